package perveance.plot;

import java.util.ArrayList;
import java.util.List;
import java.util.Locale;
import java.util.function.ToDoubleFunction;
import perveance.engine.device.geometry.ElectrodeAnswer;
import perveance.engine.device.geometry.GapPoint;
import perveance.engine.device.geometry.GapProfile;

/** Describes what happens between cathode and anode, from place to place. */
public final class GapPlot {
  private static final double MILLI = 1e-3;

  private GapPlot() {}

  /** What is drawn over the distance from the cathode. */
  public enum Show {
    /** Potential with and without space charge. */
    POTENTIAL("potential, V", 1),
    /** Field strength with and without space charge. */
    FIELD("field, kV/m", 1e3),
    /** Density of the space charge. */
    DENSITY("charge density, mC/m\u00b3", 1e-3),
    /** Speed of the electrons. */
    SPEED("electron speed, km/s", 1e3);

    private final String axis;
    private final double scale;

    Show(String axis, double scale) {
      this.axis = axis;
      this.scale = scale;
    }
  }

  /**
   * One quantity across the gap of a design in which current flows.
   *
   * @param answer the design worked out
   * @param profile its gap from place to place
   * @param show the quantity
   * @return description; the distance is counted in millimetres
   */
  public static PlotDescription of(ElectrodeAnswer answer, GapProfile profile, Show show) {
    List<PlotSeries> series = new ArrayList<>();
    List<PlotDescription.Label> labels = new ArrayList<>();
    boolean pair = show == Show.POTENTIAL || show == Show.FIELD;
    PlotSeries charged =
        line("with space charge", PlotSeries.Role.MAIN, profile, show, charged(show));
    series.add(charged);
    if (pair) {
      PlotSeries empty =
          line("without space charge", PlotSeries.Role.SECOND, profile, show, empty(show));
      series.add(empty);
      labels.add(label(charged, 0.62, PlotDescription.Anchor.TOP_LEFT));
      labels.add(label(empty, 0.38, PlotDescription.Anchor.BOTTOM_RIGHT));
    }
    double wide = StagePlots.roundUp(answer.working().gap() / MILLI);
    return new PlotDescription(
        title(answer),
        new PlotAxis("distance from the cathode, mm", 0, wide, false),
        new PlotAxis(show.axis, 0, StagePlots.roundUp(1.05 * top(series, show)), false),
        series,
        labels);
  }

  private static String title(ElectrodeAnswer answer) {
    String name = answer.design().title().isEmpty() ? "Gap" : answer.design().title();
    return String.format(
        Locale.ROOT,
        answer.triode().isPresent()
            ? "%s, cathode to the grid's place, equivalent diode at %.3g V%s"
            : "%s, cathode to anode at %.3g V%s",
        name,
        answer.workingVoltage(),
        answer.saturated() ? ", as if emission sufficed" : "");
  }

  private static ToDoubleFunction<GapPoint> charged(Show show) {
    return switch (show) {
      case POTENTIAL -> GapPoint::potential;
      case FIELD -> p -> Math.abs(p.field());
      case DENSITY -> GapPoint::chargeDensity;
      case SPEED -> GapPoint::speed;
    };
  }

  private static ToDoubleFunction<GapPoint> empty(Show show) {
    return show == Show.FIELD ? p -> Math.abs(p.emptyField()) : GapPoint::emptyPotential;
  }

  private static PlotSeries line(
      String name,
      PlotSeries.Role role,
      GapProfile profile,
      Show show,
      ToDoubleFunction<GapPoint> quantity) {
    List<PlotPoint> points = new ArrayList<>();
    if (show == Show.POTENTIAL || show == Show.SPEED) {
      points.add(new PlotPoint(0, 0));
    }
    for (GapPoint p : profile.points()) {
      points.add(new PlotPoint(p.distance() / MILLI, quantity.applyAsDouble(p) / show.scale));
    }
    return new PlotSeries(name, role, points);
  }

  private static PlotDescription.Label label(
      PlotSeries series, double part, PlotDescription.Anchor anchor) {
    PlotPoint at = series.points().get((int) (part * (series.points().size() - 1)));
    return new PlotDescription.Label(series.name(), at, anchor, false);
  }

  /** The density has no end at the cathode, so its axis ends where a tenth of the gap is passed. */
  private static double top(List<PlotSeries> series, Show show) {
    return series.stream()
        .map(PlotSeries::points)
        .flatMap(points -> points.stream().skip(show == Show.DENSITY ? points.size() / 20 : 0))
        .mapToDouble(PlotPoint::y)
        .max()
        .orElse(1);
  }
}
