package perveance.engine.device;

/**
 * Least resistance of the supply at each anode (half the winding's resistance, the primary's
 * carried over, and any resistor) for a reservoir capacitor.
 *
 * @param anodeVoltage transformer voltage at each anode, root mean square [V]
 * @param resistance least resistance at each anode [ohm]
 * @param source publication
 * @param how {@code found} or {@code memory}
 * @param confidence {@code high}, {@code medium} or {@code low}
 * @param note remark, may be empty
 */
public record LimitingResistance(
    double anodeVoltage,
    double resistance,
    String source,
    String how,
    String confidence,
    String note) {}
