package perveance.files.device;

import java.io.IOException;
import java.io.InputStream;
import java.nio.charset.StandardCharsets;
import java.nio.file.DirectoryStream;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.ArrayList;
import java.util.Collections;
import java.util.List;
import java.util.Optional;
import java.util.OptionalInt;
import perveance.engine.base.BadInputException;
import perveance.engine.base.Problem;
import perveance.files.toml.SourceText;

/**
 * A folder of device files; one that does not exist is empty.
 *
 * @param folder the folder
 * @param shown how messages name it
 */
record FolderShelf(Path folder, String shown) implements Shelf {
  @Override
  public List<String> files() throws BadInputException {
    List<String> names = new ArrayList<>();
    if (!Files.isDirectory(folder)) {
      return names;
    }
    try (DirectoryStream<Path> files = Files.newDirectoryStream(folder)) {
      for (Path file : files) {
        String name = file.getFileName().toString();
        if (name.endsWith(SUFFIX)) {
          names.add(name);
        }
      }
    } catch (IOException e) {
      throw refused(shown, "a folder that cannot be listed: " + e.getMessage());
    }
    Collections.sort(names);
    return names;
  }

  @Override
  public Optional<SourceText> read(String file) throws BadInputException {
    Path path = folder.resolve(file);
    return Files.isRegularFile(path)
        ? Optional.of(SourceText.read(path, shown(file)))
        : Optional.empty();
  }

  @Override
  public SourceText readHead(String file, int bytes) throws BadInputException {
    try (InputStream in = Files.newInputStream(folder.resolve(file))) {
      String text = new String(in.readNBytes(bytes), StandardCharsets.UTF_8);
      return SourceText.of(shown(file), text);
    } catch (IOException e) {
      throw refused(shown(file), "a file that cannot be read: " + e.getMessage());
    }
  }

  private String shown(String file) {
    return shown + "/" + file;
  }

  private static BadInputException refused(String file, String found) {
    return new BadInputException(
        new Problem(file, OptionalInt.empty(), "", found, "a readable one", Optional.empty()));
  }
}
