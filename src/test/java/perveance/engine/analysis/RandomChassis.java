package perveance.engine.analysis;

import java.util.ArrayList;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import java.util.OptionalDouble;
import java.util.Random;
import perveance.engine.stage.Chassis;
import perveance.engine.stage.Conditions;
import perveance.engine.stage.KeySpec;
import perveance.engine.stage.Setting;
import perveance.engine.stage.StageEntry;
import perveance.engine.stage.StageKind;
import perveance.engine.stage.StageKinds;
import perveance.engine.stage.Supply;
import perveance.engine.stage.SupplyFeed;

/**
 * Chassis at random over all kinds: sensible stages whose values are then moved over six decades,
 * keys left out or put in, any valve in any socket, supplies from a volt to kilovolts.
 */
final class RandomChassis {
  private static final List<String> TRIODES =
      List.of("12AX7", "12AU7", "12AT7", "6SN7GT", "6SL7GT", "6DJ8", "300B", "2A3", "845");
  private static final List<String> PENTODES =
      List.of("EF86", "6SJ7", "EL84", "EL34", "6L6", "6V6GT", "KT88", "6SK7");

  private final Random random;

  RandomChassis(long seed) {
    this.random = new Random(seed);
  }

  Chassis next() {
    List<Supply> supplies = new ArrayList<>();
    supplies.add(
        new Supply(
            "A",
            new SupplyFeed.Stated(decades(1, 4000)),
            random.nextBoolean() ? OptionalDouble.of(decades(1e-7, 1e-3)) : OptionalDouble.empty(),
            random.nextBoolean() ? OptionalDouble.of(decades(1e3, 1e7)) : OptionalDouble.empty()));
    if (random.nextBoolean()) {
      supplies.add(
          new Supply(
              "B",
              new SupplyFeed.Dropped("A", decades(10, 1e6)),
              OptionalDouble.of(decades(1e-7, 1e-3)),
              OptionalDouble.empty()));
    }
    List<StageEntry> stages = new ArrayList<>();
    int count = 1 + random.nextInt(3);
    for (int i = 0; i < count; i++) {
      stages.add(stage("V" + (i + 1), supplies, i + 1 < count ? "V" + (i + 2) : ""));
    }
    return new Chassis("random", Conditions.USUAL, supplies, stages);
  }

  private double decades(double low, double high) {
    return low * Math.exp(random.nextDouble() * Math.log(high / low));
  }

  private StageEntry stage(String ref, List<Supply> supplies, String following) {
    List<StageKind> kinds = StageKinds.all();
    StageKind kind = kinds.get(random.nextInt(kinds.size()));
    Map<String, Setting> settings = new LinkedHashMap<>();
    Map<String, Double> usual = UsualStages.of(kind.name(), random);
    for (KeySpec key : kind.keys()) {
      Double value = usual.get(key.key());
      // one part of a bias control by itself is refused; a whole one is among the usual values
      boolean extra = random.nextInt(12) == 0 && !key.key().startsWith("bias_");
      switch (key.form()) {
        case QUANTITY -> {
          if (value != null && random.nextInt(15) != 0) {
            put(settings, key, moved(key, value));
          } else if (extra) {
            put(
                settings,
                key,
                within(key, key.lowest() > 0 ? decades(1e-12, 1e6) : -decades(1, 100)));
          }
        }
        case DEVICE -> {
          if (key.required() || extra) {
            settings.put(key.key(), new Setting.Word(device(kind.name())));
          }
        }
        case SUPPLY -> {
          if (key.required() || value != null || extra) {
            String name = supplies.get(random.nextInt(supplies.size())).name();
            settings.put(key.key(), new Setting.Word(name));
          }
        }
        case STAGE -> {
          if (!following.isEmpty() && random.nextBoolean()) {
            settings.put(key.key(), new Setting.Word(following));
          }
        }
        case WORD -> {
          if (extra && !key.choices().isEmpty()) {
            String word = key.choices().get(random.nextInt(key.choices().size()));
            settings.put(key.key(), new Setting.Word(word));
          }
        }
        case FLAG -> {
          if (extra) {
            settings.put(key.key(), new Setting.Flag(true));
          }
        }
      }
    }
    return new StageEntry(ref, kind.name(), settings);
  }

  private String device(String kind) {
    boolean pentode = random.nextInt(kind.contains("output") ? 2 : 6) == 0;
    List<String> drawer = pentode ? PENTODES : TRIODES;
    return drawer.get(random.nextInt(drawer.size()));
  }

  /** Mostly the usual value, often moved by up to three decades either way. */
  private double moved(KeySpec key, double value) {
    double far = random.nextInt(3) == 0 ? 6.9 : 0.7;
    return within(key, value * Math.exp(far * (2 * random.nextDouble() - 1)));
  }

  private static double within(KeySpec key, double value) {
    return Math.max(key.lowest(), Math.min(key.highest(), value));
  }

  private static void put(Map<String, Setting> settings, KeySpec key, double value) {
    settings.put(key.key(), new Setting.Number(Double.toString(value), value));
  }
}
