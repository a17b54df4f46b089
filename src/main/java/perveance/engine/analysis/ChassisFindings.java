package perveance.engine.analysis;

import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import perveance.engine.analysis.ChassisAnswer.Failure;
import perveance.engine.base.DataMessage;
import perveance.engine.base.Finding;
import perveance.engine.base.Severity;
import perveance.engine.base.SupplyMessage;
import perveance.engine.base.Unit;
import perveance.engine.circuit.DcSolution;
import perveance.engine.stage.Conditions;

/** Findings about the chassis as a whole: what was not solved, stored charge, mains, heaters. */
final class ChassisFindings {
  /** Mains this far above nominal are told of; the makers allow heaters 5 % [1]. */
  private static final double HIGH_MAINS = 1.05;

  private final ChassisModel model;
  private final Optional<DcSolution> cold;
  private final Conditions conditions;
  private final List<Finding> findings = new ArrayList<>();

  ChassisFindings(ChassisModel model, Optional<DcSolution> cold) {
    this.model = model;
    this.cold = cold;
    this.conditions = model.chassis().conditions();
  }

  List<Finding> all(List<Discharge> discharges, SupplyDrain drain) {
    for (Failure failure : model.failures()) {
      findings.add(
          Finding.of(
              DataMessage.NOT_SOLVED,
              Severity.CAUTION,
              failure.ref(),
              failure.ref(),
              failure.reason()));
    }
    findings.addAll(DischargeFindings.of(model, discharges));
    mains();
    findings.addAll(HeaterFindings.of(model));
    model.dc().ifPresent(idle -> supplies(idle, drain));
    return findings;
  }

  private void supplies(DcSolution idle, SupplyDrain drain) {
    findings.addAll(PulledFindings.of(model, idle));
    findings.addAll(SupplyPartFindings.of(model, idle, cold));
    findings.addAll(drain.findings(model, idle));
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
}
