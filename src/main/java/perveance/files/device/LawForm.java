package perveance.files.device;

import java.util.List;
import java.util.Map;
import java.util.Optional;
import perveance.engine.device.DeviceLaw;
import perveance.engine.device.LawParameter;
import perveance.engine.device.SpaceChargeDiodeLaw;
import perveance.engine.device.SpreadPentodeLaw;
import perveance.engine.device.SpreadPentodeParameters;
import perveance.engine.device.SpreadTriodeLaw;
import perveance.engine.device.SpreadTriodeParameters;

/** The device laws that a file may name, with the keys that each one takes. */
enum LawForm {
  SPREAD_TRIODE(
      SpreadTriodeLaw.NAME, SpreadTriodeParameters.KEYS, SpreadTriodeParameters.REMOTE_KEYS) {
    @Override
    DeviceLaw make(Map<String, Double> values) {
      return new SpreadTriodeLaw(SpreadTriodeParameters.of(values));
    }

    @Override
    boolean makes(DeviceLaw law) {
      return law instanceof SpreadTriodeLaw;
    }
  },
  SPREAD_PENTODE(SpreadPentodeLaw.NAME, SpreadPentodeParameters.KEYS, List.of()) {
    @Override
    DeviceLaw make(Map<String, Double> values) {
      return new SpreadPentodeLaw(SpreadPentodeParameters.of(values));
    }

    @Override
    boolean makes(DeviceLaw law) {
      return law instanceof SpreadPentodeLaw;
    }
  },
  SPACE_CHARGE_DIODE(SpaceChargeDiodeLaw.NAME, SpaceChargeDiodeLaw.KEYS, List.of()) {
    @Override
    DeviceLaw make(Map<String, Double> values) {
      return SpaceChargeDiodeLaw.of(values);
    }

    @Override
    boolean makes(DeviceLaw law) {
      return law instanceof SpaceChargeDiodeLaw;
    }
  };

  private final String word;
  private final List<String> keys;
  private final List<String> further;

  LawForm(String word, List<String> keys, List<String> further) {
    this.word = word;
    this.keys = keys;
    this.further = further;
  }

  /** Makes the law; refuses values that have no meaning with an IllegalArgumentException. */
  abstract DeviceLaw make(Map<String, Double> values);

  abstract boolean makes(DeviceLaw law);

  /** The name of the law in a file. */
  String word() {
    return word;
  }

  /** The keys of the law, all of them required, in SI units. */
  List<String> keys() {
    return keys;
  }

  /** Keys that the law takes besides, for what few devices have. */
  List<String> further() {
    return further;
  }

  static List<String> words() {
    return List.of(SPREAD_TRIODE.word, SPREAD_PENTODE.word, SPACE_CHARGE_DIODE.word);
  }

  static Optional<LawForm> named(String word) {
    for (LawForm form : values()) {
      if (form.word.equals(word)) {
        return Optional.of(form);
      }
    }
    return Optional.empty();
  }

  /** The form of a law; misuse where a law has none. */
  static LawForm of(DeviceLaw law) {
    for (LawForm form : values()) {
      if (form.makes(law)) {
        return form;
      }
    }
    throw new IllegalArgumentException(
        "law has no form in a file, its first parameter is "
            + law.parameters().stream().map(LawParameter::key).findFirst().orElse("missing"));
  }
}
