package perveance.engine.analysis;

import java.util.ArrayList;
import java.util.List;
import perveance.engine.circuit.DcSolver;
import perveance.engine.circuit.Element.Valve;
import perveance.engine.circuit.HeldCurve;
import perveance.engine.device.ElectrodeCurrents;
import perveance.engine.stage.StageCircuit.Output;
import perveance.engine.stage.StageCircuit.StageDevice;

/** A stage's characteristic at mid-band, read at its input, its outputs and its valves. */
final class StageCurve {
  private final StageModel model;
  private final HeldCurve curve;
  private final int[] element;
  private final double[] onset;
  private final List<Valve> valves = new ArrayList<>();
  private final double[] idleOutput;
  private double idleInput;
  private double level;

  /** The characteristic of a solved stage. */
  StageCurve(StageModel model) {
    this(model, new HeldCurve(model.dc(), model.shares()));
    readIdle();
  }

  private StageCurve(StageModel model, HeldCurve curve) {
    this.model = model;
    this.curve = curve;
    List<StageDevice> devices = model.stage().devices();
    this.element = new int[devices.size()];
    this.onset = new double[devices.size()];
    for (int v = 0; v < element.length; v++) {
      element[v] = model.circuit().element(devices.get(v).ref());
      valves.add(model.valve(devices.get(v).ref()));
      onset[v] = valves.get(v).law().gridCurrentOnset();
    }
    this.idleOutput = new double[model.stage().outputs().size()];
  }

  /**
   * The characteristic of one specimen after the other.
   *
   * @param model the nominal stage
   * @param solver solver of its circuit, at a point
   * @param point that point
   */
  StageCurve(StageModel model, DcSolver solver, double[] point) {
    this(model, new HeldCurve(solver, point, model.shares()));
  }

  /**
   * Takes the next specimen.
   *
   * @param contactShift how far each valve's contact potential lies above the nominal one, by which
   *     the onset of grid current comes earlier [V]
   */
  boolean take(DcSolver solver, double[] point, double[] contactShift) {
    if (!curve.take(solver, point)) {
      return false;
    }
    for (int v = 0; v < onset.length; v++) {
      onset[v] = valves.get(v).law().gridCurrentOnset() - contactShift[v];
    }
    readIdle();
    return true;
  }

  private void readIdle() {
    curve.move(0);
    level = 0;
    idleInput = curve.voltage(model.stage().inputNode());
    for (int o = 0; o < idleOutput.length; o++) {
      idleOutput[o] = absolute(o);
    }
  }

  private double absolute(int index) {
    Output output = model.stage().outputs().get(index);
    return curve.voltage(output.plus()) - curve.voltage(output.minus());
  }

  /**
   * Moves the source.
   *
   * @param to voltage of the source above its idle value [V]
   * @return whether a state was found
   */
  boolean move(double to) {
    level = to;
    return curve.move(to);
  }

  /** Voltage at the stage's input above idle, in the last state [V]. */
  double input() {
    return model.stage().input().isPresent()
        ? level
        : curve.voltage(model.stage().inputNode()) - idleInput;
  }

  /** Voltage of an output above idle, in the last state [V]. */
  double output(int index) {
    return absolute(index) - idleOutput[index];
  }

  /** Number of valve sections. */
  int valves() {
    return element.length;
  }

  /** Anode current of a section in the last state [A]. */
  double anodeCurrent(int valve) {
    return curve.valve(element[valve]).current(ElectrodeCurrents.ANODE);
  }

  /** Grid to cathode voltage of a section in the last state [V]. */
  double gridVoltage(int valve) {
    Valve v = valves.get(valve);
    return curve.voltage(v.grid()) - curve.voltage(v.cathode());
  }

  /** Grid voltage at which a section's grid current begins; infinite for none [V]. */
  double gridOnset(int valve) {
    return onset[valve];
  }
}
