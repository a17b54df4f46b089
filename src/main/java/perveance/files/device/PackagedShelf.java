package perveance.files.device;

import java.net.URISyntaxException;
import java.net.URL;
import java.nio.file.Files;
import java.nio.file.Path;
import java.security.CodeSource;

/**
 * Finds the device files that come with the program: beside its classes or in its jar. They are not
 * asked of the class loader, because a name it does not have makes it open every jar there is.
 */
final class PackagedShelf {
  private static final String ROOT = "perveance/device-curves/";

  /** As the folder is called in the project. */
  private static final String SHOWN = "device-curves";

  private PackagedShelf() {}

  static Shelf find() {
    return at(place());
  }

  static Shelf at(Path place) {
    return Files.isDirectory(place)
        ? new FolderShelf(place.resolve(ROOT), SHOWN)
        : new JarShelf(place, ROOT, SHOWN);
  }

  private static Path place() {
    CodeSource source = PackagedShelf.class.getProtectionDomain().getCodeSource();
    URL location = source == null ? null : source.getLocation();
    if (location == null) {
      throw new IllegalStateException("the program does not know where it lies");
    }
    try {
      return Path.of(location.toURI());
    } catch (URISyntaxException e) {
      throw new IllegalStateException("the program lies at no usable place: " + location, e);
    }
  }
}
