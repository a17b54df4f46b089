package perveance.reference;

import java.util.List;
import perveance.engine.circuit.Circuit;

/**
 * A circuit that both engines solve.
 *
 * @param name name of the case, also of its file of answers
 * @param circuit circuit
 * @param input name of the driving source
 * @param outputs where the signal is compared
 * @param peak drive for the harmonics [V]
 * @param frequencies where the small signal is compared [Hz]
 */
record ReferenceCase(
    String name,
    Circuit circuit,
    String input,
    List<Output> outputs,
    double peak,
    List<Double> frequencies) {
  /** Samples a period; harmonics above half of them fold. */
  static final int SAMPLES = 64;

  /** Harmonics compared. */
  static final int HARMONICS = 7;

  /** A pair of nodes. */
  record Output(String name, int plus, int minus) {}

  @Override
  public String toString() {
    return name;
  }
}
