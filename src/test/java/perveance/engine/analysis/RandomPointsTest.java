package perveance.engine.analysis;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertFalse;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.util.List;
import java.util.Map;
import java.util.concurrent.ConcurrentSkipListMap;
import java.util.stream.IntStream;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.TestReporter;
import perveance.engine.circuit.DcOutcome;
import perveance.engine.circuit.DcSolution;
import perveance.engine.circuit.DcSolver;
import perveance.engine.circuit.Element;
import perveance.engine.stage.Chassis;
import perveance.engine.stage.ChassisChecks;
import perveance.engine.stage.ChassisCircuits;
import perveance.engine.stage.ChassisCircuits.Built;
import perveance.engine.stage.ChassisComplaint;
import perveance.engine.stage.StageCircuit;
import perveance.engine.stage.StageCircuit.StageDevice;
import perveance.engine.stage.StageEntry;

/**
 * Robustness of dc points and limits as a property, over 100,000 chassis: each is solved with every
 * valve's figures finite, Kirchhoff's law kept to 1 nA and the energy in balance; or it is refused
 * with a reason. None is left without a point. The shares and the reasons are reported. The full
 * answers are tried on fewer in {@link RandomChassisTest}. The number is set by {@code
 * perveance.random.points}.
 */
class RandomPointsTest {
  private static final int COUNT = Integer.getInteger("perveance.random.points", 100_000);

  /** Each with a seed of its own, worked on side by side. */
  private static final int SLICES = 20;

  /** How many of what needed stepping are told one by one. */
  private static final int TOLD = 12;

  private final Map<String, Integer> counts = new ConcurrentSkipListMap<>();

  /** What needed more than leaks, by its place in the run. */
  private final Map<String, String> stepping = new ConcurrentSkipListMap<>();

  @Test
  void everyChassisHasItsPointOrAReason(TestReporter reporter) {
    IntStream.range(0, SLICES).parallel().forEach(this::tryOutSlice);
    counts.forEach((what, count) -> reporter.publishEntry(what, Integer.toString(count)));
    int solved = count("solved");
    assertTrue(solved > COUNT / 4, counts::toString);
    assertEquals(0, count("no point"), counts::toString);
    stepping.values().forEach(reporter::publishEntry);
  }

  private void tryOutSlice(int slice) {
    RandomChassis source = new RandomChassis(19061028 + slice);
    for (int i = 0; i < COUNT / SLICES; i++) {
      tryOut(source.next());
    }
  }

  private int count(String outcome) {
    return counts.entrySet().stream()
        .filter(e -> e.getKey().startsWith(outcome))
        .mapToInt(Map.Entry::getValue)
        .sum();
  }

  private void tryOut(Chassis chassis) {
    try {
      List<ChassisComplaint> complaints = ChassisChecks.all(chassis, Bench.LIBRARY);
      if (complaints.isEmpty()) {
        solve(chassis);
      } else {
        assertFalse(complaints.get(0).message().isBlank());
        counts.merge("refused, expected " + complaints.get(0).expected(), 1, Integer::sum);
      }
    } catch (RuntimeException e) {
      throw new AssertionError(chassis.toString(), e);
    }
  }

  private void solve(Chassis chassis) {
    Built whole = new ChassisCircuits(chassis, Bench.LIBRARY).whole();
    DcOutcome outcome = new DcSolver(whole.circuit()).solve();
    if (outcome instanceof DcOutcome.Converged solved) {
      counts.merge("solved by " + solved.method(), 1, Integer::sum);
      tell(chassis, solved);
      holds(chassis, whole, solved.solution());
    } else if (outcome instanceof DcOutcome.NotConverged failed) {
      assertFalse(failed.reason().isBlank());
      counts.merge("no point: " + failed.cause(), 1, Integer::sum);
    }
  }

  /** Steps beyond leaks, with the kinds of stage that asked for them. */
  private void tell(Chassis chassis, DcOutcome.Converged solved) {
    boolean far =
        solved.method() == DcOutcome.Method.SOURCE_STEPPING
            || solved.method() == DcOutcome.Method.PSEUDO_TIME;
    if (far && stepping.size() < TOLD) {
      List<String> kinds = chassis.stages().stream().map(StageEntry::kind).toList();
      stepping.put(
          "%08x".formatted(chassis.hashCode()),
          solved.method() + ", " + solved.iterations() + " iterations: " + kinds);
    }
  }

  private static void holds(Chassis chassis, Built whole, DcSolution dc) {
    assertTrue(dc.residual() < 1e-9, () -> dc.residual() + " A left over in " + chassis);
    balances(chassis, dc);
    for (StageCircuit stage : whole.stages()) {
      List<DevicePoint> points = OperatingPoints.of(stage, dc);
      for (int i = 0; i < points.size(); i++) {
        DevicePoint point = points.get(i);
        StageDevice device = stage.devices().get(i);
        RandomChassisTest.finite(point, "point", chassis);
        LimitShares shares = new LimitShares(device, point, 0);
        shares.addIdle(GridCircuit.resistance(whole.circuit(), point.ref()));
        shares.uses().forEach(use -> RandomChassisTest.finite(use, "limit", chassis));
      }
    }
  }

  /**
   * Energy: the powers of all elements add to what Kirchhoff's law leaves over at each node times
   * its voltage, and rounding; 1e-10 W is the rounding of 100 V to 1e-14 V in 0.01 ohm.
   */
  private static void balances(Chassis chassis, DcSolution dc) {
    double turned = 0;
    for (Element element : dc.circuit().elements()) {
      turned += Math.abs(dc.power(element.name()));
    }
    double highest = 0;
    int nodes = dc.circuit().nodes().size();
    for (int node = 0; node < nodes; node++) {
      highest = Math.max(highest, Math.abs(dc.voltage(node)));
    }
    double allowed = dc.residual() * highest * nodes + 1e-11 * turned + 1e-10;
    assertEquals(0, dc.powerBalance(), allowed, chassis::toString);
  }
}
