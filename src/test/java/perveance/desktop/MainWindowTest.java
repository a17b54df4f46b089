package perveance.desktop;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertFalse;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.io.IOException;
import java.nio.charset.StandardCharsets;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.Optional;
import javafx.scene.Node;
import javafx.scene.control.Button;
import javafx.scene.control.ButtonBase;
import javafx.scene.control.Label;
import javafx.scene.input.KeyCode;
import org.junit.jupiter.api.AfterEach;
import org.junit.jupiter.api.BeforeEach;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.io.TempDir;
import perveance.engine.analysis.StageAnswer;

/** A real window, drawn into memory, on its main paths. */
class MainWindowTest {
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

  @Test
  void theExampleIsAnsweredAndTheCautionStands() {
    StageAnswer answer = window.answer();
    assertEquals("V1a", answer.ref());
    String caution = Toolkit.on(() -> ((Label) window.find("#caution")).getText());
    assertTrue(caution.contains("300 V"), caution);
    assertTrue(caution.contains("Local electrical codes"), caution);
  }

  @Test
  void aValueIsEditedOnTheDrawing() {
    window.type("V1a.cathode_resistor", "2k2");
    assertEquals("2k2", window.setting("cathode_resistor"));
    assertEquals(2200, window.number("cathode_resistor"));
    assertFalse(window.shown("#value-editor"), "the editor is closed after a good value");
    assertEquals("edited", Toolkit.on(() -> ((Label) window.find("#edited")).getText()));
  }

  @Test
  void whatCannotBeIsRefusedInWordsAndNothingChanges() {
    window.type("V1a.cathode_resistor", "22 V");
    assertEquals("1k5", window.setting("cathode_resistor"));
    String complaint = Toolkit.on(() -> ((Label) window.find("#value-complaint")).getText());
    assertTrue(complaint.contains("expected"), complaint);
    assertTrue(window.shown("#value-editor"), "the editor stays open");
  }

  @Test
  void arrowsStepAlongTheStandardValues() {
    Node handle = window.part("V1a.anode_load");
    Toolkit.run(() -> handle.fireEvent(OpenWindow.key(KeyCode.UP)));
    assertEquals(110e3, window.number("anode_load"));
    Node again = window.part("V1a.anode_load");
    Toolkit.run(() -> again.fireEvent(OpenWindow.key(KeyCode.DOWN)));
    assertEquals(100e3, window.number("anode_load"));
  }

  @Test
  void theOperatingPointIsDraggedInOneUndoableStep() {
    double before = window.answer().loadLine().orElseThrow().current();
    window.dragPoint(-30, -36);
    double after = window.answer().loadLine().orElseThrow().current();
    assertTrue(after > before * 1.1, before + " A before, " + after + " A after");
    assertTrue(window.number("cathode_resistor") < 1500, "less bias, more current");
    Toolkit.run(() -> ((Button) window.find("#undo")).fire());
    assertEquals("1k5", window.setting("cathode_resistor"));
    assertTrue(Toolkit.on(() -> window.find("#undo").isDisabled()), "one step undoes all of it");
  }

  @Test
  void theLoadMovesInsteadWhenThePersonChoosesSo() {
    Toolkit.run(() -> ((ButtonBase) window.find("#mover-load")).fire());
    window.dragPoint(25, 0);
    assertEquals("1k5", window.setting("cathode_resistor"));
    assertTrue(window.number("anode_load") < 100e3, "a higher anode takes a smaller load");
  }

  @Test
  void aRemedyIsOnePressAndOneUndo() {
    window.set("grid_leak", "10M");
    Optional<Node> remedy = Toolkit.on(() -> Optional.ofNullable(window.findOrNull("#remedy")));
    assertTrue(remedy.isPresent(), "a grid leak far over its limit has a remedy");
    var before = window.settings();
    Toolkit.run(() -> ((Button) remedy.orElseThrow()).fire());
    assertFalse(before.equals(window.settings()), "the remedy changes the stage");
    Toolkit.run(() -> ((Button) window.find("#undo")).fire());
    assertEquals(before, window.settings());
  }

  @Test
  void savingKeepsCommentsAndTellsTroubleInADialog() throws IOException {
    Path file = folder.resolve("mine.toml");
    window.answers.write = Optional.of(file);
    window.action("Save");
    String first = Files.readString(file);
    assertTrue(first.contains("anode_load = \"100k\""), first);
    Files.writeString(file, first.replace("anode_load", "# my comment\nanode_load"));
    Toolkit.run(() -> window.main.open(file));
    window.type("V1a.anode_load", "120k");
    window.action("Save");
    String second = Files.readString(file);
    assertTrue(second.contains("# my comment\nanode_load = \"120k\""), second);

    window.type("V1a.anode_load", "130k");
    window.answers.write = Optional.of(folder.resolve("absent").resolve("x.toml"));
    window.action("Save as\u2026");
    assertEquals(1, window.answers.told.size(), window.answers.told.toString());
    assertTrue(window.answers.told.get(0).contains("not written"), window.answers.told.get(0));
  }

  @Test
  void aBrokenFileIsToldAndTheDocumentStays() throws IOException {
    Path file = folder.resolve("broken.toml");
    Files.writeString(file, "perveance = 1\ntitle = 3\n");
    Toolkit.run(() -> window.main.open(file));
    assertEquals(1, window.answers.told.size());
    assertTrue(window.answers.told.get(0).contains("title"), window.answers.told.get(0));
    assertEquals("V1a", window.answer().ref());
  }

  @Test
  void everythingIsExported() throws IOException {
    export("Print the sheet (PDF)\u2026", "a.pdf", "%PDF");
    export("Export the figures (CSV)\u2026", "a.csv", "stage,valve");
    export("Export this chart (SVG)\u2026", "a.svg", "<?xml");
    export("Export the drawing (SVG)\u2026", "b.svg", "<?xml");
    export("Export this chart (PNG)\u2026", "a.png", "\u0089PNG");
    export("Export the drawing (PNG)\u2026", "b.png", "\u0089PNG");
  }

  private void export(String action, String name, String head) throws IOException {
    Path file = folder.resolve(name);
    window.answers.write = Optional.of(file);
    window.action(action);
    byte[] content = Files.readAllBytes(file);
    String start = new String(content, 0, head.length(), StandardCharsets.ISO_8859_1);
    assertEquals(head, start, action);
    assertTrue(content.length > 200, action + " wrote " + content.length + " bytes");
  }

  @Test
  void unsavedChangesAreAskedAbout() {
    window.type("V1a.anode_load", "120k");
    assertFalse(Toolkit.on(() -> window.main.mayClose()), "the person stays");
    window.answers.unsaved = perveance.desktop.viewmodel.Asking.Unsaved.DISCARD;
    assertTrue(Toolkit.on(() -> window.main.mayClose()), "the person gives them up");
    assertEquals(2, window.answers.asked.size());
  }

  @Test
  void thePointFollowsTheKeyboard() {
    double before = window.answer().loadLine().orElseThrow().current();
    Node view = window.find("#characteristics");
    Toolkit.run(() -> view.fireEvent(OpenWindow.key(KeyCode.UP)));
    assertTrue(window.answer().loadLine().orElseThrow().current() > before);
  }
}
