package perveance.engine.analysis;

import java.util.Map;
import java.util.Optional;

/** Works a stage out again with some of its keys changed, to see what a remedy would do. */
interface Retry {
  /**
   * The stage after an edit.
   *
   * @param ref the stage
   * @param edits keys and their new texts
   * @return the changed stage; empty when it cannot be built or has no solution
   */
  Optional<Variant> with(String ref, Map<String, String> edits);
}
