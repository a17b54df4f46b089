package perveance.plot;

import java.awt.geom.Rectangle2D;
import java.util.ArrayList;
import java.util.Comparator;
import java.util.List;
import java.util.Locale;
import java.util.Optional;
import java.util.OptionalDouble;
import java.util.stream.Stream;
import perveance.engine.analysis.LoadLineView;
import perveance.engine.device.CurveFamily;

/**
 * Describes anode characteristics, alone or with the load lines of a stage. Currents are shown in
 * milliamperes.
 */
public final class CharacteristicsPlot {
  private static final double MILLI = 1e-3;

  /** A label nearer to the operating point than this part of the picture is in its way. */
  private static final double NEAR = 0.08;

  /** Room that a limit's label takes, in parts of the picture. */
  private static final double WORDS_WIDE = 0.2;

  private static final double WORDS_HIGH = 0.06;

  /** The whole picture, in parts of itself. */
  private static final Rectangle2D PICTURE = new Rectangle2D.Double(0, 0, 1, 1);

  /** Which of the points of the dissipation limit carries its label. */
  private static final int LIMIT_LABEL = 24;

  /** Lower than this part of the picture a curve is too near to its neighbours for a label. */
  private static final double LEAST_HEIGHT = 0.03;

  private CharacteristicsPlot() {}

  /**
   * The family alone.
   *
   * @param family characteristics
   * @param dissipation anode limit drawn as a hyperbola, empty for none [W]
   * @return description
   */
  public static PlotDescription of(CurveFamily family, OptionalDouble dissipation) {
    return describe(family, dissipation, Optional.empty(), Optional.empty());
  }

  /**
   * The family alone, with room left for an operating point that is drawn over it.
   *
   * @param family characteristics
   * @param dissipation anode limit drawn as a hyperbola, empty for none [W]
   * @param over what will be drawn over it
   * @return description
   */
  static PlotDescription under(CurveFamily family, OptionalDouble dissipation, LoadLineView over) {
    return describe(family, dissipation, Optional.empty(), Optional.of(over));
  }

  /**
   * The family with the load lines and the swing of a stage.
   *
   * @param family characteristics
   * @param dissipation anode limit drawn as a hyperbola, empty for none [W]
   * @param lines load lines
   * @return description
   */
  public static PlotDescription of(
      CurveFamily family, OptionalDouble dissipation, LoadLineView lines) {
    return describe(family, dissipation, Optional.of(lines), Optional.of(lines));
  }

  private static PlotDescription describe(
      CurveFamily family,
      OptionalDouble dissipation,
      Optional<LoadLineView> lines,
      Optional<LoadLineView> spared) {
    List<PlotSeries> series = new ArrayList<>();
    List<PlotDescription.Label> labels = new ArrayList<>();
    for (int i = 0; i < family.curves().size(); i++) {
      addCurve(family, i, series, labels);
    }
    dissipation.ifPresent(watts -> addLimit(family, watts, spared, series, labels));
    lines.ifPresent(view -> addLines(family, view, series, labels));
    return new PlotDescription(
        family.title(),
        new PlotAxis("anode to cathode, V", 0, family.highestVoltage(), false),
        new PlotAxis("anode current, mA", 0, family.highestCurrent() / MILLI, false),
        series,
        labels);
  }

  private static void addCurve(
      CurveFamily family, int index, List<PlotSeries> series, List<PlotDescription.Label> labels) {
    CurveFamily.Curve curve = family.curves().get(index);
    List<PlotPoint> points = new ArrayList<>();
    for (CurveFamily.Point p : curve.points()) {
      points.add(new PlotPoint(p.anode(), p.current() / MILLI));
    }
    boolean major = index % 2 == 0;
    String name = gridLabel(curve.grid());
    series.add(
        new PlotSeries(name, major ? PlotSeries.Role.CURVE : PlotSeries.Role.MINOR_CURVE, points));
    if (major && !family.gridless()) {
      labels.add(endLabel(name, points, family.highestVoltage(), family.highestCurrent() / MILLI));
    }
  }

  /**
   * The label stands where the curve leaves the picture, at the top or at the right; where another
   * stands there already it moves back along the curve.
   */
  private static PlotDescription.Label endLabel(
      String name, List<PlotPoint> points, double right, double top) {
    List<PlotPoint> back = new ArrayList<>();
    for (int i = 1; i < points.size(); i++) {
      if (points.get(i).y() > top) {
        PlotPoint a = points.get(i - 1);
        PlotPoint b = points.get(i);
        double x = a.x() + (b.x() - a.x()) * (top - a.y()) / (b.y() - a.y());
        return new PlotDescription.Label(
            name, new PlotPoint(x, top), PlotDescription.Anchor.TOP_RIGHT, false, back);
      }
      if (points.get(i).y() > LEAST_HEIGHT * top) {
        back.add(0, points.get(i));
      }
    }
    PlotPoint end = new PlotPoint(right, points.get(points.size() - 1).y());
    List<PlotPoint> elsewhere =
        back.isEmpty() ? List.of(end) : back.subList(0, (back.size() + 1) / 2);
    return new PlotDescription.Label(
        name, end, PlotDescription.Anchor.BOTTOM_RIGHT, false, elsewhere);
  }

  private static void addLimit(
      CurveFamily family,
      double watts,
      Optional<LoadLineView> spared,
      List<PlotSeries> series,
      List<PlotDescription.Label> labels) {
    double top = family.highestCurrent();
    double from = watts / top;
    if (from >= family.highestVoltage()) {
      return;
    }
    List<PlotPoint> points = new ArrayList<>();
    for (int i = 0; i <= 60; i++) {
      double v = from + (family.highestVoltage() - from) * i / 60;
      points.add(new PlotPoint(v, watts / v / MILLI));
    }
    series.add(new PlotSeries(watts + " W limit", PlotSeries.Role.LIMIT, points));
    labels.add(limitLabel(trim(watts) + " W limit", points, spared, family));
  }

  /** Beyond the hyperbola, or within it where all places beyond it are taken. */
  private static PlotDescription.Label limitLabel(
      String name, List<PlotPoint> points, Optional<LoadLineView> spared, CurveFamily family) {
    PlotDescription.Anchor anchor = PlotDescription.Anchor.BOTTOM_LEFT;
    List<PlotPoint> places = new ArrayList<>(limitPlaces(points));
    if (spared.isPresent()) {
      LoadLineView view = spared.get();
      for (PlotDescription.Anchor side :
          List.of(PlotDescription.Anchor.BOTTOM_LEFT, PlotDescription.Anchor.TOP_RIGHT)) {
        anchor = side;
        places.sort(Comparator.comparing(p -> isNear(p, side, view, family)));
        if (!isNear(places.get(0), side, view, family)) {
          break;
        }
      }
    }
    return new PlotDescription.Label(name, places.get(0), anchor, false, places);
  }

  /** From the middle of the hyperbola outward, to both sides in turn. */
  private static List<PlotPoint> limitPlaces(List<PlotPoint> points) {
    List<PlotPoint> places = new ArrayList<>();
    for (int i = 0; i < points.size() - LIMIT_LABEL; i += 2) {
      places.add(points.get(LIMIT_LABEL + i));
      if (i < LIMIT_LABEL) {
        places.add(points.get(LIMIT_LABEL - i));
      }
    }
    return places;
  }

  /** Whether the words would stand on the operating point, on a line or across the edge. */
  private static boolean isNear(
      PlotPoint place, PlotDescription.Anchor side, LoadLineView view, CurveFamily family) {
    boolean beyond = side == PlotDescription.Anchor.BOTTOM_LEFT;
    double x = place.x() / family.highestVoltage() - (beyond ? 0 : WORDS_WIDE);
    double y = place.y() * MILLI / family.highestCurrent() - (beyond ? 0 : WORDS_HIGH);
    double px = view.anode() / family.highestVoltage();
    double py = view.current() / family.highestCurrent();
    Rectangle2D words = new Rectangle2D.Double(x, y, WORDS_WIDE, WORDS_HIGH);
    double left = x > px ? px - NEAR : px - NEAR - WORDS_WIDE;
    return !PICTURE.contains(words)
        || words.intersects(left, py - NEAR, 2 * NEAR + WORDS_WIDE, 2 * NEAR)
        || Stream.of(view.dc(), view.ac(), view.excursion(), view.reactive())
            .anyMatch(line -> crosses(line, words, family));
  }

  private static boolean crosses(
      List<LoadLineView.Point> line, Rectangle2D words, CurveFamily family) {
    for (int i = 1; i < line.size(); i++) {
      LoadLineView.Point a = line.get(i - 1);
      LoadLineView.Point b = line.get(i);
      if (words.intersectsLine(
          a.voltage() / family.highestVoltage(),
          a.current() / family.highestCurrent(),
          b.voltage() / family.highestVoltage(),
          b.current() / family.highestCurrent())) {
        return true;
      }
    }
    return false;
  }

  private static void addLines(
      CurveFamily family,
      LoadLineView view,
      List<PlotSeries> series,
      List<PlotDescription.Label> labels) {
    series.add(line("dc load line", PlotSeries.Role.DC_LINE, view.dc()));
    series.add(line("ac load line", PlotSeries.Role.AC_LINE, view.ac()));
    series.add(line("swing", PlotSeries.Role.EXCURSION, view.excursion()));
    if (!view.reactive().isEmpty()) {
      series.add(line("reactive load", PlotSeries.Role.MAIN, view.reactive()));
    }
    PlotPoint q = new PlotPoint(view.anode(), view.current() / MILLI);
    series.add(new PlotSeries("operating point", PlotSeries.Role.POINT, List.of(q)));
    boolean right = q.x() < 0.6 * family.highestVoltage();
    labels.add(
        new PlotDescription.Label(
            String.format(
                Locale.ROOT, "%.0f V, %s mA", view.anode(), threeFigures(view.current() / MILLI)),
            new PlotPoint(
                q.x() + (right ? 1 : -1) * 0.02 * family.highestVoltage(),
                q.y() + 0.02 * family.highestCurrent() / MILLI),
            right ? PlotDescription.Anchor.BOTTOM_LEFT : PlotDescription.Anchor.BOTTOM_RIGHT,
            true));
  }

  private static PlotSeries line(String name, PlotSeries.Role role, List<LoadLineView.Point> line) {
    List<PlotPoint> points = new ArrayList<>();
    for (LoadLineView.Point p : line) {
      points.add(new PlotPoint(p.voltage(), p.current() / MILLI));
    }
    return new PlotSeries(name, role, points);
  }

  private static String gridLabel(double grid) {
    return grid == 0 ? "0 V" : "\u2212" + trim(-grid) + " V";
  }

  private static String threeFigures(double value) {
    int decimals = Math.max(0, 2 - (int) Math.floor(Math.log10(Math.max(1e-9, value))));
    return String.format(Locale.ROOT, "%." + Math.min(6, decimals) + "f", value);
  }

  private static String trim(double value) {
    String text = String.format(Locale.ROOT, "%.2f", value);
    return text.contains(".") ? text.replaceAll("0+$", "").replaceAll("\\.$", "") : text;
  }
}
