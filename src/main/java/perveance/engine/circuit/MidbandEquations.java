package perveance.engine.circuit;

import java.util.Map;
import perveance.engine.circuit.Element.Capacitor;
import perveance.engine.circuit.Element.CurrentSource;
import perveance.engine.circuit.Element.Inductor;
import perveance.engine.circuit.Element.Resistor;
import perveance.engine.circuit.Element.Transformer;
import perveance.engine.circuit.Element.VoltageSource;
import perveance.engine.circuit.Element.Winding;

/**
 * Nodal equations within one cycle at mid-band. Capacitors that hold are voltages, inductors and
 * cores are currents, all unknown but the same all the cycle; strays are open, leakage is none. The
 * held quantities are counted capacitors first [V], then inductors [A], then cores [A in the first
 * winding].
 */
final class MidbandEquations {
  final Topology topology;
  final ElementValues values;
  final BranchPlan plan;
  final NodalSystem system;
  final int[] transformers;
  final int holds;

  private final double[] quietConstant;
  private final double[] constantPerDrive;
  private final double[] quietVoltage;
  private final double[] voltagePerDrive;

  private final Map<Integer, Double> shares;
  private final double[] quietValue;

  MidbandEquations(Circuit circuit, Map<Integer, Double> shares) {
    this.shares = shares;
    this.topology = new Topology(circuit);
    this.values = new ElementValues(circuit);
    this.quietValue = values.value.clone();
    this.plan = BranchPlan.forMidband(topology);
    this.system = new NodalSystem(topology, plan.branches);
    this.transformers = Elements.indexArray(circuit, Transformer.class);
    this.holds = plan.holdingCapacitors.length + plan.holdingInductors.length + transformers.length;
    this.quietConstant = new double[system.size];
    this.constantPerDrive = new double[system.size];
    this.quietVoltage = new double[topology.nodeCount];
    this.voltagePerDrive = new double[topology.nodeCount];
    refresh();
  }

  /** Takes other element values of the same circuit. */
  void take(ElementValues other) {
    values.copy(other);
    System.arraycopy(values.value, 0, quietValue, 0, quietValue.length);
    refresh();
  }

  /** Writes the equations for the present values and finds what a unit of drive changes in them. */
  private void refresh() {
    stamp();
    System.arraycopy(system.constant, 0, quietConstant, 0, quietConstant.length);
    System.arraycopy(system.voltage, 0, quietVoltage, 0, quietVoltage.length);
    for (Map.Entry<Integer, Double> share : shares.entrySet()) {
      values.value[share.getKey()] = quietValue[share.getKey()] + share.getValue();
    }
    stamp();
    for (int i = 0; i < quietConstant.length; i++) {
      constantPerDrive[i] = system.constant[i] - quietConstant[i];
    }
    for (int i = 0; i < quietVoltage.length; i++) {
      voltagePerDrive[i] = system.voltage[i] - quietVoltage[i];
    }
    for (Integer source : shares.keySet()) {
      values.value[source] = quietValue[source];
    }
    stamp();
  }

  private void stamp() {
    system.clear();
    topology.writeKnown(values, 1, system.voltage);
    system.valves.take(values);
    for (int i = 0; i < topology.circuit.elements().size(); i++) {
      stamp(i, topology.circuit.elements().get(i), values.value[i]);
    }
  }

  private void stamp(int i, Element element, double value) {
    int branch = plan.branchOf[i];
    if (element instanceof Resistor e) {
      system.conductance(e.a(), e.b(), 1 / value);
    } else if (element instanceof CurrentSource e) {
      system.current(e.from(), e.to(), value);
    } else if (element instanceof VoltageSource e && branch >= 0) {
      system.branch(branch, e.plus(), e.minus(), 0, value);
    } else if (element instanceof Capacitor e && branch >= 0) {
      system.branch(branch, e.a(), e.b(), 0, 0);
    } else if (element instanceof Inductor e && branch >= 0) {
      system.branch(branch, e.a(), e.b(), e.resistance(), 0);
    } else if (element instanceof Transformer e) {
      int core = system.branchRow(branch + e.windings().size());
      for (int w = 0; w < e.windings().size(); w++) {
        Winding winding = e.windings().get(w);
        system.branch(branch + w, winding.start(), winding.end(), winding.resistance(), 0);
        int row = system.branchRow(branch + w);
        system.linear[row * system.size + core] -= winding.turns();
        system.linear[core * system.size + row] += winding.turns();
      }
    }
  }

  /** Sets the drive and the held quantities for the next solve. */
  void set(double drive, double[] hold) {
    for (int i = 0; i < system.size; i++) {
      system.constant[i] = quietConstant[i] + drive * constantPerDrive[i];
    }
    for (int node = 0; node < quietVoltage.length; node++) {
      if (topology.row[node] < 0) {
        system.voltage[node] = quietVoltage[node] + drive * voltagePerDrive[node];
      }
    }
    for (int h = 0; h < holds; h++) {
      addHeld(h, hold[h], system.constant);
    }
  }

  /** Element values with the sources at a drive. */
  ElementValues valuesAt(double drive) {
    shares.forEach((s, share) -> values.value[s] = quietValue[s] + drive * share);
    return values;
  }

  /** Current of a branch, a held current, or zero for an open capacitor [A]. */
  double branchCurrent(double[] x, double[] hold, int element, int winding) {
    int branch = plan.branchOf[element];
    if (branch >= 0) {
      return x[system.branchRow(branch + winding)];
    }
    int place = java.util.Arrays.binarySearch(plan.holdingInductors, element);
    return place < 0 ? 0 : hold[plan.holdingCapacitors.length + place];
  }

  /** Adds what one held quantity brings to the constants of the equations. */
  void addHeld(int h, double amount, double[] constant) {
    int capacitors = plan.holdingCapacitors.length;
    int inductors = plan.holdingInductors.length;
    if (h < capacitors) {
      constant[system.branchRow(plan.branchOf[plan.holdingCapacitors[h]])] -= amount;
    } else if (h < capacitors + inductors) {
      Inductor e = (Inductor) element(plan.holdingInductors[h - capacitors]);
      add(constant, e.a(), amount);
      add(constant, e.b(), -amount);
    } else {
      int t = transformers[h - capacitors - inductors];
      Transformer e = (Transformer) element(t);
      constant[coreRow(t, e)] -= e.windings().get(0).turns() * amount;
    }
  }

  private Element element(int index) {
    return topology.circuit.elements().get(index);
  }

  private int coreRow(int index, Transformer e) {
    return system.branchRow(plan.branchOf[index] + e.windings().size());
  }

  private void add(double[] constant, int node, double amount) {
    if (topology.row[node] >= 0) {
      constant[topology.row[node]] += amount;
    }
  }

  /**
   * What must be zero in the mean for one held quantity: capacitor current [A], inductor voltage
   * behind its resistance [V], volts per turn of a core [V].
   */
  double imbalance(int h, double[] x, double[] hold) {
    int capacitors = plan.holdingCapacitors.length;
    int inductors = plan.holdingInductors.length;
    if (h < capacitors) {
      return x[system.branchRow(plan.branchOf[plan.holdingCapacitors[h]])];
    } else if (h < capacitors + inductors) {
      Inductor e = (Inductor) element(plan.holdingInductors[h - capacitors]);
      return valueAt(x, e.a()) - valueAt(x, e.b()) - e.resistance() * hold[h];
    }
    int t = transformers[h - capacitors - inductors];
    return x[coreRow(t, (Transformer) element(t))];
  }

  private double valueAt(double[] x, int node) {
    return topology.row[node] >= 0 ? x[topology.row[node]] : system.voltage[node];
  }

  /** The same for a change of x that belongs to a change of the held quantity number {@code by}. */
  double imbalanceSlope(int h, double[] dx, int by) {
    int capacitors = plan.holdingCapacitors.length;
    int inductors = plan.holdingInductors.length;
    if (h < capacitors || h >= capacitors + inductors) {
      return imbalance(h, dx, dx);
    }
    Inductor e = (Inductor) element(plan.holdingInductors[h - capacitors]);
    double slope = changeAt(dx, e.a()) - changeAt(dx, e.b());
    return h == by ? slope - e.resistance() : slope;
  }

  private double changeAt(double[] dx, int node) {
    return topology.row[node] >= 0 ? dx[topology.row[node]] : 0;
  }

  /** Held quantities at a dc point. */
  double[] holdsAt(DcSolution rest) {
    double[] hold = new double[holds];
    int h = 0;
    for (int c : plan.holdingCapacitors) {
      int[] ends = Terminals.of(element(c));
      hold[h++] = rest.voltage(ends[0]) - rest.voltage(ends[1]);
    }
    for (int l : plan.holdingInductors) {
      hold[h++] = rest.current(element(l).name());
    }
    for (int t : transformers) {
      Transformer e = (Transformer) element(t);
      hold[h++] = rest.ampereTurns(e) / e.windings().get(0).turns();
    }
    return hold;
  }

  /** Held quantities at the last point of a dc solver of the same circuit. */
  void holdsAt(DcSolver rest, double[] point, double[] hold) {
    int h = 0;
    for (int c : plan.holdingCapacitors) {
      Capacitor e = (Capacitor) element(c);
      hold[h++] = rest.voltage(e.a()) - rest.voltage(e.b());
    }
    for (int l : plan.holdingInductors) {
      hold[h++] = point[rest.branchRow(l)];
    }
    for (int t : transformers) {
      Transformer e = (Transformer) element(t);
      double sum = 0;
      for (int w = 0; w < e.windings().size(); w++) {
        sum += e.windings().get(w).turns() * point[rest.branchRow(t) + w];
      }
      hold[h++] = sum / e.windings().get(0).turns();
    }
  }

  /** Unknowns at a dc point with nothing driven. */
  double[] unknownsAt(DcSolution rest) {
    double[] x = new double[system.size];
    for (int node = 0; node < topology.nodeCount; node++) {
      if (topology.row[node] >= 0) {
        x[topology.row[node]] = rest.voltage(node);
      }
    }
    for (int i = 0; i < plan.branchOf.length; i++) {
      Element element = element(i);
      int branch = plan.branchOf[i];
      if (branch >= 0 && element instanceof Transformer e) {
        for (int w = 0; w < e.windings().size(); w++) {
          x[system.branchRow(branch + w)] = rest.windingCurrent(e.name(), w);
        }
      } else if (branch >= 0) {
        x[system.branchRow(branch)] = rest.current(element.name());
      }
    }
    return x;
  }
}
