package perveance.engine.device;

/**
 * Current that a cathode gives up behind a grid whose penetration factor is spread.
 *
 * <p>What it predicts: the space-charge-limited cathode current. The grid lets the pull of the
 * electrode behind it (anode, or screen) through by the penetration factor D. A real grid is not
 * uniform: wires sag and are unevenly wound, and there are ends and supports, so that D is spread
 * about its mean D0. Most of the structure lies a little below the mean and few places far above
 * it; these keep conducting when the rest is cut off, which is why mu falls towards cut-off and the
 * tail is long (island formation: J. H. Fremlin, Phil. Mag. 27, 709, 1939). Besides, the cathode
 * itself is not at one potential: initial velocities, patches of different work function, in a
 * filament the heating voltage. That part of the spread does not shrink with the anode voltage, and
 * it is what lowers mutual conductance at small currents.
 *
 * <pre>{@code
 * m  = Vg + Vc + D0 pull               mean effective voltage
 * w  = s D0 pull + c                   its spread (sqrt 3 times the standard deviation)
 * u1 = m - w sqrt(5)/3,  u2 = m + w sqrt(5)
 * I  = G integral from 0 to 1 of 3 (1 - t)^2 (u1 + t (u2 - u1))+^(3/2) dt,  y+ = max(0, y)
 * }</pre>
 *
 * <p>The density 3 (1 - t)^2 tapers from the low end to the high one. The integral is closed: with
 * a = sqrt(u1), b = sqrt(u2) it is a polynomial in a and b over (a + b)^3, without differences, so
 * that full precision is kept when the spread vanishes; it is then the three-halves law of C. D.
 * Child (Phys. Rev. 32, 492, 1911) and I. Langmuir (Phys. Rev. 2, 450, 1913). With u1 below zero it
 * is (16/105) G u2^(9/2) / (u2 - u1)^3. Below cut-off (u2 below zero) the current is zero. A
 * negative pull counts as zero.
 *
 * <p>Validity: any voltage; space charge must limit the current (no saturation). Slopes are
 * continuous everywhere but at zero pull.
 */
final class SpreadCathode {
  private static final double LOW_REACH = Math.sqrt(5) / 3;
  private static final double HIGH_REACH = Math.sqrt(5);

  private final double perveance;
  private final double lowPenetration;
  private final double highPenetration;
  private final double lowOffset;
  private final double highOffset;

  /**
   * Keeps the constants of the cathode and its grid.
   *
   * @param perveance G, above 0 [A V^-1.5]
   * @param contactPotential Vc [V]
   * @param penetration mean penetration factor D0, above 0 [1]
   * @param spread s, sqrt 3 times the standard deviation of D over D0, 0 to 1 [1]
   * @param cathodeSpread c, sqrt 3 times the standard deviation of the cathode's potential, 0 or
   *     above [V]
   */
  SpreadCathode(
      double perveance,
      double contactPotential,
      double penetration,
      double spread,
      double cathodeSpread) {
    this.perveance = perveance;
    this.lowPenetration = penetration * (1 - LOW_REACH * spread);
    this.highPenetration = penetration * (1 + HIGH_REACH * spread);
    this.lowOffset = contactPotential - LOW_REACH * cathodeSpread;
    this.highOffset = contactPotential + HIGH_REACH * cathodeSpread;
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
    double reach = pull > 0 ? pull : 0;
    double upper = grid + highOffset + reach * highPenetration;
    if (upper <= 0) {
      out.set(ElectrodeCurrents.ANODE, 0, 0, 0, 0);
      return;
    }
    double lower = grid + lowOffset + reach * lowPenetration;
    double towardsPull = pull > 0 ? 1 : 0;
    if (lower <= 0) {
      partlyCutOff(lower, upper, towardsPull, out);
    } else {
      conductingThroughout(lower, upper, towardsPull, out);
    }
  }

  private void partlyCutOff(double lower, double upper, double towardsPull, ElectrodeCurrents out) {
    double share = upper / (upper - lower);
    double steep = 16.0 / 105 * perveance * share * share * share * Math.sqrt(upper);
    double byLower = 3 * steep * share;
    store(steep * upper, byLower, 4.5 * steep - byLower, towardsPull, out);
  }

  private void conductingThroughout(
      double a2, double b2, double towardsPull, ElectrodeCurrents out) {
    double a = Math.sqrt(a2);
    double b = Math.sqrt(b2);
    double ab = a * b;
    double inverse = 1 / (a + b);
    double third = perveance * inverse * inverse * inverse;
    double fourth = third * inverse / 35;
    double low = a2 * a2 * (35 * a2 + 105 * ab + 120 * b2);
    double high = b2 * (80 * a2 * ab + 48 * a2 * b2 + 24 * ab * b2 + 8 * b2 * b2);
    double byLower =
        a * a2 * (35 * a2 + 140 * ab + 215 * b2) + b * b2 * (160 * a2 + 64 * ab + 16 * b2);
    double byUpper = a * a2 * (5 * a2 + 20 * ab + 32 * b2) + b * b2 * (28 * a2 + 16 * ab + 4 * b2);
    store(
        2.0 / 105 * third * (low + high), fourth * byLower, 2 * fourth * byUpper, towardsPull, out);
  }

  private void store(
      double current, double byLower, double byUpper, double towardsPull, ElectrodeCurrents out) {
    double byPull = towardsPull * (byLower * lowPenetration + byUpper * highPenetration);
    out.set(ElectrodeCurrents.ANODE, current, byPull, byLower + byUpper, 0);
  }
}
