package perveance.report;

import java.util.List;

/** Blocks side by side, each a stack. */
final class Columns implements Block {
  private static final double GUTTER = 14;

  private final List<List<Block>> stacks;
  private final double[] shares;

  Columns(double[] shares, List<List<Block>> stacks) {
    this.shares = shares.clone();
    this.stacks = stacks.stream().map(List::copyOf).toList();
  }

  private double inner(int i, double width) {
    return (width - GUTTER * (stacks.size() - 1)) * shares[i];
  }

  @Override
  public double height(double width) {
    double tallest = 0;
    for (int i = 0; i < stacks.size(); i++) {
      double w = inner(i, width);
      tallest = Math.max(tallest, stacks.get(i).stream().mapToDouble(b -> b.height(w)).sum());
    }
    return tallest;
  }

  @Override
  public void draw(Ink ink, double x, double y, double width) {
    double left = x;
    for (int i = 0; i < stacks.size(); i++) {
      double w = inner(i, width);
      double top = y;
      for (Block block : stacks.get(i)) {
        block.draw(ink, left, top, w);
        top += block.height(w);
      }
      left += w + GUTTER;
    }
  }
}
