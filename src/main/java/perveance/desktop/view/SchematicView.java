package perveance.desktop.view;

import java.util.ArrayList;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import java.util.Objects;
import java.util.Optional;
import java.util.Set;
import javafx.scene.input.KeyCode;
import javafx.scene.input.KeyEvent;
import javafx.scene.input.MouseEvent;
import javafx.scene.input.ScrollEvent;
import javafx.scene.layout.Pane;
import javafx.scene.layout.StackPane;
import org.jspecify.annotations.Nullable;
import perveance.app.Edit;
import perveance.desktop.viewmodel.Desk;
import perveance.desktop.viewmodel.KeyEditor;
import perveance.desktop.viewmodel.Workbench;
import perveance.engine.analysis.ChassisAnswer;
import perveance.engine.analysis.StageAnswer;
import perveance.engine.stage.Setting;
import perveance.engine.stage.StageCircuit;
import perveance.plot.Artwork;
import perveance.plot.Hotspot;
import perveance.plot.Look;
import perveance.plot.PlotFonts;
import perveance.plot.SchematicPainter;
import perveance.plot.SchematicWords;

/** The drawn schematic; every value is edited where it stands. */
final class SchematicView extends StackPane {
  private static final double LARGEST_UNIT = 21;

  /** Smallest type that is aimed at, in pixels. */
  private static final double READABLE = 10.5;

  private final Desk desk;
  private final Workbench bench;
  private final PlotFonts fonts;
  private final ArtworkNode art = new ArtworkNode();
  private final Pane handles = new Pane();
  private final Map<String, PartHandle> byName = new LinkedHashMap<>();
  private final ValueEditor editor;
  private Optional<StageAnswer> shown = Optional.empty();
  private Runnable pickDevice = () -> {};
  private @Nullable SchematicPainter painter;
  private @Nullable Look painted;
  private double lastX;
  private double lastY;

  SchematicView(Desk desk, PlotFonts fonts) {
    this.desk = desk;
    this.bench = desk.bench();
    this.fonts = fonts;
    this.editor = new ValueEditor(desk, handles);
    handles.setPickOnBounds(true);
    getChildren().addAll(art, handles);
    art.onDrawn(this::placeHandles);
    handles.addEventHandler(ScrollEvent.SCROLL, this::scrolled);
    handles.addEventHandler(MouseEvent.MOUSE_PRESSED, this::pressed);
    handles.addEventHandler(MouseEvent.MOUSE_DRAGGED, this::dragged);
    addEventFilter(KeyEvent.KEY_PRESSED, this::zoomByKey);
    bench.chosenPart().addListener((o, was, is) -> refresh());
  }

  /** Told when the person wants to choose another valve. */
  void onPickDevice(Runnable listener) {
    pickDevice = listener;
  }

  /** Draws the chosen stage anew. */
  void refresh() {
    shown = bench.stageAnswer();
    if (shown.isEmpty()) {
      art.show((g, area) -> List.of());
      return;
    }
    art.show(artwork(shown.get()));
  }

  /** What the view shows, for pictures of it. */
  Optional<Artwork> artwork() {
    return bench.stageAnswer().map(this::artwork);
  }

  private Artwork artwork(StageAnswer answer) {
    ChassisAnswer whole = Objects.requireNonNull(bench.answer().get());
    Set<String> chosen =
        bench.chosenPart().get().isEmpty() ? Set.of() : Set.of(bench.chosenPart().get());
    boolean zigzag = desk.settings().get().zigzag();
    return Artwork.of(
        painter(),
        answer.drawing(),
        new SchematicWords(whole, answer, false).text(chosen, zigzag),
        LARGEST_UNIT * art.zoom(),
        READABLE * desk.settings().get().textSize());
  }

  /** One painter as long as the colours stay, so that it measures each text once. */
  private SchematicPainter painter() {
    Look look = Skin.look(desk.settings().get());
    if (painter == null || !look.equals(painted)) {
      painter = new SchematicPainter(look, fonts);
      painted = look;
    }
    return painter;
  }

  void fit() {
    art.fit();
    refresh();
  }

  private void placeHandles() {
    List<String> names = new ArrayList<>();
    for (Hotspot spot : art.spots()) {
      if (!spot.node()) {
        names.add(spot.name());
        handle(spot.name()).place(spot);
      }
    }
    List<String> gone = new ArrayList<>(byName.keySet());
    gone.removeAll(names);
    for (String name : gone) {
      handles.getChildren().remove(byName.remove(name));
    }
    editor.follow(byName);
  }

  private PartHandle handle(String name) {
    return byName.computeIfAbsent(
        name,
        n -> {
          PartHandle handle = new PartHandle(n);
          handle.setOnAction(e -> edit(n));
          handle
              .focusedProperty()
              .addListener(
                  (o, was, is) -> {
                    if (is) {
                      bench.chosenPart().set(n);
                    }
                  });
          handle.addEventHandler(KeyEvent.KEY_PRESSED, e -> stepByKey(n, e));
          handles.getChildren().add(handle);
          return handle;
        });
  }

  /** Names the parts for a reader and marks those that a finding is about. */
  void describe(Map<String, String> words, Set<String> marked) {
    byName.forEach(
        (name, handle) -> {
          handle.setAccessibleText(words.getOrDefault(name, name));
          handle.mark(marked.contains(name));
        });
  }

  /** Opens the editor at a part, or the device picker at a valve. */
  void edit(String element) {
    if (isValve(element)) {
      pickDevice.run();
      return;
    }
    Optional<String> key = keyOf(element);
    PartHandle handle = byName.get(element);
    if (key.isPresent() && handle != null) {
      bench.chosenPart().set(element);
      editor.open(bench.chosenStage().get(), key.get(), element, handle);
    }
  }

  void focus(String element) {
    PartHandle handle = byName.get(element);
    if (handle != null) {
      handle.requestFocus();
    }
  }

  boolean holds(String element) {
    return byName.containsKey(element);
  }

  private boolean isValve(String element) {
    return shown.stream()
        .flatMap(a -> a.circuit().devices().stream())
        .anyMatch(d -> d.ref().equals(element));
  }

  private Optional<String> keyOf(String element) {
    return shown.stream()
        .flatMap(a -> a.circuit().parts().stream())
        .filter(p -> p.element().equals(element))
        .map(StageCircuit.Part::key)
        .findFirst();
  }

  private void stepByKey(String element, KeyEvent event) {
    boolean up = event.getCode() == KeyCode.UP;
    boolean down = event.getCode() == KeyCode.DOWN;
    Optional<String> key = keyOf(element);
    if ((up || down) && key.isPresent() && !event.isControlDown()) {
      String ref = bench.chosenStage().get();
      Optional<Edit> step = KeyEditor.step(bench.chassis(), ref, key.get(), up);
      step.ifPresent(bench::edit);
      event.consume();
    } else if (event.getCode() == KeyCode.DELETE && key.isPresent()) {
      remove(bench.chosenStage().get(), key.get());
      event.consume();
    }
  }

  private void remove(String ref, String key) {
    KeyEditor.Outcome outcome = KeyEditor.parse(bench.chassis(), ref, key, "");
    if (outcome instanceof KeyEditor.Outcome.Accepted accepted) {
      bench.edit(accepted.edit());
    } else if (outcome instanceof KeyEditor.Outcome.Refused refused) {
      bench.say(refused.why());
    }
  }

  /** The text of a value as it is written in the file. */
  static String written(Workbench bench, String ref, String key) {
    return bench.chassis().stage(ref).map(s -> s.settings().get(key)).map(Setting::text).orElse("");
  }

  private void scrolled(ScrollEvent event) {
    if (event.isControlDown() || event.isShortcutDown()) {
      zoom(event.getDeltaY() > 0 ? 1.15 : 1 / 1.15, event.getX(), event.getY());
      event.consume();
    }
  }

  private void zoom(double factor, double x, double y) {
    art.zoom(factor, x, y);
    refresh();
  }

  private void zoomByKey(KeyEvent event) {
    if (!event.isShortcutDown()) {
      return;
    }
    switch (event.getCode()) {
      case PLUS, EQUALS, ADD -> zoom(1.2, getWidth() / 2, getHeight() / 2);
      case MINUS, SUBTRACT -> zoom(1 / 1.2, getWidth() / 2, getHeight() / 2);
      case DIGIT0, NUMPAD0 -> fit();
      default -> {
        return;
      }
    }
    event.consume();
  }

  private void pressed(MouseEvent event) {
    lastX = event.getX();
    lastY = event.getY();
    if (event.getTarget() == handles) {
      bench.chosenPart().set("");
      editor.close();
    }
  }

  private void dragged(MouseEvent event) {
    if (event.getTarget() == handles) {
      art.pan(event.getX() - lastX, event.getY() - lastY);
      lastX = event.getX();
      lastY = event.getY();
    }
  }
}
