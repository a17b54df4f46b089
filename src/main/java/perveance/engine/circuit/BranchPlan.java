package perveance.engine.circuit;

import java.util.Arrays;
import perveance.engine.circuit.Element.Capacitor;
import perveance.engine.circuit.Element.Inductor;
import perveance.engine.circuit.Element.Junction;
import perveance.engine.circuit.Element.Resistor;
import perveance.engine.circuit.Element.Transformer;
import perveance.engine.circuit.Element.Valve;
import perveance.engine.circuit.Element.VoltageSource;
import perveance.engine.circuit.Element.Winding;

/**
 * Which elements have branch currents of their own, and how many. A transformer has one for each
 * winding and then one place for its volts per turn.
 */
final class BranchPlan {
  /** First branch of each element, -1 where it has none. */
  final int[] branchOf;

  /** Capacitors that hold a voltage through a cycle; each has a branch. */
  final int[] holdingCapacitors;

  /** Inductors that hold a current through a cycle; they have no branch. */
  final int[] holdingInductors;

  final int branches;

  private BranchPlan(int[] branchOf, int[] capacitors, int[] inductors, int branches) {
    this.branchOf = branchOf;
    this.holdingCapacitors = capacitors;
    this.holdingInductors = inductors;
    this.branches = branches;
  }

  /** Every inductor and winding has a branch, capacitors have none. */
  static BranchPlan forFrequencies(Topology topology) {
    return plan(topology, new int[0], new int[0]);
  }

  /** Capacitors that hold have a branch; inductors that hold have none. */
  static BranchPlan forMidband(Topology topology) {
    Circuit circuit = topology.circuit;
    NodeGroups tied = new NodeGroups(topology.nodeCount);
    for (int s : Elements.indices(circuit, VoltageSource.class)) {
      int[] ends = Terminals.of(circuit.elements().get(s));
      tied.join(ends[0], ends[1]);
    }
    // A capacitor across others that hold already adds nothing to a cycle.
    int[] capacitors =
        Elements.indices(circuit, Capacitor.class).stream()
            .filter(c -> holds((Capacitor) circuit.elements().get(c), tied))
            .mapToInt(Integer::intValue)
            .toArray();
    NodeGroups joined = joinedWithoutInductors(circuit, capacitors);
    // An inductor that is the only way to some nodes carries what they ask for.
    int[] inductors =
        Elements.indices(circuit, Inductor.class).stream()
            .filter(l -> !bridges((Inductor) circuit.elements().get(l), joined))
            .mapToInt(Integer::intValue)
            .toArray();
    return plan(topology, capacitors, inductors);
  }

  private static boolean holds(Capacitor capacitor, NodeGroups tied) {
    return capacitor.role() == CapacitorRole.HOLDS && tied.join(capacitor.a(), capacitor.b());
  }

  private static boolean bridges(Inductor inductor, NodeGroups joined) {
    return joined.join(inductor.a(), inductor.b());
  }

  private static NodeGroups joinedWithoutInductors(Circuit circuit, int[] capacitors) {
    NodeGroups joined = new NodeGroups(circuit.nodes().size());
    for (Element element : circuit.elements()) {
      if (element instanceof Resistor e) {
        joined.join(e.a(), e.b());
      } else if (element instanceof VoltageSource e) {
        joined.join(e.plus(), e.minus());
      } else if (element instanceof Junction e) {
        joined.join(e.anode(), e.cathode());
      } else if (element instanceof Valve e) {
        joined.join(e.anode(), e.cathode());
      } else if (element instanceof Transformer e) {
        for (Winding w : e.windings()) {
          joined.join(w.start(), w.end());
        }
      }
    }
    for (int c : capacitors) {
      int[] ends = Terminals.of(circuit.elements().get(c));
      joined.join(ends[0], ends[1]);
    }
    return joined;
  }

  private static BranchPlan plan(Topology topology, int[] capacitors, int[] heldInductors) {
    Circuit circuit = topology.circuit;
    int[] branchOf = new int[circuit.elements().size()];
    Arrays.fill(branchOf, -1);
    int next = 0;
    for (int s : topology.floatingSources) {
      branchOf[s] = next++;
    }
    for (int c : capacitors) {
      branchOf[c] = next++;
    }
    for (int l : Elements.indices(circuit, Inductor.class)) {
      if (Arrays.binarySearch(heldInductors, l) < 0) {
        branchOf[l] = next++;
      }
    }
    for (int t : Elements.indices(circuit, Transformer.class)) {
      branchOf[t] = next;
      next += ((Transformer) circuit.elements().get(t)).windings().size() + 1;
    }
    return new BranchPlan(branchOf, capacitors, heldInductors, next);
  }
}
