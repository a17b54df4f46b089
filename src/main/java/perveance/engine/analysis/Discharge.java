package perveance.engine.analysis;

/**
 * Stored charge of one capacitor that can hurt.
 *
 * @param where supply node or part
 * @param element name of the capacitor in the circuit, such as {@code supply.A.reservoir}
 * @param capacitance [F]
 * @param voltage worst at switch-off, cold or unloaded [V]
 * @param energy stored [J]
 * @param resistance through which it falls; positive infinity when nothing drains it [ohm]
 * @param threshold voltage to fall below [V]
 * @param seconds time to fall below it; positive infinity when nothing drains it [s]
 * @param drainedBy what drains it, in words
 */
public record Discharge(
    String where,
    String element,
    double capacitance,
    double voltage,
    double energy,
    double resistance,
    double threshold,
    double seconds,
    String drainedBy) {}
