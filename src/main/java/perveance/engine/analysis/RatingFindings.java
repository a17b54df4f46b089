package perveance.engine.analysis;

import java.util.ArrayList;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import java.util.OptionalDouble;
import perveance.engine.base.Finding;
import perveance.engine.base.QuantityFormat;
import perveance.engine.base.RatingMessage;
import perveance.engine.base.Severity;
import perveance.engine.device.Ratings;
import perveance.engine.stage.StageCircuit.StageDevice;

/** Findings about the maker's limits, under the ratings that the device file names first. */
final class RatingFindings {
  /** From this share of a limit on a caution is given, common practice [1]. */
  static final double NEAR = 0.9;

  private record Codes(RatingMessage over, Optional<RatingMessage> near) {}

  private static final Map<String, Codes> CODES =
      Map.of(
          "anode voltage",
          new Codes(
              RatingMessage.ANODE_VOLTAGE_OVER, Optional.of(RatingMessage.ANODE_VOLTAGE_NEAR)),
          "cold anode voltage",
          new Codes(RatingMessage.COLD_START_ANODE_OVER, Optional.empty()),
          "anode dissipation",
          new Codes(
              RatingMessage.ANODE_DISSIPATION_OVER,
              Optional.of(RatingMessage.ANODE_DISSIPATION_NEAR)),
          "both anodes' dissipation",
          new Codes(
              RatingMessage.ANODE_DISSIPATION_OVER,
              Optional.of(RatingMessage.ANODE_DISSIPATION_NEAR)),
          "screen voltage",
          new Codes(
              RatingMessage.SCREEN_VOLTAGE_OVER, Optional.of(RatingMessage.SCREEN_VOLTAGE_NEAR)),
          "screen dissipation",
          new Codes(
              RatingMessage.SCREEN_DISSIPATION_OVER,
              Optional.of(RatingMessage.SCREEN_DISSIPATION_NEAR)),
          "cathode current",
          new Codes(
              RatingMessage.CATHODE_CURRENT_OVER, Optional.of(RatingMessage.CATHODE_CURRENT_NEAR)));

  private RatingFindings() {}

  static List<Finding> of(StageAnswer answer) {
    List<Finding> findings = new ArrayList<>();
    for (StageDevice device : answer.circuit().devices()) {
      Optional<Ratings> ratings = device.device().defaultRatings();
      ratings.ifPresent(r -> missing(device, r, findings));
      for (LimitUse use : answer.limits()) {
        if (use.ref().equals(device.ref()) && ratings.filter(r -> under(use, r)).isPresent()) {
          finding(use).ifPresent(findings::add);
        }
      }
    }
    return findings;
  }

  /** Whether a use is counted under the given ratings. */
  static boolean under(LimitUse use, Ratings ratings) {
    return use.system() == ratings.system() && use.source().equals(LimitShares.source(ratings));
  }

  private static void missing(StageDevice device, Ratings ratings, List<Finding> findings) {
    List<String> missing = new ArrayList<>();
    note(missing, "anode voltage", ratings.anodeVoltage());
    note(missing, "anode dissipation", ratings.anodeDissipation());
    for (String what : missing) {
      findings.add(
          Finding.of(RatingMessage.NO_RATING, Severity.NOTE, device.ref(), device.ref(), what));
    }
  }

  private static void note(List<String> missing, String what, OptionalDouble limit) {
    if (limit.isEmpty()) {
      missing.add(what);
    }
  }

  private static Optional<Finding> finding(LimitUse use) {
    if (use.what().startsWith("grid leak")) {
      return over(use, RatingMessage.GRID_LEAK_OVER);
    }
    Codes codes =
        use.what().startsWith("heater-cathode")
            ? new Codes(
                RatingMessage.HEATER_CATHODE_OVER, Optional.of(RatingMessage.HEATER_CATHODE_NEAR))
            : CODES.get(use.what());
    if (codes == null) {
      return Optional.empty();
    }
    return use.share() > 1
        ? over(use, codes.over())
        : codes.near().filter(code -> use.share() > NEAR).map(code -> near(use, code));
  }

  private static Optional<Finding> over(LimitUse use, RatingMessage code) {
    return use.share() > 1
        ? Optional.of(
            Finding.of(code, Severity.OVER_LIMIT, use.ref(), overParts(use, code.partCount()))
                .withValue(use.value(), use.limit(), use.unit()))
        : Optional.empty();
  }

  private static String[] overParts(LimitUse use, int count) {
    List<String> parts =
        List.of(
            use.ref() + when(use),
            text(use, use.value()),
            text(use, use.limit()),
            use.system().word());
    return parts.subList(0, count).toArray(new String[0]);
  }

  private static Finding near(LimitUse use, RatingMessage code) {
    return Finding.of(
            code,
            Severity.CAUTION,
            use.ref(),
            use.ref() + when(use),
            text(use, use.value()),
            QuantityFormat.TYPESET.percent(use.share(), 2),
            text(use, use.limit()))
        .withValue(use.value(), use.limit(), use.unit());
  }

  private static String when(LimitUse use) {
    return use.when().equals(LimitShares.IDLE) ? "" : " at " + use.when();
  }

  private static String text(LimitUse use, double value) {
    return QuantityFormat.TYPESET.reading(value, use.unit(), 3);
  }
}
