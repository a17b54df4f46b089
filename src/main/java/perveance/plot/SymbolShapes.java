package perveance.plot;

import java.awt.Shape;
import java.awt.geom.Arc2D;
import java.awt.geom.Ellipse2D;
import java.awt.geom.Line2D;
import java.awt.geom.Path2D;
import java.awt.geom.Rectangle2D;
import java.util.List;

/**
 * Outlines of the circuit symbols (IEC 60617 shapes, with the zigzag resistor as an option), in
 * grid units around the symbol's centre. Two-terminal symbols run from (0, -2) to (0, 2).
 */
final class SymbolShapes {
  private SymbolShapes() {}

  /**
   * A symbol's strokes.
   *
   * @param lines drawn as outline
   * @param solids filled
   * @param heavy drawn with a heavier line
   */
  record Strokes(List<Shape> lines, List<Shape> solids, List<Shape> heavy) {}

  static Strokes resistor(boolean zigzag) {
    if (!zigzag) {
      return plain(
          line(0, -2, 0, -1.2), new Rectangle2D.Double(-0.45, -1.2, 0.9, 2.4), line(0, 1.2, 0, 2));
    }
    Path2D path = new Path2D.Double();
    path.moveTo(0, -2);
    path.lineTo(0, -1.2);
    for (int i = 0; i < 6; i++) {
      path.lineTo(i % 2 == 0 ? 0.5 : -0.5, -1.0 + 0.4 * i);
    }
    path.lineTo(0, 1.2);
    path.lineTo(0, 2);
    return plain(path);
  }

  static Strokes capacitor() {
    return new Strokes(
        List.of(line(0, -2, 0, -0.25), line(0, 0.25, 0, 2)),
        List.of(),
        List.of(line(-0.9, -0.25, 0.9, -0.25), line(-0.9, 0.25, 0.9, 0.25)));
  }

  static Strokes electrolytic() {
    return new Strokes(
        List.of(
            line(0, -2, 0, -0.45),
            line(0, 0.25, 0, 2),
            new Rectangle2D.Double(-0.9, -0.45, 1.8, 0.22),
            line(0.5, -1.1, 1.0, -1.1),
            line(0.75, -1.35, 0.75, -0.85)),
        List.of(),
        List.of(line(-0.9, 0.25, 0.9, 0.25)));
  }

  static Strokes inductor() {
    Path2D path = new Path2D.Double();
    path.moveTo(0, -2);
    path.lineTo(0, -1.6);
    for (int i = 0; i < 4; i++) {
      path.append(new Arc2D.Double(-0.4, -1.6 + 0.8 * i, 0.8, 0.8, 90, -180, Arc2D.OPEN), false);
    }
    path.moveTo(0, 1.6);
    path.lineTo(0, 2);
    return plain(path);
  }

  static Strokes diode(boolean zener, boolean light) {
    Path2D body = triangle(-0.7, -0.6, 0.7, -0.6, 0, 0.6);
    Path2D bar = new Path2D.Double();
    bar.moveTo(-0.7, zener ? 0.95 : 0.6);
    bar.lineTo(-0.7, 0.6);
    bar.lineTo(0.7, 0.6);
    if (zener) {
      bar.lineTo(0.7, 0.25);
    }
    List<Shape> lines =
        new java.util.ArrayList<>(List.of(line(0, -2, 0, -0.6), line(0, 0.6, 0, 2), body, bar));
    if (light) {
      lines.add(arrow(0.9, -0.1, 1.6, -0.6));
      lines.add(arrow(0.9, 0.5, 1.6, 0.0));
    }
    return new Strokes(lines, List.of(), List.of());
  }

  static Strokes currentSource() {
    return new Strokes(
        List.of(
            line(0, -2, 0, -1),
            line(0, 1, 0, 2),
            new Ellipse2D.Double(-1, -1, 2, 2),
            arrow(0, -0.6, 0, 0.6)),
        List.of(),
        List.of());
  }

  static Strokes ground() {
    return new Strokes(List.of(), List.of(), List.of(line(-0.7, 0, 0.7, 0)));
  }

  static Strokes supply() {
    return new Strokes(List.of(), List.of(), List.of(line(-2, 0, 2, 0)));
  }

  static Strokes terminal() {
    return plain(new Ellipse2D.Double(-0.28, -0.28, 0.56, 0.56));
  }

  static Strokes dot() {
    return new Strokes(
        List.of(), List.of(new Ellipse2D.Double(-0.24, -0.24, 0.48, 0.48)), List.of());
  }

  static Strokes plain(Shape... lines) {
    return new Strokes(List.of(lines), List.of(), List.of());
  }

  static Line2D line(double x1, double y1, double x2, double y2) {
    return new Line2D.Double(x1, y1, x2, y2);
  }

  private static Path2D triangle(double x1, double y1, double x2, double y2, double x3, double y3) {
    Path2D path = new Path2D.Double();
    path.moveTo(x1, y1);
    path.lineTo(x2, y2);
    path.lineTo(x3, y3);
    path.closePath();
    return path;
  }

  private static Path2D arrow(double x1, double y1, double x2, double y2) {
    double angle = Math.atan2(y2 - y1, x2 - x1);
    Path2D path = new Path2D.Double();
    path.moveTo(x1, y1);
    path.lineTo(x2, y2);
    for (double turn : new double[] {2.6, -2.6}) {
      path.moveTo(x2, y2);
      path.lineTo(x2 + 0.35 * Math.cos(angle + turn), y2 + 0.35 * Math.sin(angle + turn));
    }
    return path;
  }
}
