package perveance.report;

import java.io.IOException;
import org.apache.pdfbox.pdmodel.PDDocument;

/**
 * The sans family of the sheet.
 *
 * @param regular regular face
 * @param bold bold face
 * @param italic italic face
 */
record Typeface(SheetFont regular, SheetFont bold, SheetFont italic) {
  static Typeface load(PDDocument document) throws IOException {
    return new Typeface(
        SheetFont.load(document, "LiberationSans-Regular.ttf"),
        SheetFont.load(document, "LiberationSans-Bold.ttf"),
        SheetFont.load(document, "LiberationSans-Italic.ttf"));
  }
}
