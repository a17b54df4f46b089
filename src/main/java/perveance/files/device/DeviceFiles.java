package perveance.files.device;

import java.nio.file.Path;
import java.util.ArrayList;
import java.util.HashMap;
import java.util.LinkedHashSet;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import java.util.Set;
import perveance.engine.base.BadInputException;
import perveance.engine.base.Problem;
import perveance.engine.device.Device;
import perveance.engine.device.DeviceLibrary;
import perveance.files.toml.SourceText;

/**
 * The devices of the user's folders and, behind them, those that come with the program. A device is
 * read when it is asked for, so a command that needs one does not wait for all.
 */
public final class DeviceFiles implements DeviceLibrary {
  private final List<Shelf> shelves = new ArrayList<>();
  private final Map<Shelf, DeviceNames> namesOf = new HashMap<>();
  private final Map<String, Device> byName = new HashMap<>();
  private final Map<String, Device> byFile = new HashMap<>();

  /**
   * Opens the library.
   *
   * @param folders the user's folders, searched in this order before the program's own files; they
   *     need not exist
   */
  public DeviceFiles(List<Path> folders) {
    for (Path folder : folders) {
      shelves.add(new FolderShelf(folder));
    }
    shelves.add(new PackagedShelf());
  }

  /**
   * Finds a device and tells what is wrong with its file.
   *
   * @param name type or alias; case, spaces and hyphens do not matter
   * @return the device; empty when no file claims the name
   * @throws BadInputException when its file cannot be used
   */
  public synchronized Optional<Device> load(String name) throws BadInputException {
    String plain = DeviceNames.plain(name);
    Device known = byName.get(plain);
    if (known != null) {
      return Optional.of(known);
    }
    Optional<SourceText> source = source(name);
    if (source.isEmpty()) {
      return Optional.empty();
    }
    String file = source.get().file();
    Device device = byFile.get(file);
    if (device == null) {
      device = DeviceReader.read(source.get());
      byFile.put(file, device);
    }
    byName.put(plain, device);
    return Optional.of(device);
  }

  /**
   * The text of a device's file.
   *
   * @param name type or alias
   * @return the text; empty when no file claims the name
   * @throws BadInputException when the file cannot be read
   */
  public synchronized Optional<SourceText> source(String name) throws BadInputException {
    for (Shelf shelf : shelves) {
      Optional<SourceText> source = source(shelf, name);
      if (source.isPresent()) {
        return source;
      }
    }
    return Optional.empty();
  }

  private Optional<SourceText> source(Shelf shelf, String name) throws BadInputException {
    if (shelf instanceof PackagedShelf && !namesOf.containsKey(shelf)) {
      // our own files are named after their type, which spares looking into all of them
      Optional<SourceText> guessed = shelf.read(DeviceNames.fileFor(name));
      if (guessed.isPresent()) {
        return guessed;
      }
    }
    Optional<String> file = names(shelf).fileOf(name);
    return file.isEmpty() ? Optional.empty() : shelf.read(file.get());
  }

  private DeviceNames names(Shelf shelf) {
    DeviceNames known = namesOf.get(shelf);
    if (known == null) {
      known = DeviceNames.of(shelf);
      namesOf.put(shelf, known);
    }
    return known;
  }

  /**
   * {@inheritDoc}
   *
   * @return the device; empty also when its file cannot be used, for which {@link #load} gives the
   *     reason
   */
  @Override
  public Optional<Device> find(String name) {
    try {
      return load(name);
    } catch (BadInputException e) {
      return Optional.empty();
    }
  }

  @Override
  public synchronized List<String> names() {
    Set<String> names = new LinkedHashSet<>();
    for (Shelf shelf : shelves) {
      names.addAll(names(shelf).names());
    }
    return List.copyOf(names);
  }

  /**
   * What is wrong with the library as a whole: folders and files that cannot be read, names that
   * two files of one folder claim. That a user's file takes a name of the program's own is
   * intended.
   *
   * @return problems, none when all is well
   */
  public synchronized List<Problem> problems() {
    List<Problem> problems = new ArrayList<>();
    for (Shelf shelf : shelves) {
      problems.addAll(names(shelf).problems());
    }
    return problems;
  }
}
