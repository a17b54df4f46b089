package perveance.engine.analysis;

import java.util.ArrayList;
import java.util.Arrays;
import java.util.List;
import java.util.Optional;
import java.util.OptionalDouble;
import perveance.engine.analysis.LoadLineView.Point;
import perveance.engine.circuit.Circuit;
import perveance.engine.circuit.DcOutcome;
import perveance.engine.circuit.DcSolution;
import perveance.engine.circuit.DcSolver;
import perveance.engine.circuit.Drive;
import perveance.engine.circuit.Element;
import perveance.engine.circuit.Element.Resistor;
import perveance.engine.circuit.Element.Transformer;
import perveance.engine.circuit.Element.Valve;
import perveance.engine.circuit.Element.Winding;
import perveance.engine.circuit.ReactiveOutcome;
import perveance.engine.circuit.ReactiveSolution;
import perveance.engine.circuit.ReactiveSolver;
import perveance.engine.circuit.Waveform;
import perveance.engine.device.ElectrodeCurrents;
import perveance.engine.device.Ratings;
import perveance.engine.stage.StageCircuit.LoadLineSpec;
import perveance.engine.stage.StageCircuit.StageDevice;
import perveance.engine.stage.StageValues;

/**
 * Drives an output stage at one frequency into the load that it states, every inductance and
 * capacitance as it is. The load's inductance stands in series with its resistance; it is known
 * here alone, so that gain, power and corners of the other answers stay those into the resistance,
 * as they are published.
 */
final class ReactiveLoad {
  /** Samples a period; the solver takes more where a waveform is too sharp for them. */
  private static final int SAMPLES = 32;

  private final StageModel model;
  private final StageValues values;
  private final Resistor load;

  private ReactiveLoad(StageModel model, StageValues values, Resistor load) {
    this.model = model;
    this.values = values;
    this.load = load;
  }

  /**
   * The answer at a level; empty where the stage states nothing reactive, or no steady cycle is
   * found.
   *
   * @param model the stage
   * @param values what it states
   * @param peak peak input [V]
   */
  static Optional<ReactiveAnswer> of(StageModel model, StageValues values, double peak) {
    boolean stated =
        values.has("load_inductance")
            || values.has("load_frequency")
            || (values.has("load_capacitance") && values.has("primary"));
    Optional<Resistor> taker =
        model
            .mainOutput()
            .load()
            .map(name -> model.circuit().elements().get(model.circuit().element(name)))
            .filter(Resistor.class::isInstance)
            .map(Resistor.class::cast);
    if (!stated || taker.isEmpty() || !(peak > 0) || !model.reached()) {
      return Optional.empty();
    }
    return new ReactiveLoad(model, values, taker.get()).at(peak);
  }

  /** The stated frequency, or the one at which the load's reactance is its resistance. */
  private double frequency() {
    OptionalDouble inductance = values.find("load_inductance");
    OptionalDouble capacitance = values.find("load_capacitance");
    double r = load.resistance();
    double turn =
        inductance.isPresent()
            ? r / (2 * Math.PI * inductance.getAsDouble())
            : 1 / (2 * Math.PI * r * capacitance.orElse(1));
    return values.number("load_frequency", turn);
  }

  private Optional<ReactiveAnswer> at(double peak) {
    Circuit circuit = loaded();
    if (!(new DcSolver(circuit).solveFrom(model.dc()) instanceof DcOutcome.Converged rest)) {
      return Optional.empty();
    }
    DcSolution dc = rest.solution();
    double frequency = frequency();
    ReactiveOutcome outcome =
        new ReactiveSolver(dc, new Drive(Waveform.cosine(SAMPLES), model.shares()), frequency)
            .solve(peak / Math.abs(model.inputShare()));
    return outcome instanceof ReactiveOutcome.Converged found
        ? Optional.of(read(found.solution(), frequency, peak))
        : Optional.empty();
  }

  /** The circuit with the load's inductance, in series with the winding that feeds the load. */
  private Circuit loaded() {
    double inductance = values.number("load_inductance", 0);
    List<Element> elements = new ArrayList<>();
    for (Element element : model.circuit().elements()) {
      boolean own = element instanceof Transformer && model.owns(element);
      elements.add(own ? with((Transformer) element, inductance) : element);
    }
    return new Circuit(model.circuit().nodes(), elements);
  }

  private Transformer with(Transformer transformer, double inductance) {
    List<Winding> windings = new ArrayList<>();
    for (Winding w : transformer.windings()) {
      boolean feeds = w.start() == load.a() && w.end() == load.b();
      windings.add(
          feeds
              ? new Winding(w.start(), w.end(), w.turns(), w.resistance(), w.leakage() + inductance)
              : w);
    }
    return new Transformer(transformer.name(), windings, transformer.magnetising());
  }

  private ReactiveAnswer read(ReactiveSolution cycle, double frequency, double peak) {
    double volts = 0;
    double amperes = 0;
    double watts = 0;
    boolean cutOff = false;
    OptionalDouble limit = OptionalDouble.empty();
    List<Double> mean = new ArrayList<>();
    for (StageDevice device : model.stage().devices()) {
      int element = model.circuit().element(device.ref());
      Path path = path(cycle, device.ref());
      volts = Math.max(volts, largest(path.voltage()));
      amperes = Math.max(amperes, largest(path.current()));
      watts = Math.max(watts, path.power());
      double idle = model.dc().valve(device.ref()).current(ElectrodeCurrents.ANODE);
      double least = Arrays.stream(path.current()).min().orElse(0);
      cutOff |= least < SwingMargins.CUT_OFF_SHARE * idle;
      mean.add(cycle.meanElectrodePower(element, ElectrodeCurrents.ANODE));
      OptionalDouble own =
          device.device().defaultRatings().map(Ratings::anodeDissipation).orElse(limit);
      limit = own.isPresent() ? own : limit;
    }
    double power = cycle.meanPower(model.circuit().element(load.name()));
    return new ReactiveAnswer(
        frequency,
        peak,
        Math.sqrt(power * load.resistance()),
        power,
        volts,
        amperes,
        mean,
        watts,
        limit,
        cutOff,
        drawn(cycle));
  }

  /** Top of a smooth cycle: that of the parabola through its highest sample and those beside it. */
  private static double largest(double[] cycle) {
    int top = 0;
    for (int k = 1; k < cycle.length; k++) {
      top = cycle[k] > cycle[top] ? k : top;
    }
    double at = cycle[top];
    double before = cycle[(top + cycle.length - 1) % cycle.length];
    double after = cycle[(top + 1) % cycle.length];
    double bend = 2 * at - before - after;
    return bend > 0 ? at + (after - before) * (after - before) / (8 * bend) : at;
  }

  /** Volts and amperes of a valve's anode over the period. */
  private record Path(double[] voltage, double[] current) {
    double power() {
      double[] watts = new double[voltage.length];
      for (int k = 0; k < watts.length; k++) {
        watts[k] = voltage[k] * current[k];
      }
      return largest(watts);
    }
  }

  private Path path(ReactiveSolution cycle, String ref) {
    Valve valve = model.valve(ref);
    return new Path(
        cycle.voltage(valve.anode(), valve.cathode()), cycle.current(model.circuit().element(ref)));
  }

  /** The closed path of the section whose characteristics are drawn. */
  private List<Point> drawn(ReactiveSolution cycle) {
    Optional<String> ref = model.stage().loadLine().map(LoadLineSpec::device);
    List<Point> points = new ArrayList<>();
    if (ref.isPresent()) {
      Path path = path(cycle, ref.get());
      int count = path.voltage().length;
      for (int k = 0; k <= count; k++) {
        points.add(new Point(path.voltage()[k % count], path.current()[k % count]));
      }
    }
    return points;
  }
}
