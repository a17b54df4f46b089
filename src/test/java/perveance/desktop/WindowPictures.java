package perveance.desktop;

import java.io.IOException;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.List;
import java.util.Locale;
import java.util.Optional;
import javafx.beans.property.ObjectProperty;
import javafx.beans.property.SimpleObjectProperty;
import javafx.embed.swing.SwingFXUtils;
import javafx.scene.Scene;
import javafx.scene.control.ToggleButton;
import javafx.scene.image.WritableImage;
import javafx.stage.Stage;
import javax.imageio.ImageIO;
import org.jspecify.annotations.Nullable;
import perveance.desktop.view.MainWindow;
import perveance.desktop.view.WindowProbe;
import perveance.desktop.viewmodel.Desk;
import perveance.desktop.viewmodel.Desks;
import perveance.desktop.viewmodel.Settings;
import perveance.desktop.viewmodel.StageList;
import perveance.engine.stage.StageKind;
import perveance.engine.stage.StageKinds;

/**
 * Draws every view at two sizes, light and dark, into pictures for people to look at.
 *
 * <p>Arguments: a folder for the pictures, then any number of chassis files.
 */
public final class WindowPictures {
  private static final List<String> VIEWS =
      List.of("characteristics", "transfer", "waveform", "distortion", "response", "spread");

  private final Path folder;
  private double text = 1;
  private @Nullable Desk desk;

  private WindowPictures(Path folder) {
    this.folder = folder;
  }

  /**
   * Draws.
   *
   * @param args folder, files
   * @throws IOException when a picture cannot be written
   */
  public static void main(String[] args) throws IOException {
    // the usual screen in memory is smaller than the larger pictures
    System.setProperty("headless.geometry", "1920x1200-32");
    Toolkit.start();
    WindowPictures pictures = new WindowPictures(Path.of(args[0]));
    Files.createDirectories(pictures.folder);
    for (boolean dark : new boolean[] {false, true}) {
      for (int[] size : new int[][] {{1280, 800}, {1920, 1200}}) {
        pictures.views("example", null, size, dark);
        pictures.kinds(size, dark);
        pictures.pickers(size, dark);
        for (int i = 1; i < args.length; i++) {
          Path file = Path.of(args[i]);
          String name = String.valueOf(file.getFileName()).replaceFirst("\\.toml$", "");
          pictures.first(name, file, size, dark);
        }
      }
    }
    pictures.large(args);
    javafx.application.Platform.exit();
  }

  /** With large text in the smaller window, where room is short. */
  private void large(String[] files) {
    int[] size = {1280, 800};
    for (double times : new double[] {1.25, 1.5}) {
      text = times;
      String name = "text-" + times;
      views(name, null, size, false);
      for (int i = 1; i < files.length; i++) {
        first(name + "-" + i, Path.of(files[i]), size, false);
      }
    }
    text = 1;
  }

  private void views(String name, @Nullable Path file, int[] size, boolean dark) {
    Stage stage = window(file, size, dark);
    for (String view : VIEWS) {
      Toolkit.run(() -> ((ToggleButton) stage.getScene().lookup("#tab-" + view)).fire());
      save(stage, name + "-" + view, size, dark);
    }
    Toolkit.run(() -> ((ToggleButton) stage.getScene().lookup("#tab-values")).fire());
    save(stage, name + "-values", size, dark);
    Toolkit.run(stage::close);
  }

  private void kinds(int[] size, boolean dark) {
    Stage stage = window(null, size, dark);
    StageList list = new StageList(shown().bench());
    for (StageKind kind : StageKinds.all()) {
      Toolkit.run(() -> list.add(kind, Optional.empty()));
      save(stage, "kind-" + kind.name(), size, dark);
    }
    Toolkit.run(stage::close);
  }

  private void pickers(int[] size, boolean dark) {
    Stage stage = window(null, size, dark);
    for (String picker : List.of("kind", "device")) {
      Toolkit.run(
          () -> {
            stage.setScene(new Scene(WindowProbe.picker(shown(), picker)));
            stage.setWidth(1040);
            stage.setHeight(640);
          });
      save(stage, "picker-" + picker, size, dark);
    }
    Toolkit.run(stage::close);
  }

  private Desk shown() {
    return java.util.Objects.requireNonNull(desk);
  }

  private void first(String name, Path file, int[] size, boolean dark) {
    Stage stage = window(file, size, dark);
    save(stage, name, size, dark);
    Toolkit.run(stage::close);
  }

  private Stage window(@Nullable Path file, int[] size, boolean dark) {
    return Toolkit.on(
        () -> {
          ObjectProperty<Settings> settings =
              new SimpleObjectProperty<>(Settings.USUAL.withDark(dark).withTextSize(text));
          Desks desks = new Desks(Runnable::run, Runnable::run, Runnable::run);
          desk = Wiring.desk(folder.resolve("home"), settings, new Answers(), desks);
          MainWindow window = new MainWindow(shown());
          if (file != null) {
            window.open(file);
          }
          Stage stage = new Stage();
          stage.setScene(window.scene());
          stage.setWidth(size[0]);
          stage.setHeight(size[1]);
          stage.show();
          return stage;
        });
  }

  private void save(Stage stage, String name, int[] size, boolean dark) {
    Toolkit.frames();
    Toolkit.run(
        () -> {
          WritableImage image = stage.getScene().snapshot(null);
          String file =
              String.format(Locale.ROOT, "%s-%d-%s.png", name, size[0], dark ? "dark" : "light");
          try {
            ImageIO.write(
                SwingFXUtils.fromFXImage(image, null), "png", folder.resolve(file).toFile());
          } catch (IOException e) {
            throw new java.io.UncheckedIOException(e);
          }
        });
  }
}
