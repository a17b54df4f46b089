package perveance.engine.analysis;

import java.util.List;

/** Hand sums of overload and distortion. */
final class SwingSums {
  private SwingSums() {}

  /**
   * Second harmonic from the two swings of one input (three-ordinate formula, as in the RCA
   * Receiving Tube Manual).
   *
   * @param curve the stage's characteristic
   * @param peak peak of the input [V]
   * @param share share of the source's voltage at the input [1]
   */
  static List<HandSum> of(StageCurve curve, double peak, double share) {
    double source = peak / share;
    if (!(peak > 0) || !curve.move(source)) {
      return List.of();
    }
    double first = Math.abs(curve.output(0));
    if (!curve.move(-source)) {
      return List.of();
    }
    double second = Math.abs(curve.output(0));
    double difference = Math.abs(first - second);
    if (!(difference > 1e-6 * first)) {
      return List.of();
    }
    return List.of(
        new HandSum(
            "second harmonic",
            "H2 = |first - second| / (2 (first + second))",
            "|"
                + Sum.volts(first)
                + " - "
                + Sum.volts(second)
                + "| / (2 x ("
                + Sum.volts(first)
                + " + "
                + Sum.volts(second)
                + "))",
            Sum.percent(difference / (2 * (first + second))),
            "output swings each way for " + Sum.volts(peak) + " peak in"));
  }
}
