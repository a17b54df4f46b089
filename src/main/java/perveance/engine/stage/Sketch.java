package perveance.engine.stage;

import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import perveance.engine.stage.Drawing.NodeMark;
import perveance.engine.stage.Drawing.Side;
import perveance.engine.stage.Drawing.Symbol;
import perveance.engine.stage.Drawing.SymbolType;
import perveance.engine.stage.Drawing.Wire;
import perveance.engine.stage.SymbolShape.Box;
import perveance.engine.stage.SymbolShape.Point;

/**
 * Collects the symbols and wires of a drawing at whatever coordinates suit; the finished drawing is
 * moved to begin at its margin and gets a dot wherever three lines meet.
 */
final class Sketch {
  private static final int MARGIN = 1;

  private final StageValues values;
  private final List<Symbol> symbols = new ArrayList<>();
  private final List<Wire> wires = new ArrayList<>();
  private final List<NodeMark> marks = new ArrayList<>();

  Sketch(StageValues values) {
    this.values = values;
  }

  StageValues values() {
    return values;
  }

  /** A symbol with two terminals, upright, for an element of this stage. */
  void upright(SymbolType type, int x, int y, String local, Side label) {
    add(type, x, y, false, false, name(local), label, "");
  }

  /** A symbol with two terminals, lying, for an element of this stage. */
  void lying(SymbolType type, int x, int y, String local, Side label) {
    add(type, x, y, true, false, name(local), label, "");
  }

  /** A valve; its element carries the reference itself. */
  void valve(SymbolType type, int x, int y, boolean mirrored, String ref, Side label) {
    add(type, x, y, false, mirrored, Optional.of(ref), label, "");
  }

  /** A symbol with terminals of its own, for an element of this stage. */
  void symbol(SymbolType type, int x, int y, String local, Side label, String text) {
    add(type, x, y, false, false, name(local), label, text);
  }

  /** A source of this stage with what is stated for it, as it is written. */
  void source(SymbolType type, int x, int y, KeySpec key, Side label, String what) {
    String stated = values.word(key.key()).orElse("");
    add(
        type,
        x,
        y,
        false,
        false,
        name(key.key()),
        label,
        (what + " " + stated.replace('-', '\u2212')).strip());
  }

  /** The rail of the supply that a key names. */
  void supply(int x, int y, KeySpec key, Side label) {
    String supply = values.word(key.key()).orElse("");
    Optional<String> part = Optional.of(ChassisNames.supply(supply));
    add(SymbolType.SUPPLY, x, y, false, false, part, label, supply);
  }

  void ground(int x, int y) {
    add(SymbolType.GROUND, x, y, false, false, Optional.empty(), Side.BELOW, "");
  }

  /** An input terminal; empty part where the stage before is wired straight to it. */
  void input(int x, int y, Optional<KeySpec> key, String text) {
    Optional<String> part = key.flatMap(k -> name(k.key()));
    add(SymbolType.INPUT, x, y, false, false, part, Side.ABOVE, text);
  }

  /** An input terminal for an element of its own name. */
  void input(int x, int y, String local, String text) {
    add(SymbolType.INPUT, x, y, false, false, name(local), Side.ABOVE, text);
  }

  /** An output terminal; to the left of what drives it when mirrored. */
  void output(int x, int y, boolean mirrored, String text) {
    add(SymbolType.OUTPUT, x, y, false, mirrored, Optional.empty(), Side.ABOVE, text);
  }

  /** The rail of a negative supply, below what hangs on it. */
  void negativeSupply(int x, int y, KeySpec key) {
    String supply = values.word(key.key()).orElse("");
    Optional<String> part = Optional.of(ChassisNames.supply(supply));
    add(SymbolType.BIAS, x, y, false, false, part, Side.BELOW, supply);
  }

  /** A wire through the given points, x and y in turn. */
  void wire(int... points) {
    for (int i = 0; i + 3 < points.length; i += 2) {
      boolean longer = points[i] != points[i + 2] || points[i + 1] != points[i + 3];
      if (longer) {
        wires.add(new Wire(points[i], points[i + 1], points[i + 2], points[i + 3]));
      }
    }
  }

  void mark(int x, int y, String node, Side label) {
    marks.add(new NodeMark(x, y, values.ref() + "." + node, label));
  }

  private Optional<String> name(String local) {
    return Optional.of(values.ref() + "." + local);
  }

  private void add(
      SymbolType type,
      int x,
      int y,
      boolean turned,
      boolean mirrored,
      Optional<String> part,
      Side label,
      String text) {
    symbols.add(new Symbol(type, x, y, turned, mirrored, part, label, text));
  }

  Drawing finish() {
    Junctions.of(symbols, wires)
        .forEach(
            p -> add(SymbolType.DOT, p.x(), p.y(), false, false, Optional.empty(), Side.LEFT, ""));
    Box all = extent();
    int dx = MARGIN - all.left();
    int dy = MARGIN - all.top();
    return new Drawing(
        all.right() + dx + MARGIN,
        all.bottom() + dy + MARGIN,
        symbols.stream().map(s -> moved(s, dx, dy)).toList(),
        wires.stream()
            .map(w -> new Wire(w.x1() + dx, w.y1() + dy, w.x2() + dx, w.y2() + dy))
            .toList(),
        marks.stream()
            .map(m -> new NodeMark(m.x() + dx, m.y() + dy, m.node(), m.label()))
            .toList());
  }

  private static Symbol moved(Symbol s, int dx, int dy) {
    return new Symbol(
        s.type(), s.x() + dx, s.y() + dy, s.turned(), s.mirrored(), s.part(), s.label(), s.text());
  }

  private Box extent() {
    List<Box> boxes = new ArrayList<>();
    for (Symbol symbol : symbols) {
      boxes.add(SymbolShape.box(symbol));
      boxes.add(SymbolShape.label(symbol));
      for (Point point : SymbolShape.terminals(symbol)) {
        boxes.add(new Box(point.x(), point.y(), point.x(), point.y()));
      }
    }
    marks.forEach(mark -> boxes.add(SymbolShape.label(mark)));
    wires.forEach(w -> boxes.add(around(w)));
    return boxes.stream().reduce(Sketch::around).orElse(new Box(0, 0, 0, 0));
  }

  private static Box around(Wire w) {
    return new Box(
        Math.min(w.x1(), w.x2()),
        Math.min(w.y1(), w.y2()),
        Math.max(w.x1(), w.x2()),
        Math.max(w.y1(), w.y2()));
  }

  private static Box around(Box a, Box b) {
    return new Box(
        Math.min(a.left(), b.left()),
        Math.min(a.top(), b.top()),
        Math.max(a.right(), b.right()),
        Math.max(a.bottom(), b.bottom()));
  }
}
