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
  private final List<ShelfIndex> shelves = new ArrayList<>();
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
      shelves.add(new ShelfIndex(new FolderShelf(folder, folder.toString()), false));
    }
    shelves.add(new ShelfIndex(PackagedShelf.find(), true));
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
    for (ShelfIndex shelf : shelves) {
      Optional<SourceText> source = shelf.source(name);
      if (source.isPresent()) {
        return source;
      }
    }
    return Optional.empty();
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
    for (ShelfIndex shelf : shelves) {
      names.addAll(shelf.names().names());
    }
    return List.copyOf(names);
  }

  /**
   * The user's own folder of device files, searched without being named.
   *
   * @return {@code .perveance/device-curves} in the home folder; it need not exist
   */
  public static Path usualFolder() {
    return Path.of(System.getProperty("user.home", "."), ".perveance", "device-curves");
  }

  /**
   * What is wrong with the user's folders, as in {@link #problems}, and with the files in them. The
   * program's own files are not looked into for that.
   *
   * @return one line each, none when all is well
   */
  public synchronized List<String> warnings() {
    Set<String> lines = new LinkedHashSet<>();
    for (ShelfIndex shelf : shelves.subList(0, shelves.size() - 1)) {
      shelf.names().problems().forEach(problem -> lines.add(problem.message()));
      for (String name : shelf.names().names()) {
        try {
          load(name);
        } catch (BadInputException e) {
          e.problems().forEach(problem -> lines.add(problem.message()));
        }
      }
    }
    return List.copyOf(lines);
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
    for (ShelfIndex shelf : shelves) {
      problems.addAll(shelf.names().problems());
    }
    return problems;
  }
}
