package perveance.files.toml;

import perveance.engine.base.QuantityFormat;
import perveance.engine.base.Unit;

/**
 * The unit and the range of a quantity.
 *
 * @param unit the unit
 * @param lowest smallest value accepted, finite [in the unit]
 * @param highest largest value accepted, finite [in the unit]
 */
public record Range(Unit unit, double lowest, double highest) {
  /** A quantity's size must be above nothing at all; nothing real is smaller. */
  private static final double LEAST = 1e-18;

  /** Refuses ranges without end. */
  public Range {
    if (!(Double.isFinite(lowest) && Double.isFinite(highest) && lowest <= highest)) {
      throw new IllegalArgumentException("range is from " + lowest + " to " + highest);
    }
  }

  /**
   * Anything above zero.
   *
   * @param unit the unit
   * @param highest largest value accepted [in the unit]
   * @return the range
   */
  public static Range above0(Unit unit, double highest) {
    return new Range(unit, LEAST, highest);
  }

  /**
   * Zero or more.
   *
   * @param unit the unit
   * @param highest largest value accepted [in the unit]
   * @return the range
   */
  public static Range from0(Unit unit, double highest) {
    return new Range(unit, 0, highest);
  }

  /**
   * Either sign.
   *
   * @param unit the unit
   * @param size largest size accepted [in the unit]
   * @return the range
   */
  public static Range within(Unit unit, double size) {
    return new Range(unit, -size, size);
  }

  /**
   * Whether a value is accepted; NaN never is.
   *
   * @param value the value [in the unit]
   * @return true when it is in the range
   */
  public boolean holds(double value) {
    return value >= lowest && value <= highest;
  }

  /**
   * The range in words that follow "expected".
   *
   * @return for example {@code a voltage from 1 V to 5 kV}
   */
  public String inWords() {
    String top = text(highest);
    if (lowest == LEAST) {
      return unit.quantityWord() + " above 0, at most " + top;
    }
    return unit.quantityWord() + " from " + text(lowest) + " to " + top;
  }

  private String text(double value) {
    if (unit == Unit.FARAD && value >= 1) {
      return Math.round(value) + " F"; // parts that large are not written in microfarads
    }
    return QuantityFormat.PLAIN.part(value, unit);
  }
}
