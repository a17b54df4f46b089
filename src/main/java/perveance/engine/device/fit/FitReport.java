package perveance.engine.device.fit;

import java.util.ArrayList;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Locale;
import java.util.Map;
import perveance.engine.device.FitSummary;
import perveance.engine.numeric.FitOutcome;
import perveance.engine.numeric.Statistics;

/** Puts into words and figures how good a fit is. */
final class FitReport {
  private FitReport() {}

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
