package perveance.engine.device;

import java.util.OptionalDouble;

/**
 * Limits under one rating system; an empty value is not published.
 *
 * @param type type designation on the sheet, for example {@code 12AX7A}
 * @param system rating system
 * @param source publication
 * @param how {@code found} or {@code memory}
 * @param anodeVoltage anode to cathode [V]
 * @param coldAnodeVoltage anode with no current (switch-on) [V]
 * @param anodeDissipation per section [W]
 * @param bothAnodesDissipation both sections together [W]
 * @param screenVoltage screen to cathode [V]
 * @param screenDissipation screen [W]
 * @param cathodeCurrent mean cathode current [A]
 * @param gridLeakFixed grid circuit resistance, fixed bias [ohm]
 * @param gridLeakCathode grid circuit resistance, cathode bias [ohm]
 * @param heaterNegative heater to cathode, heater negative [V]
 * @param heaterPositive heater to cathode, heater positive [V]
 */
public record Ratings(
    String type,
    RatingSystem system,
    String source,
    String how,
    OptionalDouble anodeVoltage,
    OptionalDouble coldAnodeVoltage,
    OptionalDouble anodeDissipation,
    OptionalDouble bothAnodesDissipation,
    OptionalDouble screenVoltage,
    OptionalDouble screenDissipation,
    OptionalDouble cathodeCurrent,
    OptionalDouble gridLeakFixed,
    OptionalDouble gridLeakCathode,
    OptionalDouble heaterNegative,
    OptionalDouble heaterPositive) {}
