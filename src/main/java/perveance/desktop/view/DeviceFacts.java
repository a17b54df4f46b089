package perveance.desktop.view;

import java.util.ArrayList;
import java.util.List;
import java.util.Map;
import java.util.OptionalDouble;
import java.util.TreeMap;
import perveance.engine.base.QuantityFormat;
import perveance.engine.base.Unit;
import perveance.engine.device.Device;
import perveance.engine.device.Heater;
import perveance.engine.device.Ratings;

/** Ratings, heater and pins of a device in lines. */
final class DeviceFacts {
  private DeviceFacts() {}

  static List<String> lines(Device device) {
    List<String> lines = new ArrayList<>();
    device.defaultRatings().ifPresent(r -> lines.add(ratings(r)));
    for (Heater heater : device.heaters()) {
      lines.add(
          "Heater "
              + reading(heater.voltage(), Unit.VOLT)
              + ", "
              + reading(heater.current(), Unit.AMPERE)
              + (heater.pins().isBlank() ? "" : ", pins " + heater.pins()));
    }
    if (!device.pins().isEmpty()) {
      StringBuilder pins = new StringBuilder("Base " + device.base() + ", pins");
      for (Map.Entry<String, String> pin : new TreeMap<>(device.pins()).entrySet()) {
        pins.append(' ').append(pin.getKey()).append(' ').append(pin.getValue()).append(',');
      }
      lines.add(pins.substring(0, pins.length() - 1));
    }
    return lines.stream().map(Bits::kept).toList();
  }

  private static String ratings(Ratings r) {
    List<String> parts = new ArrayList<>();
    add(parts, "anode", r.anodeVoltage(), Unit.VOLT);
    add(parts, "anode", r.anodeDissipation(), Unit.WATT);
    add(parts, "screen", r.screenVoltage(), Unit.VOLT);
    add(parts, "screen", r.screenDissipation(), Unit.WATT);
    add(parts, "cathode", r.cathodeCurrent(), Unit.AMPERE);
    add(parts, "heater to cathode", r.heaterNegative(), Unit.VOLT);
    return "Limits ("
        + r.system().word()
        + ", "
        + r.source()
        + "): "
        + (parts.isEmpty() ? "none published" : String.join(", ", parts));
  }

  private static void add(List<String> parts, String name, OptionalDouble value, Unit unit) {
    value.ifPresent(v -> parts.add(name + " " + reading(v, unit)));
  }

  private static String reading(double value, Unit unit) {
    return QuantityFormat.TYPESET.reading(value, unit, 3);
  }
}
