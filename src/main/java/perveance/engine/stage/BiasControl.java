package perveance.engine.stage;

import static perveance.engine.stage.StageKeys.BIAS_BOTTOM;
import static perveance.engine.stage.StageKeys.BIAS_HOLD;
import static perveance.engine.stage.StageKeys.BIAS_POT;
import static perveance.engine.stage.StageKeys.BIAS_SUPPLY;
import static perveance.engine.stage.StageKeys.BIAS_TOP;
import static perveance.engine.stage.StageKeys.GRID_BIAS;

import java.util.ArrayList;
import java.util.List;
import perveance.engine.stage.StageKind.Complaint;

/**
 * What a fixed bias is set with: a potentiometer between two resistors across the bias supply. The
 * stage's circuit has the bias as it is set; this says how far it can be set.
 */
final class BiasControl {
  /** Keys. */
  static final List<KeySpec> KEYS =
      List.of(BIAS_SUPPLY, BIAS_TOP, BIAS_POT, BIAS_BOTTOM, BIAS_HOLD);

  private BiasControl() {}

  static List<Complaint> check(StageValues values) {
    List<Complaint> complaints = new ArrayList<>();
    boolean any = KEYS.stream().anyMatch(key -> values.has(key.key()));
    if (!any) {
      return complaints;
    }
    for (KeySpec needed : List.of(GRID_BIAS, BIAS_SUPPLY, BIAS_POT)) {
      if (!values.has(needed.key())) {
        complaints.add(
            new Complaint(
                needed.key(), "a bias control without it", needed.meaning() + " with the others"));
      }
    }
    return complaints;
  }
}
