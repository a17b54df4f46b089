package perveance.report;

import java.util.List;
import perveance.plot.Artwork;

/** Framed pictures side by side. */
final class PicturePair implements Block {
  private static final double GUTTER = 10;
  private static final double INSET = 4;

  private final List<Artwork> pictures;
  private final double[] shares;
  private final double tall;

  PicturePair(List<Artwork> pictures, double[] shares, double tall) {
    this.pictures = List.copyOf(pictures);
    this.shares = shares.clone();
    this.tall = tall;
  }

  @Override
  public double height(double width) {
    return tall + 8;
  }

  @Override
  public void draw(Ink ink, double x, double y, double width) {
    double left = x;
    double room = width - GUTTER * (pictures.size() - 1);
    for (int i = 0; i < pictures.size(); i++) {
      double w = room * shares[i];
      ink.box(left, y, w, tall, 0.6, Ink.RULE);
      ink.artwork(pictures.get(i), left + INSET, y + INSET, w - 2 * INSET, tall - 2 * INSET);
      left += w + GUTTER;
    }
  }
}
