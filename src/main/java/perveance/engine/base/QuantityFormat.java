package perveance.engine.base;

import java.math.BigDecimal;
import java.math.MathContext;
import java.math.RoundingMode;

/**
 * Prints quantities as the trade writes them, always the same whatever the machine's locale. Parts
 * are printed in the letter code of IEC 60062 ("4k7"), readings as a meter shows them ("1.07 mA"),
 * to a stated number of significant figures or to the band of doubt around them, never finer.
 *
 * <p>{@link QuantityParser} reads everything printed here.
 */
public enum QuantityFormat {
  /** With the signs of print: micro, ohm, minus and the dash of a range. */
  TYPESET("\u2212", "\u2013"),
  /** In ASCII alone, for files. */
  PLAIN("-", "-");

  /** Beyond these powers of ten a part is printed as a number with an exponent. */
  private static final int LEAST_PART_POWER = -15;

  private static final int GREATEST_PART_POWER = 12;

  /** Beyond so many zeros before or behind the point a reading is printed with an exponent. */
  private static final int MOST_ZEROS = 9;

  /** However narrow its band, a value is not printed to more figures. */
  private static final int MOST_FIGURES = 4;

  /** Figures for a value whose band has no width. */
  private static final int FIGURES_WITHOUT_BAND = 3;

  private final String minus;
  private final String dash;

  QuantityFormat(String minus, String dash) {
    this.minus = minus;
    this.dash = dash;
  }

  /**
   * Prints the value of a part without loss: reading it back gives the same number.
   *
   * @param value the value, finite [in the unit]
   * @param unit the unit
   * @return such as "4k7", "22n", "0R47", "470R", "6.3 V", "1.5 mA"
   */
  public String part(double value, Unit unit) {
    return partText(exact(value), unit);
  }

  /**
   * Prints the value of a part, rounded.
   *
   * @param value the value, finite [in the unit]
   * @param unit the unit
   * @param figures significant figures, 1 or more; zeros at the end are dropped
   * @return such as "4k7"
   */
  public String part(double value, Unit unit, int figures) {
    return partText(rounded(value, figures), unit);
  }

  /**
   * Prints a reading to a stated number of significant figures, zeros at the end included.
   *
   * @param value the reading, finite [in the unit]
   * @param unit the unit
   * @param figures significant figures, 1 or more
   * @return such as "1.07 mA", "203 V", "0.11 W", "38 kΩ"
   */
  public String reading(double value, Unit unit, int figures) {
    BigDecimal rounded = rounded(value, figures);
    if (rounded.signum() == 0) {
      return withUnit("0", unit, SiPrefix.NONE);
    }
    SiPrefix prefix = ReadingScale.prefixFor(unit, leadingPower(rounded));
    if (Math.abs(leadingPower(rounded) - prefix.exponent()) > MOST_ZEROS) {
      return withUnit(scientific(rounded), unit, SiPrefix.NONE);
    }
    int lastPower = leadingPower(rounded) - figures + 1;
    return withUnit(digits(rounded, lastPower, prefix), unit, prefix);
  }

  /**
   * Prints a value no finer than its band warrants.
   *
   * @param value the value, finite [in the unit]
   * @param low the lower end of its band, finite [in the unit]
   * @param high the upper end of its band, not below low, finite [in the unit]
   * @param unit the unit
   * @return such as "203 V"
   */
  public String toBand(double value, double low, double high, Unit unit) {
    int lastPower = bandPower(value, low, high);
    BigDecimal rounded = roundedAt(value, lastPower);
    SiPrefix prefix = commonPrefix(unit, value, low, high);
    return withUnit(digits(rounded, lastPower, prefix), unit, prefix);
  }

  /**
   * Prints a band from its lower to its upper end, no finer than its width warrants.
   *
   * @param low the lower end, finite [in the unit]
   * @param high the upper end, not below low, finite [in the unit]
   * @param unit the unit
   * @return such as "187–206 V", or "−2.1 to −1.8 V" where a sign would meet the dash
   */
  public String range(double low, double high, Unit unit) {
    int lastPower = bandPower(high, low, high);
    SiPrefix prefix = commonPrefix(unit, high, low, high);
    String from = digits(roundedAt(low, lastPower), lastPower, prefix);
    String to = digits(roundedAt(high, lastPower), lastPower, prefix);
    if (from.equals(to)) {
      return withUnit(to, unit, prefix);
    }
    boolean signed = from.startsWith(minus) || to.startsWith(minus);
    return withUnit(from + (signed ? " to " : dash) + to, unit, prefix);
  }

  /**
   * Prints a ratio in percent.
   *
   * @param ratio the ratio, finite [1]
   * @param figures significant figures, 1 or more
   * @return such as "3.9 %"
   */
  public String percent(double ratio, int figures) {
    BigDecimal hundredfold = rounded(ratio, figures).movePointRight(2);
    if (hundredfold.signum() == 0) {
      return "0 %";
    }
    int lastPower = leadingPower(hundredfold) - figures + 1;
    return digits(hundredfold, lastPower, SiPrefix.NONE) + " %";
  }

  /**
   * Prints a level in decibels with its sign.
   *
   * @param level the level, finite [dB]
   * @param decimals digits after the point, 0 or more
   * @return such as "+6.0 dB"
   */
  public String level(double level, int decimals) {
    if (decimals < 0) {
      throw new IllegalArgumentException("decimals is below 0: " + decimals);
    }
    BigDecimal rounded = roundedAt(level, -decimals);
    String sign = rounded.signum() > 0 ? "+" : "";
    return sign + digits(rounded, -decimals, SiPrefix.NONE) + " dB";
  }

  private String partText(BigDecimal number, Unit unit) {
    boolean lettered = unit == Unit.OHM || unit == Unit.FARAD;
    if (number.signum() == 0) {
      return unit == Unit.OHM ? "0R" : withUnit("0", unit, SiPrefix.NONE);
    }
    int leading = leadingPower(number);
    if (leading < LEAST_PART_POWER || leading >= GREATEST_PART_POWER || unit == Unit.PERVEANCE) {
      return withUnit(scientific(number), unit, SiPrefix.NONE);
    }
    SiPrefix prefix = partPrefix(unit, leading);
    String digits = signed(number.movePointLeft(prefix.exponent()).stripTrailingZeros());
    if (!lettered) {
      return withUnit(digits, unit, prefix);
    }
    String letter = prefix == SiPrefix.NONE && unit == Unit.OHM ? "R" : prefixText(prefix);
    if (letter.isEmpty()) {
      return withUnit(digits, unit, prefix);
    }
    return digits.contains(".") ? digits.replace(".", letter) : digits + letter;
  }

  /** The largest prefix that leaves a figure before the decimal sign, among those of parts. */
  private static SiPrefix partPrefix(Unit unit, int leadingPower) {
    return switch (unit) {
      case OHM -> {
        if (leadingPower >= 6) {
          yield SiPrefix.MEGA;
        }
        yield leadingPower >= 3 ? SiPrefix.KILO : SiPrefix.NONE;
      }
      default -> ReadingScale.prefixFor(unit, leadingPower);
    };
  }

  private String withUnit(String digits, Unit unit, SiPrefix prefix) {
    String symbol =
        switch (unit) {
          case RATIO -> "";
          case OHM -> this == TYPESET ? unit.symbol() : unit.plainSymbol();
          // data sheets state mutual conductance so
          case SIEMENS -> "A/V";
          default -> unit.symbol();
        };
    String name = prefixText(prefix) + symbol;
    return name.isEmpty() ? digits : digits + " " + name;
  }

  private String prefixText(SiPrefix prefix) {
    return this == TYPESET ? prefix.typeset() : prefix.plain();
  }

  private String scientific(BigDecimal number) {
    BigDecimal digits = new BigDecimal(number.abs().stripTrailingZeros().unscaledValue());
    int leading = leadingPower(number);
    String mantissa = digits.movePointLeft(digits.precision() - 1).toPlainString();
    String power = leading < 0 ? minus + -leading : Integer.toString(leading);
    return (number.signum() < 0 ? minus : "") + mantissa + "e" + power;
  }

  private String signed(BigDecimal number) {
    String digits = number.abs().toPlainString();
    return number.signum() < 0 ? minus + digits : digits;
  }

  /** The digits of a number rounded at a power of ten, in multiples of a prefix. */
  private String digits(BigDecimal number, int lastPower, SiPrefix prefix) {
    int decimals = Math.max(0, prefix.exponent() - lastPower);
    return signed(number.movePointLeft(prefix.exponent()).setScale(decimals, RoundingMode.HALF_UP));
  }

  private static BigDecimal exact(double value) {
    if (!Double.isFinite(value)) {
      throw new IllegalArgumentException("value is not finite: " + value);
    }
    return new BigDecimal(Double.toString(value));
  }

  private static BigDecimal rounded(double value, int figures) {
    if (figures < 1) {
      throw new IllegalArgumentException("figures is below 1: " + figures);
    }
    return exact(value).round(new MathContext(figures, RoundingMode.HALF_UP));
  }

  private static BigDecimal roundedAt(double value, int lastPower) {
    return exact(value).setScale(-lastPower, RoundingMode.HALF_UP);
  }

  private static int leadingPower(BigDecimal number) {
    return number.precision() - number.scale() - 1;
  }

  /** The power of ten of the last figure worth printing: five to fifty steps across the band. */
  private static int bandPower(double value, double low, double high) {
    if (!(low <= high)) {
      throw new IllegalArgumentException("low is above high: " + low + ", " + high);
    }
    double width = high - low;
    BigDecimal size = rounded(largest(value, low, high), FIGURES_WITHOUT_BAND);
    int leading = size.signum() == 0 ? 0 : leadingPower(size);
    if (width > 0 && Double.isFinite(width)) {
      return Math.max(leading - MOST_FIGURES + 1, (int) Math.floor(Math.log10(width / 5.0)));
    }
    return size.signum() == 0 ? 0 : leading - FIGURES_WITHOUT_BAND + 1;
  }

  private static double largest(double value, double low, double high) {
    return Math.max(Math.abs(value), Math.max(Math.abs(low), Math.abs(high)));
  }

  private static SiPrefix commonPrefix(Unit unit, double value, double low, double high) {
    BigDecimal size = rounded(largest(value, low, high), FIGURES_WITHOUT_BAND);
    return size.signum() == 0 ? SiPrefix.NONE : ReadingScale.prefixFor(unit, leadingPower(size));
  }
}
