package perveance.cli;

import static org.junit.jupiter.api.Assertions.assertArrayEquals;
import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.io.IOException;
import java.nio.charset.StandardCharsets;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.List;
import java.util.stream.Stream;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.io.TempDir;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;

/** Curves, sheet, example, completion and help. */
class OtherCommandsTest {
  private static final String EXAMPLE = "examples/line-stage.toml";

  @TempDir Path folder;

  @Test
  void curvesPrintsAColumnForEachGridVoltage() {
    CommandTrial trial = CommandTrial.of("curves", "ecc83");
    List<String> lines = trial.out().lines().toList();
    assertEquals(0, trial.status(), trial.err());
    assertTrue(lines.get(0).startsWith("anode_V,anode_A at grid 0 V,"), lines.get(0));
    long columns = lines.get(0).chars().filter(c -> c == ',').count();
    assertTrue(columns >= 4);
    lines.forEach(l -> assertEquals(columns, l.chars().filter(c -> c == ',').count(), l));
  }

  @Test
  void curvesOfARectifierIsOneColumn() {
    String table = CommandTrial.of("curves", "GZ34").out();
    assertTrue(table.startsWith("anode_V,anode_A\n0,"), table.lines().findFirst().orElse(""));
  }

  @Test
  void curvesOfAPentodeKeepsTheScreenWhereItsSheetHasItUnlessTied() {
    String pentode = CommandTrial.of("curves", "EL84", "--volts", "300").out();
    String triode = CommandTrial.of("curves", "EL84", "--volts", "300", "--triode").out();
    // tied, the current at a low anode voltage is a small part of that with 250 V on the screen
    assertTrue(atZeroBias(pentode, "30,") > 3 * atZeroBias(triode, "30,"));
  }

  private static double atZeroBias(String table, String start) {
    String line = table.lines().filter(l -> l.startsWith(start)).findFirst().orElseThrow();
    return Double.parseDouble(line.split(",", -1)[1]);
  }

  @ParameterizedTest
  @CsvSource({
    "EL34, --volts=0, a figure above 0",
    "EL34, --milliamperes=-3, a figure above 0",
    "EL34, --screen=-5, a figure above 0",
    "6SN7, --screen=100, a pentode",
    "6SN7, --triode, a pentode"
  })
  void curvesRefusesWhatCannotBeDrawn(String device, String option, String expected) {
    CommandTrial trial = CommandTrial.of("curves", device, option);
    assertEquals(2, trial.status());
    assertTrue(trial.err().contains("expected " + expected), trial.err());
  }

  @Test
  void curvesDrawsVectorAndBitmap() throws IOException {
    Path svg = folder.resolve("x.svg");
    Path png = folder.resolve("x.png");
    assertEquals(0, CommandTrial.of("curves", "12AX7", "-o", svg.toString()).status());
    assertEquals(0, CommandTrial.of("curves", "12AX7", "-o", png.toString()).status());
    assertTrue(Files.readString(svg).contains("<svg"));
    assertArrayEquals(
        new byte[] {(byte) 0x89, 'P', 'N', 'G'},
        Stream.of(Files.readAllBytes(png))
            .findFirst()
            .map(b -> java.util.Arrays.copyOf(b, 4))
            .orElseThrow());
  }

  @Test
  void anUnknownDeviceIsAnsweredWithANearMiss() {
    CommandTrial trial = CommandTrial.of("curves", "12AX77");
    assertEquals(2, trial.status());
    assertTrue(trial.err().contains("12AX77") && trial.err().contains("12AX7"), trial.err());
  }

  @Test
  void sheetSaysWhereItLiesAndNeverOverwritesItsInput() throws IOException {
    Path pdf = folder.resolve("sheet.pdf");
    CommandTrial trial = CommandTrial.of("sheet", EXAMPLE, "-o", pdf.toString());
    assertEquals(0, trial.status(), trial.err());
    assertTrue(trial.out().contains(pdf.toString()), trial.out());
    byte[] start = java.util.Arrays.copyOf(Files.readAllBytes(pdf), 5);
    assertEquals("%PDF-", new String(start, StandardCharsets.US_ASCII));
    Path copy = Files.copy(Path.of(EXAMPLE), folder.resolve("mine.toml"));
    byte[] before = Files.readAllBytes(copy);
    CommandTrial over = CommandTrial.of("sheet", copy.toString(), "-o", copy.toString());
    assertEquals(2, over.status(), over.err());
    assertArrayEquals(before, Files.readAllBytes(copy));
  }

  @Test
  void exampleReportsAndWritesItsSheet() {
    CommandTrial trial = CommandTrial.of("example", "--to", folder.toString());
    assertEquals(0, trial.status(), trial.err());
    assertTrue(trial.out().contains("Build sheet: "), trial.out());
    assertTrue(Files.exists(folder.resolve("line-stage.pdf")));
  }

  @Test
  void helpHasExamplesForEveryCommand() {
    for (String command : new String[] {"check", "sheet", "curves", "example", "completion"}) {
      CommandTrial trial = CommandTrial.of(command, "--help");
      assertEquals(0, trial.status(), command);
      assertTrue(trial.out().contains("xample"), command);
    }
  }

  @Test
  void completionNamesTheCommands() {
    String script = CommandTrial.of("completion").out();
    assertTrue(script.contains("check") && script.contains("curves"));
  }

  @Test
  void anUnknownCommandIsBadInput() {
    assertEquals(2, CommandTrial.of("chekc").status());
  }
}
