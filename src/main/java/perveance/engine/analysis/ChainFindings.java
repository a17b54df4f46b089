package perveance.engine.analysis;

import java.util.ArrayList;
import java.util.List;
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

  private ChainFindings() {}

  static List<Finding> of(List<SignalChain> chains, List<StageAnswer> stages) {
    List<Finding> findings = new ArrayList<>();
    for (SignalChain chain : chains) {
      Link last = chain.links().get(chain.links().size() - 1);
      if (forPower(find(stages, last.ref()))) {
        for (Link link : chain.links().subList(0, chain.links().size() - 1)) {
          judge(find(stages, link.ref()), link, last, findings);
        }
      }
    }
    return findings;
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
