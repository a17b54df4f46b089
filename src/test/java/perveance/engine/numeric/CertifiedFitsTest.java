package perveance.engine.numeric;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertInstanceOf;

import java.util.Arrays;
import java.util.List;
import org.junit.jupiter.api.Test;

/**
 * Published: data sets with certified answers from the NIST/ITL Statistical Reference Datasets
 * (Norris for the straight line; Misra1a, Rat42, BoxBOD and MGH10 for curves, each from its second
 * published start). Certified are the parameters, their standard deviations judged by the scatter,
 * and the residual sum of squares. Tolerance: slopes by central differences are good to about
 * 1e-10, which allows parameters to 1e-6 and deviations to 1e-5 on the hardest of these (MGH10).
 */
class CertifiedFitsTest {
  /** Response and predictor, 36 pairs. */
  private static final double[] NORRIS = {
    0.1, 0.2, 338.8, 337.4, 118.1, 118.2, 888.0, 884.6, 9.2, 10.1, 228.1, 226.5, 668.5, 666.3,
    998.5, 996.3, 449.1, 448.6, 778.9, 777.0, 559.2, 558.2, 0.3, 0.4, 0.1, 0.6, 778.1, 775.5, 668.8,
    666.9, 339.3, 338.0, 448.9, 447.5, 10.8, 11.6, 557.7, 556.0, 228.3, 228.1, 998.0, 995.8, 888.8,
    887.6, 119.6, 120.2, 0.3, 0.3, 0.6, 0.3, 557.6, 556.8, 339.3, 339.1, 888.0, 887.2, 998.5, 999.0,
    778.9, 779.0, 10.2, 11.1, 117.6, 118.3, 228.9, 229.2, 668.4, 669.1, 449.2, 448.9, 0.2, 0.5
  };

  @Test
  void norris() {
    double[] x = new double[36];
    double[] y = new double[36];
    for (int i = 0; i < 36; i++) {
      y[i] = NORRIS[2 * i];
      x[i] = NORRIS[2 * i + 1];
    }
    check(
        (p, predicted) -> Arrays.setAll(predicted, i -> p[0] + p[1] * x[i]),
        y,
        List.of(FitParameter.free("B0", 0, 1), FitParameter.free("B1", 0.5, 1)),
        new double[] {-0.262323073774029, 1.00211681802045},
        new double[] {0.232818234301152, 0.429796848199937e-3},
        34 * 0.884796396144373 * 0.884796396144373);
  }

  @Test
  void misra1a() {
    double[] x = {
      77.6, 114.9, 141.1, 190.8, 239.9, 289.0, 332.8, 378.4, 434.8, 477.3, 536.8, 593.1, 689.1,
      760.0
    };
    double[] y = {
      10.07, 14.73, 17.94, 23.93, 29.61, 35.18, 40.02, 44.82, 50.76, 55.05, 61.01, 66.40, 75.47,
      81.78
    };
    check(
        (p, predicted) -> Arrays.setAll(predicted, i -> p[0] * (1 - Math.exp(-p[1] * x[i]))),
        y,
        List.of(FitParameter.positive("b1", 250), FitParameter.positive("b2", 5e-4)),
        new double[] {2.3894212918e+02, 5.5015643181e-04},
        new double[] {2.7070075241, 7.2668688436e-06},
        1.2455138894e-01);
  }

  @Test
  void rat42() {
    double[] x = {9, 14, 21, 28, 42, 57, 63, 70, 79};
    double[] y = {8.930, 10.800, 18.590, 22.330, 39.350, 56.110, 61.730, 64.620, 67.080};
    check(
        (p, predicted) -> Arrays.setAll(predicted, i -> p[0] / (1 + Math.exp(p[1] - p[2] * x[i]))),
        y,
        List.of(
            FitParameter.between("b1", 75, 0, 200),
            FitParameter.free("b2", 2.5, 1),
            FitParameter.positive("b3", 0.07)),
        new double[] {7.2462237576e+01, 2.6180768402, 6.7359200066e-02},
        new double[] {1.7340283401, 8.8295217536e-02, 3.4465663377e-03},
        8.0565229338);
  }

  @Test
  void boxBod() {
    double[] x = {1, 2, 3, 5, 7, 10};
    double[] y = {109, 149, 149, 191, 213, 224};
    check(
        (p, predicted) -> Arrays.setAll(predicted, i -> p[0] * (1 - Math.exp(-p[1] * x[i]))),
        y,
        List.of(FitParameter.free("b1", 100, 100), FitParameter.free("b2", 0.75, 1)),
        new double[] {2.1380940889e+02, 5.4723748542e-01},
        new double[] {1.2354515176e+01, 1.0455993237e-01},
        1.1680088766e+03);
  }

  @Test
  void mgh10() {
    double[] y = {
      34780, 28610, 23650, 19630, 16370, 13720, 11540, 9744, 8261, 7030, 6005, 5147, 4427, 3820,
      3307, 2872
    };
    check(
        (p, predicted) ->
            Arrays.setAll(predicted, i -> p[0] * Math.exp(p[1] / (50 + 5 * i + p[2]))),
        y,
        List.of(
            FitParameter.positive("b1", 0.02),
            FitParameter.positive("b2", 4000),
            FitParameter.positive("b3", 250)),
        new double[] {5.6096364710e-03, 6.1813463463e+03, 3.4522363462e+02},
        new double[] {1.5687892471e-04, 2.3309021107e+01, 7.8486103508e-01},
        8.7945855171e+01);
  }

  private static void check(
      Prediction prediction,
      double[] observed,
      List<FitParameter> parameters,
      double[] certified,
      double[] certifiedDeviation,
      double certifiedSum) {
    double[] deviation = new double[observed.length];
    Arrays.fill(deviation, 1);
    FitOutcome outcome = LeastSquares.fit(prediction, parameters, observed, deviation);
    FitOutcome.Fitted fitted =
        assertInstanceOf(FitOutcome.Fitted.class, outcome, () -> outcome.toString());
    double scatter = Math.sqrt(fitted.reducedChiSquare().orElseThrow());
    for (int j = 0; j < certified.length; j++) {
      assertEquals(1, fitted.parameters()[j] / certified[j], 1e-6, "parameter " + j);
      double ours = fitted.standardDeviation(j) * scatter;
      assertEquals(1, ours / certifiedDeviation[j], 1e-5, "deviation " + j);
    }
    double sum = fitted.rms() * fitted.rms() * observed.length;
    assertEquals(1, sum / certifiedSum, 1e-9, "sum of squares");
  }
}
