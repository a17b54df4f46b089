package perveance.plot;

import java.awt.Shape;
import java.awt.geom.Ellipse2D;
import java.awt.geom.Rectangle2D;
import java.util.ArrayList;
import java.util.List;

/** The strokes of a schematic as what text must not cover. */
final class Obstacles {
  /** Half a stroke's width and a hair of paper. */
  private static final double HALF_STROKE = 0.1;

  private static final double ROUND_FROM = 4;

  private final List<Rectangle2D> boxes = new ArrayList<>();
  private final List<Ellipse2D> circles = new ArrayList<>();

  void add(Shape stroke) {
    if (stroke instanceof Ellipse2D circle && circle.getWidth() > ROUND_FROM) {
      circles.add(
          new Ellipse2D.Double(
              circle.getX() - HALF_STROKE,
              circle.getY() - HALF_STROKE,
              circle.getWidth() + 2 * HALF_STROKE,
              circle.getHeight() + 2 * HALF_STROKE));
      return;
    }
    Rectangle2D b = stroke.getBounds2D();
    boxes.add(
        new Rectangle2D.Double(
            b.getX() - HALF_STROKE,
            b.getY() - HALF_STROKE,
            b.getWidth() + 2 * HALF_STROKE,
            b.getHeight() + 2 * HALF_STROKE));
  }

  /** How much of a box is covered, counted once for each stroke, in square grid units. */
  double covered(Rectangle2D box) {
    double sum = 0;
    for (Rectangle2D other : boxes) {
      sum += common(box, other);
    }
    for (Ellipse2D circle : circles) {
      if (circle.intersects(box)) {
        sum += common(box, circle.getBounds2D());
      }
    }
    return sum;
  }

  /** Area that two boxes share. */
  static double common(Rectangle2D a, Rectangle2D b) {
    double w = Math.min(a.getMaxX(), b.getMaxX()) - Math.max(a.getX(), b.getX());
    double h = Math.min(a.getMaxY(), b.getMaxY()) - Math.max(a.getY(), b.getY());
    return w > 0 && h > 0 ? w * h : 0;
  }

  /** The rectangle around all strokes. */
  Rectangle2D extent() {
    Rectangle2D all = new Rectangle2D.Double();
    boolean first = true;
    for (Rectangle2D box : boxes) {
      all = first ? box : all.createUnion(box);
      first = false;
    }
    for (Ellipse2D circle : circles) {
      all = all.createUnion(circle.getBounds2D());
    }
    return all;
  }
}
