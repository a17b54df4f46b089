package perveance.engine.analysis;

import perveance.engine.analysis.CleanSwing.Limit;

/**
 * Follows the mid-band characteristic outward from idle until the swing stops being clean:
 *
 * <ul>
 *   <li>grid current: a grid reaches the onset that its law states (0.3 uA);
 *   <li>cut-off: a section is down to a tenth of its idle current. A pair in push-pull may lose one
 *       section while the other goes on, so there this does not count;
 *   <li>knee: the gain has fallen to half of that at idle, and not because a section cuts off.
 * </ul>
 */
final class SwingSearch {
  /** A section counts as cut off below this share of its idle current, common practice [1]. */
  static final double CUT_OFF_SHARE = 0.1;

  /** At the knee the gain has fallen to this share of that at idle [1]. */
  static final double KNEE_SHARE = 0.5;

  /** A section this far down has to do with a fall of the gain [1]. */
  private static final double NEAR_CUT_OFF = 0.3;

  private static final double FIRST_STEPS = 16;
  private static final double GROWTH = 1.15;
  private static final int MOST_STEPS = 60;
  private static final int REFINEMENTS = 40;
  private static final double ACCURACY = 1e-4;

  private final HeldCharge dynamic;
  private final boolean composite;
  private final double[] idleCurrent;
  private final double idleGain;
  private final double scale;
  private Limit cause = Limit.NONE;

  /**
   * Starts at idle.
   *
   * @param dynamic the characteristic
   * @param composite whether a section may be cut off while others go on
   */
  SwingSearch(HeldCharge dynamic, boolean composite) {
    this.dynamic = dynamic;
    this.composite = composite;
    this.idleCurrent = new double[dynamic.valves()];
    dynamic.move(0);
    for (int v = 0; v < idleCurrent.length; v++) {
      idleCurrent[v] = dynamic.anodeCurrent(v);
    }
    this.scale = scale();
    this.idleGain = slope(0);
  }

  /** Source voltage that would bring the first section to an end if all were linear [V]. */
  private double scale() {
    double probe = 1e-3;
    double[] grid = new double[idleCurrent.length];
    for (int v = 0; v < grid.length; v++) {
      grid[v] = dynamic.gridVoltage(v);
    }
    if (!dynamic.move(probe)) {
      return 1;
    }
    double least = Double.POSITIVE_INFINITY;
    for (int v = 0; v < grid.length; v++) {
      double rate = (dynamic.anodeCurrent(v) - idleCurrent[v]) / probe;
      if (rate != 0) {
        least = Math.min(least, Math.abs(idleCurrent[v] / rate));
      }
      double up = (dynamic.gridVoltage(v) - grid[v]) / probe;
      double room = Math.abs(dynamic.gridOnset(v) - grid[v]);
      if (up != 0 && room > 0) {
        least = Math.min(least, room / Math.abs(up));
      }
    }
    return least > 0 && least < 1e6 ? least : 1;
  }

  /** Gain of the main output at a source voltage, from a small step [1]. */
  private double slope(double source) {
    double step = scale * 1e-3;
    if (!dynamic.move(source - step)) {
      return Double.NaN;
    }
    double before = dynamic.output(0);
    return dynamic.move(source + step) ? (dynamic.output(0) - before) / (2 * step) : Double.NaN;
  }

  /**
   * Searches one side.
   *
   * @param sign 1 for a rising input, -1 for a falling one
   */
  SwingEnd end(int sign) {
    double step = scale / FIRST_STEPS;
    double clean = 0;
    for (int i = 0; i < MOST_STEPS; i++) {
      double next = clean + step;
      if (!(margin(sign * next) > 0)) {
        return refined(sign, clean, next);
      }
      clean = next;
      step *= GROWTH;
    }
    return at(sign * clean, Limit.NONE);
  }

  private SwingEnd refined(int sign, double inside, double outside) {
    double low = inside;
    double high = outside;
    for (int i = 0; i < REFINEMENTS && high - low > ACCURACY * high; i++) {
      double middle = 0.5 * (low + high);
      if (margin(sign * middle) > 0) {
        low = middle;
      } else {
        high = middle;
      }
    }
    margin(sign * high);
    return at(sign * low, cause);
  }

  private SwingEnd at(double source, Limit limit) {
    dynamic.move(source);
    return new SwingEnd(source, dynamic.input(), dynamic.output(0), limit);
  }

  /** Above zero while clean; the smallest of the margins, whose cause is kept. */
  private double margin(double source) {
    double gain = slope(source) / idleGain;
    if (!dynamic.move(source) || Double.isNaN(gain)) {
      cause = Limit.NONE;
      return -1;
    }
    double least = Double.POSITIVE_INFINITY;
    boolean fading = false;
    for (int v = 0; v < idleCurrent.length; v++) {
      double room = dynamic.gridOnset(v) - dynamic.gridVoltage(v);
      if (room <= 0) {
        cause = Limit.GRID_CURRENT;
        return room;
      }
      double share = dynamic.anodeCurrent(v) / idleCurrent[v];
      fading |= share < NEAR_CUT_OFF;
      if (!composite && share - CUT_OFF_SHARE < least) {
        least = share - CUT_OFF_SHARE;
        cause = Limit.CUT_OFF;
      }
    }
    if ((composite || !fading) && gain - KNEE_SHARE < least) {
      least = gain - KNEE_SHARE;
      cause = Limit.KNEE;
    }
    return least;
  }
}
