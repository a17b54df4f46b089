package perveance.architecture;

import java.io.IOException;
import java.io.UncheckedIOException;
import java.nio.charset.StandardCharsets;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.List;
import java.util.stream.Stream;

/** The source files of the project, found from the folder that the tests run in. */
final class Sources {
  static final Path MAIN = Path.of("src", "main", "java");
  static final Path TEST = Path.of("src", "test", "java");
  static final Path BENCHMARK = Path.of("src", "test", "benchmark");

  private Sources() {}

  /**
   * Finds the Java files below a folder.
   *
   * @param folder where to look; may be missing
   * @return the files in a fixed order
   */
  static List<Path> under(Path folder) {
    return filesUnder(folder).stream().filter(file -> file.toString().endsWith(".java")).toList();
  }

  /**
   * Finds all files below a folder.
   *
   * @param folder where to look; may be missing
   * @return the files in a fixed order
   */
  static List<Path> filesUnder(Path folder) {
    if (!Files.isDirectory(folder)) {
      return List.of();
    }
    try (Stream<Path> all = Files.walk(folder)) {
      return all.filter(Files::isRegularFile).sorted().toList();
    } catch (IOException e) {
      throw new UncheckedIOException(e);
    }
  }

  /**
   * Reads a text file.
   *
   * @param file a file in UTF-8
   * @return its lines
   */
  static List<String> lines(Path file) {
    try {
      return Files.readAllLines(file, StandardCharsets.UTF_8);
    } catch (IOException e) {
      throw new UncheckedIOException(file.toString(), e);
    }
  }
}
