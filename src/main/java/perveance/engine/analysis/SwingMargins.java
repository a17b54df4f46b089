package perveance.engine.analysis;

import perveance.engine.analysis.SwingEnd.Sign;

/**
 * How far a state of a stage is from each sign that its swing is at an end:
 *
 * <ul>
 *   <li>grid current: a grid reaches the onset that its law states (0.3 uA). A grid that conducts
 *       at idle already ends nothing by that, nor does one that is wired straight to an anode: no
 *       capacitor there takes up charge, and the current counts by what it loads;
 *   <li>cut-off: a section is down to a tenth of its idle current. A pair in push-pull may lose one
 *       section while the other goes on, so there this does not count;
 *   <li>output: the gain has fallen to half of that at idle, and not because a section cuts off;
 *   <li>input: the source moves the input half as much as at idle.
 * </ul>
 */
final class SwingMargins {
  /** A section counts as cut off below this share of its idle current, common practice [1]. */
  static final double CUT_OFF_SHARE = 0.1;

  /** At the end the gain has fallen to this share of that at idle [1]. */
  static final double SLOPE_SHARE = 0.5;

  /** A section this far down has to do with a fall of the gain [1]. */
  static final double NEAR_CUT_OFF = 0.3;

  /** A grid that follows the input by more than this is wired to it [1]. */
  private static final double FOLLOWS = 0.5;

  private static final double PROBE = 1e-3;

  private final StageCurve curve;
  private final boolean composite;
  private final double[] idleCurrent;
  private final double[] idleGrid;
  private final double[] idleAnode;

  /** Whether a grid's onset of current ends a swing. */
  private final boolean[] watched;

  private final double scale;
  private double idleGain;
  private double idleShare;

  /**
   * Starts at idle.
   *
   * @param curve the characteristic
   * @param composite whether a section may be cut off while others go on
   */
  SwingMargins(StageCurve curve, boolean composite) {
    this.curve = curve;
    this.composite = composite;
    this.idleCurrent = new double[curve.valves()];
    this.idleGrid = new double[curve.valves()];
    this.idleAnode = new double[curve.valves()];
    this.watched = new boolean[curve.own()];
    curve.move(0);
    readIdle();
    this.scale = scale();
    watch();
    readSlopes();
  }

  /** The same limits on another specimen's characteristic, which stands at idle. */
  private SwingMargins(SwingMargins nominal, StageCurve specimen, boolean slopes) {
    this.curve = specimen;
    this.composite = nominal.composite;
    this.idleCurrent = new double[specimen.valves()];
    this.idleGrid = new double[specimen.valves()];
    this.idleAnode = new double[specimen.valves()];
    this.watched = nominal.watched;
    readIdle();
    this.scale = nominal.scale;
    this.idleGain = nominal.idleGain;
    this.idleShare = nominal.idleShare;
    if (slopes) {
      readSlopes();
    }
  }

  /**
   * The same limits on another specimen's characteristic, which stands at idle.
   *
   * @param specimen the characteristic
   * @param slopes whether its slopes at idle are needed
   */
  SwingMargins on(StageCurve specimen, boolean slopes) {
    return new SwingMargins(this, specimen, slopes);
  }

  private void readIdle() {
    for (int v = 0; v < idleCurrent.length; v++) {
      idleCurrent[v] = curve.anodeCurrent(v);
      idleGrid[v] = curve.gridVoltage(v);
      idleAnode[v] = curve.anodeVoltage(v);
    }
  }

  private void readSlopes() {
    idleGain = outputSlope(0);
    idleShare = curve.atSource() ? 1 : inputSlope(0);
  }

  private void watch() {
    boolean moved = curve.move(PROBE * scale);
    double input = curve.input();
    for (int v = 0; v < watched.length; v++) {
      double follows = moved && input != 0 ? curve.gridToChassis(v) / input : 0;
      boolean wired = curve.wired() && follows > FOLLOWS;
      watched[v] = !wired && idleGrid[v] <= curve.gridOnset(v);
    }
  }

  /** Source voltage that would bring the first section to an end if all were linear [V]. */
  private double scale() {
    if (!curve.move(PROBE)) {
      return 1;
    }
    double least = Double.POSITIVE_INFINITY;
    for (int v = 0; v < watched.length; v++) {
      double rate = (curve.anodeCurrent(v) - idleCurrent[v]) / PROBE;
      if (rate != 0) {
        least = Math.min(least, Math.abs(idleCurrent[v] / rate));
      }
      double up = (curve.gridVoltage(v) - idleGrid[v]) / PROBE;
      double room = Math.abs(curve.gridOnset(v) - idleGrid[v]);
      if (up != 0 && room > 0) {
        least = Math.min(least, room / Math.abs(up));
      }
    }
    return least > 0 && least < 1e6 ? least : 1;
  }

  double scaleOfSource() {
    return scale;
  }

  /** How far a source voltage is from one sign of an end; zero or below beyond it [1]. */
  double margin(Sign sign, double source) {
    return switch (sign) {
      case GRID -> curve.move(source) ? gridRoom() : -1;
      case CUT_OFF -> curve.move(source) ? cutOffRoom() : -1;
      case OUTPUT -> idleGain == 0 ? -1 : outputSlope(source) / idleGain - SLOPE_SHARE;
      case INPUT -> idleShare == 0 ? -1 : inputSlope(source) / idleShare - SLOPE_SHARE;
      case NONE -> 1;
    };
  }

  /** Change of the main output for one of the input, around a source voltage [1]. */
  private double outputSlope(double source) {
    double step = scale * PROBE;
    if (!curve.move(source - step)) {
      return 0;
    }
    double output = curve.output(0);
    double input = curve.input();
    return curve.move(source + step) ? ratio(curve.output(0) - output, curve.input() - input) : 0;
  }

  private double inputSlope(double source) {
    double step = scale * PROBE;
    if (!curve.move(source - step)) {
      return 0;
    }
    double input = curve.input();
    return curve.move(source + step) ? (curve.input() - input) / (2 * step) : 0;
  }

  private static double ratio(double change, double by) {
    return by == 0 ? 0 : change / by;
  }

  /** Whether the output has fallen behind the input over a step. */
  boolean outputFell(double outputChange, double inputChange) {
    return ratio(outputChange, inputChange) / idleGain < SLOPE_SHARE;
  }

  /** Whether the input has fallen behind the source over a step. */
  boolean inputFell(double inputChange, double sourceChange) {
    return !curve.atSource() && inputChange / sourceChange / idleShare < SLOPE_SHARE;
  }

  /** Least room to the onset of grid current; zero or below once it flows [V]. */
  double gridRoom() {
    double least = Double.POSITIVE_INFINITY;
    for (int v = 0; v < watched.length; v++) {
      if (watched[v]) {
        least = Math.min(least, curve.gridOnset(v) - curve.gridVoltage(v));
      }
    }
    return least;
  }

  /** Least share of current above cut-off; zero or below once a section counts as cut off [1]. */
  double cutOffRoom() {
    double least = 1;
    for (int v = 0; v < watched.length && !composite; v++) {
      least = Math.min(least, currentShare(v) - CUT_OFF_SHARE);
    }
    return least;
  }

  /** Whether no section is near cut-off, which would explain a fall of the gain. */
  boolean whole() {
    for (int v = 0; v < watched.length && !composite; v++) {
      if (curve.anodeCurrent(v) < NEAR_CUT_OFF * idleCurrent[v]) {
        return false;
      }
    }
    return true;
  }

  /** Whether a section's anode stands higher than at idle. */
  boolean risen(int valve) {
    return curve.anodeVoltage(valve) > idleAnode[valve];
  }

  /** Anode current of a section over that at idle [1]. */
  double currentShare(int valve) {
    return curve.anodeCurrent(valve) / idleCurrent[valve];
  }

  /** How far a grid has come beyond its onset, if it has risen since idle [V]. */
  double conduction(int valve) {
    double now = curve.gridVoltage(valve);
    return now > idleGrid[valve] ? now - curve.gridOnset(valve) : Double.NEGATIVE_INFINITY;
  }
}
