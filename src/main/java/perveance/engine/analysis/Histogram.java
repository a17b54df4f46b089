package perveance.engine.analysis;

import java.util.ArrayList;
import java.util.Collections;
import java.util.List;
import perveance.engine.numeric.Statistics;

/**
 * How often a figure came out how large among the samples behind a band. The few farthest samples
 * at either end are left out, so that one of them does not flatten all the others.
 *
 * @param from lower end of the first class, in the unit of the figure [1]
 * @param width of each class, in the unit of the figure, above zero [1]
 * @param counts samples in each class
 * @param samples number of samples, with those left out
 */
public record Histogram(double from, double width, List<Integer> counts, int samples) {
  private static final int CLASSES = 24;
  private static final double LEFT_OUT = 0.002;

  /** Copies the list. */
  public Histogram {
    if (!(width > 0)) {
      throw new IllegalArgumentException("width is not above zero: " + width);
    }
    counts = List.copyOf(counts);
  }

  /**
   * Sorts samples into classes.
   *
   * @param sorted samples from low to high, not all alike; array of any length above one [1]
   * @return classes of one width
   */
  static Histogram of(double[] sorted) {
    double low = Statistics.percentileOfSorted(sorted, LEFT_OUT);
    double high = Statistics.percentileOfSorted(sorted, 1 - LEFT_OUT);
    double width = (high - low) / CLASSES;
    List<Integer> counts = new ArrayList<>(Collections.nCopies(CLASSES, 0));
    for (double value : sorted) {
      if (value >= low && value <= high) {
        int place = (int) Math.min(CLASSES - 1, Math.floor((value - low) / width));
        counts.set(place, counts.get(place) + 1);
      }
    }
    return new Histogram(low, width, counts, sorted.length);
  }

  /**
   * The largest class.
   *
   * @return samples in it
   */
  public int highest() {
    return Collections.max(counts);
  }
}
