package perveance.cli;

import perveance.engine.analysis.ChassisAnswer;
import perveance.engine.base.Severity;

/** The exit code that an answer deserves. */
final class Outcome {
  private Outcome() {}

  static ExitCode of(ChassisAnswer answer) {
    if (!answer.failures().isEmpty()) {
      return ExitCode.NOT_SOLVED;
    }
    boolean over =
        answer.findings().stream().anyMatch(f -> f.severity().compareTo(Severity.OVER_LIMIT) >= 0);
    return over ? ExitCode.OVER_LIMIT : ExitCode.DONE;
  }
}
