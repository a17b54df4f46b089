package perveance.desktop.viewmodel;

import java.util.Locale;
import java.util.Optional;
import perveance.app.Edit;
import perveance.engine.base.NearMiss;
import perveance.engine.base.PreferredSeries;
import perveance.engine.base.QuantityException;
import perveance.engine.base.QuantityFormat;
import perveance.engine.base.QuantityParser;
import perveance.engine.base.Unit;
import perveance.engine.stage.Chassis;
import perveance.engine.stage.KeySpec;
import perveance.engine.stage.Setting;
import perveance.engine.stage.StageEntry;
import perveance.engine.stage.StageKinds;

/** Turns what a person types beside a part into an edit, or says in words why it cannot be. */
public final class KeyEditor {
  private KeyEditor() {}

  /** What became of a typed text. */
  public sealed interface Outcome {
    /**
     * It is an edit.
     *
     * @param edit the edit
     */
    record Accepted(Edit edit) implements Outcome {}

    /**
     * It is none.
     *
     * @param why a sentence for the person
     */
    record Refused(String why) implements Outcome {}
  }

  /**
   * The specification of a key.
   *
   * @param chassis chassis
   * @param ref stage
   * @param key key
   * @return specification, empty when the stage's kind has no such key
   */
  public static Optional<KeySpec> spec(Chassis chassis, String ref, String key) {
    return chassis
        .stage(ref)
        .flatMap(stage -> StageKinds.find(stage.kind()))
        .flatMap(kind -> kind.keys().stream().filter(k -> k.key().equals(key)).findFirst());
  }

  /**
   * The edit that a text means.
   *
   * @param chassis chassis
   * @param ref stage
   * @param key key
   * @param text as typed; nothing takes an optional key out
   * @return the edit or the reason against it
   */
  public static Outcome parse(Chassis chassis, String ref, String key, String text) {
    Optional<KeySpec> spec = spec(chassis, ref, key);
    if (spec.isEmpty()) {
      return new Outcome.Refused(ref + " has no " + words(key) + ".");
    }
    if (text.isBlank()) {
      return spec.get().required()
          ? new Outcome.Refused("A stage of this kind needs its " + words(key) + ".")
          : new Outcome.Accepted(new Edit.ClearKey(ref, key));
    }
    return switch (spec.get().form()) {
      case QUANTITY -> quantity(spec.get(), ref, text.strip());
      case FLAG -> flag(ref, key, text.strip());
      case WORD, DEVICE, SUPPLY, STAGE -> word(spec.get(), ref, text.strip());
    };
  }

  private static Outcome quantity(KeySpec spec, String ref, String text) {
    try {
      double value = QuantityParser.parse(text, spec.unit()).value();
      if (!(value >= spec.lowest() && value <= spec.highest())) {
        return new Outcome.Refused(
            text + " is not possible here: " + range(spec) + " (" + spec.meaning() + ").");
      }
      return new Outcome.Accepted(
          new Edit.SetKey(ref, spec.key(), new Setting.Number(text, value)));
    } catch (QuantityException e) {
      return new Outcome.Refused("Found " + e.found() + ", expected " + e.expected() + ".");
    }
  }

  private static String range(KeySpec spec) {
    QuantityFormat format = QuantityFormat.TYPESET;
    return format.part(spec.lowest(), spec.unit())
        + " to "
        + format.part(spec.highest(), spec.unit());
  }

  private static Outcome flag(String ref, String key, String text) {
    return switch (text.toLowerCase(Locale.ROOT)) {
      case "yes", "true", "on" ->
          new Outcome.Accepted(new Edit.SetKey(ref, key, new Setting.Flag(true)));
      case "no", "false", "off" ->
          new Outcome.Accepted(new Edit.SetKey(ref, key, new Setting.Flag(false)));
      default -> new Outcome.Refused("Found " + text + ", expected yes or no.");
    };
  }

  private static Outcome word(KeySpec spec, String ref, String text) {
    if (!spec.choices().isEmpty() && !spec.choices().contains(text)) {
      String near =
          NearMiss.suggest(text, spec.choices()).map(s -> " Did you mean " + s + "?").orElse("");
      return new Outcome.Refused(
          "Found " + text + ", expected one of " + String.join(", ", spec.choices()) + "." + near);
    }
    return new Outcome.Accepted(new Edit.SetKey(ref, spec.key(), new Setting.Word(text)));
  }

  /**
   * The edit that puts the next standard value in place of the present one.
   *
   * @param chassis chassis
   * @param ref stage
   * @param key key of a quantity
   * @param up true for the next above, false for the next below
   * @return the edit, empty when the key has no positive quantity or the range ends
   */
  public static Optional<Edit> step(Chassis chassis, String ref, String key, boolean up) {
    Optional<KeySpec> spec = spec(chassis, ref, key);
    Optional<Setting> now =
        chassis.stage(ref).map(StageEntry::settings).map(settings -> settings.get(key));
    if (spec.isEmpty() || !(now.orElse(null) instanceof Setting.Number number)) {
      return Optional.empty();
    }
    if (!(number.value() > 0)) {
      return Optional.empty();
    }
    PreferredSeries series =
        spec.get().unit() == Unit.FARAD ? PreferredSeries.E12 : PreferredSeries.E24;
    double next =
        up ? series.above(number.value() * 1.0001) : series.below(number.value() * 0.9999);
    return next >= spec.get().lowest() && next <= spec.get().highest()
        ? Optional.of(set(ref, spec.get(), next))
        : Optional.empty();
  }

  /**
   * The edit that sets a quantity to a computed value, written as the trade writes it.
   *
   * @param ref stage
   * @param spec the key
   * @param value new value [unit of the key]
   * @return the edit
   */
  public static Edit set(String ref, KeySpec spec, double value) {
    String text = QuantityFormat.PLAIN.part(value, spec.unit(), 3);
    try {
      double exact = QuantityParser.parse(text, spec.unit()).value();
      return new Edit.SetKey(ref, spec.key(), new Setting.Number(text, exact));
    } catch (QuantityException e) {
      throw new IllegalStateException("printed what cannot be read: " + text, e);
    }
  }

  /**
   * A key in words.
   *
   * @param key for example {@code anode_load}
   * @return for example {@code anode load}
   */
  public static String words(String key) {
    return key.replace('_', ' ').replaceAll("(?<=[a-z])(?=2( |$))", " ");
  }
}
