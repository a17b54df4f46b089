package perveance.engine.stage;

import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import perveance.engine.base.NearMiss;
import perveance.engine.base.QuantityFormat;
import perveance.engine.stage.ChassisComplaint.Place;

/**
 * Checks each key of a stage by itself: known to its kind, of the right form, possible, present.
 */
public final class KeyChecks {
  private final int index;
  private final StageEntry entry;
  private final StageKind kind;
  private final List<ChassisComplaint> complaints = new ArrayList<>();

  private KeyChecks(int index, StageEntry entry, StageKind kind) {
    this.index = index;
    this.entry = entry;
    this.kind = kind;
  }

  /**
   * Checks the keys of one stage.
   *
   * @param index which stage of the chassis, from 0
   * @param entry the stage
   * @param kind its kind
   * @return complaints, empty when every key is possible by itself
   */
  public static List<ChassisComplaint> complaints(int index, StageEntry entry, StageKind kind) {
    KeyChecks checks = new KeyChecks(index, entry, kind);
    entry.settings().forEach(checks::check);
    checks.required();
    return List.copyOf(checks.complaints);
  }

  private void check(String key, Setting setting) {
    Optional<KeySpec> spec = kind.keys().stream().filter(k -> k.key().equals(key)).findFirst();
    if (spec.isEmpty()) {
      List<String> known = kind.keys().stream().map(KeySpec::key).toList();
      add(key, "an unknown key", "a key of " + kind.name(), NearMiss.suggest(key, known));
    } else if (setting instanceof Setting.Number number) {
      checkNumber(spec.get(), number);
    } else if (setting instanceof Setting.Flag) {
      if (spec.get().form() != KeySpec.Form.FLAG) {
        add(key, setting.text(), form(spec.get()), Optional.empty());
      }
    } else {
      checkWord(spec.get(), setting.text());
    }
  }

  private void checkNumber(KeySpec spec, Setting.Number number) {
    if (spec.form() != KeySpec.Form.QUANTITY) {
      add(spec.key(), number.text(), form(spec), Optional.empty());
    } else if (!(number.value() >= spec.lowest() && number.value() <= spec.highest())) {
      add(spec.key(), number.text(), range(spec), Optional.empty());
    }
  }

  private void checkWord(KeySpec spec, String word) {
    boolean wrongForm = spec.form() == KeySpec.Form.QUANTITY || spec.form() == KeySpec.Form.FLAG;
    boolean wrongChoice = !spec.choices().isEmpty() && !spec.choices().contains(word);
    if (wrongForm || wrongChoice || word.isBlank()) {
      Optional<String> near = NearMiss.suggest(word, spec.choices());
      add(spec.key(), "\"" + word + "\"", form(spec), near);
    }
  }

  private void required() {
    for (KeySpec spec : kind.keys()) {
      if (spec.required() && !entry.settings().containsKey(spec.key())) {
        add(spec.key(), "nothing", spec.meaning() + ": " + form(spec), Optional.empty());
      }
    }
  }

  /** What a key takes, in words. */
  private static String form(KeySpec spec) {
    return switch (spec.form()) {
      case QUANTITY -> spec.unit().quantityWord() + " such as " + example(spec);
      case WORD ->
          spec.choices().isEmpty() ? "a word" : "one of " + String.join(", ", spec.choices());
      case DEVICE -> "the name of a valve";
      case SUPPLY -> "the name of a supply";
      case STAGE -> "the reference of a stage";
      case FLAG -> "true or false";
    };
  }

  private static String example(KeySpec spec) {
    return "\"" + spec.unit().example() + "\"";
  }

  /** The range of a key, in words. */
  private static String range(KeySpec spec) {
    QuantityFormat plain = QuantityFormat.PLAIN;
    return spec.unit().quantityWord()
        + " from "
        + plain.part(spec.lowest(), spec.unit())
        + " to "
        + plain.part(spec.highest(), spec.unit());
  }

  private void add(String key, String found, String expected, Optional<String> near) {
    complaints.add(
        new ChassisComplaint(Place.STAGE, index, entry.ref(), key, found, expected, near));
  }
}
