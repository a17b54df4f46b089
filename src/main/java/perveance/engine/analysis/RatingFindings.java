package perveance.engine.analysis;

import java.util.ArrayList;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import java.util.OptionalDouble;
import perveance.engine.base.Finding;
import perveance.engine.base.RatingMessage;
import perveance.engine.base.Remedy;
import perveance.engine.base.Severity;
import perveance.engine.device.Ratings;
import perveance.engine.stage.StageCircuit.StageDevice;

/** Findings about the maker's limits, under the ratings that the device file names first. */
final class RatingFindings {
  /** From this share of a limit on a caution is given, common practice [1]. */
  static final double NEAR = 0.9;

  /** A leak of just the limit stays within it, whatever the cathode resistor adds [1]. */
  private static final double ROUNDING = 0.01;

  private record Codes(RatingMessage over, Optional<RatingMessage> near) {
    Codes(RatingMessage over, RatingMessage near) {
      this(over, Optional.of(near));
    }
  }

  private static final Codes HEATER =
      new Codes(RatingMessage.HEATER_CATHODE_OVER, RatingMessage.HEATER_CATHODE_NEAR);
  private static final Codes LEAK = new Codes(RatingMessage.GRID_LEAK_OVER, Optional.empty());
  private static final Map<String, Codes> CODES =
      Map.of(
          "anode voltage",
          new Codes(RatingMessage.ANODE_VOLTAGE_OVER, RatingMessage.ANODE_VOLTAGE_NEAR),
          "cold anode voltage",
          new Codes(RatingMessage.COLD_START_ANODE_OVER, Optional.empty()),
          "anode dissipation",
          new Codes(RatingMessage.ANODE_DISSIPATION_OVER, RatingMessage.ANODE_DISSIPATION_NEAR),
          "both anodes' dissipation",
          new Codes(RatingMessage.BOTH_ANODES_OVER, Optional.empty()),
          "screen voltage",
          new Codes(RatingMessage.SCREEN_VOLTAGE_OVER, RatingMessage.SCREEN_VOLTAGE_NEAR),
          "screen dissipation",
          new Codes(RatingMessage.SCREEN_DISSIPATION_OVER, RatingMessage.SCREEN_DISSIPATION_NEAR),
          "cathode current",
          new Codes(RatingMessage.CATHODE_CURRENT_OVER, RatingMessage.CATHODE_CURRENT_NEAR));

  private final FindingContext context;
  private final List<Finding> findings = new ArrayList<>();

  private RatingFindings(FindingContext context) {
    this.context = context;
  }

  static List<Finding> of(FindingContext context) {
    RatingFindings all = new RatingFindings(context);
    for (StageDevice device : context.answer().circuit().devices()) {
      device.device().defaultRatings().ifPresent(r -> all.add(device, r));
    }
    return all.findings;
  }

  private void add(StageDevice device, Ratings ratings) {
    missing(device, "anode voltage", ratings.anodeVoltage());
    missing(device, "anode dissipation", ratings.anodeDissipation());
    for (LimitUse use : context.answer().limits()) {
      if (use.ref().equals(device.ref()) && under(use, ratings)) {
        judge(use);
      }
    }
  }

  /** Whether a use is counted under the given ratings. */
  static boolean under(LimitUse use, Ratings ratings) {
    return use.system() == ratings.system() && use.source().equals(LimitShares.source(ratings));
  }

  private void missing(StageDevice device, String what, OptionalDouble limit) {
    if (limit.isEmpty()) {
      findings.add(
          Finding.of(RatingMessage.NO_RATING, Severity.NOTE, context.ref(), device.ref(), what)
              .onPart(device.ref()));
    }
  }

  private static Codes codes(LimitUse use) {
    if (use.what().startsWith("grid leak")) {
      return LEAK;
    }
    return use.what().startsWith("heater-cathode") ? HEATER : CODES.getOrDefault(use.what(), LEAK);
  }

  private void judge(LimitUse use) {
    Codes codes = codes(use);
    if (use.share() > (codes.equals(LEAK) ? 1 + ROUNDING : 1)) {
      Finding over =
          Finding.of(
                  codes.over(),
                  Severity.OVER_LIMIT,
                  context.ref(),
                  overParts(use, codes.over().partCount()))
              .withValue(use.value(), use.limit(), use.unit())
              .onPart(use.ref());
      Optional<Remedy> remedy = RatingRemedies.of(context, use);
      findings.add(remedy.map(over::withRemedy).orElse(over));
    } else if (use.share() > NEAR) {
      codes.near().ifPresent(code -> findings.add(near(use, code)));
    }
  }

  private static String[] overParts(LimitUse use, int count) {
    List<String> parts =
        List.of(
            place(use),
            Words.of(use.value(), use.unit()),
            Words.of(use.limit(), use.unit()),
            use.system().word());
    return parts.subList(0, count).toArray(new String[0]);
  }

  private Finding near(LimitUse use, RatingMessage code) {
    return Finding.of(
            code,
            Severity.CAUTION,
            context.ref(),
            place(use),
            Words.of(use.value(), use.unit()),
            Words.percent(use.share()),
            Words.of(use.limit(), use.unit()))
        .withValue(use.value(), use.limit(), use.unit())
        .onPart(use.ref());
  }

  private static String place(LimitUse use) {
    return use.when().equals(LimitShares.IDLE) ? use.ref() : use.ref() + " at " + use.when();
  }
}
