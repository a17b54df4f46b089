package perveance.engine.stage;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertFalse;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.util.ArrayList;
import java.util.List;
import java.util.Set;
import java.util.TreeSet;
import java.util.stream.Collectors;
import perveance.engine.circuit.Element;
import perveance.engine.stage.Drawing.Symbol;
import perveance.engine.stage.Drawing.SymbolType;
import perveance.engine.stage.Drawing.Wire;
import perveance.engine.stage.SymbolShape.Box;
import perveance.engine.stage.SymbolShape.Point;

/** What every drawing of a stage must keep: complete, joined up, and with room for its text. */
final class DrawingChecks {
  private final StageBench.Built built;
  private final Drawing drawing;
  private final String name;

  DrawingChecks(String name, StageBench.Built built) {
    this.name = name;
    this.built = built;
    this.drawing = built.drawing();
  }

  void all() {
    everyPartOnce();
    wiresEndSomewhere();
    wiresAreStraightAndSeparate();
    nothingOverlaps();
    everythingInside();
    new DrawingNets(name, built).sameAsCircuit();
  }

  private void everyPartOnce() {
    Set<String> expected = new TreeSet<>();
    built.stage().parts().forEach(p -> assertTrue(expected.add(p.element()), p.element()));
    built.stage().devices().forEach(d -> expected.add(d.ref()));
    List<String> drawn =
        drawing.symbols().stream()
            .filter(s -> !isTerminal(s.type()) && s.part().isPresent())
            .map(s -> s.part().get())
            .filter(part -> !unstatedCapacitor(part))
            .sorted()
            .toList();
    assertEquals(List.copyOf(expected), drawn, name);
  }

  /** A capacitor that must be there but is not stated is drawn, yet it is no part to buy. */
  private boolean unstatedCapacitor(String part) {
    return built.stage().parts().stream().noneMatch(p -> p.element().equals(part))
        && built.circuit().elements().get(built.circuit().element(part))
            instanceof Element.Capacitor c
        && c.capacitance() == StageWiring.WITHOUT_CORNER;
  }

  private static boolean isTerminal(SymbolType type) {
    return switch (type) {
      case SUPPLY, BIAS, INPUT, OUTPUT, GROUND, DOT, CURRENT_SOURCE -> true;
      default -> false;
    };
  }

  private void wiresEndSomewhere() {
    for (Wire wire : drawing.wires()) {
      assertJoined(wire, new Point(wire.x1(), wire.y1()));
      assertJoined(wire, new Point(wire.x2(), wire.y2()));
    }
  }

  private void assertJoined(Wire wire, Point end) {
    boolean terminal =
        drawing.symbols().stream()
            .filter(s -> s.type() != SymbolType.DOT)
            .anyMatch(s -> SymbolShape.terminals(s).contains(end));
    boolean other =
        drawing.wires().stream().anyMatch(w -> !w.equals(wire) && (ends(w, end) || passes(w, end)));
    assertTrue(terminal || other, () -> name + ": a wire ends in the air at " + end);
  }

  private static boolean ends(Wire w, Point p) {
    return (w.x1() == p.x() && w.y1() == p.y()) || (w.x2() == p.x() && w.y2() == p.y());
  }

  private static boolean passes(Wire w, Point p) {
    return Junctions.passes(w, p);
  }

  private void wiresAreStraightAndSeparate() {
    List<Wire> wires = drawing.wires();
    for (int i = 0; i < wires.size(); i++) {
      Wire a = wires.get(i);
      assertTrue(a.x1() == a.x2() || a.y1() == a.y2(), () -> name + ": slanting " + a);
      for (Wire b : wires.subList(i + 1, wires.size())) {
        assertFalse(alongEachOther(a, b), () -> name + ": " + a + " lies on " + b);
      }
    }
  }

  private static boolean alongEachOther(Wire a, Wire b) {
    Box x = box(a);
    Box y = box(b);
    boolean upright = a.x1() == a.x2() && b.x1() == b.x2() && a.x1() == b.x1();
    boolean level = a.y1() == a.y2() && b.y1() == b.y2() && a.y1() == b.y1();
    return (upright && x.top() < y.bottom() && y.top() < x.bottom())
        || (level && x.left() < y.right() && y.left() < x.right());
  }

  private static Box box(Wire w) {
    return new Box(
        Math.min(w.x1(), w.x2()),
        Math.min(w.y1(), w.y2()),
        Math.max(w.x1(), w.x2()),
        Math.max(w.y1(), w.y2()));
  }

  private record Area(String what, Box box) {}

  private void nothingOverlaps() {
    List<Area> areas = areas();
    for (int i = 0; i < areas.size(); i++) {
      Area a = areas.get(i);
      for (Area b : areas.subList(i + 1, areas.size())) {
        assertFalse(a.box().overlaps(b.box()), () -> name + ": " + a + " overlaps " + b);
      }
      for (Wire w : drawing.wires()) {
        assertFalse(crosses(w, a.box()), () -> name + ": " + w + " crosses " + a);
      }
    }
  }

  private List<Area> areas() {
    List<Area> areas = new ArrayList<>();
    for (Symbol s : drawing.symbols()) {
      if (s.type() == SymbolType.DOT) {
        continue;
      }
      String what = s.type() + " " + s.part().orElse("");
      areas.add(new Area(what, SymbolShape.box(s)));
      if (s.type() != SymbolType.GROUND) {
        areas.add(new Area("text of " + what, SymbolShape.label(s)));
      }
    }
    drawing.marks().forEach(m -> areas.add(new Area("mark " + m.node(), SymbolShape.label(m))));
    return areas;
  }

  private static boolean crosses(Wire w, Box b) {
    Box a = box(w);
    if (w.x1() == w.x2()) {
      return b.left() < w.x1()
          && w.x1() < b.right()
          && a.top() < b.bottom()
          && b.top() < a.bottom();
    }
    return b.top() < w.y1() && w.y1() < b.bottom() && a.left() < b.right() && b.left() < a.right();
  }

  private void everythingInside() {
    for (Area area : areas()) {
      Box b = area.box();
      boolean inside =
          b.left() >= 0
              && b.top() >= 0
              && b.right() <= drawing.width()
              && b.bottom() <= drawing.height();
      assertTrue(inside, () -> name + ": " + area + " sticks out");
    }
    Set<String> nodes =
        drawing.marks().stream().map(Drawing.NodeMark::node).collect(Collectors.toSet());
    assertTrue(built.circuit().nodes().containsAll(nodes), () -> name + ": no node of " + nodes);
  }
}
