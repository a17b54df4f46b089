package perveance.engine.stage;

import java.util.List;
import java.util.Optional;

/**
 * A chassis as described by its file: immutable; an edit is a new chassis.
 *
 * @param title what it is
 * @param conditions mains, meter, tolerances
 * @param supplies supply nodes in the order of the file
 * @param stages stages in signal order
 */
public record Chassis(
    String title, Conditions conditions, List<Supply> supplies, List<StageEntry> stages) {
  /** Copies the lists. */
  public Chassis {
    supplies = List.copyOf(supplies);
    stages = List.copyOf(stages);
  }

  /**
   * Finds a stage.
   *
   * @param ref reference on the drawing
   * @return the stage, or empty
   */
  public Optional<StageEntry> stage(String ref) {
    return stages.stream().filter(s -> s.ref().equals(ref)).findFirst();
  }

  /**
   * Finds a supply node.
   *
   * @param name name of the node
   * @return the supply, or empty
   */
  public Optional<Supply> supply(String name) {
    return supplies.stream().filter(s -> s.name().equals(name)).findFirst();
  }
}
