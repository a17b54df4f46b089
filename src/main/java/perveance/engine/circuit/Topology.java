package perveance.engine.circuit;

import java.util.ArrayList;
import java.util.Arrays;
import java.util.List;
import perveance.engine.circuit.Element.Junction;
import perveance.engine.circuit.Element.Valve;
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

  /** How many unknown nodes are joined to valves or junctions; their rows come first. */
  final int deviceNodes;

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
    boolean[] device = deviceNodes(circuit);
    this.deviceNodes = number(known, device, true, 0);
    this.unknownNodes = number(known, device, false, deviceNodes);
  }

  private static boolean[] deviceNodes(Circuit circuit) {
    boolean[] device = new boolean[circuit.nodes().size()];
    for (Element element : circuit.elements()) {
      if (element instanceof Valve || element instanceof Junction) {
        for (int node : Terminals.of(element)) {
          device[node] = true;
        }
      }
    }
    return device;
  }

  /** Numbers the unknown nodes of devices, or the others; returns the next number. */
  private int number(boolean[] known, boolean[] device, boolean wanted, int first) {
    int next = first;
    for (int node = 0; node < nodeCount; node++) {
      if (known[node]) {
        row[node] = -1;
      } else if (device[node] == wanted) {
        row[node] = next++;
      }
    }
    return next;
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
