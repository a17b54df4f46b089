package perveance.cli;

import perveance.engine.base.BadInputException;
import perveance.engine.base.Problem;
import picocli.CommandLine;

/** Builds the command line and turns failures into messages and exit codes. */
public final class CommandLines {
  private CommandLines() {}

  /**
   * The command line with its error handling.
   *
   * @return ready to execute
   */
  public static CommandLine create() {
    CommandLine line = new CommandLine(new PerveanceCommand());
    line.setCaseInsensitiveEnumValuesAllowed(true);
    line.setExecutionExceptionHandler(CommandLines::failed);
    line.setExitCodeExceptionMapper(e -> ExitCode.INTERNAL_ERROR.number());
    return line;
  }

  /** A command line that prints where another does. */
  static CommandLine create(PerveanceCommand like) {
    return create().setOut(like.out()).setErr(like.err());
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
