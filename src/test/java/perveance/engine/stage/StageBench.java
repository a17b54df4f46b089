package perveance.engine.stage;

import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import java.util.OptionalDouble;
import perveance.engine.circuit.Circuit;
import perveance.engine.circuit.Element;
import perveance.engine.device.Capacitances;
import perveance.engine.device.Device;
import perveance.engine.device.DeviceLaw;
import perveance.engine.device.FitSummary;
import perveance.engine.device.Validity;

/** Puts single stages on the bench: values by key, a supply of a stated voltage, a device. */
final class StageBench {
  final StageKind kind;
  final Map<String, Setting> settings = new LinkedHashMap<>();
  final Map<String, Device> devices = new LinkedHashMap<>();
  Surroundings around = Surroundings.NONE;

  StageBench(String kind, DeviceLaw law) {
    this.kind = StageKinds.find(kind).orElseThrow();
    devices.put("device", device("TEST", law, Capacitances.NONE));
    settings.put("device", new Setting.Word("TEST"));
    settings.put("supply", new Setting.Word("A"));
  }

  private StageBench(StageBench other) {
    this.kind = other.kind;
    this.settings.putAll(other.settings);
    this.devices.putAll(other.devices);
    this.around = other.around;
  }

  StageBench copy() {
    return new StageBench(this);
  }

  static Device device(String type, DeviceLaw law, Capacitances capacitances) {
    return new Device(
        type,
        List.of(),
        2,
        "",
        Map.of(),
        List.of(),
        List.of(),
        capacitances,
        List.of(),
        law,
        new FitSummary("", 0, 0, List.of(), List.of()),
        new Validity(0, 1000, 0, 1, -100, 0),
        List.of());
  }

  StageBench with(String key, double value) {
    settings.put(key, new Setting.Number(Double.toString(value), value));
    return this;
  }

  StageBench with(String key, String word) {
    settings.put(key, new Setting.Word(word));
    return this;
  }

  StageBench with(String key, boolean flag) {
    settings.put(key, new Setting.Flag(flag));
    return this;
  }

  StageBench without(String key) {
    settings.remove(key);
    return this;
  }

  StageBench device2(DeviceLaw law) {
    devices.put("device2", device("TEST2", law, Capacitances.NONE));
    return with("device2", "TEST2");
  }

  StageBench in(Surroundings surroundings) {
    around = surroundings;
    return this;
  }

  StageValues values() {
    return new StageValues(new StageEntry("V1", kind.name(), settings), devices, around);
  }

  Built build(double supply) {
    Circuit.Builder builder = new Circuit.Builder();
    StageCircuit stage = kind.build(values(), builder);
    for (String key : List.of("supply", "screen_supply", "tail_supply")) {
      Optional<String> name = values().word(key);
      if (name.isPresent() && kind.keys().stream().anyMatch(k -> k.key().equals(key))) {
        String node = ChassisNames.supply(name.get());
        double voltage = key.equals("tail_supply") ? -supply : supply;
        try {
          builder.add(new Element.VoltageSource(node, builder.node(node), 0, voltage));
        } catch (IllegalArgumentException twice) {
          // the same supply feeds two points of the stage
        }
      }
    }
    around
        .directInput()
        .ifPresent(n -> builder.add(new Element.VoltageSource("before", builder.node(n), 0, 100)));
    around
        .directInput2()
        .ifPresent(n -> builder.add(new Element.VoltageSource("before2", builder.node(n), 0, 100)));
    return new Built(stage, builder.build(), kind.draw(values()));
  }

  static Surroundings drivenFrom(String node) {
    return drivenFrom(node, Optional.empty());
  }

  static Surroundings drivenFrom(String node, Optional<String> node2) {
    return new Surroundings(
        Optional.of(node),
        node2,
        Optional.empty(),
        OptionalDouble.empty(),
        Optional.empty(),
        Optional.empty(),
        OptionalDouble.empty());
  }

  /**
   * A stage as built.
   *
   * @param stage what is where
   * @param circuit its circuit with supplies
   * @param drawing its drawing
   */
  record Built(StageCircuit stage, Circuit circuit, Drawing drawing) {}
}
