package perveance.plot;

import java.awt.Graphics2D;
import java.awt.geom.AffineTransform;
import java.awt.geom.Rectangle2D;
import java.util.List;
import org.jfree.chart.ChartRenderingInfo;
import org.jfree.chart.JFreeChart;
import perveance.engine.stage.Drawing;

/** Something that draws itself into a rectangle: a chart or a schematic. */
public interface Artwork {
  /** Name of the spot that a chart reports for the area between its axes. */
  String BETWEEN_AXES = "between the axes";

  /** Name of the spots where a chart has drawn texts. */
  String TEXT = "text";

  /**
   * Draws, filling the rectangle as far as the proportions allow.
   *
   * @param g graphics, left as it was found
   * @param area where
   * @return where parts and nodes were drawn, in the units of the area; for a chart the area
   *     between its axes, named {@link #BETWEEN_AXES}
   */
  List<Hotspot> draw(Graphics2D g, Rectangle2D area);

  /**
   * A chart.
   *
   * @param chart the chart
   * @return artwork
   */
  static Artwork of(JFreeChart chart) {
    return (g, area) -> {
      ChartRenderingInfo info = new ChartRenderingInfo(null);
      chart.draw(g, area, info);
      Rectangle2D data = info.getPlotInfo().getDataArea();
      return List.of(Hotspot.of(BETWEEN_AXES, data));
    };
  }

  /**
   * A schematic, as large as fits and not larger than a stated scale.
   *
   * @param painter painter
   * @param drawing geometry
   * @param text words
   * @param largest largest size of one grid unit, in units of the area [1]
   * @param readable size of type that is aimed at where the drawing is small, in units of the area
   *     [1]
   * @return artwork
   */
  static Artwork of(
      SchematicPainter painter,
      Drawing drawing,
      SchematicText text,
      double largest,
      double readable) {
    return (g, area) -> {
      SchematicLayout layout = painter.layout(drawing, text, area, largest, readable);
      double scale = layout.scale(area, largest);
      double x = area.getCenterX() - scale * layout.extent().getCenterX();
      double y = area.getCenterY() - scale * layout.extent().getCenterY();
      AffineTransform before = g.getTransform();
      g.translate(x, y);
      g.scale(scale, scale);
      List<Hotspot> spots = painter.paint(g, layout);
      g.setTransform(before);
      return spots.stream().map(s -> s.scaled(x, y, scale)).toList();
    };
  }
}
