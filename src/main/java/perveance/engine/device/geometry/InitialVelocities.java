package perveance.engine.device.geometry;

import java.util.function.DoubleUnaryOperator;
import perveance.engine.base.PhysicalConstants;
import perveance.engine.numeric.Quadrature;

/**
 * Langmuir's functions for a plane gap whose electrons leave the cathode with thermal speeds (I.
 * Langmuir, Phys. Rev. 21, 419, 1923; earlier P. S. Epstein 1919 and T. C. Fry 1921).
 *
 * <p>Space charge then forms a potential minimum. With {@code eta = e (V - Vm) / (k T)} the
 * dimensionless distance from the minimum is
 *
 * <pre>{@code
 * xi = integral of d eta / sqrt(phi(eta))
 * phi = exp(eta) - 1 -/+ exp(eta) erf(sqrt(eta)) +/- 2 sqrt(eta / pi)
 * xi = (2 pi m)^(1/4) sqrt(e J / eps0) (k T)^(-3/4) (x - xm)
 * }</pre>
 *
 * <p>with the upper signs on the anode's side. On the cathode's side xi tends to 2.554. Range: eta
 * from 0 to 1e5; the integral is taken in t = sqrt(eta), where the integrand is smooth, by
 * Simpson's rule with an error below 1e-8.
 */
public final class InitialVelocities {
  private static final Quadrature RULE = Quadrature.gaussLegendre(20);
  private static final double HIGHEST_ETA = 1e5;
  private static final double CATHODE_SIDE_END = 80;
  private static final double SMALL = 1e-3;

  private InitialVelocities() {}

  /**
   * Distance from the minimum towards the anode.
   *
   * @param eta height above the minimum in units of kT/e, 0 to 1e5 [1]
   * @return xi [1]
   */
  public static double anodeSide(double eta) {
    return integral(InitialVelocities::anodeIntegrand, Math.sqrt(checked(eta)));
  }

  /**
   * Distance from the minimum towards the cathode.
   *
   * @param eta height above the minimum in units of kT/e, 0 to 1e5 [1]
   * @return magnitude of xi, at most 2.554 [1]
   */
  public static double cathodeSide(double eta) {
    double end = Math.sqrt(Math.min(checked(eta), CATHODE_SIDE_END));
    return integral(InitialVelocities::cathodeIntegrand, end);
  }

  /**
   * What turns a distance into xi.
   *
   * @param temperature of the cathode, above 0 [K]
   * @param currentDensity J, above 0 [A m^-2]
   * @return xi per metre [m^-1]
   */
  public static double scale(double temperature, double currentDensity) {
    Dimension.positive("temperature", temperature);
    Dimension.positive("currentDensity", currentDensity);
    double energy = PhysicalConstants.BOLTZMANN * temperature;
    return Math.sqrt(Math.sqrt(2 * Math.PI * PhysicalConstants.ELECTRON_MASS))
        * Math.sqrt(
            PhysicalConstants.ELEMENTARY_CHARGE
                * currentDensity
                / PhysicalConstants.VACUUM_PERMITTIVITY)
        / Math.pow(energy, 0.75);
  }

  private static double checked(double eta) {
    if (!(eta >= 0 && eta <= HIGHEST_ETA)) {
      throw new IllegalArgumentException("eta must be from 0 to 1e5, found " + eta);
    }
    return eta;
  }

  private static double anodeIntegrand(double t) {
    if (t < SMALL) {
      return 2 / Math.sqrt(1 - 4 * t / (3 * Math.sqrt(Math.PI)) + 0.5 * t * t);
    }
    double phi = scaledErfc(t) - 1 + 2 * t / Math.sqrt(Math.PI);
    return 2 * t / Math.sqrt(phi);
  }

  private static double cathodeIntegrand(double t) {
    if (t < SMALL) {
      return 2 / Math.sqrt(1 + 4 * t / (3 * Math.sqrt(Math.PI)) + 0.5 * t * t);
    }
    double phi = 2 * Math.exp(t * t) - scaledErfc(t) - 1 - 2 * t / Math.sqrt(Math.PI);
    return 2 * t / Math.sqrt(phi);
  }

  private static double integral(DoubleUnaryOperator integrand, double end) {
    double sum = 0;
    for (double from = 0; from < end; from++) {
      sum += RULE.integrate(integrand, from, Math.min(from + 1, end));
    }
    return sum;
  }

  /** exp(x^2) erfc(x) for x of zero or more: series near zero, continued fraction beyond. */
  private static double scaledErfc(double x) {
    if (x < 2.5) {
      double term = x;
      double sum = x;
      for (int n = 1; term > 1e-18 * sum; n++) {
        term *= 2 * x * x / (2 * n + 1);
        sum += term;
      }
      return Math.exp(x * x) - 2 / Math.sqrt(Math.PI) * sum;
    }
    double fraction = x;
    for (int n = 80; n >= 1; n--) {
      fraction = x + 0.5 * n / fraction;
    }
    return 1 / (fraction * Math.sqrt(Math.PI));
  }
}
