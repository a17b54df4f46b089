package perveance.engine.numeric;

import static org.junit.jupiter.api.Assertions.assertArrayEquals;
import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertFalse;
import static org.junit.jupiter.api.Assertions.assertThrows;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.util.Random;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.ValueSource;

class DenseLuTest {
  /**
   * Derived: A = [[2, 1], [1, 3]], b = (3, 5), x = (0.8, 1.4) by Cramer's rule. Tolerance: rounding
   * of a few operations.
   */
  @Test
  void solvesTwoEquationsAsByHand() {
    DenseLu lu = new DenseLu(2);
    assertTrue(lu.factor(new double[] {2, 1, 1, 3}));
    double[] b = {3, 5};
    lu.solve(b);
    assertArrayEquals(new double[] {0.8, 1.4}, b, 1e-15);
  }

  /** Derived: a zero on the diagonal needs a row exchange; x = (5, 3). */
  @Test
  void exchangesRowsForAZeroPivot() {
    DenseLu lu = new DenseLu(2);
    assertTrue(lu.factor(new double[] {0, 1, 1, 0}));
    double[] b = {3, 5};
    lu.solve(b);
    assertArrayEquals(new double[] {5, 3}, b, 0);
  }

  /**
   * Derived: the residual A x - b of a backward stable solution is of the order of the rounding of
   * |A| |x| (Golub and Van Loan, section 3.4); 64 roundings are allowed for 40 equations.
   */
  @ParameterizedTest
  @ValueSource(ints = {1, 2, 3, 5, 12, 40})
  void solutionsSatisfyTheEquations(int size) {
    Random random = new Random(20 + size);
    DenseLu lu = new DenseLu(size);
    for (int round = 0; round < 50; round++) {
      double[] matrix = wildMatrix(random, size);
      double[] b = vector(random, size);
      double[] x = b.clone();
      assertTrue(lu.factor(matrix.clone()));
      lu.solve(x);
      assertResidual(matrix, size, 1, x, b);
      double[] y = b.clone();
      lu.solveTransposed(y);
      assertResidual(matrix, size, size, y, b);
    }
  }

  @Test
  void reportsSingularMatrices() {
    assertFalse(new DenseLu(1).factor(new double[] {0}));
    assertFalse(new DenseLu(2).factor(new double[] {1, 2, 2, 4}));
    assertFalse(new DenseLu(2).factor(new double[] {1, 0, 1, 0}));
    assertFalse(new DenseLu(2).factor(new double[] {1, 1, 0, 0}));
    assertFalse(new DenseLu(2).factor(new double[] {1, Double.NaN, 0, 1}));
    assertFalse(new DenseLu(2).factor(new double[] {1, Double.POSITIVE_INFINITY, 0, 1}));
  }

  /**
   * Derived: conductances among nodes with no path to chassis leave the node voltages undetermined;
   * every column of the nodal matrix sums to zero, up to rounding, so the matrix is singular.
   */
  @Test
  void reportsFloatingNetworksWhateverTheirConductances() {
    Random random = new Random(7);
    for (int round = 0; round < 1000; round++) {
      int size = 2 + random.nextInt(10);
      double[] matrix = floatingNetwork(random, size);
      assertFalse(new DenseLu(size).factor(matrix), "floating network of " + size);
    }
  }

  /**
   * Derived: the same networks with one leak of 1e-9 of the largest conductance to chassis are
   * solvable: all of the current driven into a node leaves through the leak at node 0.
   */
  @Test
  void solvesNetworksHeldByASmallLeak() {
    Random random = new Random(8);
    for (int round = 0; round < 1000; round++) {
      int size = 2 + random.nextInt(10);
      double[] matrix = floatingNetwork(random, size);
      double leak = 1e-9 * largest(matrix);
      matrix[0] += leak;
      double[] current = new double[size];
      current[size - 1] = leak;
      DenseLu lu = new DenseLu(size);
      assertTrue(lu.factor(matrix));
      lu.solve(current);
      // one volt across the leak; cancellation may cost nine of sixteen digits
      assertEquals(1.0, current[0], 1e-5);
    }
  }

  @Test
  void judgesSingularityWithoutRegardToUnits() {
    double[] milli = {1e-12, 2e-12, 3e9, 4e9};
    assertTrue(new DenseLu(2).factor(milli));
    double[] tinyColumn = {1e-200, 1, 1e-200, 2};
    assertTrue(new DenseLu(2).factor(tinyColumn));
  }

  @Test
  void refusesMisuse() {
    assertThrows(IllegalArgumentException.class, () -> new DenseLu(0));
    DenseLu lu = new DenseLu(2);
    assertThrows(IllegalArgumentException.class, () -> lu.factor(new double[3]));
    assertThrows(IllegalStateException.class, () -> lu.solve(new double[2]));
    lu.factor(new double[] {1, 1, 1, 1});
    assertThrows(IllegalStateException.class, () -> lu.solve(new double[2]));
    lu.factor(new double[] {1, 0, 0, 1});
    assertThrows(IllegalArgumentException.class, () -> lu.solve(new double[3]));
  }

  private static void assertResidual(double[] a, int size, int stride, double[] x, double[] b) {
    for (int i = 0; i < size; i++) {
      double sum = 0;
      double scale = Math.abs(b[i]);
      for (int j = 0; j < size; j++) {
        double entry = stride == 1 ? a[i * size + j] : a[j * size + i];
        sum += entry * x[j];
        scale += Math.abs(entry * x[j]);
      }
      // growth through pivots is bounded by row scales, which differ by up to 1e6 here
      assertEquals(b[i], sum, 64 * Math.ulp(1.0) * size * Math.max(scale, norm(a, x, size)));
    }
  }

  private static double norm(double[] a, double[] x, int size) {
    double largestX = 0;
    for (int j = 0; j < size; j++) {
      largestX = Math.max(largestX, Math.abs(x[j]));
    }
    return largest(a) * largestX;
  }

  private static double largest(double[] a) {
    double largest = 0;
    for (double entry : a) {
      largest = Math.max(largest, Math.abs(entry));
    }
    return largest;
  }

  private static double[] wildMatrix(Random random, int size) {
    double[] matrix = new double[size * size];
    for (int i = 0; i < size; i++) {
      double rowScale = Math.pow(10, random.nextInt(7) - 3);
      for (int j = 0; j < size; j++) {
        matrix[i * size + j] = random.nextGaussian() * rowScale;
      }
    }
    return matrix;
  }

  private static double[] vector(Random random, int size) {
    double[] vector = new double[size];
    for (int i = 0; i < size; i++) {
      vector[i] = random.nextGaussian();
    }
    return vector;
  }

  private static double[] floatingNetwork(Random random, int size) {
    double[] matrix = new double[size * size];
    for (int i = 1; i < size; i++) {
      connect(matrix, size, i, random.nextInt(i), conductance(random));
      connect(matrix, size, i, random.nextInt(i), conductance(random));
    }
    return matrix;
  }

  private static double conductance(Random random) {
    return Math.pow(10, -3 * random.nextDouble() - 3);
  }

  private static void connect(double[] matrix, int size, int a, int b, double conductance) {
    matrix[a * size + a] += conductance;
    matrix[b * size + b] += conductance;
    matrix[a * size + b] -= conductance;
    matrix[b * size + a] -= conductance;
  }
}
