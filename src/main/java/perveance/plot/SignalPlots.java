package perveance.plot;

import java.util.ArrayList;
import java.util.List;
import java.util.Locale;
import java.util.Optional;
import java.util.function.ToDoubleFunction;
import perveance.engine.analysis.DrivenAnswer;
import perveance.engine.analysis.LoadLineView;
import perveance.engine.analysis.SmallSignalAnswer;
import perveance.engine.analysis.StageAnswer;
import perveance.plot.PlotDescription.Anchor;
import perveance.plot.PlotDescription.Label;
import perveance.plot.PlotSeries.Role;

/** Describes what a stage does to a signal: transfer, waveform, distortion, response. */
public final class SignalPlots {
  private static final double LEAST_PERCENT = 0.001;

  private SignalPlots() {}

  /**
   * Anode voltage against the signal at the input over the driven or clean swing.
   *
   * @param answer the stage's answer
   * @return description, empty without a swing
   */
  public static Optional<PlotDescription> transfer(StageAnswer answer) {
    return path(answer)
        .map(
            path -> {
              double peak = peak(answer);
              List<PlotPoint> curve = new ArrayList<>();
              for (int k = 0; k < path.size(); k++) {
                double input = peak * Math.cos(Math.PI * k / (path.size() - 1));
                curve.add(0, new PlotPoint(input, path.get(k).voltage()));
              }
              double low = lowest(curve);
              double high = highest(curve);
              double middle = answer.loadLine().orElseThrow().anode();
              double slope = (highest(curve) - lowest(curve)) / (2 * peak);
              boolean falling = curve.get(0).y() > curve.get(curve.size() - 1).y();
              double end = peak * (falling ? -slope : slope);
              List<PlotPoint> straight =
                  List.of(new PlotPoint(-peak, middle - end), new PlotPoint(peak, middle + end));
              return new PlotDescription(
                  "Transfer",
                  new PlotAxis("input, V", -peak, peak, false),
                  new PlotAxis(
                      "anode to cathode, V",
                      low - margin(low, high),
                      high + margin(low, high),
                      false),
                  List.of(
                      new PlotSeries("straight line", Role.SECOND, straight),
                      new PlotSeries("transfer", Role.MAIN, curve),
                      new PlotSeries(
                          "operating point", Role.POINT, List.of(new PlotPoint(0, middle)))),
                  List.of(label("dashed: no distortion", new PlotPoint(-peak * 0.96, low))));
            });
  }

  /**
   * Anode voltage over two cycles of the driven or clean swing.
   *
   * @param answer the stage's answer
   * @return description, empty without a swing
   */
  public static Optional<PlotDescription> waveform(StageAnswer answer) {
    return path(answer)
        .map(
            path -> {
              int half = path.size() - 1;
              List<PlotPoint> curve = new ArrayList<>();
              List<PlotPoint> sine = new ArrayList<>();
              double mean = (path.get(0).voltage() + path.get(half).voltage()) / 2;
              double swing = (path.get(0).voltage() - path.get(half).voltage()) / 2;
              for (int k = 0; k <= 4 * half; k++) {
                int in = k % (2 * half);
                double cycle = (double) k / (2 * half);
                curve.add(
                    new PlotPoint(cycle, path.get(in <= half ? in : 2 * half - in).voltage()));
                sine.add(new PlotPoint(cycle, mean + swing * Math.cos(2 * Math.PI * cycle)));
              }
              double low = lowest(curve);
              double high = highest(curve);
              double edge = margin(low, high);
              return new PlotDescription(
                  "Waveform",
                  new PlotAxis("cycles", 0, 2, false),
                  new PlotAxis("anode to cathode, V", low - edge, high + 3 * edge, false),
                  List.of(
                      new PlotSeries("sine of the same swing", Role.SECOND, sine),
                      new PlotSeries("anode", Role.MAIN, curve)),
                  List.of(
                      new Label(
                          "dashed: a sine of the same swing",
                          new PlotPoint(0.03, high + 3 * edge),
                          Anchor.TOP_LEFT,
                          false)));
            });
  }

  /**
   * Distortion with its second and third harmonic against the input level.
   *
   * @param answer the stage's answer
   * @return description, empty when levels have not been worked out
   */
  public static Optional<PlotDescription> distortion(StageAnswer answer) {
    List<DrivenAnswer> levels = answer.levels().stream().filter(l -> l.inputPeak() > 0).toList();
    if (levels.size() < 2) {
      return Optional.empty();
    }
    List<PlotSeries> series = new ArrayList<>();
    List<Label> labels = new ArrayList<>();
    add(series, labels, "total", Role.MAIN, line(levels, DrivenAnswer::distortion));
    add(series, labels, "second", Role.SECOND, line(levels, l -> harmonic(l, 0)));
    add(series, labels, "third", Role.THIRD, line(levels, l -> harmonic(l, 1)));
    double most = series.stream().mapToDouble(s -> highest(s.points())).max().orElse(1);
    double last = levels.get(levels.size() - 1).inputPeak();
    answer
        .clean()
        .headroom()
        .ifPresent(h -> cleanInput(series, labels, answer.clean().inputPeak(), most));
    return Optional.of(
        new PlotDescription(
            "Distortion",
            new PlotAxis("input peak, V", 0, last, false),
            new PlotAxis("distortion, %", decadeBelow(most / 1e4), decadeAbove(most), true),
            series,
            labels));
  }

  private static void cleanInput(
      List<PlotSeries> series, List<Label> labels, double x, double top) {
    PlotPoint foot = new PlotPoint(x, LEAST_PERCENT);
    PlotPoint head = new PlotPoint(x, decadeAbove(top));
    series.add(new PlotSeries("clean input", Role.LIMIT, List.of(foot, head)));
    labels.add(new Label("clean to here", head, Anchor.TOP_RIGHT, false));
  }

  private static void add(
      List<PlotSeries> series, List<Label> labels, String name, Role role, List<PlotPoint> line) {
    if (line.size() > 1) {
      series.add(new PlotSeries(name, role, line));
      PlotPoint at = line.get(line.size() * (role == Role.MAIN ? 4 : 6) / 8);
      labels.add(new Label(name, at, Anchor.BOTTOM_RIGHT, role == Role.MAIN));
    }
  }

  /** Points that a logarithmic axis can show. */
  private static List<PlotPoint> line(
      List<DrivenAnswer> levels, ToDoubleFunction<DrivenAnswer> ratio) {
    List<PlotPoint> points = new ArrayList<>();
    for (DrivenAnswer level : levels) {
      double percent = 100 * ratio.applyAsDouble(level);
      if (percent > LEAST_PERCENT) {
        points.add(new PlotPoint(level.inputPeak(), percent));
      }
    }
    return points;
  }

  private static double harmonic(DrivenAnswer level, int index) {
    return index < level.harmonics().size() ? Math.abs(level.harmonics().get(index)) : 0;
  }

  /**
   * Gain against frequency.
   *
   * @param answer the stage's answer
   * @return description, empty when the response has not been worked out
   */
  public static Optional<PlotDescription> response(StageAnswer answer) {
    SmallSignalAnswer small = answer.smallSignal();
    List<PlotPoint> points = new ArrayList<>();
    for (SmallSignalAnswer.ResponsePoint p : small.response()) {
      if (p.magnitude() > 0) {
        points.add(new PlotPoint(p.frequency(), 20 * Math.log10(p.magnitude())));
      }
    }
    if (points.size() < 2) {
      return Optional.empty();
    }
    double top = Math.ceil(highest(points) / 5) * 5 + 5;
    double bottom = Math.max(Math.floor(lowest(points) / 5) * 5, top - 40);
    List<PlotSeries> series = new ArrayList<>();
    List<Label> labels = new ArrayList<>();
    small.lowCorner().ifPresent(f -> corner(f, bottom, top, series, labels));
    small.highCorner().ifPresent(f -> corner(f, bottom, top, series, labels));
    series.add(new PlotSeries("gain", Role.MAIN, points));
    return Optional.of(
        new PlotDescription(
            "Response",
            new PlotAxis(
                "frequency, Hz", points.get(0).x(), points.get(points.size() - 1).x(), true),
            new PlotAxis("gain, dB", bottom, top, false),
            series,
            labels));
  }

  private static void corner(
      double frequency, double low, double high, List<PlotSeries> series, List<Label> labels) {
    series.add(
        new PlotSeries(
            "corner",
            Role.MARK,
            List.of(new PlotPoint(frequency, low), new PlotPoint(frequency, high))));
    String text =
        frequency < 1e3
            ? String.format(Locale.ROOT, "\u22123 dB %.3g Hz", frequency)
            : String.format(Locale.ROOT, "\u22123 dB %.3g kHz", frequency / 1e3);
    labels.add(
        new Label(
            text,
            new PlotPoint(frequency, low + 0.06 * (high - low)),
            frequency < 1e3 ? Anchor.BOTTOM_LEFT : Anchor.BOTTOM_RIGHT,
            false));
  }

  /** Half a cycle of a cosine, positive input peak first. */
  private static Optional<List<LoadLineView.Point>> path(StageAnswer answer) {
    return answer
        .loadLine()
        .map(LoadLineView::excursion)
        .filter(path -> path.size() > 4)
        .filter(path -> peak(answer) > 0);
  }

  private static double peak(StageAnswer answer) {
    return answer.driven().map(DrivenAnswer::inputPeak).orElse(answer.clean().inputPeak());
  }

  private static Label label(String text, PlotPoint at) {
    return new Label(text, at, Anchor.BOTTOM_LEFT, false);
  }

  private static double margin(double low, double high) {
    return Math.max(1e-6, 0.08 * (high - low));
  }

  private static double lowest(List<PlotPoint> points) {
    return points.stream().mapToDouble(PlotPoint::y).min().orElse(0);
  }

  private static double highest(List<PlotPoint> points) {
    return points.stream().mapToDouble(PlotPoint::y).max().orElse(1);
  }

  private static double decadeAbove(double value) {
    return Math.pow(10, Math.ceil(Math.log10(Math.max(value, 10 * LEAST_PERCENT))));
  }

  private static double decadeBelow(double value) {
    return Math.pow(10, Math.floor(Math.log10(Math.max(value, LEAST_PERCENT))));
  }
}
