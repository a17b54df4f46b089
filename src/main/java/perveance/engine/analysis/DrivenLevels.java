package perveance.engine.analysis;

import java.util.ArrayList;
import java.util.Comparator;
import java.util.HashMap;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import java.util.OptionalDouble;
import perveance.engine.analysis.LoadLineView.Point;
import perveance.engine.circuit.Drive;
import perveance.engine.circuit.Element;
import perveance.engine.circuit.Element.Resistor;
import perveance.engine.circuit.Element.Valve;
import perveance.engine.circuit.MidbandOutcome;
import perveance.engine.circuit.MidbandSolution;
import perveance.engine.circuit.MidbandSolver;
import perveance.engine.circuit.Waveform;

/** Drives a stage with sines: at the stated drive, over a ladder of levels. */
final class DrivenLevels {
  /** Levels of the ladder, relative to the clean input peak: 20 dB below to 3 dB above [1]. */
  private static final double[] LADDER = {
    0.1, 0.15, 0.2, 0.3, 0.4, 0.5, 0.6, 0.7, 0.8, 0.9, 1.0, 1.2, 1.4
  };

  /** Levels of the ladder at which two tones are tried as well, relative to the same [1]. */
  private static final List<Double> TWO_TONES = List.of(0.2, 0.5, 1.0);

  private static final Waveform SINE = Waveform.cosine(64);

  private final StageModel model;
  private final MidbandSolver solver;

  DrivenLevels(StageModel model) {
    this.model = model;
    this.solver = new MidbandSolver(model.dc(), new Drive(SINE, model.shares()));
  }

  /** The steady cycle at a peak input; empty for no drive and where there is none. */
  Optional<MidbandSolution> cycle(double peak) {
    if (!(peak > 0) || !model.reached()) {
      return Optional.empty();
    }
    return solver.solve(peak / Math.abs(model.inputShare()))
            instanceof MidbandOutcome.Converged solved
        ? Optional.of(solved.solution())
        : Optional.empty();
  }

  /** The figures at a peak input; empty for no drive and where there is no steady cycle. */
  Optional<DrivenAnswer> answer(double peak) {
    return cycle(peak).map(c -> new DrivenFigures(model, c).answer(peak));
  }

  /** The ladder of levels, the stated drive among them, rising; some with two tones. */
  List<DrivenAnswer> ladder(double clean, OptionalDouble drive) {
    List<Double> peaks = new ArrayList<>();
    for (double step : LADDER) {
      peaks.add(step * clean);
    }
    drive.ifPresent(peaks::add);
    peaks.sort(Comparator.naturalOrder());
    TwoTones tones = new TwoTones(model);
    List<DrivenAnswer> levels = new ArrayList<>();
    for (double peak : peaks) {
      boolean both = TWO_TONES.stream().anyMatch(step -> step * clean == peak);
      answer(peak).map(a -> both ? a.with(tones.at(peak)) : a).ifPresent(levels::add);
    }
    return levels;
  }

  /** Path of a valve through its anode characteristics over half a cycle. */
  static List<Point> path(StageModel model, MidbandSolution cycle, String ref) {
    Valve valve = model.valve(ref);
    double[] voltage = cycle.voltage(valve.anode(), valve.cathode());
    double[] current = cycle.current(model.circuit().element(ref));
    List<Point> path = new ArrayList<>();
    for (int k = 0; k <= cycle.count() / 2; k++) {
      path.add(new Point(voltage[k], current[k]));
    }
    return path;
  }

  /** What each resistor bears over a cycle, by element. */
  static Map<String, PartStress> stress(StageModel model, MidbandSolution cycle) {
    Map<String, PartStress> stress = new HashMap<>();
    for (Element element : model.circuit().elements()) {
      if (element instanceof Resistor r && PartRoles.isPart(model, r)) {
        double highest = 0;
        for (double v : cycle.voltage(r.a(), r.b())) {
          highest = Math.max(highest, Math.abs(v));
        }
        double power = cycle.meanPower(model.circuit().element(r.name()));
        stress.put(r.name(), new PartStress(highest, power));
      }
    }
    return stress;
  }
}
