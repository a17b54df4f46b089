package perveance.cli;

import java.io.IOException;
import java.nio.charset.StandardCharsets;
import java.nio.file.Path;
import java.util.List;
import java.util.Locale;
import java.util.concurrent.Callable;
import org.jspecify.annotations.Nullable;
import perveance.engine.base.BadInputException;
import perveance.engine.base.Problem;
import perveance.engine.device.Device;
import perveance.engine.device.fit.FitResult;
import perveance.engine.device.fit.LawFit;
import perveance.engine.device.fit.SpecimenFit;
import perveance.files.WholeFile;
import perveance.plot.CurvePictures;
import perveance.plot.FitPlot;
import picocli.CommandLine.Command;
import picocli.CommandLine.Mixin;
import picocli.CommandLine.Option;
import picocli.CommandLine.Parameters;
import picocli.CommandLine.ParentCommand;

/** {@code fit}: makes a law from evidence or readings and says how good it is. */
@Command(
    name = "fit",
    mixinStandardHelpOptions = true,
    description = {
      "Fits a device law to readings and says how well it meets them.",
      "The readings are a table or a device file's evidence; which of them it distrusts is told,",
      "and a device file is written if asked.",
      "With --valve it scales a typical law to the first reading instead."
    },
    footer = {
      "",
      "Readings are a CSV with a heading, for example  Va [V], Vg [V], Ia [mA]",
      "",
      "Examples:",
      "  perveance fit my-readings.csv -o my-valve.toml --picture my-valve.svg",
      "  perveance fit device-curves/12ax7.toml",
      "  perveance fit one-reading.csv --valve 12AX7"
    })
final class FitCommand implements Callable<Integer> {
  @ParentCommand private PerveanceCommand parent = new PerveanceCommand();

  @Mixin private CommonOptions common = new CommonOptions();

  @Parameters(paramLabel = "FILE", description = "Device file or readings (TOML or CSV).")
  private Path file = Path.of("");

  @Option(
      names = {"-o", "--output"},
      paramLabel = "DEVICE.toml",
      description = "Write a device file with the fitted law.")
  private @Nullable Path output;

  @Option(
      names = "--picture",
      paramLabel = "PICTURE",
      description = "Draw the points on the fitted curves (.svg or .png).")
  private @Nullable Path picture;

  @Option(
      names = "--valve",
      paramLabel = "DEVICE",
      description = "Scale this type's typical law to the first reading.")
  private @Nullable String valve;

  @Override
  public Integer call() throws BadInputException, IOException {
    FitInput input = FitInput.read(file);
    if (valve != null) {
      return scale(input, valve);
    }
    FitResult result = input.fit();
    return result instanceof FitResult.Fitted fitted
        ? fitted(input, fitted.fit())
        : refused(((FitResult.NotFitted) result).reason());
  }

  private int refused(String reason) {
    parent.err().println("Not fitted: " + reason);
    parent.err().flush();
    return ExitCode.NOT_SOLVED.number();
  }

  private int fitted(FitInput input, LawFit fit) throws BadInputException, IOException {
    print(FitReportText.of(input, fit, common.vocabulary()));
    Device device = input.sheet().with(fit.law(), fit.summary(), fit.validity());
    if (output != null) {
      byte[] bytes = input.text(fit).getBytes(StandardCharsets.UTF_8);
      WholeFile.write(output, List.of(file), out -> out.write(bytes));
      print("Device file: " + output.toAbsolutePath().normalize() + "\n");
    }
    if (picture != null) {
      boolean vector = picture.toString().toLowerCase(Locale.ROOT).endsWith(".svg");
      byte[] bytes = CurvePictures.of(FitPlot.of(device, fit), vector);
      WholeFile.write(picture, List.of(file), out -> out.write(bytes));
      print("Picture: " + picture.toAbsolutePath().normalize() + "\n");
    }
    return ExitCode.DONE.number();
  }

  private int scale(FitInput input, String type) throws BadInputException {
    Workshop workshop = common.workshop();
    Device device =
        workshop
            .devices()
            .load(type)
            .orElseThrow(
                () ->
                    new BadInputException(UnknownDevice.problem(type, workshop.devices().names())));
    if (input.sheet().evidence().isEmpty()) {
      throw new BadInputException(
          Problem.at(file.toString(), 1, "readings", "none", "at least one reading"));
    }
    SpecimenFit result = SpecimenFit.scale(device.law(), input.sheet().evidence().get(0));
    if (result instanceof SpecimenFit.Scaled scaled) {
      print(FitReportText.scaled(device, scaled));
      return ExitCode.DONE.number();
    }
    return refused(((SpecimenFit.NotScaled) result).reason());
  }

  private void print(String text) {
    parent.out().print(text);
    parent.out().flush();
  }
}
