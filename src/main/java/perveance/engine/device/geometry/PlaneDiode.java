package perveance.engine.device.geometry;

import perveance.engine.base.PhysicalConstants;

/**
 * Parallel plane electrodes: {@code I = P0 A V^(3/2) / d^2} with {@code P0 = (4 eps0 / 9) sqrt(2 e
 * / m)}; the potential rises with the four-thirds power of the distance (Child 1911).
 *
 * @param area of each electrode, above 0 [m^2]
 * @param gap distance between them, above 0 [m]
 */
public record PlaneDiode(double area, double gap) implements DiodeGeometry {
  /** Checks the dimensions. */
  public PlaneDiode {
    Dimension.positive("area", area);
    Dimension.positive("gap", gap);
  }

  @Override
  public double perveance() {
    return PhysicalConstants.PLANE_SPACE_CHARGE * area / (gap * gap);
  }

  @Override
  public double cathodeArea() {
    return area;
  }

  @Override
  public GapPoint at(double distance, double voltage) {
    Gap.check(distance, gap, voltage);
    double part = distance / gap;
    double potential = voltage * part * Math.cbrt(part);
    double speed = Gap.speed(potential);
    return new GapPoint(
        distance,
        potential,
        4.0 / 3.0 * potential / distance,
        current(voltage) / area / speed,
        speed,
        voltage * part,
        voltage / gap);
  }
}
