package perveance.engine.circuit;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertInstanceOf;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.util.List;
import java.util.Map;
import org.junit.jupiter.api.Test;
import perveance.engine.circuit.CircuitSketch.Coil;
import perveance.engine.circuit.DcOutcome.Converged;
import perveance.engine.numeric.Harmonics;

/** Cycles at a stated frequency against closed forms, the mid-band cycle and the course in time. */
class ReactiveSolverTest {
  private static final ThreeHalvesTriode SMALL = new ThreeHalvesTriode(1.6e-3, 100, 0.6, 1e-5, 0.1);
  private static final ThreeHalvesTriode POWER = new ThreeHalvesTriode(8.45e-4, 4.2, 0, 0, 1);

  private static DcSolution rest(Circuit c) {
    return assertInstanceOf(Converged.class, new DcSolver(c).solve()).solution();
  }

  private static ReactiveSolution driven(Circuit c, double frequency, double peak) {
    Drive drive = Drive.of(Waveform.cosine(64), c.element("in"));
    ReactiveOutcome outcome = new ReactiveSolver(rest(c), drive, frequency).solve(peak);
    return assertInstanceOf(ReactiveOutcome.Converged.class, outcome).solution();
  }

  /**
   * derived: i = 60 + 30 cos mA through |Z| = 5 k at 45 degrees (3535.5 ohm and 3535.5 ohm of
   * reactance in series), 250 V at rest: the anode swings 150 V each way, the load takes 1.591 W,
   * the anode stands at 143.9 V when the current is highest and the current at 81.2 mA when the
   * voltage is lowest. Samples stand on both extremes: 64 is a multiple of 8. Tolerance: digits
   * quoted.
   */
  @Test
  void ellipseOfAnInductiveLoad() {
    double part = 5000 / Math.sqrt(2);
    Circuit c =
        new CircuitSketch()
            .source("supply", "B", "0", 250 + 0.06 * part)
            .source("in", "g", "0", 0)
            .triode("V1", new PolynomialValve(List.of(60e-3, 30e-3)), "a", "g", "0")
            .resistor("r", "B", "m", part)
            .inductor("l", "m", "a", part / (2 * Math.PI * 1000), 0)
            .build();
    ReactiveSolution cycle = driven(c, 1000, 1);
    double[] v = cycle.voltage(c.node("a"), 0);
    double[] i = cycle.current(c.element("V1"));
    int highestCurrent = 0;
    int lowestVoltage = 0;
    for (int k = 0; k < v.length; k++) {
      highestCurrent = i[k] > i[highestCurrent] ? k : highestCurrent;
      lowestVoltage = v[k] < v[lowestVoltage] ? k : lowestVoltage;
    }
    assertEquals(100, v[lowestVoltage], 1e-6);
    assertEquals(143.9, v[highestCurrent], 0.05);
    assertEquals(81.2e-3, i[lowestVoltage], 0.05e-3);
    double load = cycle.meanPower(c.element("r")) - 0.06 * 0.06 * part;
    assertEquals(1.591, load, 0.0005);
    assertEquals(0, cycle.powerBalance(), 1e-7);
    assertTrue(cycle.residual() < 1e-9, "residual " + cycle.residual());
  }

  private static Circuit stage() {
    return new CircuitSketch()
        .source("supply", "B", "0", 300)
        .source("in", "in", "0", 0)
        .resistor("source", "in", "i", 10e3)
        .holds("input", "i", "g", 22e-9)
        .resistor("grid_leak", "g", "0", 1e6)
        .resistor("anode_load", "B", "a", 100e3)
        .triode("V1", SMALL, "a", "g", "k")
        .resistor("cathode_resistor", "k", "0", 1.5e3)
        .holds("bypass", "k", "0", 22e-6)
        .holds("coupling", "a", "out", 22e-9)
        .resistor("next", "out", "0", 470e3)
        .stray("wiring", "out", "0", 50e-12)
        .build();
  }

  /** derived: a small signal has the gain of the small-signal solution, in size and phase. */
  @Test
  void smallSignalsAgree() {
    Circuit c = stage();
    SmallSignal signals = new SmallSignal(rest(c));
    for (double frequency : new double[] {5, 50, 5e3, 100e3}) {
      Harmonics h = driven(c, frequency, 1e-4).harmonics(c.node("out"), 0);
      Complex gain = signals.transfer(c.element("in"), c.node("out"), 0, frequency);
      double scale = 1e-4 * gain.magnitude();
      assertEquals(1e-4 * gain.re(), h.cosine(1), 1e-4 * scale, "at " + frequency);
      assertEquals(-1e-4 * gain.im(), h.sine(1), 1e-4 * scale, "at " + frequency);
    }
  }

  /**
   * Far above the corners of coupling and bypass, and without strays, the cycle is that of the
   * mid-band solution. Tolerance: 1e-4, the ripple left on the bypass at 100 kHz being below it.
   */
  @Test
  void highFrequencyIsMidband() {
    Circuit c =
        new Circuit(
            stage().nodes(),
            stage().elements().stream().filter(e -> !e.name().equals("wiring")).toList());
    Drive drive = Drive.of(Waveform.cosine(64), c.element("in"));
    MidbandSolution held =
        assertInstanceOf(
                MidbandOutcome.Converged.class, new MidbandSolver(rest(c), drive).solve(1.5))
            .solution();
    Harmonics expected = held.harmonics(c.node("out"), 0);
    Harmonics found = driven(c, 100e3, 1.5).harmonics(c.node("out"), 0);
    for (int n = 1; n <= 5; n++) {
      double allowed = 1e-4 * expected.amplitude(1);
      assertEquals(expected.cosine(n), found.cosine(n), allowed, "harmonic " + n);
    }
    assertEquals(
        held.meanVoltage(c.node("a"), 0), driven(c, 100e3, 1.5).meanVoltage(c.node("a"), 0), 1e-3);
  }

  /** A course in time that has become steady shows the same cycle; 1 kHz, 60 V of swing. */
  @Test
  void agreesWithTheCourseInTime() {
    Circuit c = stage();
    ReactiveSolution cycle = driven(c, 1000, 1.2);
    TransientSetup setup =
        TransientSetup.until(0.25)
            .withCourse(c.element("in"), t -> 1.2 * Math.cos(2 * Math.PI * 1000 * t), List.of())
            .withLongestStep(4e-6)
            .withStrays();
    TransientSolution course =
        assertInstanceOf(TransientOutcome.Completed.class, Transient.from(rest(c), setup))
            .solution();
    double[] out = cycle.voltage(c.node("out"), 0);
    for (int k = 0; k < out.length; k++) {
      double inTime = course.voltageAt(c.node("out"), 0.248 + k * 1e-3 / out.length);
      // the course's own error, 1e-5 a step, and straight lines between steps of 4 us
      assertEquals(inTime, out[k], 0.01, "sample " + k);
    }
  }

  /**
   * A push-pull stage with a loudspeaker of 8 ohm and 1 mH behind a real transformer: the power of
   * the supply goes into valves and parts.
   */
  @Test
  void loudspeakerOnAPushPullStage() {
    Circuit c =
        new CircuitSketch()
            .source("supply", "B", "0", 250)
            .source("in", "g1", "0", -42.4)
            .source("in2", "g2", "0", -42.4)
            .triode("V1", POWER, "a1", "g1", "0")
            .triode("V2", POWER, "a2", "g2", "0")
            .transformer(
                "output",
                20,
                new Coil("a1", "B", 1, 100, 5e-3),
                new Coil("B", "a2", 1, 100, 5e-3),
                new Coil("s", "0", 0.08, 0.3, 1e-5))
            .resistor("voice", "s", "m", 8)
            .inductor("coil", "m", "0", 1e-3, 0.5)
            .build();
    Drive drive =
        new Drive(Waveform.cosine(32), Map.of(c.element("in"), 1.0, c.element("in2"), -1.0));
    ReactiveOutcome outcome = new ReactiveSolver(rest(c), drive, 2000).solve(40);
    ReactiveSolution cycle = assertInstanceOf(ReactiveOutcome.Converged.class, outcome).solution();
    assertEquals(0, cycle.powerBalance(), 1e-6);
    assertTrue(cycle.meanPower(c.element("voice")) > 1);
    Harmonics h = cycle.harmonics(c.node("s"), 0);
    assertEquals(0, h.relative(2).orElseThrow(), 1e-9);
  }

  /**
   * A valve driven hard into cut-off and grid current has edges that 16 samples fold. The answer
   * comes with more samples, and agrees with one that started from eight times as many; with edges
   * too sharp for any number of samples at hand there is a reason and no answer. Tolerance: 1e-3 of
   * the fundamental; what lies above half of the fewest samples that pass is left out of both.
   */
  @Test
  void foldedEdgesAreSolvedWithMoreSamplesOrRefused() {
    Circuit c = stage();
    Drive coarse = Drive.of(Waveform.cosine(16), c.element("in"));
    ReactiveOutcome outcome = new ReactiveSolver(rest(c), coarse, 1000).solve(3);
    ReactiveSolution found = assertInstanceOf(ReactiveOutcome.Converged.class, outcome).solution();
    assertTrue(found.count() > 16, "samples " + found.count());
    assertTrue(found.residual() <= 1e-6, "residual " + found.residual());
    Drive fine = Drive.of(Waveform.cosine(128), c.element("in"));
    ReactiveOutcome finer = new ReactiveSolver(rest(c), fine, 1000).solve(3);
    Harmonics expected =
        assertInstanceOf(ReactiveOutcome.Converged.class, finer)
            .solution()
            .harmonics(c.node("out"), 0);
    Harmonics harmonics = found.harmonics(c.node("out"), 0);
    for (int n = 1; n <= 5; n++) {
      double allowed = 1e-3 * expected.amplitude(1);
      assertEquals(expected.cosine(n), harmonics.cosine(n), allowed, "harmonic " + n);
    }
    ReactiveOutcome sharp = new ReactiveSolver(rest(c), coarse, 1000).solve(300);
    String reason = assertInstanceOf(ReactiveOutcome.NotConverged.class, sharp).reason();
    assertTrue(reason.contains("too sharp"), reason);
  }
}
