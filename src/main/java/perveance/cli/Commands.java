package perveance.cli;

import java.util.List;
import java.util.function.Supplier;
import picocli.CommandLine;

/**
 * The commands of the program, in the order of its help. Each is built by reflection, which a cold
 * start feels; a command line that names one is given that one alone.
 */
final class Commands {
  private record Entry(String name, Supplier<Object> command) {}

  private static final List<Entry> ALL =
      List.of(
          new Entry("check", CheckCommand::new),
          new Entry("sheet", SheetCommand::new),
          new Entry("curves", CurvesCommand::new),
          new Entry("fit", FitCommand::new),
          new Entry("geometry", GeometryCommand::new),
          new Entry("desktop", DesktopCommand::new),
          new Entry("example", ExampleCommand::new),
          new Entry("completion", CompletionCommand::new));

  private Commands() {}

  /** Adds the command that is named first, or all of them. */
  static void add(CommandLine line, String... args) {
    String first = args.length == 0 ? "" : args[0];
    boolean named = ALL.stream().anyMatch(e -> e.name().equals(first));
    for (Entry entry : ALL) {
      if (!named || entry.name().equals(first)) {
        line.addSubcommand(entry.name(), entry.command().get());
      }
    }
  }
}
