package perveance.engine.circuit;

import perveance.engine.circuit.Element.Capacitor;
import perveance.engine.circuit.Element.Inductor;
import perveance.engine.circuit.Element.Resistor;
import perveance.engine.circuit.Element.Transformer;
import perveance.engine.circuit.Element.VoltageSource;
import perveance.engine.circuit.Element.Winding;
import perveance.engine.device.ElectrodeCurrents;

/** Writes a circuit, its valves and junctions replaced by their slopes, into a linear frame. */
final class LinearStamper {
  private final Circuit circuit;
  private final BranchPlan plan;
  private final boolean midband;
  final LinearFrame frame;

  /** For all frequencies, or for mid-band, where some capacitors and inductors hold. */
  LinearStamper(Topology topology, boolean midband) {
    this.circuit = topology.circuit;
    this.midband = midband;
    this.plan = midband ? BranchPlan.forMidband(topology) : BranchPlan.forFrequencies(topology);
    this.frame = new LinearFrame(topology.nodeCount, plan.branches);
  }

  /** Place in the frame of the first branch of an element, -1 when it has none. */
  int place(int element) {
    return plan.branchOf[element] < 0 ? -1 : frame.nodes + plan.branchOf[element];
  }

  void stamp(ElementValues values, ValveBank valves, JunctionBank junctions) {
    frame.clear();
    for (int i = 0; i < circuit.elements().size(); i++) {
      stamp(i, circuit.elements().get(i), values.value[i]);
    }
    for (int v = 0; v < valves.count; v++) {
      stampValve(valves, v);
    }
    for (int j = 0; j < junctions.count; j++) {
      frame.conductance(junctions.anode(j), junctions.cathode(j), junctions.conductance[j]);
    }
    for (int node = 1; node < frame.nodes; node++) {
      frame.addReal(node, node, Newton.LEAK);
    }
  }

  private void stamp(int i, Element element, double value) {
    int branch = plan.branchOf[i];
    if (element instanceof Resistor e) {
      frame.conductance(e.a(), e.b(), 1 / value);
    } else if (element instanceof Capacitor e) {
      if (branch >= 0) {
        frame.branch(branch, e.a(), e.b(), 0, 0);
      } else {
        frame.capacitance(e.a(), e.b(), value);
      }
    } else if (element instanceof VoltageSource e && branch >= 0) {
      frame.branch(branch, e.plus(), e.minus(), 0, 0);
    } else if (element instanceof Inductor e && branch >= 0) {
      frame.branch(branch, e.a(), e.b(), e.resistance(), midband ? 0 : value);
    } else if (element instanceof Transformer e) {
      stampTransformer(e, branch);
    }
  }

  /** Windings, then the core: N1 u = j omega Lm im with N1 im the sum of N i (u volts a turn). */
  private void stampTransformer(Transformer transformer, int first) {
    int count = transformer.windings().size();
    int core = frame.nodes + first + count;
    boolean ideal = midband || Double.isInfinite(transformer.magnetising());
    double firstTurns = transformer.windings().get(0).turns();
    for (int w = 0; w < count; w++) {
      Winding winding = transformer.windings().get(w);
      double leakage = midband ? 0 : winding.leakage();
      frame.branch(first + w, winding.start(), winding.end(), winding.resistance(), leakage);
      int current = frame.nodes + first + w;
      frame.addReal(current, core, -winding.turns());
      if (ideal) {
        frame.addReal(core, current, winding.turns());
      } else {
        frame.addRate(core, current, -transformer.magnetising() / firstTurns * winding.turns());
      }
    }
    if (!ideal) {
      frame.addReal(core, core, firstTurns);
    }
  }

  private void stampValve(ValveBank valves, int v) {
    int cathode = valves.cathode(v);
    ElectrodeCurrents point = valves.point[v];
    for (int e = 0; e < valves.active(v); e++) {
      for (int by = 0; by < valves.active(v); by++) {
        frame.transconductance(
            valves.electrode(v, e), cathode, valves.electrode(v, by), cathode, point.slope(e, by));
      }
    }
  }
}
