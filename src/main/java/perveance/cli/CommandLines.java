package perveance.cli;

import java.nio.file.Path;
import java.util.Optional;
import perveance.engine.base.BadInputException;
import perveance.engine.base.Problem;
import picocli.CommandLine;

/** Builds the command line and turns failures into messages and exit codes. */
public final class CommandLines {
  private CommandLines() {}

  /**
   * Runs one command line.
   *
   * @param desktop opens the window
   * @param args the command line
   * @return exit status
   */
  public static int run(Window desktop, String... args) {
    return create(desktop, args).execute(args);
  }

  /** Opens the desktop program. */
  @FunctionalInterface
  public interface Window {
    /**
     * Opens the window and returns when it is closed.
     *
     * @param file chassis file to open, empty for the first example
     * @throws BadInputException when there is no display for a window
     */
    void open(Optional<Path> file) throws BadInputException;
  }

  /** The command line with its error handling, ready to execute the arguments. */
  static CommandLine create(Window desktop, String... args) {
    CommandLine line = new CommandLine(new PerveanceCommand(desktop));
    Commands.add(line, args);
    line.setCaseInsensitiveEnumValuesAllowed(true);
    line.setExecutionExceptionHandler(CommandLines::failed);
    line.setExitCodeExceptionMapper(
        e ->
            (e instanceof CommandLine.ParameterException
                    ? ExitCode.BAD_INPUT
                    : ExitCode.INTERNAL_ERROR)
                .number());
    return line;
  }

  /** Runs a command line that prints where another does. */
  static int run(PerveanceCommand like, String... args) {
    return create(like.window(), args).setOut(like.out()).setErr(like.err()).execute(args);
  }

  private static int failed(Exception exception, CommandLine line, CommandLine.ParseResult parsed) {
    if (exception instanceof BadInputException bad) {
      for (Problem problem : bad.problems()) {
        line.getErr().println(problem.message());
      }
      line.getErr().flush();
      return ExitCode.BAD_INPUT.number();
    }
    if (exception instanceof java.io.IOException io) {
      line.getErr().println("Cannot read or write: " + io.getMessage());
      line.getErr().flush();
      return ExitCode.BAD_INPUT.number();
    }
    System.getLogger("perveance").log(System.Logger.Level.DEBUG, "internal error", exception);
    line.getErr()
        .println(
            "Internal error, the program is at fault, your file is untouched: "
                + exception.getMessage());
    line.getErr().flush();
    return ExitCode.INTERNAL_ERROR.number();
  }
}
