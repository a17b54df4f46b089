package perveance.engine.analysis;

import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import java.util.OptionalDouble;
import perveance.engine.analysis.CleanSwing.Limit;
import perveance.engine.base.Finding;
import perveance.engine.base.Remedy;
import perveance.engine.base.Severity;
import perveance.engine.base.SignalMessage;
import perveance.engine.base.Unit;
import perveance.engine.stage.StageCircuit.Part;

/** Findings about overload: which side ends first, headroom against the drive, distortion. */
final class SwingFindings {
  /** Less headroom than this over the stated drive is little, common practice [dB]. */
  private static final double LITTLE = 3;

  /** Distortion at the stated drive that is told of in a stage without a transformer [1]. */
  private static final double MUCH = 0.05;

  /** Distortion that output stages are usually driven to [1]. */
  private static final double MUCH_FOR_POWER = 0.10;

  /** More clean output than this is worth a change of a part [1]. */
  private static final double WORTHWHILE = 1.05;

  /** Sides within this of each other end together [1]. */
  private static final double ALIKE = 1.02;

  private SwingFindings() {}

  static List<Finding> of(FindingContext context) {
    List<Finding> findings = new ArrayList<>();
    first(context).ifPresent(findings::add);
    headroom(context).ifPresent(findings::add);
    distortion(context).ifPresent(findings::add);
    return findings;
  }

  private static Optional<Finding> first(FindingContext context) {
    CleanSwing clean = context.answer().clean();
    if (clean.limitedBy() == Limit.NONE || !(clean.inputPeak() > 0)) {
      return Optional.empty();
    }
    String name = place(context, clean);
    String at = Words.of(clean.inputPeak(), Unit.VOLT);
    SignalMessage code =
        switch (clean.limitedBy()) {
          case GRID_CURRENT -> SignalMessage.GRID_CURRENT_FIRST;
          case CUT_OFF -> SignalMessage.CUT_OFF_FIRST;
          case SUPPLY -> SignalMessage.SUPPLY_FIRST;
          case BOTTOMING -> SignalMessage.BOTTOMING_FIRST;
          default -> SignalMessage.KNEE_FIRST;
        };
    String[] parts =
        code.partCount() > 2 ? new String[] {name, at, otherSide(clean)} : new String[] {name, at};
    Finding told =
        Finding.of(code, Severity.NOTE, context.ref(), parts)
            .withValue(clean.inputPeak(), Unit.VOLT);
    return Optional.of(
        own(context, clean) ? moreOutput(context).map(told::withRemedy).orElse(told) : told);
  }

  private static String otherSide(CleanSwing clean) {
    double least = Math.min(clean.positivePeak(), clean.negativePeak());
    double most = Math.max(clean.positivePeak(), clean.negativePeak());
    return most <= ALIKE * least
        ? "the other side ends there as well"
        : "the other side ends at " + Words.of(most, Unit.VOLT);
  }

  private static boolean own(FindingContext context, CleanSwing clean) {
    return context.answer().points().stream().anyMatch(p -> p.ref().equals(clean.limitedAt()));
  }

  /** The stage, and the one wired to it when that one's valve is what ends the swing. */
  private static String place(FindingContext context, CleanSwing clean) {
    return own(context, clean)
        ? context.ref()
        : context.ref() + ", wired straight to " + clean.limitedAt() + ",";
  }

  /** The bias that gives the most clean output, where it gives more than now. */
  static Optional<Remedy> moreOutput(FindingContext context) {
    Remedies remedies = context.remedies();
    double now = context.answer().clean().outputPeak();
    for (Part part : BiasFindings.biasParts(context)) {
      Optional<Remedies.Trial> best =
          remedies.best(part, now, v -> v.clean().outputPeak(), WORTHWHILE);
      if (best.isPresent()) {
        return best.map(remedies::remedy);
      }
    }
    return Optional.empty();
  }

  private static Optional<Finding> headroom(FindingContext context) {
    CleanSwing clean = context.answer().clean();
    OptionalDouble drive = context.values().find("drive");
    boolean forPower = context.answer().driven().flatMap(d -> box(d.power())).isPresent();
    if (drive.isEmpty() || clean.headroom().isEmpty()) {
      return Optional.empty();
    }
    double room = clean.headroom().getAsDouble();
    if (room < (forPower ? -1 : 0)) {
      Finding finding =
          Finding.of(
                  SignalMessage.NO_HEADROOM,
                  Severity.CAUTION,
                  context.ref(),
                  context.ref(),
                  Words.of(drive.getAsDouble(), Unit.VOLT),
                  Words.of(clean.inputPeak(), Unit.VOLT))
              .withValue(drive.getAsDouble(), clean.inputPeak(), Unit.VOLT);
      return Optional.of(enough(context).map(finding::withRemedy).orElse(finding));
    } else if (room < LITTLE && !forPower) {
      return Optional.of(
          Finding.of(
                  SignalMessage.LITTLE_HEADROOM,
                  Severity.NOTE,
                  context.ref(),
                  context.ref(),
                  Words.level(room))
              .withValue(room, LITTLE, Unit.DECIBEL));
    }
    return Optional.empty();
  }

  private static Optional<Double> box(OptionalDouble value) {
    return value.isPresent() ? Optional.of(value.getAsDouble()) : Optional.empty();
  }

  /** The smallest change of the bias that takes the drive cleanly. */
  private static Optional<Remedy> enough(FindingContext context) {
    return context
        .remedies()
        .smallest(
            BiasFindings.biasParts(context),
            v ->
                v.clean().headroom().orElse(-1) >= 0
                    && v.clean().outputPeak()
                        > BiasFindings.KEPT * context.answer().clean().outputPeak());
  }

  private static Optional<Finding> distortion(FindingContext context) {
    return context
        .answer()
        .driven()
        .filter(d -> d.distortion() > (d.power().isPresent() ? MUCH_FOR_POWER : MUCH))
        .map(
            d ->
                Finding.of(
                        SignalMessage.HIGH_DISTORTION,
                        Severity.NOTE,
                        context.ref(),
                        context.ref(),
                        Words.percent(d.distortion()))
                    .withValue(d.distortion(), Unit.RATIO));
  }
}
