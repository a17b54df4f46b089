package perveance.report;

/**
 * A block with room above it, which keeps a heading off the rule or the text before.
 *
 * @param above room above in points [1]
 * @param block the block
 */
record Spaced(double above, Block block) implements Block {
  @Override
  public double height(double width) {
    return above + block.height(width);
  }

  @Override
  public void draw(Ink ink, double x, double y, double width) {
    block.draw(ink, x, y + above, width);
  }
}
