package perveance.plot;

import java.awt.Graphics2D;
import java.awt.geom.AffineTransform;
import java.awt.geom.Rectangle2D;
import java.util.List;
import org.jfree.chart.JFreeChart;
import perveance.engine.stage.Drawing;

/** Something that draws itself into a rectangle: a chart or a schematic. */
public interface Artwork {
  /**
   * Draws, filling the rectangle as far as the proportions allow.
   *
   * @param g graphics, left as it was found
   * @param area where
   * @return where parts and nodes were drawn, in the units of the area; empty for a chart
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
      chart.draw(g, area);
      return List.of();
    };
  }

  /**
   * A schematic, as large as fits and not larger than a stated scale.
   *
   * @param painter painter
   * @param drawing geometry
   * @param text words
   * @param largest largest size of one grid unit, in units of the area [1]
   * @return artwork
   */
  static Artwork of(SchematicPainter painter, Drawing drawing, SchematicText text, double largest) {
    return (g, area) -> {
      Rectangle2D extent = painter.extent(drawing, text);
      double scale =
          Math.min(
              largest,
              Math.min(area.getWidth() / extent.getWidth(), area.getHeight() / extent.getHeight()));
      double x = area.getCenterX() - scale * extent.getCenterX();
      double y = area.getCenterY() - scale * extent.getCenterY();
      AffineTransform before = g.getTransform();
      g.translate(x, y);
      g.scale(scale, scale);
      List<Hotspot> spots = painter.paint(g, drawing, text);
      g.setTransform(before);
      return spots.stream()
          .map(
              s ->
                  new Hotspot(
                      s.name(),
                      s.node(),
                      x + scale * s.x(),
                      y + scale * s.y(),
                      scale * s.width(),
                      scale * s.height()))
          .toList();
    };
  }
}
