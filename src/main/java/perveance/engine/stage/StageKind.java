package perveance.engine.stage;

import java.util.List;
import perveance.engine.circuit.Circuit;

/**
 * A kind of stage. One file: the keys it reads, the circuit it builds, the drawing it lays out and
 * the test points it names. Everything else (answers, limits, bands, findings, sheet) is generic.
 */
public interface StageKind {
  /**
   * Name in the chassis file.
   *
   * @return for example {@code common-cathode}
   */
  String name();

  /**
   * Name in sentences.
   *
   * @return for example {@code common cathode}
   */
  String title();

  /**
   * Keys it reads, in the order in which a person would fill them in.
   *
   * @return keys without {@code ref} and {@code kind}
   */
  List<KeySpec> keys();

  /**
   * Contradictions between keys that a single key's range cannot show.
   *
   * @param values the stage's values
   * @return complaints, empty when it can be built
   */
  List<Complaint> check(StageValues values);

  /**
   * Adds the stage to a circuit.
   *
   * @param values the stage's values
   * @param circuit receives nodes and elements, named {@code ref.key}
   * @return what is where in it
   */
  StageCircuit build(StageValues values, Circuit.Builder circuit);

  /**
   * Lays out the drawing.
   *
   * @param values the stage's values
   * @return symbols on a grid, tied to the same parts and nodes as the circuit
   */
  Drawing draw(StageValues values);

  /**
   * A contradiction in a stage's keys.
   *
   * @param key key to change
   * @param found what is there
   * @param expected what would do
   */
  record Complaint(String key, String found, String expected) {}
}
