package perveance.engine.numeric;

import java.util.List;
import java.util.OptionalDouble;

/** What came of a least-squares fit. */
public sealed interface FitOutcome {
  /**
   * The fit converged.
   *
   * @param parameters the fitted parameters, in the order given [unit of each]
   * @param residuals observed less predicted, one for each observation [unit of each]
   * @param covariance covariance of the parameters that follows from the stated standard deviations
   *     of the observations, parameters x parameters [product of their units]; zero in the row and
   *     column of a parameter that its bound holds
   * @param rms root mean square of the residuals in multiples of their standard deviations (in a
   *     robust fit, of the deviations as widened for the observations trusted less) [1]
   * @param iterations how many steps the fit took
   * @param distrusted places of observations that a robust fit set aside, ascending; empty from an
   *     ordinary fit
   * @param atBound names of parameters that their bound holds
   */
  record Fitted(
      double[] parameters,
      double[] residuals,
      double[][] covariance,
      double rms,
      int iterations,
      List<Integer> distrusted,
      List<String> atBound)
      implements FitOutcome {
    /** Copies the arrays. */
    public Fitted {
      parameters = parameters.clone();
      residuals = residuals.clone();
      covariance = copy(covariance);
      distrusted = List.copyOf(distrusted);
      atBound = List.copyOf(atBound);
    }

    /**
     * Returns the fitted parameters.
     *
     * @return a copy, in the order given [unit of each]
     */
    @Override
    public double[] parameters() {
      return parameters.clone();
    }

    /**
     * Returns observed less predicted.
     *
     * @return a copy, one for each observation [unit of each]
     */
    @Override
    public double[] residuals() {
      return residuals.clone();
    }

    /**
     * Returns the covariance of the parameters from the stated deviations of the observations.
     *
     * @return a copy, parameters x parameters [product of their units]
     */
    @Override
    public double[][] covariance() {
      return copy(covariance);
    }

    /**
     * Returns the standard deviation of a parameter from the stated deviations of the observations.
     *
     * @param index place of the parameter
     * @return its standard deviation [unit of the parameter]
     */
    public double standardDeviation(int index) {
      return Math.sqrt(covariance[index][index]);
    }

    /**
     * Returns how much larger the scatter is than the stated deviations: the weighted sum of
     * squares over the degrees of freedom. The covariance times this is the covariance judged by
     * the scatter itself.
     *
     * @return the reduced chi-square [1]; empty when as many parameters were free as observed
     */
    public OptionalDouble reducedChiSquare() {
      int freedom = residuals.length - (parameters.length - atBound.size());
      return freedom > 0
          ? OptionalDouble.of(rms * rms * residuals.length / freedom)
          : OptionalDouble.empty();
    }

    private static double[][] copy(double[][] matrix) {
      double[][] copy = new double[matrix.length][];
      for (int i = 0; i < matrix.length; i++) {
        copy[i] = matrix[i].clone();
      }
      return copy;
    }
  }

  /**
   * The fit did not come to an end that can be used.
   *
   * @param reason why, in words
   * @param lastParameters the last parameters tried, in the order given [unit of each]
   */
  record NotFitted(String reason, double[] lastParameters) implements FitOutcome {
    /** Copies the array. */
    public NotFitted {
      lastParameters = lastParameters.clone();
    }

    /**
     * Returns the last parameters tried.
     *
     * @return a copy, in the order given [unit of each]
     */
    @Override
    public double[] lastParameters() {
      return lastParameters.clone();
    }
  }
}
