package perveance.files.device;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertSame;
import static org.junit.jupiter.api.Assertions.assertThrows;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.io.IOException;
import java.nio.charset.StandardCharsets;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.List;
import java.util.Locale;
import java.util.stream.Stream;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.io.TempDir;
import perveance.engine.base.BadInputException;
import perveance.engine.base.Problem;
import perveance.engine.device.Device;
import perveance.files.toml.SourceText;

/** Finding devices by any of their names, in the user's folder first. */
class DeviceFilesTest {
  private static final Path OURS = Path.of("device-curves");

  @TempDir private Path folder;

  @Test
  void everyFileOfOursLoadsIsNamedAfterItsTypeAndClaimsNamesAlone()
      throws IOException, BadInputException {
    DeviceFiles library = new DeviceFiles(List.of());
    List<Path> files = tomlFiles(OURS);
    assertTrue(files.size() >= 8, files.toString());
    for (Path file : files) {
      Device device = DeviceReader.read(SourceText.read(file));
      String name = device.type().toLowerCase(Locale.ROOT).replace('/', '-') + ".toml";
      assertEquals(name, file.getFileName().toString());
      assertEquals(device.type(), library.load(device.type()).orElseThrow().type());
      for (String alias : device.aliases()) {
        assertEquals(device.type(), library.load(alias).orElseThrow().type(), alias);
      }
    }
    assertEquals(List.of(), library.problems());
    assertTrue(library.names().containsAll(List.of("12AX7", "ECC83")));
  }

  @Test
  void namesAreFoundWhateverTheirCaseSpacesAndHyphens() {
    DeviceFiles library = new DeviceFiles(List.of());
    Device expected = library.find("12AX7").orElseThrow();
    for (String name : List.of("12ax7", " 12AX7 ", "12-AX-7", "ecc83", "ECC 83", "12AX7/ECC83")) {
      assertSame(expected, library.find(name).orElseThrow(), name);
    }
    for (String name : List.of("", "12AX", "../12ax7", "no such valve", "/", "a\\b")) {
      assertTrue(library.find(name).isEmpty(), name);
    }
  }

  @Test
  void theUsersFileComesBeforeOurs() throws IOException, BadInputException {
    String ours = Files.readString(OURS.resolve("12ax7.toml"), StandardCharsets.UTF_8);
    write("mine.toml", ours.replace("sections = 2", "sections = 1"));
    DeviceFiles library = new DeviceFiles(List.of(folder));
    assertEquals(1, library.load("ECC83").orElseThrow().sections());
    assertEquals(List.of(), library.problems());
  }

  @Test
  void aBrokenFileIsToldWhenItsDeviceIsAskedForAndHarmsNoOther()
      throws IOException, BadInputException {
    write("mine.toml", "perveance_device = 1\ntype = \"MINE\"\nkind = \"trode\"\n");
    DeviceFiles library = new DeviceFiles(List.of(folder));
    BadInputException refusal = assertThrows(BadInputException.class, () -> library.load("mine"));
    assertEquals(
        List.of(1, 1, 1, 3), refusal.problems().stream().map(p -> p.line().orElseThrow()).toList());
    assertTrue(library.find("mine").isEmpty());
    assertTrue(library.find("12AX7").isPresent());
  }

  @Test
  void aNameClaimedByTwoFilesOfOneFolderIsToldWithBothPlaces() throws IOException {
    write("a.toml", "type = \"A1\"\naliases = [\"X\"]\n");
    write("b.toml", "type = \"B1\"\n\naliases = [\"x\"]\n");
    List<Problem> problems = new DeviceFiles(List.of(folder)).problems();
    assertEquals(1, problems.size());
    String message = problems.get(0).message();
    assertTrue(message.contains("b.toml:3: aliases: found \"x\" a second time"), message);
    assertTrue(message.contains("a.toml claims it in line 2"), message);
  }

  @Test
  void aFolderThatIsNotThereIsEmpty() {
    DeviceFiles library = new DeviceFiles(List.of(folder.resolve("none")));
    assertTrue(library.find("12AX7").isPresent());
  }

  private void write(String name, String text) throws IOException {
    Files.writeString(folder.resolve(name), text, StandardCharsets.UTF_8);
  }

  static List<Path> tomlFiles(Path folder) throws IOException {
    try (Stream<Path> files = Files.list(folder)) {
      return files.filter(f -> f.toString().endsWith(".toml")).sorted().toList();
    }
  }
}
