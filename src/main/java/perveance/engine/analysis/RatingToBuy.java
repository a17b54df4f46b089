package perveance.engine.analysis;

import java.util.OptionalDouble;

/**
 * Ratings to buy. A resistor runs at half its rated power at most at idle and at drive (habit in a
 * warm chassis), and a fault must stay within the rating as long as a resistor of moderate size can
 * bear it; beyond that a fuse has to act. Film capacitors get 1.5 times the highest voltage they
 * see, cold start included; electrolytics are used to 80 % of theirs. All four are common practice.
 */
final class RatingToBuy {
  /** Share of the rated power that is used in normal work, common practice 50 to 60 %. */
  static final double POWER_USE = 0.5;

  /** Film capacitors are rated at least this many times the highest voltage, common practice. */
  static final double FILM_MARGIN = 1.5;

  /** Share of the rated voltage of an electrolytic that is used, common practice 80 to 90 %. */
  static final double ELECTROLYTIC_USE = 0.8;

  /** The largest rating that is bought to bear a fault [W]. */
  static final double LARGEST_FOR_FAULT = 5;

  private static final double[] POWERS = {0.25, 0.5, 1, 2, 3, 5, 7, 10, 15, 25, 50, 100};
  private static final double[] RESISTOR_VOLTAGES = {200, 250, 350, 500, 700, 1000, 1600, 2500};
  private static final double[] FILM_VOLTAGES = {63, 100, 160, 250, 400, 630, 1000, 1600, 2000};
  private static final double[] ELECTROLYTIC_VOLTAGES = {
    10, 16, 25, 35, 50, 63, 100, 160, 250, 350, 400, 450, 500
  };

  private RatingToBuy() {}

  /**
   * Rated power of a resistor.
   *
   * @param working largest mean power at idle or at drive [W]
   * @param fault power in the worst fault [W]
   * @return rated power to buy; empty beyond the largest usual rating [W]
   */
  static OptionalDouble power(double working, double fault) {
    double need = working / POWER_USE;
    return above(POWERS, bears(fault) ? Math.max(need, fault) : need);
  }

  /** Whether a resistor is bought to bear a fault of this power. */
  static boolean bears(double fault) {
    return fault <= LARGEST_FOR_FAULT;
  }

  /**
   * Voltage rating of a resistor.
   *
   * @param highest highest voltage across it [V]
   * @return limiting voltage to buy, empty where every resistor bears it [V]
   */
  static OptionalDouble resistorVoltage(double highest) {
    return highest <= RESISTOR_VOLTAGES[0] / 2
        ? OptionalDouble.empty()
        : above(RESISTOR_VOLTAGES, highest);
  }

  /**
   * Voltage rating of a film capacitor.
   *
   * @param highest highest voltage across it, cold start included [V]
   * @return rated voltage to buy; empty beyond the largest usual rating [V]
   */
  static OptionalDouble filmVoltage(double highest) {
    return above(FILM_VOLTAGES, FILM_MARGIN * highest);
  }

  /**
   * Voltage rating of an electrolytic.
   *
   * @param highest highest voltage across it, cold start included [V]
   * @return rated voltage to buy; empty beyond the largest usual rating [V]
   */
  static OptionalDouble electrolyticVoltage(double highest) {
    return above(ELECTROLYTIC_VOLTAGES, highest / ELECTROLYTIC_USE);
  }

  private static OptionalDouble above(double[] ladder, double need) {
    for (double step : ladder) {
      if (step >= need * (1 - 1e-9)) {
        return OptionalDouble.of(step);
      }
    }
    return OptionalDouble.empty();
  }
}
