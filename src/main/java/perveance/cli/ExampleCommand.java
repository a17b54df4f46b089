package perveance.cli;

import java.io.IOException;
import java.io.InputStream;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.List;
import java.util.concurrent.Callable;
import perveance.engine.base.BadInputException;
import perveance.files.WholeFile;
import picocli.CommandLine.Command;
import picocli.CommandLine.Option;
import picocli.CommandLine.ParentCommand;

/** {@code example}: the main job on a shipped example. */
@Command(
    name = "example",
    mixinStandardHelpOptions = true,
    description = "Reports on a shipped example and writes its build sheet.",
    footer = {"", "Example:", "  perveance example --to somewhere"})
final class ExampleCommand implements Callable<Integer> {
  private static final String NAME = "line-stage.toml";

  @ParentCommand private PerveanceCommand parent = new PerveanceCommand();

  @Option(
      names = "--to",
      paramLabel = "FOLDER",
      description = "Where the chassis file and its sheet go.",
      defaultValue = ".")
  private Path folder = Path.of(".");

  @Override
  public Integer call() throws BadInputException, IOException {
    byte[] chassis;
    try (InputStream in = ExampleCommand.class.getResourceAsStream("/perveance/examples/" + NAME)) {
      if (in == null) {
        throw new IOException("the example is missing from the installation: " + NAME);
      }
      chassis = in.readAllBytes();
    }
    Files.createDirectories(folder);
    Path file = folder.resolve(NAME);
    WholeFile.write(file, List.of(), out -> out.write(chassis));
    int checked = CommandLines.run(parent, "check", file.toString());
    int drawn = CommandLines.run(parent, "sheet", file.toString());
    return Math.max(checked, drawn);
  }
}
