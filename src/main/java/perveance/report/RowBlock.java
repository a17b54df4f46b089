package perveance.report;

import java.util.List;

/** One row of a table: cells in columns given as shares of the width, wrapped where needed. */
final class RowBlock implements Block {
  private static final double LEADING = 1.25;
  private static final double GAP = 4;

  private final Typeface faces;
  private final double[] shares;
  private final List<Cell> cells;
  private final double size;
  private final double least;
  private final double rule;

  /**
   * A row.
   *
   * @param shares width of each column as a share of the whole [1]
   * @param size text size in points [1]
   * @param least smallest height in points [1]
   * @param rule width of the line below, zero for none [1]
   */
  RowBlock(
      Typeface faces, double[] shares, List<Cell> cells, double size, double least, double rule) {
    this.faces = faces;
    this.shares = shares.clone();
    this.cells = List.copyOf(cells);
    this.size = size;
    this.least = least;
    this.rule = rule;
  }

  @Override
  public double height(double width) {
    double tallest = least;
    for (int i = 0; i < cells.size(); i++) {
      tallest = Math.max(tallest, lines(i, width).size() * size * LEADING + 2);
    }
    return tallest;
  }

  private List<String> lines(int column, double width) {
    Cell cell = cells.get(column);
    if (cell.style() == Cell.Style.BOX || cell.style() == Cell.Style.TICKS) {
      return List.of(cell.text());
    }
    return TextBlock.wrap(face(cell), cell.text(), size, shares[column] * width - GAP);
  }

  private SheetFont face(Cell cell) {
    return cell.style() == Cell.Style.BOLD ? faces.bold() : faces.regular();
  }

  @Override
  public void draw(Ink ink, double x, double y, double width) {
    double height = height(width);
    double left = x;
    for (int i = 0; i < cells.size(); i++) {
      double w = shares[i] * width;
      switch (cells.get(i).style()) {
        case BOX -> writingBox(ink, cells.get(i), left, y, w, height);
        case TICKS -> ticks(ink, cells.get(i), left, y, height);
        default -> words(ink, i, left, y, width, height);
      }
      left += w;
    }
    if (rule > 0) {
      ink.line(x, y + height, x + width, y + height, rule, Ink.RULE);
    }
  }

  private void words(Ink ink, int column, double left, double y, double width, double height) {
    List<String> lines = lines(column, width);
    double baseline = y + (height - lines.size() * size * LEADING) / 2 + size;
    Cell cell = cells.get(column);
    for (String line : lines) {
      ink.text(
          left,
          baseline,
          face(cell),
          size,
          cell.style() == Cell.Style.SOFT ? Ink.SOFT : Ink.BLACK,
          line);
      baseline += size * LEADING;
    }
  }

  private void writingBox(Ink ink, Cell cell, double left, double y, double w, double height) {
    ink.box(left, y + 1.5, w - GAP, height - 3, 0.8, Ink.BLACK);
    ink.textRight(
        left + w - GAP - 3, y + height / 2 + 3, faces.regular(), 8, Ink.SOFT, cell.text());
  }

  private void ticks(Ink ink, Cell cell, double left, double y, double height) {
    double at = left;
    for (String word : cell.text().split(" ", -1)) {
      ink.box(at, y + height / 2 - 4, 8, 8, 0.7, Ink.BLACK);
      ink.text(at + 10, y + height / 2 + 3, faces.regular(), 7.5, Ink.SOFT, word);
      at += 14 + faces.regular().width(word, 7.5);
    }
  }
}
