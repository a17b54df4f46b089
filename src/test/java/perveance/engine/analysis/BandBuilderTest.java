package perveance.engine.analysis;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.util.List;
import org.junit.jupiter.api.Test;

class BandBuilderTest {
  /**
   * Derived. A sum 3 a + 4 b of independent normal deviates has a standard deviation of 5, so that
   * its 95 % band is 5 x 1.95996 either way, 9/25 of the variance from a and 16/25 from b. The
   * tolerance is the sampling error of a quantile of 1,000 stratified samples of two causes.
   */
  @Test
  void bandAndSharesOfALinearFigure() {
    SampleDraws draws = new SampleDraws(7, 1000, 3);
    double[] figure = new double[1000];
    for (int s = 0; s < figure.length; s++) {
      figure[s] = 100 + 3 * draws.of(0, s) + 4 * draws.of(1, s);
    }
    Band band = new BandBuilder(draws, List.of("a", "b", "idle")).band(figure);
    assertEquals(100 - 9.8, band.low(), 0.5);
    assertEquals(100 + 9.8, band.high(), 0.5);
    assertEquals("b", band.shares().get(0).cause());
    assertEquals(0.64, band.shares().get(0).fraction(), 0.03);
    assertEquals(0.36, band.shares().get(1).fraction(), 0.03);
    assertEquals(2, band.shares().size());
  }

  /** Derived. Each cause takes every slice once: mean 0, variance 1, no two causes alike. */
  @Test
  void drawsAreStandardAndIndependent() {
    SampleDraws draws = new SampleDraws(1, 1000, 4);
    for (int a = 0; a < 4; a++) {
      double sum = 0;
      double squares = 0;
      for (int s = 0; s < 1000; s++) {
        sum += draws.of(a, s);
        squares += draws.of(a, s) * draws.of(a, s);
      }
      assertEquals(0, sum / 1000, 1e-12);
      assertEquals(1, squares / 1000, 0.005);
      for (int b = 0; b < a; b++) {
        double product = 0;
        for (int s = 0; s < 1000; s++) {
          product += draws.of(a, s) * draws.of(b, s);
        }
        assertEquals(0, product / 1000, 0.12);
      }
    }
  }

  @Test
  void theSameSeedGivesTheSameDraws() {
    SampleDraws one = new SampleDraws(5, 100, 2);
    SampleDraws again = new SampleDraws(5, 100, 2);
    SampleDraws other = new SampleDraws(6, 100, 2);
    boolean differs = false;
    for (int s = 0; s < 100; s++) {
      assertEquals(one.of(1, s), again.of(1, s));
      differs |= one.of(1, s) != other.of(1, s);
    }
    assertTrue(differs);
  }

  @Test
  void samplesWithoutAnAnswerAreLeftOut() {
    SampleDraws draws = new SampleDraws(3, 200, 1);
    double[] figure = new double[200];
    for (int s = 0; s < 200; s++) {
      figure[s] = s % 10 == 0 ? Double.NaN : 1;
    }
    Band band = new BandBuilder(draws, List.of("a")).band(figure);
    assertEquals(1, band.low());
    assertEquals(1, band.high());
    assertTrue(band.shares().isEmpty());
  }
}
