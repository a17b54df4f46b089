package perveance.engine.analysis;

import perveance.engine.analysis.CleanSwing.Limit;
import perveance.engine.analysis.SwingEnd.Sign;

/**
 * Names what ends a swing and the valve section where it happens, from the state at the end. A
 * stage that is wired straight to others may be ended by theirs: the grid of the next one loads it,
 * or the one before can move its input no further.
 *
 * @param limit what ends the swing
 * @param at reference of the section; empty for none
 */
record SwingCause(Limit limit, String at) {
  /** Below its onset by less than this a grid may load a large resistance already [V]. */
  private static final double NEAR_ONSET = 0.2;

  static final SwingCause NONE = new SwingCause(Limit.NONE, "");

  /** The cause at the curve's present state. */
  static SwingCause of(StageCurve curve, SwingMargins margins, Sign sign) {
    return switch (sign) {
      case GRID -> new SwingCause(Limit.GRID_CURRENT, curve.ref(mostConducting(curve, margins, 0)));
      case CUT_OFF -> new SwingCause(Limit.CUT_OFF, curve.ref(leastCurrent(curve, margins, 0)));
      case OUTPUT -> slope(curve, margins, 0, curve.own());
      case INPUT -> slope(curve, margins, curve.own(), curve.valves());
      case NONE -> NONE;
    };
  }

  /** A fall of a slope: a grid loads it, a section of those named is cut off or bottomed. */
  private static SwingCause slope(StageCurve curve, SwingMargins margins, int from, int to) {
    int grid = mostConducting(curve, margins, curve.valves());
    if (margins.conduction(grid) > -NEAR_ONSET) {
      return new SwingCause(Limit.GRID_CURRENT, curve.ref(grid));
    }
    if (from >= to) {
      return NONE;
    }
    int weakest = leastCurrent(curve, margins, from);
    if (from > 0 && margins.currentShare(weakest) < SwingMargins.NEAR_CUT_OFF) {
      return new SwingCause(Limit.CUT_OFF, curve.ref(weakest));
    }
    int lowest = from;
    for (int v = from; v < to; v++) {
      lowest = curve.anodeVoltage(v) < curve.anodeVoltage(lowest) ? v : lowest;
    }
    return new SwingCause(fallen(curve, margins, lowest), curve.ref(lowest));
  }

  private static Limit fallen(StageCurve curve, SwingMargins margins, int valve) {
    if (margins.risen(valve)) {
      return Limit.SUPPLY;
    }
    return curve.screened(valve) ? Limit.KNEE : Limit.BOTTOMING;
  }

  /** The section whose grid is furthest beyond its onset; the stage's own where count is 0. */
  private static int mostConducting(StageCurve curve, SwingMargins margins, int count) {
    int most = 0;
    for (int v = 0; v < Math.max(count, curve.own()); v++) {
      most = margins.conduction(v) > margins.conduction(most) ? v : most;
    }
    return most;
  }

  private static int leastCurrent(StageCurve curve, SwingMargins margins, int from) {
    int least = from;
    for (int v = from; v < (from > 0 ? curve.valves() : curve.own()); v++) {
      least = margins.currentShare(v) < margins.currentShare(least) ? v : least;
    }
    return least;
  }
}
