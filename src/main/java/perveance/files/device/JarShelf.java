package perveance.files.device;

import java.io.IOException;
import java.io.InputStream;
import java.io.UncheckedIOException;
import java.nio.charset.StandardCharsets;
import java.nio.file.Path;
import java.util.ArrayList;
import java.util.Collections;
import java.util.Enumeration;
import java.util.List;
import java.util.Optional;
import java.util.zip.ZipEntry;
import java.util.zip.ZipFile;
import perveance.engine.base.BadInputException;
import perveance.files.toml.SourceText;

/**
 * A folder of device files within the program's own jar. The jar stays open as long as the program
 * runs, as it does for the class loader; opening it for each file costs more than reading the file.
 */
final class JarShelf implements Shelf {
  private final ZipFile jar;
  private final String root;
  private final String shown;

  /**
   * Opens the jar.
   *
   * @param jar the jar
   * @param root the folder in it, with a slash at its end
   * @param shown how messages name the folder
   */
  JarShelf(Path jar, String root, String shown) {
    try {
      this.jar = new ZipFile(jar.toFile());
    } catch (IOException e) {
      throw unreadable(e);
    }
    this.root = root;
    this.shown = shown;
  }

  @Override
  public List<String> files() {
    List<String> names = new ArrayList<>();
    for (Enumeration<? extends ZipEntry> all = jar.entries(); all.hasMoreElements(); ) {
      String name = all.nextElement().getName();
      if (name.startsWith(root) && name.endsWith(SUFFIX)) {
        names.add(name.substring(root.length()));
      }
    }
    Collections.sort(names);
    return names;
  }

  @Override
  public Optional<SourceText> read(String file) throws BadInputException {
    ZipEntry entry = jar.getEntry(root + file);
    return entry == null
        ? Optional.empty()
        : Optional.of(SourceText.decode(shown(file), bytes(entry, SourceText.MOST_BYTES + 1)));
  }

  @Override
  public SourceText readHead(String file, int bytes) {
    ZipEntry entry = jar.getEntry(root + file);
    byte[] head = entry == null ? new byte[0] : bytes(entry, bytes);
    return SourceText.of(shown(file), new String(head, StandardCharsets.UTF_8));
  }

  private byte[] bytes(ZipEntry entry, int most) {
    try (InputStream in = jar.getInputStream(entry)) {
      return in.readNBytes(most);
    } catch (IOException e) {
      throw unreadable(e);
    }
  }

  private String shown(String file) {
    return shown + "/" + file;
  }

  private static UncheckedIOException unreadable(IOException e) {
    return new UncheckedIOException("the program's own jar cannot be read", e);
  }
}
