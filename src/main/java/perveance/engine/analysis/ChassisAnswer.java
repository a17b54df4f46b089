package perveance.engine.analysis;

import java.util.List;
import perveance.engine.base.Finding;
import perveance.engine.stage.Chassis;

/**
 * The answer for a whole chassis.
 *
 * @param chassis what was asked
 * @param supplies supply nodes
 * @param stages stages in signal order; a stage that could not be solved is missing here and has a
 *     failure
 * @param failures stages that could not be solved and why
 * @param discharges stored charge, largest energy first
 * @param highestVoltage highest voltage to chassis anywhere, cold start included [V]
 * @param chains stages in a row, with their levels and which of them overloads first
 * @param findings of the whole chassis, worst first, those of its stages included
 */
public record ChassisAnswer(
    Chassis chassis,
    List<SupplyAnswer> supplies,
    List<StageAnswer> stages,
    List<Failure> failures,
    List<Discharge> discharges,
    double highestVoltage,
    List<SignalChain> chains,
    List<Finding> findings) {
  /** Copies the lists. */
  public ChassisAnswer {
    supplies = List.copyOf(supplies);
    stages = List.copyOf(stages);
    failures = List.copyOf(failures);
    discharges = List.copyOf(discharges);
    chains = List.copyOf(chains);
    findings = List.copyOf(findings);
  }

  /**
   * A stage without an answer.
   *
   * @param ref reference
   * @param reason why, in a sentence
   */
  public record Failure(String ref, String reason) {}
}
