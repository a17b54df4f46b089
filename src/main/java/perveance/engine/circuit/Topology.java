package perveance.engine.circuit;

import java.util.ArrayList;
import java.util.Arrays;
import java.util.List;
import perveance.engine.circuit.Element.VoltageSource;

/**
 * Which node voltages are unknown. Nodes that voltage sources tie to chassis are known: they need
 * no equation, which keeps the matrices small.
 */
final class Topology {
  final Circuit circuit;
  final int nodeCount;

  /** Row of each node's equation, -1 where the voltage is known. */
  final int[] row;

  /** How many node voltages are unknown; rows of branch currents come after them. */
  final int unknownNodes;

  /** Sources that fix a node, in an order in which each starts from a known node. */
  final int[] fixingSources;

  /** The node that each fixing source fixes. */
  final int[] fixedNodes;

  /** Sources whose current is an unknown of its own, because neither end is known. */
  final int[] floatingSources;

  /** A source that closes a loop of sources, or -1. */
  final int loopedSource;

  Topology(Circuit circuit) {
    this.circuit = circuit;
    this.nodeCount = circuit.nodes().size();
    boolean[] known = new boolean[nodeCount];
    known[0] = true;
    List<Integer> fixing = new ArrayList<>();
    List<Integer> fixed = new ArrayList<>();
    List<Integer> waiting = Elements.indices(circuit, VoltageSource.class);
    int looped = -1;
    boolean progress = true;
    while (progress) {
      progress = false;
      for (Integer index : List.copyOf(waiting)) {
        VoltageSource source = (VoltageSource) circuit.elements().get(index);
        if (known[source.plus()] && known[source.minus()]) {
          looped = index;
          waiting.remove(index);
        } else if (known[source.plus()] || known[source.minus()]) {
          int node = known[source.plus()] ? source.minus() : source.plus();
          known[node] = true;
          fixed.add(node);
          fixing.add(index);
          waiting.remove(index);
          progress = true;
        }
      }
    }
    this.loopedSource = looped;
    this.fixingSources = fixing.stream().mapToInt(Integer::intValue).toArray();
    this.fixedNodes = fixed.stream().mapToInt(Integer::intValue).toArray();
    this.floatingSources = waiting.stream().mapToInt(Integer::intValue).toArray();
    this.row = new int[nodeCount];
    int next = 0;
    for (int node = 0; node < nodeCount; node++) {
      row[node] = known[node] ? -1 : next++;
    }
    this.unknownNodes = next;
  }

  /** Whether a voltage source lies between unknown nodes, so that its current is an unknown. */
  boolean floats(int element) {
    for (int source : floatingSources) {
      if (source == element) {
        return true;
      }
    }
    return false;
  }

  /** Writes the known node voltages for the sources' present values, all of them scaled [V]. */
  void writeKnown(ElementValues values, double scale, double[] voltage) {
    voltage[0] = 0;
    for (int i = 0; i < fixingSources.length; i++) {
      VoltageSource source = (VoltageSource) circuit.elements().get(fixingSources[i]);
      double across = scale * values.value[fixingSources[i]];
      if (fixedNodes[i] == source.plus()) {
        voltage[source.plus()] = voltage[source.minus()] + across;
      } else {
        voltage[source.minus()] = voltage[source.plus()] - across;
      }
    }
  }

  /**
   * Writes the volts on each known node for one volt of one source, all others being shorts.
   *
   * @return whether the source fixes a node
   */
  boolean writeUnit(int element, double[] voltage) {
    boolean fixes = false;
    Arrays.fill(voltage, 0);
    for (int i = 0; i < fixingSources.length; i++) {
      VoltageSource source = (VoltageSource) circuit.elements().get(fixingSources[i]);
      double across = fixingSources[i] == element ? 1 : 0;
      fixes |= fixingSources[i] == element;
      if (fixedNodes[i] == source.plus()) {
        voltage[source.plus()] = voltage[source.minus()] + across;
      } else {
        voltage[source.minus()] = voltage[source.plus()] - across;
      }
    }
    return fixes;
  }
}
