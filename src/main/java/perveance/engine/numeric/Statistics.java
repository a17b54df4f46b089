package perveance.engine.numeric;

import java.util.Arrays;

/** Summaries of samples. */
public final class Statistics {
  private Statistics() {}

  /**
   * Returns the arithmetic mean.
   *
   * @param sample one or more finite numbers [any unit]
   * @return the mean [the same unit]
   */
  public static double mean(double[] sample) {
    requireNumbers(sample);
    double sum = 0;
    for (double value : sample) {
      sum += value;
    }
    return sum / sample.length;
  }

  /**
   * Returns the standard deviation of the population that the sample comes from.
   *
   * @param sample two or more finite numbers [any unit]
   * @return the square root of the sum of squares about the mean over one less than the number of
   *     samples [the same unit]
   */
  public static double standardDeviation(double[] sample) {
    if (sample.length < 2) {
      throw new IllegalArgumentException("sample has " + sample.length + " numbers, not 2 or more");
    }
    double mean = mean(sample);
    double sum = 0;
    for (double value : sample) {
      sum += (value - mean) * (value - mean);
    }
    return Math.sqrt(sum / (sample.length - 1));
  }

  /**
   * Returns the root of the mean square.
   *
   * @param sample one or more finite numbers [any unit]
   * @return the root mean square [the same unit]
   */
  public static double rootMeanSquare(double[] sample) {
    requireNumbers(sample);
    double sum = 0;
    for (double value : sample) {
      sum += value * value;
    }
    return Math.sqrt(sum / sample.length);
  }

  /**
   * Returns the middle of a sample.
   *
   * @param sample one or more finite numbers, in any order; not changed [any unit]
   * @return the median [the same unit]
   */
  public static double median(double[] sample) {
    return percentile(sample, 0.5);
  }

  /**
   * Returns the value below which a share of the sample lies.
   *
   * @param sample one or more finite numbers, in any order; not changed [any unit]
   * @param share from 0 to 1 [1]
   * @return the percentile, interpolated between neighbours [the same unit]
   */
  public static double percentile(double[] sample, double share) {
    requireNumbers(sample);
    double[] sorted = sample.clone();
    Arrays.sort(sorted);
    return percentileOfSorted(sorted, share);
  }

  /**
   * Returns the value below which a share of a sorted sample lies, by straight lines between
   * neighbours (definition 7 of R. J. Hyndman and Y. Fan, The American Statistician 50, 361, 1996).
   *
   * @param sorted one or more finite numbers, ascending [any unit]
   * @param share from 0 to 1 [1]
   * @return the percentile [the same unit]
   */
  public static double percentileOfSorted(double[] sorted, double share) {
    requireNumbers(sorted);
    if (!(share >= 0 && share <= 1)) {
      throw new IllegalArgumentException("share is not between 0 and 1: " + share);
    }
    double place = share * (sorted.length - 1);
    int below = (int) Math.floor(place);
    int above = Math.min(below + 1, sorted.length - 1);
    double part = place - below;
    return sorted[below] * (1 - part) + sorted[above] * part;
  }

  /**
   * Returns the mean in which each number counts by its weight.
   *
   * @param sample one or more finite numbers [any unit]
   * @param weight a weight for each, 0 or more, not all 0 [1]
   * @return the weighted mean [the same unit as the sample]
   */
  public static double weightedMean(double[] sample, double[] weight) {
    requireWeights(sample, weight);
    double sum = 0;
    double total = 0;
    for (int i = 0; i < sample.length; i++) {
      sum += sample[i] * weight[i];
      total += weight[i];
    }
    return sum / total;
  }

  /**
   * Returns the middle by weight: the least number up to which at least half of the weight lies.
   *
   * @param sample one or more finite numbers, in any order; not changed [any unit]
   * @param weight a weight for each, 0 or more, not all 0 [1]
   * @return the weighted median [the same unit as the sample]
   */
  public static double weightedMedian(double[] sample, double[] weight) {
    double total = requireWeights(sample, weight);
    Integer[] order = new Integer[sample.length];
    Arrays.setAll(order, i -> i);
    Arrays.sort(order, (a, b) -> Double.compare(sample[a], sample[b]));
    double sum = 0;
    for (int i : order) {
      sum += weight[i];
      if (sum >= 0.5 * total) {
        return sample[i];
      }
    }
    return sample[order[order.length - 1]];
  }

  private static double requireWeights(double[] sample, double[] weight) {
    requireNumbers(sample);
    if (weight.length != sample.length) {
      throw new IllegalArgumentException(
          "weight has " + weight.length + " entries, not " + sample.length);
    }
    double total = 0;
    for (double share : weight) {
      if (!(share >= 0)) {
        throw new IllegalArgumentException("weight is below 0: " + share);
      }
      total += share;
    }
    if (!(total > 0) || Double.isInfinite(total)) {
      throw new IllegalArgumentException("weight sums to " + total);
    }
    return total;
  }

  private static void requireNumbers(double[] sample) {
    if (sample.length == 0) {
      throw new IllegalArgumentException("sample is empty");
    }
    for (double value : sample) {
      if (!Double.isFinite(value)) {
        throw new IllegalArgumentException("sample holds a number that is not finite: " + value);
      }
    }
  }
}
