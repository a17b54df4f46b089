package perveance.engine.base;

import java.util.Optional;

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
  private static final int LONGEST_SHOWN = 40;
  private static final int MOST_EXPONENT_CHARACTERS = 5;
  private static final String BEYOND = ", which is beyond the numbers a computer keeps";

  private QuantityParser() {}

  /**
   * Reads a quantity of the unit expected.
   *
   * @param text the text as typed
   * @param expected the unit the quantity must have
   * @return the finite quantity in that unit
   * @throws QuantityException if the text is anything else, saying what was found and expected
   */
  public static Quantity parse(String text, Unit expected) throws QuantityException {
    String tidy = tidy(text);
    if (tidy.isEmpty()) {
      throw refusal("nothing", expected);
    }
    if (tidy.length() > LONGEST_TEXT) {
      throw refusal(quoted(text) + ", which is too long for a quantity", expected);
    }
    Optional<WrittenNumber> code = WrittenNumber.readLetterCode(tidy);
    Optional<UnitMeaning> letter =
        code.isEmpty() ? Optional.empty() : letterMeaning(code.get(), expected);
    return letter.isPresent()
        ? quantity(code.orElseThrow(), letter.get(), text, expected)
        : parsePlain(tidy, text, expected);
  }

  /** What the letter of a code means, if the code is one of the unit expected. */
  private static Optional<UnitMeaning> letterMeaning(WrittenNumber code, Unit expected) {
    Optional<UnitMeaning> letter = UnitSpelling.read(String.valueOf(code.separator()), expected);
    boolean unitFits = code.rest().isEmpty() || UnitSpelling.names(code.rest(), expected);
    // "k7" is rather a lost digit than 700
    boolean lostDigit = code.whole().isEmpty() && letter.isPresent() && letter.get().power() > 0;
    return unitFits && !lostDigit ? letter : Optional.empty();
  }

  private static Quantity parsePlain(String tidy, String text, Unit expected)
      throws QuantityException {
    Optional<WrittenNumber> number = WrittenNumber.read(tidy);
    if (number.isEmpty()) {
      throw refusal(quoted(text), expected);
    }
    if (number.get().mayMeanThousands()) {
      throw refusal(quoted(text) + ", which can mean two things by its comma", expected);
    }
    String suffix = number.get().rest();
    Optional<UnitMeaning> meaning = UnitSpelling.read(suffix, expected);
    if (meaning.isPresent()) {
      return quantity(number.get(), meaning.get(), text, expected);
    }
    Optional<Unit> other = otherUnit(tidy, suffix);
    String trouble =
        other.isPresent()
            ? ", which is " + inWords(other.get())
            : ", in which " + quoted(suffix) + " is not understood here";
    throw refusal(quoted(text) + trouble, expected);
  }

  /** The unit that stands there instead of the one expected, "4k7 ohm" where volts belong too. */
  private static Optional<Unit> otherUnit(String tidy, String suffix) {
    Optional<WrittenNumber> code = WrittenNumber.readLetterCode(tidy);
    String letters = code.filter(c -> !c.rest().isEmpty()).map(WrittenNumber::rest).orElse(suffix);
    return UnitSpelling.readAny(letters)
        .or(() -> code.flatMap(c -> UnitSpelling.readAny(String.valueOf(c.separator()))))
        .map(UnitMeaning::unit);
  }

  private static Quantity quantity(
      WrittenNumber number, UnitMeaning meaning, String text, Unit expected)
      throws QuantityException {
    String exponent = number.exponent();
    if (exponent.length() > MOST_EXPONENT_CHARACTERS) {
      throw refusal(quoted(text) + BEYOND, expected);
    }
    int power = exponent.isEmpty() ? 0 : Integer.parseInt(exponent);
    double value = meaning.apply(number, power);
    boolean vanished = value == 0 && !number.isZero();
    if (!Double.isFinite(value) || vanished) {
      throw refusal(quoted(text) + BEYOND, expected);
    }
    // a zero is a zero, whatever its sign
    return new Quantity(value == 0 ? 0.0 : value, expected);
  }

  /** Blanks and minus signs from typesetting become the plain ones. */
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
    StringBuilder shown = new StringBuilder("\"");
    for (int i = 0; i < text.length() && i < LONGEST_SHOWN; i++) {
      shown.append(Character.isISOControl(text.charAt(i)) ? '?' : text.charAt(i));
    }
    return shown.append(text.length() > LONGEST_SHOWN ? "...\"" : "\"").toString();
  }
}
