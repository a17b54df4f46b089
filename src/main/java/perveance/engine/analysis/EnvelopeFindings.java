package perveance.engine.analysis;

import java.util.ArrayList;
import java.util.List;
import java.util.OptionalDouble;
import perveance.engine.analysis.Envelopes.Envelope;
import perveance.engine.base.Finding;
import perveance.engine.base.RatingMessage;
import perveance.engine.base.Severity;
import perveance.engine.base.Unit;
import perveance.engine.device.Ratings;

/**
 * Findings about an envelope whose sections work in different stages. Where both are in one stage,
 * the stage's own limits hold the sum already.
 */
final class EnvelopeFindings {
  private EnvelopeFindings() {}

  static List<Finding> of(ChassisModel model, List<StageAnswer> stages) {
    List<Finding> findings = new ArrayList<>();
    for (Envelope envelope : Envelopes.of(model)) {
      List<StageAnswer> in =
          stages.stream().filter(s -> s.points().stream().anyMatch(p -> has(envelope, p))).toList();
      if (in.size() > 1) {
        envelope
            .device()
            .defaultRatings()
            .ifPresent(ratings -> judge(envelope, in, ratings, findings));
      }
    }
    return findings;
  }

  private static boolean has(Envelope envelope, DevicePoint point) {
    return envelope.sections().contains(point.ref());
  }

  private static void judge(
      Envelope envelope, List<StageAnswer> stages, Ratings ratings, List<Finding> findings) {
    OptionalDouble limit = ratings.bothAnodesDissipation();
    double sum =
        stages.stream()
            .flatMap(s -> s.points().stream())
            .filter(p -> has(envelope, p))
            .mapToDouble(DevicePoint::anodeDissipation)
            .sum();
    if (limit.isPresent() && sum > limit.getAsDouble()) {
      findings.add(
          Finding.of(
                  RatingMessage.BOTH_ANODES_OVER,
                  Severity.OVER_LIMIT,
                  stages.get(0).ref(),
                  envelope.name(),
                  Words.of(sum, Unit.WATT),
                  Words.of(limit.getAsDouble(), Unit.WATT),
                  ratings.system().word())
              .withValue(sum, limit.getAsDouble(), Unit.WATT));
    }
  }
}
