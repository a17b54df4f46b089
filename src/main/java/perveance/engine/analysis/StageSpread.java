package perveance.engine.analysis;

import static perveance.engine.device.ElectrodeCurrents.ANODE;
import static perveance.engine.device.ElectrodeCurrents.GRID;
import static perveance.engine.device.ElectrodeCurrents.SCREEN;

import java.util.Arrays;
import java.util.HashMap;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import perveance.engine.circuit.DcSolver;
import perveance.engine.circuit.Element.Valve;
import perveance.engine.circuit.SmallSignal;
import perveance.engine.device.ElectrodeCurrents;
import perveance.engine.device.LawKind;
import perveance.engine.stage.StageCircuit.Output;
import perveance.engine.stage.StageCircuit.StageDevice;

/**
 * One stage over many specimens: solves each, reads its operating point and its mid-band figures,
 * and keeps them for the bands.
 */
final class StageSpread {
  private static final double DECLARED_SOLVED = 0.5;

  private final StageModel model;
  private final DcSolver solver;
  private final SampleDraws draws;
  private final Causes causes;
  private final RailSpread rails;
  private final Map<String, double[]> figures = new LinkedHashMap<>();
  private final Map<String, Map<String, double[]>> deviceFigures = new HashMap<>();
  private final Map<String, double[]> swings = new LinkedHashMap<>();
  private final Map<String, double[]> nodes = new HashMap<>();
  private int solved;

  StageSpread(StageModel model, SampleDraws draws, Causes causes, RailSpread rails) {
    this.model = model;
    this.solver = new DcSolver(model.circuit());
    this.draws = draws;
    this.causes = causes;
    this.rails = rails;
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
    double[] point = new double[nominal.length];
    for (int s = 0; s < draws.samples(); s++) {
      specimen.take(s);
      boolean possible = setRails(held, s);
      System.arraycopy(nominal, 0, point, 0, point.length);
      if (possible && solver.solveInto(point)) {
        solved++;
        readDevices(s);
        readNodes(s);
        signal.take(solver);
        readSignal(signal, s);
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

  private void readDevices(int sample) {
    for (StageDevice device : model.stage().devices()) {
      int element = model.circuit().element(device.ref());
      Valve valve = (Valve) model.circuit().elements().get(element);
      ElectrodeCurrents at = solver.valve(element);
      double cathode = solver.voltage(valve.cathode());
      double anode = solver.voltage(valve.anode());
      double gm = at.slope(ANODE, GRID);
      double ga = at.slope(ANODE, ANODE);
      put(device, "anode", sample, anode - cathode);
      put(device, "grid", sample, solver.voltage(valve.grid()) - cathode);
      put(device, "anodeChassis", sample, anode);
      put(device, "cathodeChassis", sample, cathode);
      put(device, "gridChassis", sample, solver.voltage(valve.grid()));
      put(device, "anodeCurrent", sample, at.current(ANODE));
      put(device, "mutualConductance", sample, gm);
      put(device, "anodeResistance", sample, ga > 0 ? 1 / ga : Double.NaN);
      put(device, "amplificationFactor", sample, ga > 0 ? gm / ga : Double.NaN);
      put(device, "anodeDissipation", sample, (anode - cathode) * at.current(ANODE));
      if (valve.law().kind() == LawKind.PENTODE) {
        double screen = solver.voltage(valve.screen());
        put(device, "screen", sample, screen - cathode);
        put(device, "screenChassis", sample, screen);
        put(device, "screenCurrent", sample, at.current(SCREEN));
        put(device, "screenDissipation", sample, (screen - cathode) * at.current(SCREEN));
      }
    }
  }

  private void put(StageDevice device, String figure, int sample, double value) {
    deviceFigures.computeIfAbsent(device.ref(), r -> new LinkedHashMap<>())
            .computeIfAbsent(figure, f -> empty())[sample] =
        value;
  }

  private void readNodes(int sample) {
    for (var point : model.stage().testPoints()) {
      int node = point.node();
      nodes.computeIfAbsent(model.circuit().nodes().get(node), n -> empty())[sample] =
          solver.voltage(node);
    }
  }

  private void readSignal(SmallSignal signal, int sample) {
    List<Output> outputs = model.stage().outputs();
    Output main = outputs.get(0);
    put("gain", sample, gain(signal, main));
    if (outputs.size() > 1) {
      put("secondGain", sample, gain(signal, outputs.get(1)));
    }
    put("outputResistance", sample, OutputLoad.sourceResistance(model, signal, main));
  }

  private double gain(SmallSignal signal, Output output) {
    int source = model.source();
    double gain = signal.midbandGain(source, output.plus(), output.minus());
    return model.stage().input().isPresent()
        ? gain
        : gain / signal.midbandGain(source, model.stage().inputNode(), 0);
  }

  private void put(String figure, int sample, double value) {
    figures.computeIfAbsent(figure, f -> empty())[sample] = value;
  }

  private double[] empty() {
    double[] values = new double[draws.samples()];
    Arrays.fill(values, Double.NaN);
    return values;
  }

  /** Whether enough specimens have an answer to speak of a band. */
  boolean usable() {
    return solved > DECLARED_SOLVED * draws.samples();
  }

  /** Bands of the stage's figures. */
  Map<String, Band> bands() {
    return bands(figures);
  }

  /** Bands of the clean swing. */
  Map<String, Band> swingBands() {
    return bands(swings);
  }

  /** Bands of one device's operating point. */
  Map<String, Band> bands(String device) {
    return bands(deviceFigures.getOrDefault(device, Map.of()));
  }

  /** Bands of the voltages of the test points, by node name. */
  Map<String, Band> nodeBands() {
    return bands(nodes);
  }

  private Map<String, Band> bands(Map<String, double[]> from) {
    BandBuilder builder = new BandBuilder(draws, causes.names(model.stage()));
    Map<String, Band> bands = new LinkedHashMap<>();
    from.forEach((name, values) -> bands.put(name, builder.band(values)));
    return bands;
  }
}
