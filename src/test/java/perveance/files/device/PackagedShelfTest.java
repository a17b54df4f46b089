package perveance.files.device;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.io.IOException;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.List;
import java.util.zip.ZipEntry;
import java.util.zip.ZipOutputStream;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.io.TempDir;
import perveance.engine.base.BadInputException;

/** The program's own device files, as they lie in its jar and as they lie beside its classes. */
class PackagedShelfTest {
  private static final Path OURS = Path.of("device-curves");

  @TempDir private Path folder;

  private Path jar() throws IOException {
    Path jar = folder.resolve("perveance 1.0.jar");
    try (ZipOutputStream out = new ZipOutputStream(Files.newOutputStream(jar))) {
      out.putNextEntry(new ZipEntry("perveance/Other.class"));
      for (Path file : DeviceFilesTest.tomlFiles(OURS)) {
        out.putNextEntry(new ZipEntry("perveance/device-curves/" + file.getFileName()));
        out.write(Files.readAllBytes(file));
      }
    }
    return jar;
  }

  @Test
  void aJarAndAFolderHoldTheSame() throws IOException, BadInputException {
    Shelf packed = PackagedShelf.at(jar());
    Shelf loose = PackagedShelf.find();
    List<String> files = packed.files();
    assertEquals(
        DeviceFilesTest.tomlFiles(OURS).stream().map(f -> f.getFileName().toString()).toList(),
        files);
    assertEquals(files, loose.files());
    for (String file : files) {
      assertEquals(loose.read(file), packed.read(file));
      assertEquals(loose.readHead(file, 100), packed.readHead(file, 100));
    }
    assertTrue(packed.read("none.toml").isEmpty());
    assertTrue(loose.read("none.toml").isEmpty());
  }

  @Test
  void messagesNameTheFileAsTheProjectDoes() throws IOException, BadInputException {
    for (Shelf shelf : List.of(PackagedShelf.at(jar()), PackagedShelf.find())) {
      assertEquals("device-curves/12ax7.toml", shelf.read("12ax7.toml").orElseThrow().file());
    }
  }

  @Test
  void namesAreToldFromTheTopWithoutTheRest() {
    String text =
        "a = 1\ntype = \"T\"\npins = [\"1 a\",\n  \"2 g\"]\naliases = [\"A\",\n  \"B\"]\nb = 2\n"
            + "[[evidence]]\ntype = \"U\"\n";
    assertEquals(
        "\ntype = \"T\"\n\n\naliases = [\"A\",\n  \"B\"]\n\n", DeviceNames.namesAlone(text));
    assertEquals("type = \"T\"", DeviceNames.namesAlone("type = \"T\""));
    assertEquals("", DeviceNames.namesAlone(""));
  }
}
