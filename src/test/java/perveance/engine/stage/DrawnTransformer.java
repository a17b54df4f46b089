package perveance.engine.stage;

import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import perveance.engine.circuit.Element;
import perveance.engine.circuit.Element.Winding;
import perveance.engine.stage.Drawing.Symbol;
import perveance.engine.stage.Drawing.SymbolType;
import perveance.engine.stage.SymbolShape.Point;

/** Which node belongs to which terminal of a drawn transformer. */
final class DrawnTransformer {
  private DrawnTransformer() {}

  static Map<Point, Integer> nodes(Symbol symbol, Element.Transformer transformer) {
    List<Point> t = SymbolShape.terminals(symbol);
    List<Winding> w = transformer.windings();
    Winding secondary = w.get(w.size() - 1);
    Map<Point, Integer> nodes = new LinkedHashMap<>();
    nodes.put(t.get(t.size() - 2), secondary.start());
    nodes.put(t.get(t.size() - 1), secondary.end());
    nodes.put(t.get(0), w.get(0).end());
    if (symbol.type() == SymbolType.TRANSFORMER) {
      nodes.put(t.get(1), w.get(w.size() - 2).start());
      if (w.size() == 3) {
        nodes.put(t.get(2), w.get(0).start());
      }
      return nodes;
    }
    nodes.put(t.get(1), w.get(0).end());
    nodes.put(t.get(0), w.get(w.size() == 5 ? 1 : 0).start());
    nodes.put(t.get(2), w.get(w.size() == 5 ? 3 : 1).end());
    if (w.size() == 5) {
      nodes.put(t.get(3), w.get(0).start());
      nodes.put(t.get(4), w.get(2).end());
    }
    return nodes;
  }
}
