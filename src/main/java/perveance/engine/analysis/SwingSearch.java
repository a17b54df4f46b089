package perveance.engine.analysis;

import java.util.function.DoubleUnaryOperator;
import perveance.engine.analysis.CleanSwing.Limit;

/**
 * Follows the mid-band characteristic outward from idle until the swing stops being clean:
 *
 * <ul>
 *   <li>grid current: a grid reaches the onset that its law states (0.3 uA); a grid that conducts
 *       at idle already, as in a follower wired straight to an anode, ends nothing by that;
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

  private static final double FIRST_STEP = 0.25;
  private static final double GROWTH = 1.4;
  private static final int MOST_STEPS = 24;
  private static final int REFINEMENTS = 30;
  private static final double ACCURACY = 1e-5;

  private final StageCurve curve;
  private final boolean composite;
  private final double[] idleCurrent;

  /** Whether grid current flows at idle already, so that its onset ends nothing. */
  private final boolean[] conducting;

  private final double scale;
  private double idleGain;

  /**
   * Starts at idle.
   *
   * @param curve the characteristic
   * @param composite whether a section may be cut off while others go on
   */
  SwingSearch(StageCurve curve, boolean composite) {
    this.curve = curve;
    this.composite = composite;
    this.idleCurrent = new double[curve.valves()];
    this.conducting = new boolean[curve.valves()];
    curve.move(0);
    readIdle();
    for (int v = 0; v < conducting.length; v++) {
      conducting[v] = curve.gridVoltage(v) > curve.gridOnset(v);
    }
    this.scale = scale();
    this.idleGain = slope(0);
  }

  /**
   * The same limits on another specimen's characteristic, which stands at idle.
   *
   * @param specimen the characteristic
   * @param knee whether a knee is followed, for which the gain at idle is needed
   */
  private SwingSearch(SwingSearch nominal, StageCurve specimen, boolean knee) {
    this.curve = specimen;
    this.composite = nominal.composite;
    this.idleCurrent = new double[specimen.valves()];
    this.conducting = nominal.conducting;
    readIdle();
    this.scale = nominal.scale;
    this.idleGain = knee ? slope(0) : nominal.idleGain;
  }

  /** The same limits on another specimen's characteristic, which stands at idle. */
  SwingSearch on(StageCurve specimen, boolean knee) {
    return new SwingSearch(this, specimen, knee);
  }

  private void readIdle() {
    for (int v = 0; v < idleCurrent.length; v++) {
      idleCurrent[v] = curve.anodeCurrent(v);
    }
  }

  /** How far a source voltage is from one kind of end; zero or below beyond it [1]. */
  double margin(Limit limit, double source) {
    return switch (limit) {
      case GRID_CURRENT -> curve.move(source) ? gridRoom() : -1;
      case CUT_OFF -> curve.move(source) ? cutOffRoom() : -1;
      case KNEE -> idleGain == 0 ? -1 : slope(source) / idleGain - KNEE_SHARE;
      case NONE -> 1;
    };
  }

  /** Source voltage that would bring the first section to an end if all were linear [V]. */
  private double scale() {
    double probe = 1e-3;
    double[] grid = new double[idleCurrent.length];
    for (int v = 0; v < grid.length; v++) {
      grid[v] = curve.gridVoltage(v);
    }
    if (!curve.move(probe)) {
      return 1;
    }
    double least = Double.POSITIVE_INFINITY;
    for (int v = 0; v < grid.length; v++) {
      double rate = (curve.anodeCurrent(v) - idleCurrent[v]) / probe;
      if (rate != 0) {
        least = Math.min(least, Math.abs(idleCurrent[v] / rate));
      }
      double up = (curve.gridVoltage(v) - grid[v]) / probe;
      double room = Math.abs(curve.gridOnset(v) - grid[v]);
      if (up != 0 && room > 0) {
        least = Math.min(least, room / Math.abs(up));
      }
    }
    return least > 0 && least < 1e6 ? least : 1;
  }

  /** Gain of the main output at a source voltage, from a small step [1]. */
  private double slope(double source) {
    double step = scale * 1e-3;
    if (!curve.move(source - step)) {
      return 0;
    }
    double before = curve.output(0);
    return curve.move(source + step) ? (curve.output(0) - before) / (2 * step) : 0;
  }

  /**
   * Searches one side.
   *
   * @param sign 1 for a rising input, -1 for a falling one
   */
  SwingEnd end(int sign) {
    double step = FIRST_STEP * scale;
    double before = 0;
    double clean = 0;
    double output = 0;
    for (int i = 0; i < MOST_STEPS; i++) {
      double next = clean + step;
      if (!curve.move(sign * next)) {
        return at(sign * clean, Limit.NONE);
      }
      double reached = curve.output(0);
      double gain = (reached - output) / (sign * step) / idleGain;
      boolean knee = gain < KNEE_SHARE && (composite || !fading());
      if (gridRoom() <= 0 || cutOffRoom() <= 0 || knee) {
        return nearest(sign, before, clean, next, knee);
      }
      before = clean;
      clean = next;
      output = reached;
      step *= GROWTH;
    }
    return at(sign * clean, Limit.NONE);
  }

  /** Which of the ends between two points comes first. */
  private SwingEnd nearest(int sign, double before, double clean, double next, boolean knee) {
    curve.move(sign * next);
    boolean grid = gridRoom() <= 0;
    boolean cutOff = cutOffRoom() <= 0;
    double end = next;
    Limit limit = Limit.KNEE;
    if (grid) {
      end = zero(clean, next, x -> margin(Limit.GRID_CURRENT, sign * x));
      limit = Limit.GRID_CURRENT;
    }
    if (cutOff) {
      double at = zero(clean, next, x -> margin(Limit.CUT_OFF, sign * x));
      limit = at < end || !grid ? Limit.CUT_OFF : limit;
      end = Math.min(at, end);
    }
    if (knee) {
      double at = zero(before, next, x -> margin(Limit.KNEE, sign * x));
      limit = at < end || !(grid || cutOff) ? Limit.KNEE : limit;
      end = Math.min(at, end);
    }
    return at(sign * end, limit);
  }

  /** Where a margin falls through zero: false position, Illinois variant. */
  private static double zero(double from, double to, DoubleUnaryOperator margin) {
    double low = from;
    double high = to;
    double atLow = margin.applyAsDouble(low);
    double atHigh = margin.applyAsDouble(high);
    if (!(atLow > 0)) {
      return low;
    }
    int side = 0;
    for (int i = 0; i < REFINEMENTS && high - low > ACCURACY * high; i++) {
      double x = atHigh < 0 ? low + (high - low) * atLow / (atLow - atHigh) : high;
      double at = margin.applyAsDouble(x);
      if (Math.abs(at) < 1e-7) {
        return x;
      } else if (at > 0) {
        low = x;
        atLow = at;
        atHigh = side > 0 ? atHigh / 2 : atHigh;
        side = 1;
      } else {
        high = x;
        atHigh = at;
        atLow = side < 0 ? atLow / 2 : atLow;
        side = -1;
      }
    }
    return low;
  }

  private SwingEnd at(double source, Limit limit) {
    curve.move(source);
    return new SwingEnd(source, curve.input(), curve.output(0), limit);
  }

  /** Least room to the onset of grid current; zero or below once it flows [V]. */
  private double gridRoom() {
    double least = Double.POSITIVE_INFINITY;
    for (int v = 0; v < idleCurrent.length; v++) {
      if (!conducting[v]) {
        least = Math.min(least, curve.gridOnset(v) - curve.gridVoltage(v));
      }
    }
    return least;
  }

  /** Least share of current above cut-off; zero or below once a section counts as cut off [1]. */
  private double cutOffRoom() {
    double least = 1;
    for (int v = 0; v < idleCurrent.length && !composite; v++) {
      least = Math.min(least, curve.anodeCurrent(v) / idleCurrent[v] - CUT_OFF_SHARE);
    }
    return least;
  }

  /** Whether a section is near cut-off, which then explains a fall of the gain. */
  private boolean fading() {
    for (int v = 0; v < idleCurrent.length; v++) {
      if (curve.anodeCurrent(v) < NEAR_CUT_OFF * idleCurrent[v]) {
        return true;
      }
    }
    return false;
  }
}
