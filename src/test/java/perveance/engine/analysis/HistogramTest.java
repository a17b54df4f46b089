package perveance.engine.analysis;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertThrows;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.util.List;
import java.util.stream.DoubleStream;
import org.junit.jupiter.api.Test;

/** Classes of samples, derived by counting. */
class HistogramTest {
  /**
   * Samples 0, 1, ... 2399: the lowest and highest 0.2 % (five of each, by the interpolated
   * quantile) are left out, and the rest is even, so 24 classes hold 99 or 100 each.
   */
  @Test
  void evenSamplesFillEvenClasses() {
    Histogram h = Histogram.of(DoubleStream.iterate(0, x -> x + 1).limit(2400).toArray());
    assertEquals(24, h.counts().size());
    assertEquals(2400, h.samples());
    assertEquals(2390, h.counts().stream().mapToInt(Integer::intValue).sum());
    assertTrue(h.counts().stream().allMatch(c -> c == 99 || c == 100), h.counts().toString());
    assertEquals(100, h.highest());
  }

  /** One wild sample among a thousand does not stretch the classes. */
  @Test
  void aWildSampleIsLeftOut() {
    double[] samples = DoubleStream.iterate(1, x -> x + 1).limit(1000).toArray();
    samples[999] = 1e9;
    Histogram h = Histogram.of(samples);
    assertTrue(h.from() + 24 * h.width() < 1001, "classes end at " + (h.from() + 24 * h.width()));
  }

  @Test
  void classesHaveAWidth() {
    assertThrows(IllegalArgumentException.class, () -> new Histogram(0, 0, List.of(1), 1));
  }
}
