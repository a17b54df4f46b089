package perveance.engine.search;

import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import java.util.OptionalDouble;
import java.util.function.Function;
import perveance.engine.analysis.StageAnswer;
import perveance.engine.numeric.RootOutcome;
import perveance.engine.numeric.Roots;
import perveance.engine.stage.Chassis;
import perveance.engine.stage.KeySpec;
import perveance.engine.stage.Setting;
import perveance.engine.stage.StageEntry;

/**
 * Finds the value of one key at which a figure of a stage is as wanted: a secant on the logarithm
 * of the value, which starts from the present one and so needs few answers while a hand drags, made
 * sure by a bracket once the figure has been seen on both sides.
 */
public final class KeySearch {
  /** Largest step of the logarithm: a factor of 4. */
  private static final double LONGEST_STEP = Math.log(4);

  /** First step, to feel the slope: 2 %. */
  private static final double FIRST_STEP = 0.02;

  private static final int MOST_STEPS = 16;

  private final Chassis chassis;
  private final KeyGoal goal;
  private final Function<Chassis, Optional<StageAnswer>> answers;
  private final List<Point> seen = new ArrayList<>();
  private final double sign;

  /** A value tried: logarithm of its magnitude and how far the figure is from the goal. */
  private record Point(double log, double miss) {}

  private KeySearch(
      Chassis chassis,
      KeyGoal goal,
      double start,
      Function<Chassis, Optional<StageAnswer>> answers) {
    this.chassis = chassis;
    this.goal = goal;
    this.answers = answers;
    this.sign = Math.signum(start);
  }

  /**
   * Searches from the value that the chassis has now.
   *
   * @param chassis a chassis without complaints, in which the key has a value that is not zero
   * @param goal what is wanted
   * @param answers works out the stage in a changed chassis; empty when it has no solution there
   * @return the value, or the nearest one and why no further
   */
  public static KeyOutcome find(
      Chassis chassis, KeyGoal goal, Function<Chassis, Optional<StageAnswer>> answers) {
    Optional<Setting> setting =
        chassis.stage(goal.ref()).map(StageEntry::settings).map(s -> s.get(goal.key().key()));
    if (!(setting.orElse(null) instanceof Setting.Number now) || now.value() == 0) {
      throw new IllegalArgumentException(
          "the chassis has no value to start from: " + goal.ref() + " " + goal.key().key());
    }
    return new KeySearch(chassis, goal, now.value(), answers).search(now.value());
  }

  private KeyOutcome search(double start) {
    double log = Math.log(Math.abs(start));
    OptionalDouble first = miss(log);
    if (first.isEmpty()) {
      return new KeyOutcome.NotFound(
          start, Double.MAX_VALUE, "The stage has no solution as it stands.");
    }
    double next = clamped(log + FIRST_STEP);
    for (int step = 0; step < MOST_STEPS; step++) {
      if (met().isPresent()) {
        return found(met().get());
      }
      OptionalDouble miss = miss(next);
      if (miss.isEmpty()) {
        return notFound("Beyond this value the stage has no solution.");
      }
      Optional<Point> other = opposite();
      if (other.isPresent() && met().isEmpty()) {
        return bracketed(last(), other.get());
      }
      double following = clamped(secant());
      if (following == next && met().isEmpty()) {
        return notFound("The value is at the end of its range.");
      }
      next = following;
    }
    return met().map(this::found).orElseGet(() -> notFound("The figure does not reach the goal."));
  }

  private KeyOutcome bracketed(Point a, Point b) {
    double low = Math.min(a.log(), b.log());
    double high = Math.max(a.log(), b.log());
    double slope = Math.abs((a.miss() - b.miss()) / (high - low));
    double tolerance = Math.max(1e-9, 0.5 * goal.accuracy() / slope);
    RootOutcome root = Roots.bracketed(log -> miss(log).orElse(Double.NaN), low, high, tolerance);
    if (root instanceof RootOutcome.NotFound) {
      return notFound("Between two values the stage has no solution.");
    }
    return found(nearest());
  }

  /** The next guess from the last two points; a long step where the figure hardly moves. */
  private double secant() {
    Point b = last();
    Point a = seen.get(seen.size() - 2);
    double slope = (b.miss() - a.miss()) / (b.log() - a.log());
    double step = -b.miss() / slope;
    if (!Double.isFinite(step)) {
      step = LONGEST_STEP;
    }
    return b.log() + Math.max(-LONGEST_STEP, Math.min(LONGEST_STEP, step));
  }

  private double clamped(double log) {
    KeySpec key = goal.key();
    double one = Math.abs(key.lowest());
    double other = Math.abs(key.highest());
    boolean around = key.lowest() <= 0 && key.highest() >= 0;
    double low = around ? 1e-15 : Math.min(one, other);
    double high = around ? (sign < 0 ? one : other) : Math.max(one, other);
    return Math.max(Math.log(low), Math.min(Math.log(high), log));
  }

  private OptionalDouble miss(double log) {
    for (Point p : seen) {
      if (p.log() == log) {
        return OptionalDouble.of(p.miss());
      }
    }
    Optional<StageAnswer> answer = answers.apply(with(value(log)));
    if (answer.isEmpty()) {
      return OptionalDouble.empty();
    }
    double miss = goal.figure().applyAsDouble(answer.get()) - goal.wanted();
    if (!Double.isFinite(miss)) {
      return OptionalDouble.empty();
    }
    seen.add(new Point(log, miss));
    return OptionalDouble.of(miss);
  }

  private double value(double log) {
    return sign * Math.exp(log);
  }

  private Chassis with(double value) {
    List<StageEntry> stages = new ArrayList<>(chassis.stages());
    stages.replaceAll(
        s ->
            s.ref().equals(goal.ref())
                ? s.with(goal.key().key(), new Setting.Number(Double.toString(value), value))
                : s);
    return new Chassis(chassis.title(), chassis.conditions(), chassis.supplies(), stages);
  }

  private Point last() {
    return seen.get(seen.size() - 1);
  }

  /** The nearest point seen at which the figure missed on the other side. */
  private Optional<Point> opposite() {
    Point here = last();
    return seen.stream()
        .filter(p -> p.miss() * here.miss() < 0)
        .min(
            (p, q) ->
                Double.compare(Math.abs(p.log() - here.log()), Math.abs(q.log() - here.log())));
  }

  private Point nearest() {
    return seen.stream()
        .min((p, q) -> Double.compare(Math.abs(p.miss()), Math.abs(q.miss())))
        .orElseThrow();
  }

  private Optional<Point> met() {
    return Optional.of(nearest()).filter(p -> Math.abs(p.miss()) <= goal.accuracy());
  }

  private KeyOutcome found(Point point) {
    if (Math.abs(point.miss()) > goal.accuracy()) {
      return notFound("The figure jumps across the goal.");
    }
    return new KeyOutcome.Found(value(point.log()), goal.wanted() + point.miss(), seen.size());
  }

  private KeyOutcome notFound(String reason) {
    Point point = nearest();
    return new KeyOutcome.NotFound(value(point.log()), goal.wanted() + point.miss(), reason);
  }
}
