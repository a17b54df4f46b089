package perveance.engine.analysis;

import java.util.ArrayList;
import java.util.Comparator;
import java.util.List;
import java.util.Optional;
import java.util.stream.IntStream;
import java.util.stream.Stream;
import perveance.engine.base.QuantityFormat;
import perveance.engine.base.Unit;
import perveance.engine.circuit.CapacitorRole;
import perveance.engine.circuit.Circuit;
import perveance.engine.circuit.DcOutcome;
import perveance.engine.circuit.DcSolution;
import perveance.engine.circuit.DcSolver;
import perveance.engine.circuit.Element;
import perveance.engine.circuit.Element.Capacitor;
import perveance.engine.circuit.Element.CurrentSource;
import perveance.engine.circuit.Element.Inductor;
import perveance.engine.circuit.Element.Resistor;
import perveance.engine.circuit.Element.Transformer;
import perveance.engine.circuit.Element.Winding;

/**
 * Stored charge after switch-off: for each capacitor above the threshold its energy C V^2 / 2 and
 * the time R C ln(V / threshold) until it is below. R is what the wiring alone offers: valves are
 * taken as cold, since nothing guarantees that they conduct until the end, and the supply as gone.
 * Capacitors that hang together by resistors, chokes or windings are taken as one, which errs on
 * the long side.
 */
final class Discharges {
  /** Stands for no path; keeps the equations solvable [ohm]. */
  private static final double NO_PATH = 1e13;

  /** Above this, leakage decides and nothing can be said [ohm]. */
  private static final double LEAKAGE = 1e9;

  /** Stands for a winding whose resistance is not stated [ohm]. */
  private static final double LEAST_WIRE = 0.01;

  private static final double TEST_CURRENT = 1e-6;

  /**
   * Less charge than this is not listed: the limit of IEC 60950-1 for what may be touched after
   * disconnection, 45 uC up to 15 kV (quoted from memory; a local rule may differ) [C].
   */
  private static final double LEAST_CHARGE = 45e-6;

  private final Circuit circuit;
  private final double threshold;
  private final List<Resistor> paths;

  Discharges(Circuit circuit, double threshold) {
    this.circuit = circuit;
    this.threshold = threshold;
    this.paths = circuit.elements().stream().flatMap(Discharges::paths).toList();
  }

  /** What conducts with the supply gone and the valves cold: resistors, chokes and windings. */
  private static Stream<Resistor> paths(Element element) {
    if (element instanceof Resistor r) {
      return Stream.of(r);
    } else if (element instanceof Inductor l) {
      return Stream.of(wire(l.name(), l.a(), l.b(), l.resistance()));
    } else if (element instanceof Transformer t) {
      return IntStream.range(0, t.windings().size())
          .mapToObj(
              i -> {
                Winding w = t.windings().get(i);
                return wire(t.name() + ".winding" + i, w.start(), w.end(), w.resistance());
              });
    }
    return Stream.empty();
  }

  private static Resistor wire(String name, int a, int b, double resistance) {
    return new Resistor(name, a, b, Math.max(LEAST_WIRE, resistance));
  }

  /** Capacitors above the threshold with enough charge to matter, largest energy first. */
  List<Discharge> all(DcSolution loaded, Optional<DcSolution> cold) {
    List<Discharge> found = new ArrayList<>();
    for (Element element : circuit.elements()) {
      if (element instanceof Capacitor c
          && c.role() == CapacitorRole.HOLDS
          && c.capacitance() < 1) {
        double voltage =
            Math.max(
                PartStress.of(loaded, c.name()).voltage(),
                cold.map(dc -> PartStress.of(dc, c.name()).voltage()).orElse(0.0));
        if (voltage > threshold && c.capacitance() * voltage >= LEAST_CHARGE) {
          found.add(discharge(c, voltage));
        }
      }
    }
    found.sort(Comparator.comparingDouble(Discharge::energy).reversed());
    return found;
  }

  private Discharge discharge(Capacitor capacitor, double voltage) {
    double resistance = resistance(capacitor);
    boolean drained = resistance < LEAKAGE;
    double together = drained ? capacitanceAlong(capacitor) : capacitor.capacitance();
    return new Discharge(
        place(capacitor.name()),
        capacitor.name(),
        capacitor.capacitance(),
        voltage,
        0.5 * capacitor.capacitance() * voltage * voltage,
        drained ? resistance : Double.POSITIVE_INFINITY,
        threshold,
        drained ? resistance * together * Math.log(voltage / threshold) : Double.POSITIVE_INFINITY,
        drained
            ? "the " + QuantityFormat.TYPESET.reading(resistance, Unit.OHM, 2) + " across it"
            : "nothing");
  }

  /** A reservoir is told by its supply node, any other capacitor by its stage and key. */
  private static String place(String element) {
    return element.startsWith("supply.")
        ? "supply " + element.split("\\.", -1)[1]
        : element.replace('.', ' ').replace('_', ' ');
  }

  /** Resistance across a capacitor with the supply gone and the valves cold. */
  private double resistance(Capacitor capacitor) {
    List<Element> elements = new ArrayList<>(paths);
    for (int node = 1; node < circuit.nodes().size(); node++) {
      elements.add(new Resistor("no path " + node, node, 0, NO_PATH));
    }
    elements.add(new CurrentSource("test", capacitor.b(), capacitor.a(), TEST_CURRENT));
    return new DcSolver(new Circuit(circuit.nodes(), elements)).solve()
            instanceof DcOutcome.Converged solved
        ? (solved.solution().voltage(capacitor.a()) - solved.solution().voltage(capacitor.b()))
            / TEST_CURRENT
        : Double.POSITIVE_INFINITY;
  }

  /** Capacitance of all that hangs on the capacitor's own node by what conducts. */
  private double capacitanceAlong(Capacitor capacitor) {
    boolean[] along = new boolean[circuit.nodes().size()];
    along[capacitor.a() != 0 ? capacitor.a() : capacitor.b()] = true;
    boolean progress = true;
    while (progress) {
      progress = false;
      for (Resistor r : paths) {
        if (r.a() != 0 && r.b() != 0 && along[r.a()] != along[r.b()]) {
          along[r.a()] = true;
          along[r.b()] = true;
          progress = true;
        }
      }
    }
    double sum = 0;
    for (Element element : circuit.elements()) {
      if (element instanceof Capacitor c
          && c.role() == CapacitorRole.HOLDS
          && c.capacitance() < 1
          && (along[c.a()] || along[c.b()])) {
        sum += c.capacitance();
      }
    }
    return sum;
  }
}
