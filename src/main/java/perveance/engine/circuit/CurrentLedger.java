package perveance.engine.circuit;

import java.util.Arrays;
import perveance.engine.circuit.Element.Capacitor;
import perveance.engine.circuit.Element.CurrentSource;
import perveance.engine.circuit.Element.Inductor;
import perveance.engine.circuit.Element.Junction;
import perveance.engine.circuit.Element.Resistor;
import perveance.engine.circuit.Element.Transformer;
import perveance.engine.circuit.Element.Valve;
import perveance.engine.circuit.Element.VoltageSource;

/**
 * Currents and powers of all elements at one set of node voltages, each from its own law and not
 * from the matrix, and what Kirchhoff's law leaves over.
 */
final class CurrentLedger {
  /** Currents that are no function of the node voltages alone. */
  interface Branches {
    /**
     * Current of a capacitor, inductor, winding or source between unknown nodes.
     *
     * @return current from the first node to the second [A]
     */
    double current(int element, int winding);
  }

  /** Current from the first node through each element; of a valve its anode current [A]. */
  final double[] current;

  /** Power taken by each element [W]. */
  final double[] power;

  /** Current of each winding of a transformer, from start to end; empty for others [A]. */
  final double[][] winding;

  /** Sum of the currents that leave each node [A]. */
  private final double[] leaving;

  private final Topology topology;
  private final ValveBank valves;
  private final JunctionBank junctions;
  private double[] voltage;

  CurrentLedger(Topology topology, ValveBank valves, JunctionBank junctions) {
    int count = topology.circuit.elements().size();
    this.topology = topology;
    this.valves = valves;
    this.junctions = junctions;
    this.voltage = new double[topology.nodeCount];
    this.current = new double[count];
    this.power = new double[count];
    this.winding = new double[count][];
    this.leaving = new double[topology.nodeCount];
    for (int i = 0; i < count; i++) {
      Element element = topology.circuit.elements().get(i);
      winding[i] = new double[element instanceof Transformer e ? e.windings().size() : 0];
    }
  }

  /** Fills in everything for node voltages at which the banks have been evaluated. */
  void fill(ElementValues values, double[] nodeVoltages, Branches branches) {
    voltage = nodeVoltages;
    Arrays.fill(leaving, 0);
    Arrays.fill(power, 0);
    for (int i = 0; i < current.length; i++) {
      add(i, topology.circuit.elements().get(i), values.value[i], branches);
    }
    addValves();
    addJunctions();
    addFixingSources();
  }

  /** Largest current that is left over at a node whose voltage had to be found [A]. */
  double residual() {
    double largest = 0;
    for (int node = 1; node < leaving.length; node++) {
      if (topology.row[node] >= 0) {
        largest = Math.max(largest, Math.abs(leaving[node]));
      }
    }
    return largest;
  }

  private void add(int i, Element element, double value, Branches branches) {
    if (element instanceof Resistor e) {
      twoEnds(i, e.a(), e.b(), (voltage[e.a()] - voltage[e.b()]) / value);
    } else if (element instanceof CurrentSource e) {
      twoEnds(i, e.from(), e.to(), value);
    } else if (element instanceof Transformer e) {
      addWindings(i, e, branches);
    } else if (element instanceof Capacitor e) {
      twoEnds(i, e.a(), e.b(), branches.current(i, 0));
    } else if (element instanceof Inductor e) {
      twoEnds(i, e.a(), e.b(), branches.current(i, 0));
    } else if (element instanceof VoltageSource e && topology.floats(i)) {
      twoEnds(i, e.plus(), e.minus(), branches.current(i, 0));
    }
  }

  private void twoEnds(int i, int a, int b, double through) {
    current[i] = through;
    power[i] = (voltage[a] - voltage[b]) * through;
    leaving[a] += through;
    leaving[b] -= through;
  }

  private void addWindings(int i, Transformer e, Branches branches) {
    double total = 0;
    for (int w = 0; w < winding[i].length; w++) {
      double through = branches.current(i, w);
      twoEnds(i, e.windings().get(w).start(), e.windings().get(w).end(), through);
      winding[i][w] = through;
      total += power[i];
    }
    current[i] = winding[i][0];
    power[i] = total;
  }

  private void addValves() {
    for (int v = 0; v < valves.count; v++) {
      int i = valves.element[v];
      Valve e = (Valve) topology.circuit.elements().get(i);
      for (int electrode = 0; electrode < valves.active(v); electrode++) {
        int node = valves.electrode(v, electrode);
        double into = valves.point[v].current(electrode);
        power[i] += (voltage[node] - voltage[e.cathode()]) * into;
        leaving[node] += into;
        leaving[e.cathode()] -= into;
      }
      current[i] = valves.point[v].current(0);
    }
  }

  private void addJunctions() {
    for (int j = 0; j < junctions.count; j++) {
      int i = junctions.element[j];
      Junction e = (Junction) topology.circuit.elements().get(i);
      twoEnds(i, e.anode(), e.cathode(), junctions.current[j]);
    }
  }

  /** A source that fixes a node carries what the node's other elements ask for. */
  private void addFixingSources() {
    for (int k = topology.fixingSources.length - 1; k >= 0; k--) {
      int i = topology.fixingSources[k];
      VoltageSource e = (VoltageSource) topology.circuit.elements().get(i);
      double left = leaving[topology.fixedNodes[k]];
      twoEnds(i, e.plus(), e.minus(), topology.fixedNodes[k] == e.plus() ? -left : left);
    }
  }
}
