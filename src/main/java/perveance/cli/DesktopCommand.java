package perveance.cli;

import java.nio.file.Path;
import java.util.Optional;
import java.util.concurrent.Callable;
import org.jspecify.annotations.Nullable;
import perveance.engine.base.BadInputException;
import picocli.CommandLine.Command;
import picocli.CommandLine.Parameters;
import picocli.CommandLine.ParentCommand;

/** {@code desktop}: opens the window. */
@Command(
    name = "desktop",
    mixinStandardHelpOptions = true,
    description = "Opens the desktop program, on a chassis file if one is given.",
    footer = {"", "Example:", "  perveance desktop my-amplifier.toml"})
final class DesktopCommand implements Callable<Integer> {
  @ParentCommand private PerveanceCommand parent = new PerveanceCommand();

  @Parameters(paramLabel = "FILE", arity = "0..1", description = "Chassis file (TOML).")
  private @Nullable Path file;

  @Override
  public Integer call() throws BadInputException {
    parent.window().open(Optional.ofNullable(file));
    return ExitCode.DONE.number();
  }
}
