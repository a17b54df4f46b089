package perveance.engine.circuit;

import java.util.Arrays;
import perveance.engine.circuit.Element.CurrentSource;
import perveance.engine.circuit.Element.VoltageSource;
import perveance.engine.numeric.ComplexLu;
import perveance.engine.numeric.DenseLu;

/**
 * Solves a linear frame at one frequency for unit sources, unit currents and, transposed, for the
 * effect of every place on one output. Answers are read for any node or branch of the frame.
 */
final class FrameSolver {
  private final Topology topology;
  private final LinearFrame frame;
  private final LinearStamper stamper;
  private final int size;

  /** Place in the frame of each unknown. */
  private final int[] place;

  private final double[] matrix;
  private final double[] matrixIm;
  private final double[] vector;
  private final double[] vectorIm;
  private final double[] known;
  private final DenseLu real;
  private final ComplexLu complex;
  private double omega;

  FrameSolver(Topology topology, LinearStamper stamper) {
    this.topology = topology;
    this.stamper = stamper;
    this.frame = stamper.frame;
    int branches = frame.size - frame.nodes;
    this.size = topology.unknownNodes + branches;
    this.place = new int[size];
    for (int node = 0; node < frame.nodes; node++) {
      if (topology.row[node] >= 0) {
        place[topology.row[node]] = node;
      }
    }
    for (int b = 0; b < branches; b++) {
      place[topology.unknownNodes + b] = frame.nodes + b;
    }
    this.matrix = new double[size * size];
    this.matrixIm = new double[size * size];
    this.vector = new double[size];
    this.vectorIm = new double[size];
    this.known = new double[frame.nodes];
    this.real = new DenseLu(Math.max(1, size));
    this.complex = new ComplexLu(Math.max(1, size));
  }

  /** Factors the equations at an angular frequency, zero for the real part alone [rad/s]. */
  boolean factor(double angularFrequency) {
    omega = angularFrequency;
    for (int i = 0; i < size; i++) {
      int at = place[i] * frame.size;
      for (int j = 0; j < size; j++) {
        matrix[i * size + j] = frame.real[at + place[j]];
        matrixIm[i * size + j] = omega * frame.rate[at + place[j]];
      }
    }
    if (size == 0) {
      return true;
    }
    return omega == 0 ? real.factor(matrix) : complex.factor(matrix, matrixIm);
  }

  private void solve() {
    if (size == 0) {
      return;
    }
    if (omega == 0) {
      real.solve(vector);
    } else {
      complex.solve(vector, vectorIm);
    }
  }

  private void clear() {
    Arrays.fill(vector, 0);
    Arrays.fill(vectorIm, 0);
    Arrays.fill(known, 0);
  }

  /** Response to one volt or one ampere of a source. */
  void respondTo(int source) {
    clear();
    Element element = topology.circuit.elements().get(source);
    if (element instanceof CurrentSource e) {
      add(e.from(), -1);
      add(e.to(), 1);
    } else if (!(element instanceof VoltageSource)) {
      throw new IllegalArgumentException(element.name() + " is no source");
    } else if (topology.writeUnit(source, known)) {
      for (int i = 0; i < size; i++) {
        vector[i] = -onKnown(frame.real, place[i]);
        vectorIm[i] = -omega * onKnown(frame.rate, place[i]);
      }
    } else {
      vector[topology.unknownNodes + stamper.place(source) - frame.nodes] = 1;
    }
    solve();
  }

  private double onKnown(double[] entries, int row) {
    double sum = 0;
    for (int node = 0; node < frame.nodes; node++) {
      sum += entries[row * frame.size + node] * known[node];
    }
    return sum;
  }

  private void add(int node, double amount) {
    if (topology.row[node] >= 0) {
      vector[topology.row[node]] += amount;
    }
  }

  /** Response to one ampere taken from one node and put into another, sources dead. */
  void respondToCurrent(int from, int to) {
    clear();
    add(from, -1);
    add(to, 1);
    solve();
  }

  /** Effect of one ampere into each node, or one volt in each branch, on an output voltage. */
  void effectsOn(int plus, int minus) {
    clear();
    add(plus, 1);
    add(minus, -1);
    if (size == 0) {
      return;
    }
    if (omega == 0) {
      real.solveTransposed(vector);
    } else {
      complex.solveTransposed(vector, vectorIm);
    }
  }

  double re(int framePlace) {
    int i = unknownAt(framePlace);
    return i >= 0 ? vector[i] : known[framePlace];
  }

  double im(int framePlace) {
    int i = unknownAt(framePlace);
    return i >= 0 ? vectorIm[i] : 0;
  }

  private int unknownAt(int framePlace) {
    return framePlace < frame.nodes
        ? topology.row[framePlace]
        : topology.unknownNodes + framePlace - frame.nodes;
  }

  /** Current that a source of one volt delivers, out of plus, after {@link #respondTo}. */
  Complex delivered(int source) {
    int branch = stamper.place(source);
    if (branch >= frame.nodes) {
      return new Complex(-re(branch), -im(branch));
    }
    double sumRe = 0;
    double sumIm = 0;
    for (int node = 0; node < frame.nodes; node++) {
      if (known[node] != 0) {
        for (int j = 0; j < frame.size; j++) {
          double g = frame.real[node * frame.size + j];
          double b = omega * frame.rate[node * frame.size + j];
          sumRe += known[node] * (g * re(j) - b * im(j));
          sumIm += known[node] * (g * im(j) + b * re(j));
        }
      }
    }
    return new Complex(sumRe, sumIm);
  }
}
