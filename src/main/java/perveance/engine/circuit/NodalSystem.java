package perveance.engine.circuit;

import java.util.Arrays;

/**
 * Nodal equations with branch currents: linear x + constant + i(x) = 0, where x holds the unknown
 * node voltages [V], then the branch currents [A], and i the currents of valves and junctions. The
 * equation of a node is the sum of the currents that leave it [A]; that of a branch is its voltage
 * law [V]. (C.-W. Ho, A. E. Ruehli and P. A. Brennan, IEEE Trans. Circuits Syst. 22, 504, 1975.)
 */
final class NodalSystem {
  /** Currents too small to look at twice [A]. */
  private static final double NEGLIGIBLE = 1e-12;

  private static final double ROUNDING = 4 * Math.ulp(1.0);

  final Topology topology;
  final int size;
  final double[] linear;
  final double[] constant;

  /** All node voltages, known ones and chassis included [V]. */
  final double[] voltage;

  final ValveBank valves;
  final JunctionBank junctions;

  /** Unknown nodes joined to devices, in the order of their rows, which are the first. */
  private final int[] deviceNode;

  NodalSystem(Topology topology, int branches) {
    this.topology = topology;
    this.size = topology.unknownNodes + branches;
    this.linear = new double[size * size];
    this.constant = new double[size];
    this.voltage = new double[topology.nodeCount];
    this.valves = new ValveBank(topology.circuit, topology);
    this.junctions = new JunctionBank(topology.circuit, topology);
    this.deviceNode = new int[topology.deviceNodes];
    for (int node = 0; node < topology.nodeCount; node++) {
      if (topology.row[node] >= 0 && topology.row[node] < deviceNode.length) {
        deviceNode[topology.row[node]] = node;
      }
    }
  }

  void clear() {
    Arrays.fill(linear, 0);
    Arrays.fill(constant, 0);
  }

  /** Row of a branch's voltage law and of its current. */
  int branchRow(int branch) {
    return topology.unknownNodes + branch;
  }

  void conductance(int a, int b, double g) {
    int ra = topology.row[a];
    int rb = topology.row[b];
    if (ra >= 0) {
      linear[ra * size + ra] += g;
      if (rb >= 0) {
        linear[ra * size + rb] -= g;
      } else {
        constant[ra] -= g * voltage[b];
      }
    }
    if (rb >= 0) {
      linear[rb * size + rb] += g;
      if (ra >= 0) {
        linear[rb * size + ra] -= g;
      } else {
        constant[rb] -= g * voltage[a];
      }
    }
  }

  /** A current taken out of one node and put into another [A]. */
  void current(int from, int to, double amount) {
    int rf = topology.row[from];
    int rt = topology.row[to];
    if (rf >= 0) {
      constant[rf] += amount;
    }
    if (rt >= 0) {
      constant[rt] -= amount;
    }
  }

  /** A branch from a to b with (va - vb) - resistance * current - voltage = 0. */
  void branch(int branch, int a, int b, double resistance, double drop) {
    int at = branchRow(branch);
    join(at, a, 1);
    join(at, b, -1);
    linear[at * size + at] -= resistance;
    constant[at] -= drop;
  }

  /** Lets a branch current leave a node and the node's voltage enter the branch's law. */
  private void join(int at, int node, double sign) {
    int r = topology.row[node];
    if (r >= 0) {
      linear[r * size + at] += sign;
      linear[at * size + r] += sign;
    } else {
      constant[at] += sign * voltage[node];
    }
  }

  /** Spreads the unknowns into {@link #voltage}. */
  void spread(double[] x) {
    int[] row = topology.row;
    for (int node = 0; node < row.length; node++) {
      if (row[node] >= 0) {
        voltage[node] = x[row[node]];
      }
    }
  }

  /** Spreads x and evaluates all devices. */
  void evaluate(double[] x) {
    spread(x);
    valves.evaluate(voltage);
    junctions.evaluate(voltage);
  }

  /** Evaluates all devices; the unknowns begin with the voltages of their nodes. */
  void evaluateDevices(double[] unknowns) {
    for (int i = 0; i < deviceNode.length; i++) {
      voltage[deviceNode[i]] = unknowns[i];
    }
    valves.evaluate(voltage);
    junctions.evaluate(voltage);
  }

  /**
   * Spreads x into {@link #voltage}, evaluates all devices and sums the currents that leave every
   * unknown node; returns the largest that is left over beyond what rounding of its terms can make
   * [A].
   */
  double kirchhoff(double[] x, double[] out) {
    evaluate(x);
    multiply(linear, constant, x, out, size);
    valves.addCurrents(out);
    junctions.addCurrents(out);
    double largest = 0;
    for (int i = 0; i < topology.unknownNodes; i++) {
      double left = Math.abs(out[i]);
      if (left > NEGLIGIBLE) {
        left -= rounding(i, x);
      }
      // not a comparison with largest, which a value that is no number would pass
      if (!(left <= largest)) {
        largest = left;
      }
    }
    return largest;
  }

  private double rounding(int i, double[] x) {
    double terms = 0;
    for (int j = 0; j < size; j++) {
      terms += Math.abs(linear[i * size + j] * x[j]);
    }
    return ROUNDING * terms;
  }

  /** out = matrix x + constant, for the first {@code size} entries. */
  static void multiply(double[] matrix, double[] constant, double[] x, double[] out, int size) {
    for (int i = 0; i < size; i++) {
      double sum = constant[i];
      int at = i * size;
      for (int j = 0; j < size; j++) {
        sum += matrix[at + j] * x[j];
      }
      out[i] = sum;
    }
  }
}
