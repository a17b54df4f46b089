package perveance.engine.numeric;

import java.util.function.DoubleUnaryOperator;
import org.apache.commons.math3.analysis.integration.gauss.GaussIntegrator;
import org.apache.commons.math3.analysis.integration.gauss.GaussIntegratorFactory;

/**
 * Integrates smooth functions by Gauss and Legendre's rule: exact for polynomials up to twice the
 * number of points less one.
 */
public final class Quadrature {
  private static final int MOST_POINTS = 200;

  private final double[] points;
  private final double[] weights;

  private Quadrature(double[] points, double[] weights) {
    this.points = points;
    this.weights = weights;
  }

  /**
   * Prepares a rule, which can then be used any number of times.
   *
   * @param count how many points, 1 to 200
   * @return the rule
   */
  public static Quadrature gaussLegendre(int count) {
    if (count < 1 || count > MOST_POINTS) {
      throw new IllegalArgumentException("count is not between 1 and 200: " + count);
    }
    double[] points = new double[count];
    double[] weights = new double[count];
    GaussIntegrator rule = new GaussIntegratorFactory().legendre(count);
    for (int i = 0; i < count; i++) {
      points[i] = rule.getPoint(i);
      weights[i] = rule.getWeight(i);
    }
    return new Quadrature(points, weights);
  }

  /**
   * Integrates a function.
   *
   * @param function the function, smooth between the limits
   * @param from the lower limit, finite [unit of the argument]
   * @param to the upper limit, finite; may lie below, which turns the sign [unit of the argument]
   * @return the integral [unit of the function times that of the argument]
   */
  public double integrate(DoubleUnaryOperator function, double from, double to) {
    if (!Double.isFinite(from) || !Double.isFinite(to)) {
      throw new IllegalArgumentException("limits are not finite: " + from + ", " + to);
    }
    double middle = 0.5 * (from + to);
    double half = 0.5 * (to - from);
    double sum = 0;
    for (int i = 0; i < points.length; i++) {
      sum += weights[i] * function.applyAsDouble(middle + half * points[i]);
    }
    return sum * half;
  }
}
