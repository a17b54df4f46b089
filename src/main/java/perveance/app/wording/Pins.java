package perveance.app.wording;

import java.util.Map;
import java.util.Set;
import perveance.engine.device.Device;

/** Pins of one section of a device, found by electrode. */
public final class Pins {
  private final Map<String, String> pins;
  private final String section;

  /**
   * Pins for a reference.
   *
   * @param device device
   * @param ref reference; a trailing letter a or b, or digit 1 or 2 after a letter, names the
   *     section
   */
  public Pins(Device device, String ref) {
    this.pins = device.pins();
    this.section = device.sections() < 2 ? "" : ref.endsWith("b") ? "2" : "1";
  }

  /**
   * Pin of an electrode.
   *
   * @param electrode {@code a}, {@code g}, {@code k} or {@code g2}
   * @return pin, empty when the file does not say
   */
  public String of(String electrode) {
    for (String name : names(electrode)) {
      for (Map.Entry<String, String> pin : pins.entrySet()) {
        if (pin.getValue().equals(name)) {
          return pin.getKey();
        }
      }
    }
    return "";
  }

  private Set<String> names(String electrode) {
    if (!section.isEmpty()) {
      return Set.of(electrode + section);
    }
    return switch (electrode) {
      case "g" -> Set.of("g", "g1");
      case "k" -> Set.of("k", "k+g3", "k+beam plates", "f");
      default -> Set.of(electrode);
    };
  }
}
