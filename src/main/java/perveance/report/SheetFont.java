package perveance.report;

import java.io.IOException;
import java.io.InputStream;
import java.util.PrimitiveIterator;
import org.apache.fontbox.ttf.CmapLookup;
import org.apache.fontbox.ttf.TTFParser;
import org.apache.fontbox.ttf.TrueTypeFont;
import org.apache.pdfbox.io.RandomAccessReadBuffer;
import org.apache.pdfbox.pdmodel.PDDocument;
import org.apache.pdfbox.pdmodel.font.PDType0Font;

/** One embedded face; only the glyphs used are embedded. */
final class SheetFont {
  private final PDType0Font font;
  private final CmapLookup glyphs;

  private SheetFont(PDType0Font font, CmapLookup glyphs) {
    this.font = font;
    this.glyphs = glyphs;
  }

  static SheetFont load(PDDocument document, String file) throws IOException {
    try (InputStream in =
        SheetFont.class.getClassLoader().getResourceAsStream("liberation/" + file)) {
      if (in == null) {
        throw new IOException("font missing from the installation: " + file);
      }
      TrueTypeFont face = new TTFParser().parse(new RandomAccessReadBuffer(in));
      CmapLookup glyphs = face.getUnicodeCmapLookup();
      return new SheetFont(PDType0Font.load(document, face, true), glyphs);
    }
  }

  PDType0Font font() {
    return font;
  }

  /** The text with every sign the face lacks replaced, so that a foreign title still prints. */
  String printable(String text) {
    StringBuilder out = new StringBuilder(text.length());
    PrimitiveIterator.OfInt points = text.codePoints().iterator();
    while (points.hasNext()) {
      int point = points.nextInt();
      if (Character.isISOControl(point)) {
        out.append(' ');
      } else {
        out.appendCodePoint(glyphs.getGlyphId(point) == 0 ? '?' : point);
      }
    }
    return out.toString();
  }

  /** Width in points at a size. */
  double width(String text, double size) {
    try {
      return font.getStringWidth(printable(text)) * size / 1000;
    } catch (IOException e) {
      throw new java.io.UncheckedIOException("cannot measure text", e);
    }
  }
}
