package perveance.cli;

import java.io.PrintWriter;
import java.io.StringWriter;
import picocli.CommandLine;

/**
 * One command line run in this machine.
 *
 * @param status exit status
 * @param out what it printed
 * @param err what it complained of
 */
record CommandTrial(int status, String out, String err) {
  static CommandTrial of(String... args) {
    StringWriter out = new StringWriter();
    StringWriter err = new StringWriter();
    CommandLine line = CommandLines.create(file -> {}, args);
    line.setOut(new PrintWriter(out, true));
    line.setErr(new PrintWriter(err, true));
    int status = line.execute(args);
    return new CommandTrial(status, out.toString(), err.toString());
  }
}
