package perveance.desktop;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertFalse;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.io.IOException;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.List;
import java.util.Optional;
import javafx.scene.Node;
import javafx.scene.control.Button;
import javafx.scene.control.MenuItem;
import javafx.scene.input.KeyCode;
import javafx.scene.input.KeyEvent;
import org.junit.jupiter.api.AfterEach;
import org.junit.jupiter.api.BeforeEach;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.io.TempDir;
import perveance.desktop.view.WindowProbe;
import perveance.desktop.viewmodel.Asking;
import perveance.engine.stage.StageEntry;
import perveance.engine.stage.Supply;

/** Stages and supply nodes as a list, and the document that they stand in. */
class ChassisListTest {
  @TempDir private Path folder = Path.of("");

  private OpenWindow window;

  @BeforeEach
  void open() {
    window = OpenWindow.open(folder);
  }

  @AfterEach
  void close() {
    window.close();
  }

  private List<String> stages() {
    return Toolkit.on(
        () -> window.desk.bench().chassis().stages().stream().map(StageEntry::ref).toList());
  }

  private void menu(String row, String words) {
    Button button = (Button) window.find(row);
    Toolkit.run(
        () ->
            button.getContextMenu().getItems().stream()
                .filter(i -> words.equals(i.getText()))
                .findFirst()
                .map(MenuItem.class::cast)
                .orElseThrow()
                .fire());
  }

  @Test
  void stagesAreDuplicatedMovedRenamedAndRemoved() {
    menu("#stage-V1a", "Duplicate");
    String copy = stages().get(1);
    assertEquals(List.of("V1a", copy), stages());
    menu("#stage-" + copy, "Move up");
    assertEquals(List.of(copy, "V1a"), stages());
    window.answers.word = Optional.of("V7");
    menu("#stage-" + copy, "Rename\u2026");
    assertEquals(List.of("V7", "V1a"), stages());
    menu("#stage-V7", "Remove");
    assertEquals(List.of("V1a"), stages());
    for (int i = 0; i < 4; i++) {
      Toolkit.run(() -> ((Button) window.find("#undo")).fire());
    }
    assertEquals(List.of("V1a"), stages());
    assertFalse(Toolkit.on(() -> window.desk.bench().modified().get()), "all is undone");
  }

  @Test
  void stagesAreMovedAndRenamedByKeys() {
    window.action("Duplicate the stage");
    String copy = stages().get(1);
    Node row = window.find("#stage-" + copy);
    Toolkit.run(
        () ->
            row.fireEvent(
                new KeyEvent(KeyEvent.KEY_PRESSED, "", "", KeyCode.UP, false, false, true, false)));
    assertEquals(List.of(copy, "V1a"), stages());
    window.answers.word = Optional.of("V9");
    Node moved = window.find("#stage-" + copy);
    Toolkit.run(() -> moved.fireEvent(OpenWindow.key(KeyCode.F2)));
    assertEquals(List.of("V9", "V1a"), stages());
  }

  @Test
  void aSupplyNodeIsRenamedWithTheStagesThatItFeeds() {
    window.answers.word = Optional.of("HT");
    menu("#supply-A", "Rename\u2026");
    assertEquals("HT", window.setting("supply"));
    assertEquals(
        List.of("HT"),
        window.desk.bench().chassis().supplies().stream().map(Supply::name).toList());
  }

  @Test
  void aFileLetFallOnTheWindowIsOpened() throws IOException {
    Path file = folder.resolve("dropped.toml");
    Files.copy(Path.of("examples/pentode-input.toml"), file);
    Toolkit.run(() -> WindowProbe.drop(window.main, List.of(file.toFile())));
    assertEquals(Optional.of(file.toAbsolutePath()), window.desk.document().file());
    assertEquals("V1", window.answer().ref());
  }

  @Test
  void unsavedChangesAreAskedAboutBeforeAnotherFileIsOpened() {
    window.type("V1a.anode_load", "120k");
    Path other = Path.of("examples/pentode-input.toml");
    Toolkit.run(() -> window.main.open(other));
    assertEquals("V1a", window.answer().ref(), "the person stays");
    window.answers.unsaved = Asking.Unsaved.SAVE;
    window.answers.write = Optional.of(folder.resolve("kept.toml"));
    Toolkit.run(() -> window.main.open(other));
    assertTrue(Files.exists(folder.resolve("kept.toml")), "saved before it was left");
    assertEquals("V1", window.answer().ref());
  }

  @Test
  void anUnsavedChassisIsOfferedAfterAKill() throws IOException {
    window.type("V1a.anode_load", "150k");
    Toolkit.run(
        () -> {
          try {
            window.desk.document().keep();
          } catch (perveance.desktop.viewmodel.DocumentException e) {
            throw new AssertionError(e);
          }
        });
    try (var kept = Files.list(folder.resolve("recovery"))) {
      Path left = kept.findFirst().orElseThrow();
      Files.writeString(
          left, Files.readString(left).replaceFirst("# process: \\d+", "# process: 99999999"));
    }
    OpenWindow next = OpenWindow.open(folder);
    next.answers.choice = Optional.of(0);
    Toolkit.run(next.main::offerRecovery);
    assertTrue(next.answers.asked.get(0).contains("Unsaved changes"), next.answers.asked.get(0));
    assertEquals("150k", next.setting("anode_load"));
    next.close();
  }
}
