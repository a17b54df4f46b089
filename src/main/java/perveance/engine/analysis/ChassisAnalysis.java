package perveance.engine.analysis;

import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import perveance.engine.base.Finding;
import perveance.engine.base.Findings;
import perveance.engine.base.Progress;
import perveance.engine.circuit.DcSolution;
import perveance.engine.device.DeviceLibrary;
import perveance.engine.stage.Chassis;
import perveance.engine.stage.ChassisCircuits;

/**
 * Works a chassis out: the one way from a chassis to its answer, the same for every kind of stage.
 *
 * <p>The whole chassis is solved at dc with its supply chain; then each group of stages that hang
 * together is worked out on the supply voltages found. Stages without a solution are told with the
 * reason; the others have their answer all the same.
 */
public final class ChassisAnalysis {
  private final DeviceLibrary devices;

  /**
   * An analysis with a library of devices.
   *
   * @param devices where devices are found by name
   */
  public ChassisAnalysis(DeviceLibrary devices) {
    this.devices = devices;
  }

  /**
   * Answers a chassis.
   *
   * @param chassis a chassis without complaints (see {@link
   *     perveance.engine.stage.ChassisChecks#all})
   * @param options how much is worked out
   * @param progress told how far the work is; when cancelled, bands and findings are left out
   * @return the answer
   * @throws IllegalArgumentException when the chassis has complaints
   */
  public ChassisAnswer answer(Chassis chassis, AnalysisOptions options, Progress progress) {
    progress.report(0, "operating point");
    ChassisModel model = ChassisModel.of(chassis, new ChassisCircuits(chassis, devices));
    Optional<DcSolution> dc = model.dc();
    FaultCircuits faults = new FaultCircuits(model.whole().circuit());
    Optional<DcSolution> cold = options.details() ? faults.cold() : Optional.empty();
    Optional<ChassisSpread> spread =
        dc.isPresent() && options.samples() > 0 && !progress.cancelled()
            ? Optional.of(ChassisSpread.of(model, dc.get(), options, progress))
            : Optional.empty();
    StageAnswers answers = new StageAnswers(model, faults, cold, spread, options);
    List<StageAnswer> stages = new ArrayList<>();
    for (StageModel stage : model.models()) {
      StageAnswer answer = answers.answer(stage);
      boolean judged = options.details() && !progress.cancelled();
      stages.add(judged ? judged(answer, stage, model, cold) : answer);
    }
    List<Discharge> discharges = dc.map(p -> discharges(model, p, cold)).orElse(List.of());
    HighestVoltage highest = HighestVoltage.of(model, cold);
    List<SignalChain> chains = SignalChains.of(chassis, stages);
    List<Finding> findings = new ArrayList<>();
    if (options.details()) {
      findings.addAll(new ChassisFindings(model, cold).all(discharges, answers.drain()));
      findings.addAll(EnvelopeFindings.of(model, stages));
      findings.addAll(ChainFindings.of(chains, stages));
    }
    stages.forEach(s -> findings.addAll(s.findings()));
    progress.report(1, "done");
    return new ChassisAnswer(
        chassis,
        dc.map(p -> SupplyFigures.of(chassis, p, cold, spread.map(ChassisSpread::rails)))
            .orElse(List.of()),
        stages,
        model.failures(),
        discharges,
        highest.voltage(),
        chains,
        Findings.worstFirst(findings));
  }

  private StageAnswer judged(
      StageAnswer answer, StageModel stage, ChassisModel model, Optional<DcSolution> cold) {
    FindingContext context =
        new FindingContext(
            answer,
            stage,
            model.circuits().values(answer.ref()),
            model.chassis().conditions(),
            InputCapacitor.of(model.chassis(), answer.ref()),
            cold,
            new ChassisRetry(model, devices));
    List<Finding> findings = new ArrayList<>();
    findings.addAll(RatingFindings.of(context));
    findings.addAll(BiasFindings.of(context));
    findings.addAll(BiasSupplyFindings.of(context));
    findings.addAll(GridFindings.of(context));
    findings.addAll(SwingFindings.of(context));
    findings.addAll(OutputFindings.of(context));
    findings.addAll(OutputLoadFindings.of(context));
    findings.addAll(ReactiveFindings.of(context));
    findings.addAll(ResponseFindings.of(context));
    findings.addAll(PartFindings.of(context));
    findings.addAll(DataFindings.of(context));
    return answer.withFindings(Findings.worstFirst(findings));
  }

  /**
   * Answers one stage of a chassis.
   *
   * @param chassis a chassis without complaints
   * @param ref reference of the stage
   * @param options how much is worked out
   * @return its answer; empty when it has no solution
   */
  public Optional<StageAnswer> answerStage(Chassis chassis, String ref, AnalysisOptions options) {
    return answer(chassis, options, Progress.none()).stages().stream()
        .filter(s -> s.ref().equals(ref))
        .findFirst();
  }

  private static List<Discharge> discharges(
      ChassisModel model, DcSolution dc, Optional<DcSolution> cold) {
    return new Discharges(model.whole().circuit(), model.chassis().conditions().threshold())
        .all(dc, cold);
  }
}
