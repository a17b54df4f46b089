package perveance.engine.search;

import java.util.function.ToDoubleFunction;
import perveance.engine.analysis.StageAnswer;
import perveance.engine.stage.KeySpec;

/**
 * What is wanted of a stage and which value may move for it.
 *
 * @param ref stage
 * @param key the key that may move, a quantity
 * @param figure reads the figure off an answer, in its SI unit [1]
 * @param wanted the figure wanted, in the same unit [1]
 * @param accuracy how near is near enough, in the same unit, above zero [1]
 */
public record KeyGoal(
    String ref, KeySpec key, ToDoubleFunction<StageAnswer> figure, double wanted, double accuracy) {
  /** Refuses a goal that nothing can meet. */
  public KeyGoal {
    if (!Double.isFinite(wanted)) {
      throw new IllegalArgumentException("wanted is not finite: " + wanted);
    }
    if (!(accuracy > 0)) {
      throw new IllegalArgumentException("accuracy is not above 0: " + accuracy);
    }
    if (key.form() != KeySpec.Form.QUANTITY) {
      throw new IllegalArgumentException("key is no quantity: " + key.key());
    }
  }
}
