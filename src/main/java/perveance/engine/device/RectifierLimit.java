package perveance.engine.device;

import java.util.OptionalDouble;

/**
 * Limits of a rectifier with one kind of filter. A type whose current falls with voltage has one
 * for each voltage stated; an empty value is not published.
 *
 * @param type type designation on the sheet
 * @param system rating system
 * @param filter what follows the rectifier
 * @param anodeVoltage transformer voltage at each anode, root mean square [V]
 * @param outputCurrent direct current of the whole valve [A]
 * @param peakCurrent repetitive peak current at each anode [A]
 * @param inverseVoltage peak inverse voltage [V]
 * @param capacitance largest capacitor on the cathode, where nothing more limits the peaks [F]
 * @param heaterVoltage between heater and cathode, peak [V]
 * @param source publication
 * @param how {@code found} or {@code memory}
 * @param confidence {@code high}, {@code medium} or {@code low}
 * @param note remark, may be empty
 */
public record RectifierLimit(
    String type,
    RatingSystem system,
    RectifierFilter filter,
    OptionalDouble anodeVoltage,
    OptionalDouble outputCurrent,
    OptionalDouble peakCurrent,
    OptionalDouble inverseVoltage,
    OptionalDouble capacitance,
    OptionalDouble heaterVoltage,
    String source,
    String how,
    String confidence,
    String note) {}
