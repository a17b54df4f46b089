package perveance.engine.circuit;

import java.util.Map;
import java.util.function.DoubleUnaryOperator;
import perveance.engine.circuit.Element.CurrentSource;
import perveance.engine.circuit.Element.Inductor;
import perveance.engine.circuit.Element.Resistor;
import perveance.engine.circuit.Element.Transformer;
import perveance.engine.circuit.Element.VoltageSource;
import perveance.engine.circuit.Element.Winding;
import perveance.engine.circuit.StorageBank.Kind;
import perveance.engine.device.DeviceLaw;

/** Nodal equations of one step in time; what stores is a conductance or resistance with history. */
final class TransientEquations {
  final Topology topology;
  final ElementValues values;
  final BranchPlan plan;
  final NodalSystem system;
  final StorageBank stores;
  private final TransientSetup setup;
  private final double[] restingValue;
  private final DeviceLaw[] fullLaw;

  TransientEquations(Circuit circuit, TransientSetup setup) {
    this.setup = setup;
    this.topology = new Topology(circuit);
    this.values = new ElementValues(circuit);
    this.plan = BranchPlan.forFrequencies(topology);
    this.system = new NodalSystem(topology, plan.branches);
    this.stores = new StorageBank(circuit, setup.strays());
    this.restingValue = values.value.clone();
    this.fullLaw = new DeviceLaw[restingValue.length];
    for (int valve : setup.emissions().keySet()) {
      fullLaw[valve] = values.law(valve);
    }
  }

  /** Sets sources and emissions for a time [s]. */
  void setTime(double time) {
    for (Map.Entry<Integer, DoubleUnaryOperator> e : setup.courses().entrySet()) {
      values.value[e.getKey()] = restingValue[e.getKey()] + e.getValue().applyAsDouble(time);
    }
    for (Map.Entry<Integer, DoubleUnaryOperator> e : setup.emissions().entrySet()) {
      double conduction = Math.max(COLD, e.getValue().applyAsDouble(time));
      values.setLaw(e.getKey(), fullLaw[e.getKey()].specimen(conduction, 0));
    }
  }

  /** Conduction that stands for a cold cathode: laws want a factor above zero. */
  private static final double COLD = 1e-12;

  /** Writes the equations of a step of a length [s], all sources scaled. */
  void stamp(double step, boolean trapezoidal, double sourceScale) {
    system.clear();
    topology.writeKnown(values, sourceScale, system.voltage);
    system.valves.take(values);
    Circuit circuit = topology.circuit;
    for (int i = 0; i < restingValue.length; i++) {
      stampPlain(i, circuit.elements().get(i), values.value[i], sourceScale);
    }
    double rate = StorageBank.rate(step, trapezoidal);
    for (int s = 0; s < stores.count; s++) {
      stampStore(s, rate, trapezoidal ? stores.flow[s] : 0);
    }
  }

  private void stampPlain(int i, Element element, double value, double sourceScale) {
    if (element instanceof Resistor e) {
      system.conductance(e.a(), e.b(), 1 / value);
    } else if (element instanceof CurrentSource e) {
      system.current(e.from(), e.to(), sourceScale * value);
    } else if (element instanceof VoltageSource e && plan.branchOf[i] >= 0) {
      system.branch(plan.branchOf[i], e.plus(), e.minus(), 0, sourceScale * value);
    }
  }

  private void stampStore(int s, double rate, double lastFlow) {
    double c = rate * stores.inertia[s];
    double history = c * stores.quantity[s] + lastFlow;
    int i = stores.element[s];
    Element element = topology.circuit.elements().get(i);
    int branch = plan.branchOf[i] + stores.winding[s];
    switch (stores.kind[s]) {
      case CAPACITOR -> {
        int[] ends = Terminals.of(element);
        system.conductance(ends[0], ends[1], c);
        system.current(ends[1], ends[0], history);
      }
      case INDUCTOR -> {
        Inductor e = (Inductor) element;
        system.branch(branch, e.a(), e.b(), e.resistance() + c, -history);
      }
      case WINDING -> {
        Transformer e = (Transformer) element;
        Winding w = e.windings().get(stores.winding[s]);
        system.branch(branch, w.start(), w.end(), w.resistance() + c, -history);
        int core = system.branchRow(plan.branchOf[i] + e.windings().size());
        system.linear[system.branchRow(branch) * system.size + core] -= w.turns();
      }
      case CORE -> stampCore(s, (Transformer) element, branch, c, history);
    }
  }

  /** The ampere-turns S with c S - u = history; an ideal core keeps the S it has. */
  private void stampCore(int s, Transformer e, int branch, double c, double history) {
    int row = system.branchRow(branch);
    boolean ideal = Double.isInfinite(c);
    for (int w = 0; w < e.windings().size(); w++) {
      int current = system.branchRow(branch - e.windings().size() + w);
      system.linear[row * system.size + current] += (ideal ? 1 : c) * e.windings().get(w).turns();
    }
    if (ideal) {
      system.constant[row] -= stores.quantity[s];
    } else {
      system.linear[row * system.size + row] -= 1;
      system.constant[row] -= history;
    }
  }

  /** Reads quantities and flows of all stores from a solution, flows by the rule of the step. */
  void read(double[] x, double step, boolean trapezoidal) {
    system.spread(x);
    double rate = StorageBank.rate(step, trapezoidal);
    for (int s = 0; s < stores.count; s++) {
      double y = quantity(s, x);
      stores.nextQuantity[s] = y;
      double c = rate * stores.inertia[s];
      stores.nextFlow[s] =
          Double.isInfinite(c)
              ? 0
              : c * (y - stores.quantity[s]) - (trapezoidal ? stores.flow[s] : 0);
    }
  }

  private double quantity(int s, double[] x) {
    int i = stores.element[s];
    Element element = topology.circuit.elements().get(i);
    if (stores.kind[s] == Kind.CAPACITOR) {
      int[] ends = Terminals.of(element);
      return system.voltage[ends[0]] - system.voltage[ends[1]];
    } else if (stores.kind[s] == Kind.CORE) {
      Transformer e = (Transformer) element;
      double sum = 0;
      for (int w = 0; w < e.windings().size(); w++) {
        sum += e.windings().get(w).turns() * x[system.branchRow(plan.branchOf[i] + w)];
      }
      return sum;
    }
    return x[system.branchRow(plan.branchOf[i] + stores.winding[s])];
  }

  /** Starts all stores from a dc point, at which nothing flows. */
  void startFrom(DcSolution rest) {
    for (int s = 0; s < stores.count; s++) {
      Element element = topology.circuit.elements().get(stores.element[s]);
      stores.quantity[s] =
          switch (stores.kind[s]) {
            case CAPACITOR -> {
              int[] ends = Terminals.of(element);
              yield rest.voltage(ends[0]) - rest.voltage(ends[1]);
            }
            case INDUCTOR -> rest.current(element.name());
            case WINDING -> rest.windingCurrent(element.name(), stores.winding[s]);
            case CORE -> rest.ampereTurns((Transformer) element);
          };
    }
  }

  /** Current of a branch or of a capacitor at the last accepted time [A]. */
  double branchCurrent(double[] x, double[] storeFlow, int element, int winding) {
    if (plan.branchOf[element] >= 0) {
      return x[system.branchRow(plan.branchOf[element] + winding)];
    }
    for (int s = 0; s < stores.count; s++) {
      if (stores.element[s] == element) {
        return storeFlow[s];
      }
    }
    return 0;
  }
}
