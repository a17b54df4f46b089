package perveance.engine.circuit;

import java.util.ArrayList;
import java.util.List;

/** A dc operating point at which Kirchhoff's law holds; immutable. */
public final class DcSolution {
  private final Circuit circuit;
  private final double[] voltage;
  private final double[] unknowns;
  private final CurrentLedger currents;
  private final List<ValvePoint> valves;

  DcSolution(DcEquations equations, double[] unknowns) {
    this.circuit = equations.values.asCircuit();
    this.voltage = equations.system.voltage.clone();
    this.unknowns = unknowns.clone();
    ValveBank bank = equations.system.valves;
    this.currents = new CurrentLedger(equations.topology, bank, equations.system.junctions);
    currents.fill(
        equations.values,
        voltage,
        (element, winding) -> equations.branchCurrent(this.unknowns, element, winding));
    List<ValvePoint> points = new ArrayList<>();
    for (int v = 0; v < bank.count; v++) {
      double cathode = voltage[bank.cathode(v)];
      double[] toCathode = {
        voltage[bank.anode(v)] - cathode,
        voltage[bank.grid(v)] - cathode,
        voltage[bank.screen(v)] - cathode
      };
      String name = circuit.elements().get(bank.element[v]).name();
      points.add(new ValvePoint(name, toCathode, cathode, bank.point[v]));
    }
    this.valves = List.copyOf(points);
  }

  /**
   * The circuit with the values for which this point was found.
   *
   * @return circuit
   */
  public Circuit circuit() {
    return circuit;
  }

  /**
   * Voltage of a node.
   *
   * @param node node number
   * @return node to chassis [V]
   */
  public double voltage(int node) {
    return voltage[node];
  }

  /**
   * Voltage of a node.
   *
   * @param node node name
   * @return node to chassis [V]
   */
  public double voltage(String node) {
    return voltage[circuit.node(node)];
  }

  /**
   * Current through an element from its first node to its second; of a valve its anode current, of
   * a transformer that of its first winding, of a capacitor zero.
   *
   * @param element element name
   * @return current [A]
   */
  public double current(String element) {
    return currents.current[circuit.element(element)];
  }

  /**
   * Current of one winding.
   *
   * @param transformer element name
   * @param winding place of the winding in its transformer
   * @return current from start to end [A]
   */
  public double windingCurrent(String transformer, int winding) {
    return currents.winding[circuit.element(transformer)][winding];
  }

  /**
   * Power that an element takes; negative for a source that delivers. Over all elements the powers
   * add to zero.
   *
   * @param element element name
   * @return power [W]
   */
  public double power(String element) {
    return currents.power[circuit.element(element)];
  }

  /**
   * Sum of the powers of all elements; zero but for rounding.
   *
   * @return power [W]
   */
  public double powerBalance() {
    double sum = 0;
    for (double p : currents.power) {
      sum += p;
    }
    return sum;
  }

  /**
   * Largest current that Kirchhoff's law leaves over at any node, summed element by element.
   *
   * @return current [A]
   */
  public double residual() {
    return currents.residual();
  }

  /**
   * All valves in the order of the circuit.
   *
   * @return valve points
   */
  public List<ValvePoint> valves() {
    return valves;
  }

  /**
   * One valve.
   *
   * @param name element name
   * @return its point
   */
  public ValvePoint valve(String name) {
    for (ValvePoint point : valves) {
      if (point.name().equals(name)) {
        return point;
      }
    }
    throw new IllegalArgumentException("no valve named " + name);
  }

  /** Sum of turns times current over the windings of a transformer [A]. */
  double ampereTurns(Element.Transformer transformer) {
    double sum = 0;
    for (int w = 0; w < transformer.windings().size(); w++) {
      sum += transformer.windings().get(w).turns() * windingCurrent(transformer.name(), w);
    }
    return sum;
  }

  /** The unknowns of the equations, not to be changed. */
  double[] unknowns() {
    return unknowns;
  }
}
