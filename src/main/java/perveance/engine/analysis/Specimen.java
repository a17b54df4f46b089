package perveance.engine.analysis;

import java.util.ArrayList;
import java.util.List;
import java.util.Set;
import perveance.engine.circuit.Circuit;
import perveance.engine.circuit.DcSolver;
import perveance.engine.circuit.Element;
import perveance.engine.circuit.Element.Resistor;
import perveance.engine.circuit.Element.Valve;
import perveance.engine.circuit.Element.VoltageSource;

/** Turns a circuit's solver into one specimen after the other. */
final class Specimen {
  private final DcSolver solver;
  private final SampleDraws draws;
  private final Causes causes;
  private final List<Varied> varied = new ArrayList<>();
  private final double[] resistance;

  /** An element that varies, its place in the circuit and its first cause. */
  private record Varied(int element, Element nominal, int cause) {}

  /**
   * Prepares a circuit.
   *
   * @param solver its solver
   * @param draws deviates
   * @param causes what varies
   * @param held names of sources that another circuit's specimens set and this one leaves alone
   */
  Specimen(DcSolver solver, SampleDraws draws, Causes causes, Set<String> held) {
    this.solver = solver;
    this.draws = draws;
    this.causes = causes;
    Circuit circuit = solver.circuit();
    this.resistance = new double[circuit.elements().size()];
    for (int i = 0; i < circuit.elements().size(); i++) {
      Element element = circuit.elements().get(i);
      if (element instanceof Resistor r) {
        resistance[i] = r.resistance();
      }
      int cause = causes.place(element.name());
      if (cause >= 0 && !held.contains(element.name())) {
        varied.add(new Varied(i, element, cause));
      }
    }
  }

  /** Sets every value to that of one sample. */
  void take(int sample) {
    for (Varied v : varied) {
      double deviate = draws.of(v.cause(), sample);
      if (v.nominal() instanceof Resistor r) {
        resistance[v.element()] = r.resistance() * Math.exp(causes.resistorDeviation() * deviate);
        solver.setResistance(v.element(), resistance[v.element()]);
      } else if (v.nominal() instanceof VoltageSource s) {
        solver.setVoltage(v.element(), s.voltage() * (1 + causes.supplyDeviation() * deviate));
      } else if (v.nominal() instanceof Valve valve) {
        solver.setLaw(
            v.element(),
            valve
                .law()
                .specimen(
                    Math.exp(Causes.CONDUCTION * deviate),
                    Causes.CONTACT * draws.of(v.cause() + 1, sample)));
      }
    }
  }

  /** A resistor's value in the sample last taken [ohm]. */
  double resistance(int element) {
    return resistance[element];
  }
}
