package perveance.engine.circuit;

import perveance.engine.numeric.DenseLu;

/**
 * Large signals at mid-band, without memory within a cycle: coupling and bypass capacitors hold the
 * voltage, chokes and cores the current, at which nothing more flows into them in the mean. The
 * point rests where the drive has shifted it, so mean currents, rectified bias and distortion are
 * those of the steady state.
 *
 * <p>For each sample the nodal equations are solved; the held quantities are found by Newton's
 * method on their mean imbalance, with exact derivatives from the factored matrices. The last
 * solution serves as the start of the next, so a sweep of levels is best asked upward.
 *
 * <p>Valid well above the corners of coupling and bypass and well below those of strays and leakage
 * inductance. Not for use by two threads at once.
 */
public final class MidbandSolver {
  private static final int MOST_PASSES = 40;

  /** A move so small that its square no longer matters: the cycle moves along by its slopes [V]. */
  private static final double CLOSE = 1e-5;

  /** A move so small that the last cycle, moved along, is a good start for the next [V]. */
  private static final double NEAR = 1;

  /** What the sum of the currents at any node and sample of an answer is below [A]. */
  private static final double RESIDUAL = 1e-9;

  private static final double SMALLEST_DAMPING = 1.0 / 64;
  private static final double SMALLEST_STRIDE = 1.0 / 256;

  private final DcSolution rest;
  private final Drive drive;
  private final MidbandEquations equations;
  private final MidbandCycle cycle;
  private final DenseLu lu;
  private final double[] restPoint;
  private final double[] hold;
  private final double[] trial;
  private final double[] step;
  private final double[] correction;
  private final double[] matrix;
  private boolean warm;
  private double solvedPeak;
  private int passes;

  /**
   * Prepares a signal about a dc point.
   *
   * @param rest dc point without signal
   * @param drive signal
   */
  public MidbandSolver(DcSolution rest, Drive drive) {
    this.rest = rest;
    this.drive = drive;
    this.equations = new MidbandEquations(rest.circuit(), drive.shares());
    this.cycle = new MidbandCycle(equations, drive.waveform());
    int holds = equations.holds;
    this.lu = new DenseLu(Math.max(1, holds));
    this.restPoint = equations.unknownsAt(rest);
    this.hold = equations.holdsAt(rest);
    this.trial = new double[holds];
    this.step = new double[holds];
    this.correction = new double[holds];
    this.matrix = new double[holds * holds];
  }

  /**
   * Finds the steady cycle at a level.
   *
   * @param peak peak of the waveform; each source gets its share of it, zero or above [V] or [A]
   * @return the cycle, or why there is none
   */
  public MidbandOutcome solve(double peak) {
    ElementChecks.notNegative("peak", peak);
    passes = 0;
    if (warm && solvedPeak > 0 && near(peak / solvedPeak)) {
      cycle.stretch(restPoint, peak / solvedPeak);
      if (balance(peak, true)) {
        return found(peak);
      }
    }
    if (balance(peak, false)) {
      return found(peak);
    }
    return climb(peak);
  }

  private static boolean near(double ratio) {
    return ratio > 0.8 && ratio < 1.25;
  }

  private MidbandOutcome found(double peak) {
    MidbandSolution solution = solution(peak);
    if (!(solution.residual() < RESIDUAL) && pass(peak, hold, true)) {
      solution = solution(peak);
    }
    if (!(solution.residual() < RESIDUAL)) {
      reset();
      return new MidbandOutcome.NotConverged(
          "the currents of the cycle do not balance", peak, solvedPeak);
    }
    warm = true;
    solvedPeak = peak;
    return new MidbandOutcome.Converged(solution, passes);
  }

  private MidbandSolution solution(double peak) {
    return new MidbandSolution(equations, drive.waveform(), cycle.points, hold, peak);
  }

  /** Raises the level from nothing in strides that shrink where a stride fails. */
  private MidbandOutcome climb(double peak) {
    reset();
    double reached = 0;
    double stride = 0.25;
    while (reached < 1) {
      double next = Math.min(1, reached + stride);
      if (balance(next * peak, false)) {
        reached = next;
        stride *= 1.5;
      } else {
        stride /= 2;
        if (stride < SMALLEST_STRIDE) {
          reset();
          return new MidbandOutcome.NotConverged(
              "no steady cycle was found at this drive", peak, reached * peak);
        }
      }
    }
    return found(peak);
  }

  private void reset() {
    warm = false;
    System.arraycopy(equations.holdsAt(rest), 0, hold, 0, hold.length);
  }

  /** Newton's method on the held quantities; restores them when it fails. */
  private boolean balance(double peak, boolean startWarm) {
    double[] kept = hold.clone();
    if (pass(peak, hold, startWarm)) {
      for (int i = 0; i < MOST_PASSES; i++) {
        System.arraycopy(cycle.slope, 0, matrix, 0, matrix.length);
        if (hold.length == 0) {
          return true;
        }
        if (!lu.factor(matrix)) {
          break;
        }
        solveFor(step);
        double length = cycle.reach(step);
        if (length <= CLOSE) {
          add(step, 1, hold);
          cycle.shift(step, 1);
          return true;
        }
        if (!(length < Double.MAX_VALUE) || !advance(peak, length)) {
          break;
        }
      }
    }
    System.arraycopy(kept, 0, hold, 0, hold.length);
    return false;
  }

  private boolean advance(double peak, double length) {
    for (double damping = 1; damping >= SMALLEST_DAMPING; damping /= 2) {
      System.arraycopy(hold, 0, trial, 0, hold.length);
      add(step, damping, trial);
      boolean close = damping == 1 && length < NEAR;
      if (close) {
        cycle.shift(step, 1);
      }
      if (pass(peak, trial, close)) {
        solveFor(correction);
        if (cycle.reach(correction) <= (1 - damping / 4) * length) {
          System.arraycopy(trial, 0, hold, 0, hold.length);
          return true;
        }
      }
    }
    return false;
  }

  private static void add(double[] change, double factor, double[] to) {
    for (int h = 0; h < to.length; h++) {
      to[h] += factor * change[h];
    }
  }

  private boolean pass(double peak, double[] held, boolean startWarm) {
    passes++;
    return cycle.run(peak, held, restPoint, startWarm)
        || (startWarm && cycle.run(peak, held, restPoint, false));
  }

  private void solveFor(double[] out) {
    for (int h = 0; h < out.length; h++) {
      out[h] = -cycle.mean[h];
    }
    lu.solve(out);
  }
}
