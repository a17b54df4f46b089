package perveance.benchmark;

import perveance.engine.circuit.CapacitorRole;
import perveance.engine.circuit.Circuit;
import perveance.engine.circuit.Element.Capacitor;
import perveance.engine.circuit.Element.Resistor;
import perveance.engine.circuit.Element.Valve;
import perveance.engine.circuit.Element.VoltageSource;
import perveance.engine.device.DeviceLaw;
import perveance.engine.device.SpreadTriodeLaw;
import perveance.engine.device.SpreadTriodeParameters;

/** Circuits of a stated size for the measurements. */
final class BenchmarkCircuits {
  private static final DeviceLaw LAW =
      new SpreadTriodeLaw(
          new SpreadTriodeParameters(1.13e-3, 0.59, 0.0096, 0.21, 0.3, 3, 3.9e-4, -0.6, 0.0862));

  private final Circuit.Builder builder = new Circuit.Builder();

  private BenchmarkCircuits() {
    builder.add(new VoltageSource("supply", builder.node("B"), 0, 300));
    builder.add(new VoltageSource("in", builder.node("in"), 0, 0));
  }

  /** One triode with everything a stage has: 8 nodes beside chassis. */
  static Circuit oneStage() {
    return chain(1);
  }

  /** Triode into direct-coupled follower: 12 nodes, two valves. */
  static Circuit twoStages() {
    BenchmarkCircuits c = new BenchmarkCircuits();
    c.stage(1, "in", "a1");
    c.resistor("stopper", "a1", "gf", 1e3);
    c.triode("VF", "B", "gf", "kf");
    c.resistor("follower", "kf", "t", 1e3);
    c.resistor("tail", "t", "0", 100e3);
    c.capacitor("out", "t", "out", 1e-6);
    c.resistor("load", "out", "0", 220e3);
    return c.builder.build();
  }

  /** Stages one after another, coupled by capacitors: seven nodes each, and supply and input. */
  static Circuit chain(int stages) {
    BenchmarkCircuits c = new BenchmarkCircuits();
    String from = "in";
    for (int s = 1; s <= stages; s++) {
      c.stage(s, from, "a" + s);
      c.capacitor("coupling" + s, "a" + s, "o" + s, 22e-9);
      c.resistor("next" + s, "o" + s, "0", 470e3);
      from = "o" + s;
    }
    return c.builder.build();
  }

  private void stage(int s, String from, String anode) {
    resistor("source" + s, from, "e" + s, 10e3);
    capacitor("input" + s, "e" + s, "j" + s, 22e-9);
    resistor("leak" + s, "j" + s, "0", 1e6);
    resistor("stop" + s, "j" + s, "g" + s, 10e3);
    resistor("load" + s, "B", anode, 100e3);
    triode("V" + s, anode, "g" + s, "k" + s);
    resistor("cathode" + s, "k" + s, "0", 1.5e3);
    capacitor("bypass" + s, "k" + s, "0", 22e-6);
  }

  private int node(String name) {
    return name.equals("0") ? 0 : builder.node(name);
  }

  private void resistor(String name, String a, String b, double ohm) {
    builder.add(new Resistor(name, node(a), node(b), ohm));
  }

  private void capacitor(String name, String a, String b, double farad) {
    builder.add(new Capacitor(name, node(a), node(b), farad, CapacitorRole.HOLDS));
  }

  private void triode(String name, String a, String g, String k) {
    builder.add(new Valve(name, LAW, node(a), node(g), node(k), node(k)));
  }
}
