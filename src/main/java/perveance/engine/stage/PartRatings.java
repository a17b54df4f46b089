package perveance.engine.stage;

import java.util.ArrayList;
import java.util.List;
import java.util.OptionalDouble;
import java.util.Set;
import java.util.stream.Collectors;
import java.util.stream.Stream;
import perveance.engine.base.Unit;
import perveance.engine.stage.KeySpec.Form;

/**
 * Keys by which a stage states the ratings of the parts it has: {@code anode_load_power}, {@code
 * anode_load_voltage}, {@code coupling_voltage}. Every resistor has both and every capacitor the
 * second, whatever the kind of the stage; what only stands for something outside it has none.
 *
 * @param power rated power, empty when not stated [W]
 * @param voltage rated voltage, empty when not stated [V]
 */
public record PartRatings(OptionalDouble power, OptionalDouble voltage) {
  /** A part of which no rating is stated. */
  public static final PartRatings NONE =
      new PartRatings(OptionalDouble.empty(), OptionalDouble.empty());

  private static final String POWER = "_power";
  private static final String VOLTAGE = "_voltage";

  /** What is no part of the stage, or no resistor or capacitor to buy. */
  private static final Set<String> NO_PARTS =
      Stream.of(
              StageKeys.SOURCE,
              StageKeys.LOAD,
              StageKeys.LOAD2,
              StageKeys.LOAD_CAPACITANCE,
              StageKeys.PRIMARY,
              StageKeys.WINDING_RESISTANCE,
              StageKeys.CHOKE_RESISTANCE,
              StageKeys.SECONDARY_RESISTANCE,
              StageKeys.SECONDARY_LOAD,
              StageKeys.CURRENT_SOURCE_RESISTANCE,
              StageKeys.BIAS_TOP,
              StageKeys.BIAS_POT,
              StageKeys.BIAS_BOTTOM,
              StageKeys.BIAS_HOLD,
              StageKeys.STRAY_GRID_ANODE,
              StageKeys.STRAY_GRID,
              StageKeys.STRAY_ANODE)
          .map(KeySpec::key)
          .collect(Collectors.toUnmodifiableSet());

  /** The keys for the ratings of all parts among some keys. */
  static List<KeySpec> keys(List<KeySpec> parts) {
    List<KeySpec> ratings = new ArrayList<>();
    for (KeySpec part : parts) {
      boolean bought = part.form() == Form.QUANTITY && !NO_PARTS.contains(part.key());
      String name = part.key().replace('_', ' ');
      if (bought && part.unit() == Unit.OHM) {
        ratings.add(
            rating(part.key() + POWER, Unit.WATT, 0.01, 1000, "rated power of the " + name));
      }
      if (bought && (part.unit() == Unit.OHM || part.unit() == Unit.FARAD)) {
        ratings.add(
            rating(part.key() + VOLTAGE, Unit.VOLT, 1, 50e3, "rated voltage of the " + name));
      }
    }
    return ratings;
  }

  private static KeySpec rating(String key, Unit unit, double low, double high, String meaning) {
    return new KeySpec(key, Form.QUANTITY, unit, low, high, false, List.of(), meaning);
  }

  /**
   * The key that states the rated power of a part.
   *
   * @param part key of the part
   * @return key of its rating
   */
  public static String powerKey(String part) {
    return part + POWER;
  }

  /**
   * The key that states the rated voltage of a part.
   *
   * @param part key of the part
   * @return key of its rating
   */
  public static String voltageKey(String part) {
    return part + VOLTAGE;
  }

  /**
   * What a stage states of one of its parts.
   *
   * @param values the stage
   * @param part key of the part
   * @return its ratings
   */
  public static PartRatings of(StageValues values, String part) {
    return new PartRatings(values.find(powerKey(part)), values.find(voltageKey(part)));
  }
}
