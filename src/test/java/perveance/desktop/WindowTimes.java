package perveance.desktop;

import java.lang.management.ManagementFactory;
import java.lang.management.ThreadMXBean;
import java.nio.file.Path;
import java.util.ArrayList;
import java.util.Collections;
import java.util.List;
import java.util.Locale;
import java.util.Random;
import java.util.concurrent.CompletableFuture;
import java.util.concurrent.ExecutorService;
import java.util.concurrent.Executors;
import java.util.concurrent.TimeUnit;
import java.util.function.BooleanSupplier;
import javafx.application.Platform;
import javafx.beans.property.SimpleObjectProperty;
import javafx.stage.Stage;
import perveance.desktop.view.MainWindow;
import perveance.desktop.viewmodel.Desk;
import perveance.desktop.viewmodel.Desks;
import perveance.desktop.viewmodel.KeyEditor;
import perveance.desktop.viewmodel.PointDrag;
import perveance.desktop.viewmodel.Settings;
import perveance.engine.stage.Chassis;
import perveance.engine.stage.StageEntry;

/**
 * Measures the window: time to the first answer, work on the toolkit's thread for each frame of a
 * drag, and memory after many random edits.
 *
 * <p>Arguments: a scratch folder, number of stages, seconds of random edits.
 */
public final class WindowTimes {
  private static final int HAND_MILLISECONDS = 16;
  private static final int DRAG_STEPS = 400;
  private static final ThreadMXBean THREADS = ManagementFactory.getThreadMXBean();

  private final ExecutorService quick = Executors.newSingleThreadExecutor();
  private final ExecutorService thorough = Executors.newSingleThreadExecutor();
  private final List<Double> frames = Collections.synchronizedList(new ArrayList<>());
  private final Desk desk;
  private long processor;

  private WindowTimes(Path folder) {
    Desks desks =
        new Desks(
            quick,
            CompletableFuture.delayedExecutor(60, TimeUnit.MILLISECONDS, thorough),
            Platform::runLater);
    desk = Toolkit.on(() -> open(folder, desks));
  }

  /**
   * Measures and prints.
   *
   * @param args folder, stages, seconds
   * @throws InterruptedException when it is ended early
   */
  public static void main(String[] args) throws InterruptedException {
    long start = System.nanoTime();
    Toolkit.start();
    WindowTimes times = new WindowTimes(Path.of(args[0]));
    print(
        "window built and shown after %.0f ms, %d ms of processor time",
        (System.nanoTime() - start) / 1e6,
        ProcessHandle.current().info().totalCpuDuration().orElseThrow().toMillis());
    times.settle(() -> times.desk.bench().answer().get() != null);
    print("first answer shown after %.0f ms", (System.nanoTime() - start) / 1e6);
    int stages = Integer.parseInt(args[1]);
    Toolkit.run(() -> times.desk.document().start(many(times.desk.bench().chassis(), stages)));
    times.settle(() -> times.desk.bench().settled().get());
    times.drag();
    times.drag();
    times.soak(Integer.parseInt(args[2]));
    times.quick.shutdown();
    times.thorough.shutdown();
    Platform.exit();
  }

  private void settle(BooleanSupplier reached) throws InterruptedException {
    while (!Toolkit.on(reached::getAsBoolean)) {
      Thread.sleep(5);
    }
  }

  private Desk open(Path folder, Desks desks) {
    Desk made =
        Wiring.desk(folder, new SimpleObjectProperty<>(Settings.USUAL), new Answers(), desks);
    MainWindow window = new MainWindow(made);
    // between two frames lies all that the toolkit's thread does: edits, answers, layout
    window.scene().addPostLayoutPulseListener(this::frame);
    Stage stage = new Stage();
    stage.setScene(window.scene());
    stage.setWidth(1280);
    stage.setHeight(800);
    stage.show();
    return made;
  }

  private void frame() {
    long now = THREADS.getCurrentThreadCpuTime();
    frames.add((now - processor) / 1e6);
    processor = now;
  }

  private static Chassis many(Chassis one, int stages) {
    List<StageEntry> entries = new ArrayList<>();
    for (int i = 1; i <= stages; i++) {
      StageEntry first = one.stages().get(0);
      entries.add(new StageEntry("V" + i, first.kind(), first.settings()));
    }
    return new Chassis(one.title(), one.conditions(), one.supplies(), entries);
  }

  private void drag() throws InterruptedException {
    PointDrag drag = desk.drag();
    Toolkit.run(drag::begin);
    frames.clear();
    long start = System.nanoTime();
    for (int i = 0; i < DRAG_STEPS; i++) {
      double current = 1e-3 * (1 + 0.3 * Math.sin(i / 30.0));
      Toolkit.run(() -> drag.point(PointDrag.Mover.BIAS, 200, current));
      Thread.sleep(HAND_MILLISECONDS);
    }
    double seconds = (System.nanoTime() - start) / 1e9;
    List<Double> sorted = new ArrayList<>(frames);
    Toolkit.run(drag::end);
    Collections.sort(sorted);
    print(
        "drag: %.0f frames a second; processor time of the toolkit's thread for a frame:"
            + " median %.1f ms, 95 %% below %.1f ms, longest %.1f ms",
        sorted.size() / seconds,
        sorted.get(sorted.size() / 2),
        sorted.get(sorted.size() * 95 / 100),
        sorted.get(sorted.size() - 1));
  }

  private void soak(int seconds) throws InterruptedException {
    Random random = new Random(1);
    List<String> keys = List.of("anode_load", "cathode_resistor", "grid_leak", "coupling", "load");
    long end = System.nanoTime() + TimeUnit.SECONDS.toNanos(seconds);
    int edits = 0;
    while (System.nanoTime() < end) {
      String key = keys.get(random.nextInt(keys.size()));
      boolean up = random.nextBoolean();
      Toolkit.run(() -> step(key, up));
      edits++;
      Thread.sleep(20);
    }
    System.gc();
    Runtime run = Runtime.getRuntime();
    print("%d edits, %d MB in use", edits, (run.totalMemory() - run.freeMemory()) >> 20);
  }

  private void step(String key, boolean up) {
    KeyEditor.step(desk.bench().chassis(), desk.bench().chosenStage().get(), key, up)
        .ifPresent(desk.bench()::edit);
  }

  private static void print(String format, Object... values) {
    System.Logger log = System.getLogger(WindowTimes.class.getName());
    log.log(System.Logger.Level.INFO, String.format(Locale.ROOT, format, values));
  }
}
