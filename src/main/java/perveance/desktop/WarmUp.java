package perveance.desktop;

import java.nio.file.Path;
import perveance.desktop.viewmodel.Settings;
import perveance.desktop.viewmodel.Starters;
import perveance.engine.analysis.AnalysisOptions;
import perveance.engine.analysis.ChassisAnswer;
import perveance.engine.analysis.StageAnswer;
import perveance.engine.base.Progress;
import perveance.plot.ChartFactory;
import perveance.plot.Look;
import perveance.plot.Pictures;
import perveance.plot.PlotFonts;
import perveance.plot.StagePlots;

/**
 * Answers and draws the example once where nobody sees it, while the window toolkit starts on
 * another core: most of the time to the first window is the loading of classes, and those of the
 * engine and of the charts do not have to wait for the toolkit's.
 */
final class WarmUp implements Runnable {
  private static final int SIDE = 200;

  private final Path home;

  private WarmUp(Path home) {
    this.home = home;
  }

  /** Begins; nothing waits for the end of it, and its trouble is told where it matters. */
  static void begin(Path home) {
    Thread thread = new Thread(new WarmUp(home), "perveance-warm-up");
    thread.setDaemon(true);
    thread.setUncaughtExceptionHandler((t, e) -> {});
    thread.start();
  }

  @Override
  public void run() {
    PlotFonts fonts = new PlotFonts();
    ChassisAnswer answer =
        new EngineRoom(Wiring.devices(home))
            .answer(Starters.example(Settings.USUAL), AnalysisOptions.LIVE, Progress.none());
    for (StageAnswer stage : answer.stages()) {
      StagePlots.frame(stage)
          .map(frame -> new ChartFactory(Look.LIGHT, fonts, SIDE / 20.0).artwork(frame))
          .ifPresent(chart -> Pictures.tryOut(chart, SIDE));
    }
  }
}
