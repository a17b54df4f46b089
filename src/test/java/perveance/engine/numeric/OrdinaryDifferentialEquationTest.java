package perveance.engine.numeric;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertInstanceOf;
import static org.junit.jupiter.api.Assertions.assertThrows;

import org.junit.jupiter.api.Test;

class OrdinaryDifferentialEquationTest {
  /** Derived: y' = -y from 1 is exp(-x); tolerance ten steps' worth of the error allowed. */
  @Test
  void followsADecay() {
    OrdinaryDifferentialEquation decay =
        new OrdinaryDifferentialEquation((x, y, slope) -> slope[0] = -y[0], 1, 1e-12);
    double[][] states = reached(decay.follow(new double[] {0, 1, 2, 5}, new double[] {1})).states();
    assertEquals(1, states[0][0]);
    assertEquals(Math.exp(-1), states[1][0], 1e-11);
    assertEquals(Math.exp(-2), states[2][0], 1e-11);
    assertEquals(Math.exp(-5), states[3][0], 1e-11);
  }

  /** Derived: y'' = -y from (0, 1) backwards is sin; two equations, descending points. */
  @Test
  void followsAnOscillationBackwards() {
    OrdinaryDifferentialEquation oscillator =
        new OrdinaryDifferentialEquation(
            (x, y, slope) -> {
              slope[0] = y[1];
              slope[1] = -y[0];
            },
            2,
            1e-12);
    double[] last = reached(oscillator.follow(new double[] {0, -20}, new double[] {0, 1})).last();
    assertEquals(Math.sin(-20), last[0], 1e-10);
    assertEquals(Math.cos(-20), last[1], 1e-10);
  }

  /**
   * Published: the function beta^2 of the space-charge current between cylinders (I. Langmuir and
   * K. B. Blodgett, Phys. Rev. 22, 347, 1923), 3 b b'' + b'^2 + 4 b b' + b^2 = 1 over the logarithm
   * g of the ratio of radii. Printed values have four decimals, the last one three; one unit of the
   * last digit is allowed, because the table cuts digits off rather than rounding them (its 1.0946
   * at 42 stands for 1.09466).
   */
  @Test
  void findsTheCylinderFunctionOfLangmuirAndBlodgett() {
    double[] ratios = {1.5, 2, 3, 4, 5, 6, 10, 20, 42, 100, 1000};
    double[] printed = {
      0.1193, 0.2793, 0.5170, 0.6671, 0.7666, 0.8362, 0.9782, 1.0715, 1.0946, 1.0782, 1.017
    };
    double[] betaSquared = cylinderFunction(ratios);
    for (int i = 0; i < ratios.length; i++) {
      double unit = ratios[i] == 1000 ? 0.001 : 0.0001;
      assertEquals(printed[i], betaSquared[i], unit, "ratio " + ratios[i]);
    }
  }

  /**
   * Published: the same function by the power series of the same paper, coefficients to 14 terms.
   * Derived tolerance: the coefficients have six to ten digits, which leaves five decimals up to a
   * ratio of 20; half of the last is allowed.
   */
  @Test
  void agreesWithTheSeriesOfLangmuirAndBlodgett() {
    double[] coefficients = {
      1,
      -0.4,
      0.09166667,
      -0.01424242,
      0.001679275,
      -0.0001612219,
      0.00001293486,
      -8.87693e-7,
      5.46192e-8,
      -2.94843e-9,
      1.36026e-10,
      -7.1101e-12,
      2.6644e-13,
      1.2526e-15
    };
    double[] ratios = {1.1, 1.25, 1.5, 2, 3, 5, 8, 10, 20};
    double[] betaSquared = cylinderFunction(ratios);
    for (int i = 0; i < ratios.length; i++) {
      double g = Math.log(ratios[i]);
      double beta = 0;
      for (int n = coefficients.length - 1; n >= 0; n--) {
        beta = (beta + coefficients[n]) * g;
      }
      assertEquals(beta * beta, betaSquared[i], 5e-6, "ratio " + ratios[i]);
    }
  }

  /**
   * Follows the equation from near the cathode, where b = g - 2/5 g^2 + 11/120 g^3 - 47/3300 g^4.
   */
  private static double[] cylinderFunction(double[] ratios) {
    OrdinaryDifferentialEquation cylinder =
        new OrdinaryDifferentialEquation(
            (g, b, slope) -> {
              slope[0] = b[1];
              slope[1] = (1 - b[1] * b[1] - 4 * b[0] * b[1] - b[0] * b[0]) / (3 * b[0]);
            },
            2,
            1e-12);
    double g = 0.01;
    double[] points = new double[ratios.length + 1];
    points[0] = g;
    for (int i = 0; i < ratios.length; i++) {
      points[i + 1] = Math.log(ratios[i]);
    }
    double b = g - 2.0 / 5 * g * g + 11.0 / 120 * g * g * g - 47.0 / 3300 * Math.pow(g, 4);
    double slope = 1 - 4.0 / 5 * g + 11.0 / 40 * g * g - 47.0 / 825 * g * g * g;
    double[][] states = reached(cylinder.follow(points, new double[] {b, slope})).states();
    double[] betaSquared = new double[ratios.length];
    for (int i = 0; i < ratios.length; i++) {
      betaSquared[i] = states[i + 1][0] * states[i + 1][0];
    }
    return betaSquared;
  }

  /** Derived: y' = y^2 from 1 is 1/(1 - x), which has no value from x = 1 on. */
  @Test
  void saysWhenTheEndIsBeyondReach() {
    OrdinaryDifferentialEquation runaway =
        new OrdinaryDifferentialEquation((x, y, slope) -> slope[0] = y[0] * y[0], 1, 1e-9);
    DifferentialOutcome.NotReached outcome =
        assertInstanceOf(
            DifferentialOutcome.NotReached.class,
            runaway.follow(new double[] {0, 2}, new double[] {1}));
    assertEquals(1, outcome.lastPoint(), 0.01);
  }

  @Test
  void saysWhenASlopeIsNotFinite() {
    OrdinaryDifferentialEquation broken =
        new OrdinaryDifferentialEquation((x, y, slope) -> slope[0] = Math.log(1 - x), 1, 1e-9);
    DifferentialOutcome.NotReached outcome =
        assertInstanceOf(
            DifferentialOutcome.NotReached.class,
            broken.follow(new double[] {0, 3}, new double[] {0}));
    assertEquals("a slope is not finite", outcome.reason());
  }

  @Test
  void refusesMisuse() {
    OrdinaryDifferentialEquation.Slopes none = (x, y, slope) -> slope[0] = 0;
    assertThrows(
        IllegalArgumentException.class, () -> new OrdinaryDifferentialEquation(none, 0, 1e-9));
    assertThrows(
        IllegalArgumentException.class, () -> new OrdinaryDifferentialEquation(none, 1, 1));
    OrdinaryDifferentialEquation flat = new OrdinaryDifferentialEquation(none, 1, 1e-9);
    double[] start = {0};
    assertThrows(IllegalArgumentException.class, () -> flat.follow(new double[] {0}, start));
    assertThrows(IllegalArgumentException.class, () -> flat.follow(new double[] {0, 1, 1}, start));
    assertThrows(
        IllegalArgumentException.class, () -> flat.follow(new double[] {0, 1, 0.5}, start));
    assertThrows(
        IllegalArgumentException.class, () -> flat.follow(new double[] {0, 1}, new double[2]));
    assertThrows(
        IllegalArgumentException.class,
        () -> flat.follow(new double[] {0, 1}, new double[] {Double.NaN}));
  }

  private static DifferentialOutcome.Reached reached(DifferentialOutcome outcome) {
    return assertInstanceOf(DifferentialOutcome.Reached.class, outcome, () -> outcome.toString());
  }
}
