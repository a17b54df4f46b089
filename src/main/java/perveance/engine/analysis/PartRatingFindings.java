package perveance.engine.analysis;

import java.util.ArrayList;
import java.util.List;
import java.util.OptionalDouble;
import perveance.engine.base.Finding;
import perveance.engine.base.PartMessage;
import perveance.engine.base.QuantityFormat;
import perveance.engine.base.Remedy;
import perveance.engine.base.Severity;
import perveance.engine.base.Unit;
import perveance.engine.stage.PartRatings;
import perveance.engine.stage.StageCircuit.PartType;

/** Findings about parts whose rating the stage states: what they bear against what they may. */
final class PartRatingFindings {
  /** Share of the rated power beyond which a resistor runs hot, common practice 50 to 60 % [1]. */
  static final double HOT = 0.6;

  private final FindingContext context;
  private final PartDuty duty;
  private final List<Finding> findings = new ArrayList<>();

  private PartRatingFindings(FindingContext context, PartDuty duty) {
    this.context = context;
    this.duty = duty;
  }

  static List<Finding> of(FindingContext context, PartDuty duty) {
    PartRatingFindings all = new PartRatingFindings(context, duty);
    duty.rated().power().ifPresent(all::power);
    duty.rated().voltage().ifPresent(all::voltage);
    return all.findings;
  }

  private void power(double rated) {
    double working = duty.workingPower();
    if (working > rated) {
      add(PartMessage.RESISTOR_POWER_OVER, Severity.OVER_LIMIT, working, rated);
    } else if (duty.worstPower() > rated && RatingToBuy.bears(duty.worstPower())) {
      Finding finding =
          Finding.of(
                  PartMessage.RESISTOR_FAULT_OVER,
                  Severity.CAUTION,
                  context.ref(),
                  context.named(duty.part()),
                  Words.roughly(duty.worstPower(), Unit.WATT),
                  duty.worstCase(),
                  Words.part(rated, Unit.WATT))
              .withValue(duty.worstPower(), rated, Unit.WATT);
      add(finding, Unit.WATT);
    } else if (working > HOT * rated) {
      Finding finding =
          Finding.of(
                  PartMessage.RESISTOR_POWER_NEAR,
                  Severity.CAUTION,
                  context.ref(),
                  context.named(duty.part()),
                  Words.roughly(working, Unit.WATT),
                  Words.percent(working / rated),
                  Words.part(rated, Unit.WATT))
              .withValue(working, rated, Unit.WATT);
      add(finding, Unit.WATT);
    }
  }

  private void voltage(double rated) {
    double highest = highest();
    if (highest > rated) {
      boolean resistor = duty.part().type() == PartType.RESISTOR;
      add(
          resistor ? PartMessage.RESISTOR_VOLTAGE_OVER : PartMessage.CAPACITOR_VOLTAGE_OVER,
          Severity.OVER_LIMIT,
          highest,
          rated);
    }
  }

  private double highest() {
    return Math.max(duty.worstVoltage(), Math.max(duty.idleVoltage(), duty.coldVoltage()));
  }

  private void add(PartMessage code, Severity severity, double value, double rated) {
    Unit unit = code == PartMessage.RESISTOR_POWER_OVER ? Unit.WATT : Unit.VOLT;
    add(
        Finding.of(
                code,
                severity,
                context.ref(),
                context.named(duty.part()),
                Words.of(value, unit),
                Words.part(rated, unit))
            .withValue(value, rated, unit),
        unit);
  }

  /** The rating that would do, as one press: the part is then bought for it. */
  private void add(Finding finding, Unit unit) {
    OptionalDouble rating = unit == Unit.WATT ? power() : voltage();
    Finding on = finding.onPart(duty.part().element());
    if (rating.isEmpty()) {
      findings.add(on);
      return;
    }
    String key = duty.part().key();
    findings.add(
        on.withRemedy(
            Remedy.set(
                "Fit one of " + Words.part(rating.getAsDouble(), unit) + " or more.",
                unit == Unit.WATT ? PartRatings.powerKey(key) : PartRatings.voltageKey(key),
                QuantityFormat.PLAIN.part(rating.getAsDouble(), unit))));
  }

  private OptionalDouble power() {
    return RatingToBuy.power(duty.workingPower(), duty.worstPower());
  }

  private OptionalDouble voltage() {
    return switch (duty.part().type()) {
      case CAPACITOR -> RatingToBuy.filmVoltage(highest());
      case ELECTROLYTIC -> RatingToBuy.electrolyticVoltage(highest());
      default -> RatingToBuy.resistorVoltage(highest());
    };
  }
}
