package perveance.cli;

import java.nio.file.Path;
import java.util.ArrayList;
import java.util.List;
import perveance.app.wording.Vocabulary;
import picocli.CommandLine.Option;

/** Options that every command on a chassis file takes. */
final class CommonOptions {
  @Option(
      names = "--words",
      paramLabel = "british|american",
      description = "Vocabulary of the report: anode and valve, or plate and tube.",
      defaultValue = "british")
  private Vocabulary vocabulary = Vocabulary.BRITISH;

  @Option(
      names = "--devices",
      paramLabel = "FOLDER",
      description = "Folder of your own device files, searched first; may be repeated.")
  private List<Path> folders = new ArrayList<>();

  Vocabulary vocabulary() {
    return vocabulary;
  }

  Workshop workshop() {
    return new Workshop(folders);
  }
}
