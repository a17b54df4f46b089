package perveance.engine.circuit;

import java.util.ArrayList;
import java.util.List;
import perveance.engine.circuit.Element.Capacitor;
import perveance.engine.circuit.Element.CurrentSource;
import perveance.engine.circuit.Element.Inductor;
import perveance.engine.circuit.Element.Resistor;
import perveance.engine.circuit.Element.Valve;
import perveance.engine.circuit.Element.VoltageSource;
import perveance.engine.device.DeviceLaw;

/**
 * The values of a circuit's elements as they now are: they start as the circuit states them and may
 * be changed by element index without allocating.
 */
final class ElementValues {
  private final Circuit circuit;

  /** Resistance, capacitance, inductance, source voltage or current by element [SI]. */
  final double[] value;

  private final DeviceLaw[] laws;
  private boolean changed;

  ElementValues(Circuit circuit) {
    this.circuit = circuit;
    int count = circuit.elements().size();
    value = new double[count];
    laws = new DeviceLaw[count];
    for (int i = 0; i < count; i++) {
      value[i] = stated(circuit.elements().get(i));
      if (circuit.elements().get(i) instanceof Valve valve) {
        laws[i] = valve.law();
      }
    }
  }

  private static double stated(Element element) {
    if (element instanceof Resistor e) {
      return e.resistance();
    } else if (element instanceof Capacitor e) {
      return e.capacitance();
    } else if (element instanceof Inductor e) {
      return e.inductance();
    } else if (element instanceof VoltageSource e) {
      return e.voltage();
    } else if (element instanceof CurrentSource e) {
      return e.current();
    }
    return 0;
  }

  DeviceLaw law(int element) {
    return laws[element];
  }

  void set(int element, Class<? extends Element> kind, double newValue) {
    requireKind(element, kind);
    value[element] = newValue;
    changed = true;
  }

  void setLaw(int element, DeviceLaw law) {
    requireKind(element, Valve.class);
    if (law.kind() != laws[element].kind()) {
      throw new IllegalArgumentException(
          "law is a " + law.kind() + ", not a " + laws[element].kind());
    }
    laws[element] = law;
    changed = true;
  }

  /** Takes all values of another set for the same circuit. */
  void copy(ElementValues other) {
    System.arraycopy(other.value, 0, value, 0, value.length);
    System.arraycopy(other.laws, 0, laws, 0, laws.length);
    changed = true;
  }

  private void requireKind(int element, Class<? extends Element> kind) {
    if (element < 0 || element >= value.length) {
      throw new IllegalArgumentException("no element with index " + element);
    }
    if (!kind.isInstance(circuit.elements().get(element))) {
      throw new IllegalArgumentException(
          circuit.elements().get(element).name() + " is no " + kind.getSimpleName());
    }
  }

  /** The circuit with the values as they now are. */
  Circuit asCircuit() {
    if (!changed) {
      return circuit;
    }
    List<Element> elements = new ArrayList<>();
    for (int i = 0; i < value.length; i++) {
      elements.add(current(circuit.elements().get(i), i));
    }
    return new Circuit(circuit.nodes(), elements);
  }

  private Element current(Element stated, int i) {
    if (stated instanceof Resistor e) {
      return new Resistor(e.name(), e.a(), e.b(), value[i]);
    } else if (stated instanceof Capacitor e) {
      return new Capacitor(e.name(), e.a(), e.b(), value[i], e.role());
    } else if (stated instanceof Inductor e) {
      return new Inductor(e.name(), e.a(), e.b(), value[i], e.resistance());
    } else if (stated instanceof VoltageSource e) {
      return new VoltageSource(e.name(), e.plus(), e.minus(), value[i]);
    } else if (stated instanceof CurrentSource e) {
      return new CurrentSource(e.name(), e.from(), e.to(), value[i]);
    } else if (stated instanceof Valve e) {
      return new Valve(e.name(), laws[i], e.anode(), e.grid(), e.screen(), e.cathode());
    }
    return stated;
  }
}
