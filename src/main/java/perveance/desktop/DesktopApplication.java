package perveance.desktop;

import java.nio.file.Path;
import java.util.List;
import java.util.Optional;
import java.util.OptionalInt;
import java.util.concurrent.CompletableFuture;
import java.util.concurrent.CountDownLatch;
import java.util.concurrent.Executor;
import java.util.concurrent.ExecutorService;
import java.util.concurrent.Executors;
import java.util.concurrent.TimeUnit;
import javafx.animation.KeyFrame;
import javafx.animation.Timeline;
import javafx.application.Application;
import javafx.application.Platform;
import javafx.beans.property.ObjectProperty;
import javafx.scene.image.Image;
import javafx.stage.Stage;
import javafx.util.Duration;
import org.jspecify.annotations.Nullable;
import perveance.desktop.view.DialogAsking;
import perveance.desktop.view.MainWindow;
import perveance.desktop.viewmodel.Desk;
import perveance.desktop.viewmodel.Desks;
import perveance.desktop.viewmodel.DocumentException;
import perveance.desktop.viewmodel.Settings;
import perveance.engine.base.BadInputException;
import perveance.engine.base.Problem;

/** The desktop program. */
public final class DesktopApplication extends Application {
  private static final int KEEP_SECONDS = 5;
  private static final int PAUSE_MILLISECONDS = 60;

  private final ExecutorService quick = Executors.newSingleThreadExecutor(r -> thread(r, "quick"));
  private final ExecutorService thorough =
      Executors.newSingleThreadExecutor(r -> thread(r, "thorough"));
  private final CountDownLatch shown = new CountDownLatch(1);
  private @Nullable String keepingFailed;

  /**
   * Opens the window and returns when it is closed.
   *
   * @param args at most one chassis file
   * @throws BadInputException when there is no display for a window
   */
  public static void open(List<String> args) throws BadInputException {
    // drawing into memory needs no second connection to the display
    System.setProperty("java.awt.headless", "true");
    WarmUp.begin(Home.folder());
    try {
      launch(DesktopApplication.class, args.toArray(new String[0]));
    } catch (UnsupportedOperationException e) {
      throw new BadInputException(
          new Problem(
              "desktop",
              OptionalInt.empty(),
              "",
              "no display (" + e.getMessage() + ")",
              "a display; without one, use check and sheet",
              Optional.empty()));
    }
  }

  private static Thread thread(Runnable work, String name) {
    Thread thread = new Thread(work, "perveance-" + name);
    thread.setDaemon(true);
    return thread;
  }

  @Override
  public void start(Stage stage) {
    Path home = Home.folder();
    ObjectProperty<Settings> settings = Wiring.settings(home);
    DialogAsking asking = new DialogAsking(settings::get);
    Executor afterPause =
        CompletableFuture.delayedExecutor(PAUSE_MILLISECONDS, TimeUnit.MILLISECONDS, thorough);
    thorough.execute(this::waitForWindow);
    Desk desk =
        Wiring.desk(home, settings, asking, new Desks(quick, afterPause, Platform::runLater));
    MainWindow window = new MainWindow(desk);
    Thread.currentThread().setUncaughtExceptionHandler((t, e) -> tell(asking, e));
    stage.setTitle("Perveance");
    icon().ifPresent(stage.getIcons()::add);
    stage.setMinWidth(980);
    stage.setMinHeight(640);
    stage.setScene(window.scene());
    stage.setOnCloseRequest(
        e -> {
          if (!window.mayClose()) {
            e.consume();
          }
        });
    stage.show();
    asking.ownedBy(stage);
    keepRegularly(desk);
    Platform.runLater(() -> begin(window));
  }

  /** The thorough answer would take from the window the core on which it is built. */
  private void waitForWindow() {
    try {
      shown.await();
    } catch (InterruptedException e) {
      Thread.currentThread().interrupt();
    }
  }

  private void begin(MainWindow window) {
    shown.countDown();
    window.offerRecovery();
    List<String> files = getParameters().getUnnamed();
    if (!files.isEmpty()) {
      window.open(Path.of(files.get(0)));
    }
  }

  private static Optional<Image> icon() {
    return Optional.ofNullable(
            DesktopApplication.class.getResource("/perveance/desktop/perveance.png"))
        .map(url -> new Image(url.toExternalForm()));
  }

  private void keepRegularly(Desk desk) {
    Timeline keeper = new Timeline(new KeyFrame(Duration.seconds(KEEP_SECONDS), e -> keep(desk)));
    keeper.setCycleCount(Timeline.INDEFINITE);
    keeper.play();
  }

  /** Trouble with keeping is told once, not every few seconds. */
  private void keep(Desk desk) {
    try {
      desk.document().keep();
      keepingFailed = null;
    } catch (DocumentException e) {
      if (!e.why().equals(keepingFailed)) {
        keepingFailed = e.why();
        desk.bench().say(e.what() + " " + e.remedy());
      }
    }
  }

  private static void tell(DialogAsking asking, Throwable error) {
    System.getLogger(DesktopApplication.class.getName())
        .log(System.Logger.Level.ERROR, "unexpected", error);
    asking.tell(
        "Something went wrong inside the program. The chassis is as it was before.",
        String.valueOf(error),
        "Save the chassis, then report what you did together with the line above.");
  }

  @Override
  public void stop() {
    quick.shutdownNow();
    thorough.shutdownNow();
  }
}
