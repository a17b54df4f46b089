package perveance.engine.stage;

import java.util.List;
import java.util.Optional;
import perveance.engine.base.Unit;
import perveance.engine.device.Device;

/**
 * What is where in the circuit that a stage built.
 *
 * @param ref reference of the stage
 * @param input name of the source element that drives the stage, empty where another stage's output
 *     is wired to it directly
 * @param inputNode node behind the source resistance where the stage begins
 * @param outputs outputs, the main one first; a phase splitter has two
 * @param devices valve sections
 * @param parts parts to buy, in reading order
 * @param testPoints points to measure, in measuring order
 * @param loadLine the device and the view shown as load line, empty when the kind has none
 * @param assumptions what the circuit takes for granted where the stage is silent, in sentences
 */
public record StageCircuit(
    String ref,
    Optional<String> input,
    int inputNode,
    List<Output> outputs,
    List<StageDevice> devices,
    List<Part> parts,
    List<TestPoint> testPoints,
    Optional<LoadLineSpec> loadLine,
    List<String> assumptions) {
  /** Copies the lists. */
  public StageCircuit {
    outputs = List.copyOf(outputs);
    devices = List.copyOf(devices);
    parts = List.copyOf(parts);
    testPoints = List.copyOf(testPoints);
    assumptions = List.copyOf(assumptions);
  }

  /**
   * An output.
   *
   * @param name {@code output}, or {@code anode} and {@code cathode} for a concertina
   * @param plus node
   * @param minus node, 0 for chassis
   * @param load name of the resistor that takes the output power, empty when none
   */
  public record Output(String name, int plus, int minus, Optional<String> load) {}

  /**
   * A valve section in the stage.
   *
   * @param ref reference, for example {@code V1a}; also the element's name
   * @param device its device
   * @param key key that names it, {@code device} or {@code device2}
   * @param connection {@code triode}, {@code pentode} or {@code ultra-linear}
   * @param cathodeBiased whether the cathode circuit holds its bias (decides the grid-leak limit)
   */
  public record StageDevice(
      String ref, Device device, String key, String connection, boolean cathodeBiased) {}

  /**
   * A part.
   *
   * @param element name of the circuit element, {@code ref.key}
   * @param key key in the chassis file, for edits and remedies
   * @param type what it is
   * @param value in SI units of its type [1]
   * @param role what it does, for the parts list: {@code anode load}
   */
  public record Part(String element, String key, PartType type, double value, String role) {}

  /** What a part is. */
  public enum PartType {
    /** Resistor [ohm]. */
    RESISTOR(Unit.OHM),
    /** Film capacitor [F]. */
    CAPACITOR(Unit.FARAD),
    /** Electrolytic capacitor [F]. */
    ELECTROLYTIC(Unit.FARAD),
    /** Inductor [H]. */
    INDUCTOR(Unit.HENRY),
    /** Transformer; the value is its primary load [ohm]. */
    TRANSFORMER(Unit.OHM),
    /** Diode, zener, LED; the value is its voltage [V]. */
    JUNCTION(Unit.VOLT);

    private final Unit unit;

    PartType(Unit unit) {
      this.unit = unit;
    }

    /**
     * Unit of the part's value.
     *
     * @return unit
     */
    public Unit unit() {
      return unit;
    }
  }

  /**
   * A point to measure, against chassis.
   *
   * @param node node
   * @param device section it belongs to, empty for a supply node
   * @param electrode {@code anode}, {@code cathode}, {@code grid}, {@code screen} or empty
   */
  public record TestPoint(int node, String device, String electrode) {}

  /**
   * Which device's characteristics show the stage.
   *
   * @param device reference of the section
   * @param composite true for the composite characteristic of a push-pull pair
   */
  public record LoadLineSpec(String device, boolean composite) {}
}
