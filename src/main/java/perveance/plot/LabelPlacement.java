package perveance.plot;

import java.awt.geom.Rectangle2D;
import java.util.ArrayList;
import java.util.Arrays;
import java.util.List;

/**
 * Chooses a place for each label so that none covers a stroke or another label: first each in turn,
 * the best place that is free; then those that still collide move again, now that the others stand.
 */
final class LabelPlacement {
  private static final int ROUNDS = 4;

  /** A later place in a label's list counts as so much covered area. */
  private static final double DISLIKE = 0.004;

  /** Paper that a text wants to its left and right. */
  private static final double AIR = 0.12;

  /** Stands for what has not been asked for yet; most labels stay at one of their first places. */
  private static final double UNKNOWN = -1;

  private final List<SchematicLabel> labels;
  private final Obstacles obstacles;
  private final List<double[]> covered = new ArrayList<>();
  private final int[] chosen;

  private LabelPlacement(List<SchematicLabel> labels, Obstacles obstacles) {
    this.labels = labels;
    this.obstacles = obstacles;
    this.chosen = new int[labels.size()];
  }

  /**
   * Where the labels stand.
   *
   * @param places one for each label
   * @param collision area of text that covers something, in square grid units, 0 when none does [1]
   */
  record Placed(List<SchematicLabel.Place> places, double collision) {}

  static Placed place(List<SchematicLabel> labels, Obstacles obstacles) {
    return new LabelPlacement(labels, obstacles).run();
  }

  private Placed run() {
    for (SchematicLabel label : labels) {
      double[] unknown = new double[label.places().size()];
      Arrays.fill(unknown, UNKNOWN);
      covered.add(unknown);
    }
    for (int i = 0; i < labels.size(); i++) {
      chosen[i] = best(i, i);
    }
    for (int round = 0; round < ROUNDS && collision() > 0; round++) {
      for (int i = 0; i < labels.size(); i++) {
        chosen[i] = best(i, labels.size());
      }
    }
    List<SchematicLabel.Place> places = new ArrayList<>();
    for (int i = 0; i < labels.size(); i++) {
      places.add(place(i));
    }
    return new Placed(places, collision());
  }

  private SchematicLabel.Place place(int label) {
    return labels.get(label).places().get(chosen[label]);
  }

  private int best(int label, int standing) {
    List<SchematicLabel.Place> places = labels.get(label).places();
    int best = 0;
    double least = Double.POSITIVE_INFINITY;
    for (int i = 0; i < places.size() && DISLIKE * i < least; i++) {
      double cost = DISLIKE * i + penalty(covered(label, i));
      if (cost < least) {
        cost += penalty(amongLabels(label, places.get(i), standing));
      }
      if (cost < least) {
        least = cost;
        best = i;
      }
    }
    return best;
  }

  private double covered(int label, int place) {
    double[] known = covered.get(label);
    if (known[place] == UNKNOWN) {
      known[place] = obstacles.covered(airy(labels.get(label).places().get(place).box()));
    }
    return known[place];
  }

  /** However small a collision is, a free place at the end of the list is better. */
  private static double penalty(double area) {
    return area > 0 ? 1 + area : 0;
  }

  private double amongLabels(int label, SchematicLabel.Place place, int standing) {
    Rectangle2D box = airy(place.box());
    double sum = 0;
    for (int j = 0; j < standing; j++) {
      if (j != label) {
        sum += Obstacles.common(box, place(j).box());
      }
    }
    return sum;
  }

  private double collision() {
    double sum = 0;
    for (int i = 0; i < labels.size(); i++) {
      sum += covered(i, chosen[i]) + amongLabels(i, place(i), i);
    }
    return sum;
  }

  private static Rectangle2D airy(Rectangle2D box) {
    return new Rectangle2D.Double(
        box.getX() - AIR, box.getY(), box.getWidth() + 2 * AIR, box.getHeight());
  }
}
