package perveance.plot;

import java.awt.Font;
import java.awt.Graphics2D;
import java.awt.geom.Rectangle2D;
import java.util.ArrayList;
import java.util.Comparator;
import java.util.List;
import java.util.Optional;
import org.jfree.chart.annotations.AbstractXYAnnotation;
import org.jfree.chart.axis.ValueAxis;
import org.jfree.chart.plot.PlotRenderingInfo;
import org.jfree.chart.plot.XYPlot;

/**
 * Texts inside a chart, each on a patch of paper so that lines do not strike it through. A text
 * that would meet another one moves along its line; where the line has no room it is left out.
 */
final class ChartLabels extends AbstractXYAnnotation {
  private static final long serialVersionUID = 1L;
  private static final double GAP = 2;

  /** Half the side of the square that an operating point keeps for itself, in pixels. */
  private static final double POINT = 7;

  private final transient PlotDescription description;
  private final transient Look look;
  private final Font emphasised;
  private final Font plain;
  private final transient List<Rectangle2D> taken = new ArrayList<>();

  ChartLabels(PlotDescription description, Look look, PlotFonts fonts, double textSize) {
    this.description = description;
    this.look = look;
    this.emphasised = fonts.bold(textSize);
    this.plain = fonts.regular(0.92 * textSize);
  }

  /** Where texts were drawn last. */
  List<Rectangle2D> boxes() {
    return List.copyOf(taken);
  }

  /** From a value to a place in the chart. */
  private record Scale(XYPlot plot, Rectangle2D area, ValueAxis domain, ValueAxis range) {
    double x(PlotPoint p) {
      return domain.valueToJava2D(p.x(), area, plot.getDomainAxisEdge());
    }

    double y(PlotPoint p) {
      return range.valueToJava2D(p.y(), area, plot.getRangeAxisEdge());
    }
  }

  @Override
  public void draw(
      Graphics2D g,
      XYPlot plot,
      Rectangle2D area,
      ValueAxis domain,
      ValueAxis range,
      int rendererIndex,
      PlotRenderingInfo info) {
    Scale scale = new Scale(plot, area, domain, range);
    taken.clear();
    List<Rectangle2D> points = points(scale);
    taken.addAll(points);
    List<PlotDescription.Label> order = new ArrayList<>(description.labels());
    order.sort(Comparator.comparing(l -> l.emphasis() ? 0 : l.along().isEmpty() ? 1 : 2));
    for (PlotDescription.Label label : order) {
      g.setFont(label.emphasis() ? emphasised : plain);
      place(label, scale, g).ifPresent(box -> draw(g, label, box));
    }
    taken.removeAll(points);
  }

  private List<Rectangle2D> points(Scale scale) {
    return description.series().stream()
        .filter(s -> s.role() == PlotSeries.Role.POINT)
        .flatMap(s -> s.points().stream())
        .<Rectangle2D>map(
            p ->
                new Rectangle2D.Double(
                    scale.x(p) - POINT, scale.y(p) - POINT, 2 * POINT, 2 * POINT))
        .toList();
  }

  private Optional<Rectangle2D> place(PlotDescription.Label label, Scale scale, Graphics2D g) {
    Rectangle2D first = box(label, label.at(), label.anchor(), scale, g);
    if (isFree(first)) {
      return Optional.of(first);
    }
    for (PlotPoint at : label.along()) {
      Rectangle2D box = box(label, at, label.anchor(), scale, g);
      if (isFree(box)) {
        return Optional.of(box);
      }
    }
    if (!label.along().isEmpty()) {
      return Optional.empty();
    }
    for (PlotDescription.Anchor anchor : PlotDescription.Anchor.values()) {
      Rectangle2D box = box(label, label.at(), anchor, scale, g);
      if (isFree(box)) {
        return Optional.of(box);
      }
    }
    return Optional.of(first);
  }

  private boolean isFree(Rectangle2D box) {
    return taken.stream().noneMatch(box::intersects);
  }

  private static Rectangle2D box(
      PlotDescription.Label label,
      PlotPoint at,
      PlotDescription.Anchor anchor,
      Scale scale,
      Graphics2D g) {
    double x = scale.x(at);
    double y = scale.y(at);
    double width = g.getFontMetrics().stringWidth(label.text());
    double height = g.getFontMetrics().getAscent();
    double left =
        switch (anchor) {
          case BOTTOM_LEFT, TOP_LEFT -> x + GAP;
          case BOTTOM_RIGHT, TOP_RIGHT, CENTRE_RIGHT -> x - GAP - width;
          case TOP_CENTRE -> x - width / 2;
        };
    double top =
        switch (anchor) {
          case BOTTOM_LEFT, BOTTOM_RIGHT -> y - GAP - height;
          case TOP_LEFT, TOP_RIGHT, TOP_CENTRE -> y + GAP;
          case CENTRE_RIGHT -> y - height / 2;
        };
    Rectangle2D area = scale.area();
    left = Math.min(Math.max(left, area.getMinX() + 1), area.getMaxX() - width - 1);
    top = Math.min(Math.max(top, area.getMinY() + 1), area.getMaxY() - height - 1);
    return new Rectangle2D.Double(left - 1, top, width + 2, height);
  }

  private void draw(Graphics2D g, PlotDescription.Label label, Rectangle2D box) {
    g.setPaint(look.paper());
    g.fill(box);
    g.setPaint(label.emphasis() ? look.accent() : look.soft());
    g.drawString(
        label.text(), (float) (box.getX() + 1), (float) (box.getY() + 0.86 * box.getHeight()));
    taken.add(box);
  }
}
