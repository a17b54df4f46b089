package perveance.cli;

import java.io.IOException;
import java.nio.file.Path;
import java.time.LocalDate;
import java.util.List;
import java.util.concurrent.Callable;
import org.jspecify.annotations.Nullable;
import perveance.engine.analysis.AnalysisOptions;
import perveance.engine.analysis.ChassisAnswer;
import perveance.engine.base.BadInputException;
import perveance.engine.base.Progress;
import perveance.files.WholeFile;
import perveance.report.BuildSheet;
import perveance.report.PaperSize;
import perveance.report.SheetOptions;
import picocli.CommandLine.Command;
import picocli.CommandLine.Mixin;
import picocli.CommandLine.Option;
import picocli.CommandLine.Parameters;
import picocli.CommandLine.ParentCommand;

/** {@code sheet}: writes the build sheet. */
@Command(
    name = "sheet",
    mixinStandardHelpOptions = true,
    description = "Writes the build sheet of a chassis file as a PDF and says where.",
    footer = {
      "",
      "Examples:",
      "  perveance sheet my-amplifier.toml",
      "  perveance sheet --paper letter --words american -o bench.pdf my-amplifier.toml"
    })
final class SheetCommand implements Callable<Integer> {
  @ParentCommand private PerveanceCommand parent = new PerveanceCommand();

  @Mixin private CommonOptions common = new CommonOptions();

  @Parameters(paramLabel = "FILE", description = "Chassis file (TOML).")
  private Path file = Path.of("");

  @Option(
      names = {"-o", "--output"},
      paramLabel = "PDF",
      description = "Where to write; beside the chassis file if not given.")
  private @Nullable Path output;

  @Option(
      names = "--paper",
      paramLabel = "a4|letter",
      description = "Paper size.",
      defaultValue = "a4")
  private PaperSize paper = PaperSize.A4;

  @Option(names = "--zigzag", description = "Draw resistors as zigzags.")
  private boolean zigzag;

  @Override
  public Integer call() throws BadInputException, IOException {
    Workshop workshop = common.workshop();
    workshop.warn(parent.err());
    ChassisAnswer answer =
        workshop.analysis().answer(workshop.read(file), AnalysisOptions.FULL, Progress.none());
    Path target = output == null ? beside(file) : output;
    SheetOptions options =
        new SheetOptions(
            paper, common.vocabulary(), zigzag, LocalDate.now(), PerveanceCommand.version());
    byte[] pdf = new BuildSheet(options).render(answer);
    WholeFile.write(target, List.of(file), out -> out.write(pdf));
    parent.out().println("Build sheet: " + target.toAbsolutePath().normalize());
    parent.out().flush();
    return Outcome.of(answer).number();
  }

  private static Path beside(Path file) {
    String name = file.getFileName().toString();
    String stem = name.endsWith(".toml") ? name.substring(0, name.length() - 5) : name;
    return file.resolveSibling(stem + ".pdf");
  }
}
