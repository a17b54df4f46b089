package perveance.engine.numeric;

import java.util.OptionalDouble;
import org.apache.commons.math3.complex.Complex;
import org.apache.commons.math3.transform.DftNormalization;
import org.apache.commons.math3.transform.FastFourierTransformer;
import org.apache.commons.math3.transform.TransformType;

/**
 * The harmonics of a waveform of which one period is known at equal steps: x = A0 + sum of an cos(n
 * theta) + bn sin(n theta), with theta from 0 at the first sample. Exact when the waveform has no
 * harmonic from half the number of samples up; what it has there is folded onto lower ones.
 */
public final class Harmonics {
  private final double[] cosine;
  private final double[] sine;

  private Harmonics(double[] cosine, double[] sine) {
    this.cosine = cosine;
    this.sine = sine;
  }

  /**
   * Analyses one period.
   *
   * @param samples finite values at equal steps over exactly one period, the end point left out;
   *     their number a power of two, 4 or more [any unit]
   * @return the harmonics
   */
  public static Harmonics of(double[] samples) {
    int count = samples.length;
    if (count < 4 || Integer.bitCount(count) != 1) {
      throw new IllegalArgumentException(
          "samples has " + count + " values, not a power of two of 4 or more");
    }
    for (double sample : samples) {
      if (!Double.isFinite(sample)) {
        throw new IllegalArgumentException("samples holds a value that is not finite: " + sample);
      }
    }
    Complex[] transform =
        new FastFourierTransformer(DftNormalization.STANDARD)
            .transform(samples, TransformType.FORWARD);
    double[] cosine = new double[count / 2];
    double[] sine = new double[count / 2];
    cosine[0] = transform[0].getReal() / count;
    for (int n = 1; n < count / 2; n++) {
      cosine[n] = 2.0 * transform[n].getReal() / count;
      sine[n] = -2.0 * transform[n].getImaginary() / count;
    }
    return new Harmonics(cosine, sine);
  }

  /**
   * Returns the highest harmonic that is known.
   *
   * @return half the number of samples less one
   */
  public int highest() {
    return cosine.length - 1;
  }

  /**
   * Returns the mean over the period.
   *
   * @return A0 [unit of the samples]
   */
  public double mean() {
    return cosine[0];
  }

  /**
   * Returns the part of a harmonic in phase with a cosine.
   *
   * @param order which harmonic, from 1 to the highest
   * @return an, peak [unit of the samples]
   */
  public double cosine(int order) {
    requireOrder(order);
    return cosine[order];
  }

  /**
   * Returns the part of a harmonic in phase with a sine.
   *
   * @param order which harmonic, from 1 to the highest
   * @return bn, peak [unit of the samples]
   */
  public double sine(int order) {
    requireOrder(order);
    return sine[order];
  }

  /**
   * Returns the size of a harmonic.
   *
   * @param order which harmonic, from 1 to the highest
   * @return the peak amplitude, 0 or more [unit of the samples]
   */
  public double amplitude(int order) {
    requireOrder(order);
    return Math.hypot(cosine[order], sine[order]);
  }

  /**
   * Returns where in its period a harmonic begins: it is amplitude times cos(n theta + phase).
   *
   * @param order which harmonic, from 1 to the highest
   * @return the phase, from -pi to pi; 0 for a harmonic that is absent [rad]
   */
  public double phase(int order) {
    requireOrder(order);
    return Math.atan2(-sine[order], cosine[order]);
  }

  /**
   * Returns a harmonic's size as a share of the fundamental's.
   *
   * @param order which harmonic, from 1 to the highest
   * @return the ratio of amplitudes [1]; empty where there is no fundamental
   */
  public OptionalDouble relative(int order) {
    double fundamental = amplitude(1);
    double ratio = amplitude(order) / fundamental;
    return Double.isFinite(ratio) ? OptionalDouble.of(ratio) : OptionalDouble.empty();
  }

  /**
   * Returns the total harmonic distortion: the root of the sum of squares of the harmonics from the
   * second up, as a share of the fundamental.
   *
   * @param highestOrder the last harmonic counted, from 2 to the highest
   * @return the distortion [1]; empty where there is no fundamental
   */
  public OptionalDouble distortion(int highestOrder) {
    if (highestOrder < 2 || highestOrder > highest()) {
      throw new IllegalArgumentException(
          "highestOrder is not between 2 and " + highest() + ": " + highestOrder);
    }
    double sum = 0;
    for (int n = 2; n <= highestOrder; n++) {
      sum = Math.hypot(sum, amplitude(n));
    }
    double ratio = sum / amplitude(1);
    return Double.isFinite(ratio) ? OptionalDouble.of(ratio) : OptionalDouble.empty();
  }

  private void requireOrder(int order) {
    if (order < 1 || order > highest()) {
      throw new IllegalArgumentException("order is not between 1 and " + highest() + ": " + order);
    }
  }
}
