package perveance.engine.analysis;

import java.util.ArrayList;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import java.util.OptionalDouble;
import perveance.engine.base.Progress;
import perveance.engine.base.QuantityException;
import perveance.engine.base.QuantityParser;
import perveance.engine.device.DeviceLibrary;
import perveance.engine.stage.Chassis;
import perveance.engine.stage.Conditions;
import perveance.engine.stage.KeySpec;
import perveance.engine.stage.Setting;
import perveance.engine.stage.StageEntry;
import perveance.engine.stage.StageKinds;
import perveance.engine.stage.Supply;
import perveance.engine.stage.SupplyFeed;
import perveance.files.device.DeviceFiles;

/** Puts chassis together from texts, as a chassis file would, and answers them. */
final class Bench {
  /** The devices that come with the program. */
  static final DeviceLibrary LIBRARY = new DeviceFiles(List.of());

  private DeviceLibrary library = LIBRARY;
  private Conditions conditions = Conditions.USUAL;
  private final List<Supply> supplies = new ArrayList<>();
  private final List<StageEntry> stages = new ArrayList<>();

  /** A chassis with one stated supply named A. */
  static Bench on(double supply) {
    return new Bench().supply("A", supply);
  }

  /** The usual stage: 12AX7, 100 k, 1k5 bypassed, next grid 470 k. */
  static String[] standard() {
    return new String[] {
      "device", "12AX7",
      "supply", "A",
      "anode_load", "100k",
      "cathode_resistor", "1k5",
      "cathode_bypass", "22u",
      "grid_leak", "1M",
      "coupling", "22n",
      "load", "470k"
    };
  }

  Bench supply(String name, double voltage) {
    supplies.add(
        new Supply(
            name, new SupplyFeed.Stated(voltage), OptionalDouble.empty(), OptionalDouble.empty()));
    return this;
  }

  Bench dropped(String name, String from, double dropper, double reservoir) {
    supplies.add(
        new Supply(
            name,
            new SupplyFeed.Dropped(from, dropper),
            OptionalDouble.of(reservoir),
            OptionalDouble.empty()));
    return this;
  }

  Bench supply(Supply supply) {
    supplies.add(supply);
    return this;
  }

  /** Other devices than those that come with the program. */
  Bench devices(DeviceLibrary others) {
    library = others;
    return this;
  }

  Bench conditions(Conditions changed) {
    conditions = changed;
    return this;
  }

  /** Adds a stage from key and text in turn. */
  Bench stage(String ref, String kind, String... keysAndTexts) {
    stages.add(entry(ref, kind, keysAndTexts));
    return this;
  }

  /** Adds the usual stage with some keys changed; an empty text takes a key out. */
  Bench standardWith(String... keysAndTexts) {
    Map<String, String> texts = new LinkedHashMap<>();
    String[] usual = standard();
    for (int i = 0; i < usual.length; i += 2) {
      texts.put(usual[i], usual[i + 1]);
    }
    for (int i = 0; i < keysAndTexts.length; i += 2) {
      texts.put(keysAndTexts[i], keysAndTexts[i + 1]);
    }
    List<String> flat = new ArrayList<>();
    texts.forEach(
        (key, text) -> {
          if (!text.isEmpty()) {
            flat.add(key);
            flat.add(text);
          }
        });
    return stage("V1a", "common-cathode", flat.toArray(new String[0]));
  }

  /** Adds the usual stage under another name, to be driven by one before. */
  Bench standardNext(String ref) {
    return stage(ref, "common-cathode", standard());
  }

  static StageEntry entry(String ref, String kind, String... keysAndTexts) {
    Map<String, Setting> settings = new LinkedHashMap<>();
    for (int i = 0; i < keysAndTexts.length; i += 2) {
      String key = keysAndTexts[i];
      KeySpec spec =
          StageKinds.find(kind).orElseThrow().keys().stream()
              .filter(k -> k.key().equals(key))
              .findFirst()
              .orElseThrow(() -> new IllegalArgumentException(kind + " has no key " + key));
      settings.put(key, setting(spec, keysAndTexts[i + 1]));
    }
    return new StageEntry(ref, kind, settings);
  }

  private static Setting setting(KeySpec spec, String text) {
    return switch (spec.form()) {
      case QUANTITY -> new Setting.Number(text, number(text, spec));
      case FLAG -> new Setting.Flag(Boolean.parseBoolean(text));
      default -> new Setting.Word(text);
    };
  }

  private static double number(String text, KeySpec spec) {
    try {
      return QuantityParser.parse(text, spec.unit()).value();
    } catch (QuantityException e) {
      throw new IllegalArgumentException(text, e);
    }
  }

  Chassis chassis() {
    return new Chassis("bench", conditions, supplies, stages);
  }

  ChassisAnswer answer(AnalysisOptions options) {
    return new ChassisAnalysis(library).answer(chassis(), options, Progress.none());
  }

  /** The first stage's answer without bands. */
  StageAnswer first() {
    return answer(AnalysisOptions.LIVE).stages().get(0);
  }

  /** The first stage's answer with everything. */
  StageAnswer full() {
    return answer(AnalysisOptions.FULL).stages().get(0);
  }
}
