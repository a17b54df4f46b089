package perveance.engine.circuit;

import java.util.ArrayList;
import java.util.List;

/**
 * The course of a circuit in time: start-up from cold, blocking by an overload and its recovery,
 * switching. The trapezoidal rule with its local error held within the tolerance; the first step
 * after each corner is a short one by the backward Euler rule, which damps what a jump sets off.
 */
public final class Transient {
  private static final int MOST_STEPS = 200_000;

  /** First step after a corner, against the whole time. */
  private static final double FIRST = 1e-7;

  /** Steps are given up below this, against the whole time. */
  private static final double SHORTEST = 1e-12;

  private static final double SAFETY = 0.9;
  private static final double SMALLEST_STRIDE = 1e-5;

  private final TransientSetup setup;
  private final TransientEquations equations;
  private final Newton newton;
  private final CurrentLedger ledger;
  private final double[] x;
  private final double[] trial;
  private final double[] before;
  private final List<TransientRow> rows = new ArrayList<>();
  private double time;
  private int rejected;

  private Transient(Circuit circuit, TransientSetup setup) {
    this.setup = setup;
    this.equations = new TransientEquations(circuit, setup);
    NodalSystem system = equations.system;
    this.newton = new Newton(system);
    this.ledger = new CurrentLedger(equations.topology, system.valves, system.junctions);
    this.x = new double[system.size];
    this.trial = new double[system.size];
    this.before = new double[system.size];
  }

  /**
   * Runs from a dc point.
   *
   * @param rest point at time zero
   * @param setup what happens
   * @return the course, or where it stopped
   */
  public static TransientOutcome from(DcSolution rest, TransientSetup setup) {
    Transient run = new Transient(rest.circuit(), setup);
    run.equations.startFrom(rest);
    return run.run();
  }

  /**
   * Runs from nothing: all capacitors empty, no current in any winding, sources switched on at time
   * zero.
   *
   * @param circuit circuit
   * @param setup what happens
   * @return the course, or where it stopped
   */
  public static TransientOutcome fromCold(Circuit circuit, TransientSetup setup) {
    return new Transient(circuit, setup).run();
  }

  private TransientOutcome run() {
    double first = FIRST * setup.endTime();
    // an instant so short that nothing stored can change shows the voltages at time zero
    if (!step(first, false) && !raiseSources(first)) {
      return stopped("the circuit has no state to start from");
    }
    settle(0, first);
    List<Double> ends = new ArrayList<>(setup.corners());
    ends.removeIf(t -> !(t > 0 && t < setup.endTime()));
    ends.add(setup.endTime());
    for (double end : ends) {
      double reached = time;
      if (!advance(Math.min(first, (end - reached) / 2), end)) {
        return stopped(
            rows.size() > MOST_STEPS
                ? "more than " + MOST_STEPS + " steps were needed"
                : "no step was short enough for the currents to balance");
      }
    }
    return new TransientOutcome.Completed(solution(), rows.size() - 1, rejected);
  }

  /** Steps to a corner, the first step short. */
  private boolean advance(double firstStep, double end) {
    double step = firstStep;
    boolean trapezoidal = false;
    while (time < end) {
      double left = end - time;
      double length = step >= left ? left : Math.min(step, left / 2);
      double growth = attempt(length, trapezoidal);
      if (growth > 0) {
        boolean last = length == left;
        settle(last ? end : time + length, length);
        trapezoidal = true;
      } else {
        rejected++;
      }
      step = Math.min(setup.longestStep(), length * Math.abs(growth));
      if (step < SHORTEST * setup.endTime() || rows.size() > MOST_STEPS) {
        return false;
      }
    }
    return true;
  }

  /** Tries a step; the factor for the next one, negative when this one must be taken again. */
  private double attempt(double length, boolean trapezoidal) {
    if (!step(length, trapezoidal)) {
      return -0.25;
    }
    if (!trapezoidal) {
      return 2;
    }
    double error = equations.stores.error(length, setup.tolerance());
    double factor = error == 0 ? 2 : SAFETY / Math.cbrt(error);
    return error > 1 ? -Math.max(0.2, factor) : Math.min(2, factor);
  }

  private boolean step(double length, boolean trapezoidal) {
    System.arraycopy(x, 0, trial, 0, x.length);
    equations.setTime(time + length);
    equations.stamp(length, trapezoidal, 1);
    newton.prepare();
    if (newton.solve(trial) != Newton.End.CONVERGED) {
      System.arraycopy(before, 0, trial, 0, trial.length);
      if (newton.solve(trial) != Newton.End.CONVERGED) {
        return false;
      }
    }
    equations.read(trial, length, trapezoidal);
    return true;
  }

  /** A first step that Newton's method does not find at once: sources are raised by degrees. */
  private boolean raiseSources(double length) {
    java.util.Arrays.fill(trial, 0);
    double reached = 0;
    double stride = 0.1;
    while (reached < 1) {
      System.arraycopy(trial, 0, before, 0, trial.length);
      double next = Math.min(1, reached + stride);
      equations.stamp(length, false, next);
      newton.prepare();
      if (newton.solve(trial) == Newton.End.CONVERGED) {
        reached = next;
        stride *= 2;
      } else {
        System.arraycopy(before, 0, trial, 0, trial.length);
        stride /= 4;
        if (stride < SMALLEST_STRIDE) {
          return false;
        }
      }
    }
    equations.read(trial, length, false);
    return true;
  }

  /** Keeps the step that was tried. */
  private void settle(double newTime, double length) {
    System.arraycopy(x, 0, before, 0, x.length);
    System.arraycopy(trial, 0, x, 0, x.length);
    time = newTime;
    equations.stores.accept(length);
    ledger.fill(
        equations.values,
        equations.system.voltage,
        (element, winding) -> equations.branchCurrent(x, equations.stores.flow, element, winding));
    rows.add(TransientRow.of(time, equations.system.voltage, ledger, equations.system.valves));
  }

  private TransientOutcome stopped(String reason) {
    return new TransientOutcome.Stopped(reason, time, solution());
  }

  private TransientSolution solution() {
    return new TransientSolution(equations.topology.circuit, rows, equations.system.valves.element);
  }
}
