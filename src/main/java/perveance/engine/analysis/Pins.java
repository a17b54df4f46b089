package perveance.engine.analysis;

import java.util.List;
import java.util.Map;
import java.util.Optional;
import perveance.engine.device.Device;
import perveance.engine.device.LawKind;

/** Finds the pin of an electrode on the base of a device. */
final class Pins {
  private Pins() {}

  /**
   * Pin of an electrode of a section.
   *
   * @param device the device
   * @param ref reference of the section; a last letter b means the second section
   * @param electrode {@code anode}, {@code grid}, {@code screen}, {@code cathode}
   * @return pin number as printed, empty when the file does not tell
   */
  static Optional<String> of(Device device, String ref, String electrode) {
    for (String name : names(device, ref, electrode)) {
      for (Map.Entry<String, String> pin : device.pins().entrySet()) {
        if (pin.getValue().equals(name)) {
          return Optional.of(pin.getKey());
        }
      }
    }
    return Optional.empty();
  }

  private static List<String> names(Device device, String ref, String electrode) {
    boolean pentode = device.law().kind() == LawKind.PENTODE;
    String letter =
        switch (electrode) {
          case "anode" -> "a";
          case "cathode" -> device.pins().containsValue("f") ? "f" : "k";
          case "screen" -> "g2";
          default -> "g";
        };
    if (device.sections() > 1) {
      return List.of(letter + section(ref));
    }
    return pentode && letter.equals("g") ? List.of("g1", "g") : List.of(letter);
  }

  private static int section(String ref) {
    char last = ref.isEmpty() ? 'a' : Character.toLowerCase(ref.charAt(ref.length() - 1));
    return last >= 'a' && last <= 'f' ? 1 + last - 'a' : 1;
  }
}
