package perveance.report;

/** Something that takes a height at a width and draws itself; never broken across pages. */
interface Block {
  /**
   * Height it takes.
   *
   * @param width room in points [1]
   * @return height in points [1]
   */
  double height(double width);

  /**
   * Draws.
   *
   * @param ink page
   * @param x left in points [1]
   * @param y top in points [1]
   * @param width room in points [1]
   */
  void draw(Ink ink, double x, double y, double width);
}
