package perveance.engine.numeric;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertFalse;
import static org.junit.jupiter.api.Assertions.assertThrows;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.util.Random;
import org.junit.jupiter.api.Test;

class InterpolationTest {
  @Test
  void passesThroughItsPoints() {
    double[] x = {-1, 0, 0.5, 4};
    double[] y = {3, 1, 7, 2};
    Interpolation monotone = Interpolation.monotone(x, y);
    Interpolation spline = Interpolation.spline(x, y);
    for (int i = 0; i < x.length; i++) {
      assertEquals(y[i], monotone.value(x[i]), 0);
      assertEquals(y[i], spline.value(x[i]), 0);
    }
  }

  /** Derived: a straight line is reproduced by both, and so is its slope. */
  @Test
  void reproducesStraightLines() {
    double[] x = {0, 1, 3, 7};
    double[] y = {2, 5, 11, 23};
    for (Interpolation curve :
        new Interpolation[] {Interpolation.monotone(x, y), Interpolation.spline(x, y)}) {
      for (double at = 0; at <= 7; at += 0.01) {
        assertEquals(2 + 3 * at, curve.value(at), 1e-13);
        assertEquals(3, curve.slope(at), 1e-13);
      }
    }
    Interpolation two = Interpolation.monotone(new double[] {0, 2}, new double[] {1, 5});
    assertEquals(3, two.value(1), 0);
    assertEquals(3, Interpolation.spline(new double[] {0, 2}, new double[] {1, 5}).value(1), 1e-15);
  }

  /** Property: between rising points the monotone curve never falls, however steep the steps. */
  @Test
  void risesWhereThePointsRise() {
    Random random = new Random(1980);
    for (int round = 0; round < 300; round++) {
      int count = 2 + random.nextInt(8);
      double[] x = new double[count];
      double[] y = new double[count];
      for (int i = 1; i < count; i++) {
        x[i] = x[i - 1] + 0.01 + random.nextDouble();
        y[i] = y[i - 1] + Math.pow(10, -6 * random.nextDouble());
      }
      Interpolation curve = Interpolation.monotone(x, y);
      double before = curve.value(0);
      for (int k = 1; k <= 500; k++) {
        double value = curve.value(Math.min(x[count - 1], x[count - 1] * k / 500));
        assertTrue(value >= before - 1e-15 * y[count - 1], "falls in round " + round);
        before = value;
      }
    }
  }

  /** Derived: a table with a peak keeps its peak; the spline through the same points exceeds it. */
  @Test
  void doesNotSwingBeyondThePoints() {
    double[] x = {0, 1, 2, 3, 4};
    double[] y = {0, 0, 1, 1, 0};
    Interpolation curve = Interpolation.monotone(x, y);
    Interpolation spline = Interpolation.spline(x, y);
    double highest = 0;
    for (double at = 0; at <= 4; at += 0.001) {
      assertTrue(curve.value(at) >= -1e-15 && curve.value(at) <= 1 + 1e-15);
      highest = Math.max(highest, spline.value(at));
    }
    assertTrue(highest > 1.05, "spline " + highest);
  }

  /**
   * Derived: sin from 0 to pi has no second derivative at its ends, as the natural spline; its
   * error is at most 5/384 h^4 (C. A. Hall, J. Approx. Theory 1, 209, 1968), 7.8e-6 for 20 steps.
   */
  @Test
  void splineConvergesToASmoothCurve() {
    double[] x = new double[21];
    double[] y = new double[21];
    for (int i = 0; i <= 20; i++) {
      x[i] = i * Math.PI / 20;
      y[i] = Math.sin(x[i]);
    }
    Interpolation spline = Interpolation.spline(x, y);
    double allowed = 5.0 / 384 * Math.pow(Math.PI / 20, 4);
    for (double at = 0; at <= Math.PI; at += 0.003) {
      assertEquals(Math.sin(at), spline.value(at), allowed);
    }
  }

  /** Property: the slope is that of the value, by central differences of 1e-6. */
  @Test
  void slopeFollowsTheValue() {
    Random random = new Random(4);
    double[] x = {0, 0.3, 1, 2.5, 3};
    for (int round = 0; round < 50; round++) {
      double[] y = random.doubles(5, -1, 1).toArray();
      for (Interpolation curve :
          new Interpolation[] {Interpolation.monotone(x, y), Interpolation.spline(x, y)}) {
        double at = 0.001 + 2.99 * random.nextDouble();
        double difference = (curve.value(at + 1e-6) - curve.value(at - 1e-6)) / 2e-6;
        // a second derivative of up to 100 may jump at a point of the table
        assertEquals(difference, curve.slope(at), 2e-4);
      }
    }
  }

  @Test
  void standsOnlyWithinItsTable() {
    Interpolation curve = Interpolation.monotone(new double[] {1, 2}, new double[] {1, 2});
    assertTrue(curve.covers(1));
    assertTrue(curve.covers(2));
    assertFalse(curve.covers(2.1));
    assertFalse(curve.covers(Double.NaN));
    assertThrows(IllegalArgumentException.class, () -> curve.value(0.9));
    assertThrows(IllegalArgumentException.class, () -> curve.slope(Double.NaN));
  }

  @Test
  void refusesMisuse() {
    double[] one = {1};
    assertThrows(IllegalArgumentException.class, () -> Interpolation.monotone(one, one));
    assertThrows(
        IllegalArgumentException.class,
        () -> Interpolation.spline(new double[] {1, 1}, new double[] {1, 2}));
    assertThrows(
        IllegalArgumentException.class,
        () -> Interpolation.spline(new double[] {1, 2}, new double[] {1, Double.NaN}));
    assertThrows(
        IllegalArgumentException.class,
        () -> Interpolation.spline(new double[] {1, 2}, new double[] {1, 2, 3}));
  }
}
