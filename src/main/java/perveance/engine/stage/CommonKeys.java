package perveance.engine.stage;

import java.util.List;

/** Keys that every kind of stage reads. */
final class CommonKeys {
  static final List<KeySpec> LIST =
      List.of(
          StageKeys.DRIVE,
          StageKeys.HEATER_ELEVATION,
          StageKeys.STRAY_GRID_ANODE,
          StageKeys.STRAY_GRID,
          StageKeys.STRAY_ANODE);

  private CommonKeys() {}
}
