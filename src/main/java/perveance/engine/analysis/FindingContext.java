package perveance.engine.analysis;

import perveance.engine.base.QuantityFormat;
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
 * @param retry works the stage out again with changed keys
 */
record FindingContext(
    StageAnswer answer, StageModel model, StageValues values, Conditions conditions, Retry retry) {
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

  /** A part's value as text that a chassis file takes. */
  static String text(Part part, double value) {
    return QuantityFormat.PLAIN.part(value, Remedies.unit(part));
  }
}
