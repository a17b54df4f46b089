package perveance.engine.analysis;

import static perveance.engine.device.ElectrodeCurrents.ANODE;

import java.util.ArrayList;
import java.util.List;
import perveance.engine.circuit.CapacitorRole;
import perveance.engine.circuit.Circuit;
import perveance.engine.circuit.DcSolver;
import perveance.engine.circuit.Element;
import perveance.engine.circuit.Element.Capacitor;
import perveance.engine.circuit.Element.CurrentSource;
import perveance.engine.circuit.Element.Inductor;
import perveance.engine.circuit.Element.Valve;
import perveance.engine.circuit.Element.VoltageSource;
import perveance.engine.stage.StageCircuit.Output;
import perveance.engine.stage.StageCircuit.StageDevice;

/**
 * A stage's characteristic at mid-band: holding capacitors stand as voltage sources at their idle
 * charge, inductors as current sources at their idle current, strays are left out.
 */
final class HeldCharge {
  private final StageModel model;
  private final DcSolver solver;
  private final int source;
  private final double idleSource;
  private final double[] point;
  private final double[] idlePoint;
  private final int[] element;
  private final List<Valve> valves = new ArrayList<>();
  private double input;
  private boolean converged;

  HeldCharge(StageModel model) {
    this.model = model;
    List<Element> elements = new ArrayList<>();
    for (Element e : model.circuit().elements()) {
      if (e instanceof Capacitor c) {
        if (c.role() == CapacitorRole.HOLDS) {
          double held = model.dc().voltage(c.a()) - model.dc().voltage(c.b());
          elements.add(new VoltageSource(c.name(), c.a(), c.b(), held));
        }
      } else if (e instanceof Inductor l) {
        elements.add(new CurrentSource(l.name(), l.a(), l.b(), model.dc().current(l.name())));
      } else {
        elements.add(e);
      }
    }
    Circuit held = new Circuit(model.circuit().nodes(), elements);
    this.solver = new DcSolver(held);
    Element drive = model.circuit().elements().get(model.source());
    this.source = held.element(drive.name());
    this.idleSource = ((VoltageSource) drive).voltage();
    this.point = new double[solver.pointLength()];
    this.element = new int[model.stage().devices().size()];
    for (StageDevice device : model.stage().devices()) {
      element[valves.size()] = held.element(device.ref());
      valves.add(model.valve(device.ref()));
    }
    solver.solveInto(point);
    this.idlePoint = point.clone();
  }

  /**
   * Moves the source.
   *
   * @param value voltage of the source above its idle value [V]
   * @return whether a state was found
   */
  boolean move(double value) {
    solver.setVoltage(source, idleSource + value);
    if (value == 0 || !converged) {
      System.arraycopy(idlePoint, 0, point, 0, point.length);
    }
    input = value;
    converged = solver.solveInto(point);
    return converged;
  }

  /** Voltage at the stage's input above idle, in the last state [V]. */
  double input() {
    int node = model.stage().inputNode();
    return model.stage().input().isPresent()
        ? input
        : solver.voltage(node) - model.dc().voltage(node);
  }

  /** Voltage of an output above idle, in the last state [V]. */
  double output(int index) {
    Output output = model.stage().outputs().get(index);
    double idle = model.dc().voltage(output.plus()) - model.dc().voltage(output.minus());
    return solver.voltage(output.plus()) - solver.voltage(output.minus()) - idle;
  }

  /** Number of valve sections. */
  int valves() {
    return element.length;
  }

  /** Anode current of a section in the last state [A]. */
  double anodeCurrent(int valve) {
    return solver.valve(element[valve]).current(ANODE);
  }

  /** Grid to cathode voltage of a section in the last state [V]. */
  double gridVoltage(int valve) {
    Valve v = valves.get(valve);
    return solver.voltage(v.grid()) - solver.voltage(v.cathode());
  }

  /** Grid voltage at which a section's grid current begins; infinite for none [V]. */
  double gridOnset(int valve) {
    return valves.get(valve).law().gridCurrentOnset();
  }
}
