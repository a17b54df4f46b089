package perveance.engine.numeric;

import java.util.ArrayList;
import java.util.Arrays;
import java.util.List;
import org.apache.commons.math3.exception.ConvergenceException;
import org.apache.commons.math3.exception.TooManyEvaluationsException;
import org.apache.commons.math3.exception.TooManyIterationsException;
import org.apache.commons.math3.fitting.leastsquares.LeastSquaresBuilder;
import org.apache.commons.math3.fitting.leastsquares.LeastSquaresOptimizer.Optimum;
import org.apache.commons.math3.fitting.leastsquares.LevenbergMarquardtOptimizer;
import org.apache.commons.math3.linear.RealVector;

/**
 * Fits the parameters of a law to observations by weighted least squares (Levenberg-Marquardt; D.
 * W. Marquardt, J. SIAM 11, 431, 1963; in the form of J. J. More, Numerical Analysis, Dundee 1977,
 * Springer, p. 105). Each observation counts by its standard deviation.
 */
public final class LeastSquares {
  private static final int MOST_ITERATIONS = 1000;
  private static final int MOST_EVALUATIONS = 5000;
  private static final double COST_TOLERANCE = 1e-14;
  private static final double PARAMETER_TOLERANCE = 1e-12;

  /** Huber's constant: 95 % as efficient as least squares where the errors are normal. */
  private static final double HUBER = 1.345;

  /** Ratio of the standard deviation to the median absolute deviation of a normal distribution. */
  private static final double DEVIATION_PER_MEDIAN = 1.4826;

  /** Beyond so many standard deviations of the rest, an observation is named as distrusted. */
  private static final double DISTRUST = 3.0;

  /** Least scatter taken for real, in stated deviations: below it lies rounding. */
  private static final double LEAST_SCATTER = 1e-6;

  private static final int MOST_REWEIGHTINGS = 50;
  private static final double REWEIGHTING_TOLERANCE = 1e-8;

  private LeastSquares() {}

  /**
   * Fits every observation by its stated standard deviation.
   *
   * @param prediction the law
   * @param parameters its parameters, at least one and no more than observations
   * @param observed the observations, finite [unit of each]
   * @param deviation the standard deviation of each, above 0 [unit of each]
   * @return the fitted parameters with their covariance, or why there are none
   */
  public static FitOutcome fit(
      Prediction prediction, List<FitParameter> parameters, double[] observed, double[] deviation) {
    FitProblem problem = new FitProblem(prediction, parameters, observed, deviation);
    return minimise(problem, deviation, problem.start(), List.of());
  }

  /**
   * Fits while trusting outliers less (P. J. Huber, Ann. Math. Statist. 35, 73, 1964, by iterated
   * reweighting), and names the observations that do not go with the rest: more than three standard
   * deviations of the others off, and by more than their own stated deviation.
   *
   * @param prediction the law
   * @param parameters its parameters, at least one and no more than observations
   * @param observed the observations, finite [unit of each]
   * @param deviation the standard deviation of each, above 0 [unit of each]
   * @return the fitted parameters with the observations set aside, or why there are none
   */
  public static FitOutcome fitRobustly(
      Prediction prediction, List<FitParameter> parameters, double[] observed, double[] deviation) {
    FitProblem problem = new FitProblem(prediction, parameters, observed, deviation);
    double[] start = problem.start();
    double[] widened = deviation.clone();
    for (int round = 0; round < MOST_REWEIGHTINGS; round++) {
      FitOutcome outcome = minimise(problem, widened, start, List.of());
      if (!(outcome instanceof FitOutcome.Fitted fitted)) {
        return outcome;
      }
      double[] misfit = inDeviations(fitted.residuals(), deviation);
      double scatter = scatter(misfit);
      double[] inner = problem.settled();
      widened = widen(deviation, misfit, scatter);
      if (round > 0 && near(inner, start)) {
        return minimise(problem, widened, inner, distrusted(misfit, scatter));
      }
      start = inner;
    }
    return new FitOutcome.NotFitted(
        "the weights of the observations did not settle in " + MOST_REWEIGHTINGS + " rounds",
        problem.toOuter(start));
  }

  private static FitOutcome minimise(
      FitProblem problem, double[] deviation, double[] start, List<Integer> distrusted) {
    problem.weighBy(deviation);
    if (!problem.finiteAt(start)) {
      return new FitOutcome.NotFitted(
          "the prediction is not finite at the start", problem.toOuter(start));
    }
    try {
      Optimum optimum =
          new LevenbergMarquardtOptimizer()
              .withCostRelativeTolerance(COST_TOLERANCE)
              .withParameterRelativeTolerance(PARAMETER_TOLERANCE)
              .withOrthoTolerance(COST_TOLERANCE)
              .optimize(
                  new LeastSquaresBuilder()
                      .model(problem)
                      .lazyEvaluation(true)
                      .target(new double[deviation.length])
                      .start(start)
                      .maxIterations(MOST_ITERATIONS)
                      .maxEvaluations(MOST_EVALUATIONS)
                      .build());
      RealVector inner = optimum.getPoint();
      return problem.outcome(inner.toArray(), optimum.getIterations(), distrusted);
    } catch (TooManyIterationsException | TooManyEvaluationsException e) {
      return new FitOutcome.NotFitted(
          "the fit did not settle in " + MOST_ITERATIONS + " steps", problem.lastParameters());
    } catch (ConvergenceException e) {
      return new FitOutcome.NotFitted("the fit cannot go on from here", problem.lastParameters());
    }
  }

  private static double[] inDeviations(double[] residuals, double[] deviation) {
    double[] misfit = new double[residuals.length];
    for (int i = 0; i < misfit.length; i++) {
      misfit[i] = Math.abs(residuals[i]) / deviation[i];
    }
    return misfit;
  }

  private static double scatter(double[] misfit) {
    return Math.max(LEAST_SCATTER, DEVIATION_PER_MEDIAN * Statistics.median(misfit));
  }

  private static double[] widen(double[] deviation, double[] misfit, double scatter) {
    double[] widened = deviation.clone();
    for (int i = 0; i < widened.length; i++) {
      widened[i] *= Math.sqrt(Math.max(1.0, misfit[i] / (HUBER * scatter)));
    }
    return widened;
  }

  private static List<Integer> distrusted(double[] misfit, double scatter) {
    List<Integer> places = new ArrayList<>();
    for (int i = 0; i < misfit.length; i++) {
      if (misfit[i] > DISTRUST * scatter && misfit[i] > 1.0) {
        places.add(i);
      }
    }
    return places;
  }

  private static boolean near(double[] a, double[] b) {
    double largest = 0;
    for (int i = 0; i < a.length; i++) {
      largest = Math.max(largest, Math.abs(a[i] - b[i]) / Math.max(1.0, Math.abs(a[i])));
    }
    return largest < REWEIGHTING_TOLERANCE || Arrays.equals(a, b);
  }
}
