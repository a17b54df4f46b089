package perveance.engine.base;

import java.util.OptionalDouble;

/**
 * Reads the plainest spellings, "250 V", "1.2 mA", "100k", without regular expressions or big
 * decimals. Device files hold thousands of them, read by a program that has just started, where the
 * full reading costs twenty milliseconds at first and a tenth of one each time.
 *
 * <p>What is not of this form is left to {@link QuantityParser}, which gives the same number.
 */
final class UsualQuantity {
  private static final int LONGEST = 18;

  private UsualQuantity() {}

  /** The value in the unit, or empty when the text has to be read in full. */
  static OptionalDouble read(String text, Unit unit) {
    int end = endOfNumber(text);
    if (end == 0 || text.length() > LONGEST) {
      return OptionalDouble.empty();
    }
    int suffix = end < text.length() - 1 && text.charAt(end) == ' ' ? end + 1 : end;
    String exponent = exponent(text.substring(suffix), unit);
    if (exponent.isEmpty()) {
      return OptionalDouble.empty();
    }
    // the decimal text as a whole is read to the nearest double, never a product of two doubles
    return OptionalDouble.of(
        Double.parseDouble(text.substring(0, end).concat(exponent)) + 0.0); // no negative zero
  }

  /** Where digits with perhaps a sign and one point end; 0 when there are none. */
  private static int endOfNumber(String text) {
    int at = text.startsWith("-") ? 1 : 0;
    int digits = at;
    while (at < text.length() && isDigit(text.charAt(at))) {
      at++;
    }
    if (at == digits) {
      return 0;
    }
    if (at + 1 < text.length() && text.charAt(at) == '.' && isDigit(text.charAt(at + 1))) {
      at++;
      while (at < text.length() && isDigit(text.charAt(at))) {
        at++;
      }
    }
    return at;
  }

  private static boolean isDigit(char c) {
    return c >= '0' && c <= '9';
  }

  private static String exponent(String suffix, Unit unit) {
    String symbol = symbol(unit);
    if (suffix.isEmpty() || (suffix.equals(symbol) && unit != Unit.RATIO)) {
      return "e0";
    }
    boolean prefixAlone = suffix.length() == 1;
    if (symbol.isEmpty() || !(prefixAlone || suffix.substring(1).equals(symbol))) {
      return "";
    }
    return switch (suffix.charAt(0)) {
      case 'p' -> "e-12";
      case 'n' -> "e-9";
      case 'u' -> "e-6";
      case 'm' -> "e-3";
      case 'k' -> "e3";
      case 'M' -> "e6";
      default -> "";
    };
  }

  private static String symbol(Unit unit) {
    return switch (unit) {
      case VOLT -> "V";
      case AMPERE -> "A";
      case OHM -> "ohm";
      case FARAD -> "F";
      case WATT -> "W";
      case HERTZ -> "Hz";
      case SIEMENS -> "A/V";
      default -> "";
    };
  }
}
