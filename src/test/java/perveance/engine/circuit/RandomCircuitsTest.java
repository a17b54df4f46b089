package perveance.engine.circuit;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertFalse;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.util.EnumMap;
import java.util.Map;
import org.junit.jupiter.api.Test;
import perveance.engine.circuit.DcOutcome.Cause;
import perveance.engine.circuit.DcOutcome.Converged;
import perveance.engine.circuit.DcOutcome.Method;
import perveance.engine.circuit.DcOutcome.NotConverged;

/** Any legal circuit is solved, with the currents in balance, or refused with a reason. */
class RandomCircuitsTest {
  private static final int CIRCUITS = 5000;
  private static final long SEED = 20;

  @Test
  void solvedInBalanceOrRefusedWithAReason() {
    RandomCircuits circuits = new RandomCircuits(SEED);
    Map<Method, Integer> solved = new EnumMap<>(Method.class);
    Map<Cause, Integer> refused = new EnumMap<>(Cause.class);
    for (int i = 0; i < CIRCUITS; i++) {
      Circuit circuit = circuits.next();
      DcOutcome outcome = new DcSolver(circuit).solve();
      String which = "circuit " + i + " of seed " + SEED;
      if (outcome instanceof Converged found) {
        solved.merge(found.method(), 1, Integer::sum);
        checkPoint(circuit, found, which);
        checkSignals(circuit, found.solution(), which);
      } else if (outcome instanceof NotConverged refusal) {
        refused.merge(refusal.cause(), 1, Integer::sum);
        assertFalse(refusal.reason().isBlank(), which);
      }
    }
    // half of the random wirings leave a node floating or short a source; of the others nearly
    // all are solved, and nine in ten of them by Newton's method alone
    int points = solved.values().stream().mapToInt(Integer::intValue).sum();
    int lost =
        refused.getOrDefault(Cause.NO_CONVERGENCE, 0) + refused.getOrDefault(Cause.SINGULAR, 0);
    assertTrue(points > CIRCUITS / 2, "solved " + solved + ", refused " + refused);
    assertTrue(lost < points / 100, "solved " + solved + ", refused " + refused);
    assertTrue(solved.getOrDefault(Method.NEWTON, 0) > 0.9 * points, "solved " + solved);
  }

  private static void checkPoint(Circuit circuit, Converged found, String which) {
    DcSolution point = found.solution();
    assertTrue(found.residual() < 1e-9, which);
    double highest = 0;
    double power = 0;
    for (int node = 0; node < circuit.nodes().size(); node++) {
      assertTrue(Double.isFinite(point.voltage(node)), which);
      highest = Math.max(highest, Math.abs(point.voltage(node)));
    }
    for (Element element : circuit.elements()) {
      power += Math.abs(point.power(element.name()));
    }
    // what Kirchhoff's law leaves over at each node, times its voltage; rounding; 1e-11 W is what
    // the rounding of 1 kV to 1e-13 V makes in 10 ohm
    double leftOver = found.residual() * highest * circuit.nodes().size();
    double allowed = leftOver + 1e-11 * power + 1e-11;
    assertEquals(0, point.powerBalance(), allowed, which);
  }

  private static void checkSignals(Circuit circuit, DcSolution point, String which) {
    SmallSignal signals = new SmallSignal(point);
    if (signals.refusal().isPresent()) {
      assertFalse(signals.refusal().get().isBlank(), which);
      return;
    }
    int supply = circuit.element("supply");
    int last = circuit.nodes().size() - 1;
    assertTrue(Double.isFinite(signals.midbandGain(supply, last, 0)), which);
    assertTrue(Double.isFinite(signals.transfer(supply, last, 0, 1000).magnitude()), which);
    assertTrue(Double.isFinite(signals.outputImpedance(last, 0, 1000).magnitude()), which);
  }

  /** Cycles and courses of solved circuits: an answer in finite numbers, or a reason. */
  @Test
  void cyclesAndCoursesAreFiniteOrRefused() {
    RandomCircuits circuits = new RandomCircuits(SEED + 1);
    int found = 0;
    for (int i = 0; i < 300; i++) {
      Circuit circuit = circuits.next();
      if (new DcSolver(circuit).solve() instanceof Converged point) {
        String which = "circuit " + i + " of seed " + (SEED + 1);
        Drive drive = Drive.of(Waveform.cosine(16), circuit.element("supply"));
        double peak = Math.pow(10, i % 4 - 1);
        if (new MidbandSolver(point.solution(), drive).solve(peak)
            instanceof MidbandOutcome.Converged cycle) {
          found++;
          checkCycle(circuit, cycle.solution(), which);
          assertTrue(cycle.solution().residual() < 1e-9, which);
        }
        if (new ReactiveSolver(point.solution(), drive, 1000).solve(peak)
            instanceof ReactiveOutcome.Converged cycle) {
          checkCycle(circuit, cycle.solution(), which);
          assertTrue(cycle.solution().residual() <= 1e-6, which);
        }
        checkCourse(circuit, which);
      }
    }
    assertTrue(found > 100, "found " + found);
  }

  private static void checkCycle(Circuit circuit, PeriodicState state, String which) {
    for (int node = 0; node < circuit.nodes().size(); node++) {
      for (double v : state.voltage(node, 0)) {
        assertTrue(Double.isFinite(v), which);
      }
    }
    assertTrue(Double.isFinite(state.powerBalance()), which);
  }

  private static void checkCourse(Circuit circuit, String which) {
    TransientOutcome outcome = Transient.fromCold(circuit, TransientSetup.until(1e-3));
    TransientSolution course =
        outcome instanceof TransientOutcome.Completed done
            ? done.solution()
            : ((TransientOutcome.Stopped) outcome).soFar();
    for (int node = 0; node < circuit.nodes().size(); node++) {
      for (double v : course.voltage(node)) {
        assertTrue(Double.isFinite(v), which);
      }
    }
  }

  /** The same point is found from a neighbour's as from nothing. */
  @Test
  void startDoesNotMatterForAStage() {
    Circuit stage =
        new CircuitSketch()
            .source("supply", "B", "0", 250)
            .resistor("anode_load", "B", "a", 100e3)
            .resistor("cathode_resistor", "k", "0", 1.5e3)
            .resistor("grid_leak", "g", "0", 1e6)
            .triode("V1", new ThreeHalvesTriode(1.6e-3, 100, 0.6, 1e-5, 0.1), "a", "g", "k")
            .build();
    DcSolver solver = new DcSolver(stage);
    double[] walked = new double[solver.pointLength()];
    double[] fresh = new double[solver.pointLength()];
    for (double load = 10; load < 1e7; load *= 1.5) {
      solver.setResistance(stage.element("anode_load"), load);
      assertTrue(solver.solveInto(walked));
      java.util.Arrays.fill(fresh, 0);
      assertTrue(solver.solveInto(fresh));
      for (int i = 0; i < fresh.length; i++) {
        assertEquals(fresh[i], walked[i], 1e-9 * Math.max(1, Math.abs(fresh[i])), "load " + load);
      }
    }
  }
}
