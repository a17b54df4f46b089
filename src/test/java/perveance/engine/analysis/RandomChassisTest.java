package perveance.engine.analysis;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertFalse;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.lang.reflect.InvocationTargetException;
import java.lang.reflect.RecordComponent;
import java.util.Collection;
import java.util.Map;
import java.util.Optional;
import java.util.OptionalDouble;
import java.util.TreeMap;
import org.jspecify.annotations.Nullable;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.TestReporter;
import perveance.engine.base.Progress;
import perveance.engine.circuit.DcOutcome;
import perveance.engine.circuit.DcSolver;
import perveance.engine.stage.Chassis;
import perveance.engine.stage.ChassisChecks;
import perveance.engine.stage.ChassisCircuits;

/**
 * Robustness as a property: whatever the chassis, it is refused with a reason, or answered with
 * figures that are all numbers, or a stage of it has a failure with a reason. No exception, no
 * not-a-number. How many chassis are tried is set by the property {@code perveance.random.chassis}.
 */
class RandomChassisTest {
  private static final int COUNT = Integer.getInteger("perveance.random.chassis", 600);
  private static final AnalysisOptions EVERYTHING = new AnalysisOptions(40, 3, true, true);

  @Test
  void anyChassisIsAnsweredOrRefusedWithAReason(TestReporter reporter) {
    RandomChassis source = new RandomChassis(20240611);
    ChassisAnalysis analysis = new ChassisAnalysis(Bench.LIBRARY);
    Map<String, Integer> counts = new TreeMap<>();
    for (int i = 0; i < COUNT; i++) {
      Chassis chassis = source.next();
      if (!ChassisChecks.all(chassis, Bench.LIBRARY).isEmpty()) {
        counts.merge("refused", 1, Integer::sum);
        continue;
      }
      counts.merge(dcPoint(chassis), 1, Integer::sum);
      AnalysisOptions options = i % 10 == 0 ? EVERYTHING : AnalysisOptions.LIVE;
      ChassisAnswer answer = answer(analysis, chassis, options);
      answer.failures().forEach(f -> assertFalse(f.reason().isBlank(), f.ref()));
      assertEquals(chassis.stages().size(), answer.stages().size() + answer.failures().size());
      finite(answer, "answer", chassis);
      counts.merge("stages answered", answer.stages().size(), Integer::sum);
      counts.merge("stages failed", answer.failures().size(), Integer::sum);
    }
    counts.forEach((what, count) -> reporter.publishEntry(what, Integer.toString(count)));
    int answered = counts.getOrDefault("stages answered", 0);
    assertTrue(answered > COUNT / 3, counts.toString());
    assertTrue(counts.getOrDefault("stages failed", 0) < 0.02 * answered, counts.toString());
  }

  /** Solves the whole chassis: Kirchhoff's law to 1 nA and energy in balance, or a reason. */
  private static String dcPoint(Chassis chassis) {
    DcOutcome outcome =
        new DcSolver(new ChassisCircuits(chassis, Bench.LIBRARY).whole().circuit()).solve();
    if (outcome instanceof DcOutcome.Converged solved) {
      assertTrue(solved.solution().residual() < 1e-9, chassis::toString);
      assertEquals(0, solved.solution().powerBalance(), 1e-5, chassis::toString);
      return "dc by " + solved.method();
    }
    DcOutcome.NotConverged failed = (DcOutcome.NotConverged) outcome;
    assertFalse(failed.reason().isBlank());
    return "dc failed: " + failed.cause();
  }

  private static ChassisAnswer answer(
      ChassisAnalysis analysis, Chassis chassis, AnalysisOptions options) {
    try {
      return analysis.answer(chassis, options, Progress.none());
    } catch (RuntimeException e) {
      throw new AssertionError(chassis.toString(), e);
    }
  }

  /** Walks through records, lists and maps; no number may be not-a-number. */
  static void finite(@Nullable Object at, String path, Chassis chassis) {
    if (at instanceof Double number) {
      assertFalse(number.isNaN(), () -> path + " of " + chassis);
    } else if (at instanceof OptionalDouble number && number.isPresent()) {
      assertTrue(Double.isFinite(number.getAsDouble()), () -> path + " of " + chassis);
    } else if (at instanceof Optional<?> optional) {
      optional.ifPresent(o -> finite(o, path, chassis));
    } else if (at instanceof Collection<?> list) {
      list.forEach(o -> finite(o, path + "[]", chassis));
    } else if (at instanceof Map<?, ?> map) {
      map.forEach((key, value) -> finite(value, path + "." + key, chassis));
    } else if (at instanceof Record record
        && record.getClass().getPackageName().equals("perveance.engine.analysis")) {
      for (RecordComponent component : record.getClass().getRecordComponents()) {
        finite(value(record, component), path + "." + component.getName(), chassis);
      }
    }
  }

  private static @Nullable Object value(Record record, RecordComponent component) {
    try {
      return component.getAccessor().invoke(record);
    } catch (IllegalAccessException | InvocationTargetException e) {
      throw new AssertionError(component.toString(), e);
    }
  }
}
