package perveance.engine.circuit;

import java.util.Arrays;

/**
 * Solves the points of one cycle for given held quantities, and how far the held quantities are
 * from balance. A waveform that is even about its start is solved over half a cycle.
 */
final class MidbandCycle {
  private static final int DEEPEST = 10;

  private final MidbandEquations equations;
  private final Waveform waveform;
  private final Newton newton;
  private final double[] before;

  /** Unknowns at each sample that was solved. */
  final double[][] points;

  /** Mean imbalance of each held quantity. */
  final double[] mean;

  /** Its derivative by each held quantity, row by row. */
  final double[] slope;

  /** Change of the unknowns at each sample by each held quantity. */
  private final double[][][] byHold;

  MidbandCycle(MidbandEquations equations, Waveform waveform) {
    int size = equations.system.size;
    this.equations = equations;
    this.waveform = waveform;
    this.newton = new Newton(equations.system);
    newton.prepare();
    this.before = new double[size];
    this.points = new double[waveform.distinct()][size];
    this.byHold = new double[points.length][equations.holds][size];
    this.mean = new double[equations.holds];
    this.slope = new double[equations.holds * equations.holds];
  }

  /**
   * Runs a cycle.
   *
   * @param start unknowns without drive, from which the first sample is reached; not used when warm
   * @param warm whether {@link #points} already holds a good guess
   */
  boolean run(double level, double[] hold, double[] start, boolean warm) {
    Arrays.fill(mean, 0);
    Arrays.fill(slope, 0);
    for (int k = 0; k < points.length; k++) {
      double drive = level * waveform.sample(k);
      if (!warm && !reachFromLast(k, level, hold, start)) {
        return false;
      }
      if (warm && !settle(drive, hold, points[k])) {
        return false;
      }
      accumulate(k, hold);
    }
    return true;
  }

  /** Largest change of a node's voltage at any sample for a change of the held quantities [V]. */
  double reach(double[] change) {
    double largest = 0;
    for (double[][] sample : byHold) {
      for (int i = 0; i < equations.topology.unknownNodes; i++) {
        double moved = 0;
        for (int h = 0; h < change.length; h++) {
          moved += change[h] * sample[h][i];
        }
        // written so that what is no number counts as large
        if (!(Math.abs(moved) <= largest)) {
          largest = Math.abs(moved);
        }
      }
    }
    return largest;
  }

  /** Moves all points along with a small change of the held quantities. */
  void shift(double[] change, double factor) {
    for (int k = 0; k < points.length; k++) {
      for (int h = 0; h < change.length; h++) {
        for (int i = 0; i < points[k].length; i++) {
          points[k][i] += factor * change[h] * byHold[k][h][i];
        }
      }
    }
  }

  /** Stretches all points away from the point of rest, for a start at another level. */
  void stretch(double[] rest, double ratio) {
    for (double[] point : points) {
      for (int i = 0; i < point.length; i++) {
        point[i] = rest[i] + ratio * (point[i] - rest[i]);
      }
    }
  }

  private boolean reachFromLast(int k, double level, double[] hold, double[] start) {
    double drive = level * waveform.sample(k);
    double[] from = k == 0 ? start : points[k - 1];
    double fromDrive = k == 0 ? 0 : level * waveform.sample(k - 1);
    System.arraycopy(from, 0, points[k], 0, from.length);
    if (k > 1) {
      double last = waveform.sample(k - 1) - waveform.sample(k - 2);
      double next = waveform.sample(k) - waveform.sample(k - 1);
      double ratio = Math.max(-2, Math.min(2, last == 0 ? 0 : next / last));
      for (int i = 0; i < from.length; i++) {
        points[k][i] += ratio * (from[i] - points[k - 2][i]);
      }
    }
    if (settle(drive, hold, points[k])) {
      return true;
    }
    System.arraycopy(from, 0, points[k], 0, from.length);
    return approach(fromDrive, drive, hold, points[k], DEEPEST);
  }

  /** Goes from a solved drive to another, halving the way where a step is too long. */
  private boolean approach(double from, double to, double[] hold, double[] x, int depth) {
    System.arraycopy(x, 0, before, 0, x.length);
    if (settle(to, hold, x)) {
      return true;
    }
    System.arraycopy(before, 0, x, 0, x.length);
    double middle = 0.5 * (from + to);
    return depth > 0
        && approach(from, middle, hold, x, depth - 1)
        && approach(middle, to, hold, x, depth - 1);
  }

  private boolean settle(double drive, double[] hold, double[] x) {
    equations.set(drive, hold);
    return newton.solve(x) == Newton.End.CONVERGED;
  }

  private void accumulate(int k, double[] hold) {
    int count = waveform.count();
    boolean counted = points.length < count && k > 0 && k < count / 2;
    double weight = (counted ? 2.0 : 1.0) / count;
    int holds = equations.holds;
    for (int h = 0; h < holds; h++) {
      mean[h] += weight * equations.imbalance(h, points[k], hold);
    }
    for (int by = 0; by < holds; by++) {
      double[] step = byHold[k][by];
      Arrays.fill(step, 0);
      equations.addHeld(by, 1, step);
      newton.respond(step);
      for (int h = 0; h < holds; h++) {
        slope[h * holds + by] += weight * equations.imbalanceSlope(h, step, by);
      }
    }
  }
}
