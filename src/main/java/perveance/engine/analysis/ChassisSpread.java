package perveance.engine.analysis;

import java.util.HashMap;
import java.util.Map;
import java.util.Optional;
import perveance.engine.base.Progress;
import perveance.engine.circuit.DcSolution;

/** The specimens of a chassis: its supply nodes and every stage over all samples. */
final class ChassisSpread {
  private final RailSpread rails;
  private final Map<String, StageSpread> stages = new HashMap<>();

  private ChassisSpread(RailSpread rails) {
    this.rails = rails;
  }

  static ChassisSpread of(
      ChassisModel model, DcSolution dc, AnalysisOptions options, Progress progress) {
    Causes causes =
        new Causes(model.whole().circuit(), model.whole().stages(), model.chassis().conditions());
    SampleDraws draws = new SampleDraws(options.seed(), options.samples(), causes.count());
    ChassisSpread spread = new ChassisSpread(new RailSpread(dc, model.rails(), draws, causes));
    int done = 0;
    for (StageModel stage : model.models()) {
      if (progress.cancelled()) {
        break;
      }
      progress.report((double) done++ / model.models().size(), "bands of " + stage.stage().ref());
      StageSpread of = new StageSpread(stage, draws, causes, spread.rails);
      of.run();
      spread.stages.put(stage.stage().ref(), of);
    }
    return spread;
  }

  RailSpread rails() {
    return rails;
  }

  /** Specimens of a stage; empty when too few have an answer. */
  Optional<StageSpread> stage(String ref) {
    return Optional.ofNullable(stages.get(ref)).filter(StageSpread::usable);
  }
}
