package perveance.cli;

import java.io.PrintWriter;
import java.io.Writer;
import org.jspecify.annotations.Nullable;
import picocli.CommandLine.Command;
import picocli.CommandLine.Model.CommandSpec;
import picocli.CommandLine.Spec;

/** The program: its commands and its help. */
@Command(
    name = "perveance",
    mixinStandardHelpOptions = true,
    versionProvider = PerveanceCommand.Version.class,
    synopsisSubcommandLabel = "COMMAND",
    description = "Amplifier-stage design for thermionic valves.",
    footer = {
      "",
      "Start with:  perveance check examples/line-stage.toml",
      "",
      "Voltages in valve equipment can kill, also after switch-off. Local electrical",
      "codes and competent or licensed persons decide whether and how work is done."
    })
public final class PerveanceCommand {
  private final CommandLines.Window window;

  /** Makes a command without a window, for the parser. */
  public PerveanceCommand() {
    this(file -> {});
  }

  PerveanceCommand(CommandLines.Window window) {
    this.window = window;
  }

  CommandLines.Window window() {
    return window;
  }

  /** Absent in a stand-in that no command line has taken up. */
  @Spec private @Nullable CommandSpec spec;

  /** Where results go. */
  PrintWriter out() {
    CommandSpec taken = spec;
    return taken == null || taken.commandLine() == null
        ? new PrintWriter(Writer.nullWriter())
        : taken.commandLine().getOut();
  }

  /** Where complaints go. */
  PrintWriter err() {
    CommandSpec taken = spec;
    return taken == null || taken.commandLine() == null
        ? new PrintWriter(Writer.nullWriter())
        : taken.commandLine().getErr();
  }

  /** Version of the program, from the jar. */
  static String version() {
    String version = PerveanceCommand.class.getPackage().getImplementationVersion();
    return version == null ? "development" : version;
  }

  /** Tells picocli the version. */
  static final class Version implements picocli.CommandLine.IVersionProvider {
    @Override
    public String[] getVersion() {
      return new String[] {"perveance " + version()};
    }
  }
}
