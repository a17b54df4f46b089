package perveance.engine.stage;

import java.util.ArrayList;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Locale;
import java.util.Map;
import java.util.Optional;
import java.util.OptionalDouble;
import perveance.engine.device.Capacitances;
import perveance.engine.device.Device;
import perveance.engine.device.DeviceLaw;
import perveance.engine.device.DeviceLibrary;

/** Puts a chassis together for tests, with a library of its own. */
final class ChassisBench {
  private final List<Supply> supplies = new ArrayList<>();
  private final List<StageEntry> stages = new ArrayList<>();
  private final Map<String, Device> devices = new LinkedHashMap<>();

  ChassisBench device(String type, DeviceLaw law) {
    devices.put(type.toLowerCase(Locale.ROOT), StageBench.device(type, law, Capacitances.NONE));
    return this;
  }

  ChassisBench supply(String name, double voltage) {
    supplies.add(
        new Supply(
            name, new SupplyFeed.Stated(voltage), OptionalDouble.empty(), OptionalDouble.empty()));
    return this;
  }

  ChassisBench dropped(String name, String from, double dropper) {
    supplies.add(
        new Supply(
            name,
            new SupplyFeed.Dropped(from, dropper),
            OptionalDouble.of(22e-6),
            OptionalDouble.empty()));
    return this;
  }

  /** A stage from key and value in turn; a value is a number, a flag or a word. */
  ChassisBench stage(String ref, String kind, Object... keysAndValues) {
    Map<String, Setting> settings = new LinkedHashMap<>();
    for (int i = 0; i < keysAndValues.length; i += 2) {
      settings.put((String) keysAndValues[i], setting(keysAndValues[i + 1]));
    }
    stages.add(new StageEntry(ref, kind, settings));
    return this;
  }

  private static Setting setting(Object value) {
    if (value instanceof Number n) {
      return new Setting.Number(n.toString(), n.doubleValue());
    }
    return value instanceof Boolean flag
        ? new Setting.Flag(flag)
        : new Setting.Word(value.toString());
  }

  Chassis chassis() {
    return new Chassis("bench", Conditions.USUAL, supplies, stages);
  }

  DeviceLibrary library() {
    return new DeviceLibrary() {
      @Override
      public Optional<Device> find(String name) {
        return Optional.ofNullable(devices.get(name.toLowerCase(Locale.ROOT)));
      }

      @Override
      public List<String> names() {
        return devices.values().stream().map(Device::type).toList();
      }
    };
  }

  List<String> complaints() {
    return ChassisChecks.all(chassis(), library()).stream().map(ChassisComplaint::message).toList();
  }

  ChassisCircuits circuits() {
    return new ChassisCircuits(chassis(), library());
  }
}
