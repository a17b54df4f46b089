package perveance.engine.device.fit;

import java.util.ArrayList;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Locale;
import java.util.Map;
import perveance.engine.device.DeviceLaw;
import perveance.engine.device.Evidence;
import perveance.engine.device.FitSummary;
import perveance.engine.numeric.FitOutcome;
import perveance.engine.numeric.Statistics;

/** Puts into words and figures how good a fit is. */
final class FitReport {
  private FitReport() {}

  /**
   * The fit as a whole.
   *
   * @param law the law found
   * @param used the evidence that it was fitted to
   * @param observations its figures, in the order in which they were fitted
   * @param fitted the fit's outcome
   * @param fittedKeys the parameters that were fitted, as keys of the law
   * @param assumptions what had to be assumed
   */
  static LawFit of(
      DeviceLaw law,
      List<Evidence> used,
      List<Observation> observations,
      FitOutcome.Fitted fitted,
      List<String> fittedKeys,
      List<String> assumptions) {
    List<Evidence> distrusted =
        fitted.distrusted().stream()
            // behind the observations stand the usual values that guide a fit
            .filter(place -> place < observations.size())
            .map(place -> observations.get(place).evidence())
            .distinct()
            .toList();
    List<Residual> residuals = new LawReadings(law).compare(used);
    List<Residual> trusted =
        residuals.stream().filter(r -> !distrusted.contains(r.evidence())).toList();
    return new LawFit(
        law,
        summary(observations, trusted, fitted, assumptions),
        EvidenceRange.of(used),
        residuals,
        fittedKeys,
        fitted.covariance(),
        distrusted);
  }

  static FitSummary summary(
      List<Observation> observations,
      List<Residual> residuals,
      FitOutcome.Fitted fitted,
      List<String> assumptions) {
    double[] errors =
        residuals.stream().mapToDouble(residual -> Math.abs(residual.relativeError())).toArray();
    double worst = 0;
    for (double error : errors) {
      worst = Math.max(worst, error);
    }
    // where the scatter is larger than the stated deviations, it speaks for the uncertainty
    double scatter = Math.sqrt(Math.max(1, fitted.reducedChiSquare().orElse(1)));
    List<Double> standardErrors = new ArrayList<>();
    for (int i = 0; i < fitted.parameters().length; i++) {
      standardErrors.add(scatter * fitted.standardDeviation(i));
    }
    return new FitSummary(
        method(observations), Statistics.median(errors), worst, standardErrors, assumptions);
  }

  private static String method(List<Observation> observations) {
    Map<Figure, Integer> counts = new LinkedHashMap<>();
    int curves = 0;
    for (Observation observation : observations) {
      if (observation.evidence().kind().equals("curve")) {
        curves++;
      } else {
        counts.merge(observation.figure(), 1, Integer::sum);
      }
    }
    List<String> parts = new ArrayList<>();
    counts.forEach((figure, count) -> parts.add(count + " " + figure.word()));
    if (curves > 0) {
      parts.add(curves + " chart readings");
    }
    return "weighted least squares on " + String.join(", ", parts);
  }

  static String text(String format, Object... values) {
    return String.format(Locale.ROOT, format, values);
  }
}
