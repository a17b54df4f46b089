package perveance.architecture;

import static org.junit.jupiter.api.Assertions.assertEquals;

import com.sun.source.tree.LiteralTree;
import com.sun.source.util.TreeScanner;
import java.nio.file.Path;
import java.util.ArrayList;
import java.util.List;
import java.util.regex.Pattern;
import java.util.stream.Stream;
import org.jspecify.annotations.Nullable;
import org.junit.jupiter.api.Test;
import perveance.architecture.ParsedSources.ParsedFile;

/** What the program may say to a person, and what no text of the project may hold. */
class WordingTest {
  /** No program can promise this about a voltage or a valve, so it is said about nothing. */
  private static final Pattern PROMISE =
      Pattern.compile("\\b(un)?safe(ly)?\\b|\\bharmless\\b", Pattern.CASE_INSENSITIVE);

  /** A path that exists on one machine only, or a note that something is not finished. */
  private static final Pattern LEFTOVER =
      Pattern.compile(
          "(?<![\\w.:/])/(home|root|Users|mnt)/|\\b(TO" + "DO|FIX" + "ME|X" + "XX|HA" + "CK)\\b");

  private static final Pattern TEXT_FILE =
      Pattern.compile(".*\\.(java|toml|properties|txt|md|csv|tsv|css|xml|json|svg)|.*/run");

  @Test
  void noTextOfTheProgramPromisesSafety() {
    List<String> promises = new ArrayList<>();
    ParsedSources.MAIN.forEach(file -> collectPromises(file, promises));
    shownToPeople().forEach(file -> collect(file, PROMISE, promises));
    assertEquals("", String.join("\n", promises));
  }

  @Test
  void nothingIsLeftLyingAbout() {
    List<String> leftovers = new ArrayList<>();
    Stream.of("src", "device-curves", "examples", ".ci")
        .flatMap(folder -> Sources.filesUnder(Path.of(folder)).stream())
        .filter(file -> TEXT_FILE.matcher(file.toString()).matches())
        .forEach(file -> collect(file, LEFTOVER, leftovers));
    Stream.of("pom.xml", "README.md", "DEVELOPERS.md")
        .forEach(file -> collect(Path.of(file), LEFTOVER, leftovers));
    assertEquals("", String.join("\n", leftovers));
  }

  private static Stream<Path> shownToPeople() {
    return Stream.of(
            Path.of("src", "main", "resources"), Path.of("device-curves"), Path.of("examples"))
        .flatMap(folder -> Sources.filesUnder(folder).stream())
        .filter(file -> TEXT_FILE.matcher(file.toString()).matches());
  }

  private static void collect(Path file, Pattern pattern, List<String> found) {
    List<String> lines = Sources.lines(file);
    for (int line = 0; line < lines.size(); line++) {
      if (pattern.matcher(lines.get(line)).find()) {
        found.add(file + ":" + (line + 1) + ": " + lines.get(line).strip());
      }
    }
  }

  private static void collectPromises(ParsedFile file, List<String> promises) {
    new TreeScanner<@Nullable Void, @Nullable Void>() {
      @Override
      public @Nullable Void visitLiteral(LiteralTree literal, @Nullable Void unused) {
        if (literal.getValue() instanceof String text && PROMISE.matcher(text).find()) {
          promises.add(file.placeOf(literal) + ": " + text);
        }
        return null;
      }
    }.scan(file.unit(), null);
  }
}
