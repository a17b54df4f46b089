package perveance.engine.device;

/**
 * Current that a cathode gives up behind a grid whose penetration factor is spread.
 *
 * <p>What it predicts: the space-charge-limited cathode current. The grid lets the pull of the
 * electrode behind it (anode, or screen) through by the penetration factor D. A real grid is not
 * uniform, so D fills an interval around its mean D0, and where the effective voltage is negative
 * that part of the cathode is cut off (island formation: J. H. Fremlin, Phil. Mag. 27, 709, 1939).
 *
 * <pre>{@code
 * u1 = Vg + Vc + pull D0 (1 - s),  u2 = Vg + Vc + pull D0 (1 + s)
 * I  = G (2/5) (u2+^(5/2) - u1+^(5/2)) / (u2 - u1),  y+ = max(0, y)
 * }</pre>
 *
 * <p>With the square roots a, b of two positive ends the quotient divides out to {@code (2/5) (b^4
 * + b^3 a + b^2 a^2 + b a^3 + a^4) / (a + b)}, which keeps full precision when the spread or the
 * pull vanishes; it is then the three-halves law of C. D. Child (Phys. Rev. 32, 492, 1911) and I.
 * Langmuir (Phys. Rev. 2, 450, 1913). Below cut-off the current is zero. A negative pull counts as
 * zero.
 */
final class SpreadCathode {
  private final double perveance;
  private final double contactPotential;
  private final double lowPenetration;
  private final double highPenetration;

  /**
   * Keeps the constants of the cathode and its grid.
   *
   * @param perveance G, above 0 [A V^-1.5]
   * @param contactPotential Vc [V]
   * @param penetration mean penetration factor D0, above 0 [1]
   * @param spread half width of the spread of D relative to D0, 0 to 1 [1]
   */
  SpreadCathode(double perveance, double contactPotential, double penetration, double spread) {
    this.perveance = perveance;
    this.contactPotential = contactPotential;
    this.lowPenetration = penetration * (1 - spread);
    this.highPenetration = penetration * (1 + spread);
  }

  /**
   * Writes the current and its two slopes into the anode's place of {@code out}: the slope with
   * respect to the pull in the anode's column, with respect to the grid in the grid's.
   *
   * @param grid grid to cathode, finite [V]
   * @param pull voltage of the electrode behind the grid, finite [V]
   * @param out receives the current and slopes
   */
  void evaluate(double grid, double pull, ElectrodeCurrents out) {
    double reach = Math.max(pull, 0);
    double base = grid + contactPotential;
    double upper = base + reach * highPenetration;
    if (upper <= 0) {
      out.set(ElectrodeCurrents.ANODE, 0, 0, 0, 0);
      return;
    }
    double lower = base + reach * lowPenetration;
    double b = Math.sqrt(upper);
    double current;
    double byLower;
    double byUpper;
    if (lower <= 0) {
      double width = upper - lower;
      double mean = 0.4 * upper * upper * b / width;
      current = perveance * mean;
      byLower = perveance * mean / width;
      byUpper = perveance * (upper * b - mean) / width;
    } else {
      double a = Math.sqrt(lower);
      double ab = a * b;
      double sum = a + b;
      double scale = perveance / (sum * sum);
      current = 0.4 * scale * sum * (upper * upper + lower * lower + ab * (upper + lower + ab));
      byUpper = 0.2 * scale * (b * (3 * upper + 4 * lower) + a * (6 * upper + 2 * lower));
      byLower = 0.2 * scale * (a * (3 * lower + 4 * upper) + b * (6 * lower + 2 * upper));
    }
    double byPull = pull > 0 ? byLower * lowPenetration + byUpper * highPenetration : 0;
    out.set(ElectrodeCurrents.ANODE, current, byPull, byLower + byUpper, 0);
  }
}
