package perveance.engine.device;

import java.util.List;
import java.util.Optional;

/** Finds devices by any of their names; the names' case does not matter. */
public interface DeviceLibrary {
  /**
   * Finds a device.
   *
   * @param name type or alias
   * @return the device, or empty
   */
  Optional<Device> find(String name);

  /**
   * All names, types and aliases, for suggestions.
   *
   * @return names in order
   */
  List<String> names();
}
