package perveance.engine.analysis;

import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import java.util.OptionalDouble;

/** All hand sums of a stage. */
final class HandSums {
  /** A valve with less mutual conductance than this is cut off and has no sums [S]. */
  private static final double LEAST = 1e-9;

  private HandSums() {}

  static List<HandSum> of(
      StageModel model,
      List<DevicePoint> points,
      SmallSignalAnswer small,
      CleanSwing clean,
      OptionalDouble drive) {
    double peak = drive.orElse(clean.inputPeak());
    List<HandSum> sums = new ArrayList<>(new PointSums(model).of(points));
    Optional<SignalPath> path = SignalPath.of(model);
    boolean onGrid = path.filter(p -> p.way() == SignalPath.Way.COMMON_CATHODE).isPresent();
    if (path.isPresent() && points.get(0).mutualConductance() > LEAST) {
      LoadSeen seen = new LoadSeen(model, points.get(0).ref(), false);
      Optional<Double> load = seen.acResistance();
      if (load.isPresent()) {
        sums.addAll(
            new GainSums(path.get(), points.get(0), load.get()).all(anodeLoad(model, path.get())));
        sums.addAll(
            new FrequencySums(model, small)
                .all(points.get(0), load.get() - path.get().cathodeResistance()));
      }
      if (onGrid) {
        sums.addAll(NoiseSums.of(model, small, points.get(0)));
      }
    }
    boolean still = onGrid && path.orElseThrow().cathodeResistance() == 0;
    double onset = model.valve(points.get(0).ref()).law().gridCurrentOnset();
    sums.addAll(OverloadSums.of(clean, points.get(0), onset, drive, still));
    sums.addAll(SwingSums.of(new StageCurve(model), peak, model.inputShare()));
    return sums;
  }

  /** The part from the electrode that gives the output to a supply or chassis. */
  private static Optional<Double> anodeLoad(StageModel model, SignalPath path) {
    int node =
        path.way() == SignalPath.Way.FOLLOWER ? path.valve().cathode() : path.valve().anode();
    return PartRoles.loadAt(model, node);
  }
}
