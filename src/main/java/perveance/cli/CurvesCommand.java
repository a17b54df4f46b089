package perveance.cli;

import java.io.IOException;
import java.nio.file.Path;
import java.util.List;
import java.util.Locale;
import java.util.OptionalDouble;
import java.util.concurrent.Callable;
import org.jspecify.annotations.Nullable;
import perveance.engine.base.BadInputException;
import perveance.engine.base.Problem;
import perveance.engine.device.CurveFamily;
import perveance.engine.device.Device;
import perveance.engine.device.LawKind;
import perveance.engine.device.Ratings;
import perveance.files.WholeFile;
import perveance.plot.CurvePictures;
import picocli.CommandLine.Command;
import picocli.CommandLine.Mixin;
import picocli.CommandLine.Option;
import picocli.CommandLine.Parameters;
import picocli.CommandLine.ParentCommand;

/** {@code curves}: anode characteristics of a device. */
@Command(
    name = "curves",
    mixinStandardHelpOptions = true,
    description = "Prints a device's anode characteristics as CSV, or draws them as SVG or PNG.",
    footer = {
      "",
      "Examples:",
      "  perveance curves 12AX7",
      "  perveance curves ECC83 -o ecc83.svg",
      "  perveance curves EL84 --screen 250 -o el84.png"
    })
final class CurvesCommand implements Callable<Integer> {
  @ParentCommand private PerveanceCommand parent = new PerveanceCommand();

  @Mixin private CommonOptions common = new CommonOptions();

  @Parameters(paramLabel = "DEVICE", description = "Type or alias, any case.")
  private String name = "";

  @Option(
      names = {"-o", "--output"},
      paramLabel = "FILE",
      description = "Picture or table: the ending .svg, .png or .csv decides.")
  private @Nullable Path output;

  @Option(
      names = "--screen",
      paramLabel = "VOLTS",
      description = "Screen voltage of a pentode; tied to the anode if not given.")
  private @Nullable Double screen;

  @Option(names = "--volts", paramLabel = "VOLTS", description = "End of the voltage axis.")
  private @Nullable Double volts;

  @Option(names = "--milliamperes", paramLabel = "MA", description = "End of the current axis.")
  private @Nullable Double milliamperes;

  @Override
  public Integer call() throws BadInputException, IOException {
    Workshop workshop = common.workshop();
    Device device =
        workshop
            .devices()
            .load(name)
            .orElseThrow(() -> new BadInputException(List.of(unknown(workshop))));
    CurveFamily family = family(device);
    if (output == null) {
      parent.out().print(CurveTable.csv(family));
      parent.out().flush();
      return ExitCode.DONE.number();
    }
    byte[] content = content(device, family, output);
    WholeFile.write(output, List.of(), out -> out.write(content));
    parent.out().println("Curves: " + output.toAbsolutePath().normalize());
    parent.out().flush();
    return ExitCode.DONE.number();
  }

  private Problem unknown(Workshop workshop) {
    return UnknownDevice.problem(name, workshop.devices().names());
  }

  private CurveFamily family(Device device) {
    double toVolts = volts != null ? volts : device.validity().highestAnodeVoltage() * 1.2;
    double toAmperes =
        milliamperes != null ? milliamperes * 1e-3 : device.validity().highestCurrent() * 1.6;
    boolean pentode = device.law().kind() == LawKind.PENTODE;
    double screenVolts = !pentode ? 0 : screen != null ? screen : CurveFamily.SCREEN_TIED;
    return CurveFamily.of(device, screenVolts, toVolts, toAmperes);
  }

  private static byte[] content(Device device, CurveFamily family, Path target) {
    OptionalDouble watts =
        device.defaultRatings().map(Ratings::anodeDissipation).orElse(OptionalDouble.empty());
    String ending = target.getFileName().toString().toLowerCase(Locale.ROOT);
    if (ending.endsWith(".svg")) {
      return CurvePictures.svg(family, watts);
    }
    if (ending.endsWith(".png")) {
      return CurvePictures.png(family, watts);
    }
    return CurveTable.csv(family).getBytes(java.nio.charset.StandardCharsets.UTF_8);
  }
}
