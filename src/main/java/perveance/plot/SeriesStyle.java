package perveance.plot;

import java.awt.BasicStroke;
import java.awt.Color;
import java.awt.Shape;
import java.awt.geom.Ellipse2D;
import java.awt.geom.Path2D;
import org.jfree.chart.renderer.xy.XYAreaRenderer;
import org.jfree.chart.renderer.xy.XYItemRenderer;
import org.jfree.chart.renderer.xy.XYLineAndShapeRenderer;

/** How each role of a series is drawn; told apart by line as well as by colour. */
final class SeriesStyle {
  private static final float[] FULL = {};
  private static final float[] DASHED = {6, 4};
  private static final float[] DOTTED = {2, 3};
  private final Look look;

  SeriesStyle(Look look) {
    this.look = look;
  }

  XYItemRenderer renderer(PlotSeries.Role role) {
    return switch (role) {
      case CURVE -> line(look.ink(), 0.9f, FULL);
      case MINOR_CURVE -> line(look.soft(), 0.6f, FULL);
      case LIMIT -> line(look.limit(), 1.2f, DOTTED);
      case MARK -> line(look.soft(), 1f, DOTTED);
      case DC_LINE -> line(look.ink(), 1.3f, FULL);
      case AC_LINE -> line(look.accent(), 1.1f, DASHED);
      case EXCURSION -> line(look.accent(), 3.2f, FULL);
      case MAIN -> line(look.accent(), 1.6f, FULL);
      case SECOND -> line(look.ink(), 1.2f, DASHED);
      case THIRD -> line(look.soft(), 1.2f, DOTTED);
      case POINT -> marker(new Ellipse2D.Double(-4, -4, 8, 8), look.accent(), look.paper());
      case READINGS -> marker(new Ellipse2D.Double(-2.5, -2.5, 5, 5), look.ink(), look.ink());
      case DISTRUSTED -> marker(cross(4), look.limit(), look.limit());
      case REGION -> region();
    };
  }

  private static XYLineAndShapeRenderer line(Color colour, float width, float[] dash) {
    XYLineAndShapeRenderer renderer = new XYLineAndShapeRenderer(true, false);
    renderer.setDrawSeriesLineAsPath(true);
    renderer.setSeriesPaint(0, colour);
    renderer.setSeriesStroke(
        0,
        dash.length == 0
            ? new BasicStroke(width, BasicStroke.CAP_ROUND, BasicStroke.JOIN_ROUND)
            : new BasicStroke(width, BasicStroke.CAP_BUTT, BasicStroke.JOIN_ROUND, 10f, dash, 0f));
    return renderer;
  }

  private static XYLineAndShapeRenderer marker(Shape shape, Color edge, Color fill) {
    XYLineAndShapeRenderer renderer = new XYLineAndShapeRenderer(false, true);
    renderer.setSeriesShape(0, shape);
    renderer.setUseFillPaint(true);
    renderer.setUseOutlinePaint(true);
    renderer.setSeriesFillPaint(0, fill);
    renderer.setSeriesOutlinePaint(0, edge);
    renderer.setSeriesOutlineStroke(0, new BasicStroke(2f));
    renderer.setSeriesPaint(0, edge);
    return renderer;
  }

  private XYAreaRenderer region() {
    XYAreaRenderer renderer = new XYAreaRenderer(XYAreaRenderer.AREA);
    renderer.setSeriesPaint(0, look.shade());
    return renderer;
  }

  private static Shape cross(double half) {
    Path2D path = new Path2D.Double();
    path.moveTo(-half, -half);
    path.lineTo(half, half);
    path.moveTo(-half, half);
    path.lineTo(half, -half);
    return path;
  }
}
