package perveance.engine.device;

/**
 * One way of wiring a heater or filament.
 *
 * @param voltage nominal [V]
 * @param current nominal [A]
 * @param pins pins as printed, for example {@code 4+5 to 9}
 * @param directlyHeated true for a filament that is the cathode
 */
public record Heater(double voltage, double current, String pins, boolean directlyHeated) {}
