package perveance.cli;

import java.io.PrintWriter;
import java.io.Writer;
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
    subcommands = {
      CheckCommand.class,
      SheetCommand.class,
      CurvesCommand.class,
      FitCommand.class,
      GeometryCommand.class,
      DesktopCommand.class,
      ExampleCommand.class,
      CompletionCommand.class
    },
    footer = {
      "",
      "Start with:  perveance check examples/line-stage.toml",
      "",
      "Voltages in valve equipment can kill, also after switch-off. Local electrical codes and",
      "competent or licensed persons decide whether and how work is done."
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

  @Spec private CommandSpec spec = CommandSpec.create();

  /** Where results go. */
  PrintWriter out() {
    return spec.commandLine() == null
        ? new PrintWriter(Writer.nullWriter())
        : spec.commandLine().getOut();
  }

  /** Where complaints go. */
  PrintWriter err() {
    return spec.commandLine() == null
        ? new PrintWriter(Writer.nullWriter())
        : spec.commandLine().getErr();
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
