package perveance.engine.analysis;

import java.util.ArrayList;
import java.util.HashMap;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import java.util.OptionalDouble;
import perveance.engine.analysis.LoadLineView.Point;
import perveance.engine.circuit.DcSolution;
import perveance.engine.circuit.MidbandSolution;
import perveance.engine.stage.ChassisNames;
import perveance.engine.stage.StageCircuit.LoadLineSpec;
import perveance.engine.stage.StageValues;

/** Puts the answer of each stage of a solved chassis together. */
final class StageAnswers {
  private final ChassisModel chassis;
  private final FaultCircuits faults;
  private final Optional<DcSolution> cold;
  private final Optional<ChassisSpread> spread;
  private final AnalysisOptions options;
  private final Designators designators = new Designators();
  private final SupplyDrain drain = new SupplyDrain();
  private final Optional<MeterFigures> meters;

  StageAnswers(
      ChassisModel chassis,
      FaultCircuits faults,
      Optional<DcSolution> cold,
      Optional<ChassisSpread> spread,
      AnalysisOptions options) {
    this.chassis = chassis;
    this.faults = faults;
    this.cold = cold;
    this.spread = spread;
    this.options = options;
    double meter = chassis.chassis().conditions().meter();
    this.meters =
        options.details() ? chassis.dc().map(dc -> new MeterFigures(dc, meter)) : Optional.empty();
  }

  StageAnswer answer(StageModel model) {
    String ref = model.stage().ref();
    StageValues values = chassis.circuits().values(ref);
    Optional<StageSpread> bands = spread.flatMap(s -> s.stage(ref));
    List<DevicePoint> points = withBands(OperatingPoints.of(model.stage(), model.dc()), bands);
    StageCurve dynamic = new StageCurve(model);
    boolean composite = model.stage().loadLine().map(LoadLineSpec::composite).orElse(false);
    OptionalDouble drive = values.find("drive");
    CleanSwing clean = CleanSwings.of(dynamic, composite, drive);
    DrivenLevels levels = new DrivenLevels(model);
    Optional<MidbandSolution> atDrive =
        drive.isPresent() ? levels.cycle(drive.getAsDouble()) : Optional.empty();
    atDrive.ifPresent(cycle -> drain.add(model, cycle));
    Optional<DrivenAnswer> driven = atDrive.map(c -> driven(model, c, drive.getAsDouble()));
    LargeSignalAnswer large =
        options.details() ? large(model, values, levels, clean, points) : LargeSignalAnswer.NONE;
    SmallSignalAnswer small =
        withBands(new SmallSignalFigures(model).answer(options.details()), bands);
    return new StageAnswer(
        ref,
        values.entry().kind(),
        model.stage(),
        chassis.circuits().drawing(ref),
        points,
        new StageLimits(model, chassis.whole().circuit(), values).uses(points, cold, driven),
        small,
        bands.map(b -> withBands(clean, b)).orElse(clean),
        driven,
        options.levels() ? levels.ladder(clean.inputPeak(), drive) : List.of(),
        large,
        BiasDivider.of(values).flatMap(d -> d.answer(values.number("grid_bias"))),
        options.details() ? parts(model, values, atDrive) : List.of(),
        readings(model, points, bands),
        loadLine(model, atDrive.or(() -> levels.cycle(clean.inputPeak())), large),
        options.details() ? sums(model, points, small, clean, drive, large) : List.of(),
        model.stage().assumptions(),
        List.of());
  }

  private LargeSignalAnswer large(
      StageModel model,
      StageValues values,
      DrivenLevels levels,
      CleanSwing clean,
      List<DevicePoint> points) {
    double peak = clean.inputPeak();
    return new LargeSignalAnswer(
        Blocking.recovery(
            model,
            levels,
            peak,
            points.get(0).grid(),
            InputCapacitor.of(chassis.chassis(), model.stage().ref())),
        ReactiveLoad.of(model, values, values.number("drive", peak)));
  }

  private static List<HandSum> sums(
      StageModel model,
      List<DevicePoint> points,
      SmallSignalAnswer small,
      CleanSwing clean,
      OptionalDouble drive,
      LargeSignalAnswer large) {
    List<HandSum> sums = new ArrayList<>(HandSums.of(model, points, small, clean, drive));
    sums.addAll(Blocking.sums(large.recovery()));
    return sums;
  }

  private DrivenAnswer driven(StageModel model, MidbandSolution cycle, double drive) {
    DrivenAnswer answer = new DrivenFigures(model, cycle).answer(drive);
    return options.levels() ? answer.with(new TwoTones(model).at(drive)) : answer;
  }

  /** What the stages answered so far take at their drives beyond idle. */
  SupplyDrain drain() {
    return drain;
  }

  private static List<DevicePoint> withBands(
      List<DevicePoint> points, Optional<StageSpread> bands) {
    List<DevicePoint> with = new ArrayList<>();
    for (DevicePoint point : points) {
      with.add(bands.map(b -> point.withBands(b.bands(point.ref()))).orElse(point));
    }
    return with;
  }

  private static SmallSignalAnswer withBands(
      SmallSignalAnswer answer, Optional<StageSpread> bands) {
    if (bands.isEmpty()) {
      return answer;
    }
    Map<String, Band> all = new HashMap<>(bands.get().bands());
    all.putAll(bands.get().cornerBands(answer));
    return answer.withBands(all);
  }

  private static CleanSwing withBands(CleanSwing clean, StageSpread bands) {
    return clean.withBands(bands.swingBands());
  }

  private List<PartDuty> parts(
      StageModel model, StageValues values, Optional<MidbandSolution> driven) {
    Optional<DcSolution> idle = chassis.dc();
    if (idle.isEmpty()) {
      return List.of();
    }
    PartDuties duties = new PartDuties(model, values, idle.get(), faults, cold);
    driven.ifPresent(cycle -> duties.addDriven(DrivenLevels.stress(model, cycle)));
    return duties.all(designators);
  }

  private List<ExpectedReading> readings(
      StageModel model, List<DevicePoint> points, Optional<StageSpread> bands) {
    Map<String, Band> nodes = new HashMap<>(bands.map(StageSpread::nodeBands).orElse(Map.of()));
    spread.ifPresent(
        s ->
            chassis
                .chassis()
                .supplies()
                .forEach(
                    supply -> {
                      String name = ChassisNames.supply(supply.name());
                      s.rails().band(name).ifPresent(b -> nodes.put(name, b));
                    }));
    return meters.map(m -> m.of(model, points, nodes)).orElse(List.of());
  }

  private static Optional<LoadLineView> loadLine(
      StageModel model, Optional<MidbandSolution> cycle, LargeSignalAnswer large) {
    boolean composite = model.stage().loadLine().map(LoadLineSpec::composite).orElse(false);
    return model
        .stage()
        .loadLine()
        .map(LoadLineSpec::device)
        .flatMap(
            ref -> {
              List<Point> path = cycle.map(c -> DrivenLevels.path(model, c, ref)).orElse(List.of());
              List<Point> reactive = large.reactive().map(ReactiveAnswer::path).orElse(List.of());
              return LoadLines.of(new LoadSeen(model, ref, composite), ref, path, reactive);
            });
  }
}
