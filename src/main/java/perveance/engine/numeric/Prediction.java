package perveance.engine.numeric;

/** What a law with given parameters predicts for every observation. */
@FunctionalInterface
public interface Prediction {
  /**
   * Fills in the predictions.
   *
   * @param parameters the parameters, in the order of the fit; not to be changed [unit of each]
   * @param predicted one entry for each observation, to be filled [unit of each]
   */
  void predict(double[] parameters, double[] predicted);
}
