package perveance.engine.numeric;

import java.util.function.DoubleUnaryOperator;
import org.apache.commons.math3.analysis.solvers.BrentSolver;
import org.apache.commons.math3.exception.TooManyEvaluationsException;

/** Finds where a function of one variable crosses zero. */
public final class Roots {
  private static final int MOST_EVALUATIONS = 200;
  private static final double RELATIVE_ACCURACY = 4.0 * Math.ulp(1.0);

  private Roots() {}

  /**
   * Finds a root between two points at which the function has opposite signs, by Brent's method (R.
   * P. Brent, Algorithms for Minimization without Derivatives, 1973, chapter 4).
   *
   * @param function the function, continuous between the two points
   * @param low one end, finite [unit of the argument]
   * @param high the other end, above low, finite [unit of the argument]
   * @param tolerance how near the root must be, above 0 [unit of the argument]
   * @return the root, or why none was found
   */
  public static RootOutcome bracketed(
      DoubleUnaryOperator function, double low, double high, double tolerance) {
    if (!(low < high) || !Double.isFinite(low) || !Double.isFinite(high)) {
      throw new IllegalArgumentException("low is not below high: " + low + ", " + high);
    }
    if (!(tolerance > 0)) {
      throw new IllegalArgumentException("tolerance is not above 0: " + tolerance);
    }
    Watched watched = new Watched(function);
    try {
      double atLow = watched.value(low);
      double atHigh = watched.value(high);
      if (atLow == 0) {
        return new RootOutcome.Found(low, 0, watched.evaluations);
      }
      if (atHigh == 0) {
        return new RootOutcome.Found(high, 0, watched.evaluations);
      }
      if (Math.signum(atLow) == Math.signum(atHigh)) {
        return new RootOutcome.NotFound(
            "the function has the same sign at both ends: " + atLow + " and " + atHigh, high);
      }
      double x =
          new BrentSolver(RELATIVE_ACCURACY, tolerance, Double.MIN_VALUE)
              .solve(MOST_EVALUATIONS, watched::value, low, high);
      return new RootOutcome.Found(x, watched.value(x), watched.evaluations);
    } catch (NotFiniteException e) {
      return new RootOutcome.NotFound(
          "the function is not finite at " + watched.lastPoint, watched.lastPoint);
    } catch (TooManyEvaluationsException e) {
      return new RootOutcome.NotFound(
          "no root within " + MOST_EVALUATIONS + " evaluations", watched.lastPoint);
    }
  }

  /** Keeps the last point and stops the search at a value that is not finite. */
  private static final class Watched {
    private final DoubleUnaryOperator function;
    private double lastPoint;
    private int evaluations;

    Watched(DoubleUnaryOperator function) {
      this.function = function;
    }

    double value(double x) {
      lastPoint = x;
      evaluations++;
      double value = function.applyAsDouble(x);
      if (!Double.isFinite(value)) {
        throw new NotFiniteException();
      }
      return value;
    }
  }

  private static final class NotFiniteException extends RuntimeException {
    private static final long serialVersionUID = 1L;
  }
}
