package perveance.engine.analysis;

import java.util.ArrayList;
import java.util.Arrays;
import java.util.Comparator;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import perveance.engine.analysis.Band.Share;
import perveance.engine.numeric.Statistics;

/**
 * Makes bands of the figures of many specimens: the 2.5 % and 97.5 % quantiles, and the share of
 * each cause as the squared correlation of the figure with the cause's deviates, over the same
 * samples. The causes are independent, so that the squared correlations are the shares of a linear
 * figure's variance; they are scaled to a sum of 1. Causes of the same name are added.
 */
final class BandBuilder {
  /** Shares below this are noise of the sampling and are left out. */
  private static final double LEAST_SHARE = 0.01;

  private static final double LEAST_SPREAD = 1e-9;

  /** Fewer answers than this make no band. */
  static final int LEAST_SAMPLES = 10;

  private final SampleDraws draws;
  private final List<String> causes;

  BandBuilder(SampleDraws draws, List<String> causes) {
    this.draws = draws;
    this.causes = List.copyOf(causes);
  }

  /**
   * Makes the band of one figure.
   *
   * @param figure value in each sample; not-a-number where that sample has no answer [any]
   * @return the band
   */
  Band band(double[] figure) {
    double[] sorted = answers(figure);
    if (sorted.length < LEAST_SAMPLES) {
      throw new IllegalArgumentException("figure has " + sorted.length + " answers");
    }
    double mean = Statistics.mean(sorted);
    Arrays.sort(sorted);
    double low = Statistics.percentileOfSorted(sorted, 0.025);
    double high = Statistics.percentileOfSorted(sorted, 0.975);
    // a spread that is lost in rounding has no shape
    boolean spread = high - low > LEAST_SPREAD * Math.max(Math.abs(low), Math.abs(high));
    return new Band(
        low,
        high,
        shares(figure, mean),
        spread ? Optional.of(Histogram.of(sorted)) : Optional.empty());
  }

  /** The samples that have an answer. */
  static double[] answers(double[] figure) {
    double[] found = new double[figure.length];
    int count = 0;
    for (double value : figure) {
      if (Double.isFinite(value)) {
        found[count++] = value;
      }
    }
    return Arrays.copyOf(found, count);
  }

  private List<Share> shares(double[] figure, double mean) {
    double[] offset = new double[figure.length];
    for (int s = 0; s < figure.length; s++) {
      offset[s] = Double.isFinite(figure[s]) ? figure[s] - mean : 0;
    }
    Map<String, Double> squares = new LinkedHashMap<>();
    for (int cause = 0; cause < causes.size(); cause++) {
      double product = draws.product(cause, offset);
      squares.merge(causes.get(cause), product * product, Double::sum);
    }
    return scaled(squares);
  }

  private static List<Share> scaled(Map<String, Double> squares) {
    double sum = squares.values().stream().mapToDouble(Double::doubleValue).sum();
    List<Share> shares = new ArrayList<>();
    squares.forEach(
        (cause, square) -> {
          if (square > LEAST_SHARE * sum) {
            shares.add(new Share(cause, square / sum));
          }
        });
    shares.sort(Comparator.comparingDouble(Share::fraction).reversed());
    return shares;
  }
}
