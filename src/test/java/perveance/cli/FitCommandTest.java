package perveance.cli;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.io.IOException;
import java.nio.file.Files;
import java.nio.file.Path;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.io.TempDir;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;

/** From a table of readings, or a device file's evidence, to a law and a device file. */
class FitCommandTest {
  /** A device as a person would write it down, with a comment and sources of its own. */
  private static final String DEVICE =
      """
      perveance_device = 1
      type = "X-1"                  # no marking but this
      kind = "triode"
      base = "octal"
      pins = ["3 a", "5 g", "8 k"]
      base_source = "traced with a meter"

      [[rating]]
      system = "design-centre"
      anode_voltage = "300 V"
      source = "a type of the same size"
      confidence = "low"

      [[evidence]]
      anode_voltage = "250 V"
      grid_voltage = "-8 V"
      anode_current = "9 mA"
      mu = 20
      gm = "2.6 mA/V"
      source = "own readings"
      """;

  /**
   * Readings computed from the three-halves law of one triode, I = G (Vg + Vc + Va / mu)^(3/2) with
   * G = 1.6 mA V^-1.5, Vc = 0.6 V, mu = 20, rounded to three figures, as a person would read them:
   * decimal commas, a column for each meter. The seventh is a slip, 13.1 written for 1.31.
   */
  private static final String READINGS =
      """
      plate volts; grid volts; plate mA
      100; 0; 21,2
      100; -1; 15,8
      150; -2; 24,2
      150; -4; 13,3
      200; -6; 15,8
      200; -8; 6,69
      200; -9,7; 13,1
      250; -8; 18,5
      250; -10; 8,80
      250; -11; 4,87
      """;

  private static final String SLIP =
      "Distrusted: 200 V / \u22129.70 V, 90 % off; it was given little weight. Measure it again.";

  @TempDir Path folder;

  private Path file(String name, String text) throws IOException {
    return Files.writeString(folder.resolve(name), text);
  }

  /** Derived: the law behind the readings, within what three figures and a spread of zero allow. */
  @Test
  void readingsGiveTheLawBehindThemAndTheSlipIsNamed() throws IOException {
    Path law = folder.resolve("mine.toml");
    Path picture = folder.resolve("mine.svg");
    CommandTrial trial =
        CommandTrial.of(
            "fit",
            file("mine.csv", READINGS).toString(),
            "-o",
            law.toString(),
            "--picture",
            picture.toString());
    assertEquals(0, trial.status(), trial.err());
    assertTrue(
        trial.out().replaceAll("\\s+", " ").contains(" at worst without what is distrusted"),
        trial.out());
    assertTrue(trial.out().lines().anyMatch(l -> l.equals(SLIP)), trial.out());
    assertTrue(Files.readString(picture).contains("<svg"));
    String curves = CommandTrial.of("curves", "mine", "--devices", folder.toString()).out();
    assertTrue(curves.startsWith("anode_V,anode_A at grid 0 V,"), curves);
    String found = Files.readString(law);
    assertEquals(20, 1 / value(found, "penetration"), 1.0, found);
  }

  private static double value(String text, String key) {
    return text.lines()
        .filter(l -> l.startsWith(key + " = "))
        .mapToDouble(l -> Double.parseDouble(l.substring(key.length() + 3)))
        .findFirst()
        .orElseThrow();
  }

  @Test
  void aDeviceFileKeepsWhatItsWriterPutThere() throws IOException {
    Path source = file("x1.toml", DEVICE);
    Path law = folder.resolve("x1-law.toml");
    CommandTrial trial = CommandTrial.of("fit", source.toString(), "-o", law.toString());
    assertEquals(0, trial.status(), trial.err());
    assertTrue(trial.out().contains("Assumed: the evidence does not fix the spread"), trial.out());
    String text = Files.readString(law);
    assertTrue(text.startsWith(DEVICE), text);
    assertTrue(text.contains("[law]") && text.contains("[fit]") && text.contains("[validity]"));
  }

  /**
   * Published: 12AX7, 250 V, -2 V, 1.2 mA (RCA Receiving Tube Manual, from memory). A valve that
   * passes 0.9 mA there conducts 75 % of typical; the law meets the published point within 1 %.
   */
  @Test
  void aValveIsToldInPercentOfTypical() throws IOException {
    Path reading = file("r.csv", "Va [V], Vg [V], Ia [mA]\n250, -2, 0.9\n");
    CommandTrial trial = CommandTrial.of("fit", reading.toString(), "--valve", "ecc83");
    assertEquals(0, trial.status(), trial.err());
    assertTrue(trial.out().matches("(?s).*\\b7[456](\\.\\d)? %.*"), trial.out());
  }

  @ParameterizedTest
  @CsvSource(
      delimiter = '|',
      value = {
        "Va, Vg, Ia\\n250, -2, 1.2\\n | 2 | without a unit, expected a unit in the header",
        "Va, Vg, glow\\n250, -2, 1\\n | 2 | 1: header: found \"glow\", expected Va, Vg, Ia",
        "Va, Vg, Ia [mA]\\n250, -2\\n | 2 | 2:",
        "Va, Vg, Ia [mA]\\n250, -2, none\\n | 2 | 2: anode_current",
        "Va, Vg, Ia [mA]\\n | 2 | expected",
      })
  void readingsThatCannotBeUsedAreRefusedByLine(String text, int status, String told)
      throws IOException {
    Path readings = file("bad.csv", text.replace("\\n", "\n"));
    CommandTrial trial = CommandTrial.of("fit", readings.toString());
    assertEquals(status, trial.status(), trial.out());
    assertTrue(trial.err().contains(told), trial.err());
    assertTrue(trial.err().contains("bad.csv"), trial.err());
  }
}
