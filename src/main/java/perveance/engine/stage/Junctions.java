package perveance.engine.stage;

import java.util.ArrayList;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import perveance.engine.stage.Drawing.Symbol;
import perveance.engine.stage.Drawing.SymbolType;
import perveance.engine.stage.Drawing.Wire;
import perveance.engine.stage.SymbolShape.Point;

/** Finds the points of a drawing where three or more lines meet and a dot belongs. */
final class Junctions {
  private Junctions() {}

  static List<Point> of(List<Symbol> symbols, List<Wire> wires) {
    Map<Point, Integer> ends = new LinkedHashMap<>();
    for (Wire wire : wires) {
      ends.merge(new Point(wire.x1(), wire.y1()), 1, Integer::sum);
      ends.merge(new Point(wire.x2(), wire.y2()), 1, Integer::sum);
    }
    for (Symbol symbol : symbols) {
      if (symbol.type() != SymbolType.DOT) {
        SymbolShape.terminals(symbol).forEach(p -> ends.merge(p, 1, Integer::sum));
      }
    }
    List<Point> found = new ArrayList<>();
    ends.forEach(
        (point, count) -> {
          long through = wires.stream().filter(w -> passes(w, point)).count();
          if (count + 2 * through >= 3) {
            found.add(point);
          }
        });
    return found;
  }

  /** Whether a wire runs through a point that is not one of its ends. */
  static boolean passes(Wire wire, Point point) {
    boolean upright = wire.x1() == wire.x2() && point.x() == wire.x1();
    boolean level = wire.y1() == wire.y2() && point.y() == wire.y1();
    return (upright && between(wire.y1(), point.y(), wire.y2()))
        || (level && between(wire.x1(), point.x(), wire.x2()));
  }

  private static boolean between(int a, int value, int b) {
    return Math.min(a, b) < value && value < Math.max(a, b);
  }
}
