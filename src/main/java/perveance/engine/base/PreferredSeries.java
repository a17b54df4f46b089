package perveance.engine.base;

import java.util.Arrays;

/**
 * The preferred number series for resistors and capacitors (IEC 60063:2015). A value of E6, E12 and
 * E24 has two figures, one of E48 and E96 three. E48 and E96 are 10^(n/48) and 10^(n/96) rounded;
 * eight values of E24 (27, 30, 33, 36, 39, 43, 47, 82) are not, for historical reasons.
 */
public enum PreferredSeries {
  E6(10, 15, 22, 33, 47, 68),
  E12(10, 12, 15, 18, 22, 27, 33, 39, 47, 56, 68, 82),
  E24(
      10, 11, 12, 13, 15, 16, 18, 20, 22, 24, 27, 30, 33, 36, 39, 43, 47, 51, 56, 62, 68, 75, 82,
      91),
  E48(rounded(48)),
  E96(rounded(96));

  /** The smallest and the largest exponent of ten that a part can sensibly have. */
  private static final int LEAST_DECADE = -18;

  private static final int GREATEST_DECADE = 18;

  private final int[] numbers;

  PreferredSeries(int... numbers) {
    this.numbers = numbers;
  }

  private static int[] rounded(int steps) {
    int[] numbers = new int[steps];
    for (int n = 0; n < steps; n++) {
      numbers[n] = (int) Math.round(100.0 * Math.pow(10.0, (double) n / steps));
    }
    return numbers;
  }

  /**
   * Returns the values of one decade, from 10 (or 100) upwards.
   *
   * @return two-figure numbers for E6 to E24, three-figure numbers for E48 and E96, ascending
   */
  public int[] numbers() {
    return numbers.clone();
  }

  /**
   * Returns the values of one decade.
   *
   * @return the values from 1 up to below 10, ascending [1]
   */
  public double[] list() {
    return Arrays.stream(numbers).mapToDouble(number -> (double) number / numbers[0]).toArray();
  }

  /**
   * Returns the value of the series at the least ratio from the given one; of two at the same
   * ratio, the higher.
   *
   * @param value above 0, between 1e-17 and 1e18 [any unit]
   * @return the nearest value of the series [the same unit]
   */
  public double nearest(double value) {
    double below = below(value);
    double above = above(value);
    return value / below < above / value ? below : above;
  }

  /**
   * Returns the largest value of the series that is not above the given one.
   *
   * @param value above 0, between 1e-17 and 1e18 [any unit]
   * @return the value itself if it belongs to the series, else the next below [the same unit]
   */
  public double below(double value) {
    int place = placeAtOrBelow(value);
    return at(place);
  }

  /**
   * Returns the smallest value of the series that is not below the given one.
   *
   * @param value above 0, between 1e-17 and 1e18 [any unit]
   * @return the value itself if it belongs to the series, else the next above [the same unit]
   */
  public double above(double value) {
    int place = placeAtOrBelow(value);
    double below = at(place);
    return same(below, value) ? below : at(place + 1);
  }

  /**
   * Tells whether a value belongs to the series, apart from rounding in the last binary places.
   *
   * @param value above 0, between 1e-17 and 1e18 [any unit]
   * @return true if it is one of the series
   */
  public boolean contains(double value) {
    return same(below(value), value);
  }

  private int placeAtOrBelow(double value) {
    if (!(value >= 1e-17 && value <= 1e18)) {
      throw new IllegalArgumentException("value is not between 1e-17 and 1e18: " + value);
    }
    int decade = (int) Math.floor(Math.log10(value));
    int place = decade * numbers.length;
    while (at(place) > value && !same(at(place), value)) {
      place--;
    }
    while (at(place + 1) <= value || same(at(place + 1), value)) {
      place++;
    }
    return place;
  }

  /** The value at a place counted from 1.0, made from its decimal digits so that it is exact. */
  private double at(int place) {
    int decade = Math.floorDiv(place, numbers.length);
    if (decade < LEAST_DECADE || decade > GREATEST_DECADE) {
      throw new IllegalArgumentException("decade is outside -18 to 18: " + decade);
    }
    int digits = numbers[0] == 10 ? 1 : 2;
    int number = numbers[Math.floorMod(place, numbers.length)];
    return Double.parseDouble(number + "e" + (decade - digits));
  }

  private static boolean same(double a, double b) {
    return Math.abs(a - b) <= 8.0 * Math.ulp(a);
  }
}
