package perveance.engine.circuit;

import perveance.engine.base.PhysicalConstants;

/**
 * The band over which noise is summed, and what is assumed.
 *
 * @param lowest lower end, above zero [Hz]
 * @param highest upper end, above the lower [Hz]
 * @param temperature of all resistors, above zero [K]
 * @param flickerCorner frequency below which the valves' flicker noise exceeds their shot noise,
 *     zero for none; oxide cathodes from a few hundred hertz to several kilohertz [Hz]
 */
public record NoiseBand(double lowest, double highest, double temperature, double flickerCorner) {
  /** Checks the values. */
  public NoiseBand {
    ElementChecks.positive("lowest", lowest);
    ElementChecks.positive("highest", highest);
    if (!(highest > lowest)) {
      throw new IllegalArgumentException("highest is not above lowest: " + highest);
    }
    ElementChecks.positive("temperature", temperature);
    ElementChecks.notNegative("flickerCorner", flickerCorner);
  }

  /**
   * Resistors at 290 K and no flicker noise.
   *
   * @param lowest lower end, above zero [Hz]
   * @param highest upper end, above the lower [Hz]
   * @return the band
   */
  public static NoiseBand of(double lowest, double highest) {
    return new NoiseBand(lowest, highest, PhysicalConstants.STANDARD_NOISE_TEMPERATURE, 0);
  }

  /**
   * The same band with flicker noise.
   *
   * @param corner flicker corner of the valves, zero or above [Hz]
   * @return the band
   */
  public NoiseBand withFlickerCorner(double corner) {
    return new NoiseBand(lowest, highest, temperature, corner);
  }
}
