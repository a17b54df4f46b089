package perveance.engine.stage;

import java.util.LinkedHashMap;
import java.util.Map;
import perveance.engine.circuit.Element;
import perveance.engine.stage.Drawing.Symbol;
import perveance.engine.stage.SymbolShape.Point;

/** Which node belongs to which terminal of a drawn transformer. */
final class DrawnTransformer {
  private DrawnTransformer() {}

  static Map<Point, Integer> nodes(Symbol symbol, Element.Transformer transformer) {
    return new LinkedHashMap<>();
  }
}
