package perveance.engine.device.geometry;

import perveance.engine.base.PhysicalConstants;

/** What both shapes of gap share. */
final class Gap {
  private Gap() {}

  static void check(double distance, double gap, double voltage) {
    // a collector reached by adding steps may be one rounding beyond the gap
    if (!(distance > 0 && distance <= gap * (1 + 1e-12))) {
      throw new IllegalArgumentException(
          "distance must be above 0 and at most " + gap + ", found " + distance);
    }
    Dimension.positive("voltage", voltage);
  }

  /** Speed of an electron that has fallen from rest through a potential, below relativity [m/s]. */
  static double speed(double potential) {
    return Math.sqrt(
        2 * PhysicalConstants.ELEMENTARY_CHARGE / PhysicalConstants.ELECTRON_MASS * potential);
  }
}
