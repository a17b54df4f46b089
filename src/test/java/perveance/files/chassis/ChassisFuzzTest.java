package perveance.files.chassis;

import static org.junit.jupiter.api.Assertions.assertTrue;

import java.io.IOException;
import java.nio.charset.StandardCharsets;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.ArrayList;
import java.util.List;
import java.util.Random;
import java.util.stream.Stream;
import org.junit.jupiter.api.Test;
import perveance.engine.base.BadInputException;
import perveance.engine.base.Problem;
import perveance.engine.stage.Chassis;
import perveance.files.device.DeviceFiles;
import perveance.files.device.DeviceReader;
import perveance.files.toml.SourceText;

/**
 * Seeded damage to sound files, byte by byte and piece by piece: they are read or refused, and
 * nothing else ever happens; what is read can be saved and is read again the same.
 */
class ChassisFuzzTest {
  private static final int TEXTS = 4000;
  private static final long SEED = 1_904L;

  private static final String[] PIECES = {
    "[[stage]]",
    "[stage]",
    "[supply.A]",
    "[supply]",
    "[conditions]",
    "ref = \"V1a\"",
    "kind = 3",
    "anode_load = -1",
    "\"\"",
    "\"",
    "'",
    "\"\"\"",
    "#",
    "\n",
    "\r\n",
    "=",
    ".",
    ",",
    "[",
    "]",
    "{",
    "}",
    "nan",
    "inf",
    "-inf",
    "1e400",
    "1e308",
    "0",
    "-0",
    "99999999999999999999",
    "true",
    "\\",
    "\\u",
    "\u00B5",
    "\u0000",
    "\uFEFF",
    "1e-400",
    "drives = \"V1a\"",
    "supply = \"Q\"",
    "from = \"B\"",
    "device = \"12AX7\"",
    "device = \"\"",
    "4k7",
    "\"4k7\"",
    "\"1e999\"",
    "\"\u221E\"",
    "k",
    "V"
  };

  @Test
  void damagedChassisAreReadOrRefused() throws IOException {
    List<String> sound = new ArrayList<>(List.of(Samples.THREE_STAGES));
    for (Path example : examples()) {
      sound.add(Files.readString(example, StandardCharsets.UTF_8));
    }
    Random random = new Random(SEED);
    int read = 0;
    for (int i = 0; i < TEXTS; i++) {
      byte[] bytes = damaged(sound.get(i % sound.size()), random);
      read += readsOrIsRefused(bytes) ? 1 : 0;
    }
    int sure = read;
    // harmless damage, in a comment or a number, must not be refused
    assertTrue(sure > TEXTS / 50, () -> sure + " of " + TEXTS + " were read");
    assertTrue(sure < TEXTS * 9 / 10, () -> sure + " of " + TEXTS + " were read");
  }

  @Test
  void damagedDevicesAreReadOrRefused() throws IOException {
    String sound = Files.readString(Path.of("device-curves", "12ax7.toml"), StandardCharsets.UTF_8);
    Random random = new Random(SEED);
    for (int i = 0; i < TEXTS; i++) {
      byte[] bytes = damaged(sound, random);
      try {
        DeviceReader.read(SourceText.decode("d.toml", bytes));
      } catch (BadInputException e) {
        tellsEverything(e, "d.toml");
      }
    }
  }

  private static boolean readsOrIsRefused(byte[] bytes) {
    try {
      SourceText source = SourceText.decode("a.toml", bytes);
      Chassis chassis = new ChassisReader(Samples.LIBRARY).read(source);
      String fresh = ChassisWriter.fresh(chassis);
      Chassis again = new ChassisReader(Samples.LIBRARY).read(SourceText.of("f.toml", fresh));
      assertTrue(again.equals(chassis), fresh);
      return true;
    } catch (BadInputException e) {
      tellsEverything(e, "a.toml");
      return false;
    }
  }

  private static void tellsEverything(BadInputException e, String file) {
    for (Problem problem : e.problems()) {
      String message = problem.message();
      assertTrue(problem.file().equals(file), message);
      assertTrue(!problem.found().isBlank() && !problem.expected().isBlank(), message);
      assertTrue(message.length() < 1500, message);
      assertTrue(message.chars().noneMatch(Character::isISOControl), message);
    }
    // all but the counted rest of very many problems have a line
    long without = e.problems().stream().filter(p -> p.line().isEmpty()).count();
    assertTrue(without <= 1, e.getMessage());
  }

  private static byte[] damaged(String text, Random random) {
    StringBuilder out = new StringBuilder(text);
    int edits = 1 + random.nextInt(3);
    for (int i = 0; i < edits; i++) {
      int at = random.nextInt(out.length() + 1);
      int to = Math.min(out.length(), at + random.nextInt(12));
      switch (random.nextInt(4)) {
        case 0 -> out.delete(at, to);
        case 1 -> out.insert(at, PIECES[random.nextInt(PIECES.length)]);
        case 2 -> out.replace(at, to, PIECES[random.nextInt(PIECES.length)]);
        default -> out.insert(random.nextInt(out.length() + 1), out.substring(at, to));
      }
    }
    byte[] bytes = out.toString().getBytes(StandardCharsets.UTF_8);
    if (random.nextInt(10) == 0) {
      bytes[random.nextInt(bytes.length)] = (byte) random.nextInt(256);
    }
    return bytes;
  }

  private static List<Path> examples() throws IOException {
    Path folder = Path.of("examples");
    if (!Files.isDirectory(folder)) {
      return List.of();
    }
    ChassisReader reader = new ChassisReader(new DeviceFiles(List.of()));
    try (Stream<Path> files = Files.walk(folder)) {
      return files
          .filter(f -> f.toString().endsWith(".toml"))
          .filter(f -> isChassis(reader, f))
          .sorted()
          .toList();
    }
  }

  private static boolean isChassis(ChassisReader reader, Path file) {
    try {
      reader.read(file);
      return true;
    } catch (BadInputException e) {
      return false;
    }
  }
}
