package perveance.desktop;

import java.nio.file.Path;
import java.util.ArrayList;
import java.util.Collections;
import java.util.List;
import java.util.Locale;
import java.util.concurrent.CompletableFuture;
import java.util.concurrent.ExecutorService;
import java.util.concurrent.Executors;
import java.util.concurrent.TimeUnit;
import javafx.application.Platform;
import javafx.beans.property.SimpleObjectProperty;
import javafx.stage.Stage;
import perveance.desktop.view.MainWindow;
import perveance.desktop.viewmodel.Desk;
import perveance.desktop.viewmodel.Desks;
import perveance.desktop.viewmodel.PointDrag;
import perveance.desktop.viewmodel.Settings;
import perveance.engine.stage.Chassis;
import perveance.engine.stage.StageEntry;

/**
 * Measures the window: time to the first answer, work on the toolkit's thread for each step of a
 * drag, and memory after many random edits.
 *
 * <p>Arguments: a scratch folder, number of stages, seconds of random edits.
 */
public final class WindowTimes {
  private WindowTimes() {}

  /**
   * Measures and prints.
   *
   * @param args folder, stages, seconds
   * @throws InterruptedException when it is ended early
   */
  public static void main(String[] args) throws InterruptedException {
    long start = System.nanoTime();
    Toolkit.start();
    ExecutorService quick = Executors.newSingleThreadExecutor();
    ExecutorService thorough = Executors.newSingleThreadExecutor();
    List<Long> foreground = Collections.synchronizedList(new ArrayList<>());
    Desks desks =
        new Desks(
            quick,
            CompletableFuture.delayedExecutor(60, TimeUnit.MILLISECONDS, thorough),
            work ->
                Platform.runLater(
                    () -> {
                      long begin = System.nanoTime();
                      work.run();
                      foreground.add(System.nanoTime() - begin);
                    }));
    Desk desk = open(Path.of(args[0]), desks);
    print(
        "window built and shown after %.0f ms, %d ms of processor time",
        (System.nanoTime() - start) / 1e6,
        ProcessHandle.current().info().totalCpuDuration().orElseThrow().toMillis());
    while (Toolkit.on(() -> desk.bench().answer().get()) == null) {
      Thread.sleep(5);
    }
    print("first answer shown after %.0f ms", (System.nanoTime() - start) / 1e6);
    int stages = Integer.parseInt(args[1]);
    Toolkit.run(() -> desk.document().start(many(desk.bench().chassis(), stages)));
    while (!Toolkit.on(() -> desk.bench().settled().get())) {
      Thread.sleep(20);
    }
    drag(desk, foreground);
    soak(desk, Integer.parseInt(args[2]));
    quick.shutdownNow();
    thorough.shutdownNow();
    Platform.exit();
  }

  private static Desk open(Path folder, Desks desks) {
    return Toolkit.on(
        () -> {
          Desk desk =
              Wiring.desk(folder, new SimpleObjectProperty<>(Settings.USUAL), new Answers(), desks);
          Stage stage = new Stage();
          stage.setScene(new MainWindow(desk).scene());
          stage.setWidth(1280);
          stage.setHeight(800);
          stage.show();
          return desk;
        });
  }

  private static Chassis many(Chassis one, int stages) {
    List<StageEntry> entries = new ArrayList<>();
    for (int i = 1; i <= stages; i++) {
      StageEntry first = one.stages().get(0);
      entries.add(new StageEntry("V" + i, first.kind(), first.settings()));
    }
    return new Chassis(one.title(), one.conditions(), one.supplies(), entries);
  }

  private static void drag(Desk desk, List<Long> foreground) throws InterruptedException {
    PointDrag drag = desk.drag();
    Toolkit.run(drag::begin);
    for (int i = 0; i < 60; i++) {
      if (i == 20) {
        foreground.clear();
      }
      double current = 1e-3 * (1 + 0.3 * Math.sin(i / 8.0));
      Toolkit.run(() -> drag.point(PointDrag.Mover.BIAS, 200, current));
      Thread.sleep(60);
    }
    Toolkit.run(drag::end);
    List<Long> times = new ArrayList<>(foreground);
    Collections.sort(times);
    print(
        "drag: %d deliveries to the toolkit's thread, median %.1f ms, 95 %% below %.1f ms",
        times.size(), times.get(times.size() / 2) / 1e6, times.get(times.size() * 95 / 100) / 1e6);
  }

  private static void soak(Desk desk, int seconds) throws InterruptedException {
    java.util.Random random = new java.util.Random(1);
    List<String> keys = List.of("anode_load", "cathode_resistor", "grid_leak", "coupling", "load");
    long end = System.nanoTime() + TimeUnit.SECONDS.toNanos(seconds);
    int edits = 0;
    while (System.nanoTime() < end) {
      String key = keys.get(random.nextInt(keys.size()));
      boolean up = random.nextBoolean();
      Toolkit.run(
          () ->
              perveance.desktop.viewmodel.KeyEditor.step(
                      desk.bench().chassis(), desk.bench().chosenStage().get(), key, up)
                  .ifPresent(desk.bench()::edit));
      edits++;
      Thread.sleep(20);
    }
    System.gc();
    Runtime run = Runtime.getRuntime();
    print("%d edits, %d MB in use", edits, (run.totalMemory() - run.freeMemory()) >> 20);
  }

  private static void print(String format, Object... values) {
    System.Logger log = System.getLogger(WindowTimes.class.getName());
    log.log(System.Logger.Level.INFO, String.format(Locale.ROOT, format, values));
  }
}
