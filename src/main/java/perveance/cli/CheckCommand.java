package perveance.cli;

import java.io.ByteArrayOutputStream;
import java.io.IOException;
import java.nio.charset.StandardCharsets;
import java.nio.file.Path;
import java.util.concurrent.Callable;
import perveance.engine.analysis.AnalysisOptions;
import perveance.engine.analysis.ChassisAnswer;
import perveance.engine.base.BadInputException;
import perveance.engine.base.Progress;
import perveance.files.json.JsonReport;
import picocli.CommandLine.Command;
import picocli.CommandLine.Mixin;
import picocli.CommandLine.Option;
import picocli.CommandLine.Parameters;
import picocli.CommandLine.ParentCommand;

/** {@code check}: computes a chassis file and reports. */
@Command(
    name = "check",
    mixinStandardHelpOptions = true,
    description = "Computes every stage of a chassis file and reports, worst findings first.",
    footer = {
      "",
      "Examples:",
      "  perveance check examples/line-stage.toml",
      "  perveance check --explain my-amplifier.toml",
      "  perveance check --json my-amplifier.toml > report.json",
      "",
      "Exit status: 0 done, 1 done with an over-limit or danger finding, 2 bad input,",
      "3 could not solve, 70 internal error."
    })
final class CheckCommand implements Callable<Integer> {
  @ParentCommand private PerveanceCommand parent = new PerveanceCommand();

  @Mixin private CommonOptions common = new CommonOptions();

  @Parameters(paramLabel = "FILE", description = "Chassis file (TOML).")
  private Path file = Path.of("");

  @Option(names = "--json", description = "Print one JSON object instead of the report.")
  private boolean json;

  @Option(names = "--explain", description = "Show the hand sum behind each figure.")
  private boolean explain;

  @Override
  public Integer call() throws BadInputException, IOException {
    Workshop workshop = common.workshop();
    workshop.warn(parent.err());
    ChassisAnswer answer =
        workshop.analysis().answer(workshop.read(file), AnalysisOptions.FULL, Progress.none());
    if (json) {
      ByteArrayOutputStream bytes = new ByteArrayOutputStream();
      JsonReport.write(answer, bytes);
      parent.out().print(bytes.toString(StandardCharsets.UTF_8));
    } else {
      parent
          .out()
          .print(new TerminalReport(Ansi.detected(), common.vocabulary(), explain).print(answer));
    }
    parent.out().flush();
    return Outcome.of(answer).number();
  }
}
