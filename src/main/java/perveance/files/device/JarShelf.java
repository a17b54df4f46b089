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
 * A folder of device files within the program's own jar. The jar is opened anew each time, which
 * costs little because the class loader holds it open too.
 *
 * @param jar the jar
 * @param root the folder in it, with a slash at its end
 * @param shown how messages name the folder
 */
record JarShelf(Path jar, String root, String shown) implements Shelf {
  @Override
  public List<String> files() {
    List<String> names = new ArrayList<>();
    try (ZipFile zip = new ZipFile(jar.toFile())) {
      for (Enumeration<? extends ZipEntry> all = zip.entries(); all.hasMoreElements(); ) {
        String name = all.nextElement().getName();
        if (name.startsWith(root) && name.endsWith(SUFFIX)) {
          names.add(name.substring(root.length()));
        }
      }
    } catch (IOException e) {
      throw unreadable(e);
    }
    Collections.sort(names);
    return names;
  }

  @Override
  public Optional<SourceText> read(String file) throws BadInputException {
    try (ZipFile zip = new ZipFile(jar.toFile())) {
      ZipEntry entry = zip.getEntry(root + file);
      return entry == null
          ? Optional.empty()
          : Optional.of(SourceText.decode(shown(file), bytes(zip, entry, Integer.MAX_VALUE)));
    } catch (IOException e) {
      throw unreadable(e);
    }
  }

  @Override
  public SourceText readHead(String file, int bytes) {
    try (ZipFile zip = new ZipFile(jar.toFile())) {
      ZipEntry entry = zip.getEntry(root + file);
      byte[] head = entry == null ? new byte[0] : bytes(zip, entry, bytes);
      return SourceText.of(shown(file), new String(head, StandardCharsets.UTF_8));
    } catch (IOException e) {
      throw unreadable(e);
    }
  }

  private static byte[] bytes(ZipFile zip, ZipEntry entry, int most) throws IOException {
    try (InputStream in = zip.getInputStream(entry)) {
      return in.readNBytes(Math.min(most, SourceText.MOST_BYTES + 1));
    }
  }

  private String shown(String file) {
    return shown + "/" + file;
  }

  private static UncheckedIOException unreadable(IOException e) {
    return new UncheckedIOException("the program's own jar cannot be read", e);
  }
}
