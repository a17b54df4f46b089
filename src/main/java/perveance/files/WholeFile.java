package perveance.files;

import java.io.BufferedOutputStream;
import java.io.IOException;
import java.io.OutputStream;
import java.nio.channels.Channels;
import java.nio.channels.FileChannel;
import java.nio.charset.StandardCharsets;
import java.nio.file.AtomicMoveNotSupportedException;
import java.nio.file.Files;
import java.nio.file.Path;
import java.nio.file.StandardCopyOption;
import java.nio.file.StandardOpenOption;
import java.nio.file.attribute.PosixFileAttributeView;
import java.util.Collection;
import java.util.List;
import java.util.Optional;
import java.util.OptionalInt;
import java.util.UUID;
import perveance.engine.base.BadInputException;
import perveance.engine.base.Problem;

/**
 * Writes a file whole or not at all: beside its place first, down to the disk, then into its place
 * in one step. A full disk, a crash or a failure while writing leaves an older file as it was.
 */
public final class WholeFile {
  /** What goes into the file. */
  @FunctionalInterface
  public interface Content {
    /**
     * Writes everything.
     *
     * @param out buffered; closing it is not needed
     * @throws IOException when it cannot be written
     */
    void writeTo(OutputStream out) throws IOException;
  }

  /** Opens the file beside; tests open one on a disk that is full. */
  @FunctionalInterface
  interface Opener {
    OutputStream open(FileChannel channel) throws IOException;
  }

  private final Opener opener;

  WholeFile(Opener opener) {
    this.opener = opener;
  }

  /**
   * Writes a file.
   *
   * @param target where to; an older file is replaced
   * @param inputs files that the content was made from, which must not be replaced
   * @param content what to write
   * @throws BadInputException when the place cannot be meant
   * @throws IOException when writing fails; an older file is then still there
   */
  public static void write(Path target, Collection<Path> inputs, Content content)
      throws BadInputException, IOException {
    new WholeFile(Channels::newOutputStream).writeWhole(target, inputs, content);
  }

  /**
   * Writes a text in UTF-8 over its own older version.
   *
   * @param target where to
   * @param text the text
   * @param marked whether the file begins with a byte order mark
   * @throws BadInputException when the place cannot be meant
   * @throws IOException when writing fails; an older file is then still there
   */
  public static void save(Path target, String text, boolean marked)
      throws BadInputException, IOException {
    String whole = marked ? "\uFEFF" + text : text;
    write(target, List.of(), out -> out.write(whole.getBytes(StandardCharsets.UTF_8)));
  }

  void writeWhole(Path target, Collection<Path> inputs, Content content)
      throws BadInputException, IOException {
    // through a link, so that it still points there afterwards
    Path place = Files.exists(target) ? target.toRealPath() : target.toAbsolutePath();
    check(target, place, inputs);
    Path beside =
        place.resolveSibling("." + place.getFileName() + "." + UUID.randomUUID() + ".part");
    try {
      fill(beside, content);
      copyPermissions(place, beside);
      moveInto(beside, place);
    } finally {
      Files.deleteIfExists(beside);
    }
    syncFolder(place);
  }

  private void fill(Path beside, Content content) throws IOException {
    try (FileChannel channel =
        FileChannel.open(beside, StandardOpenOption.CREATE_NEW, StandardOpenOption.WRITE)) {
      OutputStream out = new BufferedOutputStream(opener.open(channel), 1 << 16);
      content.writeTo(new Unclosed(out));
      out.flush();
      channel.force(true);
    }
  }

  /** A writer that closes what it is given must not close the channel before it is forced. */
  private static final class Unclosed extends OutputStream {
    private final OutputStream out;

    Unclosed(OutputStream out) {
      this.out = out;
    }

    @Override
    public void write(int b) throws IOException {
      out.write(b);
    }

    @Override
    public void write(byte[] bytes, int start, int length) throws IOException {
      out.write(bytes, start, length);
    }

    @Override
    public void flush() throws IOException {
      out.flush();
    }
  }

  private static void check(Path target, Path place, Collection<Path> inputs)
      throws BadInputException, IOException {
    if (Files.isDirectory(place)) {
      throw refused(target, "a folder", "the name of a file to write");
    }
    Path folder = place.getParent();
    if (folder == null || !Files.isDirectory(folder)) {
      throw refused(target, "a folder that does not exist", "a file in a folder that exists");
    }
    for (Path input : inputs) {
      boolean same =
          input.toAbsolutePath().normalize().equals(place.normalize())
              || (Files.exists(place) && Files.exists(input) && Files.isSameFile(input, place));
      if (same) {
        throw refused(target, "the input itself", "another file for the output");
      }
    }
  }

  private static BadInputException refused(Path target, String found, String expected) {
    return new BadInputException(
        new Problem(
            target.toString(), OptionalInt.empty(), "output", found, expected, Optional.empty()));
  }

  private static void copyPermissions(Path from, Path to) throws IOException {
    PosixFileAttributeView old = Files.getFileAttributeView(from, PosixFileAttributeView.class);
    if (old != null && Files.exists(from)) {
      Files.setPosixFilePermissions(to, old.readAttributes().permissions());
    }
  }

  private static void moveInto(Path beside, Path place) throws IOException {
    try {
      Files.move(
          beside, place, StandardCopyOption.ATOMIC_MOVE, StandardCopyOption.REPLACE_EXISTING);
    } catch (AtomicMoveNotSupportedException e) {
      Files.move(beside, place, StandardCopyOption.REPLACE_EXISTING);
    }
  }

  /** The new name outlives a loss of power only once the folder is on the disk too. */
  private static void syncFolder(Path place) {
    Path folder = place.getParent();
    if (folder == null) {
      return;
    }
    try (FileChannel channel = FileChannel.open(folder, StandardOpenOption.READ)) {
      channel.force(true);
    } catch (IOException e) {
      // some systems cannot open a folder; the file itself is whole all the same
      return;
    }
  }
}
