package perveance.engine.circuit;

import java.util.ArrayList;
import java.util.List;
import perveance.engine.circuit.Element.Capacitor;
import perveance.engine.circuit.Element.CurrentSource;
import perveance.engine.circuit.Element.Inductor;
import perveance.engine.circuit.Element.Junction;
import perveance.engine.circuit.Element.Resistor;
import perveance.engine.circuit.Element.Transformer;
import perveance.engine.circuit.Element.Valve;
import perveance.engine.circuit.Element.VoltageSource;
import perveance.engine.circuit.Element.Winding;
import perveance.engine.device.DeviceLaw;

/** Writes test circuits in a line an element, nodes by name; "0" is chassis. */
final class CircuitSketch {
  private final Circuit.Builder builder = new Circuit.Builder();

  private int node(String name) {
    return name.equals("0") ? 0 : builder.node(name);
  }

  CircuitSketch resistor(String name, String a, String b, double ohm) {
    builder.add(new Resistor(name, node(a), node(b), ohm));
    return this;
  }

  CircuitSketch holds(String name, String a, String b, double farad) {
    builder.add(new Capacitor(name, node(a), node(b), farad, CapacitorRole.HOLDS));
    return this;
  }

  CircuitSketch stray(String name, String a, String b, double farad) {
    builder.add(new Capacitor(name, node(a), node(b), farad, CapacitorRole.STRAY));
    return this;
  }

  CircuitSketch inductor(String name, String a, String b, double henry, double ohm) {
    builder.add(new Inductor(name, node(a), node(b), henry, ohm));
    return this;
  }

  CircuitSketch source(String name, String plus, String minus, double volt) {
    builder.add(new VoltageSource(name, node(plus), node(minus), volt));
    return this;
  }

  CircuitSketch current(String name, String from, String to, double ampere) {
    builder.add(new CurrentSource(name, node(from), node(to), ampere));
    return this;
  }

  CircuitSketch junction(String name, String anode, String cathode, JunctionLaw law) {
    builder.add(new Junction(name, node(anode), node(cathode), law));
    return this;
  }

  CircuitSketch triode(String name, DeviceLaw law, String anode, String grid, String cathode) {
    int k = node(cathode);
    builder.add(new Valve(name, law, node(anode), node(grid), k, k));
    return this;
  }

  /** A winding between named nodes. */
  record Coil(String start, String end, double turns, double ohm, double leakage) {}

  CircuitSketch transformer(String name, double magnetising, Coil... coils) {
    List<Winding> windings = new ArrayList<>();
    for (Coil c : coils) {
      windings.add(new Winding(node(c.start), node(c.end), c.turns, c.ohm, c.leakage));
    }
    builder.add(new Transformer(name, windings, magnetising));
    return this;
  }

  CircuitSketch add(Element element) {
    builder.add(element);
    return this;
  }

  int number(String name) {
    return node(name);
  }

  Circuit build() {
    return builder.build();
  }
}
