package perveance.engine.analysis;

import java.util.ArrayList;
import java.util.List;
import perveance.engine.circuit.DcSolver;
import perveance.engine.circuit.Element;
import perveance.engine.circuit.Element.Valve;
import perveance.engine.circuit.HeldCurve;
import perveance.engine.device.ElectrodeCurrents;
import perveance.engine.device.LawKind;
import perveance.engine.stage.StageCircuit.Output;

/**
 * A stage's characteristic at mid-band, read at its input, its outputs and its valves: its own
 * first, then those of stages that are wired straight to it.
 */
final class StageCurve {
  private final StageModel model;
  private final HeldCurve curve;
  private final int[] element;
  private final double[] onset;
  private final int own;
  private final List<Valve> valves = new ArrayList<>();
  private final double[] idleOutput;
  private final double[] idleGridToChassis;
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
    model.stage().devices().forEach(d -> valves.add(model.valve(d.ref())));
    this.own = valves.size();
    for (Element other : model.circuit().elements()) {
      if (other instanceof Valve v && !valves.contains(v)) {
        valves.add(v);
      }
    }
    this.element = new int[valves.size()];
    this.onset = new double[valves.size()];
    this.idleGridToChassis = new double[valves.size()];
    for (int v = 0; v < element.length; v++) {
      element[v] = model.circuit().element(valves.get(v).name());
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
   * @param contactShift how far the contact potential of each own valve lies above the nominal one,
   *     by which the onset of grid current comes earlier [V]
   */
  boolean take(DcSolver solver, double[] point, double[] contactShift) {
    if (!curve.take(solver, point)) {
      return false;
    }
    for (int v = 0; v < own; v++) {
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
    for (int v = 0; v < idleGridToChassis.length; v++) {
      idleGridToChassis[v] = curve.voltage(valves.get(v).grid());
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
    return model.atSource() ? level : curve.voltage(model.stage().inputNode()) - idleInput;
  }

  /** Voltage of an output above idle, in the last state [V]. */
  double output(int index) {
    return absolute(index) - idleOutput[index];
  }

  /** Whether the input is told by the voltage of a source. */
  boolean atSource() {
    return model.atSource();
  }

  /** Direction of the source in which the input rises: 1, or -1 behind a stage that inverts. */
  int sense() {
    return model.inputShare() < 0 ? -1 : 1;
  }

  /** Whether another stage's output is wired straight to the input. */
  boolean wired() {
    return model.stage().input().isEmpty();
  }

  /** Number of the stage's own valve sections, which come first. */
  int own() {
    return own;
  }

  /** Name of a section. */
  String ref(int valve) {
    return valves.get(valve).name();
  }

  /** Whether a section works as a pentode, which has a knee. */
  boolean screened(int valve) {
    boolean pentode = valves.get(valve).law().kind() == LawKind.PENTODE;
    return pentode
        && (valve >= own || !model.stage().devices().get(valve).connection().equals("triode"));
  }

  /** Number of valve sections, those of stages wired straight to this one included. */
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

  /** Anode to cathode voltage of a section in the last state [V]. */
  double anodeVoltage(int valve) {
    Valve v = valves.get(valve);
    return curve.voltage(v.anode()) - curve.voltage(v.cathode());
  }

  /** Grid to chassis voltage of a section above idle, in the last state [V]. */
  double gridToChassis(int valve) {
    return curve.voltage(valves.get(valve).grid()) - idleGridToChassis[valve];
  }

  /** Grid voltage at which a section's grid current begins; infinite for none [V]. */
  double gridOnset(int valve) {
    return onset[valve];
  }
}
