package perveance.engine.numeric;

import static org.junit.jupiter.api.Assertions.assertArrayEquals;
import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertThrows;

import org.junit.jupiter.api.Test;

/** Derived: every expected value is a sum on paper. */
class StatisticsTest {
  private static final double[] SAMPLE = {4, 1, 3, 2};

  @Test
  void meanAndSpread() {
    assertEquals(2.5, Statistics.mean(SAMPLE));
    assertEquals(Math.sqrt(5.0 / 3), Statistics.standardDeviation(SAMPLE), 1e-15);
    assertEquals(Math.sqrt(7.5), Statistics.rootMeanSquare(SAMPLE), 1e-15);
  }

  @Test
  void medianOfOddAndEvenCounts() {
    assertEquals(2.5, Statistics.median(SAMPLE));
    assertEquals(3, Statistics.median(new double[] {9, 3, 1}));
    assertEquals(7, Statistics.median(new double[] {7}));
    assertArrayEquals(new double[] {4, 1, 3, 2}, SAMPLE);
  }

  @Test
  void percentilesBetweenNeighbours() {
    assertEquals(1, Statistics.percentile(SAMPLE, 0));
    assertEquals(4, Statistics.percentile(SAMPLE, 1));
    assertEquals(1.75, Statistics.percentile(SAMPLE, 0.25), 1e-15);
    assertEquals(3.7, Statistics.percentileOfSorted(new double[] {1, 2, 3, 4}, 0.9), 1e-15);
  }

  @Test
  void weighted() {
    double[] weight = {1, 1, 1, 5};
    assertEquals(18.0 / 8, Statistics.weightedMean(SAMPLE, weight), 1e-15);
    assertEquals(2, Statistics.weightedMedian(SAMPLE, weight));
    assertEquals(4, Statistics.weightedMedian(SAMPLE, new double[] {1, 0, 0, 0}));
  }

  @Test
  void refusesMisuse() {
    double[] none = {};
    assertThrows(IllegalArgumentException.class, () -> Statistics.mean(none));
    assertThrows(IllegalArgumentException.class, () -> Statistics.standardDeviation(new double[1]));
    assertThrows(
        IllegalArgumentException.class, () -> Statistics.median(new double[] {Double.NaN}));
    assertThrows(IllegalArgumentException.class, () -> Statistics.percentile(SAMPLE, 1.1));
    assertThrows(
        IllegalArgumentException.class, () -> Statistics.weightedMean(SAMPLE, new double[4]));
    assertThrows(
        IllegalArgumentException.class,
        () -> Statistics.weightedMean(SAMPLE, new double[] {1, -1, 1, 1}));
    assertThrows(
        IllegalArgumentException.class, () -> Statistics.weightedMedian(SAMPLE, new double[3]));
  }
}
