package perveance.engine.analysis;

import java.util.Optional;
import perveance.engine.circuit.DcSolution;
import perveance.engine.stage.Conditions;
import perveance.engine.stage.StageCircuit.Part;
import perveance.engine.stage.StageValues;

/**
 * What the findings of one stage are made from.
 *
 * @param answer the stage's answer without findings
 * @param model the solved stage
 * @param values what the stage states
 * @param conditions what the chassis states
 * @param inputCapacitor capacitor through which the stage is driven, where one is stated
 * @param cold the whole chassis with cold valves
 * @param retry works the stage out again with changed keys
 */
record FindingContext(
    StageAnswer answer,
    StageModel model,
    StageValues values,
    Conditions conditions,
    Optional<InputCapacitor> inputCapacitor,
    Optional<DcSolution> cold,
    Retry retry) {
  Remedies remedies() {
    return new Remedies(answer, retry);
  }

  String ref() {
    return answer.ref();
  }

  /** A part as the sheet names it. */
  String named(Part part) {
    return remedies().designator(part);
  }
}
