package perveance.engine.analysis;

import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import perveance.engine.base.Finding;
import perveance.engine.base.PartMessage;
import perveance.engine.base.PreferredSeries;
import perveance.engine.base.Remedy;
import perveance.engine.base.Severity;
import perveance.engine.base.Unit;
import perveance.engine.stage.StageCircuit.Part;
import perveance.engine.stage.StageCircuit.PartType;

/** Findings about parts: what they see at cold start, values that cannot be bought. */
final class PartFindings {
  private PartFindings() {}

  static List<Finding> of(FindingContext context) {
    List<Finding> findings = new ArrayList<>();
    for (PartDuty duty : context.answer().parts()) {
      coldStart(context, duty).ifPresent(findings::add);
      notPreferred(context, duty).ifPresent(findings::add);
      findings.addAll(PartRatingFindings.of(context, duty));
    }
    return findings;
  }

  /** A capacitor that sees more before the valves warm than it does afterwards. */
  private static Optional<Finding> coldStart(FindingContext context, PartDuty duty) {
    PartType type = duty.part().type();
    boolean capacitor = type == PartType.CAPACITOR || type == PartType.ELECTROLYTIC;
    double cold = duty.coldVoltage();
    if (!capacitor
        || cold <= context.conditions().threshold()
        || cold <= 1.05 * duty.idleVoltage()) {
      return Optional.empty();
    }
    Finding finding =
        Finding.of(
                PartMessage.CAPACITOR_COLD_START,
                Severity.NOTE,
                context.ref(),
                context.named(duty.part()),
                Words.of(cold, Unit.VOLT))
            .withValue(cold, Unit.VOLT)
            .onPart(duty.part().element());
    return Optional.of(
        duty.buy()
            .map(buy -> finding.withRemedy(Remedy.byHand("Buy it for " + buy + ".")))
            .orElse(finding));
  }

  /** A value that nobody sells; what the stage drives, a speaker say, is not chosen by series. */
  private static Optional<Finding> notPreferred(FindingContext context, PartDuty duty) {
    Part part = duty.part();
    PreferredSeries series =
        switch (part.type()) {
          case RESISTOR -> PreferredSeries.E96;
          case CAPACITOR, ELECTROLYTIC -> PreferredSeries.E24;
          default -> null;
        };
    if (series == null
        || PartRoles.isLoad(part)
        || series.contains(part.value())
        || PreferredSeries.E24.contains(part.value())
        || Math.abs(duty.nearest() / part.value() - 1) < 1e-3) {
      return Optional.empty();
    }
    Unit unit = Remedies.unit(part);
    Finding finding =
        Finding.of(
                PartMessage.NOT_PREFERRED,
                Severity.NOTE,
                context.ref(),
                context.named(part),
                Words.part(part.value(), unit),
                Words.part(duty.nearest(), unit))
            .withValue(part.value(), unit)
            .onPart(part.element());
    Remedies remedies = context.remedies();
    return Optional.of(
        remedies
            .trial(part, duty.nearest())
            .map(t -> finding.withRemedy(remedies.remedy(t)))
            .orElse(finding));
  }
}
