package perveance.architecture;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.nio.file.Path;
import java.util.List;
import java.util.stream.IntStream;
import java.util.stream.Stream;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.ValueSource;
import perveance.architecture.ParsedSources.ParsedFile;

/** Every number that crosses a public boundary says what it is measured in. */
class UnitsDocumentedTest {
  private static final Path SAMPLE =
      Path.of("src", "test", "resources", "perveance", "architecture", "untold.txt");

  private static final String MARK = "// misses ";

  @Test
  void everyPublicNumberStatesItsUnit() {
    List<String> missing =
        ParsedSources.MAIN.stream().flatMap(UnitsDocumentedTest::missing).toList();
    assertEquals("", String.join("\n", missing), missing.size() + " numbers without a unit");
  }

  /** The scan itself is tested on a source that leaves out every kind of tag once. */
  @Test
  void theScanSeesEveryKindOfOmission() {
    List<String> sample = Sources.lines(SAMPLE);
    List<String> planted =
        IntStream.range(0, sample.size())
            .filter(index -> sample.get(index).contains(MARK))
            .mapToObj(index -> (index + 1) + ": " + sample.get(index).replaceFirst(".*" + MARK, ""))
            .toList();
    assertTrue(planted.size() >= 10);
    List<String> seen =
        missing(ParsedSources.parse(String.join("\n", sample)))
            .map(line -> line.replaceFirst("^[^:]*:", ""))
            .toList();
    assertEquals(String.join("\n", planted), String.join("\n", seen));
  }

  @ParameterizedTest
  @ValueSource(
      strings = {
        "voltage [V]",
        "x [A V^-1.5]",
        "[1]",
        "gain [dB], at least 0",
        "[V/Hz^0.5]",
        "[A/V^(3/2)]",
        "array [V], one per node",
        "weight [unit of y]",
        "drift [ppm/K]"
      })
  void unitsAreRecognised(String text) {
    assertTrue(UnitText.isStatedIn(text));
  }

  @ParameterizedTest
  @ValueSource(strings = {"voltage in V", "V", "[]", "in [0, 1]", "x[i]", "[volts]", "[-1]"})
  void otherBracketsAreNot(String text) {
    assertEquals(false, UnitText.isStatedIn(text));
  }

  private static Stream<String> missing(ParsedFile file) {
    UnitScanner scanner = new UnitScanner(file);
    scanner.scan(file.unit(), null);
    return scanner.missing().stream();
  }
}
