package perveance.engine.numeric;

import org.apache.commons.math3.exception.MaxCountExceededException;
import org.apache.commons.math3.exception.NumberIsTooSmallException;
import org.apache.commons.math3.ode.FirstOrderDifferentialEquations;
import org.apache.commons.math3.ode.nonstiff.DormandPrince853Integrator;

/**
 * Follows ordinary differential equations from known starting values, by the method of Dormand and
 * Prince of order 8 with step control (E. Hairer, S. P. Norsett and G. Wanner, Solving Ordinary
 * Differential Equations I, 2nd ed., section II.5). For equations that are not stiff.
 */
public final class OrdinaryDifferentialEquation {
  private static final int MOST_EVALUATIONS = 1_000_000;

  /** The least step, as a share of the way. */
  private static final double LEAST_STEP = 1e-14;

  private final Slopes slopes;
  private final int equations;
  private final double tolerance;

  /** How fast each quantity changes. */
  @FunctionalInterface
  public interface Slopes {
    /**
     * Fills in the slopes.
     *
     * @param x where [unit of the argument]
     * @param state the quantities there, not to be changed [unit of each]
     * @param slope one entry for each quantity, to be filled [unit of each per unit of x]
     */
    void fill(double x, double[] state, double[] slope);
  }

  /**
   * Describes a system.
   *
   * @param slopes how fast each quantity changes
   * @param equations how many quantities there are, 1 or more
   * @param tolerance the error allowed in a step, as a share of each quantity, and of 1 for a
   *     quantity smaller than that; between 1e-14 and 0.1 [1]
   */
  public OrdinaryDifferentialEquation(Slopes slopes, int equations, double tolerance) {
    if (equations < 1) {
      throw new IllegalArgumentException("equations is below 1: " + equations);
    }
    if (!(tolerance >= 1e-14 && tolerance <= 0.1)) {
      throw new IllegalArgumentException("tolerance is not between 1e-14 and 0.1: " + tolerance);
    }
    this.slopes = slopes;
    this.equations = equations;
    this.tolerance = tolerance;
  }

  /**
   * Follows the quantities from the first point through all others.
   *
   * @param points two or more finite points, ascending or descending [unit of the argument]
   * @param start the quantities at the first point, finite [unit of each]
   * @return the quantities at every point, the first included, or why they could not be followed
   */
  public DifferentialOutcome follow(double[] points, double[] start) {
    requirePoints(points, start);
    double[][] states = new double[points.length][];
    states[0] = start.clone();
    Watched watched = new Watched();
    double way = Math.abs(points[points.length - 1] - points[0]);
    DormandPrince853Integrator integrator =
        new DormandPrince853Integrator(LEAST_STEP * way, way, tolerance, tolerance);
    integrator.setMaxEvaluations(MOST_EVALUATIONS);
    try {
      for (int i = 1; i < points.length; i++) {
        states[i] = new double[equations];
        integrator.integrate(watched, points[i - 1], states[i - 1], points[i], states[i]);
      }
      return new DifferentialOutcome.Reached(states);
    } catch (NotFiniteException e) {
      return new DifferentialOutcome.NotReached("a slope is not finite", watched.lastPoint);
    } catch (NumberIsTooSmallException e) {
      return new DifferentialOutcome.NotReached(
          "the step became too small for the tolerance", watched.lastPoint);
    } catch (MaxCountExceededException e) {
      return new DifferentialOutcome.NotReached(
          "the end was not reached in " + MOST_EVALUATIONS + " evaluations", watched.lastPoint);
    }
  }

  private void requirePoints(double[] points, double[] start) {
    if (points.length < 2) {
      throw new IllegalArgumentException("points has " + points.length + " entries, not 2 or more");
    }
    if (start.length != equations) {
      throw new IllegalArgumentException(
          "start has " + start.length + " entries, not " + equations);
    }
    for (double quantity : start) {
      if (!Double.isFinite(quantity)) {
        throw new IllegalArgumentException("start is not finite: " + quantity);
      }
    }
    double direction = Math.signum(points[1] - points[0]);
    for (int i = 1; i < points.length; i++) {
      double step = (points[i] - points[i - 1]) * direction;
      if (!(step > 0) || Double.isInfinite(step)) {
        throw new IllegalArgumentException("points do not go one way at " + points[i]);
      }
    }
  }

  /** Keeps the last point and stops at a slope that is not finite. */
  private final class Watched implements FirstOrderDifferentialEquations {
    private double lastPoint;

    @Override
    public int getDimension() {
      return equations;
    }

    @Override
    public void computeDerivatives(double x, double[] state, double[] slope) {
      lastPoint = x;
      slopes.fill(x, state, slope);
      for (double value : slope) {
        if (!Double.isFinite(value)) {
          throw new NotFiniteException();
        }
      }
    }
  }

  private static final class NotFiniteException extends RuntimeException {
    private static final long serialVersionUID = 1L;
  }
}
