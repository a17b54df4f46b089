package perveance.engine.analysis;

import java.util.ArrayList;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import perveance.engine.base.QuantityException;
import perveance.engine.base.QuantityParser;
import perveance.engine.device.DeviceLibrary;
import perveance.engine.stage.Chassis;
import perveance.engine.stage.ChassisChecks;
import perveance.engine.stage.ChassisCircuits;
import perveance.engine.stage.KeySpec;
import perveance.engine.stage.Setting;
import perveance.engine.stage.StageEntry;
import perveance.engine.stage.StageKinds;

/** Tries edits of one stage on a solved chassis. */
final class ChassisRetry implements Retry {
  private final ChassisModel model;
  private final DeviceLibrary devices;

  ChassisRetry(ChassisModel model, DeviceLibrary devices) {
    this.model = model;
    this.devices = devices;
  }

  @Override
  public Optional<Variant> with(String ref, Map<String, String> edits) {
    Optional<Chassis> edited = edited(ref, edits);
    if (edited.isEmpty() || !ChassisChecks.all(edited.get(), devices).isEmpty()) {
      return Optional.empty();
    }
    ChassisCircuits circuits = new ChassisCircuits(edited.get(), devices);
    return model
        .again(edited.get(), circuits, ref)
        .map(stage -> new Variant(stage, circuits.whole().circuit(), circuits.values(ref)));
  }

  private Optional<Chassis> edited(String ref, Map<String, String> edits) {
    List<StageEntry> stages = new ArrayList<>();
    for (StageEntry entry : model.chassis().stages()) {
      Optional<StageEntry> changed =
          entry.ref().equals(ref) ? changed(entry, edits) : Optional.of(entry);
      if (changed.isEmpty()) {
        return Optional.empty();
      }
      stages.add(changed.get());
    }
    return Optional.of(
        new Chassis(
            model.chassis().title(),
            model.chassis().conditions(),
            model.chassis().supplies(),
            stages));
  }

  private static Optional<StageEntry> changed(StageEntry entry, Map<String, String> edits) {
    StageEntry changed = entry;
    for (Map.Entry<String, String> edit : edits.entrySet()) {
      Optional<Setting> setting = setting(entry, edit.getKey(), edit.getValue());
      if (setting.isEmpty()) {
        return Optional.empty();
      }
      changed = changed.with(edit.getKey(), setting.get());
    }
    return Optional.of(changed);
  }

  private static Optional<Setting> setting(StageEntry entry, String key, String text) {
    Optional<KeySpec> spec =
        StageKinds.find(entry.kind()).stream()
            .flatMap(kind -> kind.keys().stream())
            .filter(k -> k.key().equals(key))
            .findFirst();
    if (spec.isEmpty() || spec.get().form() != KeySpec.Form.QUANTITY) {
      return Optional.empty();
    }
    try {
      double value = QuantityParser.parse(text, spec.get().unit()).value();
      boolean allowed = value >= spec.get().lowest() && value <= spec.get().highest();
      return allowed ? Optional.of(new Setting.Number(text, value)) : Optional.empty();
    } catch (QuantityException e) {
      return Optional.empty();
    }
  }
}
