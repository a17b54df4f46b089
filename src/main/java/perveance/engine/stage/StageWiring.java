package perveance.engine.stage;

import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import perveance.engine.circuit.CapacitorRole;
import perveance.engine.circuit.Circuit;
import perveance.engine.circuit.Element;
import perveance.engine.stage.Drawing.SymbolType;
import perveance.engine.stage.StageCircuit.LoadLineSpec;
import perveance.engine.stage.StageCircuit.Output;
import perveance.engine.stage.StageCircuit.Part;
import perveance.engine.stage.StageCircuit.PartType;
import perveance.engine.stage.StageCircuit.StageDevice;
import perveance.engine.stage.StageCircuit.TestPoint;

/**
 * Wires one stage into a circuit and keeps the list of what is where. Names of nodes and elements
 * get the stage's reference in front.
 */
final class StageWiring {
  /**
   * Capacitance that stands for a coupling which sets no corner: with 10 kohm it is below 16 uHz.
   */
  static final double WITHOUT_CORNER = 1.0;

  /** Resistance of a current source where none is stated; a cascoded one has more [ohm]. */
  static final double USUAL_SOURCE_RESISTANCE = 10e6;

  /** What a current source that has run out of voltage goes over by [V]. */
  private static final double LIMIT = 0.65;

  /** Taken where a stage stands without a supply, to choose a diode's working current [V]. */
  static final double USUAL_SUPPLY = 250;

  /** Least current at which a bias diode is taken to have its stated voltage [A]. */
  static final double LEAST_CURRENT = 1e-6;

  private final StageValues values;
  private final Circuit.Builder circuit;
  private final List<Part> parts = new ArrayList<>();
  private final List<StageDevice> devices = new ArrayList<>();
  private final List<TestPoint> testPoints = new ArrayList<>();
  private final List<Output> outputs = new ArrayList<>();
  private final List<String> assumptions = new ArrayList<>();
  private Optional<String> input = Optional.empty();
  private int inputNode;

  StageWiring(StageValues values, Circuit.Builder circuit) {
    this.values = values;
    this.circuit = circuit;
  }

  StageValues values() {
    return values;
  }

  /** The name of something of this stage. */
  String name(String local) {
    return values.ref() + "." + local;
  }

  /** A node of this stage. */
  int node(String local) {
    return circuit.node(name(local));
  }

  /** A node of the circuit by its whole name. */
  int outerNode(String name) {
    return circuit.node(name);
  }

  /** The node of the supply that a key names. */
  int supply(KeySpec key) {
    String supply =
        values
            .word(key.key())
            .orElseThrow(
                () -> new IllegalArgumentException("no supply for " + values.ref() + key.key()));
    return circuit.node(ChassisNames.supply(supply));
  }

  /** A resistor that the stage states under the key. */
  void resistor(KeySpec key, int a, int b, String role) {
    resistor(key.key(), key, values.number(key.key()), a, b, role);
  }

  /** A resistor of its own name whose value a person changes under the key. */
  void resistor(String local, KeySpec key, double resistance, int a, int b, String role) {
    circuit.add(new Element.Resistor(name(local), a, b, resistance));
    parts.add(new Part(name(local), key.key(), PartType.RESISTOR, resistance, role));
  }

  /** A resistor that stands for something outside the stage. */
  void outerResistor(String local, int a, int b, double resistance) {
    circuit.add(new Element.Resistor(name(local), a, b, resistance));
  }

  /** A capacitor that the stage states under the key. */
  void capacitor(KeySpec key, int a, int b, String role) {
    capacitor(key.key(), key, values.number(key.key()), a, b, role);
  }

  /** A capacitor of its own name whose value a person changes under the key. */
  void capacitor(String local, KeySpec key, double capacitance, int a, int b, String role) {
    circuit.add(new Element.Capacitor(name(local), a, b, capacitance, CapacitorRole.HOLDS));
    PartType type = electrolytic(capacitance) ? PartType.ELECTROLYTIC : PartType.CAPACITOR;
    parts.add(new Part(name(local), key.key(), type, capacitance, role));
  }

  /** From 1 uF up a capacitor is drawn and bought as an electrolytic (common practice). */
  static boolean electrolytic(double capacitance) {
    return capacitance >= 1e-6;
  }

  /** A capacitor that is no part: it holds its charge and sets no corner. */
  void idealCapacitor(String local, int a, int b) {
    circuit.add(new Element.Capacitor(name(local), a, b, WITHOUT_CORNER, CapacitorRole.HOLDS));
  }

  /** A capacitance of electrodes or wiring. */
  void stray(String local, int a, int b, double capacitance) {
    if (capacitance > 0 && a != b) {
      circuit.add(new Element.Capacitor(name(local), a, b, capacitance, CapacitorRole.STRAY));
    }
  }

  /** The symbol of a capacitor; one that is not stated is drawn without a value. */
  static SymbolType capacitorSymbol(StageValues values, KeySpec key) {
    return electrolytic(values.number(key.key(), 0))
        ? SymbolType.ELECTROLYTIC
        : SymbolType.CAPACITOR;
  }

  /**
   * A stated current source with its resistance for signals. It cannot lift its far end above its
   * near one: a junction across it takes over, so that a cold valve sees the supply and no more.
   */
  void currentSource(KeySpec key, int from, int to) {
    double current = values.number(key.key());
    circuit.add(new Element.CurrentSource(name(key.key()), from, to, current));
    KeySpec resistanceKey = StageKeys.CURRENT_SOURCE_RESISTANCE;
    double resistance = values.number(resistanceKey.key(), USUAL_SOURCE_RESISTANCE);
    outerResistor(resistanceKey.key(), from, to, resistance);
    circuit.add(
        new Element.Junction(
            name(key.key() + "_limit"), to, from, BiasDiode.SILICON.law(LIMIT, current)));
    assume("The current source keeps its current down to no voltage across it.");
    if (!values.has(resistanceKey.key())) {
      assume("The resistance of the current source is not stated; taken as 10 Mohm.");
    }
  }

  void voltageSource(String local, int plus, int minus, double voltage) {
    circuit.add(new Element.VoltageSource(name(local), plus, minus, voltage));
  }

  /** Adds an element that has no place of its own here. */
  void element(Element element) {
    circuit.add(element);
  }

  void part(String local, KeySpec key, PartType type, double value, String role) {
    parts.add(new Part(name(local), key.key(), type, value, role));
  }

  void device(StageDevice device) {
    devices.add(device);
  }

  void testPoint(int node, String device, String electrode) {
    testPoints.add(new TestPoint(node, device, electrode));
  }

  void output(String name, int plus, int minus, Optional<String> load) {
    outputs.add(new Output(name, plus, minus, load));
  }

  void input(Optional<String> source, int node) {
    input = source;
    inputNode = node;
  }

  void assume(String sentence) {
    if (!assumptions.contains(sentence)) {
      assumptions.add(sentence);
    }
  }

  StageCircuit finish(LoadLineSpec loadLine) {
    return new StageCircuit(
        values.ref(),
        input,
        inputNode,
        outputs,
        devices,
        parts,
        testPoints,
        Optional.of(loadLine),
        assumptions);
  }
}
