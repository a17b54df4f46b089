package perveance.engine.base;

import java.util.Optional;

/**
 * The parts of a number as written, before anything is known about its unit. Read by hand rather
 * than by regular expressions: device files hold thousands of numbers, read by a program that has
 * just started, and regular expressions are slow at first.
 *
 * @param sign "-" or nothing
 * @param whole the digits before the decimal sign, perhaps none
 * @param fraction the digits behind it, perhaps none
 * @param separator the decimal sign: point, comma, a letter of IEC 60062, or a blank where there is
 *     none
 * @param exponent the exponent of ten behind "e", with its sign; nothing where there is none
 * @param rest what follows the number, without blanks
 */
record WrittenNumber(
    String sign, String whole, String fraction, char separator, String exponent, String rest) {
  private static final char NONE = ' ';

  /** Reads digits with perhaps a point or a comma and an exponent; empty where no number stands. */
  static Optional<WrittenNumber> read(String text) {
    int start = afterSign(text);
    int point = afterDigits(text, start);
    boolean pointed = point < text.length() && ".,".indexOf(text.charAt(point)) >= 0;
    int fraction = pointed ? point + 1 : point;
    int end = afterDigits(text, fraction);
    if (point == start && end == fraction) {
      return Optional.empty();
    }
    int behind = afterExponent(text, end);
    return Optional.of(
        new WrittenNumber(
            sign(text),
            text.substring(start, point),
            text.substring(fraction, end),
            pointed ? text.charAt(point) : NONE,
            behind > end ? text.substring(end + 1, behind) : "",
            text.substring(behind).replace(" ", "")));
  }

  /** Reads digits around a letter in place of the decimal sign, as in "4k7" or "R47". */
  static Optional<WrittenNumber> readLetterCode(String text) {
    int start = afterSign(text);
    int letter = afterDigits(text, start);
    int end = afterDigits(text, letter + 1);
    boolean lettered =
        letter < text.length() && Character.isLetter(text.charAt(letter)) && end > letter + 1;
    // "4e7" is a number with an exponent
    if (!lettered || "eE".indexOf(text.charAt(letter)) >= 0) {
      return Optional.empty();
    }
    return Optional.of(
        new WrittenNumber(
            sign(text),
            text.substring(start, letter),
            text.substring(letter + 1, end),
            text.charAt(letter),
            "",
            text.substring(end).replace(" ", "")));
  }

  /** Whether some would read it as thousands and some as a fraction: "1,500" but not "0,500". */
  boolean mayMeanThousands() {
    return separator == ','
        && fraction.length() == 3
        && !whole.isEmpty()
        && whole.length() <= 3
        && whole.charAt(0) != '0';
  }

  /** Whether every digit is zero. */
  boolean isZero() {
    return isZero(whole) && isZero(fraction);
  }

  private static boolean isZero(String digits) {
    for (int i = 0; i < digits.length(); i++) {
      if (digits.charAt(i) != '0') {
        return false;
      }
    }
    return true;
  }

  /** The number as a decimal text with a point, with an exponent of ten joined to it. */
  String decimal(int power) {
    // a builder, because joining strings with + costs ten milliseconds on its first use
    StringBuilder text = new StringBuilder(24).append(sign).append(whole.isEmpty() ? "0" : whole);
    if (!fraction.isEmpty()) {
      text.append('.').append(fraction);
    }
    return power == 0 ? text.toString() : text.append('e').append(power).toString();
  }

  private static String sign(String text) {
    return text.startsWith("-") ? "-" : "";
  }

  private static int afterSign(String text) {
    return text.startsWith("-") || text.startsWith("+") ? 1 : 0;
  }

  private static int afterDigits(String text, int from) {
    int at = from;
    while (at < text.length() && isDigit(text.charAt(at))) {
      at++;
    }
    return at;
  }

  private static int afterExponent(String text, int from) {
    if (from >= text.length() || "eE".indexOf(text.charAt(from)) < 0) {
      return from;
    }
    int digits = from + 1 + afterSign(text.substring(from + 1));
    int end = afterDigits(text, digits);
    return end > digits ? end : from;
  }

  /** Only the ten of ASCII; other scripts' digits are refused rather than guessed. */
  private static boolean isDigit(char c) {
    return c >= '0' && c <= '9';
  }
}
