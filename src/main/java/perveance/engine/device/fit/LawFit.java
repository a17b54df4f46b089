package perveance.engine.device.fit;

import java.util.List;
import perveance.engine.device.DeviceLaw;
import perveance.engine.device.Evidence;
import perveance.engine.device.FitSummary;
import perveance.engine.device.Validity;

/**
 * A law fitted to evidence.
 *
 * @param law the law
 * @param summary how good it is, as a device file keeps it
 * @param validity what the evidence covers
 * @param residuals every figure used, in the order of the evidence
 * @param fittedKeys the parameters that were fitted, as keys of the law
 * @param covariance of the fitted parameters, fitted x fitted [product of their units]
 * @param distrusted evidence that does not go with the rest, from a robust fit
 */
public record LawFit(
    DeviceLaw law,
    FitSummary summary,
    Validity validity,
    List<Residual> residuals,
    List<String> fittedKeys,
    double[][] covariance,
    List<Evidence> distrusted) {
  /** Copies what could change. */
  public LawFit {
    residuals = List.copyOf(residuals);
    fittedKeys = List.copyOf(fittedKeys);
    covariance = copy(covariance);
    distrusted = List.copyOf(distrusted);
  }

  /**
   * The covariance.
   *
   * @return a copy, fitted x fitted [product of their units]
   */
  @Override
  public double[][] covariance() {
    return copy(covariance);
  }

  private static double[][] copy(double[][] matrix) {
    double[][] copy = new double[matrix.length][];
    for (int i = 0; i < matrix.length; i++) {
      copy[i] = matrix[i].clone();
    }
    return copy;
  }
}
