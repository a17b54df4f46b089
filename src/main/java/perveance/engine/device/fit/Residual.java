package perveance.engine.device.fit;

import perveance.engine.device.Evidence;

/**
 * One published figure beside what a law says.
 *
 * @param evidence where the figure stands
 * @param figure what it is
 * @param published stated value [SI unit of the figure]
 * @param predicted the law's value [SI unit of the figure]
 * @param scale what a relative error is told against, above 0: the stated value, but for chart
 *     readings at least a tenth of the chart's highest current [SI unit of the figure]
 */
public record Residual(
    Evidence evidence, Figure figure, double published, double predicted, double scale) {
  /**
   * The error relative to the scale.
   *
   * @return (predicted - published) / scale [1]
   */
  public double relativeError() {
    return (predicted - published) / scale;
  }
}
