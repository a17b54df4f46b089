package perveance.architecture;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;

import com.sun.source.tree.MethodTree;
import com.sun.source.util.TreeScanner;
import java.nio.file.Path;
import java.util.ArrayList;
import java.util.List;
import java.util.Set;
import java.util.stream.Stream;
import org.jspecify.annotations.Nullable;
import org.junit.jupiter.api.Test;
import perveance.architecture.ParsedSources.ParsedFile;

/** Sources stay small enough to be read at one sitting, and finished. */
class SourceShapeTest {
  private static final int LONGEST_FILE = 400;
  private static final int MEDIAN_FILE = 120;
  private static final int LONGEST_METHOD = 40;

  /** Names that gather whatever has no place; cycles grow from them. */
  private static final Set<String> NAMELESS =
      Set.of("util", "utils", "common", "core", "misc", "manager", "managers", "helper", "helpers");

  @Test
  void noFileIsLong() {
    List<String> tooLong =
        all()
            .filter(file -> Sources.lines(file).size() > LONGEST_FILE)
            .map(file -> file + " has " + Sources.lines(file).size() + " lines")
            .toList();
    assertEquals("", String.join("\n", tooLong), "files over " + LONGEST_FILE + " lines");
  }

  @Test
  void mostFilesAreShort() {
    List<Integer> lengths =
        Sources.under(Sources.MAIN).stream()
            .map(file -> Sources.lines(file).size())
            .sorted()
            .toList();
    int median = lengths.get(lengths.size() / 2);
    assertTrue(median < MEDIAN_FILE, () -> "the median file has " + median + " lines");
  }

  @Test
  void noMethodIsLong() {
    List<String> tooLong = new ArrayList<>();
    ParsedSources.MAIN.forEach(file -> collectLongMethods(file, tooLong));
    assertEquals("", String.join("\n", tooLong), "methods over " + LONGEST_METHOD + " lines");
  }

  @Test
  void noPackageIsADrawerForOddments() {
    List<Path> drawers =
        all()
            .filter(
                file -> Stream.of(file.toString().split("[/\\\\]")).anyMatch(NAMELESS::contains))
            .toList();
    assertEquals(List.of(), drawers);
  }

  private static Stream<Path> all() {
    return Stream.of(Sources.MAIN, Sources.TEST, Sources.BENCHMARK)
        .flatMap(folder -> Sources.under(folder).stream());
  }

  private static void collectLongMethods(ParsedFile file, List<String> tooLong) {
    new TreeScanner<@Nullable Void, @Nullable Void>() {
      @Override
      public @Nullable Void visitMethod(MethodTree method, @Nullable Void unused) {
        if (method.getBody() != null) {
          long lines = file.lastLineOf(method.getBody()) - file.lineOf(method.getBody()) + 1;
          if (lines > LONGEST_METHOD) {
            tooLong.add(
                file.placeOf(method) + ": " + method.getName() + " has " + lines + " lines");
          }
        }
        return super.visitMethod(method, null);
      }
    }.scan(file.unit(), null);
  }
}
