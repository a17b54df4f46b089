package perveance.engine.device.geometry;

import perveance.engine.base.PhysicalConstants;

/**
 * Coaxial cylinders, either of which may be the cathode: {@code I = 2 pi P0 (l / r) V^(3/2) /
 * beta^2} with r the radius of the collector and beta by {@link LangmuirBlodgett}. End effects are
 * left out.
 *
 * @param cathodeRadius above 0 [m]
 * @param anodeRadius above 0 and not that of the cathode [m]
 * @param length of the electrodes, above 0 [m]
 */
public record CylinderDiode(double cathodeRadius, double anodeRadius, double length)
    implements DiodeGeometry {
  /** Checks the dimensions. */
  public CylinderDiode {
    Dimension.positive("cathodeRadius", cathodeRadius);
    Dimension.positive("anodeRadius", anodeRadius);
    Dimension.positive("length", length);
    if (cathodeRadius == anodeRadius) {
      throw new IllegalArgumentException("anodeRadius must differ from cathodeRadius");
    }
  }

  /**
   * The square of Langmuir and Blodgett's function.
   *
   * @return beta^2 at the anode [1]
   */
  public double betaSquared() {
    return LangmuirBlodgett.at(anodeRadius / cathodeRadius).squared();
  }

  @Override
  public double perveance() {
    return PhysicalConstants.CYLINDER_SPACE_CHARGE * length / (anodeRadius * betaSquared());
  }

  @Override
  public double gap() {
    return Math.abs(anodeRadius - cathodeRadius);
  }

  @Override
  public double cathodeArea() {
    return 2 * Math.PI * cathodeRadius * length;
  }

  @Override
  public GapPoint at(double distance, double voltage) {
    Gap.check(distance, gap(), voltage);
    double outward = Math.signum(anodeRadius - cathodeRadius);
    double radius = cathodeRadius + outward * distance;
    LangmuirBlodgett here = LangmuirBlodgett.at(radius / cathodeRadius);
    // the same current crosses every radius, so r beta^2 goes with V^(3/2)
    double ratio = radius * here.squared() / (anodeRadius * betaSquared());
    double potential = voltage * Math.cbrt(ratio * ratio);
    double byRadius = 2.0 / 3.0 * potential / radius * (1 + 2 * here.slope() / here.beta());
    double speed = Gap.speed(potential);
    double logRatio = Math.log(anodeRadius / cathodeRadius);
    return new GapPoint(
        distance,
        potential,
        outward * byRadius,
        current(voltage) / (2 * Math.PI * radius * length) / speed,
        speed,
        voltage * Math.log(radius / cathodeRadius) / logRatio,
        outward * voltage / (radius * logRatio));
  }
}
