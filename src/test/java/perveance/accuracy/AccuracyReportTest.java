package perveance.accuracy;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.io.IOException;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.ArrayList;
import java.util.Comparator;
import java.util.List;
import org.junit.jupiter.api.Test;

/**
 * Writes the accuracy report to {@code target/accuracy.md} and checks the README's copy. To renew
 * the copy:
 *
 * <pre>{@code mvn -q test -Dtest=AccuracyReportTest -Dperveance.accuracy=write}</pre>
 */
class AccuracyReportTest {
  private static final String BEGIN = "<!-- accuracy:begin -->\n";
  private static final String END = "<!-- accuracy:end -->";
  private static final boolean WRITE = "write".equals(System.getProperty("perveance.accuracy"));

  /** All that is compared; another kind of device adds its stages here. */
  private static final List<AccuracySource> SOURCES =
      List.of(
          new LibraryEvidence(),
          new LeftOut(),
          new TriodeStageAccuracy(),
          new PentodeStageAccuracy());

  private static String report() {
    List<AccuracyLine> lines = new ArrayList<>();
    for (AccuracySource source : SOURCES) {
      lines.addAll(source.lines());
    }
    lines.sort(Comparator.comparing(AccuracyLine::type));
    StringBuilder table =
        new StringBuilder(
            """
            | type | compared | law | n | median error | worst error | source |
            | --- | --- | --- | --- | --- | --- | --- |
            """);
    lines.forEach(line -> table.append(line.row()).append('\n'));
    return """
    Errors of the laws in `device-curves/` against published figures. "Fitted" figures took
    part in the fit; "predicted" ones never did; for "point left out" each tabulated point of
    a type with three or more was left out in turn and predicted from the rest. Chart errors
    are told against the reading or a tenth of the chart's highest current, whichever is
    more. Over all types (median of the types' medians):

    %s
    <details>
    <summary>Every type by itself, with its sources</summary>

    %s
    </details>

    Published laws with their published parameters, at the tabulated points of the library
    (second opinions: fitted by their authors to other evidence):

    %s
    What the tapering spread and the cathode's own spread change at low current, on rows that
    no law was fitted to:

    %s\
    """
        .formatted(
            AccuracySummary.of(lines),
            table,
            LawComparison.secondOpinions(),
            LawComparison.lowCurrent());
  }

  @Test
  void theReadmeCarriesTheReport() throws IOException {
    String report = report();
    Files.createDirectories(Path.of("target"));
    Files.writeString(Path.of("target", "accuracy.md"), report);
    Path readme = Path.of("README.md");
    String text = Files.readString(readme);
    int begin = text.indexOf(BEGIN);
    int end = text.indexOf(END);
    assertTrue(begin >= 0 && end > begin, "README.md has no place for the accuracy report");
    if (WRITE) {
      String renewed = text.substring(0, begin + BEGIN.length()) + report + text.substring(end);
      Files.writeString(readme, renewed);
      return;
    }
    String copy = text.substring(begin + BEGIN.length(), end);
    assertEquals(report, copy, "renew the README's copy, see this test's comment");
  }
}
