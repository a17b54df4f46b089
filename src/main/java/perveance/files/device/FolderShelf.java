package perveance.files.device;

import java.io.IOException;
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
 */
record FolderShelf(Path folder) implements Shelf {
  @Override
  public List<String> files() throws BadInputException {
    List<String> names = new ArrayList<>();
    if (!Files.isDirectory(folder)) {
      return names;
    }
    try (DirectoryStream<Path> files = Files.newDirectoryStream(folder, "*" + SUFFIX)) {
      for (Path file : files) {
        names.add(file.getFileName().toString());
      }
    } catch (IOException e) {
      throw new BadInputException(
          new Problem(
              folder.toString(),
              OptionalInt.empty(),
              "",
              "a folder that cannot be listed: " + e.getMessage(),
              "a readable folder",
              Optional.empty()));
    }
    Collections.sort(names);
    return names;
  }

  @Override
  public Optional<SourceText> read(String file) throws BadInputException {
    Path path = folder.resolve(file);
    return Files.isRegularFile(path) ? Optional.of(SourceText.read(path)) : Optional.empty();
  }
}
