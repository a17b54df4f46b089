package perveance.engine.analysis;

import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import java.util.OptionalDouble;
import perveance.engine.circuit.Circuit;
import perveance.engine.circuit.DcSolution;
import perveance.engine.device.LawKind;
import perveance.engine.stage.StageCircuit.StageDevice;
import perveance.engine.stage.StageValues;

/** Gathers the use of every published limit of a stage's valves. */
final class StageLimits {
  private final StageModel model;
  private final Circuit whole;
  private final double heater;

  /**
   * Limits of one stage.
   *
   * @param model the stage
   * @param whole circuit of the whole chassis
   * @param values the stage's values
   */
  StageLimits(StageModel model, Circuit whole, StageValues values) {
    this.model = model;
    this.whole = whole;
    this.heater = values.number("heater_elevation", 0);
  }

  /**
   * All uses.
   *
   * @param points operating points of its valves
   * @param cold the whole chassis with cold valves
   * @param driven at the stated drive
   */
  List<LimitUse> uses(
      List<DevicePoint> points, Optional<DcSolution> cold, Optional<DrivenAnswer> driven) {
    List<LimitUse> uses = new ArrayList<>();
    for (int i = 0; i < points.size(); i++) {
      DevicePoint point = points.get(i);
      StageDevice device = model.device(point.ref());
      LimitShares shares = new LimitShares(device, point, heater);
      shares.addIdle(GridCircuit.resistance(whole, point.ref()));
      cold.ifPresent(
          dc -> {
            var valve = dc.valve(point.ref());
            shares.addCold(valve.voltage(0), valve.cathodeVoltage());
          });
      int section = i;
      driven.ifPresent(d -> addDriven(shares, d, section, points.size()));
      if (i == points.size() - 1 && device.device().sections() > 1 && points.size() > 1) {
        double both = points.stream().mapToDouble(DevicePoint::anodeDissipation).sum();
        shares.addEnvelope(both, LimitShares.IDLE);
      }
      uses.addAll(shares.uses());
    }
    return uses;
  }

  private void addDriven(LimitShares shares, DrivenAnswer driven, int section, int sections) {
    List<Double> screens = driven.screenDissipation();
    boolean screened =
        model.stage().devices().get(section).device().law().kind() == LawKind.PENTODE;
    double cathode = (driven.meanAnodeCurrent() + driven.meanScreenCurrent().orElse(0)) / sections;
    shares.addDriven(
        driven.anodeDissipation().get(section),
        screened && screens.size() == sections
            ? OptionalDouble.of(screens.get(section))
            : OptionalDouble.empty(),
        OptionalDouble.of(cathode));
  }
}
