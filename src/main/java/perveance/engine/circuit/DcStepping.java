package perveance.engine.circuit;

import java.util.Arrays;
import perveance.engine.circuit.DcOutcome.Method;

/**
 * Newton's method with its fallbacks: leaks to chassis that are taken away step by step, and
 * sources that are raised step by step (both are common practice in circuit simulation: L. W.
 * Nagel, Memorandum ERL-M520, University of California, Berkeley, 1975); at last pseudo-transient
 * continuation, every node held where it was by less and less (C. T. Kelley and D. E. Keyes, SIAM
 * J. Numer. Anal. 35, 508, 1998).
 */
final class DcStepping {
  private static final double FIRST_LEAK = 1e-2;
  private static final double LAST_LEAK = 1e-13;
  private static final double SMALLEST_STEP = 1e-4;
  private static final double FIRST_HOLD = 1;
  private static final int MOST_HOLDS = 300;

  private final DcEquations equations;
  private final Newton newton;
  private final double[] start;
  private final double[] kept;
  private int iterations;
  private Method method = Method.NEWTON;

  DcStepping(DcEquations equations, Newton newton) {
    this.equations = equations;
    this.newton = newton;
    this.start = new double[equations.system.size];
    this.kept = new double[equations.system.size];
  }

  int iterations() {
    return iterations;
  }

  Method method() {
    return method;
  }

  Newton.End solve(double[] x) {
    iterations = 0;
    method = Method.NEWTON;
    System.arraycopy(x, 0, start, 0, x.length);
    Newton.End end = isZero(x) ? attemptCold(x) : attempt(x, 1, 0);
    if (end == Newton.End.CONVERGED) {
      return end;
    }
    if (removeLeaks(x)) {
      method = Method.GMIN_STEPPING;
      return Newton.End.CONVERGED;
    }
    if (raiseSources(x)) {
      method = Method.SOURCE_STEPPING;
      return Newton.End.CONVERGED;
    }
    if (letGo(x)) {
      method = Method.PSEUDO_TIME;
      return Newton.End.CONVERGED;
    }
    System.arraycopy(start, 0, x, 0, x.length);
    return attempt(x, 1, 0);
  }

  private static boolean isZero(double[] x) {
    for (double value : x) {
      if (value != 0) {
        return false;
      }
    }
    return true;
  }

  private Newton.End attemptCold(double[] x) {
    equations.stamp(1, 0);
    newton.prepare();
    Newton.End end = newton.solveCold(x);
    iterations += newton.iterations();
    return end;
  }

  private Newton.End attempt(double[] x, double sourceScale, double leak) {
    equations.stamp(sourceScale, leak);
    newton.prepare();
    Newton.End end = newton.solve(x);
    iterations += newton.iterations();
    return end;
  }

  private boolean removeLeaks(double[] x) {
    Arrays.fill(x, 0);
    double leak = FIRST_LEAK;
    double factor = 10;
    if (attempt(x, 1, leak) != Newton.End.CONVERGED) {
      return false;
    }
    while (leak > LAST_LEAK) {
      System.arraycopy(x, 0, kept, 0, x.length);
      if (attempt(x, 1, leak / factor) == Newton.End.CONVERGED) {
        leak /= factor;
        factor = Math.min(10, factor * factor);
      } else {
        System.arraycopy(kept, 0, x, 0, x.length);
        factor = Math.sqrt(factor);
        if (factor < 1.05) {
          return false;
        }
      }
    }
    return attempt(x, 1, 0) == Newton.End.CONVERGED;
  }

  /**
   * The last resort: where every hold down to a leak was followed, the point counts if Kirchhoff's
   * law holds at it, though voltages that only rounding or leakage decides may still move.
   */
  private boolean letGo(double[] x) {
    Arrays.fill(x, 0);
    double hold = FIRST_HOLD;
    for (int i = 0; i < MOST_HOLDS && hold > LAST_LEAK; i++) {
      System.arraycopy(x, 0, kept, 0, x.length);
      equations.stamp(1, 0);
      equations.hold(hold, kept);
      newton.prepare();
      boolean reached =
          newton.solve(x) == Newton.End.CONVERGED || newton.kirchhoffResidual() <= Newton.KIRCHHOFF;
      iterations += newton.iterations();
      if (!reached) {
        System.arraycopy(kept, 0, x, 0, x.length);
      }
      hold *= reached ? 0.5 : 4;
    }
    System.arraycopy(x, 0, kept, 0, x.length);
    if (attempt(x, 1, 0) == Newton.End.CONVERGED) {
      return true;
    }
    System.arraycopy(kept, 0, x, 0, x.length);
    return hold <= LAST_LEAK && newton.balance(x) <= Newton.KIRCHHOFF;
  }

  private boolean raiseSources(double[] x) {
    Arrays.fill(x, 0);
    double reached = 0;
    double stride = 0.1;
    while (reached < 1) {
      System.arraycopy(x, 0, kept, 0, x.length);
      double next = Math.min(1, reached + stride);
      if (attempt(x, next, 0) == Newton.End.CONVERGED) {
        reached = next;
        stride *= 2;
      } else {
        System.arraycopy(kept, 0, x, 0, x.length);
        stride /= 4;
        if (stride < SMALLEST_STEP) {
          return false;
        }
      }
    }
    return true;
  }
}
