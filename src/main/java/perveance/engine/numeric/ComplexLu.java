package perveance.engine.numeric;

/**
 * Solves small dense systems of complex equations; the complex counterpart of {@link DenseLu}, with
 * the same pivoting, the same test for singularity and the same promise to allocate nothing after
 * construction. Real and imaginary parts live in separate arrays.
 *
 * <p>Not for use by two threads at once.
 */
public final class ComplexLu {
  private static final double ROUNDING = 2.0 * Math.ulp(1.0);

  private final int size;
  private final int[] swaps;
  private final double[] rowScale;
  private final double[] columnScale;
  private final double[] pivotInverseReal;
  private final double[] pivotInverseImaginary;
  private double[] real;
  private double[] imaginary;
  private boolean factored;

  /**
   * Creates a solver for systems of one size.
   *
   * @param size the number of equations, 1 or more
   */
  public ComplexLu(int size) {
    if (size < 1) {
      throw new IllegalArgumentException("size is below 1: " + size);
    }
    this.size = size;
    this.swaps = new int[size];
    this.rowScale = new double[size];
    this.columnScale = new double[size];
    this.pivotInverseReal = new double[size];
    this.pivotInverseImaginary = new double[size];
    this.real = new double[0];
    this.imaginary = new double[0];
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
   * Factors a matrix in place. The arrays are kept and must not be changed while the factors are in
   * use.
   *
   * @param matrixReal real parts, size x size entries, row by row; overwritten [any units]
   * @param matrixImaginary imaginary parts, likewise; overwritten [any units]
   * @return false if the matrix is singular or holds a number that is not finite; it is then spoilt
   *     and nothing can be solved
   */
  public boolean factor(double[] matrixReal, double[] matrixImaginary) {
    requireLength(matrixReal, size * size, "matrixReal");
    requireLength(matrixImaginary, size * size, "matrixImaginary");
    real = matrixReal;
    imaginary = matrixImaginary;
    factored = scale();
    for (int k = 0; k < size && factored; k++) {
      int pivotRow = pivotRow(k);
      swaps[k] = pivotRow;
      swapRows(k, pivotRow);
      double least = ROUNDING * size * columnScale[k] * rowScale[k];
      if (magnitude(k * size + k) > least) {
        invertPivot(k);
        eliminate(k);
      } else {
        factored = false;
      }
    }
    return factored;
  }

  /** The sum of the parts' sizes: within a factor of 1.41 of the modulus, and cheaper. */
  private double magnitude(int index) {
    return Math.abs(real[index]) + Math.abs(imaginary[index]);
  }

  private boolean scale() {
    for (int i = 0; i < size; i++) {
      double largest = 0;
      for (int j = 0; j < size; j++) {
        double entry = magnitude(i * size + j);
        if (!(entry <= Double.MAX_VALUE)) {
          return false;
        }
        largest = Math.max(largest, entry);
      }
      if (largest == 0) {
        return false;
      }
      rowScale[i] = largest;
    }
    for (int j = 0; j < size; j++) {
      double largest = 0;
      for (int i = 0; i < size; i++) {
        largest = Math.max(largest, magnitude(i * size + j) / rowScale[i]);
      }
      columnScale[j] = largest;
    }
    return true;
  }

  private int pivotRow(int k) {
    int best = k;
    double largest = -1;
    for (int i = k; i < size; i++) {
      double scaled = magnitude(i * size + k) / rowScale[i];
      if (scaled > largest) {
        largest = scaled;
        best = i;
      }
    }
    return best;
  }

  private void swapRows(int a, int b) {
    if (a == b) {
      return;
    }
    for (int j = 0; j < size; j++) {
      swapEntries(real, a * size + j, b * size + j);
      swapEntries(imaginary, a * size + j, b * size + j);
    }
    swapEntries(rowScale, a, b);
  }

  /** One over the pivot, scaled against overflow (R. L. Smith, Comm. ACM 5, 435, 1962). */
  private void invertPivot(int k) {
    double re = real[k * size + k];
    double im = imaginary[k * size + k];
    if (Math.abs(re) >= Math.abs(im)) {
      double ratio = im / re;
      double divisor = re + im * ratio;
      pivotInverseReal[k] = 1.0 / divisor;
      pivotInverseImaginary[k] = -ratio / divisor;
    } else {
      double ratio = re / im;
      double divisor = re * ratio + im;
      pivotInverseReal[k] = ratio / divisor;
      pivotInverseImaginary[k] = -1.0 / divisor;
    }
  }

  private void eliminate(int k) {
    double inverseRe = pivotInverseReal[k];
    double inverseIm = pivotInverseImaginary[k];
    for (int i = k + 1; i < size; i++) {
      int first = i * size + k;
      double re = real[first];
      double im = imaginary[first];
      if (re == 0 && im == 0) {
        continue;
      }
      double factorRe = re * inverseRe - im * inverseIm;
      double factorIm = re * inverseIm + im * inverseRe;
      real[first] = factorRe;
      imaginary[first] = factorIm;
      for (int j = k + 1; j < size; j++) {
        int above = k * size + j;
        int here = i * size + j;
        real[here] -= factorRe * real[above] - factorIm * imaginary[above];
        imaginary[here] -= factorRe * imaginary[above] + factorIm * real[above];
      }
    }
  }

  /**
   * Solves A x = b with the factors of A.
   *
   * @param bReal real parts of b, one for each equation; overwritten by those of x [any units]
   * @param bImaginary imaginary parts of b; overwritten by those of x [any units]
   */
  public void solve(double[] bReal, double[] bImaginary) {
    requireReady(bReal, bImaginary);
    for (int k = 0; k < size; k++) {
      swapEntries(bReal, k, swaps[k]);
      swapEntries(bImaginary, k, swaps[k]);
    }
    for (int i = 1; i < size; i++) {
      subtractProducts(bReal, bImaginary, i, i * size, 1, 0, i);
    }
    for (int i = size - 1; i >= 0; i--) {
      subtractProducts(bReal, bImaginary, i, i * size, 1, i + 1, size);
      divideByPivot(bReal, bImaginary, i);
    }
  }

  /**
   * Solves with the transposed matrix (not the conjugate), A^T x = b, with the factors of A: one
   * such solution gives the effect of every source on one output.
   *
   * @param bReal real parts of b, one for each unknown of A; overwritten by those of x [any units]
   * @param bImaginary imaginary parts of b; overwritten by those of x [any units]
   */
  public void solveTransposed(double[] bReal, double[] bImaginary) {
    requireReady(bReal, bImaginary);
    for (int i = 0; i < size; i++) {
      subtractProducts(bReal, bImaginary, i, i, size, 0, i);
      divideByPivot(bReal, bImaginary, i);
    }
    for (int i = size - 1; i >= 0; i--) {
      subtractProducts(bReal, bImaginary, i, i, size, i + 1, size);
    }
    for (int k = size - 1; k >= 0; k--) {
      swapEntries(bReal, k, swaps[k]);
      swapEntries(bImaginary, k, swaps[k]);
    }
  }

  /** Takes from entry i the products of the factors at offset + stride j with the entries j. */
  private void subtractProducts(
      double[] bReal, double[] bImaginary, int i, int offset, int stride, int from, int to) {
    double sumRe = bReal[i];
    double sumIm = bImaginary[i];
    for (int j = from; j < to; j++) {
      double re = real[offset + stride * j];
      double im = imaginary[offset + stride * j];
      sumRe -= re * bReal[j] - im * bImaginary[j];
      sumIm -= re * bImaginary[j] + im * bReal[j];
    }
    bReal[i] = sumRe;
    bImaginary[i] = sumIm;
  }

  private void divideByPivot(double[] bReal, double[] bImaginary, int i) {
    double re = bReal[i];
    double im = bImaginary[i];
    bReal[i] = re * pivotInverseReal[i] - im * pivotInverseImaginary[i];
    bImaginary[i] = re * pivotInverseImaginary[i] + im * pivotInverseReal[i];
  }

  private void requireReady(double[] bReal, double[] bImaginary) {
    if (!factored) {
      throw new IllegalStateException("no matrix is factored");
    }
    requireLength(bReal, size, "bReal");
    requireLength(bImaginary, size, "bImaginary");
  }

  private static void requireLength(double[] array, int length, String name) {
    if (array.length != length) {
      throw new IllegalArgumentException(name + " has " + array.length + " entries, not " + length);
    }
  }

  private static void swapEntries(double[] vector, int a, int b) {
    double kept = vector[a];
    vector[a] = vector[b];
    vector[b] = kept;
  }
}
