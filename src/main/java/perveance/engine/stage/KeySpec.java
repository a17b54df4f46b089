package perveance.engine.stage;

import java.util.List;
import perveance.engine.base.Unit;

/**
 * One key that a stage kind reads.
 *
 * @param key key in the chassis file
 * @param form what kind of value it takes
 * @param unit unit of a quantity; RATIO for words and flags
 * @param lowest smallest value accepted, in the unit [1]
 * @param highest largest value accepted, in the unit [1]
 * @param required whether a stage of the kind must state it
 * @param choices words accepted, empty when free
 * @param meaning one line for messages and help
 */
public record KeySpec(
    String key,
    Form form,
    Unit unit,
    double lowest,
    double highest,
    boolean required,
    List<String> choices,
    String meaning) {
  /** What kind of value a key takes. */
  public enum Form {
    /** A number with a unit. */
    QUANTITY,
    /** A word, from the choices when there are any. */
    WORD,
    /** Name of a device. */
    DEVICE,
    /** Name of a supply node. */
    SUPPLY,
    /** Reference of another stage. */
    STAGE,
    /** true or false. */
    FLAG
  }

  /** Copies the choices. */
  public KeySpec {
    choices = List.copyOf(choices);
  }

  /**
   * The same key, required.
   *
   * @return required key
   */
  public KeySpec asRequired() {
    return new KeySpec(key, form, unit, lowest, highest, true, choices, meaning);
  }
}
