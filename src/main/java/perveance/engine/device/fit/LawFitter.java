package perveance.engine.device.fit;

import java.util.List;
import perveance.engine.device.Evidence;

/** Fits the law of one kind of device. */
public sealed interface LawFitter permits TriodeFitter, PentodeFitter, RectifierFitter {
  /**
   * Fits the law to the evidence that is meant for fitting.
   *
   * @param evidence all evidence; what does not count for the fit is left aside
   * @param conditions what else must be known
   * @return the law, or why there is none
   */
  FitResult fit(List<Evidence> evidence, FitConditions conditions);
}
