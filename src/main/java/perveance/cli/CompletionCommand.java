package perveance.cli;

import picocli.AutoComplete;
import picocli.CommandLine.Command;
import picocli.CommandLine.ParentCommand;

/** {@code completion}: prints a completion script. */
@Command(
    name = "completion",
    mixinStandardHelpOptions = true,
    description = "Prints a completion script for bash and zsh.",
    footer = {"", "Example:", "  source <(perveance completion)"})
final class CompletionCommand implements Runnable {
  @ParentCommand private PerveanceCommand parent = new PerveanceCommand();

  @Override
  public void run() {
    parent.out().print(AutoComplete.bash("perveance", CommandLines.create(parent.window())));
    parent.out().flush();
  }
}
