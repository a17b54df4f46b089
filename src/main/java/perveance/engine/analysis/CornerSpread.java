package perveance.engine.analysis;

import java.util.ArrayList;
import java.util.Comparator;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import java.util.OptionalDouble;
import java.util.Set;
import java.util.TreeSet;
import perveance.engine.analysis.Band.Share;
import perveance.engine.circuit.CapacitorRole;
import perveance.engine.circuit.DcSolver;
import perveance.engine.circuit.Element;
import perveance.engine.circuit.Element.Capacitor;
import perveance.engine.circuit.SmallSignal;

/**
 * Bands of a stage's corners. A corner goes nearly as a product of its causes, so one standard
 * deviation of each is tried by itself and their logarithmic effects are added as squares; a corner
 * a specimen would cost too much to search among a thousand.
 */
final class CornerSpread {
  /** One standard deviation of electrodes' and wiring capacitances: 20 % is two, usual [1]. */
  private static final double STRAYS = 0.10;

  /** Half the width of a 95 % band in standard deviations [1]. */
  private static final double WIDTH = 1.96;

  /** A part of a corner's variance that is worth a name [1]. */
  private static final double LEAST_SHARE = 0.01;

  private static final int STEPS = 12;
  private static final double ACCURACY = 1e-5;

  private final StageModel model;
  private final Causes causes;
  private final DcSolver solver;
  private final Specimen specimen;
  private final SmallSignal signal;
  private final double[] point;
  private final double[] nominal;
  private final int unvaried;

  /**
   * Prepares a stage.
   *
   * @param model the stage
   * @param causes what varies
   * @param held supply nodes that stay as they are
   */
  CornerSpread(StageModel model, Causes causes, Set<String> held) {
    this.model = model;
    this.causes = causes;
    this.solver = new DcSolver(model.circuit());
    this.unvaried = causes.count();
    this.specimen = new Specimen(solver, SampleDraws.oneByOne(causes.count()), causes, held);
    this.nominal = new double[solver.pointLength()];
    this.point = new double[nominal.length];
    specimen.take(unvaried);
    solver.solveInto(nominal);
    this.signal = new SmallSignal(solver);
  }

  /** Bands of the corners that the stage has, by component name. */
  Map<String, Band> bands(SmallSignalAnswer small) {
    Map<String, Band> bands = new LinkedHashMap<>();
    band(small.lowCorner()).ifPresent(b -> bands.put("lowCorner", b));
    band(small.highCorner()).ifPresent(b -> bands.put("highCorner", b));
    return bands;
  }

  private Optional<Band> band(OptionalDouble corner) {
    if (corner.isEmpty() || !model.reached()) {
      return Optional.empty();
    }
    double at = corner.getAsDouble();
    Map<String, Double> squares = new LinkedHashMap<>();
    List<String> names = causes.names(model.stage());
    for (int cause : causesHere()) {
      specimen.take(cause);
      squares.merge(names.get(cause), square(at), Double::sum);
    }
    specimen.take(unvaried);
    capacitors(at, squares);
    double sum = squares.values().stream().mapToDouble(Double::doubleValue).sum();
    double wide = Math.exp(WIDTH * Math.sqrt(sum));
    return sum > 0 && Double.isFinite(wide)
        ? Optional.of(new Band(at / wide, at * wide, shares(squares, sum)))
        : Optional.empty();
  }

  private static List<Share> shares(Map<String, Double> squares, double sum) {
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

  /** The causes that touch this stage's circuit. */
  private Set<Integer> causesHere() {
    Set<Integer> here = new TreeSet<>();
    for (Element element : model.circuit().elements()) {
      int cause = causes.place(element.name());
      if (cause >= 0) {
        here.add(cause);
        if (element instanceof Element.Valve) {
          here.add(cause + 1);
        }
      }
    }
    return here;
  }

  private void capacitors(double at, Map<String, Double> squares) {
    List<Element> elements = model.circuit().elements();
    String own = model.stage().ref() + ".";
    for (int i = 0; i < elements.size(); i++) {
      if (elements.get(i) instanceof Capacitor c && PartRoles.isPart(model, c)) {
        vary(i, c, Math.exp(causes.capacitorDeviation()));
        String key = c.name().startsWith(own) ? c.name().substring(own.length()) : c.name();
        squares.merge(key, square(at), Double::sum);
        vary(i, c, 1);
      }
    }
    strays(Math.exp(STRAYS));
    squares.merge("stray capacitances", square(at), Double::sum);
    strays(1);
  }

  private void strays(double factor) {
    List<Element> elements = model.circuit().elements();
    for (int i = 0; i < elements.size(); i++) {
      if (elements.get(i) instanceof Capacitor c && c.role() == CapacitorRole.STRAY) {
        vary(i, c, factor);
      }
    }
  }

  private void vary(int element, Capacitor nominalValue, double factor) {
    solver.setCapacitance(element, nominalValue.capacitance() * factor);
  }

  /** Square of the logarithm by which the present values move a corner; zero where it is lost. */
  private double square(double from) {
    System.arraycopy(nominal, 0, point, 0, point.length);
    if (!solver.solveInto(point)) {
      return 0;
    }
    signal.take(solver);
    double reference = midband();
    double x = Math.log(from);
    double at = level(x, reference);
    double before = x + 0.02;
    double atBefore = level(before, reference);
    for (int i = 0; i < STEPS && Math.abs(x - before) > ACCURACY && at != atBefore; i++) {
      double step = at * (x - before) / (at - atBefore);
      before = x;
      atBefore = at;
      x -= Math.max(-0.5, Math.min(0.5, step));
      at = level(x, reference);
    }
    double moved = x - Math.log(from);
    return Math.abs(at) < 1e-3 && Math.abs(moved) < 3 ? moved * moved : 0;
  }

  private double midband() {
    double out =
        signal.midbandGain(model.source(), model.mainOutput().plus(), model.mainOutput().minus());
    double in =
        model.atSource() ? 1 : signal.midbandGain(model.source(), model.stage().inputNode(), 0);
    return Math.abs(out / in);
  }

  /** How far the gain at a frequency is above 3 dB below mid-band [1]. */
  private double level(double logarithm, double reference) {
    double frequency = Math.exp(logarithm);
    if (!signal.answers(frequency)) {
      return 0;
    }
    int plus = model.mainOutput().plus();
    int minus = model.mainOutput().minus();
    double gain = signal.transfer(model.source(), plus, minus, frequency).magnitude();
    double input =
        model.atSource()
            ? 1
            : signal.transfer(model.source(), model.stage().inputNode(), 0, frequency).magnitude();
    return gain / input / reference - Math.sqrt(0.5);
  }
}
