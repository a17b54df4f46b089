package perveance.plot;

import java.awt.Dimension;
import java.awt.Graphics2D;
import java.awt.RenderingHints;
import java.awt.geom.Rectangle2D;
import java.awt.image.BufferedImage;
import java.io.ByteArrayOutputStream;
import java.io.IOException;
import java.io.StringWriter;
import java.io.UncheckedIOException;
import java.nio.charset.StandardCharsets;
import javax.imageio.ImageIO;
import javax.xml.parsers.DocumentBuilderFactory;
import javax.xml.parsers.ParserConfigurationException;
import org.apache.batik.svggen.SVGGraphics2D;
import org.w3c.dom.Document;

/** Renders artwork to SVG and PNG. */
public final class Pictures {
  private Pictures() {}

  /**
   * A vector picture.
   *
   * @param artwork what to draw
   * @param look colours of the background
   * @param width in pixels
   * @param height in pixels
   * @return the SVG file
   */
  public static byte[] svg(Artwork artwork, Look look, int width, int height) {
    SVGGraphics2D g = new SVGGraphics2D(emptyDocument());
    g.setSVGCanvasSize(new Dimension(width, height));
    paint(g, artwork, look, width, height);
    try (StringWriter out = new StringWriter()) {
      g.stream(out, true);
      return out.toString().getBytes(StandardCharsets.UTF_8);
    } catch (IOException e) {
      throw new UncheckedIOException("cannot write the picture", e);
    }
  }

  private static Document emptyDocument() {
    try {
      return DocumentBuilderFactory.newInstance()
          .newDocumentBuilder()
          .getDOMImplementation()
          .createDocument("http://www.w3.org/2000/svg", "svg", null);
    } catch (ParserConfigurationException e) {
      throw new IllegalStateException("the Java runtime has no XML support", e);
    }
  }

  /**
   * A bitmap.
   *
   * @param artwork what to draw
   * @param look colours of the background
   * @param width in logical pixels
   * @param height in logical pixels
   * @param scale pixels for each logical pixel, above zero [1]
   * @return the PNG file
   */
  public static byte[] png(Artwork artwork, Look look, int width, int height, double scale) {
    BufferedImage image =
        new BufferedImage(
            (int) Math.round(width * scale),
            (int) Math.round(height * scale),
            BufferedImage.TYPE_INT_RGB);
    Graphics2D g = image.createGraphics();
    smooth(g);
    g.scale(scale, scale);
    paint(g, artwork, look, width, height);
    g.dispose();
    try (ByteArrayOutputStream out = new ByteArrayOutputStream()) {
      ImageIO.write(image, "png", out);
      return out.toByteArray();
    } catch (IOException e) {
      throw new UncheckedIOException("cannot write the picture", e);
    }
  }

  /**
   * Draws where nobody sees it, so that a later drawing finds its classes loaded.
   *
   * @param artwork what to draw
   * @param side width and height in pixels
   */
  public static void tryOut(Artwork artwork, int side) {
    Graphics2D g = new BufferedImage(side, side, BufferedImage.TYPE_INT_RGB).createGraphics();
    artwork.draw(g, new Rectangle2D.Double(0, 0, side, side));
    g.dispose();
  }

  /**
   * Turns on everything that makes lines and text smooth.
   *
   * @param g graphics
   */
  public static void smooth(Graphics2D g) {
    g.setRenderingHint(RenderingHints.KEY_ANTIALIASING, RenderingHints.VALUE_ANTIALIAS_ON);
    g.setRenderingHint(
        RenderingHints.KEY_TEXT_ANTIALIASING, RenderingHints.VALUE_TEXT_ANTIALIAS_ON);
    g.setRenderingHint(
        RenderingHints.KEY_FRACTIONALMETRICS, RenderingHints.VALUE_FRACTIONALMETRICS_ON);
    g.setRenderingHint(RenderingHints.KEY_STROKE_CONTROL, RenderingHints.VALUE_STROKE_PURE);
  }

  private static void paint(Graphics2D g, Artwork artwork, Look look, int width, int height) {
    Rectangle2D area = new Rectangle2D.Double(0, 0, width, height);
    g.setPaint(look.paper());
    g.fill(area);
    artwork.draw(g, area);
  }
}
