package perveance.engine.circuit;

import java.util.List;
import java.util.Optional;
import perveance.engine.circuit.DcOutcome.Cause;
import perveance.engine.circuit.DcOutcome.NotConverged;
import perveance.engine.circuit.Element.CurrentSource;
import perveance.engine.circuit.Element.Inductor;
import perveance.engine.circuit.Element.Junction;
import perveance.engine.circuit.Element.Resistor;
import perveance.engine.circuit.Element.Transformer;
import perveance.engine.circuit.Element.Valve;
import perveance.engine.circuit.Element.VoltageSource;
import perveance.engine.circuit.Element.Winding;

/**
 * Looks whether the wiring alone determines every dc voltage and current. A node needs a path to
 * chassis through resistors, windings and sources, or both a way in and a way out through valves
 * and junctions; current sources alone determine no voltage. Grids and screens are no paths: what
 * they take depends on leakage.
 */
final class DcPaths {
  private final Circuit circuit;
  private final NodeGroups joined;
  private final NodeGroups ideal;

  /** Nodes joined by anything that lets a voltage set a current. */
  private final NodeGroups related;

  private DcPaths(Circuit circuit) {
    this.circuit = circuit;
    this.joined = new NodeGroups(circuit.nodes().size());
    this.ideal = new NodeGroups(circuit.nodes().size());
    this.related = new NodeGroups(circuit.nodes().size());
  }

  static Optional<NotConverged> refusal(Circuit circuit) {
    DcPaths paths = new DcPaths(circuit);
    Optional<NotConverged> loop = paths.joinAll();
    return loop.isPresent() ? loop : paths.floatingNode();
  }

  private Optional<NotConverged> joinAll() {
    for (Element element : circuit.elements()) {
      boolean closes = false;
      if (element instanceof Resistor e) {
        join(e.a(), e.b());
      } else if (element instanceof Valve e) {
        related.join(e.anode(), e.cathode());
      } else if (element instanceof Junction e) {
        related.join(e.anode(), e.cathode());
      } else if (element instanceof VoltageSource e) {
        join(e.plus(), e.minus());
        closes = !ideal.join(e.plus(), e.minus());
      } else if (element instanceof Inductor e) {
        closes = joinWinding(e.a(), e.b(), e.resistance());
      } else if (element instanceof Transformer e) {
        for (Winding w : e.windings()) {
          closes |= joinWinding(w.start(), w.end(), w.resistance());
        }
      }
      if (closes) {
        return Optional.of(
            refused(
                Cause.SOURCE_LOOP,
                element.name() + " closes a loop of sources or windings without resistance",
                element.name()));
      }
    }
    return Optional.empty();
  }

  private void join(int a, int b) {
    joined.join(a, b);
    related.join(a, b);
  }

  private boolean joinWinding(int a, int b, double resistance) {
    join(a, b);
    return resistance == 0 && !ideal.join(a, b);
  }

  private Optional<NotConverged> floatingNode() {
    boolean[] fed = reach(true);
    boolean[] drained = reach(false);
    for (int node = 0; node < fed.length; node++) {
      boolean related = this.related.of(node) == this.related.of(0);
      if (!related || !fed[node] || !drained[node]) {
        String name = circuit.nodes().get(node);
        return Optional.of(
            refused(Cause.FLOATING_NODE, "node " + name + " has no path for dc to chassis", name));
      }
    }
    return Optional.empty();
  }

  /** Nodes that current can reach from chassis, or from which it can reach chassis. */
  private boolean[] reach(boolean forward) {
    boolean[] reached = new boolean[circuit.nodes().size()];
    boolean[] group = new boolean[reached.length];
    group[joined.of(0)] = true;
    boolean progress = true;
    while (progress) {
      progress = false;
      for (Element element : circuit.elements()) {
        progress |= spread(element, forward, group);
      }
    }
    for (int node = 0; node < reached.length; node++) {
      reached[node] = group[joined.of(node)];
    }
    return reached;
  }

  private boolean spread(Element element, boolean forward, boolean[] group) {
    if (element instanceof Valve e) {
      return link(e.anode(), e.cathode(), forward, group);
    } else if (element instanceof Junction e) {
      boolean reverse = e.law().breakdown() < Double.POSITIVE_INFINITY;
      return link(e.anode(), e.cathode(), forward, group)
          | (reverse && link(e.cathode(), e.anode(), forward, group));
    } else if (element instanceof CurrentSource e) {
      return link(e.from(), e.to(), forward, group) | link(e.to(), e.from(), forward, group);
    }
    return false;
  }

  private boolean link(int from, int to, boolean forward, boolean[] group) {
    int start = joined.of(forward ? from : to);
    int end = joined.of(forward ? to : from);
    if (!group[start] || group[end]) {
      return false;
    }
    group[end] = true;
    return true;
  }

  private static NotConverged refused(Cause cause, String reason, String place) {
    return new NotConverged(cause, reason, place, List.of(), 0);
  }
}
