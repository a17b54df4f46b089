package perveance.engine.circuit;

import perveance.engine.numeric.DenseLu;

/**
 * Damped Newton's method on nodal equations. A step is kept when the correction that the same
 * matrix would make afterwards is smaller than the step itself (natural monotonicity test: P.
 * Deuflhard, Newton Methods for Nonlinear Problems, Springer 2004, section 3.3); else it is
 * shortened. The test does not depend on how equations in amperes and in volts are scaled. Nothing
 * is allocated after construction.
 */
final class Newton {
  /** Kirchhoff's law must hold better than this at every node [A]. */
  static final double KIRCHHOFF = 1e-10;

  /** What a solve came to. */
  enum End {
    CONVERGED,
    SINGULAR,
    STALLED
  }

  private static final int MOST_ITERATIONS = 60;
  private static final double SHORTEST = 1.0 / 1024;

  /** A leak in the matrix alone: it lets a node whose valves are all cut off be solved [S]. */
  static final double LEAK = 1e-13;

  private final NodalSystem system;
  private final DenseLu lu;
  private final double[] matrix;
  private final double[] residual;
  private final double[] step;
  private final double[] trial;
  private final double[] correction;
  private int iterations;

  Newton(NodalSystem system) {
    int size = system.size;
    this.system = system;
    this.lu = new DenseLu(Math.max(1, size));
    this.matrix = new double[size * size];
    this.residual = new double[size];
    this.step = new double[size];
    this.trial = new double[size];
    this.correction = new double[size];
  }

  /** Iterations of the last solve. */
  int iterations() {
    return iterations;
  }

  /** Largest current that Kirchhoff's law leaves over at any node at the last point [A]. */
  double kirchhoffResidual() {
    double largest = 0;
    for (int i = 0; i < system.topology.unknownNodes; i++) {
      largest = Math.max(largest, Math.abs(residual[i]));
    }
    return largest;
  }

  /** The factored matrix of the last step, for further right-hand sides. */
  DenseLu factors() {
    return lu;
  }

  /** Solves from x and leaves the answer, or the last point, in x. */
  End solve(double[] x) {
    system.residual(x, residual);
    double damping = 1;
    for (iterations = 1; iterations <= MOST_ITERATIONS; iterations++) {
      if (!factor()) {
        return End.SINGULAR;
      }
      solveFor(residual, step);
      double length = norm(step, x);
      if (!(length < Double.MAX_VALUE)) {
        return End.SINGULAR;
      }
      if (length <= 1) {
        if (finish(x)) {
          return End.CONVERGED;
        }
        continue;
      }
      damping = advance(x, length, damping);
      if (damping == 0) {
        return End.STALLED;
      }
    }
    return End.STALLED;
  }

  private boolean factor() {
    system.jacobian(matrix);
    for (int i = 0; i < system.topology.unknownNodes; i++) {
      matrix[i * system.size + i] += LEAK;
    }
    return system.size == 0 || lu.factor(matrix);
  }

  private void solveFor(double[] left, double[] out) {
    for (int i = 0; i < left.length; i++) {
      out[i] = -left[i];
    }
    if (out.length > 0) {
      lu.solve(out);
    }
  }

  /** Takes the last, small step and looks whether Kirchhoff's law holds. */
  private boolean finish(double[] x) {
    for (int i = 0; i < x.length; i++) {
      x[i] += step[i];
    }
    system.residual(x, residual);
    return kirchhoffResidual() <= KIRCHHOFF;
  }

  /** Moves x along the step as far as helps; returns the damping used, 0 when none helps. */
  private double advance(double[] x, double length, double last) {
    double damping = Math.min(1, 2 * last);
    while (damping >= SHORTEST) {
      for (int i = 0; i < x.length; i++) {
        trial[i] = x[i] + damping * step[i];
      }
      system.residual(trial, residual);
      solveFor(residual, correction);
      double left = norm(correction, trial);
      if (left <= (1 - damping / 4) * length) {
        System.arraycopy(trial, 0, x, 0, x.length);
        return damping;
      }
      damping /= 2;
    }
    system.residual(x, residual);
    return 0;
  }

  /** Largest change of a node voltage, 1 where it no longer matters. */
  private double norm(double[] change, double[] x) {
    double largest = 0;
    for (int i = 0; i < system.topology.unknownNodes; i++) {
      largest = Math.max(largest, Math.abs(change[i]) / (1e-7 + 1e-9 * Math.abs(x[i])));
    }
    return largest;
  }
}
