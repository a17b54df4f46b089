package perveance.engine.device;

/**
 * Current of electrons that land on a control grid.
 *
 * <p>What it predicts: below the grid's own contact potential only the fastest electrons reach it
 * and the current falls by a factor e for every VT (retarding region); above, it grows with the
 * three-halves power of the voltage. Both are joined in one smooth expression,
 *
 * <pre>{@code I = Gg p^(3/2),  p = 1.5 VT ln(1 + exp((Vg - V0) / (1.5 VT)))}</pre>
 *
 * <p>Gg is the grid's perveance and VT = k T / e the thermal voltage of the cathode. V0 is not
 * given but follows from the published onset: the grid voltage at which the current is 0.3 uA, the
 * criterion of the continental valve handbooks. The rule with three-halves power and retarding
 * exponential is common textbook physics (K. R. Spangenberg, Vacuum Tubes, 1948, chapters 8 and 9);
 * the joint is ours.
 */
final class GridCurrent {
  /** Current at the published onset of grid current [A]. */
  static final double ONSET_CURRENT = 0.3e-6;

  private static final double FAR_BELOW = -60;
  private static final double FAR_ABOVE = 36;

  private final double perveance;
  private final double width;
  private final double origin;

  /**
   * Places the curve so that the onset current flows at the onset.
   *
   * @param perveance Gg, above 0 [A V^-1.5]
   * @param onset grid voltage at 0.3 uA [V]
   * @param thermalVoltage VT, above 0 [V]
   */
  GridCurrent(double perveance, double onset, double thermalVoltage) {
    this.perveance = perveance;
    this.width = 1.5 * thermalVoltage;
    double p = Math.cbrt(Math.pow(ONSET_CURRENT / perveance, 2));
    this.origin = onset - width * Math.log(Math.expm1(p / width));
  }

  /**
   * How far the grid is above its own contact potential, as a smooth step.
   *
   * @param grid grid to cathode [V]
   * @return 0 far below, 1 far above [1]
   */
  double openness(double grid) {
    double x = (grid - origin) / width;
    if (x < FAR_BELOW) {
      return 0;
    }
    return x > FAR_ABOVE ? 1 : 1 / (1 + Math.exp(-x));
  }

  /**
   * The current.
   *
   * @param grid grid to cathode [V]
   * @param openness {@link #openness} at that voltage [1]
   * @return current into the grid [A]
   */
  double current(double grid, double openness) {
    double p = positivePart(grid, openness);
    return perveance * p * Math.sqrt(p);
  }

  /**
   * Slope of the current.
   *
   * @param grid grid to cathode [V]
   * @param openness {@link #openness} at that voltage [1]
   * @return dIg/dVg [S]
   */
  double slope(double grid, double openness) {
    return 1.5 * perveance * Math.sqrt(positivePart(grid, openness)) * openness;
  }

  /**
   * Slope of the openness.
   *
   * @param openness {@link #openness} at a voltage [1]
   * @return its slope by the grid voltage [1/V]
   */
  double opennessSlope(double openness) {
    return openness * (1 - openness) / width;
  }

  private double positivePart(double grid, double openness) {
    if (openness == 0) {
      return 0;
    }
    // ln(1 + e^x) written three ways so that no digits are lost
    if (openness < 1e-5) {
      return width * openness * (1 + 0.5 * openness);
    }
    return openness < 0.5
        ? -width * Math.log(1 - openness)
        : grid - origin - width * Math.log(openness);
  }
}
