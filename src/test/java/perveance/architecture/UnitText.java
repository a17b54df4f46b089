package perveance.architecture;

import java.util.Arrays;
import java.util.Set;
import java.util.regex.Matcher;
import java.util.regex.Pattern;

/** Recognises a unit in square brackets, such as {@code [V]}, {@code [A V^-1.5]}, {@code [1]}. */
final class UnitText {
  private static final Pattern BRACKET = Pattern.compile("\\[([^\\[\\]]+)]");

  private static final Pattern POWER = Pattern.compile("\\^(\\([^()]*\\)|-?[0-9.]+)");

  private static final Set<String> UNITS =
      Set.of(
          "1", "%", "A", "C", "F", "H", "Hz", "J", "K", "N", "Pa", "S", "T", "V", "W", "Wb", "b",
          "bit", "cm", "dB", "deg", "degC", "dBm", "dBu", "dBV", "eV", "h", "kHz", "kg", "kV", "m",
          "mA", "mS", "mV", "mW", "min", "mm", "ms", "nF", "nA", "ohm", "pF", "ppm", "pt", "px",
          "rad", "s", "uA", "uF", "uV", "us", "kohm", "Mohm", "VA", "char", "uS", "mH", "um");

  private UnitText() {}

  /**
   * Tells whether a comment states a unit.
   *
   * @param text comment of a parameter or a result
   * @return whether one pair of square brackets holds a unit; a quantity whose unit is the caller's
   *     choice says so in words, as in {@code [any unit]} or {@code [unit of y]}
   */
  static boolean isStatedIn(String text) {
    Matcher bracket = BRACKET.matcher(text);
    while (bracket.find()) {
      if (isUnit(bracket.group(1).strip())) {
        return true;
      }
    }
    return false;
  }

  private static boolean isUnit(String text) {
    if (text.matches(".*\\b\\w*[Uu]nits?\\b.*")) {
      return true;
    }
    // factors are joined by a space, a star or a slash, and may have a power; a mixed array
    // lists its units
    String factors = POWER.matcher(text).replaceAll("");
    return Arrays.stream(factors.split("[ /*,]+")).allMatch(UNITS::contains);
  }
}
