package perveance.cli;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertFalse;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.io.IOException;
import java.nio.charset.StandardCharsets;
import java.nio.file.Files;
import java.nio.file.Path;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.io.TempDir;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.ValueSource;

/** The report, the picture and the object of {@code geometry}. */
class GeometryCommandTest {
  private static final String TRIODE = "examples/geometry/plane-triode.toml";

  @TempDir Path folder;

  @Test
  void theReportTellsTheConstantsAndThePoint() {
    CommandTrial trial = CommandTrial.of("geometry", TRIODE);
    assertEquals(0, trial.status(), trial.err());
    for (String words :
        new String[] {
          "amplification factor mu",
          "35.46",
          "14.4 mA",
          "7.075 mA/V",
          "potential minimum",
          "A/cm\u00b2"
        }) {
      assertTrue(trial.out().contains(words), words + " in\n" + trial.out());
    }
  }

  @ParameterizedTest
  @ValueSource(strings = {"potential", "field", "density", "speed"})
  void thePictureShowsWhatIsAskedFor(String show) throws IOException {
    Path svg = folder.resolve(show + ".svg");
    CommandTrial trial = CommandTrial.of("geometry", TRIODE, "--show", show, "-o", svg.toString());
    assertEquals(0, trial.status(), trial.err());
    String picture = Files.readString(svg, StandardCharsets.UTF_8);
    assertTrue(picture.contains("distance from the cathode, mm"));
    assertEquals(
        show.equals("potential") || show.equals("field"), picture.contains("without space charge"));
  }

  @Test
  void theObjectNamesItsUnits() {
    String object = CommandTrial.of("geometry", TRIODE, "--json").out();
    for (String name : new String[] {"\"mu\"", "\"gm_S\"", "\"emission_A\"", "\"distance_m\""}) {
      assertTrue(object.contains(name), name);
    }
    assertFalse(object.contains("NaN") || object.contains("null"));
  }

  @Test
  void aTriodeThatIsCutOffSaysSoAndHasNoPicture() throws IOException {
    Path cutOff = folder.resolve("cut-off.toml");
    Files.writeString(cutOff, Files.readString(Path.of(TRIODE)).replace("\"-4 V\"", "\"-40 V\""));
    CommandTrial trial = CommandTrial.of("geometry", cutOff.toString());
    assertEquals(0, trial.status(), trial.err());
    assertTrue(trial.out().contains("Cut off"), trial.out());
    Path picture = folder.resolve("none.svg");
    assertEquals(
        2, CommandTrial.of("geometry", cutOff.toString(), "-o", picture.toString()).status());
    assertFalse(Files.exists(picture));
  }

  @Test
  void anotherEndingIsRefusedAndTheInputIsKept() throws IOException {
    assertEquals(2, CommandTrial.of("geometry", TRIODE, "-o", "x.pdf").status());
    Path copy = folder.resolve("own.svg");
    Files.copy(Path.of(TRIODE), copy);
    assertEquals(2, CommandTrial.of("geometry", copy.toString(), "-o", copy.toString()).status());
    assertEquals(Files.readString(Path.of(TRIODE)), Files.readString(copy));
  }
}
