package perveance.cli;

import java.io.IOException;
import java.nio.file.Path;
import java.util.List;
import java.util.Locale;
import java.util.Optional;
import java.util.OptionalDouble;
import java.util.OptionalInt;
import java.util.concurrent.Callable;
import org.jspecify.annotations.Nullable;
import perveance.engine.base.BadInputException;
import perveance.engine.base.Problem;
import perveance.engine.device.CurveFamily;
import perveance.engine.device.Device;
import perveance.engine.device.LawKind;
import perveance.files.WholeFile;
import perveance.plot.CurvePictures;
import perveance.plot.DevicePlots;
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
      "  perveance curves EL84 --screen 250 -o el84.png",
      "  perveance curves EL34 --triode --volts 500 -o el34.svg"
    })
final class CurvesCommand implements Callable<Integer> {
  private static final double LARGEST = 1e5;

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
      description = "Screen voltage of a pentode; that of its published point if not given.")
  private @Nullable Double screen;

  @Option(names = "--triode", description = "Tie the screen of a pentode to the anode.")
  private boolean triode;

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
    CurveFamily family = family(device, options(device));
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

  /** Where the axes end and what the screen does, each checked. */
  private Axes options(Device device) throws BadInputException {
    boolean pentode = device.law().kind() == LawKind.PENTODE;
    if (!pentode && (triode || screen != null)) {
      throw refused(
          triode ? "--triode" : "--screen", device.type() + ", which has no screen", "a pentode");
    }
    if (triode && screen != null) {
      throw refused("--screen", "a screen voltage as well as --triode", "one or the other");
    }
    OptionalDouble tied =
        triode ? OptionalDouble.of(CurveFamily.SCREEN_TIED) : positive("--screen", screen, "V");
    return new Axes(
        tied.orElse(DevicePlots.usualScreen(device)),
        positive("--volts", volts, "V"),
        positive("--milliamperes", milliamperes, "mA"));
  }

  private static OptionalDouble positive(String option, @Nullable Double value, String unit)
      throws BadInputException {
    if (value == null) {
      return OptionalDouble.empty();
    }
    if (!(value > 0 && value <= LARGEST)) {
      throw refused(option, value + "", "a figure above 0 and up to 100000 " + unit);
    }
    return OptionalDouble.of(value);
  }

  private static BadInputException refused(String option, String found, String expected) {
    return new BadInputException(
        List.of(
            new Problem(
                "command line", OptionalInt.empty(), option, found, expected, Optional.empty())));
  }

  private static CurveFamily family(Device device, Axes axes) {
    OptionalDouble amperes =
        axes.milliamperes.isPresent()
            ? OptionalDouble.of(1e-3 * axes.milliamperes.getAsDouble())
            : OptionalDouble.empty();
    return DevicePlots.family(device, axes.screen, axes.volts, amperes);
  }

  /** What the options ask for: screen [V], ends of the axes [V], [mA]. */
  private record Axes(double screen, OptionalDouble volts, OptionalDouble milliamperes) {}

  private static byte[] content(Device device, CurveFamily family, Path target) {
    OptionalDouble watts = DevicePlots.dissipation(device);
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
