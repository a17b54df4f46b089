package perveance.desktop;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertFalse;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.nio.file.Path;
import javafx.scene.Node;
import javafx.scene.control.Button;
import javafx.scene.control.Label;
import javafx.scene.control.ListView;
import javafx.scene.control.Slider;
import javafx.scene.control.TextField;
import javafx.scene.control.ToggleButton;
import javafx.scene.input.KeyCode;
import javafx.scene.input.KeyEvent;
import org.junit.jupiter.api.AfterEach;
import org.junit.jupiter.api.BeforeEach;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.io.TempDir;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.ValueSource;
import perveance.desktop.view.WindowProbe;

/** The drawing and the charts under hand and key. */
class DrawingTest {
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

  private double width(String part) {
    Button handle = (Button) window.part(part);
    return Toolkit.on(handle::getPrefWidth);
  }

  @Test
  void theDrawingIsEnlargedAndFittedAgain() {
    double before = width("V1a.anode_load");
    Node part = window.part("V1a.anode_load");
    Toolkit.run(
        () ->
            part.fireEvent(
                new KeyEvent(
                    KeyEvent.KEY_PRESSED, "", "", KeyCode.PLUS, false, true, false, false)));
    assertTrue(width("V1a.anode_load") > 1.1 * before, "it is larger");
    window.action("Fit the drawing");
    assertEquals(before, width("V1a.anode_load"), 1);
  }

  @Test
  void theEndOfTheDcLineMovesTheLoad() {
    window.drag("DC_END", 0, -40);
    assertTrue(window.number("anode_load") < 95e3, "steeper: " + window.setting("anode_load"));
    assertEquals("1k5", window.setting("cathode_resistor"));
  }

  @Test
  void theEndOfTheSwingMovesTheDrive() {
    double before = window.number("drive");
    window.drag("SWING_UP", -12, -18);
    assertTrue(window.number("drive") > 1.2 * before, window.setting("drive"));
  }

  @Test
  void theDriveIsMovedAtTheFoot() {
    Slider slider = (Slider) window.find("#drive");
    Toolkit.run(() -> slider.setValue(0.8));
    assertEquals(0.8, window.number("drive"), 0.01);
  }

  @ParameterizedTest
  @ValueSource(
      strings = {"characteristics", "transfer", "waveform", "distortion", "response", "spread"})
  void everyViewShowsSomething(String view) {
    Toolkit.run(() -> ((ToggleButton) window.find("#tab-" + view)).fire());
    assertTrue(Toolkit.on(() -> WindowProbe.chart(window.main)).isPresent(), view);
  }

  @Test
  void theSpreadOfAnotherFigureIsShown() {
    Toolkit.run(() -> ((ToggleButton) window.find("#tab-spread")).fire());
    String first = Toolkit.on(() -> WindowProbe.chart(window.main).orElseThrow().title());
    Toolkit.run(
        () -> {
          window.stage.getScene().getRoot().applyCss();
          window.stage.getScene().getRoot().layout();
          ((Button) window.find("#spread-gain")).fire();
        });
    assertEquals("V1a anode to chassis", first);
    assertEquals("gain", Toolkit.on(() -> WindowProbe.chart(window.main).orElseThrow().title()));
  }

  @Test
  void theHandSumStandsBesideTheFindingsOnDemand() {
    assertFalse(window.shown("#hand-sum"));
    Toolkit.run(() -> ((Button) window.find("#hand-sums")).fire());
    assertTrue(window.shown("#hand-sum"));
  }

  @Test
  void theCautionHasNoButtonThatTakesItAway() {
    Label caution = (Label) window.find("#caution");
    Toolkit.run(() -> ((Button) window.find("#caution-steps")).fire());
    assertEquals(1, window.answers.told.size(), "all steps are told");
    assertTrue(window.answers.told.get(0).contains("measure"), window.answers.told.get(0));
    assertTrue(Toolkit.on(() -> caution.isVisible() && caution.getScene() != null));
  }

  @Test
  void aValveIsFoundByAnAliasAndItsEffectIsSeenFirst() {
    javafx.scene.Parent picker = Toolkit.on(() -> WindowProbe.picker(window.desk, "device"));
    TextField search = (TextField) picker.lookup("#device-search");
    Toolkit.run(() -> search.setText("ecc82"));
    ListView<?> hits = (ListView<?>) picker.lookup("#device-hits");
    assertEquals(1, Toolkit.on(() -> hits.getItems().size()));
    String effect = Toolkit.on(() -> WindowProbe.words(picker));
    assertTrue(effect.contains("12AU7"), effect);
    assertTrue(effect.contains("heater") && effect.contains("pin"), "facts: " + effect);
    assertTrue(effect.contains("gain"), "what it does to the stage: " + effect);
    assertEquals("12AX7", window.setting("device"), "nothing is taken yet");
  }
}
