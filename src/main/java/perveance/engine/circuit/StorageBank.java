package perveance.engine.circuit;

import java.util.ArrayList;
import java.util.List;
import perveance.engine.circuit.Element.Capacitor;
import perveance.engine.circuit.Element.Inductor;
import perveance.engine.circuit.Element.Transformer;
import perveance.engine.circuit.Element.Winding;

/**
 * What stores energy in a circuit, stepped in time. Every store has a quantity y (capacitor
 * voltage, inductor or winding current, ampere-turns of a core), an inertia c (capacitance,
 * inductance, inductance at one turn) and a flow f with c dy/dt = f (current, voltage, volts per
 * turn).
 *
 * <p>Trapezoidal rule: f + fn = (2 c / h) (y - yn); backward Euler: f = (c / h) (y - yn), with yn,
 * fn the values at the last accepted time.
 */
final class StorageBank {
  /** What a store is. */
  enum Kind {
    CAPACITOR,
    INDUCTOR,
    WINDING,
    CORE
  }

  final int count;
  final Kind[] kind;
  final int[] element;
  final int[] winding;
  final double[] inertia;

  /** Quantity and flow at the last accepted time, and the flow at the one before. */
  final double[] quantity;

  final double[] flow;
  private final double[] earlierFlow;

  /** Quantity and flow of the step that is being tried. */
  final double[] nextQuantity;

  final double[] nextFlow;
  private double lastStep;

  StorageBank(Circuit circuit, boolean strays) {
    List<Kind> kinds = new ArrayList<>();
    List<int[]> places = new ArrayList<>();
    List<Double> inertias = new ArrayList<>();
    for (int i = 0; i < circuit.elements().size(); i++) {
      Element e = circuit.elements().get(i);
      if (e instanceof Capacitor c && (strays || c.role() == CapacitorRole.HOLDS)) {
        add(kinds, places, inertias, Kind.CAPACITOR, i, 0, c.capacitance());
      } else if (e instanceof Inductor l) {
        add(kinds, places, inertias, Kind.INDUCTOR, i, 0, l.inductance());
      } else if (e instanceof Transformer t) {
        for (int w = 0; w < t.windings().size(); w++) {
          add(kinds, places, inertias, Kind.WINDING, i, w, t.windings().get(w).leakage());
        }
        Winding first = t.windings().get(0);
        double perTurn = t.magnetising() / (first.turns() * first.turns());
        add(kinds, places, inertias, Kind.CORE, i, t.windings().size(), perTurn);
      }
    }
    count = kinds.size();
    kind = kinds.toArray(new Kind[0]);
    element = places.stream().mapToInt(p -> p[0]).toArray();
    winding = places.stream().mapToInt(p -> p[1]).toArray();
    inertia = inertias.stream().mapToDouble(Double::doubleValue).toArray();
    quantity = new double[count];
    flow = new double[count];
    earlierFlow = new double[count];
    nextQuantity = new double[count];
    nextFlow = new double[count];
  }

  private static void add(
      List<Kind> kinds,
      List<int[]> places,
      List<Double> inertias,
      Kind kind,
      int element,
      int winding,
      double inertia) {
    kinds.add(kind);
    places.add(new int[] {element, winding});
    inertias.add(inertia);
  }

  /** Factor k of the rule: f = k c (y - yn) - history. */
  static double rate(double step, boolean trapezoidal) {
    return (trapezoidal ? 2 : 1) / step;
  }

  /**
   * Error of the step being tried against what is allowed, 1 at the limit. The trapezoidal rule's
   * error is found from the explicit rule of the same order (P. M. Gresho, R. L. Lee and R. L.
   * Sani, in Recent Advances in Numerical Methods in Fluids, Pineridge 1980).
   */
  double error(double step, double tolerance) {
    double ratio = step / lastStep;
    double worst = 0;
    for (int s = 0; s < count; s++) {
      if (inertia[s] > 0 && inertia[s] < Double.POSITIVE_INFINITY) {
        double slope = (2 + ratio) * flow[s] - ratio * earlierFlow[s];
        double predicted = quantity[s] + 0.5 * step * slope / inertia[s];
        double error = (nextQuantity[s] - predicted) / (3 * (1 + 1 / ratio));
        double floor = kind[s] == Kind.CAPACITOR ? 1e-2 : 1e-5;
        double size = Math.max(Math.abs(nextQuantity[s]), floor);
        worst = Math.max(worst, Math.abs(error) / (tolerance * size));
      }
    }
    return worst;
  }

  /** Makes the step being tried the last accepted one. */
  void accept(double step) {
    System.arraycopy(flow, 0, earlierFlow, 0, count);
    System.arraycopy(nextQuantity, 0, quantity, 0, count);
    System.arraycopy(nextFlow, 0, flow, 0, count);
    lastStep = step;
  }
}
