package perveance.engine.base;

import static org.junit.jupiter.api.Assertions.assertArrayEquals;
import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertFalse;
import static org.junit.jupiter.api.Assertions.assertThrows;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.util.Arrays;
import java.util.Random;
import java.util.Set;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;
import org.junit.jupiter.params.provider.EnumSource;
import org.junit.jupiter.params.provider.ValueSource;

class PreferredSeriesTest {
  /** Published: the series of IEC 60063, as printed; exact. */
  @ParameterizedTest
  @CsvSource({
    "E6, 10 15 22 33 47 68",
    "E12, 10 12 15 18 22 27 33 39 47 56 68 82",
    "E24, 10 11 12 13 15 16 18 20 22 24 27 30 33 36 39 43 47 51 56 62 68 75 82 91",
    "E48, 100 105 110 115 121 127 133 140 147 154 162 169 178 187 196 205 215 226 237 249 261 274"
        + " 287 301 316 332 348 365 383 402 422 442 464 487 511 536 562 590 619 649 681 715 750 787"
        + " 825 866 909 953",
    "E96, 100 102 105 107 110 113 115 118 121 124 127 130 133 137 140 143 147 150 154 158 162 165"
        + " 169 174 178 182 187 191 196 200 205 210 215 221 226 232 237 243 249 255 261 267 274 280"
        + " 287 294 301 309 316 324 332 340 348 357 365 374 383 392 402 412 422 432 442 453 464 475"
        + " 487 499 511 523 536 549 562 576 590 604 619 634 649 665 681 698 715 732 750 768 787 806"
        + " 825 845 866 887 909 931 953 976",
  })
  void seriesAreThoseOfTheStandard(PreferredSeries series, String printed) {
    int[] expected = Arrays.stream(printed.split(" ")).mapToInt(Integer::parseInt).toArray();
    assertArrayEquals(expected, series.numbers());
  }

  /**
   * Published: eight values of E24 are not 10^(n/24) rounded to two figures (IEC 60063); all others
   * are.
   */
  @Test
  void twentyFourHasItsEightExceptions() {
    Set<Integer> exceptions = Set.of(27, 30, 33, 36, 39, 43, 47, 82);
    int[] numbers = PreferredSeries.E24.numbers();
    for (int n = 0; n < 24; n++) {
      long rounded = Math.round(10 * Math.pow(10, n / 24.0));
      assertEquals(exceptions.contains(numbers[n]), rounded != numbers[n], "E24 " + numbers[n]);
    }
  }

  /**
   * Derived: each coarser series is every second value of the finer one, where both have two
   * figures.
   */
  @Test
  void coarserSeriesAreWithinFinerOnes() {
    assertEverySecond(PreferredSeries.E6.numbers(), PreferredSeries.E12.numbers());
    assertEverySecond(PreferredSeries.E12.numbers(), PreferredSeries.E24.numbers());
    assertEverySecond(PreferredSeries.E48.numbers(), PreferredSeries.E96.numbers());
  }

  @ParameterizedTest
  @CsvSource({
    "E12, 1500, 1500, 1500, 1500",
    "E12, 1600, 1500, 1500, 1800",
    "E12, 1700, 1800, 1500, 1800",
    "E24, 1700, 1800, 1600, 1800",
    "E6, 9000, 10000, 6800, 10000",
    "E6, 0.5, 0.47, 0.47, 0.68",
    "E96, 1000, 1000, 1000, 1000",
    "E96, 98700, 97600, 97600, 100000",
    "E12, 25e-9, 27e-9, 22e-9, 27e-9",
    "E24, 999.9, 1000, 910, 1000",
    "E12, 1e-12, 1e-12, 1e-12, 1e-12",
  })
  void findsNearestBelowAndAbove(
      PreferredSeries series, double value, double nearest, double below, double above) {
    assertEquals(nearest, series.nearest(value), 0);
    assertEquals(below, series.below(value), 0);
    assertEquals(above, series.above(value), 0);
  }

  /**
   * Derived: near means near by ratio. Between 10 and 15 the ratios meet at sqrt(150) = 12.247, not
   * at 12.5.
   */
  @Test
  void nearestGoesByRatio() {
    assertEquals(10, PreferredSeries.E6.nearest(12.24));
    assertEquals(15, PreferredSeries.E6.nearest(12.25));
  }

  /**
   * Property: below <= value <= above, neighbours in the series, nearest one of them, all exact.
   */
  @ParameterizedTest
  @EnumSource(PreferredSeries.class)
  void neighboursEncloseTheValue(PreferredSeries series) {
    Random random = new Random(60063);
    for (int round = 0; round < 20_000; round++) {
      double value = Math.pow(10, 30 * random.nextDouble() - 15);
      double below = series.below(value);
      double above = series.above(value);
      assertTrue(below <= value * (1 + 1e-14) && value <= above * (1 + 1e-14), "value " + value);
      assertTrue(series.contains(below) && series.contains(above));
      assertEquals(below, series.below(below));
      assertEquals(above, series.above(above));
      double nearest = series.nearest(value);
      assertTrue(nearest == below || nearest == above);
      double other = nearest == below ? above : below;
      double distance = Math.abs(Math.log(nearest / value));
      assertTrue(distance <= Math.abs(Math.log(other / value)) + 1e-12);
    }
  }

  /** Property: every value of every series in every decade is found as itself. */
  @ParameterizedTest
  @EnumSource(PreferredSeries.class)
  void ownValuesAreFound(PreferredSeries series) {
    for (int decade = -15; decade <= 15; decade++) {
      for (int number : series.numbers()) {
        double value = Double.parseDouble(number + "e" + decade);
        assertEquals(value, series.nearest(value));
        assertEquals(value, series.above(value));
        assertEquals(value, series.below(value));
        double computed = Math.nextUp(value);
        assertEquals(value, series.nearest(computed));
        assertTrue(series.contains(computed));
      }
    }
    assertFalse(series.contains(1.234e3 * 1.007));
  }

  @ParameterizedTest
  @ValueSource(
      doubles = {0, -1, Double.NaN, Double.POSITIVE_INFINITY, 1e-30, 1e30, Double.MIN_VALUE})
  void refusesWhatNoPartCanHave(double value) {
    for (PreferredSeries series : PreferredSeries.values()) {
      assertThrows(IllegalArgumentException.class, () -> series.nearest(value));
      assertThrows(IllegalArgumentException.class, () -> series.above(value));
      assertThrows(IllegalArgumentException.class, () -> series.below(value));
    }
  }

  @Test
  void listsOneDecade() {
    assertArrayEquals(new double[] {1, 1.5, 2.2, 3.3, 4.7, 6.8}, PreferredSeries.E6.list(), 0);
    PreferredSeries.E6.numbers()[0] = 99;
    assertEquals(10, PreferredSeries.E6.numbers()[0]);
  }

  private static void assertEverySecond(int[] coarse, int[] fine) {
    assertEquals(2 * coarse.length, fine.length);
    for (int n = 0; n < coarse.length; n++) {
      assertEquals(coarse[n], fine[2 * n]);
    }
  }
}
