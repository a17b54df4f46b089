package perveance.engine.circuit;

import java.util.Arrays;

/**
 * Nodal equations with branch currents: linear x + constant + i(x) = 0, where x holds the unknown
 * node voltages [V], then the branch currents [A], and i the currents of valves and junctions. The
 * equation of a node is the sum of the currents that leave it [A]; that of a branch is its voltage
 * law [V]. (C.-W. Ho, A. E. Ruehli and P. A. Brennan, IEEE Trans. Circuits Syst. 22, 504, 1975.)
 */
final class NodalSystem {
  final Topology topology;
  final int size;
  final double[] linear;
  final double[] constant;

  /** All node voltages, known ones and chassis included [V]. */
  final double[] voltage;

  final ValveBank valves;
  final JunctionBank junctions;

  NodalSystem(Topology topology, int branches) {
    this.topology = topology;
    this.size = topology.unknownNodes + branches;
    this.linear = new double[size * size];
    this.constant = new double[size];
    this.voltage = new double[topology.nodeCount];
    this.valves = new ValveBank(topology.circuit, topology);
    this.junctions = new JunctionBank(topology.circuit, topology);
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

  /** Evaluates all devices at x. */
  void evaluate(double[] x) {
    spread(x);
    valves.evaluate(voltage);
    junctions.evaluate(voltage);
  }

  /** Evaluates all devices at x and writes what is left of the equations. */
  void residual(double[] x, double[] out) {
    evaluate(x);
    for (int i = 0; i < size; i++) {
      double sum = constant[i];
      int at = i * size;
      for (int j = 0; j < size; j++) {
        sum += linear[at + j] * x[j];
      }
      out[i] = sum;
    }
    valves.addCurrents(out);
    junctions.addCurrents(out);
  }

  /** Writes the matrix of derivatives at the point that was last evaluated. */
  void jacobian(double[] out) {
    System.arraycopy(linear, 0, out, 0, out.length);
    valves.addSlopes(out, size);
    junctions.addSlopes(out, size);
  }
}
