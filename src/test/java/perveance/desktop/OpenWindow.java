package perveance.desktop;

import static org.junit.jupiter.api.Assertions.assertTrue;

import java.nio.file.Path;
import java.util.Map;
import java.util.Objects;
import javafx.beans.property.ObjectProperty;
import javafx.beans.property.SimpleObjectProperty;
import javafx.geometry.Point2D;
import javafx.scene.Node;
import javafx.scene.Parent;
import javafx.scene.control.Button;
import javafx.scene.control.TextField;
import javafx.scene.input.KeyCode;
import javafx.scene.input.KeyEvent;
import javafx.scene.input.MouseButton;
import javafx.scene.robot.Robot;
import javafx.stage.Stage;
import org.jspecify.annotations.Nullable;
import perveance.app.Edit;
import perveance.desktop.view.MainWindow;
import perveance.desktop.view.WindowProbe;
import perveance.desktop.viewmodel.Desk;
import perveance.desktop.viewmodel.Desks;
import perveance.desktop.viewmodel.KeyEditor;
import perveance.desktop.viewmodel.Settings;
import perveance.engine.analysis.StageAnswer;
import perveance.engine.stage.Setting;

/** A window under test: everything is computed at once, so that a test sees the end of it. */
final class OpenWindow {
  final Desk desk;
  final MainWindow main;
  final Stage stage;
  final Answers answers;

  private OpenWindow(Desk desk, MainWindow main, Stage stage, Answers answers) {
    this.desk = desk;
    this.main = main;
    this.stage = stage;
    this.answers = answers;
  }

  static OpenWindow open(Path home) {
    Toolkit.start();
    return Toolkit.on(
        () -> {
          Answers answers = new Answers();
          ObjectProperty<Settings> settings = new SimpleObjectProperty<>(Settings.USUAL);
          Desk desk =
              Wiring.desk(
                  home,
                  GridLeakWarner::new,
                  settings,
                  answers,
                  new Desks(Runnable::run, Runnable::run, Runnable::run));
          MainWindow main = new MainWindow(desk);
          Stage stage = new Stage();
          stage.setScene(main.scene());
          stage.setWidth(1280);
          stage.setHeight(800);
          stage.show();
          return new OpenWindow(desk, main, stage, answers);
        });
  }

  void close() {
    Toolkit.run(stage::close);
  }

  StageAnswer answer() {
    return desk.bench().stageAnswer().orElseThrow();
  }

  Map<String, Setting> settings() {
    return desk.bench().chassis().stages().get(0).settings();
  }

  String setting(String key) {
    return Objects.requireNonNull(settings().get(key), key).text();
  }

  double number(String key) {
    return ((Setting.Number) Objects.requireNonNull(settings().get(key), key)).value();
  }

  @Nullable Node findOrNull(String id) {
    return stage.getScene().lookup(id);
  }

  Node find(String id) {
    return Objects.requireNonNull(findOrNull(id), id);
  }

  boolean shown(String id) {
    return Toolkit.on(() -> findOrNull(id) != null);
  }

  Node part(String element) {
    return Toolkit.on(
        () -> Objects.requireNonNull(byId(stage.getScene().getRoot(), "part-" + element), element));
  }

  private static @Nullable Node byId(Node node, String id) {
    if (id.equals(node.getId())) {
      return node;
    }
    if (node instanceof Parent parent) {
      for (Node child : parent.getChildrenUnmodifiable()) {
        Node found = byId(child, id);
        if (found != null) {
          return found;
        }
      }
    }
    return null;
  }

  /** Presses a part, types a value and presses Enter. */
  void type(String element, String text) {
    Button part = (Button) part(element);
    Toolkit.run(part::fire);
    Toolkit.run(
        () -> {
          // the field answers to keys once it has been styled
          stage.getScene().getRoot().applyCss();
          stage.getScene().getRoot().layout();
          TextField field = (TextField) find("#value-editor");
          field.setText(text);
          field.fireEvent(key(KeyCode.ENTER));
        });
  }

  /** Sets a value past the drawing. */
  void set(String key, String text) {
    Toolkit.run(
        () -> {
          String ref = desk.bench().chosenStage().get();
          KeyEditor.Outcome outcome = KeyEditor.parse(desk.bench().chassis(), ref, key, text);
          Edit edit = ((KeyEditor.Outcome.Accepted) outcome).edit();
          assertTrue(desk.bench().edit(edit).isEmpty(), () -> desk.bench().message().get());
        });
  }

  /** Does what a menu would do. */
  void action(String words) {
    Toolkit.run(() -> WindowProbe.run(main, words));
  }

  /** Takes hold of the operating point and pulls it by some pixels. */
  void dragPoint(double dx, double dy) {
    drag("POINT", dx, dy);
  }

  /** Takes hold of a part of the load lines and pulls it by some pixels. */
  void drag(String handle, double dx, double dy) {
    Toolkit.frames();
    Point2D at =
        Toolkit.on(
            () -> {
              stage.toFront();
              stage.requestFocus();
              return WindowProbe.hand(main).localToScreen(WindowProbe.grip(main, handle));
            });
    Robot robot = Toolkit.on(Robot::new);
    Toolkit.run(() -> robot.mouseMove(at));
    Toolkit.run(() -> robot.mousePress(MouseButton.PRIMARY));
    for (int i = 1; i <= 4; i++) {
      double part = i / 4.0;
      Toolkit.run(() -> robot.mouseMove(at.getX() + dx * part, at.getY() + dy * part));
    }
    Toolkit.run(() -> robot.mouseRelease(MouseButton.PRIMARY));
    Toolkit.run(() -> {});
  }

  /** Presses keys as a person would, at what has the focus. */
  void press(KeyCode... codes) {
    Robot robot = Toolkit.on(Robot::new);
    Toolkit.run(
        () -> {
          for (KeyCode code : codes) {
            robot.keyPress(code);
          }
          for (int i = codes.length - 1; i >= 0; i--) {
            robot.keyRelease(codes[i]);
          }
        });
    Toolkit.run(() -> {});
  }

  /** What is said at the foot of the window. */
  String message() {
    return Toolkit.on(() -> desk.bench().message().get());
  }

  static KeyEvent key(KeyCode code) {
    return new KeyEvent(KeyEvent.KEY_PRESSED, "", "", code, false, false, false, false);
  }
}
