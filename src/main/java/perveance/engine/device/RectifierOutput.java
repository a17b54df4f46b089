package perveance.engine.device;

import java.util.OptionalDouble;

/**
 * A published operating point of a full-wave rectifier.
 *
 * @param filter what follows the rectifier
 * @param anodeVoltage transformer voltage at each anode, root mean square [V]
 * @param outputCurrent direct current drawn [A]
 * @param capacitance reservoir [F]; empty with a choke
 * @param resistance of the supply at each anode [ohm]
 * @param outputVoltage direct voltage at the reservoir, or after the choke [V]
 * @param source publication
 * @param how {@code found} or {@code memory}
 * @param confidence {@code high}, {@code medium} or {@code low}
 * @param note remark, may be empty
 */
public record RectifierOutput(
    RectifierFilter filter,
    double anodeVoltage,
    double outputCurrent,
    OptionalDouble capacitance,
    OptionalDouble resistance,
    double outputVoltage,
    String source,
    String how,
    String confidence,
    String note) {}
