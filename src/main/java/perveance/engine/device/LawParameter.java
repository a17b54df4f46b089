package perveance.engine.device;

/**
 * One parameter of a law.
 *
 * @param key name used in device files, for example {@code perveance}
 * @param value value in SI units, as named by {@code unit} [1]
 * @param unit unit as text, for example {@code A V^-1.5}
 * @param meaning one line that says what it is
 */
public record LawParameter(String key, double value, String unit, String meaning) {}
