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
  private static final double SMALL = 0.005;

  private final double perveance;
  private final double width;
  private final double inverseWidth;
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
    this.inverseWidth = 1 / width;
    double p = Math.cbrt(Math.pow(ONSET_CURRENT / perveance, 2));
    this.origin = onset - width * Math.log(Math.expm1(p / width));
  }

  /**
   * Writes the grid's current and slopes: its own current, and the part of a current turned back
   * before the anode that ends on an open grid.
   *
   * @param grid grid to cathode, finite [V]
   * @param turned current that turns back before the anode [A]
   * @param turnedByAnode its slope by the anode voltage [S]
   * @param turnedByGrid its slope by the grid voltage [S]
   * @param out receives the grid's current and slopes
   */
  void evaluate(
      double grid,
      double turned,
      double turnedByAnode,
      double turnedByGrid,
      ElectrodeCurrents out) {
    double x = (grid - origin) * inverseWidth;
    if (x < FAR_BELOW) {
      out.set(ElectrodeCurrents.GRID, 0, 0, 0, 0);
      return;
    }
    // a smooth step, 0 where the grid is far below its contact potential, 1 far above
    double open = x > FAR_ABOVE ? 1 : 1 / (1 + Math.exp(-x));
    double p = width * softPlus(x, open);
    double root = perveance * Math.sqrt(p);
    double step = open * (1 - open) * inverseWidth;
    out.set(
        ElectrodeCurrents.GRID,
        root * p + turned * open,
        turnedByAnode * open,
        1.5 * root * open + turnedByGrid * open + turned * step,
        0);
  }

  /** ln(1 + e^x), written so that no digits are lost and far below without a logarithm. */
  private static double softPlus(double x, double open) {
    if (open < SMALL) {
      // -ln(1 - open) by its series; the next term is below 1e-16 of the sum
      return open
          * (1
              + open
                  * (1.0 / 2
                      + open
                          * (1.0 / 3
                              + open
                                  * (1.0 / 4 + open * (1.0 / 5 + open * (1.0 / 6 + open / 7))))));
    }
    return open < 0.5 ? -Math.log(1 - open) : x - Math.log(open);
  }
}
