package perveance.engine.analysis;

import java.util.ArrayList;
import java.util.Comparator;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import java.util.OptionalDouble;
import java.util.function.Predicate;
import java.util.function.ToDoubleFunction;
import perveance.engine.base.PreferredSeries;
import perveance.engine.base.QuantityFormat;
import perveance.engine.base.Remedy;
import perveance.engine.base.Unit;
import perveance.engine.stage.StageCircuit.Part;
import perveance.engine.stage.StageCircuit.PartType;

/**
 * Computes cures: changes one part along the preferred values, works the stage out again, and keeps
 * the change that serves.
 */
final class Remedies {
  /** How far a part is moved along the preferred values, twelve a decade. */
  private static final int MOST_STEPS = 12;

  private final StageAnswer now;
  private final Retry retry;

  Remedies(StageAnswer now, Retry retry) {
    this.now = now;
    this.retry = retry;
  }

  /**
   * One change tried.
   *
   * @param part the part changed
   * @param value its new value [1]
   * @param text the new value as text
   * @param answer what the stage then does
   */
  record Trial(Part part, double value, String text, Variant answer) {}

  /** Tries one value of a part. */
  Optional<Trial> trial(Part part, double value) {
    String text = QuantityFormat.PLAIN.part(value, unit(part));
    return retry
        .with(now.ref(), Map.of(part.key(), text))
        .map(answer -> new Trial(part, value, text, answer));
  }

  /**
   * The smallest change of one part that cures.
   *
   * @param parts parts that may be changed
   * @param cured whether an answer is good
   */
  Optional<Remedy> smallest(List<Part> parts, Predicate<Variant> cured) {
    List<Trial> cures = new ArrayList<>();
    for (Part part : parts) {
      for (boolean up : new boolean[] {true, false}) {
        firstCure(part, up, cured).ifPresent(cures::add);
      }
    }
    return cures.stream()
        .min(Comparator.comparingDouble(t -> Math.abs(Math.log(t.value() / t.part().value()))))
        .map(this::remedy);
  }

  private Optional<Trial> firstCure(Part part, boolean up, Predicate<Variant> cured) {
    double value = part.value();
    for (int step = 0; step < MOST_STEPS; step++) {
      value = up ? above(value) : below(value);
      Optional<Trial> trial = trial(part, value);
      if (trial.isEmpty()) {
        return Optional.empty();
      }
      if (cured.test(trial.get().answer()) && keepsLimits(trial.get().answer())) {
        return trial;
      }
    }
    return Optional.empty();
  }

  /**
   * The value of one part that makes a figure largest, if that gains enough.
   *
   * @param part the part
   * @param highest the figure as it is now
   * @param figure what is to be large
   * @param gain least gain worth a change, as a ratio [1]
   */
  Optional<Trial> best(Part part, double highest, ToDoubleFunction<Variant> figure, double gain) {
    Optional<Trial> best = Optional.empty();
    double least = highest * gain;
    for (boolean up : new boolean[] {true, false}) {
      double value = part.value();
      double last = highest;
      for (int step = 0; step < MOST_STEPS; step++) {
        value = up ? above(value) : below(value);
        Optional<Trial> trial = trial(part, value);
        double at = trial.map(t -> figure.applyAsDouble(t.answer())).orElse(0.0);
        if (at < last || (at > least && !keepsLimits(trial.orElseThrow().answer()))) {
          break;
        }
        last = at;
        if (at > least && at > best.map(t -> figure.applyAsDouble(t.answer())).orElse(0.0)) {
          best = trial;
        }
      }
    }
    return best;
  }

  /** Whether a change drives no valve over a limit, or further over one, than it is now. */
  private boolean keepsLimits(Variant changed) {
    return changed.limits().stream()
        .filter(use -> use.share() > 1 && counts(use))
        .allMatch(
            use -> now.limits().stream().anyMatch(u -> same(u, use) && use.share() <= u.share()));
  }

  /** Whether a limit is one of those that findings are told about. */
  private boolean counts(LimitUse use) {
    return now.circuit().devices().stream()
        .filter(d -> d.ref().equals(use.ref()))
        .flatMap(d -> d.device().defaultRatings().stream())
        .anyMatch(ratings -> RatingFindings.under(use, ratings));
  }

  private static boolean same(LimitUse one, LimitUse other) {
    return one.ref().equals(other.ref())
        && one.what().equals(other.what())
        && one.when().equals(other.when())
        && one.source().equals(other.source());
  }

  /** The remedy that a trial amounts to. */
  Remedy remedy(Trial trial) {
    return Remedy.set(
        QuantityFormat.TYPESET.part(trial.value(), unit(trial.part()))
            + " at "
            + designator(trial.part())
            + " "
            + Effect.of(now, trial.answer())
            + ".",
        trial.part().key(),
        trial.text());
  }

  /** The remedy that a trial amounts to where it is about the low corner. */
  Remedy corner(Trial trial, OptionalDouble before) {
    OptionalDouble after = trial.answer().small().lowCorner();
    String moved =
        before.isPresent() && after.isPresent()
            ? " brings the low corner from "
                + Words.roughly(before.getAsDouble(), Unit.HERTZ)
                + " to "
                + Words.roughly(after.getAsDouble(), Unit.HERTZ)
                + "."
            : " widens the low end.";
    return Remedy.set(
        Words.part(trial.value(), unit(trial.part())) + " at " + designator(trial.part()) + moved,
        trial.part().key(),
        trial.text());
  }

  /** How a part is called on the sheet: its designator and what it does. */
  String designator(Part part) {
    return now.parts().stream()
        .filter(d -> d.part().element().equals(part.element()))
        .findFirst()
        .map(d -> d.designator() + " (" + part.role() + ")")
        .orElse(part.role());
  }

  /** The stage's resistors that a person chooses, one for each key. */
  List<Part> resistors() {
    List<Part> found = new ArrayList<>();
    for (Part part : now.circuit().parts()) {
      if (part.type() == PartType.RESISTOR
          && found.stream().noneMatch(p -> p.key().equals(part.key()))) {
        found.add(part);
      }
    }
    return found;
  }

  static double above(double value) {
    return PreferredSeries.E12.above(value * 1.0001);
  }

  static double below(double value) {
    return PreferredSeries.E12.below(value * 0.9999);
  }

  static Unit unit(Part part) {
    return switch (part.type()) {
      case RESISTOR, TRANSFORMER -> Unit.OHM;
      case CAPACITOR, ELECTROLYTIC -> Unit.FARAD;
      case INDUCTOR -> Unit.HENRY;
      case JUNCTION -> Unit.VOLT;
    };
  }
}
