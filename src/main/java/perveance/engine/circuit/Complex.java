package perveance.engine.circuit;

/**
 * A complex number: a gain or an impedance at one frequency, in the unit that the method giving it
 * states.
 *
 * @param re real part [1]
 * @param im imaginary part [1]
 */
public record Complex(double re, double im) {
  /**
   * Magnitude.
   *
   * @return square root of the sum of squares, in the unit of the number [1]
   */
  public double magnitude() {
    return Math.hypot(re, im);
  }

  /**
   * Phase.
   *
   * @return angle, -pi to pi [rad]
   */
  public double phase() {
    return Math.atan2(im, re);
  }

  /**
   * One over this number.
   *
   * @return reciprocal
   */
  public Complex reciprocal() {
    double square = re * re + im * im;
    return new Complex(re / square, -im / square);
  }
}
