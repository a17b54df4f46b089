package perveance.engine.circuit;

import java.util.function.IntFunction;

/**
 * One period of a drive at equal steps, its highest peak being 1. The number of samples is a power
 * of two, 8 or more; harmonics from half of it up are folded, so it should be several times the
 * highest harmonic that matters.
 */
public final class Waveform {
  private static final int FEWEST = 8;

  private final double[] samples;
  private final IntFunction<Waveform> shape;

  private Waveform(double[] samples, IntFunction<Waveform> shape) {
    this.samples = samples;
    this.shape = shape;
  }

  /**
   * A cosine, one cycle a period.
   *
   * @param count number of samples, a power of two
   * @return the waveform
   */
  public static Waveform cosine(int count) {
    return twoTone(count, 1, 1, 2, 0);
  }

  /**
   * Two cosines that are multiples of one frequency, both at their peak at the start, so that the
   * peak of the sum is the sum of the peaks.
   *
   * @param count number of samples, a power of two above twice the highest product of interest
   * @param firstCycles cycles of the first tone in a period, 1 or more
   * @param firstShare share of the peak taken by the first tone [1]
   * @param secondCycles cycles of the second tone in a period, 1 or more
   * @param secondShare share of the peak taken by the second tone [1]
   * @return the waveform, scaled to a peak of 1
   */
  public static Waveform twoTone(
      int count, int firstCycles, double firstShare, int secondCycles, double secondShare) {
    if (count < FEWEST || Integer.bitCount(count) != 1) {
      throw new IllegalArgumentException("count is no power of two of 8 or more: " + count);
    }
    double[] samples = new double[count];
    double sum = firstShare + secondShare;
    for (int k = 0; k < count; k++) {
      // the second half mirrors the first to the last bit
      double turn = 2 * Math.PI * Math.min(k, count - k) / count;
      double both =
          firstShare * Math.cos(firstCycles * turn) + secondShare * Math.cos(secondCycles * turn);
      samples[k] = both / sum;
    }
    return new Waveform(
        samples, n -> twoTone(n, firstCycles, firstShare, secondCycles, secondShare));
  }

  /**
   * The intermodulation test of the SMPTE: 60 and 7000 Hz, 4 to 1, on their common period of 1/20
   * s. Harmonic 3 is the low tone, 350 the high one, 347, 353, 344, 356 its side tones.
   *
   * @return the waveform
   */
  public static Waveform smpte() {
    return twoTone(2048, 3, 4, 350, 1);
  }

  /**
   * The difference-tone test of the CCIF: 19 and 20 kHz, equal, on their common period of 1 ms.
   * Harmonic 1 is the difference tone, 18 and 21 are the third-order tones.
   *
   * @return the waveform
   */
  public static Waveform ccif() {
    return twoTone(256, 19, 1, 20, 1);
  }

  /**
   * The same shape at twice as many samples.
   *
   * @return finer waveform
   */
  Waveform finer() {
    return shape.apply(2 * samples.length);
  }

  /**
   * Number of samples.
   *
   * @return count, a power of two
   */
  public int count() {
    return samples.length;
  }

  /**
   * One sample.
   *
   * @param index place in the period
   * @return value, the peak being 1 [1]
   */
  public double sample(int index) {
    return samples[index];
  }

  /**
   * How many samples differ: a waveform that is even about its start needs only half of them.
   *
   * @return count that must be solved
   */
  int distinct() {
    for (int k = 1; k < samples.length; k++) {
      if (samples[k] != samples[samples.length - k]) {
        return samples.length;
      }
    }
    return samples.length / 2 + 1;
  }
}
