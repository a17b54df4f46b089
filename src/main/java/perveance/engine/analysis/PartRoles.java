package perveance.engine.analysis;

import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import perveance.engine.circuit.CapacitorRole;
import perveance.engine.circuit.Element;
import perveance.engine.circuit.Element.Capacitor;
import perveance.engine.circuit.Element.Resistor;
import perveance.engine.stage.ChassisNames;
import perveance.engine.stage.StageCircuit;
import perveance.engine.stage.StageCircuit.Output;
import perveance.engine.stage.StageCircuit.Part;

/** Finds a stage's parts by what they do in its circuit, whatever the kind of the stage. */
final class PartRoles {
  private PartRoles() {}

  /** Whether an element is a part that a person has put in, not a stand-in or a stray. */
  static boolean isPart(StageModel model, Element element) {
    return part(model.stage(), element.name()).isPresent();
  }

  /** Whether a part is what the stage drives: a speaker, headphones, the next grid leak. */
  static boolean isLoad(Part part) {
    return part.role().equals("load");
  }

  static Optional<Part> part(StageCircuit stage, String element) {
    return stage.parts().stream().filter(p -> p.element().equals(element)).findFirst();
  }

  /** Whether a two-terminal part has an end at a node. */
  static boolean touches(StageModel model, Part part, int node) {
    Element element = model.circuit().elements().get(model.circuit().element(part.element()));
    return (element instanceof Resistor r && (r.a() == node || r.b() == node))
        || (element instanceof Capacitor c && (c.a() == node || c.b() == node));
  }

  /** The capacitor through which an output is coupled, if it is a part. */
  static Optional<Capacitor> coupling(StageModel model, Output output) {
    int plus = output.plus();
    for (Element element : model.circuit().elements()) {
      if (element instanceof Capacitor c
          && c.role() == CapacitorRole.HOLDS
          && isPart(model, c)
          && (c.a() == plus || c.b() == plus)
          && c.a() != 0
          && c.b() != 0) {
        return Optional.of(c);
      }
    }
    return Optional.empty();
  }

  /** The only part resistor from a node to a node that stands still [ohm]. */
  static Optional<Double> loadAt(StageModel model, int node) {
    List<Double> found = new ArrayList<>();
    for (Element element : model.circuit().elements()) {
      if (element instanceof Resistor r
          && isPart(model, r)
          && (r.a() == node || r.b() == node)
          && still(model, r.a() == node ? r.b() : r.a())) {
        found.add(r.resistance());
      }
    }
    return found.size() == 1 ? Optional.of(found.get(0)) : Optional.empty();
  }

  private static boolean still(StageModel model, int node) {
    return node == 0 || model.circuit().nodes().get(node).startsWith(ChassisNames.supply(""));
  }
}
