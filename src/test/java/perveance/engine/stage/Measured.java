package perveance.engine.stage;

import perveance.engine.circuit.Circuit;
import perveance.engine.circuit.Complex;
import perveance.engine.circuit.DcOutcome;
import perveance.engine.circuit.DcSolution;
import perveance.engine.circuit.DcSolver;
import perveance.engine.circuit.SmallSignal;

/** A stage on the bench with its dc point found: what a meter and an oscillator would tell. */
final class Measured {
  final StageBench.Built built;
  final Circuit circuit;
  final DcSolution point;
  final SmallSignal small;

  Measured(StageBench bench, double supply) {
    this.built = bench.build(supply);
    this.circuit = built.circuit();
    DcOutcome outcome = new DcSolver(circuit).solve();
    if (!(outcome instanceof DcOutcome.Converged solved)) {
      throw new AssertionError(outcome.toString());
    }
    this.point = solved.solution();
    this.small = new SmallSignal(point);
  }

  Measured(StageBench bench) {
    this(bench, 250);
  }

  /** Name of the source element that drives the stage. */
  private int source() {
    return circuit.element(built.stage().input().orElse("before"));
  }

  StageCircuit.Output output(int index) {
    return built.stage().outputs().get(index);
  }

  double gain() {
    return gain(0);
  }

  double gain(int output) {
    return small.midbandGain(source(), output(output).plus(), output(output).minus());
  }

  double gainTo(String node) {
    return small.midbandGain(source(), circuit.node("V1." + node), 0);
  }

  double outputResistance() {
    return outputResistance(0);
  }

  double outputResistance(int output) {
    return small.midbandOutputResistance(output(output).plus(), output(output).minus());
  }

  /** Magnitude of the gain at a frequency. */
  double gainAt(double frequency) {
    Complex transfer = small.transfer(source(), output(0).plus(), output(0).minus(), frequency);
    return transfer.magnitude();
  }

  perveance.engine.circuit.Corners corners() {
    return small.corners(source(), output(0).plus(), output(0).minus());
  }

  double volts(String node) {
    return point.voltage("V1." + node);
  }

  double amperes(String element) {
    return point.current(element);
  }
}
