package perveance.engine.analysis;

import java.util.ArrayList;
import java.util.HashMap;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import java.util.Set;
import perveance.engine.circuit.Circuit;
import perveance.engine.circuit.Element;
import perveance.engine.circuit.Element.Resistor;
import perveance.engine.circuit.Element.Valve;
import perveance.engine.circuit.Element.VoltageSource;
import perveance.engine.stage.Conditions;
import perveance.engine.stage.StageCircuit;
import perveance.engine.stage.StageCircuit.Part;

/**
 * What differs from one specimen of a chassis to the next: each valve section in conduction and in
 * contact potential, each resistor within its tolerance, each stated voltage. All are independent;
 * tolerances are taken as two standard deviations.
 */
final class Causes {
  /** One standard deviation of the logarithm of a valve's conduction, common practice [1]. */
  static final double CONDUCTION = 0.13;

  /** One standard deviation of a valve's contact potential, common practice [V]. */
  static final double CONTACT = 0.08;

  private final Map<String, Integer> placeOf = new HashMap<>();
  private final List<String> elements = new ArrayList<>();
  private final double resistor;
  private final double supply;
  private final double capacitor;

  /**
   * Lists the causes of a whole circuit.
   *
   * @param circuit the whole circuit
   * @param stages its stages, for which resistors are parts
   * @param conditions tolerances
   */
  Causes(Circuit circuit, List<StageCircuit> stages, Conditions conditions) {
    this.resistor = conditions.resistorTolerance() / 2;
    this.supply = conditions.supplyTolerance() / 2;
    this.capacitor = conditions.capacitorTolerance() / 2;
    Set<String> parts = new java.util.HashSet<>();
    for (StageCircuit stage : stages) {
      stage.parts().stream().map(Part::element).forEach(parts::add);
    }
    for (Element element : circuit.elements()) {
      if (element instanceof Valve v) {
        add(v.name());
        elements.add(v.name());
      } else if (element instanceof VoltageSource s && s.voltage() != 0) {
        add(s.name());
      } else if (element instanceof Resistor r
          && (parts.contains(r.name()) || outsideStages(r, stages))) {
        add(r.name());
      }
    }
  }

  private static boolean outsideStages(Resistor r, List<StageCircuit> stages) {
    return stages.stream().noneMatch(s -> r.name().startsWith(s.ref() + "."));
  }

  private void add(String element) {
    placeOf.put(element, elements.size());
    elements.add(element);
  }

  int count() {
    return elements.size();
  }

  /** Place of an element's first cause, -1 for one that does not vary. */
  int place(String element) {
    return placeOf.getOrDefault(element, -1);
  }

  double resistorDeviation() {
    return resistor;
  }

  /** Of the logarithm of a capacitor, which moves corners and nothing at mid-band [1]. */
  double capacitorDeviation() {
    return capacitor;
  }

  double supplyDeviation() {
    return supply;
  }

  /** Names of all causes as the chassis calls them. */
  List<String> names() {
    List<String> names = new ArrayList<>();
    for (int i = 0; i < elements.size(); i++) {
      String element = elements.get(i);
      boolean second = place(element) < i;
      boolean first = i + 1 < elements.size() && elements.get(i + 1).equals(element);
      String what = second ? " contact potential" : first ? " conduction" : "";
      names.add(element + what);
    }
    return names;
  }

  /** Names of all causes as a stage calls them: its own parts by their keys. */
  List<String> names(StageCircuit stage) {
    Optional<String> only =
        stage.devices().size() == 1
            ? Optional.of(stage.devices().get(0).ref() + " ")
            : Optional.empty();
    String own = stage.ref() + ".";
    List<String> names = new ArrayList<>();
    for (String name : names()) {
      if (only.isPresent() && name.startsWith(only.get())) {
        names.add("valve " + name.substring(only.get().length()));
      } else {
        names.add(name.startsWith(own) ? name.substring(own.length()) : name.replace('.', ' '));
      }
    }
    return names;
  }
}
