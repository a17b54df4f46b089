package perveance.files.device;

import java.util.Optional;
import org.jspecify.annotations.Nullable;
import perveance.engine.base.BadInputException;
import perveance.files.toml.SourceText;

/** A shelf with what is known of the names on it; they are looked through when first needed. */
final class ShelfIndex {
  private final Shelf shelf;
  private final boolean namedByType;
  private @Nullable DeviceNames names;

  /**
   * An index not made yet.
   *
   * @param shelf the shelf
   * @param namedByType whether its files are named after their type, which spares looking into all
   *     of them for a device that is asked for by its type
   */
  ShelfIndex(Shelf shelf, boolean namedByType) {
    this.shelf = shelf;
    this.namedByType = namedByType;
  }

  Optional<SourceText> source(String name) throws BadInputException {
    if (namedByType && names == null) {
      Optional<SourceText> guessed = shelf.read(DeviceNames.fileFor(name));
      if (guessed.isPresent()) {
        return guessed;
      }
    }
    Optional<String> file = names().fileOf(name);
    return file.isEmpty() ? Optional.empty() : shelf.read(file.get());
  }

  DeviceNames names() {
    DeviceNames known = names;
    if (known == null) {
      known = DeviceNames.of(shelf);
      names = known;
    }
    return known;
  }
}
