package perveance.desktop;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertFalse;
import static org.junit.jupiter.api.Assertions.assertThrows;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.io.IOException;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.List;
import java.util.Optional;
import javafx.beans.property.SimpleObjectProperty;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.io.TempDir;
import perveance.app.Edit;
import perveance.desktop.viewmodel.Desk;
import perveance.desktop.viewmodel.Desks;
import perveance.desktop.viewmodel.DocumentException;
import perveance.desktop.viewmodel.Documents;
import perveance.desktop.viewmodel.Settings;

/** Files behind a desk: saving, restoring after a kill, settings. No toolkit is started. */
class DocumentTest {
  @TempDir private Path folder = Path.of("");

  private Desk desk() {
    return Wiring.desk(
        folder.resolve("home"),
        new SimpleObjectProperty<>(Settings.USUAL),
        new Answers(),
        new Desks(Runnable::run, Runnable::run, Runnable::run));
  }

  /** The text of a recovery file is what a killed program leaves; here it is left by hand. */
  @Test
  void whatAKilledProgramLeftIsRestoredAsAnUndoableEdit() throws DocumentException, IOException {
    Desk first = desk();
    Path file = folder.resolve("amplifier.toml");
    first.document().saveAs(file);
    first.bench().edit(new Edit.SetTitle("After the last save"));
    first.document().keep();
    Path kept = only(folder.resolve("home").resolve("recovery"));
    // a process that no longer runs: its number is beyond any that the system gives
    Files.writeString(
        kept, Files.readString(kept).replaceFirst("# process: \\d+", "# process: 99999999"));

    Desk second = desk();
    List<Documents.Left> left = second.document().documents().left();
    assertEquals(1, left.size());
    assertEquals(Optional.of(file), left.get(0).original());
    second.document().restore(left.get(0));
    assertEquals("After the last save", second.bench().chassis().title());
    assertTrue(second.bench().modified().get(), "it still has to be saved");
    assertEquals(Optional.of(file), second.document().file());
    assertTrue(second.document().documents().left().isEmpty(), "it is not offered twice");
    second.bench().undo();
    assertEquals("Line stage, example", second.bench().chassis().title());
    assertFalse(second.bench().modified().get());
  }

  /** Device files of the user's that claim one name twice are told at the foot, until mended. */
  @Test
  void faultsOfTheUsersDeviceFilesStandAtTheFoot() throws IOException {
    Path devices = Files.createDirectories(folder.resolve("home").resolve("devices"));
    Files.writeString(devices.resolve("a.toml"), "type = \"A1\"\naliases = [\"X\"]\n");
    Files.writeString(devices.resolve("b.toml"), "type = \"B1\"\naliases = [\"x\"]\n");
    Desk desk = desk();
    assertTrue(desk.bench().message().get().contains("b.toml:2: aliases: found \"x\""));
    desk.bench().edit(new Edit.SetTitle("Another"));
    assertTrue(desk.bench().message().get().contains("b.toml:2: aliases: found \"x\""));
  }

  @Test
  void savingForgetsWhatWasKept() throws DocumentException, IOException {
    Desk desk = desk();
    desk.bench().edit(new Edit.SetTitle("Changed"));
    desk.document().keep();
    only(folder.resolve("home").resolve("recovery"));
    desk.document().saveAs(folder.resolve("a.toml"));
    try (var files = Files.list(folder.resolve("home").resolve("recovery"))) {
      assertEquals(0, files.count());
    }
    assertEquals(List.of(folder.resolve("a.toml")), desk.document().documents().recent());
  }

  @Test
  void aFailedSaveKeepsTheOlderFileAndSaysWhatToDo() throws DocumentException, IOException {
    Desk desk = desk();
    Path place = folder.resolve("folder.toml");
    Files.createDirectory(place);
    DocumentException told =
        assertThrows(DocumentException.class, () -> desk.document().saveAs(place));
    assertTrue(told.why().contains("folder"), told.why());
    assertTrue(told.remedy().contains("save again"), told.remedy());
    assertFalse(desk.document().file().isPresent());
  }

  @Test
  void settingsComeBackAndDamagedOnesDoNotStopTheProgram() throws IOException {
    SettingsFile file = new SettingsFile(folder);
    assertEquals(Settings.USUAL, file.load());
    Settings set = Settings.USUAL.withDark(true).withTextSize(1.3).withConditions(60, 1e6);
    assertTrue(file.save(set));
    assertEquals(set, file.load());
    Files.writeString(folder.resolve("settings.properties"), "text-size = huge\nmeter = -1\n");
    assertEquals(Settings.USUAL, file.load());
  }

  private static Path only(Path folder) throws IOException {
    try (var files = Files.list(folder)) {
      List<Path> all = files.toList();
      assertEquals(1, all.size(), all.toString());
      return all.get(0);
    }
  }
}
