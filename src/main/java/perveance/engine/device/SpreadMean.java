package perveance.engine.device;

/**
 * Mean of the three-halves power of an effective voltage that is uniformly spread.
 *
 * <p>The penetration factor of a real grid varies along its structure, so the effective voltage
 * fills an interval; where it is negative that part of the cathode is cut off (island formation).
 * The mean over the interval from {@code lower} to {@code upper} is
 *
 * <pre>{@code (2/5) * (upper+^(5/2) - lower+^(5/2)) / (upper - lower)}</pre>
 *
 * with {@code y+ = max(0, y)}. In the square roots p, q of two positive ends the quotient divides
 * out, {@code (2/5) (q^4 + q^3 p + q^2 p^2 + q p^3 + p^4) / (q + p)}, so the value and its slopes
 * keep full precision when the interval shrinks to a point, where they become the plain
 * three-halves law.
 *
 * @param value mean [V^1.5]
 * @param byLower slope with respect to the lower end [V^0.5]
 * @param byUpper slope with respect to the upper end [V^0.5]
 */
record SpreadMean(double value, double byLower, double byUpper) {
  private static final SpreadMean CUT_OFF = new SpreadMean(0, 0, 0);

  /**
   * Integrates over the interval.
   *
   * @param one one end [V]
   * @param other other end, on either side of the first [V]
   * @return mean with slopes by the first and the second argument, finite for finite ends [V^1.5]
   */
  static SpreadMean over(double one, double other) {
    if (one > other) {
      SpreadMean swapped = over(other, one);
      return new SpreadMean(swapped.value, swapped.byUpper, swapped.byLower);
    }
    if (other <= 0) {
      return CUT_OFF;
    }
    double q = Math.sqrt(other);
    if (one <= 0) {
      double width = other - one;
      double mean = 0.4 * other * other * q / width;
      return new SpreadMean(mean, mean / width, (other * q - mean) / width);
    }
    double p = Math.sqrt(one);
    double sum = p + q;
    double mean =
        0.4 * (other * other + other * q * p + other * one + one * p * q + one * one) / sum;
    double byUpper = (q * (0.6 * other + 0.8 * one) + p * (1.2 * other + 0.4 * one)) / (sum * sum);
    double byLower = (p * (0.6 * one + 0.8 * other) + q * (1.2 * one + 0.4 * other)) / (sum * sum);
    return new SpreadMean(mean, byLower, byUpper);
  }
}
