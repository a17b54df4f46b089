package perveance.plot;

import static perveance.plot.SymbolShapes.line;

import java.awt.BasicStroke;
import java.awt.Shape;
import java.awt.geom.Arc2D;
import java.awt.geom.Ellipse2D;
import java.awt.geom.Path2D;
import java.util.ArrayList;
import java.util.List;

/**
 * Outlines of valves in grid units: envelope of radius three, anode lead up to (0, -4), grid lead
 * to (-4, 0.6 is drawn at 0), cathode lead to (0, 4), screen lead to (4, 0).
 */
final class ValveShapes {
  private ValveShapes() {}

  static SymbolShapes.Strokes triode(boolean directlyHeated) {
    List<Shape> lines = new ArrayList<>();
    List<Shape> heavy = new ArrayList<>();
    envelope(lines);
    anode(lines, heavy);
    grid(lines, heavy, 0, -4);
    cathode(lines, heavy, directlyHeated);
    return new SymbolShapes.Strokes(lines, List.of(), heavy);
  }

  static SymbolShapes.Strokes pentode(boolean beam) {
    List<Shape> lines = new ArrayList<>();
    List<Shape> heavy = new ArrayList<>();
    envelope(lines);
    anode(lines, heavy);
    grid(lines, heavy, 0.7, -4);
    grid(lines, heavy, 0, 4);
    if (beam) {
      heavy.add(line(-1.5, -1.0, -1.5, -0.45));
      heavy.add(line(-1.5, -0.45, -1.1, -0.45));
      heavy.add(line(1.5, -1.0, 1.5, -0.45));
      heavy.add(line(1.5, -0.45, 1.1, -0.45));
    } else {
      heavy.add(dashes(-0.8));
    }
    cathode(lines, heavy, false);
    return new SymbolShapes.Strokes(lines, List.of(), heavy);
  }

  private static void envelope(List<Shape> lines) {
    lines.add(new Ellipse2D.Double(-3, -3, 6, 6));
  }

  private static void anode(List<Shape> lines, List<Shape> heavy) {
    lines.add(line(0, -4, 0, -1.6));
    heavy.add(line(-1.4, -1.6, 1.4, -1.6));
  }

  /** A dashed grid at a height, with its lead at zero height towards the given side. */
  private static void grid(List<Shape> lines, List<Shape> heavy, double height, double end) {
    heavy.add(dashes(height));
    double side = Math.signum(end);
    Path2D lead = new Path2D.Double();
    lead.moveTo(side * 1.7, height);
    if (height != 0) {
      lead.lineTo(side * 2.2, height);
      lead.lineTo(side * 2.2, 0);
    }
    lead.lineTo(end, 0);
    lines.add(lead);
  }

  private static Shape dashes(double height) {
    Path2D path = new Path2D.Double();
    for (int i = 0; i < 4; i++) {
      double x = -1.7 + 0.94 * i;
      path.moveTo(x, height);
      path.lineTo(x + 0.58, height);
    }
    return path;
  }

  private static void cathode(List<Shape> lines, List<Shape> heavy, boolean filament) {
    if (filament) {
      Path2D path = new Path2D.Double();
      path.moveTo(-0.9, 2.4);
      path.lineTo(0, 1.3);
      path.lineTo(0.9, 2.4);
      heavy.add(path);
      lines.add(line(0, 1.3, 0, 4));
      return;
    }
    heavy.add(new Arc2D.Double(-1.3, 1.5, 2.6, 1.4, 20, 140, Arc2D.OPEN));
    lines.add(line(0, 1.5, 0, 4));
  }

  /** Line widths in grid units. */
  static BasicStroke stroke(boolean heavy) {
    return new BasicStroke(heavy ? 0.24f : 0.13f, BasicStroke.CAP_ROUND, BasicStroke.JOIN_ROUND);
  }
}
