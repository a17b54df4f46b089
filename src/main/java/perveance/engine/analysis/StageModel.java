package perveance.engine.analysis;

import java.util.List;
import java.util.Map;
import java.util.Optional;
import perveance.engine.circuit.Circuit;
import perveance.engine.circuit.DcSolution;
import perveance.engine.circuit.Element;
import perveance.engine.circuit.Element.Valve;
import perveance.engine.circuit.SmallSignal;
import perveance.engine.stage.ChassisCircuits.Built;
import perveance.engine.stage.StageCircuit;
import perveance.engine.stage.StageCircuit.Output;
import perveance.engine.stage.StageCircuit.StageDevice;

/**
 * One stage in the circuit of its group: the stages that hang together without a capacitor, on
 * supply nodes that stand still for signals. Node and element numbers are those of that circuit.
 */
final class StageModel {
  private static final double LEAST_SHARE = 1e-9;

  /** A source that would have to swing more than 10,000 times the input drives nothing [1]. */
  private static final double REACHED = 1e-4;

  private final StageCircuit stage;
  private final DcSolution dc;
  private final SmallSignal signal;
  private final int source;
  private final double inputShare;
  private final boolean atSource;

  /**
   * A stage of a group.
   *
   * @param stage the stage
   * @param driven whether another stage drives the group through a capacitor
   * @param group its group, whose first stage has the source
   * @param dc dc point of the group's circuit
   * @param signal small signals about that point
   */
  StageModel(StageCircuit stage, boolean driven, Built group, DcSolution dc, SmallSignal signal) {
    this.stage = stage;
    this.dc = dc;
    this.signal = signal;
    this.source =
        group.stages().stream()
            .flatMap(s -> s.input().stream())
            .findFirst()
            .map(group.circuit()::element)
            .orElseThrow(() -> new IllegalArgumentException("group has no source"));
    this.atSource = stage.input().isPresent() && !driven;
    this.inputShare = atSource ? 1 : audible(signal.midbandGain(source, stage.inputNode(), 0));
  }

  /** A stage before that is cut off lets nothing through; keeps what is divided by it finite. */
  private static double audible(double share) {
    return Math.abs(share) < LEAST_SHARE ? Math.copySign(LEAST_SHARE, share) : share;
  }

  /** Whether a signal can reach the input without absurd volts at the source. */
  boolean reached() {
    return Math.abs(inputShare) > REACHED;
  }

  StageCircuit stage() {
    return stage;
  }

  Circuit circuit() {
    return dc.circuit();
  }

  DcSolution dc() {
    return dc;
  }

  SmallSignal signal() {
    return signal;
  }

  /** Element that drives the stage, its own source or that of the stage before. */
  int source() {
    return source;
  }

  /** Sources that a drive moves and their shares of it. */
  Map<Integer, Double> shares() {
    return Map.of(source, 1.0);
  }

  Output mainOutput() {
    return stage.outputs().get(0);
  }

  Optional<Output> secondOutput() {
    List<Output> outputs = stage.outputs();
    return outputs.size() > 1 ? Optional.of(outputs.get(1)) : Optional.empty();
  }

  /** The valve element of one of the stage's sections. */
  Valve valve(String ref) {
    return (Valve) circuit().elements().get(circuit().element(ref));
  }

  StageDevice device(String ref) {
    return stage.devices().stream().filter(d -> d.ref().equals(ref)).findFirst().orElseThrow();
  }

  /** Whether an element belongs to this stage and not to one wired straight to it. */
  boolean owns(Element element) {
    String name = element.name();
    return name.startsWith(stage.ref() + ".")
        || stage.devices().stream()
            .map(StageDevice::ref)
            .anyMatch(ref -> name.equals(ref) || name.startsWith(ref + "."));
  }

  /**
   * Whether the stage's input is a source of its own, told by its voltage before the source
   * resistance. The input of a stage that another one drives is the node where it begins, so that
   * the loading of the driver is counted once, in the driver's gain.
   */
  boolean atSource() {
    return atSource;
  }

  /** Share of the source's voltage that reaches the input; 1 where the stage has its own. */
  double inputShare() {
    return inputShare;
  }

  /** Mid-band gain from the stage's input to an output, signed. */
  double gain(Output output) {
    return signal.midbandGain(source, output.plus(), output.minus()) / inputShare;
  }
}
