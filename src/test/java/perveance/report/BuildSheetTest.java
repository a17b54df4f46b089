package perveance.report;

import static org.junit.jupiter.api.Assertions.assertAll;
import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertFalse;
import static org.junit.jupiter.api.Assertions.assertNotEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.io.IOException;
import java.time.LocalDate;
import java.util.ArrayList;
import java.util.List;
import org.apache.pdfbox.Loader;
import org.apache.pdfbox.pdmodel.PDDocument;
import org.apache.pdfbox.pdmodel.PDPage;
import org.apache.pdfbox.rendering.PDFRenderer;
import org.apache.pdfbox.text.PDFTextStripper;
import org.junit.jupiter.api.BeforeAll;
import org.junit.jupiter.api.Test;
import perveance.app.wording.Vocabulary;
import perveance.engine.analysis.ChassisAnswer;
import perveance.engine.base.BadInputException;
import perveance.engine.stage.Chassis;

/** The sheet as text, pages and marks; what it looks like is for people. */
class BuildSheetTest {
  private static ChassisAnswer answer;
  private static byte[] pdf;
  private static String text;

  @BeforeAll
  static void render() throws BadInputException, IOException {
    answer = SheetTrial.answer("examples/line-stage.toml");
    pdf = new BuildSheet(SheetTrial.options(PaperSize.A4, Vocabulary.BRITISH)).render(answer);
    text = SheetTrial.text(pdf);
  }

  @Test
  void theCautionsStandBeforeAnyFigureThatLeadsAHand() {
    int danger = text.indexOf("DANGER");
    assertTrue(danger >= 0 && danger < text.indexOf("Conditions"), text);
    assertAll(
        () -> assertTrue(text.contains("Drain through a resistor, then measure")),
        () -> assertTrue(text.contains("22\u00b5 at 308 V holds 1.0 J")),
        () -> assertTrue(text.contains("Local electrical codes")),
        () -> assertTrue(text.contains("check your local rule")));
  }

  @Test
  void theCautionIsRepeatedWhereTheReadingsAreTaken() {
    int readings = text.indexOf("Readings");
    assertTrue(text.indexOf("DANGER", readings) > readings, text);
  }

  @Test
  void valuesVoltagesAndSignsCanBeFoundAsText() {
    for (String words :
        new String[] {
          "R1 100k",
          "C2 22n",
          "V1a 12AX7",
          "39 k\u03a9",
          "22\u00b5",
          "\u22123 dB",
          "first reading",
          "anode to cathode, V",
          "1 W limit",
          "page 1 of",
          "Perveance"
        }) {
      assertTrue(text.contains(words), words + " in\n" + text);
    }
  }

  /** Stages in a row: levels between them, and which overloads first, stand with the conditions. */
  @Test
  void theSignalPathIsPrinted() throws BadInputException, IOException {
    ChassisAnswer row = SheetTrial.answer("examples/phono-stage.toml");
    String printed =
        SheetTrial.text(
            new BuildSheet(SheetTrial.options(PaperSize.A4, Vocabulary.BRITISH)).render(row));
    int path = printed.indexOf("V1b overloads first, by grid current");
    assertTrue(path > 0 && path < printed.indexOf("Readings"), printed);
    assertTrue(printed.contains("\u2192 V1a \u00d769 \u2192"), printed);
  }

  @Test
  void theWordSafeIsNeverPrinted() {
    assertFalse(
        text.toLowerCase(java.util.Locale.ROOT).matches("(?s).*\\bsafe(ly|ty)?\\b.*"), text);
  }

  @Test
  void titleSubjectAndLanguageAreInTheMetadata() throws IOException {
    try (PDDocument document = Loader.loadPDF(pdf)) {
      assertEquals(
          "Build sheet: Line stage, Kestrel Lane Workshop",
          document.getDocumentInformation().getTitle());
      assertTrue(document.getDocumentInformation().getSubject().contains("V1a common-cathode"));
      assertEquals("en-GB", document.getDocumentCatalog().getLanguage());
    }
  }

  @Test
  void everyPageIsInkedAndOfThePaperAskedFor() throws IOException {
    for (PaperSize paper : PaperSize.values()) {
      byte[] sheet = new BuildSheet(SheetTrial.options(paper, Vocabulary.AMERICAN)).render(answer);
      try (PDDocument document = Loader.loadPDF(sheet)) {
        for (PDPage page : document.getPages()) {
          assertEquals(paper.width(), page.getMediaBox().getWidth(), 0.01);
          assertEquals(paper.height(), page.getMediaBox().getHeight(), 0.01);
        }
        assertTrue(inked(document, 0) > 0.01 && inked(document, 0) < 0.25);
      }
      assertTrue(SheetTrial.text(sheet).contains("plate"));
    }
  }

  @Test
  void picturesAreDrawnNotPasted() throws IOException {
    try (PDDocument document = Loader.loadPDF(pdf)) {
      List<String> images = new ArrayList<>();
      for (PDPage page : document.getPages()) {
        page.getResources()
            .getXObjectNames()
            .forEach(
                n -> {
                  if (page.getResources().isImageXObject(n)) {
                    images.add(n.getName());
                  }
                });
      }
      assertEquals(List.of(), images);
    }
  }

  @Test
  void aTitleInSignsTheFaceLacksStillPrints() throws IOException {
    Chassis c = answer.chassis();
    Chassis foreign =
        new Chassis("\u96fb\u6c17 amp \u0007", c.conditions(), c.supplies(), c.stages());
    byte[] sheet =
        new BuildSheet(SheetTrial.options(PaperSize.A4, Vocabulary.BRITISH))
            .render(SheetTrial.retitled(answer, foreign));
    assertTrue(SheetTrial.text(sheet).contains("amp"));
  }

  @Test
  void theSameDateGivesTheDateOfPrint() {
    assertTrue(text.contains("printed " + LocalDate.of(2026, 12, 1)));
    assertNotEquals(0, pdf.length);
  }

  private static double inked(PDDocument document, int page) throws IOException {
    java.awt.image.BufferedImage image = new PDFRenderer(document).renderImage(page, 0.5f);
    long dark = 0;
    for (int y = 0; y < image.getHeight(); y++) {
      for (int x = 0; x < image.getWidth(); x++) {
        dark += (image.getRGB(x, y) & 0xff) < 128 ? 1 : 0;
      }
    }
    return (double) dark / (image.getWidth() * image.getHeight());
  }

  @Test
  void textReaderKeepsReadingOrder() throws IOException {
    try (PDDocument document = Loader.loadPDF(pdf)) {
      PDFTextStripper first = new PDFTextStripper();
      first.setEndPage(1);
      String page = first.getText(document);
      assertTrue(page.indexOf("Build sheet") < page.indexOf("Readings"), page);
      assertTrue(text.indexOf("Readings") < text.indexOf("What it should do"), page);
    }
  }
}
