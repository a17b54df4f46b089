package perveance.engine.circuit;

import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import java.util.function.DoubleUnaryOperator;

/**
 * What happens in the course of a transient.
 *
 * @param endTime when to stop, above zero [s]
 * @param longestStep steps are never longer; a fraction of the shortest time in any course, above
 *     zero [s]
 * @param tolerance error allowed in a step, relative to the voltage or current that is stored,
 *     above zero [1]
 * @param strays whether interelectrode and wiring capacitance is counted
 * @param courses what is added to a source's dc value at each time, by element index: a function of
 *     seconds that gives volts or amperes
 * @param emissions conduction of each valve at each time, by element index: a function of seconds
 *     that gives a factor on the perveance, zero for a cold cathode
 * @param corners times at which a course or an emission jumps or bends, rising [s]
 */
public record TransientSetup(
    double endTime,
    double longestStep,
    double tolerance,
    boolean strays,
    Map<Integer, DoubleUnaryOperator> courses,
    Map<Integer, DoubleUnaryOperator> emissions,
    List<Double> corners) {
  private static final double USUAL_TOLERANCE = 1e-5;
  private static final double SHARE = 100;

  /** Copies the collections and checks the values. */
  public TransientSetup {
    ElementChecks.positive("endTime", endTime);
    ElementChecks.positive("longestStep", longestStep);
    ElementChecks.positive("tolerance", tolerance);
    courses = java.util.Collections.unmodifiableMap(new LinkedHashMap<>(courses));
    emissions = java.util.Collections.unmodifiableMap(new LinkedHashMap<>(emissions));
    corners = corners.stream().sorted().toList();
  }

  /**
   * Nothing happens: steps of at most a hundredth of the time, an error of 1e-5, no strays.
   *
   * @param endTime when to stop [s]
   * @return the setup
   */
  public static TransientSetup until(double endTime) {
    return new TransientSetup(
        endTime, endTime / SHARE, USUAL_TOLERANCE, false, Map.of(), Map.of(), List.of());
  }

  /**
   * The same with a course on one source.
   *
   * @param source element index of a voltage or current source
   * @param course what is added to its dc value [V] or [A] at each time [s]
   * @param more times at which the course jumps or bends [s]
   * @return the setup
   */
  public TransientSetup withCourse(int source, DoubleUnaryOperator course, List<Double> more) {
    Map<Integer, DoubleUnaryOperator> changed = new LinkedHashMap<>(courses);
    changed.put(source, course);
    return new TransientSetup(
        endTime, longestStep, tolerance, strays, changed, emissions, joined(more));
  }

  /**
   * The same with a valve that warms up or fails.
   *
   * @param valve element index of a valve
   * @param conduction factor on its perveance [1] at each time [s]
   * @param more times at which it jumps or bends [s]
   * @return the setup
   */
  public TransientSetup withEmission(int valve, DoubleUnaryOperator conduction, List<Double> more) {
    Map<Integer, DoubleUnaryOperator> changed = new LinkedHashMap<>(emissions);
    changed.put(valve, conduction);
    return new TransientSetup(
        endTime, longestStep, tolerance, strays, courses, changed, joined(more));
  }

  /**
   * The same with another limit on the steps.
   *
   * @param step longest step, above zero [s]
   * @return the setup
   */
  public TransientSetup withLongestStep(double step) {
    return new TransientSetup(endTime, step, tolerance, strays, courses, emissions, corners);
  }

  /**
   * The same with another tolerance.
   *
   * @param relative error allowed in a step, above zero [1]
   * @return the setup
   */
  public TransientSetup withTolerance(double relative) {
    return new TransientSetup(endTime, longestStep, relative, strays, courses, emissions, corners);
  }

  /**
   * The same with interelectrode and wiring capacitance counted.
   *
   * @return the setup
   */
  public TransientSetup withStrays() {
    return new TransientSetup(endTime, longestStep, tolerance, true, courses, emissions, corners);
  }

  private List<Double> joined(List<Double> more) {
    return java.util.stream.Stream.concat(corners.stream(), more.stream()).distinct().toList();
  }
}
