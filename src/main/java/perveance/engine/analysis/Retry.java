package perveance.engine.analysis;

import java.util.Map;
import java.util.Optional;

/** Works a stage out again with some of its keys changed, to see what a remedy would do. */
interface Retry {
  /**
   * The stage's answer after an edit, without bands, levels and findings.
   *
   * @param ref the stage
   * @param edits keys and their new texts
   * @return the answer; empty when the edited stage has none
   */
  Optional<StageAnswer> with(String ref, Map<String, String> edits);
}
