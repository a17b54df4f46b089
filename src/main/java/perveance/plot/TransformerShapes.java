package perveance.plot;

import static perveance.plot.SymbolShapes.line;

import java.awt.Shape;
import java.awt.geom.Arc2D;
import java.awt.geom.Path2D;
import java.util.ArrayList;
import java.util.List;

/**
 * Output transformers in grid units around the core's middle: primary ends at (-2, -4) and (-2, 4),
 * or (-2, -8), (-2, 0), (-2, 8) with a centre tap; secondary ends at (2, -2) and (2, 2).
 */
final class TransformerShapes {
  private TransformerShapes() {}

  static SymbolShapes.Strokes plain() {
    List<Shape> lines = new ArrayList<>();
    winding(lines, -2, -4, 4, 1);
    winding(lines, 2, -2, 2, -1);
    return new SymbolShapes.Strokes(lines, List.of(), core(4));
  }

  static SymbolShapes.Strokes centreTapped() {
    List<Shape> lines = new ArrayList<>();
    winding(lines, -2, -8, 0, 1);
    winding(lines, -2, 0, 8, 1);
    winding(lines, 2, -2, 2, -1);
    return new SymbolShapes.Strokes(lines, List.of(), core(7));
  }

  private static List<Shape> core(double half) {
    return List.of(line(-0.25, -half, -0.25, half), line(0.25, -half, 0.25, half));
  }

  private static void winding(List<Shape> lines, double x, double from, double to, int side) {
    int turns = (int) Math.round((to - from - 1) / 1.0);
    double start = (from + to - turns) / 2;
    double inner = x + side * 0.6;
    Path2D path = new Path2D.Double();
    path.moveTo(x, from);
    path.lineTo(inner, from);
    path.lineTo(inner, start);
    for (int i = 0; i < turns; i++) {
      path.append(
          new Arc2D.Double(inner - 0.5, start + i, 1, 1, 90, side > 0 ? -180 : 180, Arc2D.OPEN),
          false);
    }
    path.moveTo(inner, start + turns);
    path.lineTo(inner, to);
    path.lineTo(x, to);
    lines.add(path);
  }
}
