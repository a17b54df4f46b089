package perveance.engine.analysis;

import java.util.ArrayList;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import perveance.engine.analysis.ChassisAnswer.Failure;
import perveance.engine.base.DataMessage;
import perveance.engine.base.Finding;
import perveance.engine.base.HazardMessage;
import perveance.engine.base.PreferredSeries;
import perveance.engine.base.QuantityFormat;
import perveance.engine.base.Remedy;
import perveance.engine.base.Severity;
import perveance.engine.base.SupplyMessage;
import perveance.engine.base.Unit;
import perveance.engine.circuit.DcSolution;
import perveance.engine.stage.Conditions;
import perveance.engine.stage.StageCircuit.StageDevice;
import perveance.engine.stage.Supply;

/** Findings about the chassis as a whole: what can hurt, mains, what could not be solved. */
final class ChassisFindings {
  /** A capacitor that takes longer than this is slow [s]. */
  private static final double SLOW = 30;

  /** A bleeder is sized for this time [s]. */
  private static final double BLEED = 20;

  /** Mains this far above nominal are told of; the makers allow heaters 5 % [1]. */
  private static final double HIGH_MAINS = 1.05;

  /** A supply node that rises by more than this when a valve is pulled is told of [1]. */
  private static final double RISE = 1.1;

  private final ChassisModel model;
  private final Conditions conditions;
  private final List<Finding> findings = new ArrayList<>();

  ChassisFindings(ChassisModel model) {
    this.model = model;
    this.conditions = model.chassis().conditions();
  }

  List<Finding> all(List<Discharge> discharges) {
    for (Failure failure : model.failures()) {
      findings.add(
          Finding.of(
              DataMessage.NOT_SOLVED,
              Severity.CAUTION,
              failure.ref(),
              failure.ref(),
              failure.reason()));
    }
    discharges.forEach(this::discharge);
    mains();
    model.dc().ifPresent(this::pulled);
    return findings;
  }

  private void discharge(Discharge d) {
    Finding finding;
    if (!(d.seconds() < Double.MAX_VALUE)) {
      finding =
          Finding.of(
                  HazardMessage.NO_DISCHARGE_PATH,
                  Severity.CAUTION,
                  d.where(),
                  Words.place(d.where()),
                  Words.of(d.voltage(), Unit.VOLT))
              .withValue(d.voltage(), d.threshold(), Unit.VOLT);
    } else if (d.seconds() > SLOW) {
      finding =
          Finding.of(
                  HazardMessage.SLOW_DISCHARGE,
                  Severity.CAUTION,
                  d.where(),
                  Words.place(d.where()),
                  Words.time(d.seconds()),
                  Words.of(d.threshold(), Unit.VOLT))
              .withValue(d.seconds(), SLOW, Unit.SECOND);
    } else {
      finding =
          Finding.of(
                  HazardMessage.STORED_CHARGE,
                  Severity.NOTE,
                  d.where(),
                  Words.place(d.where()),
                  Words.of(d.voltage(), Unit.VOLT),
                  Words.roughly(d.energy(), Unit.JOULE))
              .withValue(d.voltage(), d.threshold(), Unit.VOLT);
    }
    Finding on = finding.onPart(d.where());
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

  private void mains() {
    double ratio = conditions.mainsRatio();
    if (ratio > HIGH_MAINS) {
      findings.add(
          Finding.of(
                  SupplyMessage.MAINS_HIGH,
                  Severity.CAUTION,
                  "mains",
                  Words.of(conditions.mainsActual(), Unit.VOLT),
                  Words.of(conditions.mains(), Unit.VOLT),
                  Words.percent(ratio - 1))
              .withValue(conditions.mainsActual(), conditions.mains(), Unit.VOLT));
    }
  }

  /** The supply node that rises most with one valve out of its socket. */
  private void pulled(DcSolution dc) {
    FaultCircuits faults = new FaultCircuits(model.whole().circuit());
    String valve = "";
    String node = "";
    double most = RISE;
    double reached = 0;
    for (StageModel stage : model.models()) {
      for (StageDevice device : stage.stage().devices()) {
        Optional<DcSolution> without = faults.pulled(device.ref());
        for (int rail : model.rails()) {
          double before = dc.voltage(rail);
          double after = without.map(w -> w.voltage(rail)).orElse(before);
          if (before > 0 && after / before > most) {
            most = after / before;
            reached = after;
            valve = device.ref();
            node = model.whole().circuit().nodes().get(rail);
          }
        }
      }
    }
    if (!node.isEmpty()) {
      findings.add(
          Finding.of(
                  HazardMessage.VALVE_PULLED,
                  Severity.NOTE,
                  node,
                  valve,
                  Words.place(node),
                  Words.of(reached, Unit.VOLT))
              .withValue(reached, Unit.VOLT));
    }
  }
}
