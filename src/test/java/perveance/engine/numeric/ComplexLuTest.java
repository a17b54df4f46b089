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

class ComplexLuTest {
  /** Derived: (1 + 2j) x = 3 + 4j gives x = (3 + 4j)(1 - 2j) / 5 = 2.2 - 0.4j. */
  @Test
  void dividesComplexNumbers() {
    ComplexLu lu = new ComplexLu(1);
    assertTrue(lu.factor(new double[] {1}, new double[] {2}));
    double[] re = {3};
    double[] im = {4};
    lu.solve(re, im);
    assertEquals(2.2, re[0], 1e-15);
    assertEquals(-0.4, im[0], 1e-15);
  }

  /** Derived: with no imaginary part the answer is that of the real solver, to rounding. */
  @Test
  void agreesWithTheRealSolver() {
    Random random = new Random(3);
    double[] matrix = gaussian(random, 25);
    double[] b = gaussian(random, 5);
    DenseLu dense = new DenseLu(5);
    dense.factor(matrix.clone());
    double[] expected = b.clone();
    dense.solve(expected);
    ComplexLu lu = new ComplexLu(5);
    lu.factor(matrix, new double[25]);
    double[] im = new double[5];
    lu.solve(b, im);
    assertArrayEquals(expected, b, 1e-13);
    assertArrayEquals(new double[5], im, 0);
  }

  /** Derived: A x = b must hold to the rounding of the products, plain and transposed. */
  @ParameterizedTest
  @ValueSource(ints = {1, 2, 3, 7, 20})
  void solutionsSatisfyTheEquations(int size) {
    Random random = new Random(50 + size);
    ComplexLu lu = new ComplexLu(size);
    for (int round = 0; round < 50; round++) {
      double[] re = gaussian(random, size * size);
      double[] im = gaussian(random, size * size);
      double[] bRe = gaussian(random, size);
      double[] bIm = gaussian(random, size);
      assertTrue(lu.factor(re.clone(), im.clone()));
      double[] xRe = bRe.clone();
      double[] xIm = bIm.clone();
      lu.solve(xRe, xIm);
      assertSatisfied(re, im, xRe, xIm, bRe, bIm, false);
      double[] yRe = bRe.clone();
      double[] yIm = bIm.clone();
      lu.solveTransposed(yRe, yIm);
      assertSatisfied(re, im, yRe, yIm, bRe, bIm, true);
    }
  }

  @Test
  void reportsSingularMatrices() {
    ComplexLu lu = new ComplexLu(2);
    // the second row is j times the first
    assertFalse(lu.factor(new double[] {1, 2, 0, 0}, new double[] {0, 0, 1, 2}));
    assertFalse(lu.factor(new double[4], new double[4]));
    assertFalse(lu.factor(new double[] {1, 0, 0, 1}, new double[] {0, Double.NaN, 0, 0}));
  }

  /**
   * Derived: (a + bj)(c + dj) must not overflow on the way: 1e300 (1 + j) x = 1e300 gives (1-j)/2.
   */
  @Test
  void invertsHugePivots() {
    ComplexLu lu = new ComplexLu(1);
    assertTrue(lu.factor(new double[] {8e307}, new double[] {8e307}));
    double[] re = {8e307};
    double[] im = {0};
    lu.solve(re, im);
    assertEquals(0.5, re[0], 1e-15);
    assertEquals(-0.5, im[0], 1e-15);
  }

  @Test
  void refusesMisuse() {
    assertThrows(IllegalArgumentException.class, () -> new ComplexLu(0));
    ComplexLu lu = new ComplexLu(2);
    assertThrows(IllegalArgumentException.class, () -> lu.factor(new double[4], new double[3]));
    assertThrows(IllegalStateException.class, () -> lu.solve(new double[2], new double[2]));
  }

  private static void assertSatisfied(
      double[] re,
      double[] im,
      double[] xRe,
      double[] xIm,
      double[] bRe,
      double[] bIm,
      boolean transposed) {
    int size = bRe.length;
    double largestX = 0;
    for (int j = 0; j < size; j++) {
      largestX = Math.max(largestX, Math.hypot(xRe[j], xIm[j]));
    }
    for (int i = 0; i < size; i++) {
      double sumRe = -bRe[i];
      double sumIm = -bIm[i];
      for (int j = 0; j < size; j++) {
        int place = transposed ? j * size + i : i * size + j;
        sumRe += re[place] * xRe[j] - im[place] * xIm[j];
        sumIm += re[place] * xIm[j] + im[place] * xRe[j];
      }
      // entries are of order 5 at most; 64 roundings a term
      double allowed = 64 * 5 * size * Math.ulp(1.0) * Math.max(1, largestX);
      assertEquals(0, sumRe, allowed);
      assertEquals(0, sumIm, allowed);
    }
  }

  private static double[] gaussian(Random random, int length) {
    double[] vector = new double[length];
    for (int i = 0; i < length; i++) {
      vector[i] = random.nextGaussian();
    }
    return vector;
  }
}
