package perveance.accuracy;

import java.nio.file.Path;
import java.util.List;
import perveance.engine.base.BadInputException;
import perveance.engine.device.Device;
import perveance.files.device.DeviceFiles;

/** The device files of the working copy. */
public final class Library {
  private static final DeviceFiles FILES = new DeviceFiles(List.of(Path.of("device-curves")));

  private Library() {}

  /** A device by any name; a test that names a missing one fails here. */
  public static Device device(String name) {
    try {
      return FILES.load(name).orElseThrow(() -> new IllegalArgumentException("no device " + name));
    } catch (BadInputException e) {
      throw new IllegalStateException(e);
    }
  }

  /** All names of the library. */
  public static List<String> names() {
    return FILES.names();
  }
}
