package perveance.plot;

import java.awt.Font;
import java.awt.Graphics2D;
import java.awt.geom.Rectangle2D;
import org.jfree.chart.annotations.AbstractXYAnnotation;
import org.jfree.chart.axis.ValueAxis;
import org.jfree.chart.plot.PlotRenderingInfo;
import org.jfree.chart.plot.XYPlot;

/** Text inside the plot, on a patch of paper so that lines do not strike it through. */
final class LabelAnnotation extends AbstractXYAnnotation {
  private static final long serialVersionUID = 1L;
  private static final double GAP = 2;

  private final transient PlotDescription.Label label;
  private final transient Look look;
  private final Font font;

  LabelAnnotation(PlotDescription.Label label, Look look, PlotFonts fonts, double textSize) {
    this.label = label;
    this.look = look;
    this.font = label.emphasis() ? fonts.bold(textSize) : fonts.regular(0.92 * textSize);
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
    double x = domain.valueToJava2D(label.at().x(), area, plot.getDomainAxisEdge());
    double y = range.valueToJava2D(label.at().y(), area, plot.getRangeAxisEdge());
    g.setFont(font);
    double width = g.getFontMetrics().stringWidth(label.text());
    double height = g.getFontMetrics().getAscent();
    double left =
        switch (label.anchor()) {
          case BOTTOM_LEFT, TOP_LEFT -> x + GAP;
          case BOTTOM_RIGHT, TOP_RIGHT, CENTRE_RIGHT -> x - GAP - width;
          case TOP_CENTRE -> x - width / 2;
        };
    double top =
        switch (label.anchor()) {
          case BOTTOM_LEFT, BOTTOM_RIGHT -> y - GAP - height;
          case TOP_LEFT, TOP_RIGHT, TOP_CENTRE -> y + GAP;
          case CENTRE_RIGHT -> y - height / 2;
        };
    left = Math.min(Math.max(left, area.getMinX() + 1), area.getMaxX() - width - 1);
    top = Math.min(Math.max(top, area.getMinY() + 1), area.getMaxY() - height - 1);
    g.setPaint(look.paper());
    g.fill(new Rectangle2D.Double(left - 1, top, width + 2, height));
    g.setPaint(label.emphasis() ? look.accent() : look.soft());
    g.drawString(label.text(), (float) left, (float) (top + 0.86 * height));
  }
}
