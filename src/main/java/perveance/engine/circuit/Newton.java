package perveance.engine.circuit;

import java.util.Arrays;
import perveance.engine.numeric.DenseLu;

/**
 * Damped Newton's method on nodal equations. Linear unknowns are condensed out once for a matrix
 * ({@link #prepare}), so that an iteration deals with the nodes of devices alone. A step is kept
 * when the correction that the same matrix would make afterwards is smaller than the step itself
 * (natural monotonicity test: P. Deuflhard, Newton Methods for Nonlinear Problems, Springer 2004,
 * section 3.3); else it is shortened. The test does not depend on how equations in amperes and in
 * volts are scaled. Nothing is allocated after construction.
 */
final class Newton {
  /** Kirchhoff's law must hold better than this at every node [A]. */
  static final double KIRCHHOFF = 3e-10;

  /** A balance that leakage across any socket upsets [A]. */
  private static final double LEAKAGE = 1e-12;

  /** A leak in the matrix alone: it lets a node whose valves are all cut off be solved [S]. */
  static final double LEAK = 1e-13;

  /** What a solve came to. */
  enum End {
    CONVERGED,
    SINGULAR,
    STALLED
  }

  private static final int REFINEMENTS = 3;
  private static final int MOST_ITERATIONS = 60;
  private static final double SHORTEST = 1.0 / 1024;

  private final NodalSystem system;
  private final ColdStart coldStart;
  private final Condensation condensation;
  private final double[] left;
  private DenseLu lu = new DenseLu(1);
  private double[] linear = new double[0];
  private double[] matrix = new double[0];
  private double[] constant = new double[0];
  private double[] unknowns = new double[0];
  private double[] residual = new double[0];
  private double[] step = new double[0];
  private double[] trial = new double[0];
  private double[] correction = new double[0];
  private int size;
  private int iterations;
  private double kirchhoff;

  Newton(NodalSystem system) {
    this.system = system;
    this.coldStart = new ColdStart(system);
    this.condensation = new Condensation(system.size, system.topology.deviceNodes);
    this.left = new double[system.size];
  }

  /** Takes the system's matrix as it now is; must be called whenever it has changed. */
  void prepare() {
    condensation.eliminate(system.linear);
    resize(condensation.size());
    condensation.remaining(linear);
  }

  /** Happens when pivots are chosen anew, which a change of values by many decades may ask for. */
  private void resize(int needed) {
    if (needed != size || linear.length != needed * needed) {
      size = needed;
      lu = new DenseLu(Math.max(1, needed));
      linear = new double[needed * needed];
      matrix = new double[needed * needed];
      constant = new double[needed];
      unknowns = new double[needed];
      residual = new double[needed];
      step = new double[needed];
      trial = new double[needed];
      correction = new double[needed];
    }
  }

  /** Iterations of the last solve. */
  int iterations() {
    return iterations;
  }

  /** Largest current that Kirchhoff's law leaves over at any node at the last point [A]. */
  double kirchhoffResidual() {
    return kirchhoff;
  }

  /** Solves from x for the system's present constants; leaves the answer, or last point, in x. */
  End solve(double[] x) {
    condensation.forward(system.constant, constant);
    for (int i = 0; i < size; i++) {
      unknowns[i] = x[condensation.column(i)];
    }
    return finish(x);
  }

  /** As {@link #solve}, from the tangents of all valves instead of a point. */
  End solveCold(double[] x) {
    condensation.forward(system.constant, constant);
    System.arraycopy(linear, 0, matrix, 0, matrix.length);
    coldStart.addSlopes(matrix, size);
    addLeaks();
    if (size > 0 && lu.factor(matrix)) {
      System.arraycopy(constant, 0, residual, 0, size);
      coldStart.addCurrents(residual);
      solveFor(residual, unknowns);
    } else {
      Arrays.fill(unknowns, 0);
    }
    return finish(x);
  }

  /**
   * Iterates, completes the point and sums the currents of every node. Where the steps do not die
   * out but the currents balance to a picoampere, the voltages that still move are those that only
   * leakage would decide: the point is taken.
   */
  private End finish(double[] x) {
    End end = iterate();
    complete(x);
    for (int i = 0; i < REFINEMENTS && end == End.CONVERGED && !(kirchhoff <= KIRCHHOFF); i++) {
      evaluate(unknowns);
      if (!factor()) {
        return End.SINGULAR;
      }
      solveFor(residual, step);
      add(step);
      condensation.forward(system.constant, constant);
      complete(x);
    }
    if (end == End.CONVERGED) {
      return kirchhoff <= KIRCHHOFF ? end : End.STALLED;
    }
    return kirchhoff <= LEAKAGE ? End.CONVERGED : end;
  }

  private void complete(double[] x) {
    condensation.backward(unknowns, x);
    balance(x);
  }

  /** Largest current that the present equations leave over at a whole point [A]. */
  double balance(double[] x) {
    kirchhoff = system.kirchhoff(x, left);
    return kirchhoff;
  }

  private End iterate() {
    evaluate(unknowns);
    double damping = 1;
    for (iterations = 1; iterations <= MOST_ITERATIONS; iterations++) {
      if (!factor()) {
        return End.SINGULAR;
      }
      solveFor(residual, step);
      double length = norm(step, unknowns);
      if (!(length < Double.MAX_VALUE)) {
        return End.SINGULAR;
      }
      if (length <= 1) {
        add(step);
        return End.CONVERGED;
      }
      damping = advance(length, damping);
      if (damping == 0) {
        return End.STALLED;
      }
      if (norm(correction, unknowns) <= 1) {
        add(correction);
        return End.CONVERGED;
      }
    }
    return End.STALLED;
  }

  private void add(double[] change) {
    for (int i = 0; i < size; i++) {
      unknowns[i] += change[i];
    }
  }

  private void evaluate(double[] at) {
    system.evaluateDevices(at);
    NodalSystem.multiply(linear, constant, at, residual, size);
    system.valves.addCurrents(residual);
    system.junctions.addCurrents(residual);
  }

  private boolean factor() {
    System.arraycopy(linear, 0, matrix, 0, matrix.length);
    system.valves.addSlopes(matrix, size);
    system.junctions.addSlopes(matrix, size);
    addLeaks();
    return size == 0 || lu.factor(matrix);
  }

  private void addLeaks() {
    for (int i = 0; i < system.topology.deviceNodes; i++) {
      matrix[i * size + i] += LEAK;
    }
  }

  private void solveFor(double[] leftOver, double[] out) {
    for (int i = 0; i < size; i++) {
      out[i] = -leftOver[i];
    }
    if (size > 0) {
      lu.solve(out);
    }
  }

  /** Moves along the step as far as helps; returns the damping used, 0 when none helps. */
  private double advance(double length, double last) {
    double damping = Math.min(1, 2 * last);
    while (damping >= SHORTEST) {
      for (int i = 0; i < size; i++) {
        trial[i] = unknowns[i] + damping * step[i];
      }
      evaluate(trial);
      solveFor(residual, correction);
      if (norm(correction, trial) <= (1 - damping / 4) * length) {
        System.arraycopy(trial, 0, unknowns, 0, size);
        return damping;
      }
      damping /= 2;
    }
    return 0;
  }

  /** Largest change of a device's node voltage, 1 where it no longer matters. */
  private double norm(double[] change, double[] at) {
    double largest = 0;
    for (int i = 0; i < system.topology.deviceNodes; i++) {
      largest = Math.max(largest, Math.abs(change[i]) / (1e-7 + 1e-9 * Math.abs(at[i])));
    }
    return largest;
  }

  /** Change of the solution for changed constants, by the last factored matrix; in place. */
  void respond(double[] constantChange) {
    condensation.forward(constantChange, step);
    for (int i = 0; i < size; i++) {
      step[i] = -step[i];
    }
    if (size > 0) {
      lu.solve(step);
    }
    condensation.backward(step, constantChange);
  }
}
