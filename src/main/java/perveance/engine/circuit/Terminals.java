package perveance.engine.circuit;

import perveance.engine.circuit.Element.Capacitor;
import perveance.engine.circuit.Element.CurrentSource;
import perveance.engine.circuit.Element.Inductor;
import perveance.engine.circuit.Element.Junction;
import perveance.engine.circuit.Element.Resistor;
import perveance.engine.circuit.Element.Transformer;
import perveance.engine.circuit.Element.Valve;
import perveance.engine.circuit.Element.VoltageSource;
import perveance.engine.circuit.Element.Winding;

/** The nodes an element is joined to. */
final class Terminals {
  private Terminals() {}

  static int[] of(Element element) {
    if (element instanceof Resistor e) {
      return new int[] {e.a(), e.b()};
    } else if (element instanceof Capacitor e) {
      return new int[] {e.a(), e.b()};
    } else if (element instanceof Inductor e) {
      return new int[] {e.a(), e.b()};
    } else if (element instanceof VoltageSource e) {
      return new int[] {e.plus(), e.minus()};
    } else if (element instanceof CurrentSource e) {
      return new int[] {e.from(), e.to()};
    } else if (element instanceof Junction e) {
      return new int[] {e.anode(), e.cathode()};
    } else if (element instanceof Valve e) {
      return new int[] {e.anode(), e.grid(), e.screen(), e.cathode()};
    }
    return ofWindings((Transformer) element);
  }

  private static int[] ofWindings(Transformer transformer) {
    int[] nodes = new int[2 * transformer.windings().size()];
    int next = 0;
    for (Winding winding : transformer.windings()) {
      nodes[next++] = winding.start();
      nodes[next++] = winding.end();
    }
    return nodes;
  }
}
