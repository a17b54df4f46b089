package perveance.engine.stage;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.util.ArrayList;
import java.util.List;
import java.util.Random;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.MethodSource;
import perveance.engine.circuit.DcOutcome;
import perveance.engine.circuit.DcSolver;

/**
 * Stages of random keys with values over their whole ranges, seeded: what the checks let pass is
 * built and drawn rightly, and the circuit is one that the engine can judge.
 */
class RandomStagesTest {
  private static final int TRIES = 600;

  static List<String> kinds() {
    return StageKinds.all().stream().map(StageKind::name).toList();
  }

  @ParameterizedTest
  @MethodSource("kinds")
  void whatPassesTheChecksIsBuiltAndDrawn(String kind) {
    Random random = new Random(20240601L + kind.hashCode());
    int passed = 0;
    for (int i = 0; i < TRIES; i++) {
      StageBench bench = stage(kind, random);
      String name = kind + " " + i + " " + bench.settings.keySet();
      assertEquals(
          List.of(),
          KeyChecks.complaints(0, bench.values().entry(), bench.kind),
          () -> "the keys are in range: " + name);
      if (!bench.kind.check(bench.values()).isEmpty()) {
        continue;
      }
      passed++;
      StageBench.Built built = bench.build(random.nextInt(1, 500));
      new DrawingChecks(name, built).all();
      DcOutcome outcome = new DcSolver(built.circuit()).solve();
      if (outcome instanceof DcOutcome.NotConverged not) {
        boolean understood =
            not.cause() != DcOutcome.Cause.FLOATING_NODE
                && not.cause() != DcOutcome.Cause.SOURCE_LOOP;
        assertTrue(understood, () -> name + ": " + not);
      }
    }
    int least = TRIES / 100;
    int found = passed;
    assertTrue(found >= least, () -> kind + ": only " + found + " passed the checks");
  }

  private static StageBench stage(String kind, Random random) {
    boolean pentode = random.nextInt(4) == 0;
    StageBench bench =
        new StageBench(kind, pentode ? StageSamples.PENTODE : YardstickTriode.T12AX7);
    double share = random.nextDouble();
    // what a part is rated for and what sets a bias change neither the circuit nor the drawing
    List<KeySpec> keys = new ArrayList<>(bench.kind.keys());
    keys.removeAll(PartRatings.keys(keys));
    keys.removeAll(BiasControl.KEYS);
    for (KeySpec key : keys) {
      boolean wanted = key.required() || random.nextDouble() < share;
      if (wanted && key.form() != KeySpec.Form.DEVICE) {
        bench.settings.put(key.key(), setting(key, random));
      } else if (!key.required() && key.form() == KeySpec.Form.SUPPLY) {
        bench.settings.remove(key.key());
      }
    }
    bench.settings.remove("drives");
    if (random.nextInt(4) == 0) {
      bench.in(StageBench.drivenFrom("V0.anode"));
    }
    return bench;
  }

  private static Setting setting(KeySpec key, Random random) {
    return switch (key.form()) {
      case QUANTITY -> {
        double value = number(key, random);
        yield new Setting.Number(Double.toString(value), value);
      }
      case FLAG -> new Setting.Flag(random.nextBoolean());
      case SUPPLY -> new Setting.Word(key.key().equals("tail_supply") ? "N" : "A");
      default -> word(key, random);
    };
  }

  private static Setting word(KeySpec key, Random random) {
    List<String> words = new ArrayList<>(key.choices());
    if (words.isEmpty()) {
      words.add("V7");
    }
    return new Setting.Word(words.get(random.nextInt(words.size())));
  }

  private static double number(KeySpec key, Random random) {
    if (key.equals(StageKeys.SECTIONS)) {
      return random.nextInt(1, 5);
    }
    if (key.lowest() <= 0) {
      return key.lowest() + random.nextDouble() * (key.highest() - key.lowest());
    }
    double low = Math.log(key.lowest());
    double value = Math.exp(low + random.nextDouble() * (Math.log(key.highest()) - low));
    return Math.max(key.lowest(), Math.min(key.highest(), value));
  }
}
