package perveance.report;

import de.rototor.pdfbox.graphics2d.PdfBoxGraphics2D;
import de.rototor.pdfbox.graphics2d.PdfBoxGraphics2DFontTextDrawer;
import java.awt.Font;
import java.awt.geom.Rectangle2D;
import java.io.IOException;
import org.apache.pdfbox.pdmodel.PDDocument;
import org.apache.pdfbox.pdmodel.PDPageContentStream;
import org.apache.pdfbox.pdmodel.font.PDFont;
import org.apache.pdfbox.util.Matrix;
import perveance.plot.Artwork;

/** Draws charts and schematics as vectors, their text as text in the embedded face. */
final class ArtworkInk {
  private final PDDocument document;
  private final Typeface faces;

  ArtworkInk(PDDocument document, Typeface faces) {
    this.document = document;
    this.faces = faces;
  }

  /** Draws into a rectangle whose lower left corner is (x, y), y up. */
  void draw(PDPageContentStream stream, Artwork artwork, double x, double y, double w, double h)
      throws IOException {
    PdfBoxGraphics2D g = new PdfBoxGraphics2D(document, (float) w, (float) h);
    g.setFontTextDrawer(new FaceMap(faces));
    artwork.draw(g, new Rectangle2D.Double(0, 0, w, h));
    g.dispose();
    stream.saveGraphicsState();
    stream.transform(Matrix.getTranslateInstance((float) x, (float) y));
    stream.drawForm(g.getXFormObject());
    stream.restoreGraphicsState();
  }

  /** Maps the screen faces to the embedded ones. */
  private static final class FaceMap extends PdfBoxGraphics2DFontTextDrawer {
    private final Typeface faces;

    FaceMap(Typeface faces) {
      this.faces = faces;
    }

    @Override
    protected PDFont mapFont(Font font, IFontTextDrawerEnv env) {
      boolean bold = font.getFontName().endsWith("Bold");
      boolean italic = font.getFontName().endsWith("Italic");
      return (bold ? faces.bold() : italic ? faces.italic() : faces.regular()).font();
    }
  }
}
