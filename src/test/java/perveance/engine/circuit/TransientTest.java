package perveance.engine.circuit;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertInstanceOf;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.util.List;
import java.util.function.DoubleUnaryOperator;
import org.junit.jupiter.api.Test;
import perveance.engine.circuit.CircuitSketch.Coil;
import perveance.engine.circuit.DcOutcome.Converged;

/** Courses in time against closed forms and against the steady state that they end in. */
class TransientTest {
  private static final ThreeHalvesTriode LAW = new ThreeHalvesTriode(1.6e-3, 100, 0.6, 1e-5, 0.1);

  private static TransientSolution completed(TransientOutcome outcome) {
    return assertInstanceOf(TransientOutcome.Completed.class, outcome).solution();
  }

  private static DcSolution rest(Circuit c) {
    return assertInstanceOf(Converged.class, new DcSolver(c).solve()).solution();
  }

  /**
   * derived: 10 k and 10 uF on 100 V from empty: v = 100 (1 - exp(-t / 0.1 s)). Tolerance: the
   * error of all steps, some tens of the 1e-5 allowed in each.
   */
  @Test
  void capacitorCharges() {
    Circuit c =
        new CircuitSketch()
            .source("supply", "B", "0", 100)
            .resistor("r", "B", "c", 10e3)
            .holds("c", "c", "0", 10e-6)
            .build();
    TransientSolution course = completed(Transient.fromCold(c, TransientSetup.until(1)));
    double[] time = course.times();
    double[] v = course.voltage(c.node("c"));
    for (int k = 0; k < time.length; k++) {
      assertEquals(100 * -Math.expm1(-time[k] / 0.1), v[k], 0.01, "at " + time[k]);
    }
    assertEquals(0.01 * Math.exp(-1), course.current(c.element("c"))[nearest(time, 0.1)], 2e-4);
  }

  private static int nearest(double[] time, double when) {
    int best = 0;
    for (int k = 0; k < time.length; k++) {
      best = Math.abs(time[k] - when) < Math.abs(time[best] - when) ? k : best;
    }
    return best;
  }

  /**
   * derived: 1 H with 100 ohm and 1 uF after a step of 10 V rings at w = sqrt(1 / LC - (R / 2L)^2)
   * with damping a = R / 2L: v = 10 (1 - exp(-a t) (cos w t + a / w sin w t)). Tolerance: 1e-3 of
   * the step at a tolerance of 1e-6 a step.
   */
  @Test
  void seriesCircuitRings() {
    Circuit c =
        new CircuitSketch()
            .source("in", "in", "0", 10)
            .inductor("choke", "in", "c", 1, 100)
            .holds("c", "c", "0", 1e-6)
            .resistor("leak", "c", "0", 1e12)
            .build();
    TransientSetup setup = TransientSetup.until(0.03).withTolerance(1e-6);
    TransientSolution course = completed(Transient.fromCold(c, setup));
    double a = 50;
    double w = Math.sqrt(1e6 - a * a);
    double[] time = course.times();
    double[] v = course.voltage(c.node("c"));
    for (int k = 0; k < time.length; k++) {
      double wave = Math.cos(w * time[k]) + a / w * Math.sin(w * time[k]);
      assertEquals(10 * (1 - Math.exp(-a * time[k]) * wave), v[k], 0.01, "at " + time[k]);
    }
  }

  /**
   * derived: a transformer of ratio 10, 2 H seen at the first winding, driven from 100 ohm with 10
   * V and loaded with 8 ohm: the reflected load is 800 ohm, so the output starts at 10 * 800 / 900
   * / 10 V and falls with L / (100 parallel 800) = 22.5 ms.
   */
  @Test
  void transformerDroops() {
    Circuit c =
        new CircuitSketch()
            .source("in", "in", "0", 0)
            .resistor("source", "in", "p", 100)
            .transformer("t", 2, new Coil("p", "0", 10, 0, 0), new Coil("s", "0", 1, 0, 0))
            .resistor("load", "s", "0", 8)
            .build();
    TransientSetup setup =
        TransientSetup.until(0.1)
            .withCourse(c.element("in"), t -> 10, List.of())
            .withTolerance(1e-6);
    TransientSolution course = completed(Transient.from(rest(c), setup));
    double tau = 2 / (1 / (1 / 100.0 + 1 / 800.0));
    double[] time = course.times();
    double[] v = course.voltage(c.node("s"));
    for (int k = 0; k < time.length; k++) {
      assertEquals(8.0 / 9 * Math.exp(-time[k] / tau), v[k], 1e-3, "at " + time[k]);
    }
  }

  private static Circuit stage() {
    return new CircuitSketch()
        .source("supply", "B", "0", 300)
        .source("in", "in", "0", 0)
        .resistor("source", "in", "i", 10e3)
        .holds("input", "i", "g", 22e-9)
        .resistor("grid_leak", "g", "0", 1e6)
        .resistor("anode_load", "B", "a", 100e3)
        .triode("V1", LAW, "a", "g", "k")
        .resistor("cathode_resistor", "k", "0", 1.5e3)
        .holds("bypass", "k", "0", 22e-6)
        .holds("coupling", "a", "out", 22e-9)
        .resistor("next", "out", "0", 470e3)
        .build();
  }

  /** A dc point stays where it is. Tolerance: that of the dc point. */
  @Test
  void restStaysAtRest() {
    Circuit c = stage();
    DcSolution rest = rest(c);
    TransientSolution course = completed(Transient.from(rest, TransientSetup.until(1)));
    for (int node = 0; node < c.nodes().size(); node++) {
      for (double v : course.voltage(node)) {
        assertEquals(rest.voltage(node), v, 1e-6, c.nodes().get(node));
      }
    }
  }

  /** From cold, with a cathode that warms up in ten seconds, the stage ends in its dc point. */
  @Test
  void coldStartEndsAtRest() {
    Circuit c = stage();
    DcSolution rest = rest(c);
    DoubleUnaryOperator warm = t -> Math.min(1, Math.max(0, (t - 2) / 8));
    TransientSetup setup =
        TransientSetup.until(15).withEmission(c.element("V1"), warm, List.of(2.0, 10.0));
    TransientSolution course = completed(Transient.fromCold(c, setup));
    assertEquals(300, course.voltageAt(c.node("a"), 1.9), 1e-3);
    assertEquals(rest.voltage("a"), course.voltageAt(c.node("a"), 15), 1e-3);
    assertEquals(rest.voltage("k"), course.voltageAt(c.node("k"), 15), 1e-4);
  }

  /**
   * An overload of 20 V for 50 ms charges the coupling capacitor through the grid. Afterwards the
   * grid stands below zero and returns with the capacitor's time constant, (1 M + 10 k) 22 nF =
   * 22.2 ms. derived: the ratio of the grid voltage one time constant apart is e. Tolerance: 1 %.
   */
  @Test
  void overloadBlocksAndRecovers() {
    Circuit c = stage();
    DoubleUnaryOperator burst = t -> t < 0.05 ? 20 * Math.sin(2 * Math.PI * 1000 * t) : 0;
    TransientSetup setup =
        TransientSetup.until(0.2)
            .withCourse(c.element("in"), burst, List.of(0.05))
            .withLongestStep(2e-5);
    TransientSolution course = completed(Transient.from(rest(c), setup));
    double tau = 1.01e6 * 22e-9;
    int grid = c.node("g");
    double early = course.voltageAt(grid, 0.06);
    double late = course.voltageAt(grid, 0.06 + tau);
    assertTrue(early < -3, "blocked at " + early);
    assertEquals(Math.E, early / late, 0.01 * Math.E);
    assertTrue(course.voltageAt(c.node("a"), 0.055) > rest(c).voltage("a") + 20);
  }

  /**
   * A sine that lasts ends in the cycle of the mid-band solution where coupling and bypass are
   * stiff: mean anode voltage within 0.05 V, peak within 0.2 % at 1 kHz.
   */
  @Test
  void longSineAgreesWithTheSteadyCycle() {
    Circuit c = stage();
    DcSolution rest = rest(c);
    MidbandSolution cycle =
        assertInstanceOf(
                MidbandOutcome.Converged.class,
                new MidbandSolver(rest, Drive.of(Waveform.cosine(64), c.element("in"))).solve(1))
            .solution();
    double[] steady = cycle.voltage(c.node("out"), 0);
    TransientSetup setup =
        TransientSetup.until(0.2)
            .withCourse(c.element("in"), t -> Math.cos(2 * Math.PI * 1000 * t), List.of())
            .withLongestStep(1e-5);
    TransientSolution course = completed(Transient.from(rest, setup));
    int out = c.node("out");
    assertEquals(steady[0], course.voltageAt(out, 0.199), 0.004 * Math.abs(steady[0]));
    assertEquals(steady[32], course.voltageAt(out, 0.1995), 0.004 * Math.abs(steady[32]));
  }

  /** The rule is of second order: a tolerance a thousandth as large brings 1/100 of the error. */
  @Test
  void errorFollowsTheTolerance() {
    Circuit c =
        new CircuitSketch()
            .source("supply", "B", "0", 100)
            .resistor("r", "B", "c", 10e3)
            .holds("c", "c", "0", 10e-6)
            .build();
    double loose = worst(c, 1e-4);
    double tight = worst(c, 1e-7);
    assertTrue(tight < loose / 50, loose + " and " + tight);
  }

  private static double worst(Circuit c, double tolerance) {
    TransientSetup setup = TransientSetup.until(0.3).withTolerance(tolerance).withLongestStep(0.1);
    TransientSolution course = completed(Transient.fromCold(c, setup));
    double[] time = course.times();
    double[] v = course.voltage(c.node("c"));
    double worst = 0;
    for (int k = 0; k < time.length; k++) {
      worst = Math.max(worst, Math.abs(100 * -Math.expm1(-time[k] / 0.1) - v[k]));
    }
    return worst;
  }
}
