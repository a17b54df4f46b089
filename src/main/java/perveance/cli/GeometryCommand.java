package perveance.cli;

import java.io.ByteArrayOutputStream;
import java.io.IOException;
import java.nio.charset.StandardCharsets;
import java.nio.file.Path;
import java.util.List;
import java.util.Locale;
import java.util.Optional;
import java.util.OptionalInt;
import java.util.concurrent.Callable;
import org.jspecify.annotations.Nullable;
import perveance.app.wording.Vocabulary;
import perveance.engine.base.BadInputException;
import perveance.engine.base.Problem;
import perveance.engine.device.geometry.ElectrodeAnswer;
import perveance.engine.device.geometry.GapProfile;
import perveance.files.WholeFile;
import perveance.files.geometry.GeometryReader;
import perveance.files.json.GeometryJson;
import perveance.plot.CurvePictures;
import perveance.plot.GapPlot;
import picocli.CommandLine.Command;
import picocli.CommandLine.Option;
import picocli.CommandLine.Parameters;
import picocli.CommandLine.ParentCommand;

/** {@code geometry}: what the dimensions of electrodes tell. */
@Command(
    name = "geometry",
    mixinStandardHelpOptions = true,
    description =
        "Works out a diode or a triode from the dimensions of its electrodes, and draws what"
            + " happens between them.",
    footer = {
      "",
      "Examples:",
      "  perveance geometry examples/geometry/plane-triode.toml",
      "  perveance geometry examples/geometry/cylinder-diode.toml -o potential.svg",
      "  perveance geometry my-grid.toml --show density -o density.png",
      "  perveance geometry my-grid.toml --json"
    })
final class GeometryCommand implements Callable<Integer> {
  @ParentCommand private PerveanceCommand parent = new PerveanceCommand();

  @Parameters(paramLabel = "FILE", description = "File of electrode dimensions (TOML).")
  private Path file = Path.of("");

  @Option(
      names = {"-o", "--output"},
      paramLabel = "FILE",
      description = "Picture of the gap: the ending .svg or .png decides.")
  private @Nullable Path output;

  @Option(
      names = "--show",
      paramLabel = "potential|field|density|speed",
      description = "What the picture shows; the potential if not given.",
      defaultValue = "potential")
  private GapPlot.Show show = GapPlot.Show.POTENTIAL;

  @Option(names = "--json", description = "Print one JSON object instead of the report.")
  private boolean json;

  @Option(
      names = "--words",
      paramLabel = "british|american",
      description = "Vocabulary of the report: anode and valve, or plate and tube.",
      defaultValue = "british")
  private Vocabulary vocabulary = Vocabulary.BRITISH;

  @Override
  public Integer call() throws BadInputException, IOException {
    ElectrodeAnswer answer = ElectrodeAnswer.of(GeometryReader.read(file));
    String picture = output == null ? "" : draw(answer, output);
    if (json) {
      ByteArrayOutputStream bytes = new ByteArrayOutputStream();
      GeometryJson.write(answer, bytes);
      parent.out().print(bytes.toString(StandardCharsets.UTF_8));
    } else {
      parent.out().print(GeometryText.of(answer, vocabulary) + picture);
    }
    parent.out().flush();
    return ExitCode.DONE.number();
  }

  private String draw(ElectrodeAnswer answer, Path target) throws BadInputException, IOException {
    String ending = target.toString().toLowerCase(Locale.ROOT);
    boolean vector = ending.endsWith(".svg");
    if (!vector && !ending.endsWith(".png")) {
      throw refused("--output", target.toString(), "a name that ends in .svg or .png");
    }
    Optional<GapProfile> profile = answer.profile();
    if (profile.isEmpty()) {
      throw refused("--output", "a design that is cut off", "one in which current flows");
    }
    byte[] picture = CurvePictures.of(GapPlot.of(answer, profile.get(), show), vector);
    WholeFile.write(target, List.of(file), out -> out.write(picture));
    return "Picture: " + target.toAbsolutePath().normalize() + "\n";
  }

  private static BadInputException refused(String option, String found, String expected) {
    return new BadInputException(
        List.of(
            new Problem(
                "command line", OptionalInt.empty(), option, found, expected, Optional.empty())));
  }
}
