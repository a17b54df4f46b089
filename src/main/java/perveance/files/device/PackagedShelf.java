package perveance.files.device;

import java.io.File;
import java.io.IOException;
import java.io.InputStream;
import java.io.UncheckedIOException;
import java.net.JarURLConnection;
import java.net.URISyntaxException;
import java.net.URL;
import java.net.URLConnection;
import java.util.ArrayList;
import java.util.Collections;
import java.util.Enumeration;
import java.util.List;
import java.util.Optional;
import java.util.zip.ZipEntry;
import java.util.zip.ZipFile;
import perveance.engine.base.BadInputException;
import perveance.files.toml.SourceText;

/** The device files that come with the program, out of its jar or its folder of classes. */
final class PackagedShelf implements Shelf {
  private static final String ROOT = "/perveance/device-curves/";

  /** Named in messages, as the file lies in the project. */
  private static final String SHOWN = "device-curves/";

  /** A file that is always there and shows where the others are. */
  private static final String LANDMARK = "12ax7.toml";

  @Override
  public List<String> files() {
    URL landmark = PackagedShelf.class.getResource(ROOT + LANDMARK);
    if (landmark == null) {
      return List.of();
    }
    List<String> names = new ArrayList<>();
    try {
      URLConnection connection = landmark.openConnection();
      if (connection instanceof JarURLConnection jar) {
        // the class loader's own open jar; it is not ours to close
        list(jar.getJarFile(), names);
      } else {
        list(new File(landmark.toURI()).getParentFile(), names);
      }
    } catch (IOException e) {
      throw new UncheckedIOException("the program's own device files cannot be listed", e);
    } catch (URISyntaxException e) {
      throw new IllegalStateException("the program's own device files cannot be found", e);
    }
    Collections.sort(names);
    return names;
  }

  private static void list(ZipFile jar, List<String> names) {
    String root = ROOT.substring(1);
    for (Enumeration<? extends ZipEntry> all = jar.entries(); all.hasMoreElements(); ) {
      String name = all.nextElement().getName();
      if (name.startsWith(root) && name.endsWith(SUFFIX)) {
        names.add(name.substring(root.length()));
      }
    }
  }

  private static void list(File folder, List<String> names) {
    String[] all = folder.list();
    for (String name : all == null ? new String[0] : all) {
      if (name.endsWith(SUFFIX)) {
        names.add(name);
      }
    }
  }

  @Override
  public Optional<SourceText> read(String file) throws BadInputException {
    try (InputStream in = PackagedShelf.class.getResourceAsStream(ROOT + file)) {
      if (in == null) {
        return Optional.empty();
      }
      return Optional.of(SourceText.decode(SHOWN + file, in.readNBytes(SourceText.MOST_BYTES + 1)));
    } catch (IOException e) {
      throw new UncheckedIOException("the program's own device file cannot be read: " + file, e);
    }
  }
}
