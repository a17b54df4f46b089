package perveance.engine.numeric;

import static org.junit.jupiter.api.Assertions.assertArrayEquals;
import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertInstanceOf;
import static org.junit.jupiter.api.Assertions.assertThrows;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.util.Arrays;
import java.util.List;
import java.util.Random;
import org.junit.jupiter.api.Test;

class LeastSquaresTest {
  /** Derived: a straight line through (0, 1), (1, 3), (2, 4): normal equations give 7/6 + 3/2 x. */
  @Test
  void fitsALineAsByHand() {
    double[] x = {0, 1, 2};
    FitOutcome.Fitted fitted =
        fitted(LeastSquares.fit(line(x), lineParameters(), new double[] {1, 3, 4}, ones(3)));
    assertArrayEquals(new double[] {7.0 / 6, 1.5}, fitted.parameters(), 1e-9);
    assertArrayEquals(new double[] {-1.0 / 6, 1.0 / 3, -1.0 / 6}, fitted.residuals(), 1e-9);
    // (A^T A)^-1 = [[5, -3], [-3, 3]] / 6; slopes by differences are good to about 1e-10
    assertEquals(5.0 / 6, fitted.covariance()[0][0], 1e-8);
    assertEquals(-0.5, fitted.covariance()[0][1], 1e-8);
    assertEquals(0.5, fitted.covariance()[1][1], 1e-8);
    assertEquals(1.0 / 6, fitted.reducedChiSquare().orElseThrow(), 1e-9);
    assertEquals(Math.sqrt(1.0 / 18), fitted.rms(), 1e-9);
    assertTrue(fitted.distrusted().isEmpty());
  }

  /** Derived: observations of 1 and 3 with deviations 1 and 2 have the weighted mean 1.4. */
  @Test
  void weighsByDeviation() {
    FitOutcome.Fitted fitted =
        fitted(
            LeastSquares.fit(
                (p, y) -> Arrays.fill(y, p[0]),
                List.of(FitParameter.free("mean", 0, 1)),
                new double[] {1, 3},
                new double[] {1, 2}));
    assertEquals(1.4, fitted.parameters()[0], 1e-9);
    assertEquals(Math.sqrt(0.8), fitted.standardDeviation(0), 1e-8);
  }

  /**
   * Derived: exact data of a law come back, over twelve powers of ten in the parameters, through
   * every kind of domain.
   */
  @Test
  void recoversTheParametersOfExactData() {
    Random random = new Random(11);
    double[] x = {0.1, 0.5, 1, 2, 3, 5, 8, 13};
    for (int round = 0; round < 200; round++) {
      double size = Math.pow(10, 12 * random.nextDouble() - 9);
      double rate = 0.1 + random.nextDouble();
      double share = 0.05 + 0.9 * random.nextDouble();
      Prediction law = (p, y) -> decay(x, p, y);
      double[] truth = {size, rate, share};
      double[] observed = new double[x.length];
      law.predict(truth, observed);
      double[] deviation = new double[x.length];
      Arrays.fill(deviation, 0.01 * size);
      FitOutcome.Fitted fitted =
          fitted(
              LeastSquares.fit(
                  law,
                  List.of(
                      FitParameter.positive("size", 3 * size),
                      FitParameter.free("rate", 0.5, 0.5),
                      FitParameter.between("share", 0.5, 0, 1)),
                  observed,
                  deviation));
      // near-collinear cases lose about half of the digits
      assertEquals(1, fitted.parameters()[0] / truth[0], 1e-6);
      assertEquals(truth[1], fitted.parameters()[1], 1e-6);
      assertEquals(truth[2], fitted.parameters()[2], 1e-6);
    }
  }

  /** A best value beyond a bound is held there, said so, and left out of the covariance. */
  @Test
  void saysWhichParameterIsAtItsBound() {
    double[] x = {0, 1, 2};
    FitOutcome.Fitted fitted =
        fitted(
            LeastSquares.fit(
                line(x),
                List.of(
                    FitParameter.free("offset", 0, 1), FitParameter.between("slope", 0.5, 0, 1)),
                new double[] {0, 2, 4},
                ones(3)));
    assertEquals(List.of("slope"), fitted.atBound());
    assertEquals(1, fitted.parameters()[1], 1e-5);
    assertEquals(1, fitted.parameters()[0], 1e-5);
    assertEquals(0, fitted.covariance()[1][1]);
    // the offset alone: one over the number of observations
    assertEquals(1.0 / 3, fitted.covariance()[0][0], 1e-6);
  }

  @Test
  void saysWhatTheObservationsDoNotDetermine() {
    double[] x = {1, 2, 3};
    FitOutcome.NotFitted together =
        notFitted(
            LeastSquares.fit(
                (p, y) -> Arrays.setAll(y, i -> (p[0] + p[1]) * x[i] + p[2]),
                List.of(
                    FitParameter.free("a", 1, 1),
                    FitParameter.free("b", 2, 1),
                    FitParameter.free("c", 1, 1)),
                new double[] {1, 2, 4},
                ones(3)));
    assertEquals("the observations do not determine a and b", together.reason());
    assertEquals(3, together.lastParameters().length);
    FitOutcome.NotFitted alone =
        notFitted(
            LeastSquares.fit(
                (p, y) -> Arrays.setAll(y, i -> p[0] * x[i]),
                List.of(FitParameter.free("a", 1, 1), FitParameter.free("idle", 2, 1)),
                new double[] {1, 2, 4},
                ones(3)));
    assertEquals("the observations do not determine idle", alone.reason());
  }

  @Test
  void saysWhenThePredictionIsNotFinite() {
    FitOutcome.NotFitted outcome =
        notFitted(
            LeastSquares.fit(
                (p, y) -> Arrays.fill(y, Double.NaN),
                List.of(FitParameter.free("a", 1, 1)),
                new double[] {1},
                ones(1)));
    assertTrue(outcome.reason().contains("not finite at the start"), outcome.reason());
  }

  /** Steps into a region where the law has no value are refused, and the fit goes on. */
  @Test
  void keepsOutOfRegionsWithoutAValue() {
    double[] x = {1, 4, 9};
    FitOutcome.Fitted fitted =
        fitted(
            LeastSquares.fit(
                (p, y) -> Arrays.setAll(y, i -> Math.sqrt(x[i] - p[0])),
                List.of(FitParameter.free("a", -50, 1)),
                new double[] {Math.sqrt(0.5), Math.sqrt(3.5), Math.sqrt(8.5)},
                ones(3)));
    assertEquals(0.5, fitted.parameters()[0], 1e-8);
  }

  /**
   * Derived: atan(ln p) is flat at p = e^60, and the first step, -0.447 x 3601, would carry the
   * logarithm to -1550, where p rounds to 0. The law must never see that.
   */
  @Test
  void aStepThatWouldRoundAPositiveParameterToNothingIsRefused() {
    FitOutcome.Fitted fitted =
        fitted(
            LeastSquares.fit(
                (p, y) -> {
                  assertTrue(p[0] > 0 && Double.isFinite(p[0]), () -> "asked at " + p[0]);
                  y[0] = Math.atan(Math.log(p[0]));
                },
                List.of(FitParameter.positive("p", Math.exp(60))),
                new double[] {Math.atan(2)},
                ones(1)));
    assertEquals(Math.exp(2), fitted.parameters()[0], 1e-6);
  }

  /** Derived: a line with two wild readings among twenty; the rest lie exactly on 2 + 3 x. */
  @Test
  void robustFitSetsOutliersAside() {
    double[] x = new double[20];
    double[] y = new double[20];
    for (int i = 0; i < 20; i++) {
      x[i] = i;
      y[i] = 2 + 3 * i;
    }
    y[4] += 40;
    y[15] -= 25;
    FitOutcome.Fitted fitted =
        fitted(LeastSquares.fitRobustly(line(x), lineParameters(), y, ones(20)));
    assertEquals(List.of(4, 15), fitted.distrusted());
    // Huber's estimate keeps a pull of 1.345 scatters, and the scatter goes to zero here
    assertEquals(2, fitted.parameters()[0], 1e-3);
    assertEquals(3, fitted.parameters()[1], 1e-4);
    FitOutcome.Fitted plain = fitted(LeastSquares.fit(line(x), lineParameters(), y, ones(20)));
    assertTrue(Math.abs(plain.parameters()[0] - 2) > 1, "an ordinary fit is pulled away");
  }

  /**
   * Derived: with normal errors few are distrusted (0.27 % lie beyond three deviations) and the
   * estimate stays within four standard deviations of the truth.
   */
  @Test
  void robustFitTrustsHonestScatter() {
    SeededNormal normal = new SeededNormal(5, 0);
    int distrusted = 0;
    for (int round = 0; round < 100; round++) {
      double[] x = new double[30];
      double[] y = new double[30];
      for (int i = 0; i < 30; i++) {
        x[i] = i / 10.0;
        y[i] = 2 + 3 * x[i] + 0.1 * normal.next();
      }
      double[] deviation = new double[30];
      Arrays.fill(deviation, 0.1);
      FitOutcome.Fitted fitted =
          fitted(LeastSquares.fitRobustly(line(x), lineParameters(), y, deviation));
      distrusted += fitted.distrusted().size();
      assertEquals(3, fitted.parameters()[1], 5 * fitted.standardDeviation(1));
    }
    assertTrue(distrusted < 45, "distrusted " + distrusted + " of 3000");
  }

  @Test
  void refusesMisuse() {
    double[] x = {0, 1};
    List<FitParameter> two = lineParameters();
    assertThrows(
        IllegalArgumentException.class,
        () -> LeastSquares.fit(line(x), two, new double[] {1}, ones(1)));
    assertThrows(
        IllegalArgumentException.class,
        () -> LeastSquares.fit(line(x), two, new double[] {1, Double.NaN}, ones(2)));
    assertThrows(
        IllegalArgumentException.class,
        () -> LeastSquares.fit(line(x), two, new double[] {1, 1}, new double[] {1, 0}));
    assertThrows(
        IllegalArgumentException.class,
        () -> LeastSquares.fit(line(x), two, new double[] {1, 1}, ones(3)));
    assertThrows(IllegalArgumentException.class, () -> FitParameter.positive("a", 0));
    assertThrows(IllegalArgumentException.class, () -> FitParameter.between("a", 1, 1, 2));
    assertThrows(IllegalArgumentException.class, () -> FitParameter.free("a", 1, 0));
  }

  private static void decay(double[] x, double[] p, double[] y) {
    Arrays.setAll(y, i -> p[0] * (p[2] + (1 - p[2]) * Math.exp(-p[1] * x[i])));
  }

  private static Prediction line(double[] x) {
    return (p, y) -> Arrays.setAll(y, i -> p[0] + p[1] * x[i]);
  }

  private static List<FitParameter> lineParameters() {
    return List.of(FitParameter.free("offset", 0, 1), FitParameter.free("slope", 1, 1));
  }

  private static double[] ones(int length) {
    double[] ones = new double[length];
    Arrays.fill(ones, 1);
    return ones;
  }

  private static FitOutcome.Fitted fitted(FitOutcome outcome) {
    return assertInstanceOf(FitOutcome.Fitted.class, outcome, () -> outcome.toString());
  }

  private static FitOutcome.NotFitted notFitted(FitOutcome outcome) {
    return assertInstanceOf(FitOutcome.NotFitted.class, outcome);
  }
}
