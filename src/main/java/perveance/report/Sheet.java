package perveance.report;

import java.io.ByteArrayOutputStream;
import java.io.IOException;
import java.util.ArrayList;
import java.util.List;
import org.apache.pdfbox.pdmodel.PDDocument;
import org.apache.pdfbox.pdmodel.PDPage;
import org.apache.pdfbox.pdmodel.PDPageContentStream;
import org.apache.pdfbox.pdmodel.common.PDRectangle;

/** Flows blocks down pages and closes the document with its page feet. */
final class Sheet implements AutoCloseable {
  private static final double LEFT = PaperSize.mm(20);
  private static final double RIGHT = PaperSize.mm(12);
  private static final double TOP = PaperSize.mm(12);
  private static final double BOTTOM = PaperSize.mm(19);

  private final PDDocument document;
  private final PaperSize paper;
  private final Typeface faces;
  private final ArtworkInk artworkInk;
  private final List<Ink> pages = new ArrayList<>();
  private final List<PDPageContentStream> streams = new ArrayList<>();
  private double y;

  Sheet(PaperSize paper) throws IOException {
    this.document = new PDDocument();
    this.paper = paper;
    this.faces = Typeface.load(document);
    this.artworkInk = new ArtworkInk(document, faces);
    newPage();
  }

  Typeface faces() {
    return faces;
  }

  PDDocument document() {
    return document;
  }

  double width() {
    return paper.width() - LEFT - RIGHT;
  }

  /** Room left on this page in points. */
  double room() {
    return paper.height() - BOTTOM - y;
  }

  final void newPage() throws IOException {
    PDPage page = new PDPage(new PDRectangle((float) paper.width(), (float) paper.height()));
    document.addPage(page);
    PDPageContentStream stream =
        new PDPageContentStream(
            document, page, PDPageContentStream.AppendMode.OVERWRITE, true, true);
    streams.add(stream);
    pages.add(new Ink(page, stream, artworkInk));
    y = TOP;
  }

  /** Adds a block, on a new page when it does not fit here. */
  void add(Block block) throws IOException {
    double height = block.height(width());
    if (height > room() && y > TOP) {
      newPage();
    }
    block.draw(pages.get(pages.size() - 1), LEFT, y, width());
    y += height;
  }

  /** Height of blocks under each other in points. */
  private double height(List<Block> blocks) {
    return blocks.stream().mapToDouble(b -> b.height(width())).sum();
  }

  /** Room that stays empty on this page in points once all groups that fit here are added. */
  double slack(List<Block> opening, List<List<Block>> groups) {
    double left = room() - height(opening);
    for (List<Block> group : groups) {
      if (height(group) > left) {
        return left;
      }
      left -= height(group);
    }
    return left;
  }

  /** Whether opening and all groups stand on this page. */
  boolean fits(List<Block> opening, List<List<Block>> groups) {
    return height(opening) + groups.stream().mapToDouble(this::height).sum() <= room();
  }

  /** Adds blocks that belong together, on a new page when they do not fit here together. */
  void addTogether(List<Block> blocks) throws IOException {
    if (height(blocks) > room() && y > TOP) {
      newPage();
    }
    for (Block block : blocks) {
      add(block);
    }
  }

  /** Prints the feet, closes all pages and returns the file. */
  byte[] finish(String title, List<String> foot) throws IOException {
    for (int i = 0; i < pages.size(); i++) {
      foot(pages.get(i), title, foot, i + 1);
      streams.get(i).close();
    }
    try (ByteArrayOutputStream out = new ByteArrayOutputStream()) {
      document.save(out);
      return out.toByteArray();
    }
  }

  private void foot(Ink ink, String title, List<String> foot, int page) {
    double base = paper.height() - BOTTOM + 8;
    double right = paper.width() - RIGHT;
    ink.line(LEFT, base, right, base, 0.5, Ink.RULE);
    ink.textRight(
        right, base + 10, faces.regular(), 8, Ink.BLACK, "page " + page + " of " + pages.size());
    double room = width() - 165;
    double at = base + 9;
    for (String line : foot) {
      for (String wrapped : TextBlock.wrap(faces.regular(), line, 7, room)) {
        ink.text(LEFT, at, faces.regular(), 7, Ink.SOFT, wrapped);
        at += 8.2;
      }
    }
    ink.textRight(right, base + 20, faces.regular(), 7, Ink.SOFT, shorten(title));
  }

  private static String shorten(String title) {
    return title.length() <= 44 ? title : title.substring(0, 43) + "\u2026";
  }

  @Override
  public void close() throws IOException {
    document.close();
  }
}
