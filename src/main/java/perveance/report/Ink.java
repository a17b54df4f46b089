package perveance.report;

import java.awt.Color;
import java.io.IOException;
import java.io.UncheckedIOException;
import org.apache.pdfbox.pdmodel.PDPage;
import org.apache.pdfbox.pdmodel.PDPageContentStream;
import perveance.plot.Artwork;

/** Draws on one page; the origin is the top left corner, y down, in points. */
final class Ink {
  static final Color BLACK = Color.BLACK;
  static final Color SOFT = new Color(0x40, 0x40, 0x40);
  static final Color RULE = new Color(0x80, 0x80, 0x80);

  private final PDPage page;
  private final PDPageContentStream stream;
  private final ArtworkInk artworkInk;
  private final double height;

  Ink(PDPage page, PDPageContentStream stream, ArtworkInk artworkInk) {
    this.page = page;
    this.stream = stream;
    this.artworkInk = artworkInk;
    this.height = page.getMediaBox().getHeight();
  }

  PDPage page() {
    return page;
  }

  /** Text with its baseline at y. */
  void text(double x, double y, SheetFont font, double size, Color colour, String text) {
    try {
      stream.beginText();
      stream.setNonStrokingColor(colour);
      stream.setFont(font.font(), (float) size);
      stream.newLineAtOffset((float) x, (float) (height - y));
      stream.showText(font.printable(text));
      stream.endText();
    } catch (IOException e) {
      throw new UncheckedIOException("cannot draw text", e);
    }
  }

  void textRight(double x, double y, SheetFont font, double size, Color colour, String text) {
    text(x - font.width(text, size), y, font, size, colour, text);
  }

  void line(double x1, double y1, double x2, double y2, double width, Color colour) {
    try {
      stream.setStrokingColor(colour);
      stream.setLineWidth((float) width);
      stream.moveTo((float) x1, (float) (height - y1));
      stream.lineTo((float) x2, (float) (height - y2));
      stream.stroke();
    } catch (IOException e) {
      throw new UncheckedIOException("cannot draw a line", e);
    }
  }

  void box(double x, double y, double w, double h, double width, Color colour) {
    try {
      stream.setStrokingColor(colour);
      stream.setLineWidth((float) width);
      stream.addRect((float) x, (float) (height - y - h), (float) w, (float) h);
      stream.stroke();
    } catch (IOException e) {
      throw new UncheckedIOException("cannot draw a box", e);
    }
  }

  void fill(double x, double y, double w, double h, Color colour) {
    try {
      stream.setNonStrokingColor(colour);
      stream.addRect((float) x, (float) (height - y - h), (float) w, (float) h);
      stream.fill();
    } catch (IOException e) {
      throw new UncheckedIOException("cannot fill a box", e);
    }
  }

  void artwork(Artwork artwork, double x, double y, double w, double h) {
    try {
      artworkInk.draw(stream, artwork, x, height - y - h, w, h);
    } catch (IOException e) {
      throw new UncheckedIOException("cannot draw a picture", e);
    }
  }
}
