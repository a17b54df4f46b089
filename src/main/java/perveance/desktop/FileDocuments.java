package perveance.desktop;

import java.io.IOException;
import java.nio.file.Files;
import java.nio.file.InvalidPathException;
import java.nio.file.Path;
import java.time.ZoneId;
import java.time.format.DateTimeFormatter;
import java.util.ArrayList;
import java.util.List;
import java.util.Locale;
import java.util.Optional;
import java.util.stream.Collectors;
import perveance.desktop.viewmodel.DocumentException;
import perveance.desktop.viewmodel.Documents;
import perveance.engine.base.BadInputException;
import perveance.engine.base.Problem;
import perveance.engine.stage.Chassis;
import perveance.files.Recovery;
import perveance.files.RecoveryFolder;
import perveance.files.WholeFile;
import perveance.files.chassis.ChassisReader;
import perveance.files.chassis.ChassisWriter;
import perveance.files.device.DeviceFiles;
import perveance.files.toml.SourceText;

/** Chassis files on the disk. */
final class FileDocuments implements Documents {
  private static final int MOST_RECENT = 8;
  private static final DateTimeFormatter WHEN =
      DateTimeFormatter.ofPattern("d MMM yyyy HH:mm", Locale.ENGLISH);

  private final ChassisReader reader;
  private final RecoveryFolder recovery;
  private final Path recentList;

  FileDocuments(DeviceFiles devices, Path home) {
    this.reader = new ChassisReader(devices);
    this.recovery = new RecoveryFolder(home.resolve("recovery"));
    this.recentList = home.resolve("recent.txt");
  }

  @Override
  public Opened open(Path file) throws DocumentException {
    try {
      SourceText source = SourceText.read(file);
      return new Opened(
          Optional.of(file.toAbsolutePath()), source.text(), source.marked(), reader.read(source));
    } catch (BadInputException e) {
      throw unreadable(file.getFileName() + " was not opened.", e);
    }
  }

  @Override
  public Opened read(String name, String text) throws DocumentException {
    try {
      Chassis chassis = reader.read(SourceText.of(name, text));
      return new Opened(Optional.empty(), text, false, chassis);
    } catch (BadInputException e) {
      throw unreadable(name + " cannot be used.", e);
    }
  }

  private static DocumentException unreadable(String what, BadInputException e) {
    return new DocumentException(
        what,
        e.problems().stream().map(Problem::message).collect(Collectors.joining("\n")),
        "Correct the lines named above in a text editor, then open the file again.");
  }

  @Override
  public Opened save(Opened before, Chassis now, Path target) throws DocumentException {
    String text = text(before, now);
    try {
      WholeFile.save(target, text, before.marked());
    } catch (BadInputException | IOException e) {
      throw unwritten(target, e);
    }
    return new Opened(Optional.of(target.toAbsolutePath()), text, before.marked(), now);
  }

  private static String text(Opened before, Chassis now) {
    return before.text().isEmpty()
        ? ChassisWriter.fresh(now)
        : ChassisWriter.update(
            new SourceText("chassis", before.text(), before.marked()), before.chassis(), now);
  }

  private static DocumentException unwritten(Path target, Exception e) {
    return new DocumentException(
        target.getFileName() + " was not written. What stood there before is unchanged.",
        String.valueOf(e.getMessage()),
        "Make room or choose another folder, then save again. Nothing in the window is lost.");
  }

  @Override
  public void keep(Opened before, Chassis now) throws DocumentException {
    try {
      recovery.keep(1, before.file(), text(before, now));
    } catch (IOException e) {
      throw new DocumentException(
          "Unsaved changes cannot be kept for a restart.",
          String.valueOf(e.getMessage()),
          "Save the chassis now, to another disk if this one is full.");
    }
  }

  @Override
  public void forget() throws DocumentException {
    try {
      recovery.forget(1);
    } catch (IOException e) {
      throw stuck(e);
    }
  }

  @Override
  public void forget(Left left) throws DocumentException {
    try {
      Files.deleteIfExists(left.id());
    } catch (IOException e) {
      throw stuck(e);
    }
  }

  private static DocumentException stuck(IOException e) {
    return new DocumentException(
        "A recovery file cannot be removed.",
        String.valueOf(e.getMessage()),
        "It does no harm; remove it by hand.");
  }

  @Override
  public List<Left> left() {
    try {
      return recovery.left().stream().map(FileDocuments::left).toList();
    } catch (IOException e) {
      return List.of();
    }
  }

  private static Left left(Recovery r) {
    return new Left(
        r.file(), r.original(), WHEN.format(r.time().atZone(ZoneId.systemDefault())), r.text());
  }

  @Override
  public List<Path> recent() {
    List<Path> paths = new ArrayList<>();
    try {
      if (Files.exists(recentList)) {
        for (String line : Files.readAllLines(recentList)) {
          Path path = Path.of(line);
          if (!line.isBlank() && Files.exists(path)) {
            paths.add(path);
          }
        }
      }
    } catch (IOException | InvalidPathException e) {
      return paths;
    }
    return paths;
  }

  @Override
  public void used(Path file) {
    List<Path> paths = new ArrayList<>(recent());
    Path used = file.toAbsolutePath();
    paths.remove(used);
    paths.add(0, used);
    String text =
        paths.stream().limit(MOST_RECENT).map(Path::toString).collect(Collectors.joining("\n"));
    try {
      Files.createDirectories(recentList.toAbsolutePath().getParent());
      WholeFile.save(recentList, text, false);
    } catch (BadInputException | IOException e) {
      // a list of recent files is a convenience; the document itself is saved
      return;
    }
  }

  @Override
  public void write(Path target, byte[] content) throws DocumentException {
    try {
      WholeFile.write(target, List.of(), out -> out.write(content));
    } catch (BadInputException | IOException e) {
      throw unwritten(target, e);
    }
  }
}
