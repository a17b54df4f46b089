package perveance.report;

/** Something that takes a height at a width and draws itself; never broken across pages. */
interface Block {
  /** Height in points at a width in points. */
  double height(double width);

  /** Draws with the top left corner at (x, y). */
  void draw(Ink ink, double x, double y, double width);
}
