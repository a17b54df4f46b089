package perveance.engine.circuit;

import perveance.engine.circuit.Element.CurrentSource;
import perveance.engine.circuit.Element.Junction;
import perveance.engine.circuit.Element.Resistor;
import perveance.engine.circuit.Element.Transformer;
import perveance.engine.circuit.Element.Valve;
import perveance.engine.circuit.Element.VoltageSource;

/**
 * Currents and powers of all elements at a dc point, each from its own law and not from the matrix,
 * and what Kirchhoff's law leaves over.
 */
final class DcCurrents {
  /** Current from the first node through each element; of a valve its anode current [A]. */
  final double[] current;

  /** Power taken by each element [W]. */
  final double[] power;

  /** Current of each winding of a transformer, from start to end; empty for others [A]. */
  final double[][] winding;

  /** Sum of the currents that leave each node [A]. */
  private final double[] leaving;

  private final DcEquations equations;
  private final double[] unknowns;
  private final double[] voltage;

  DcCurrents(DcEquations equations, double[] unknowns) {
    int count = equations.topology.circuit.elements().size();
    this.equations = equations;
    this.unknowns = unknowns;
    this.voltage = equations.system.voltage;
    this.current = new double[count];
    this.power = new double[count];
    this.winding = new double[count][];
    this.leaving = new double[equations.topology.nodeCount];
    for (int i = 0; i < count; i++) {
      winding[i] = new double[0];
      add(i, equations.topology.circuit.elements().get(i));
    }
    addValves();
    addJunctions();
    addFixingSources();
  }

  /** Largest current that is left over at a node whose voltage had to be found [A]. */
  double residual() {
    double largest = 0;
    for (int node = 1; node < leaving.length; node++) {
      largest = Math.max(largest, Math.abs(leaving[node]));
    }
    return largest;
  }

  private void add(int i, Element element) {
    if (element instanceof Resistor e) {
      twoEnds(i, e.a(), e.b(), (voltage[e.a()] - voltage[e.b()]) / equations.values.value[i]);
    } else if (element instanceof CurrentSource e) {
      twoEnds(i, e.from(), e.to(), equations.values.value[i]);
    } else if (element instanceof Transformer e) {
      addWindings(i, e);
    } else if (equations.branchOf[i] >= 0) {
      int[] ends = Terminals.of(element);
      twoEnds(i, ends[0], ends[1], branchCurrent(equations.branchOf[i]));
    }
  }

  private double branchCurrent(int branch) {
    return unknowns[equations.system.branchRow(branch)];
  }

  private void twoEnds(int i, int a, int b, double through) {
    current[i] = through;
    power[i] = (voltage[a] - voltage[b]) * through;
    leaving[a] += through;
    leaving[b] -= through;
  }

  private void addWindings(int i, Transformer e) {
    winding[i] = new double[e.windings().size()];
    double total = 0;
    for (int w = 0; w < winding[i].length; w++) {
      double through = branchCurrent(equations.branchOf[i] + w);
      twoEnds(i, e.windings().get(w).start(), e.windings().get(w).end(), through);
      winding[i][w] = through;
      total += power[i];
    }
    current[i] = winding[i][0];
    power[i] = total;
  }

  private void addValves() {
    ValveBank valves = equations.system.valves;
    for (int v = 0; v < valves.count; v++) {
      int i = valves.element[v];
      Valve e = (Valve) equations.topology.circuit.elements().get(i);
      int[] ends = {e.anode(), e.grid(), e.screen()};
      for (int electrode = 0; electrode < ends.length; electrode++) {
        double into = valves.point[v].current(electrode);
        power[i] += (voltage[ends[electrode]] - voltage[e.cathode()]) * into;
        leaving[ends[electrode]] += into;
        leaving[e.cathode()] -= into;
      }
      current[i] = valves.point[v].current(0);
    }
  }

  private void addJunctions() {
    JunctionBank junctions = equations.system.junctions;
    for (int j = 0; j < junctions.count; j++) {
      int i = junctions.element[j];
      Junction e = (Junction) equations.topology.circuit.elements().get(i);
      twoEnds(i, e.anode(), e.cathode(), junctions.current[j]);
    }
  }

  /** A source that fixes a node carries what the node's other elements ask for. */
  private void addFixingSources() {
    Topology topology = equations.topology;
    for (int k = topology.fixingSources.length - 1; k >= 0; k--) {
      int i = topology.fixingSources[k];
      VoltageSource e = (VoltageSource) topology.circuit.elements().get(i);
      double left = leaving[topology.fixedNodes[k]];
      twoEnds(i, e.plus(), e.minus(), topology.fixedNodes[k] == e.plus() ? -left : left);
    }
  }
}
