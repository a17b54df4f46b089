package perveance.engine.analysis;

import java.util.Optional;

/**
 * What a stage does outside the clean middle of its band.
 *
 * @param recovery after an overload, empty without a stated capacitor before the grid
 * @param reactive into a reactive load, empty where the stage states none
 */
public record LargeSignalAnswer(Optional<Recovery> recovery, Optional<ReactiveAnswer> reactive) {
  /** Nothing of either. */
  public static final LargeSignalAnswer NONE =
      new LargeSignalAnswer(Optional.empty(), Optional.empty());
}
