package perveance.engine.analysis;

import java.util.ArrayList;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import perveance.engine.device.Device;
import perveance.engine.stage.StageCircuit.StageDevice;

/** The glass of a chassis: sections of one name and type share an envelope, as V1a and V1b do. */
final class Envelopes {
  private Envelopes() {}

  /**
   * One envelope.
   *
   * @param name for example {@code V1}
   * @param device its type
   * @param sections the sections of it that the chassis uses
   */
  record Envelope(String name, Device device, List<String> sections) {}

  /** All envelopes in the order of the chassis. */
  static List<Envelope> of(ChassisModel model) {
    Map<String, Envelope> found = new LinkedHashMap<>();
    for (StageModel stage : model.models()) {
      for (StageDevice section : stage.stage().devices()) {
        Device device = section.device();
        String name = device.sections() > 1 ? stem(section.ref()) : section.ref();
        found
            .computeIfAbsent(
                name + " " + device.type(), k -> new Envelope(name, device, new ArrayList<>()))
            .sections()
            .add(section.ref());
      }
    }
    return List.copyOf(found.values());
  }

  /** V1 of V1a: a letter behind a digit names a section. */
  private static String stem(String ref) {
    int last = ref.length() - 1;
    boolean letter =
        last > 0
            && Character.isLowerCase(ref.charAt(last))
            && Character.isDigit(ref.charAt(last - 1));
    return letter ? ref.substring(0, last) : ref;
  }
}
