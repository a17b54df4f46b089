package perveance.cli;

import java.util.List;
import java.util.OptionalInt;
import perveance.engine.base.NearMiss;
import perveance.engine.base.Problem;

/** The message for a device that no file describes. */
final class UnknownDevice {
  private UnknownDevice() {}

  static Problem problem(String name, List<String> names) {
    return new Problem(
        "command line",
        OptionalInt.empty(),
        "DEVICE",
        name,
        "a type or alias of a device file",
        NearMiss.suggest(name, names));
  }
}
