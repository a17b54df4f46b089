package perveance.plot;

import java.awt.Font;
import java.awt.FontFormatException;
import java.io.IOException;
import java.io.InputStream;
import java.io.UncheckedIOException;

/** The one sans family of sheet and window, read from the library that carries it. */
public final class PlotFonts {
  private final Font regular;
  private final Font bold;
  private final Font italic;

  /** Reads the three faces. */
  public PlotFonts() {
    regular = read("LiberationSans-Regular.ttf");
    bold = read("LiberationSans-Bold.ttf");
    italic = read("LiberationSans-Italic.ttf");
  }

  private static Font read(String file) {
    try (InputStream in =
        PlotFonts.class.getClassLoader().getResourceAsStream("liberation/" + file)) {
      if (in == null) {
        throw new IllegalStateException("font missing from the installation: " + file);
      }
      return Font.createFont(Font.TRUETYPE_FONT, in);
    } catch (IOException e) {
      throw new UncheckedIOException("cannot read font " + file, e);
    } catch (FontFormatException e) {
      throw new IllegalStateException("damaged font " + file, e);
    }
  }

  /**
   * Regular face.
   *
   * @param size in points, or in drawing units [1]
   * @return font
   */
  public Font regular(double size) {
    return regular.deriveFont((float) size);
  }

  /**
   * Bold face.
   *
   * @param size in points, or in drawing units [1]
   * @return font
   */
  public Font bold(double size) {
    return bold.deriveFont((float) size);
  }

  /**
   * Italic face.
   *
   * @param size in points, or in drawing units [1]
   * @return font
   */
  public Font italic(double size) {
    return italic.deriveFont((float) size);
  }
}
