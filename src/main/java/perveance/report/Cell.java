package perveance.report;

/**
 * One cell of a table.
 *
 * @param text words; for a writing box the unit printed inside it
 * @param style how it looks
 */
record Cell(String text, Style style) {
  enum Style {
    PLAIN,
    BOLD,
    SOFT,
    BOX,
    TICKS
  }

  static Cell plain(String text) {
    return new Cell(text, Style.PLAIN);
  }

  static Cell bold(String text) {
    return new Cell(text, Style.BOLD);
  }

  static Cell soft(String text) {
    return new Cell(text, Style.SOFT);
  }

  static Cell box(String unit) {
    return new Cell(unit, Style.BOX);
  }

  static Cell ticks(String words) {
    return new Cell(words, Style.TICKS);
  }
}
