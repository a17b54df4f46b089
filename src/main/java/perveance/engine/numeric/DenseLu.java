package perveance.engine.numeric;

/**
 * Solves small dense systems of real equations by triangular factors with partial pivoting (Crout's
 * and Doolittle's method; G. H. Golub and C. F. Van Loan, Matrix Computations, 4th ed., sections
 * 3.2 and 3.4). Made for the inner loops of the circuit engine: after construction nothing is
 * allocated, and factors serve any number of right-hand sides.
 *
 * <p>Pivots are compared after dividing each row by its largest entry, so that a row in siemens and
 * a row in plain numbers are treated alike. A matrix counts as singular when a pivot, measured
 * against its row's and its column's largest entry, is down in the rounding of the entries it came
 * from: then no digit of a solution could be trusted.
 *
 * <p>Not for use by two threads at once.
 */
public final class DenseLu {
  private static final double ROUNDING = 2.0 * Math.ulp(1.0);

  private final int size;
  private final int[] swaps;
  private final double[] rowScale;
  private final double[] rowInverse;
  private final double[] columnScale;
  private double[] factors;
  private boolean factored;

  /**
   * Creates a solver for systems of one size.
   *
   * @param size the number of equations, 1 or more
   */
  public DenseLu(int size) {
    if (size < 1) {
      throw new IllegalArgumentException("size is below 1: " + size);
    }
    this.size = size;
    this.swaps = new int[size];
    this.rowScale = new double[size];
    this.rowInverse = new double[size];
    this.columnScale = new double[size];
    this.factors = new double[0];
  }

  /**
   * Returns the number of equations.
   *
   * @return the size
   */
  public int size() {
    return size;
  }

  /**
   * Factors a matrix in place. The array is kept and must not be changed while the factors are in
   * use.
   *
   * @param matrix size x size entries, row by row; overwritten by the factors [any units]
   * @return false if the matrix is singular or holds a number that is not finite; it is then spoilt
   *     and nothing can be solved
   */
  public boolean factor(double[] matrix) {
    if (matrix.length != size * size) {
      throw new IllegalArgumentException(
          "matrix has " + matrix.length + " entries, not " + size * size);
    }
    factors = matrix;
    factored = scale(matrix);
    for (int k = 0; k < size && factored; k++) {
      int pivotRow = pivotRow(matrix, k);
      swaps[k] = pivotRow;
      swapRows(matrix, k, pivotRow);
      double least = ROUNDING * size * columnScale[k] * rowScale[k];
      if (Math.abs(matrix[k * size + k]) > least) {
        eliminate(matrix, k);
      } else {
        factored = false;
      }
    }
    return factored;
  }

  private boolean scale(double[] matrix) {
    for (int i = 0; i < size; i++) {
      double largest = 0;
      for (int j = 0; j < size; j++) {
        double entry = Math.abs(matrix[i * size + j]);
        if (!(entry <= Double.MAX_VALUE)) {
          return false;
        }
        if (entry > largest) {
          largest = entry;
        }
      }
      if (largest == 0) {
        return false;
      }
      rowScale[i] = largest;
      // the smallest numbers have no finite inverse
      rowInverse[i] = Math.min(Double.MAX_VALUE, 1 / largest);
    }
    scaleColumns(matrix);
    return true;
  }

  private void scaleColumns(double[] matrix) {
    for (int j = 0; j < size; j++) {
      columnScale[j] = 0;
    }
    for (int i = 0; i < size; i++) {
      double inverse = rowInverse[i];
      for (int j = 0; j < size; j++) {
        double entry = Math.abs(matrix[i * size + j]) * inverse;
        if (entry > columnScale[j]) {
          columnScale[j] = entry;
        }
      }
    }
  }

  private int pivotRow(double[] matrix, int k) {
    int best = k;
    double largest = -1;
    for (int i = k; i < size; i++) {
      double scaled = Math.abs(matrix[i * size + k]) * rowInverse[i];
      if (scaled > largest) {
        largest = scaled;
        best = i;
      }
    }
    return best;
  }

  private void swapRows(double[] matrix, int a, int b) {
    if (a == b) {
      return;
    }
    for (int j = 0; j < size; j++) {
      double kept = matrix[a * size + j];
      matrix[a * size + j] = matrix[b * size + j];
      matrix[b * size + j] = kept;
    }
    double kept = rowScale[a];
    rowScale[a] = rowScale[b];
    rowScale[b] = kept;
    kept = rowInverse[a];
    rowInverse[a] = rowInverse[b];
    rowInverse[b] = kept;
  }

  private void eliminate(double[] matrix, int k) {
    double inverse = 1 / matrix[k * size + k];
    for (int i = k + 1; i < size; i++) {
      double below = matrix[i * size + k];
      if (below != 0) {
        double factor = below * inverse;
        matrix[i * size + k] = factor;
        for (int j = k + 1; j < size; j++) {
          matrix[i * size + j] -= factor * matrix[k * size + j];
        }
      }
    }
  }

  /**
   * Solves A x = b with the factors of A.
   *
   * @param rightHandSide b, one entry for each equation; overwritten by x [any units]
   */
  public void solve(double[] rightHandSide) {
    requireReady(rightHandSide);
    for (int k = 0; k < size; k++) {
      swapEntries(rightHandSide, k, swaps[k]);
    }
    for (int i = 1; i < size; i++) {
      double sum = rightHandSide[i];
      for (int j = 0; j < i; j++) {
        sum -= factors[i * size + j] * rightHandSide[j];
      }
      rightHandSide[i] = sum;
    }
    for (int i = size - 1; i >= 0; i--) {
      double sum = rightHandSide[i];
      for (int j = i + 1; j < size; j++) {
        sum -= factors[i * size + j] * rightHandSide[j];
      }
      rightHandSide[i] = sum / factors[i * size + i];
    }
  }

  /**
   * Solves with the transposed matrix, A^T x = b, with the factors of A: one such solution gives
   * the effect of every source on one output.
   *
   * @param rightHandSide b, one entry for each unknown of A; overwritten by x [any units]
   */
  public void solveTransposed(double[] rightHandSide) {
    requireReady(rightHandSide);
    for (int i = 0; i < size; i++) {
      double sum = rightHandSide[i];
      for (int j = 0; j < i; j++) {
        sum -= factors[j * size + i] * rightHandSide[j];
      }
      rightHandSide[i] = sum / factors[i * size + i];
    }
    for (int i = size - 1; i >= 0; i--) {
      double sum = rightHandSide[i];
      for (int j = i + 1; j < size; j++) {
        sum -= factors[j * size + i] * rightHandSide[j];
      }
      rightHandSide[i] = sum;
    }
    for (int k = size - 1; k >= 0; k--) {
      swapEntries(rightHandSide, k, swaps[k]);
    }
  }

  private void requireReady(double[] rightHandSide) {
    if (!factored) {
      throw new IllegalStateException("no matrix is factored");
    }
    if (rightHandSide.length != size) {
      throw new IllegalArgumentException(
          "rightHandSide has " + rightHandSide.length + " entries, not " + size);
    }
  }

  private static void swapEntries(double[] vector, int a, int b) {
    double kept = vector[a];
    vector[a] = vector[b];
    vector[b] = kept;
  }
}
