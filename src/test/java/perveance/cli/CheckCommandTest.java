package perveance.cli;

import static org.junit.jupiter.api.Assertions.assertAll;
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

/** The check command as a person at a terminal meets it. */
class CheckCommandTest {
  private static final String EXAMPLE = "examples/line-stage.toml";

  @TempDir Path folder;

  @Test
  void theReportSaysWhatItIsAndWhoDecides() {
    CommandTrial trial = CommandTrial.of("check", EXAMPLE);
    assertAll(
        () -> assertEquals(0, trial.status(), trial.err()),
        () -> assertTrue(trial.out().startsWith("Line stage, Kestrel Lane Workshop")),
        () -> assertTrue(trial.out().contains("can kill, also after switch-off")),
        () -> assertTrue(trial.out().contains("Local electrical")),
        () -> assertTrue(trial.out().contains("V1a  common cathode, 12AX7")),
        () -> assertTrue(trial.out().contains("ended by grid current")),
        () -> assertEquals("", trial.err()));
  }

  /** A folder of the user's in which two files claim one name, and one has a fault. */
  @Test
  void faultsOfTheUsersOwnDeviceFilesAreToldAndHarmNothing() throws IOException {
    String sound = Files.readString(Path.of("device-curves", "12au7.toml"));
    Files.writeString(folder.resolve("a.toml"), sound.replace("12AU7", "A1"));
    Files.writeString(folder.resolve("b.toml"), sound.replace("12AU7", "B1"));
    Files.writeString(folder.resolve("c.toml"), "perveance_device = 1\ntype = \"C1\"\nkind = 7\n");
    CommandTrial trial = CommandTrial.of("check", "--devices", folder.toString(), EXAMPLE);
    assertEquals(0, trial.status(), trial.err());
    assertTrue(trial.err().lines().allMatch(l -> l.startsWith("Device files: ")), trial.err());
    assertTrue(
        trial.err().contains("b.toml:3: aliases: found \"ECC82\" a second time"), trial.err());
    assertTrue(trial.err().contains("c.toml:3: kind: found"), trial.err());
    assertTrue(trial.out().startsWith("Line stage"), trial.out());
  }

  /** Stages in a row are told with their levels, in words and for machines. */
  @Test
  void theSignalPathIsTold() {
    String out = CommandTrial.of("check", "examples/phono-stage.toml").out();
    assertTrue(out.contains("V1b overloads first, by grid current"), out);
    assertTrue(out.contains("V1a  gain \u221269.3  31.6 mV in, 2.19 V out"), out);
    String json = CommandTrial.of("check", "--json", "examples/phono-stage.toml").out();
    assertTrue(json.contains("\"clips_first\" : \"V1b\""), json);
    assertTrue(json.contains("\"imd_smpte\""), json);
    assertTrue(json.contains("\"low_3dB_Hz\" : ["), json);
  }

  @Test
  void noLineIsWiderThanAHundredColumns() {
    CommandTrial trial = CommandTrial.of("check", "--explain", EXAMPLE);
    trial.out().lines().forEach(l -> assertTrue(l.length() <= 100, l));
  }

  @Test
  void coloursAndControlSignsStayAwayFromAPipe() {
    assertFalse(CommandTrial.of("check", EXAMPLE).out().contains("\u001b"));
  }

  @Test
  void americanWordsReplaceBritishOnes() {
    String out = CommandTrial.of("check", "--words", "american", EXAMPLE).out();
    assertTrue(out.contains("plate current"));
    assertFalse(out.matches("(?s).*\\banode\\b.*current.*"));
  }

  @Test
  void explainShowsTheUsersNumbers() {
    String out = CommandTrial.of("check", "--explain", EXAMPLE).out();
    assertTrue(out.contains("Ia = (Vb - Va) / Ra"), out);
    assertTrue(out.contains("/ 100 k"), out);
  }

  @Test
  void everyProblemIsToldAtOnceWithItsLine() throws IOException {
    Path file =
        write(
            "bad.toml",
            Files.readString(Path.of(EXAMPLE))
                .replace("12AX7\"\n", "12AX9\"\n")
                .replace("anode_load = \"100k\"", "anode_laod = \"100 V\"")
                .replace("coupling = \"22n\"", "coupling = \"-22n\""));
    CommandTrial trial = CommandTrial.of("check", file.toString());
    assertAll(
        () -> assertEquals(2, trial.status()),
        () -> assertEquals("", trial.out()),
        () -> assertTrue(trial.err().contains("bad.toml"), trial.err()),
        () -> assertTrue(trial.err().contains("12AX9"), trial.err()),
        () -> assertTrue(trial.err().contains("anode_laod"), trial.err()),
        () -> assertTrue(trial.err().contains("anode_load"), trial.err()),
        () -> assertTrue(trial.err().contains("-22n"), trial.err()),
        () -> assertFalse(trial.err().contains("\tat "), trial.err()));
  }

  @ParameterizedTest
  @ValueSource(strings = {"", "perveance = 2", "[[[[[[", "title = \"\\uD800\"", "a = 1e400"})
  void rubbishIsRefusedWithoutATrace(String text) throws IOException {
    CommandTrial trial = CommandTrial.of("check", write("rubbish.toml", text).toString());
    assertEquals(2, trial.status(), trial.err());
    assertFalse(trial.err().contains("\tat "), trial.err());
    assertFalse(trial.err().contains("Exception"), trial.err());
  }

  @Test
  void aBinaryAWrongEncodingAndAHugeFileAreRefused() throws IOException {
    Path binary = folder.resolve("binary.toml");
    Files.write(binary, new byte[] {0, 1, 2, (byte) 0xff, (byte) 0xfe, 0, 7});
    Path latin = folder.resolve("latin.toml");
    Files.write(latin, "title = \"caf\u00e9\"".getBytes(StandardCharsets.ISO_8859_1));
    Path huge = folder.resolve("huge.toml");
    Files.writeString(huge, "# filler\n".repeat(1_200_000));
    for (Path file : new Path[] {binary, latin, huge}) {
      CommandTrial trial = CommandTrial.of("check", file.toString());
      assertEquals(2, trial.status(), file + trial.err());
      assertEquals(1, trial.err().lines().count(), file + trial.err());
    }
  }

  @Test
  void aMissingFileIsToldByName() {
    CommandTrial trial = CommandTrial.of("check", folder.resolve("nowhere.toml").toString());
    assertEquals(2, trial.status());
    assertTrue(trial.err().contains("nowhere.toml"), trial.err());
  }

  @Test
  void jsonIsOneObjectOnTheContractsNames() {
    String out = CommandTrial.of("check", "--json", EXAMPLE).out();
    assertTrue(out.startsWith("{"), out);
    for (String name :
        new String[] {
          "\"operating_point\"", "\"anode_chassis_V\"", "\"gm_S\"", "\"ra_ohm\"", "\"clean\"",
          "\"limited_by\"", "\"driven\"", "\"thd\"", "\"levels\"", "\"findings\""
        }) {
      assertTrue(out.contains(name), name);
    }
    assertFalse(out.contains("NaN"));
    assertFalse(out.contains("null"));
  }

  private Path write(String name, String text) throws IOException {
    return Files.writeString(folder.resolve(name), text);
  }
}
