package perveance.app.wording;

import java.util.Map;
import java.util.OptionalDouble;
import perveance.engine.analysis.Band;
import perveance.engine.base.QuantityFormat;
import perveance.engine.base.Unit;

/** Prints figures: rounded to their band where they have one, to three digits where not. */
public final class Figures {
  private static final QuantityFormat FORMAT = QuantityFormat.TYPESET;
  private static final int DIGITS = 3;

  /** A reading nearer to zero than this is zero on a bench meter, common practice [V]. */
  private static final double METER_ZERO = 0.02;

  private Figures() {}

  /**
   * A value, rounded to its band if it has one.
   *
   * @param value value in the unit [1]
   * @param unit unit
   * @param bands bands by name
   * @param name name of the figure
   * @return text with unit
   */
  public static String value(double value, Unit unit, Map<String, Band> bands, String name) {
    Band band = bands.get(name);
    return band == null || !(band.low() <= band.high())
        ? reading(value, unit)
        : FORMAT.toBand(value, band.low(), band.high(), unit);
  }

  /**
   * A band.
   *
   * @param bands bands by name
   * @param name name of the figure
   * @param unit unit
   * @return low to high with unit, empty when there is no band
   */
  public static String band(Map<String, Band> bands, String name, Unit unit) {
    Band band = bands.get(name);
    return band == null ? "" : FORMAT.range(band.low(), band.high(), unit);
  }

  /**
   * A reading to three digits.
   *
   * @param value value in the unit [1]
   * @param unit unit
   * @return text with unit
   */
  public static String reading(double value, Unit unit) {
    return FORMAT.reading(value, unit, DIGITS);
  }

  /**
   * A reading to a stated number of digits.
   *
   * @param value value in the unit [1]
   * @param unit unit
   * @param digits significant digits
   * @return text with unit
   */
  public static String reading(double value, Unit unit, int digits) {
    return FORMAT.reading(value, unit, digits);
  }

  /**
   * A part's value as the trade writes it.
   *
   * @param value value in the unit [1]
   * @param unit unit
   * @return for example {@code 4k7}
   */
  public static String part(double value, Unit unit) {
    return FORMAT.part(value, unit, DIGITS);
  }

  /**
   * Power in a part; what warms nothing is not told to the last attowatt.
   *
   * @param watts power [W]
   * @return for example {@code 0.11 W}
   */
  public static String power(double watts) {
    return watts < 1e-3 ? "below 1 mW" : reading(watts, Unit.WATT, 2);
  }

  /**
   * What a meter shows between two ends, no finer than a bench meter resolves around zero.
   *
   * @param low lower end [V]
   * @param high upper end [V]
   * @return for example {@code 187-206 V}
   */
  public static String meterRange(double low, double high) {
    return Math.max(Math.abs(low), Math.abs(high)) < METER_ZERO
        ? "\u22120.02 to 0.02 V"
        : FORMAT.range(low, high, Unit.VOLT);
  }

  /**
   * A ratio in percent.
   *
   * @param ratio ratio [1]
   * @return for example {@code 1.6 %}
   */
  public static String percent(double ratio) {
    return ratio < 1e-4 ? "below 0.01 %" : FORMAT.percent(ratio, 2);
  }

  /**
   * A ratio in decibels, without sign for gains.
   *
   * @param ratio magnitude, above zero [1]
   * @return for example {@code 34.8 dB}
   */
  public static String decibels(double ratio) {
    String level = FORMAT.level(20 * Math.log10(Math.abs(ratio)), 1);
    return level.startsWith("+") ? level.substring(1) : level;
  }

  /**
   * A frequency that may be absent.
   *
   * @param frequency empty for none [Hz]
   * @param absent words for none
   * @return text
   */
  public static String frequency(OptionalDouble frequency, String absent) {
    return frequency.isPresent() ? reading(frequency.getAsDouble(), Unit.HERTZ, 2) : absent;
  }

  /**
   * A duration in words a person waits by.
   *
   * @param seconds time, positive infinity for never [s]
   * @return for example {@code 8 s} or {@code 3 min}
   */
  public static String duration(double seconds) {
    if (Double.isInfinite(seconds)) {
      return "never by itself";
    }
    if (seconds < 1) {
      return "less than 1 s";
    }
    if (seconds < 120) {
      return Math.round(Math.ceil(seconds)) + " s";
    }
    if (seconds < 7200) {
      return Math.round(Math.ceil(seconds / 60)) + " min";
    }
    return Math.round(Math.ceil(seconds / 3600)) + " h";
  }
}
