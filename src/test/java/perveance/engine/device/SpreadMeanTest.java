package perveance.engine.device;

import static org.junit.jupiter.api.Assertions.assertEquals;

import org.junit.jupiter.api.DisplayName;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;

/** The spread integral against the plain law, numerical integration and finite differences. */
class SpreadMeanTest {
  /*
   * Derived. Case: both ends at 4 V. Expected: 4^1.5 = 8, slopes 3/2 * sqrt(4) shared equally.
   * Tolerance: rounding.
   */
  @Test
  @DisplayName("a point interval is the plain three-halves law")
  void pointInterval() {
    SpreadMean mean = SpreadMean.over(4, 4);
    assertEquals(8, mean.value(), 1e-14);
    assertEquals(1.5, mean.byLower(), 1e-14);
    assertEquals(1.5, mean.byUpper(), 1e-14);
  }

  /*
   * Derived. Case: intervals in, across and outside the conducting region, in both orders.
   * Expected: midpoint sum of 200,000 strips. Tolerance 1e-8 relative: the sum's own error at the
   * square-root-like end of the conducting region.
   */
  @ParameterizedTest
  @CsvSource({"1,2", "0.5,7", "-3,2", "-0.01,5", "2,1", "3,-9", "-2,-1", "4,4.0001"})
  @DisplayName("value equals the numerical integral")
  void numericalIntegral(double one, double other) {
    int strips = 200_000;
    double sum = 0;
    for (int i = 0; i < strips; i++) {
      double y = one + (other - one) * (i + 0.5) / strips;
      sum += Math.pow(Math.max(0, y), 1.5);
    }
    double expected = sum / strips;
    assertEquals(expected, SpreadMean.over(one, other).value(), 1e-8 * expected + 1e-15);
  }

  /*
   * Derived. Slopes against central differences of the value with a step of 1e-5 V; their error is
   * of the order of the step squared over the distance from the joint at zero.
   */
  @ParameterizedTest
  @CsvSource({"1,2", "0.5,7", "-3,2", "-0.5,5", "2,1", "3,-9", "4,4.001"})
  @DisplayName("slopes equal finite differences")
  void slopes(double one, double other) {
    double step = 1e-5;
    SpreadMean mean = SpreadMean.over(one, other);
    double byOne =
        (SpreadMean.over(one + step, other).value() - SpreadMean.over(one - step, other).value())
            / (2 * step);
    double byOther =
        (SpreadMean.over(one, other + step).value() - SpreadMean.over(one, other - step).value())
            / (2 * step);
    assertEquals(byOne, mean.byLower(), 1e-8);
    assertEquals(byOther, mean.byUpper(), 1e-8);
  }
}
