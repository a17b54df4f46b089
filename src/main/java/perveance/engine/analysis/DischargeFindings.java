package perveance.engine.analysis;

import java.util.ArrayList;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import perveance.engine.base.Finding;
import perveance.engine.base.HazardMessage;
import perveance.engine.base.PreferredSeries;
import perveance.engine.base.QuantityFormat;
import perveance.engine.base.Remedy;
import perveance.engine.base.Severity;
import perveance.engine.base.Unit;
import perveance.engine.stage.Supply;

/** Findings about charge that stays after switch-off, with a bleeder where one helps. */
final class DischargeFindings {
  /** A capacitor that takes longer than this is slow [s]. */
  private static final double SLOW = 30;

  /** A bleeder is sized for this time [s]. */
  private static final double BLEED = 20;

  private final ChassisModel model;
  private final List<Finding> findings = new ArrayList<>();

  private DischargeFindings(ChassisModel model) {
    this.model = model;
  }

  static List<Finding> of(ChassisModel model, List<Discharge> discharges) {
    DischargeFindings all = new DischargeFindings(model);
    discharges.forEach(all::discharge);
    return all.findings;
  }

  private void discharge(Discharge d) {
    Finding finding;
    if (!(d.seconds() < Double.MAX_VALUE)) {
      finding =
          Finding.of(
                  HazardMessage.NO_DISCHARGE_PATH,
                  Severity.CAUTION,
                  where(d),
                  Words.start(d.where()),
                  Words.of(d.voltage(), Unit.VOLT))
              .withValue(d.voltage(), d.threshold(), Unit.VOLT);
    } else if (d.seconds() > SLOW) {
      finding =
          Finding.of(
                  HazardMessage.SLOW_DISCHARGE,
                  Severity.CAUTION,
                  where(d),
                  Words.start(d.where()),
                  Words.time(d.seconds()),
                  Words.of(d.threshold(), Unit.VOLT))
              .withValue(d.seconds(), SLOW, Unit.SECOND);
    } else {
      finding =
          Finding.of(
                  HazardMessage.STORED_CHARGE,
                  Severity.NOTE,
                  where(d),
                  Words.start(d.where()),
                  Words.of(d.voltage(), Unit.VOLT),
                  Words.roughly(d.energy(), Unit.JOULE))
              .withValue(d.voltage(), d.threshold(), Unit.VOLT);
    }
    Finding on = finding.onPart(d.element());
    findings.add(d.seconds() > SLOW ? bleeder(d).map(on::withRemedy).orElse(on) : on);
  }

  /** A bleeder across the reservoir that brings it below the threshold in time. */
  private Optional<Remedy> bleeder(Discharge d) {
    Optional<Supply> supply =
        model.chassis().supplies().stream()
            .filter(s -> d.where().equals("supply " + s.name()))
            .findFirst();
    if (supply.isEmpty()) {
      return Optional.empty();
    }
    double ratio = Math.log(d.voltage() / d.threshold());
    double resistance = PreferredSeries.E12.below(BLEED / (d.capacitance() * ratio));
    double power = d.voltage() * d.voltage() / resistance;
    String text = QuantityFormat.PLAIN.part(resistance, Unit.OHM);
    return Optional.of(
        new Remedy(
            "A bleeder of "
                + Words.part(resistance, Unit.OHM)
                + " across it brings it below "
                + Words.of(d.threshold(), Unit.VOLT)
                + " in "
                + Words.time(resistance * d.capacitance() * ratio)
                + "; it takes "
                + Words.roughly(power, Unit.WATT)
                + ". Then measure: bleeders fail open.",
            Map.of("bleeder", text)));
  }

  /** The supply node, or the stage that a coupling or bypass capacitor belongs to. */
  private static String where(Discharge d) {
    String first = d.element().substring(0, d.element().indexOf('.'));
    return first.equals("supply") ? d.where() : first;
  }
}
