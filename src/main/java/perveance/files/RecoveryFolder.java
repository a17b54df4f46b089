package perveance.files;

import java.io.IOException;
import java.nio.charset.StandardCharsets;
import java.nio.file.DirectoryStream;
import java.nio.file.Files;
import java.nio.file.InvalidPathException;
import java.nio.file.Path;
import java.time.Instant;
import java.util.ArrayList;
import java.util.Comparator;
import java.util.List;
import java.util.Optional;
import perveance.engine.base.BadInputException;
import perveance.files.toml.SourceText;

/**
 * Keeps unsaved documents in a folder and finds those that an ended program has left. A recovery
 * file is a chassis file with a head of comments, so that it opens like any other.
 */
public final class RecoveryFolder {
  private static final String FIRST_LINE =
      "# Recovery file: the chassis stands below as last edited.";
  private static final String PROCESS = "# process: ";
  private static final String STARTED = "# started: ";
  private static final String ORIGINAL = "# original: ";
  private static final String SUFFIX = ".recovery.toml";

  private final Path folder;
  private final long process;
  private final String started;

  /**
   * Opens a folder for this program.
   *
   * @param folder the folder, made when first needed
   */
  public RecoveryFolder(Path folder) {
    this(folder, ProcessHandle.current().pid(), startOf(ProcessHandle.current()));
  }

  RecoveryFolder(Path folder, long process, String started) {
    this.folder = folder;
    this.process = process;
    this.started = started;
  }

  private static String startOf(ProcessHandle handle) {
    return handle.info().startInstant().map(Instant::toString).orElse("");
  }

  /**
   * Keeps a document.
   *
   * @param document number of the document within this program
   * @param original the file that is being edited; empty for one never saved
   * @param text the chassis file as it would be saved now
   * @throws IOException when it cannot be written; what was kept before is then still there
   */
  public void keep(int document, Optional<Path> original, String text) throws IOException {
    Files.createDirectories(folder);
    String head =
        String.join(
            "\n",
            FIRST_LINE,
            PROCESS + process,
            STARTED + started,
            ORIGINAL + original.map(path -> path.toAbsolutePath().toString()).orElse(""),
            "",
            "");
    try {
      WholeFile.save(fileOf(document), head + text, false);
    } catch (BadInputException e) {
      throw new IOException(e.getMessage(), e);
    }
  }

  /**
   * Forgets a document that was saved or given up.
   *
   * @param document number of the document within this program
   * @throws IOException when its file cannot be removed
   */
  public void forget(int document) throws IOException {
    Files.deleteIfExists(fileOf(document));
  }

  /**
   * Forgets what was left, once it is restored or refused.
   *
   * @param recovery one of {@link #left}
   * @throws IOException when its file cannot be removed
   */
  public void forget(Recovery recovery) throws IOException {
    Files.deleteIfExists(recovery.file());
  }

  /**
   * What ended programs have left; what a program that still runs keeps is not among it.
   *
   * @return the latest first; files that cannot be read are passed over
   * @throws IOException when the folder cannot be listed
   */
  public List<Recovery> left() throws IOException {
    List<Recovery> left = new ArrayList<>();
    if (!Files.isDirectory(folder)) {
      return left;
    }
    try (DirectoryStream<Path> files = Files.newDirectoryStream(folder, "*" + SUFFIX)) {
      for (Path file : files) {
        read(file).ifPresent(left::add);
      }
    }
    left.sort(Comparator.comparing(Recovery::time).reversed());
    return left;
  }

  private Path fileOf(int document) {
    return folder.resolve(process + "-" + document + SUFFIX);
  }

  private Optional<Recovery> read(Path file) throws IOException {
    if (Files.size(file) > SourceText.MOST_BYTES) {
      return Optional.empty();
    }
    String text = new String(Files.readAllBytes(file), StandardCharsets.UTF_8);
    int end = text.indexOf("\n\n");
    if (end < 0 || !text.startsWith(FIRST_LINE)) {
      return Optional.empty();
    }
    String head = text.substring(0, end);
    if (stillRuns(value(head, PROCESS), value(head, STARTED))) {
      return Optional.empty();
    }
    return Optional.of(
        new Recovery(
            file,
            path(value(head, ORIGINAL)),
            text.substring(end + 2),
            Files.getLastModifiedTime(file).toInstant()));
  }

  private static String value(String head, String name) {
    return head.lines()
        .filter(line -> line.startsWith(name))
        .map(line -> line.substring(name.length()))
        .findFirst()
        .orElse("");
  }

  private static Optional<Path> path(String text) {
    try {
      return text.isEmpty() ? Optional.empty() : Optional.of(Path.of(text));
    } catch (InvalidPathException e) {
      return Optional.empty();
    }
  }

  /** A number is given to a new process one day, so the time of its start must agree too. */
  private static boolean stillRuns(String process, String started) {
    try {
      return ProcessHandle.of(Long.parseLong(process))
          .filter(handle -> handle.isAlive() && startOf(handle).equals(started))
          .isPresent();
    } catch (NumberFormatException e) {
      return false;
    }
  }
}
