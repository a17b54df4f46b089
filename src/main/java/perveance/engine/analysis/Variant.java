package perveance.engine.analysis;

import java.util.List;
import java.util.Optional;
import java.util.OptionalDouble;
import perveance.engine.circuit.Circuit;
import perveance.engine.stage.StageCircuit.LoadLineSpec;
import perveance.engine.stage.StageValues;

/**
 * A stage with some of its values changed, worked out as far as a question asks: each figure is
 * computed when it is first wanted.
 */
final class Variant {
  private final StageModel model;
  private final Circuit whole;
  private final StageValues values;
  private Optional<CleanSwing> clean = Optional.empty();
  private Optional<SmallSignalAnswer> small = Optional.empty();
  private Optional<List<LimitUse>> limits = Optional.empty();

  /**
   * A changed stage.
   *
   * @param model the stage as changed
   * @param whole circuit of the whole chassis as changed
   * @param values its values as changed
   */
  Variant(StageModel model, Circuit whole, StageValues values) {
    this.model = model;
    this.whole = whole;
    this.values = values;
  }

  List<DevicePoint> points() {
    return OperatingPoints.of(model.stage(), model.dc());
  }

  /** Mid-band gain, signed [1]. */
  double gain() {
    return model.gain(model.mainOutput());
  }

  /** Gain of the second output, empty when there is none [1]. */
  OptionalDouble secondGain() {
    return model.secondOutput().isPresent()
        ? OptionalDouble.of(model.gain(model.secondOutput().get()))
        : OptionalDouble.empty();
  }

  CleanSwing clean() {
    if (clean.isEmpty()) {
      boolean composite = model.stage().loadLine().map(LoadLineSpec::composite).orElse(false);
      clean = Optional.of(CleanSwings.of(new StageCurve(model), composite, values.find("drive")));
    }
    return clean.get();
  }

  /** Power into the load at the clean output, zero for a stage that gives none [W]. */
  double cleanPower() {
    return OutputLoad.cleanPower(model, clean().outputPeak()).orElse(0);
  }

  SmallSignalAnswer small() {
    if (small.isEmpty()) {
      small = Optional.of(new SmallSignalFigures(model).answer(false));
    }
    return small.get();
  }

  /** Use of every limit at idle, with cold valves and at the stated drive. */
  List<LimitUse> limits() {
    if (limits.isEmpty()) {
      Optional<DrivenAnswer> driven =
          values.find("drive").isPresent()
              ? new DrivenLevels(model).answer(values.find("drive").getAsDouble())
              : Optional.empty();
      limits =
          Optional.of(
              new StageLimits(model, whole, values)
                  .uses(points(), new FaultCircuits(whole).cold(), driven));
    }
    return limits.get();
  }
}
