package perveance.desktop;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertFalse;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.nio.file.Path;
import java.util.ArrayList;
import java.util.EnumSet;
import java.util.List;
import java.util.Objects;
import javafx.scene.AccessibleRole;
import javafx.scene.Node;
import javafx.scene.Parent;
import javafx.scene.control.Button;
import javafx.scene.control.ButtonBase;
import javafx.scene.control.Labeled;
import javafx.scene.control.ScrollPane;
import javafx.scene.control.TextField;
import javafx.scene.input.KeyCode;
import org.jspecify.annotations.Nullable;
import org.junit.jupiter.api.AfterEach;
import org.junit.jupiter.api.BeforeEach;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.io.TempDir;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.ValueSource;
import perveance.desktop.view.WindowProbe;

/** Everything by keyboard, and every place that the keyboard reaches has a name to be read out. */
class KeyboardTest {
  private static final int MOST_STEPS = 120;

  @TempDir private Path folder = Path.of("");

  private OpenWindow window;

  @BeforeEach
  void open() {
    window = OpenWindow.open(folder);
    Toolkit.run(
        () -> {
          window.stage.toFront();
          window.stage.requestFocus();
          window.find("#search").requestFocus();
        });
  }

  @AfterEach
  void close() {
    window.close();
  }

  private Node owner() {
    return Objects.requireNonNull(Toolkit.on(() -> window.stage.getScene().getFocusOwner()));
  }

  /** The tab key goes once round the window: bar, chassis, drawing, charts, findings, drive. */
  @Test
  void theTabKeyReachesEveryPartOfTheWindow() {
    Node first = owner();
    List<String> visited = new ArrayList<>();
    do {
      visited.add(String.valueOf(owner().getId()));
      window.press(KeyCode.TAB);
    } while (owner() != first && visited.size() < MOST_STEPS);
    assertTrue(visited.size() < MOST_STEPS, "the round does not close: " + visited);
    List<String> wanted =
        List.of(
            "search",
            "print-sheet",
            "stage-V1a",
            "supply-A",
            "caution-steps",
            "pick-device",
            "part-V1a.anode_load",
            "part-V1a.cathode_resistor",
            "tab-characteristics",
            "characteristics",
            "hand-sums",
            "drive");
    assertTrue(visited.containsAll(wanted), "of " + wanted + " reached only " + visited);
  }

  /** In every view, with everything unfolded, and in the pickers. */
  @ParameterizedTest
  @ValueSource(
      strings = {
        "tab-characteristics",
        "tab-transfer",
        "tab-waveform",
        "tab-distortion",
        "tab-response",
        "tab-spread",
        "tab-values values-fold",
        "hand-sums"
      })
  void whateverTakesTheFocusHasANameAndARole(String presses) {
    for (String press : presses.split(" ")) {
      Toolkit.run(() -> ((ButtonBase) window.find("#" + press)).fire());
      // a pane that scrolls holds its content only once it was laid out
      Toolkit.frames();
    }
    assertEquals(List.of(), nameless(window.stage.getScene().getRoot()));
  }

  @ParameterizedTest
  @ValueSource(strings = {"kind", "device"})
  void soDoesWhateverAPickerHolds(String picker) {
    assertEquals(List.of(), nameless(Toolkit.on(() -> WindowProbe.picker(window.desk, picker))));
  }

  private static List<String> nameless(Node root) {
    List<String> nameless = new ArrayList<>();
    Toolkit.run(() -> collect(root, nameless));
    return nameless;
  }

  @Test
  void whatPartsAreRatedForIsFoldedAway() {
    Toolkit.run(() -> ((ButtonBase) window.find("#tab-values")).fire());
    Toolkit.frames();
    assertTrue(window.shown("#value-anode_load"));
    assertFalse(window.shown("#value-anode_load_power"));
    Toolkit.run(() -> window.find("#values-fold").requestFocus());
    window.press(KeyCode.SPACE);
    assertTrue(window.shown("#value-anode_load_power"));
    TextField rating = (TextField) window.find("#value-anode_load_power");
    Toolkit.run(
        () -> {
          rating.setText("1 W");
          rating.fireEvent(OpenWindow.key(KeyCode.ENTER));
        });
    assertEquals("1 W", window.setting("anode_load_power"));
    Toolkit.run(() -> ((ButtonBase) window.find("#values-fold")).fire());
    assertTrue(window.shown("#value-anode_load_power"), "what is stated stays in sight");
    assertFalse(window.shown("#value-stray_anode"));
  }

  private static AccessibleRole role(Node node) {
    return Objects.requireNonNullElse(node.getAccessibleRole(), AccessibleRole.NODE);
  }

  private static boolean isSaid(@Nullable String words) {
    return words != null && !words.isBlank();
  }

  private static void collect(Node node, List<String> nameless) {
    boolean says = isSaid(node.getAccessibleText());
    if (node instanceof Labeled labeled) {
      says |= isSaid(labeled.getText());
    }
    if (node.isFocusTraversable() && !(node instanceof ScrollPane) && !says) {
      nameless.add(node.getClass().getSimpleName() + " " + node.getId());
    }
    boolean plain = EnumSet.of(AccessibleRole.NODE, AccessibleRole.PARENT).contains(role(node));
    if (node.isFocusTraversable() && plain) {
      nameless.add("no role: " + node.getClass().getSimpleName() + " " + node.getId());
    }
    if (node instanceof Parent parent) {
      parent.getChildrenUnmodifiable().forEach(child -> collect(child, nameless));
    }
  }

  @Test
  void aCommandIsFoundByItsWordsAndDone() {
    TextField search = (TextField) window.find("#search");
    Toolkit.run(() -> search.setText("light dark"));
    window.press(KeyCode.ENTER);
    assertTrue(Toolkit.on(() -> window.desk.settings().get().dark()), "the look has changed");
    Toolkit.run(() -> search.setText("cathode resistor"));
    window.press(KeyCode.ENTER);
    assertEquals("V1a.cathode_resistor", window.desk.bench().chosenPart().get());
    // what was chosen has the focus now
    Toolkit.run(search::requestFocus);
    Toolkit.run(() -> search.setText("V1a plate load"));
    window.press(KeyCode.ENTER);
    assertEquals("V1a.anode_load", window.desk.bench().chosenPart().get(), "in American words");
  }

  @Test
  void keysUndoAndRedoOnce() {
    window.type("V1a.anode_load", "120k");
    window.type("V1a.anode_load", "150k");
    window.press(KeyCode.CONTROL, KeyCode.Z);
    assertEquals("120k", window.setting("anode_load"));
    window.press(KeyCode.CONTROL, KeyCode.SHIFT, KeyCode.Z);
    assertEquals("150k", window.setting("anode_load"));
  }

  @Test
  void textGrowsByKeysAndTheSettingIsKept() {
    double before = window.desk.settings().get().textSize();
    window.press(KeyCode.CONTROL, KeyCode.SHIFT, KeyCode.UP);
    assertEquals(before + 0.1, window.desk.settings().get().textSize(), 1e-9);
  }

  @Test
  void escapeLeavesAValueAsItWas() {
    Button part = (Button) window.part("V1a.anode_load");
    Toolkit.run(part::fire);
    assertTrue(window.shown("#value-editor"));
    Toolkit.run(() -> ((TextField) window.find("#value-editor")).setText("1M"));
    window.press(KeyCode.ESCAPE);
    assertFalse(window.shown("#value-editor"));
    assertEquals("100k", window.setting("anode_load"));
  }
}
