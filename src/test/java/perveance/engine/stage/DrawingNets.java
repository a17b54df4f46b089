package perveance.engine.stage;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.util.ArrayList;
import java.util.HashMap;
import java.util.List;
import java.util.Map;
import java.util.Set;
import java.util.TreeSet;
import java.util.stream.Collectors;
import perveance.engine.circuit.CapacitorRole;
import perveance.engine.circuit.Circuit;
import perveance.engine.circuit.Element;
import perveance.engine.stage.Drawing.Symbol;
import perveance.engine.stage.Drawing.SymbolType;
import perveance.engine.stage.Drawing.Wire;
import perveance.engine.stage.SymbolShape.Point;

/**
 * Follows the wires of a drawing and compares what they join with the nodes of the circuit: each
 * net of the drawing must be one node and each node one net.
 */
final class DrawingNets {
  private final String name;
  private final StageBench.Built built;
  private final Circuit circuit;
  private final Map<Point, Point> parent = new HashMap<>();
  private final int[] merged;
  private final Map<Point, Integer> nodeOf = new HashMap<>();

  DrawingNets(String name, StageBench.Built built) {
    this.name = name;
    this.built = built;
    this.circuit = built.circuit();
    this.merged = new int[circuit.nodes().size()];
    joinWires();
    joinIdealCapacitors();
  }

  private void joinWires() {
    List<Point> points = new ArrayList<>();
    for (Wire w : built.drawing().wires()) {
      points.add(new Point(w.x1(), w.y1()));
      points.add(new Point(w.x2(), w.y2()));
    }
    built.drawing().symbols().forEach(s -> points.addAll(SymbolShape.terminals(s)));
    built.drawing().marks().forEach(m -> points.add(new Point(m.x(), m.y())));
    for (Wire w : built.drawing().wires()) {
      Point first = new Point(w.x1(), w.y1());
      join(first, new Point(w.x2(), w.y2()));
      points.stream().filter(p -> Junctions.passes(w, p)).forEach(p -> join(first, p));
    }
  }

  private Point root(Point p) {
    Point up = parent.getOrDefault(p, p);
    return up.equals(p) ? p : root(up);
  }

  private void join(Point a, Point b) {
    parent.put(root(a), root(b));
  }

  /** The capacitor before an input belongs to the stage before and is drawn as a wire. */
  private void joinIdealCapacitors() {
    Set<String> drawn =
        built.drawing().symbols().stream()
            .flatMap(s -> s.part().stream())
            .collect(Collectors.toSet());
    for (int i = 0; i < merged.length; i++) {
      merged[i] = i;
    }
    for (Element e : circuit.elements()) {
      if (e instanceof Element.Capacitor c
          && c.role() == CapacitorRole.HOLDS
          && !drawn.contains(c.name())) {
        int from = merged[Math.max(c.a(), c.b())];
        int to = merged[Math.min(c.a(), c.b())];
        for (int i = 0; i < merged.length; i++) {
          merged[i] = merged[i] == from ? to : merged[i];
        }
      }
    }
  }

  void sameAsCircuit() {
    built.drawing().symbols().forEach(this::known);
    built
        .drawing()
        .marks()
        .forEach(m -> set(new Point(m.x(), m.y()), circuit.node(m.node()), "mark " + m.node()));
    boolean more = true;
    while (more) {
      int before = nodeOf.size();
      built.drawing().symbols().forEach(this::twoTerminals);
      more = nodeOf.size() > before;
    }
    built.drawing().symbols().forEach(this::checkBoth);
    Map<Integer, Set<String>> nets = new HashMap<>();
    nodeOf.forEach(
        (net, node) -> nets.computeIfAbsent(node, n -> new TreeSet<>()).add(net.toString()));
    for (Map.Entry<Integer, Set<String>> e : nets.entrySet()) {
      String node = circuit.nodes().get(e.getKey());
      boolean rail = node.equals("chassis") || node.startsWith("supply.") || node.endsWith(".bias");
      assertTrue(
          rail || e.getValue().size() == 1, () -> name + ": " + node + " is in pieces: " + e);
    }
  }

  private void set(Point p, int node, String what) {
    Integer old = nodeOf.putIfAbsent(root(p), merged[node]);
    if (old != null) {
      assertEquals(circuit.nodes().get(old), circuit.nodes().get(merged[node]), name + ": " + what);
    }
  }

  private void known(Symbol s) {
    List<Point> t = SymbolShape.terminals(s);
    String what = s.type() + " " + s.part().orElse("");
    if (s.type() == SymbolType.GROUND) {
      set(t.get(0), 0, what);
    } else if (s.part().isEmpty()) {
      return;
    } else if (s.type() == SymbolType.INPUT) {
      set(t.get(0), ((Element.Resistor) element(s)).b(), what);
    } else if (element(s) instanceof Element.VoltageSource v) {
      set(t.get(0), v.plus(), what);
    } else if (element(s) instanceof Element.Valve v) {
      set(t.get(0), v.anode(), what + " anode");
      set(t.get(1), v.grid(), what + " grid");
      set(t.get(2), v.cathode(), what + " cathode");
      if (t.size() > 3) {
        set(t.get(3), v.screen(), what + " screen");
      }
    } else if (element(s) instanceof Element.Transformer x) {
      DrawnTransformer.nodes(s, x).forEach((point, node) -> set(point, node, what));
    }
  }

  private Element element(Symbol s) {
    String part = s.part().orElseThrow();
    return circuit.elements().stream()
        .filter(e -> e.name().equals(part))
        .findFirst()
        .orElseThrow(() -> new AssertionError(name + ": no element " + part));
  }

  private int[] ends(Symbol s) {
    boolean pair =
        s.part().isPresent()
            && s.type() != SymbolType.INPUT
            && SymbolShape.terminals(s).size() == 2;
    if (!pair) {
      return new int[0];
    }
    Element e = element(s);
    if (e instanceof Element.Resistor r) {
      return new int[] {merged[r.a()], merged[r.b()]};
    } else if (e instanceof Element.Capacitor c) {
      return new int[] {merged[c.a()], merged[c.b()]};
    } else if (e instanceof Element.Inductor l) {
      return new int[] {merged[l.a()], merged[l.b()]};
    } else if (e instanceof Element.Junction j) {
      return new int[] {merged[j.anode()], merged[j.cathode()]};
    }
    Element.CurrentSource i = (Element.CurrentSource) e;
    return new int[] {merged[i.from()], merged[i.to()]};
  }

  private void twoTerminals(Symbol s) {
    int[] ends = ends(s);
    if (ends.length == 0) {
      return;
    }
    List<Point> t = SymbolShape.terminals(s);
    for (int i = 0; i < 2; i++) {
      Integer here = nodeOf.get(root(t.get(i)));
      if (here != null && (here == ends[0] || here == ends[1])) {
        set(t.get(1 - i), here == ends[0] ? ends[1] : ends[0], s.part().orElseThrow());
      }
    }
  }

  private void checkBoth(Symbol s) {
    int[] ends = ends(s);
    if (ends.length == 0) {
      return;
    }
    List<Point> t = SymbolShape.terminals(s);
    List<Integer> drawn = t.stream().map(p -> nodeOf.getOrDefault(root(p), -1)).sorted().toList();
    List<Integer> wired = java.util.stream.IntStream.of(ends).sorted().boxed().toList();
    assertEquals(wired, drawn, name + ": " + s.part().orElseThrow());
  }
}
