package perveance.engine.device.geometry;

import perveance.engine.numeric.DifferentialOutcome;
import perveance.engine.numeric.OrdinaryDifferentialEquation;

/**
 * The function of Langmuir and Blodgett for space charge between coaxial cylinders (I. Langmuir and
 * K. B. Blodgett, Phys. Rev. 22, 347, 1923).
 *
 * <p>With {@code g = ln(r / r0)}, r0 the cathode's radius, beta solves
 *
 * <pre>{@code 3 b b'' + b'^2 + 4 b b' + b^2 = 1,  b ~ g near the cathode}</pre>
 *
 * <p>and the current is {@code I = 2 pi P0 (l / r) V^(3/2) / b^2}. The equation is singular at the
 * cathode, so the integration starts a little way off on the paper's own power series and is then
 * followed numerically. Range: radius ratios from 1 to 1e6 either way; outside, an exception.
 *
 * @param beta b at the collector [1]
 * @param slope db/dg there [1]
 */
record LangmuirBlodgett(double beta, double slope) {
  private static final double SERIES_REACH = 0.1;
  private static final double LARGEST_RATIO = 1e6;

  /** Coefficients of g, g^2 ... g^10 as quoted from the paper of 1923. */
  private static final double[] SERIES = {
    1,
    -0.4,
    0.09166667,
    -0.01424242,
    0.001679275,
    -0.0001612219,
    0.00001293486,
    -8.87693e-7,
    5.46192e-8,
    -2.94843e-9
  };

  private static final OrdinaryDifferentialEquation EQUATION =
      new OrdinaryDifferentialEquation(LangmuirBlodgett::fillSlopes, 2, 1e-12);

  /**
   * Integrates from the cathode to the collector.
   *
   * @param radiusRatio collector radius over cathode radius, above or below 1 but not 1 [1]
   * @return beta and its slope at the collector
   */
  static LangmuirBlodgett at(double radiusRatio) {
    if (!(radiusRatio >= 1 / LARGEST_RATIO && radiusRatio <= LARGEST_RATIO) || radiusRatio == 1) {
      throw new IllegalArgumentException(
          "radiusRatio must be from 1e-6 to 1e6 and not 1, found " + radiusRatio);
    }
    double end = Math.log(radiusRatio);
    if (Math.abs(end) <= SERIES_REACH) {
      return series(end);
    }
    double start = Math.copySign(SERIES_REACH, end);
    LangmuirBlodgett first = series(start);
    DifferentialOutcome outcome =
        EQUATION.follow(new double[] {start, end}, new double[] {first.beta, first.slope});
    if (outcome instanceof DifferentialOutcome.Reached reached) {
      double[] last = reached.last();
      return new LangmuirBlodgett(last[0], last[1]);
    }
    throw new IllegalStateException("not integrated for radiusRatio " + radiusRatio);
  }

  /** b squared, the factor of the current law [1]. */
  double squared() {
    return beta * beta;
  }

  private static LangmuirBlodgett series(double g) {
    double value = 0;
    double slope = 0;
    for (int i = SERIES.length - 1; i >= 0; i--) {
      value = (value + SERIES[i]) * g;
      slope = slope * g + (i + 1) * SERIES[i];
    }
    return new LangmuirBlodgett(value, slope);
  }

  private static void fillSlopes(double g, double[] state, double[] slopes) {
    double beta = state[0];
    double slope = state[1];
    slopes[0] = slope;
    slopes[1] = (1 - slope * slope - 4 * beta * slope - beta * beta) / (3 * beta);
  }
}
