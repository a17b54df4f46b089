package perveance.engine.analysis;

import java.util.Arrays;
import java.util.HashMap;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import perveance.engine.circuit.DcSolver;
import perveance.engine.circuit.SmallSignal;
import perveance.engine.stage.StageCircuit.LoadLineSpec;
import perveance.engine.stage.StageCircuit.Output;
import perveance.engine.stage.StageCircuit.StageDevice;
import perveance.engine.stage.StageCircuit.TestPoint;

/**
 * One stage over many specimens: solves each, reads its operating point and its mid-band figures,
 * and keeps them for the bands.
 */
final class StageSpread {
  private static final double SOLVED_ENOUGH = 0.5;

  private final StageModel model;
  private final DcSolver solver;
  private final SampleDraws draws;
  private final Causes causes;
  private final RailSpread rails;
  private final SwingSpread swings;
  private final Map<String, DeviceSamples> devices = new LinkedHashMap<>();
  private final double[][] nodes;
  private final double[] gain;
  private final double[] secondGain;
  private final double[] outputResistance;
  private final List<Integer> loads;
  private int solved;

  StageSpread(StageModel model, SampleDraws draws, Causes causes, RailSpread rails) {
    this.model = model;
    this.solver = new DcSolver(model.circuit());
    this.draws = draws;
    this.causes = causes;
    this.rails = rails;
    boolean composite = model.stage().loadLine().map(LoadLineSpec::composite).orElse(false);
    this.swings = new SwingSpread(model, composite, draws.samples());
    for (StageDevice device : model.stage().devices()) {
      int element = model.circuit().element(device.ref());
      devices.put(
          device.ref(), new DeviceSamples(element, model.valve(device.ref()), draws.samples()));
    }
    this.nodes = new double[model.stage().testPoints().size()][];
    Arrays.setAll(nodes, i -> empty());
    this.gain = empty();
    this.secondGain = empty();
    this.outputResistance = empty();
    this.loads = OutputLoad.loads(model, model.mainOutput());
  }

  private double[] empty() {
    double[] values = new double[draws.samples()];
    Arrays.fill(values, Double.NaN);
    return values;
  }

  /** Works out all specimens. */
  void run() {
    Map<Integer, double[]> held = heldRails();
    Specimen specimen = new Specimen(solver, draws, causes, rails.computed());
    double[] nominal = new double[solver.pointLength()];
    if (!solver.solveInto(nominal)) {
      return;
    }
    SmallSignal signal = new SmallSignal(solver);
    swings.follow(solver, nominal);
    double[] shift = new double[model.stage().devices().size()];
    double[] point = new double[nominal.length];
    for (int s = 0; s < draws.samples(); s++) {
      specimen.take(s);
      boolean possible = setRails(held, s);
      System.arraycopy(nominal, 0, point, 0, point.length);
      if (possible && solver.solveInto(point)) {
        solved++;
        readPoint(s);
        signal.take(solver);
        readSignal(signal, specimen, s);
        if (s % SwingSpread.STRIDE == 0) {
          readShift(s, shift);
          swings.read(s, solver, point, shift);
        }
      }
    }
  }

  private Map<Integer, double[]> heldRails() {
    Map<Integer, double[]> held = new HashMap<>();
    for (String rail : rails.computed()) {
      if (model.circuit().elements().stream().anyMatch(e -> e.name().equals(rail))) {
        held.put(model.circuit().element(rail), rails.of(rail));
      }
    }
    return held;
  }

  private boolean setRails(Map<Integer, double[]> held, int sample) {
    for (Map.Entry<Integer, double[]> rail : held.entrySet()) {
      double voltage = rail.getValue()[sample];
      if (Double.isNaN(voltage)) {
        return false;
      }
      solver.setVoltage(rail.getKey(), voltage);
    }
    return true;
  }

  private void readPoint(int sample) {
    for (DeviceSamples device : devices.values()) {
      device.read(solver, sample);
    }
    List<TestPoint> points = model.stage().testPoints();
    for (int i = 0; i < nodes.length; i++) {
      nodes[i][sample] = solver.voltage(points.get(i).node());
    }
  }

  private void readSignal(SmallSignal signal, Specimen specimen, int sample) {
    Output main = model.mainOutput();
    gain[sample] = gain(signal, main);
    if (model.secondOutput().isPresent()) {
      secondGain[sample] = gain(signal, model.secondOutput().get());
    }
    double loaded = signal.midbandOutputResistance(main.plus(), main.minus());
    double outside = 0;
    for (int load : loads) {
      outside += 1 / specimen.resistance(load);
    }
    outputResistance[sample] = 1 / (1 / loaded - outside);
  }

  private double gain(SmallSignal signal, Output output) {
    int source = model.source();
    double gain = signal.midbandGain(source, output.plus(), output.minus());
    return model.atSource()
        ? gain
        : gain / signal.midbandGain(source, model.stage().inputNode(), 0);
  }

  private void readShift(int sample, double[] shift) {
    for (int v = 0; v < shift.length; v++) {
      int cause = causes.place(model.stage().devices().get(v).ref());
      shift[v] = Causes.CONTACT * draws.of(cause + 1, sample);
    }
  }

  /** Whether enough specimens have an answer to speak of a band. */
  boolean usable() {
    return solved > SOLVED_ENOUGH * draws.samples();
  }

  /** Bands of the stage's small-signal figures. */
  Map<String, Band> bands() {
    Map<String, double[]> figures = new LinkedHashMap<>();
    figures.put("gain", gain);
    figures.put("secondGain", secondGain);
    figures.put("outputResistance", outputResistance);
    return bands(figures);
  }

  /** Bands of the corners that the stage has. */
  Map<String, Band> cornerBands(SmallSignalAnswer small) {
    return new CornerSpread(model, causes, rails.computed()).bands(small);
  }

  /** Bands of the clean swing. */
  Map<String, Band> swingBands() {
    return bands(swings.figures());
  }

  /** Bands of one device's operating point. */
  Map<String, Band> bands(String device) {
    DeviceSamples samples = devices.get(device);
    return samples == null ? Map.of() : bands(samples.figures());
  }

  /** Bands of the voltages of the test points, by node name. */
  Map<String, Band> nodeBands() {
    Map<String, double[]> figures = new LinkedHashMap<>();
    for (int i = 0; i < nodes.length; i++) {
      int node = model.stage().testPoints().get(i).node();
      figures.put(model.circuit().nodes().get(node), nodes[i]);
    }
    return bands(figures);
  }

  private Map<String, Band> bands(Map<String, double[]> from) {
    BandBuilder builder = new BandBuilder(draws, causes.names(model.stage()));
    Map<String, Band> bands = new LinkedHashMap<>();
    from.forEach(
        (name, values) -> {
          if (BandBuilder.answers(values).length >= BandBuilder.LEAST_SAMPLES) {
            bands.put(name, builder.band(values));
          }
        });
    return bands;
  }
}
