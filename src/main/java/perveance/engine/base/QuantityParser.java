package perveance.engine.base;

import java.math.BigDecimal;
import java.util.Optional;
import java.util.OptionalDouble;
import java.util.regex.Matcher;
import java.util.regex.Pattern;

/**
 * Reads a quantity as the trade writes it: "100k", "4k7", "0R47", "22n", "1.5 mA", "300 V", "43 %",
 * or a plain number in the unit expected. The letter codes are those of IEC 60062 (a prefix or unit
 * letter in place of the decimal sign). Decimal sign is the point or the comma, whatever the
 * machine's locale.
 *
 * <p>"1,500" is refused: some mean one and a half by it and some fifteen hundred.
 */
public final class QuantityParser {
  private static final int LONGEST_TEXT = 60;
  private static final int MOST_EXPONENT_DIGITS = 4;

  private QuantityParser() {}

  /** Built on the first text that needs them, which in most runs never comes. */
  private static final class Forms {
    static final Pattern PLAIN =
        Pattern.compile("([+-]?)(\\d+(?:[.,]\\d*)?|[.,]\\d+)(?:[eE]([+-]?\\d+))?(\\D.*)?");

    /** Digits, a letter in place of the decimal sign, digits, and perhaps a unit. */
    static final Pattern LETTER_CODE =
        Pattern.compile("([+-]?)(\\d*)(\\p{L})(\\d+)(?:(?=\\D)(.*))?");

    static final Pattern THOUSANDS = Pattern.compile("[1-9]\\d{0,2},\\d{3}");

    private Forms() {}
  }

  /**
   * Reads a quantity of the unit expected.
   *
   * @param text the text as typed
   * @param expected the unit the quantity must have
   * @return the finite quantity in that unit
   * @throws QuantityException if the text is anything else, saying what was found and expected
   */
  public static Quantity parse(String text, Unit expected) throws QuantityException {
    OptionalDouble usual = UsualQuantity.read(text, expected);
    return usual.isPresent()
        ? new Quantity(usual.getAsDouble(), expected)
        : parseInFull(text, expected);
  }

  static Quantity parseInFull(String text, Unit expected) throws QuantityException {
    String shown = quoted(text);
    String tidy = tidy(text);
    if (tidy.isEmpty()) {
      throw refusal("nothing", expected);
    }
    if (tidy.length() > LONGEST_TEXT) {
      throw refusal(shown + ", which is too long for a quantity", expected);
    }
    Optional<BigDecimal> number = readLetterCode(tidy, expected);
    if (number.isEmpty()) {
      number = Optional.of(readPlain(tidy, shown, expected));
    }
    return finite(number.get(), shown, expected);
  }

  private static Optional<BigDecimal> readLetterCode(String tidy, Unit expected) {
    Matcher code = Forms.LETTER_CODE.matcher(tidy);
    if (!code.matches() || "eE".contains(code.group(3))) {
      return Optional.empty();
    }
    Optional<UnitSpelling.Meaning> letter = UnitSpelling.read(code.group(3), expected);
    String unit = code.group(5) == null ? "" : code.group(5).strip();
    if (letter.isEmpty() || !(unit.isEmpty() || UnitSpelling.names(unit, expected))) {
      return Optional.empty();
    }
    boolean bigPrefix = letter.get().factor().compareTo(BigDecimal.ONE) > 0;
    if (code.group(2).isEmpty() && bigPrefix) {
      // "k7" is rather a lost digit than 700
      return Optional.empty();
    }
    String digits = code.group(1) + (code.group(2).isEmpty() ? "0" : code.group(2));
    return Optional.of(letter.get().apply(new BigDecimal(digits + "." + code.group(4))));
  }

  private static BigDecimal readPlain(String tidy, String shown, Unit expected)
      throws QuantityException {
    Matcher plain = Forms.PLAIN.matcher(tidy);
    if (!plain.matches()) {
      throw refusal(shown, expected);
    }
    if (Forms.THOUSANDS.matcher(plain.group(2)).matches()) {
      throw refusal(shown + ", which can mean two things by its comma", expected);
    }
    BigDecimal number = decimal(plain, shown, expected);
    String suffix = plain.group(4) == null ? "" : plain.group(4).replace(" ", "");
    Optional<UnitSpelling.Meaning> meaning = UnitSpelling.read(suffix, expected);
    if (meaning.isPresent()) {
      return meaning.get().apply(number);
    }
    Optional<Unit> other = otherUnit(tidy, suffix);
    if (other.isPresent()) {
      throw refusal(shown + ", which is " + inWords(other.get()), expected);
    }
    throw refusal(shown + ", in which " + quoted(suffix) + " is not understood here", expected);
  }

  /** The unit that stands there instead of the one expected, "4k7 ohm" where volts belong too. */
  private static Optional<Unit> otherUnit(String tidy, String suffix) {
    Matcher code = Forms.LETTER_CODE.matcher(tidy);
    String letters = code.matches() && code.group(5) != null ? code.group(5).strip() : suffix;
    return UnitSpelling.readAny(letters)
        .or(() -> code.matches() ? UnitSpelling.readAny(code.group(3)) : Optional.empty())
        .map(UnitSpelling.Meaning::unit);
  }

  private static BigDecimal decimal(Matcher plain, String shown, Unit expected)
      throws QuantityException {
    String exponent = plain.group(3) == null ? "0" : plain.group(3);
    BigDecimal mantissa = new BigDecimal(withPoint(plain.group(1) + plain.group(2)));
    if (exponent.length() > MOST_EXPONENT_DIGITS + 1) {
      throw refusal(shown + ", which is beyond the numbers a computer keeps", expected);
    }
    return mantissa.scaleByPowerOfTen(Integer.parseInt(exponent));
  }

  private static String withPoint(String number) {
    String pointed = number.replace(',', '.');
    return pointed.endsWith(".") ? pointed + "0" : pointed;
  }

  private static Quantity finite(BigDecimal number, String shown, Unit expected)
      throws QuantityException {
    double value = number.doubleValue();
    boolean vanished = value == 0 && number.signum() != 0;
    if (!Double.isFinite(value) || vanished) {
      throw refusal(shown + ", which is beyond the numbers a computer keeps", expected);
    }
    // a zero is a zero, whatever its sign
    return new Quantity(value == 0 ? 0.0 : value, expected);
  }

  /** Blank and minus signs from typesetting become the plain ones. */
  private static String tidy(String text) {
    return text.replace('\u2212', '-')
        .replace('\u00a0', ' ')
        .replace('\u2009', ' ')
        .replace('\u202f', ' ')
        .strip();
  }

  private static QuantityException refusal(String found, Unit expected) {
    return new QuantityException(
        found, inWords(expected) + ", for example \"" + expected.example() + "\"");
  }

  private static String inWords(Unit unit) {
    return unit == Unit.RATIO
        ? "a ratio (a plain number or %)"
        : unit.quantityWord() + " in " + unit.word() + " (" + unit.symbol() + ")";
  }

  private static String quoted(String text) {
    String shown = text.length() > 40 ? text.substring(0, 40) + "..." : text;
    return "\"" + shown.replaceAll("\\p{Cntrl}", "?") + "\"";
  }
}
