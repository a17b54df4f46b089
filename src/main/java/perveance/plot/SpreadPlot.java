package perveance.plot;

import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import java.util.OptionalDouble;
import java.util.stream.Stream;
import perveance.engine.analysis.Band;
import perveance.engine.analysis.Histogram;
import perveance.engine.base.Unit;

/** Describes how a figure spreads: its samples as steps, the 95 % band, the value and a limit. */
public final class SpreadPlot {
  private static final double HEADROOM = 1.22;
  private static final double MARGIN = 0.06;

  /** A limit farther away than so many widths of the samples is left out of the picture. */
  private static final double FARTHEST = 1.5;

  private final Histogram histogram;
  private final Prefix prefix;
  private final double scale;
  private final double top;
  private final List<PlotSeries> series = new ArrayList<>();
  private final List<PlotDescription.Label> labels = new ArrayList<>();

  private SpreadPlot(Histogram histogram, Prefix prefix) {
    this.histogram = histogram;
    this.prefix = prefix;
    this.scale = prefix.scale;
    this.top = HEADROOM * share(histogram.highest());
  }

  /**
   * The histogram of a figure.
   *
   * @param name of the figure
   * @param unit of the figure
   * @param band its band
   * @param value as computed for typical parts, in the unit [1]
   * @param limit the maker's limit, empty for none, in the unit [1]
   * @return description, empty when the band has no samples
   */
  public static Optional<PlotDescription> of(
      String name, Unit unit, Band band, double value, OptionalDouble limit) {
    return band.histogram()
        .map(h -> new SpreadPlot(h, Prefix.of(h, unit)).describe(name, unit, band, value, limit));
  }

  private PlotDescription describe(
      String name, Unit unit, Band band, double value, OptionalDouble limit) {
    double low = histogram.from();
    double high = low + histogram.width() * histogram.counts().size();
    double reach = FARTHEST * (high - low);
    List<PlotPoint> steps = steps();
    series.add(new PlotSeries("samples", PlotSeries.Role.REGION, steps));
    series.add(new PlotSeries("outline", PlotSeries.Role.MAIN, steps));
    line("typical", PlotSeries.Role.CURVE, value, 1, PlotDescription.Anchor.TOP_LEFT);
    line("2.5 %", PlotSeries.Role.SECOND, band.low(), 0.9, PlotDescription.Anchor.TOP_RIGHT);
    line("97.5 %", PlotSeries.Role.SECOND, band.high(), 0.9, PlotDescription.Anchor.TOP_LEFT);
    if (limit.isPresent() && Math.abs(limit.getAsDouble() - value) < reach) {
      double at = limit.getAsDouble();
      line("limit", PlotSeries.Role.LIMIT, at, 1, PlotDescription.Anchor.TOP_LEFT);
      low = Math.min(low, at);
      high = Math.max(high, at);
    }
    double left = Math.min(low, value);
    double right = Math.max(high, value);
    double edge = MARGIN * (right - left);
    return new PlotDescription(
        name,
        new PlotAxis(
            name + prefix.before(unit), (left - edge) / scale, (right + edge) / scale, false),
        new PlotAxis("share, %", 0, top, false),
        series,
        labels);
  }

  private double share(int count) {
    return 100.0 * count / histogram.samples();
  }

  private List<PlotPoint> steps() {
    List<PlotPoint> steps = new ArrayList<>();
    double x = histogram.from() / scale;
    steps.add(new PlotPoint(x, 0));
    for (int count : histogram.counts()) {
      steps.add(new PlotPoint(x, share(count)));
      x += histogram.width() / scale;
      steps.add(new PlotPoint(x, share(count)));
    }
    steps.add(new PlotPoint(x, 0));
    return steps;
  }

  private void line(
      String name, PlotSeries.Role role, double at, double part, PlotDescription.Anchor anchor) {
    PlotPoint end = new PlotPoint(at / scale, part * top);
    series.add(new PlotSeries(name, role, List.of(new PlotPoint(at / scale, 0), end)));
    labels.add(new PlotDescription.Label(name, end, anchor, false));
  }

  /** What axis figures are divided by, so that they lie between one and a thousand. */
  private enum Prefix {
    MEGA(1e6, "M"),
    KILO(1e3, "k"),
    NONE(1, ""),
    MILLI(1e-3, "m"),
    MICRO(1e-6, "\u00b5"),
    NANO(1e-9, "n");

    private final double scale;
    private final String letter;

    Prefix(double scale, String letter) {
      this.scale = scale;
      this.letter = letter;
    }

    static Prefix of(Histogram h, Unit unit) {
      double end = h.from() + h.width() * h.counts().size();
      double most = Math.max(Math.abs(h.from()), Math.abs(end));
      return unit == Unit.RATIO
          ? NONE
          : Stream.of(values()).filter(p -> most >= p.scale).findFirst().orElse(NANO);
    }

    String before(Unit unit) {
      return unit == Unit.RATIO ? "" : ", " + letter + unit.symbol();
    }
  }
}
