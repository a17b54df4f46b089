package perveance.engine.analysis;

import java.util.Optional;
import perveance.engine.stage.Chassis;
import perveance.engine.stage.Setting;
import perveance.engine.stage.StageEntry;

/**
 * The capacitor through which a stage is driven: its own, or the coupling of the stage before.
 *
 * @param owner reference of the stage that states it
 * @param key key that states it
 * @param capacitance [F]
 */
public record InputCapacitor(String owner, String key, double capacitance) {
  /** The capacitor before a stage; empty where none is stated. */
  static Optional<InputCapacitor> of(Chassis chassis, String ref) {
    Optional<InputCapacitor> own =
        chassis.stage(ref).flatMap(s -> InputCapacitor.stated(s, "input_coupling"));
    return own.or(
        () ->
            chassis.stages().stream()
                .filter(s -> drives(s, ref))
                .findFirst()
                .flatMap(s -> InputCapacitor.stated(s, "coupling")));
  }

  private static boolean drives(StageEntry stage, String ref) {
    Setting drives = stage.settings().get("drives");
    return drives != null && drives.text().equals(ref);
  }

  private static Optional<InputCapacitor> stated(StageEntry stage, String key) {
    return stage.settings().get(key) instanceof Setting.Number n
        ? Optional.of(new InputCapacitor(stage.ref(), key, n.value()))
        : Optional.empty();
  }
}
