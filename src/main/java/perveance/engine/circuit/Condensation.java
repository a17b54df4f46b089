package perveance.engine.circuit;

/**
 * Takes the linear unknowns out of A x + b + i(x) = 0 before Newton's method sees them: partial
 * Gaussian elimination, which leaves the Schur complement. The first unknowns and equations, as
 * many as {@code kept}, are those of devices and always stay; of the others those stay that have no
 * pivot.
 *
 * <p>Pivots are chosen by size against their row when the first matrix is seen, and again only when
 * one of them has become small. Nothing is allocated after construction.
 */
final class Condensation {
  private static final double KEEP = 1e-9;

  private final int full;
  private final CondensationPlan plan;

  /** The matrix with pivots first and what stays last; below the pivots the multipliers. */
  private final double[] matrix;

  private final double[] scale;
  private final double[] carried;
  private boolean planned;

  Condensation(int full, int kept) {
    this.full = full;
    this.plan = new CondensationPlan(full, kept);
    this.matrix = new double[full * full];
    this.scale = new double[full];
    this.carried = new double[full];
  }

  /** How many unknowns stay, at most; what is left is known only after {@link #eliminate}. */
  int size() {
    return full - plan.pivots;
  }

  /** Place in the full vector of an unknown that stays, devices first. */
  int column(int place) {
    return plan.column[plan.pivots + place];
  }

  /** Eliminates from a full matrix, given row by row. */
  void eliminate(double[] linear) {
    if (!planned || !follow(linear)) {
      plan.make(linear);
      planned = true;
      follow(linear);
    }
  }

  private boolean follow(double[] linear) {
    for (int i = 0; i < full; i++) {
      int from = plan.row[i] * full;
      int to = i * full;
      double largest = 0;
      for (int j = 0; j < full; j++) {
        double entry = linear[from + plan.column[j]];
        matrix[to + j] = entry;
        largest = Math.max(largest, Math.abs(entry));
      }
      scale[i] = largest;
    }
    for (int s = 0; s < plan.pivots; s++) {
      int at = s * full;
      double pivot = matrix[at + s];
      if (!(Math.abs(pivot) > KEEP * scale[s])) {
        return false;
      }
      double inverse = 1 / pivot;
      for (int i = s + 1; i < full; i++) {
        double entry = matrix[i * full + s];
        if (entry != 0) {
          double factor = entry * inverse;
          int to = i * full;
          matrix[to + s] = factor;
          for (int j = s + 1; j < full; j++) {
            matrix[to + j] -= factor * matrix[at + j];
          }
        }
      }
    }
    return true;
  }

  /** Writes the matrix of the equations that stay. */
  void remaining(double[] out) {
    int pivots = plan.pivots;
    int size = full - pivots;
    for (int i = 0; i < size; i++) {
      System.arraycopy(matrix, (pivots + i) * full + pivots, out, i * size, size);
    }
  }

  /** Carries constants through the elimination and writes those of the equations that stay. */
  void forward(double[] constant, double[] out) {
    for (int i = 0; i < full; i++) {
      carried[i] = constant[plan.row[i]];
    }
    int pivots = plan.pivots;
    for (int s = 0; s < pivots; s++) {
      double amount = carried[s];
      if (amount != 0) {
        for (int i = s + 1; i < full; i++) {
          carried[i] -= matrix[i * full + s] * amount;
        }
      }
    }
    System.arraycopy(carried, pivots, out, 0, full - pivots);
  }

  /** Completes the full vector from the unknowns that stay and the constants last carried. */
  void backward(double[] staying, double[] x) {
    int pivots = plan.pivots;
    System.arraycopy(staying, 0, carried, pivots, full - pivots);
    for (int s = pivots - 1; s >= 0; s--) {
      int at = s * full;
      double sum = carried[s];
      for (int j = s + 1; j < full; j++) {
        sum += matrix[at + j] * carried[j];
      }
      carried[s] = -sum / matrix[at + s];
    }
    for (int j = 0; j < full; j++) {
      x[plan.column[j]] = carried[j];
    }
  }
}
