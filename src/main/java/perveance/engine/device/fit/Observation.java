package perveance.engine.device.fit;

import perveance.engine.device.Evidence;

/**
 * A figure of the evidence as a least-squares fit sees it. Slopes count by their logarithm, so that
 * mu, ra and gm of one point weigh alike; currents and cut-off by their value.
 *
 * @param evidence where the figure stands
 * @param figure what it is
 * @param target observed value, or its logarithm for mu, ra and gm [SI unit of the figure or 1]
 * @param deviation standard deviation of the target, above 0 [unit of the target]
 */
record Observation(Evidence evidence, Figure figure, double target, double deviation) {
  private static final double LEAST_SLOPE = 1e-12;
  private static final double MOST_SLOPE = 1e12;

  /** Whether the figure counts by its logarithm. */
  static boolean logarithmic(Figure figure) {
    return switch (figure) {
      case AMPLIFICATION, ANODE_RESISTANCE, MUTUAL_CONDUCTANCE -> true;
      case CURRENT, SCREEN_CURRENT, CUT_OFF -> false;
    };
  }

  /** The law's value in the terms of the target. */
  double predicted(LawReadings readings) {
    double value = readings.predict(evidence, figure);
    // a point that a trial law cuts off has no slopes; it must still give a finite number
    return logarithmic(figure)
        ? Math.log(Math.max(LEAST_SLOPE, Math.min(MOST_SLOPE, value)))
        : value;
  }
}
