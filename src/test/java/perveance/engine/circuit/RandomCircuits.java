package perveance.engine.circuit;

import java.util.ArrayList;
import java.util.List;
import java.util.Random;
import perveance.engine.circuit.CircuitSketch.Coil;
import perveance.engine.device.DeviceLaw;
import perveance.engine.device.SpaceChargeDiodeLaw;
import perveance.engine.device.SpreadPentodeLaw;
import perveance.engine.device.SpreadPentodeParameters;
import perveance.engine.device.SpreadTriodeLaw;
import perveance.engine.device.SpreadTriodeParameters;

/**
 * Seeded random circuits of all element kinds, wired at random, with values over six decades. Most
 * make no sense; all are legal.
 */
final class RandomCircuits {
  private final Random random;

  RandomCircuits(long seed) {
    random = new Random(seed);
  }

  Circuit next() {
    int nodes = 2 + random.nextInt(9);
    List<String> names = new ArrayList<>(List.of("0"));
    CircuitSketch sketch = new CircuitSketch();
    for (int i = 1; i <= nodes; i++) {
      names.add("n" + i);
      sketch.number("n" + i);
    }
    // a supply and a tree of resistors, so that many circuits have a point at all
    sketch.source("supply", "n1", "0", signed(1, 1000));
    for (int i = 2; i <= nodes; i++) {
      if (random.nextInt(10) > 0) {
        sketch.resistor("tree" + i, names.get(i), names.get(random.nextInt(i)), ohm());
      }
    }
    int elements = 1 + random.nextInt(8);
    for (int i = 0; i < elements; i++) {
      add(sketch, "e" + i, names);
    }
    return sketch.build();
  }

  private void add(CircuitSketch sketch, String name, List<String> names) {
    String a = pick(names);
    String b = pick(names);
    switch (random.nextInt(12)) {
      case 0 -> sketch.resistor(name, a, b, ohm());
      case 1 -> sketch.holds(name, a, b, between(1e-9, 1e-3));
      case 2 -> sketch.stray(name, a, b, between(1e-13, 1e-9));
      case 3 -> sketch.inductor(name, a, b, between(1e-3, 1e3), winding());
      case 4 -> sketch.source(name, a, b, signed(1e-3, 1000));
      case 5 -> sketch.current(name, a, b, signed(1e-9, 1e-1));
      case 6 -> sketch.junction(name, a, b, junction());
      case 7 -> transformer(sketch, name, names);
      default -> sketch.add(valve(sketch, name, names));
    }
  }

  private void transformer(CircuitSketch sketch, String name, List<String> names) {
    double magnetising = random.nextInt(3) == 0 ? Double.POSITIVE_INFINITY : between(0.1, 1e3);
    Coil[] coils = new Coil[2 + random.nextInt(2)];
    for (int w = 0; w < coils.length; w++) {
      double leakage = random.nextBoolean() ? 0 : between(1e-5, 1e-1);
      coils[w] = new Coil(pick(names), pick(names), between(0.01, 1), winding(), leakage);
    }
    sketch.transformer(name, magnetising, coils);
  }

  private Element valve(CircuitSketch sketch, String name, List<String> names) {
    DeviceLaw law = law();
    int[] at = new int[4];
    for (int i = 0; i < at.length; i++) {
      at[i] = sketch.number(pick(names));
    }
    return switch (law.kind()) {
      case DIODE -> new Element.Valve(name, law, at[0], at[3], at[3], at[3]);
      case TRIODE -> new Element.Valve(name, law, at[0], at[1], at[3], at[3]);
      case PENTODE -> new Element.Valve(name, law, at[0], at[1], at[2], at[3]);
    };
  }

  DeviceLaw law() {
    return switch (random.nextInt(3)) {
      case 0 -> new SpaceChargeDiodeLaw(between(1e-5, 1e-2), signed(0.01, 1), 0.09);
      case 1 -> triode();
      default -> pentode();
    };
  }

  private DeviceLaw triode() {
    return new SpreadTriodeLaw(
        new SpreadTriodeParameters(
            between(1e-4, 1e-1),
            signed(0.01, 1),
            between(3e-3, 0.5),
            random.nextDouble(),
            random.nextDouble(),
            between(0.5, 20),
            between(1e-5, 1e-2),
            -random.nextDouble(),
            between(0.08, 0.3)));
  }

  private DeviceLaw pentode() {
    return new SpreadPentodeLaw(
        new SpreadPentodeParameters(
            between(1e-4, 1e-1),
            signed(0.01, 1),
            between(0.02, 0.3),
            random.nextDouble(),
            random.nextDouble(),
            between(1e-4, 0.1),
            between(0.02, 1),
            random.nextDouble(),
            between(0.01, 1),
            random.nextInt(2) * between(0.1, 5),
            between(0.02, 1),
            1 + 7 * random.nextDouble(),
            between(1e-5, 1e-2),
            -random.nextDouble(),
            between(0.08, 0.3)));
  }

  private JunctionLaw junction() {
    double series = random.nextBoolean() ? 0 : between(1e-2, 1e3);
    double breakdown = random.nextBoolean() ? Double.POSITIVE_INFINITY : between(2, 400);
    return new JunctionLaw(
        "random",
        between(1e-18, 1e-6),
        between(0.025, 0.12),
        series,
        breakdown,
        between(0.02, 1),
        between(1e-4, 1e-1));
  }

  private String pick(List<String> names) {
    return names.get(random.nextInt(names.size()));
  }

  private double ohm() {
    return between(10, 1e7);
  }

  private double winding() {
    return random.nextInt(3) == 0 ? 0 : between(0.01, 1e4);
  }

  private double signed(double low, double high) {
    return random.nextBoolean() ? between(low, high) : -between(low, high);
  }

  private double between(double low, double high) {
    return low * Math.pow(high / low, random.nextDouble());
  }
}
