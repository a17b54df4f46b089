package perveance.engine.analysis;

import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import perveance.engine.analysis.SignalChain.Link;
import perveance.engine.base.Finding;
import perveance.engine.base.Severity;
import perveance.engine.base.SignalMessage;
import perveance.engine.base.Unit;
import perveance.engine.stage.StageCircuit.PartType;

/** Findings about stages that should drive an output stage to its limit, and whether they can. */
final class ChainFindings {
  /** A driver with less in hand than this is thin, common practice [dB]. */
  private static final double THIN = 3;

  /** An output stage is usually driven a little beyond its clean swing [dB]. */
  private static final double USUAL_OVER = 1;

  private ChainFindings() {}

  static List<Finding> of(List<SignalChain> chains, List<StageAnswer> stages) {
    List<Finding> findings = new ArrayList<>();
    for (SignalChain chain : chains) {
      Link last = chain.links().get(chain.links().size() - 1);
      boolean forPower = forPower(find(stages, last.ref()));
      drive(chain, forPower).ifPresent(findings::add);
      if (forPower) {
        for (Link link : chain.links().subList(0, chain.links().size() - 1)) {
          judge(find(stages, link.ref()), link, last, findings);
        }
      }
    }
    return findings;
  }

  /** A drive of the first stage that is more than the row takes cleanly. */
  private static Optional<Finding> drive(SignalChain chain, boolean forPower) {
    double drive = chain.drive().orElse(0);
    double over = 20 * Math.log10(drive / chain.inputPeak());
    if (!Double.isFinite(over) || over <= (forPower ? USUAL_OVER : 0)) {
      return Optional.empty();
    }
    String ref = chain.links().get(0).ref();
    return Optional.of(
        Finding.of(
                SignalMessage.ROW_OVERDRIVEN,
                Severity.CAUTION,
                ref,
                ref,
                Words.of(drive, Unit.VOLT),
                chain.clipsFirst(),
                Words.of(chain.inputPeak(), Unit.VOLT))
            .withValue(drive, chain.inputPeak(), Unit.VOLT));
  }

  private static StageAnswer find(List<StageAnswer> stages, String ref) {
    return stages.stream().filter(s -> s.ref().equals(ref)).findFirst().orElseThrow();
  }

  private static boolean forPower(StageAnswer stage) {
    return stage.circuit().parts().stream().anyMatch(p -> p.type() == PartType.TRANSFORMER);
  }

  private static void judge(StageAnswer driver, Link link, Link last, List<Finding> findings) {
    double room = link.spare() - last.spare();
    if (room >= THIN) {
      return;
    }
    double gives = driver.clean().outputPeak();
    double takes = link.outputPeak() * Math.pow(10, last.spare() / 20);
    boolean isShort = room < 0;
    Finding finding =
        isShort
            ? Finding.of(
                SignalMessage.DRIVER_SHORT,
                Severity.CAUTION,
                driver.ref(),
                driver.ref(),
                last.ref(),
                Words.of(gives, Unit.VOLT),
                Words.of(takes, Unit.VOLT))
            : Finding.of(
                SignalMessage.DRIVER_THIN,
                Severity.NOTE,
                driver.ref(),
                driver.ref(),
                Words.level(room),
                last.ref());
    findings.add(
        isShort
            ? finding.withValue(gives, takes, Unit.VOLT)
            : finding.withValue(room, THIN, Unit.DECIBEL));
  }
}
