package perveance.report;

/** Paper that the sheet is laid out for. */
public enum PaperSize {
  /** 210 mm by 297 mm. */
  A4(210, 297),
  /** 8.5 in by 11 in. */
  LETTER(215.9, 279.4);

  private static final double POINTS_PER_MILLIMETRE = 72 / 25.4;

  private final double widthMillimetres;
  private final double heightMillimetres;

  PaperSize(double widthMillimetres, double heightMillimetres) {
    this.widthMillimetres = widthMillimetres;
    this.heightMillimetres = heightMillimetres;
  }

  /**
   * Width.
   *
   * @return width in points of 1/72 inch [1]
   */
  public double width() {
    return widthMillimetres * POINTS_PER_MILLIMETRE;
  }

  /**
   * Height.
   *
   * @return height in points of 1/72 inch [1]
   */
  public double height() {
    return heightMillimetres * POINTS_PER_MILLIMETRE;
  }

  /**
   * Millimetres in points.
   *
   * @param millimetres length in millimetres [1]
   * @return length in points [1]
   */
  static double mm(double millimetres) {
    return millimetres * POINTS_PER_MILLIMETRE;
  }
}
