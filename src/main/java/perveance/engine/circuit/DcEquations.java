package perveance.engine.circuit;

import perveance.engine.circuit.Element.CurrentSource;
import perveance.engine.circuit.Element.Inductor;
import perveance.engine.circuit.Element.Resistor;
import perveance.engine.circuit.Element.Transformer;
import perveance.engine.circuit.Element.VoltageSource;
import perveance.engine.circuit.Element.Winding;

/**
 * Nodal equations at dc: capacitors are open, inductors and windings are their resistance. Sources
 * between unknown nodes, inductors and windings have a branch current each, in this order.
 */
final class DcEquations {
  final Topology topology;
  final ElementValues values;
  final NodalSystem system;
  private final int[] resistors;
  private final int[] currentSources;
  private final int[] inductors;
  private final int[] transformers;

  /** First branch of each element that has one, -1 elsewhere. */
  final int[] branchOf;

  DcEquations(Topology topology, ElementValues values) {
    Circuit circuit = topology.circuit;
    this.topology = topology;
    this.values = values;
    this.resistors = Elements.indexArray(circuit, Resistor.class);
    this.currentSources = Elements.indexArray(circuit, CurrentSource.class);
    this.inductors = Elements.indexArray(circuit, Inductor.class);
    this.transformers = Elements.indexArray(circuit, Transformer.class);
    this.branchOf = new int[circuit.elements().size()];
    java.util.Arrays.fill(branchOf, -1);
    int branches = 0;
    for (int s : topology.floatingSources) {
      branchOf[s] = branches++;
    }
    for (int l : inductors) {
      branchOf[l] = branches++;
    }
    for (int t : transformers) {
      branchOf[t] = branches;
      branches += ((Transformer) circuit.elements().get(t)).windings().size();
    }
    this.system = new NodalSystem(topology, branches);
  }

  /** Writes the equations for the present values, sources scaled, a leak at every node [S]. */
  void stamp(double sourceScale, double leak) {
    system.clear();
    topology.writeKnown(values, sourceScale, system.voltage);
    system.valves.take(values);
    Circuit circuit = topology.circuit;
    for (int r : resistors) {
      Resistor e = (Resistor) circuit.elements().get(r);
      system.conductance(e.a(), e.b(), 1 / values.value[r]);
    }
    for (int s : currentSources) {
      CurrentSource e = (CurrentSource) circuit.elements().get(s);
      system.current(e.from(), e.to(), sourceScale * values.value[s]);
    }
    for (int s : topology.floatingSources) {
      VoltageSource e = (VoltageSource) circuit.elements().get(s);
      system.branch(branchOf[s], e.plus(), e.minus(), 0, sourceScale * values.value[s]);
    }
    for (int l : inductors) {
      Inductor e = (Inductor) circuit.elements().get(l);
      system.branch(branchOf[l], e.a(), e.b(), e.resistance(), 0);
    }
    for (int t : transformers) {
      stampWindings((Transformer) circuit.elements().get(t), branchOf[t]);
    }
    if (leak > 0) {
      for (int node = 1; node < topology.nodeCount; node++) {
        system.conductance(node, 0, leak);
      }
    }
  }

  /** Ties every unknown node by a conductance to where it stands [S], [V]. */
  void hold(double conductance, double[] at) {
    for (int row = 0; row < topology.unknownNodes; row++) {
      system.linear[row * system.size + row] += conductance;
      system.constant[row] -= conductance * at[row];
    }
  }

  private void stampWindings(Transformer transformer, int firstBranch) {
    for (int w = 0; w < transformer.windings().size(); w++) {
      Winding winding = transformer.windings().get(w);
      system.branch(firstBranch + w, winding.start(), winding.end(), winding.resistance(), 0);
    }
  }

  /** Current of a branch of an element, zero for an open capacitor [A]. */
  double branchCurrent(double[] unknowns, int element, int winding) {
    int branch = branchOf[element];
    return branch < 0 ? 0 : unknowns[system.branchRow(branch + winding)];
  }
}
