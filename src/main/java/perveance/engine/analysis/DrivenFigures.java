package perveance.engine.analysis;

import java.util.ArrayList;
import java.util.Arrays;
import java.util.List;
import java.util.Optional;
import java.util.OptionalDouble;
import perveance.engine.circuit.Element.Valve;
import perveance.engine.circuit.MidbandSolution;
import perveance.engine.device.ElectrodeCurrents;
import perveance.engine.device.LawKind;
import perveance.engine.numeric.Harmonics;
import perveance.engine.stage.StageCircuit.StageDevice;

/** Reads the figures of one level off a steady cycle at mid-band. */
final class DrivenFigures {
  /** Highest harmonic that is listed and counted as distortion. */
  static final int HIGHEST = 10;

  private final StageModel model;
  private final MidbandSolution cycle;

  DrivenFigures(StageModel model, MidbandSolution cycle) {
    this.model = model;
    this.cycle = cycle;
  }

  /**
   * All figures.
   *
   * @param peak peak voltage at the stage's input [V]
   */
  DrivenAnswer answer(double peak) {
    Harmonics harmonics = cycle.harmonics(model.mainOutput().plus(), model.mainOutput().minus());
    List<Double> relative = new ArrayList<>();
    double square = 0;
    for (int n = 1; n <= HIGHEST; n++) {
      square += 0.5 * harmonics.amplitude(n) * harmonics.amplitude(n);
      if (n > 1) {
        relative.add(harmonics.relative(n).orElse(0));
      }
    }
    List<Integer> screened = screened();
    return new DrivenAnswer(
        peak,
        Math.sqrt(square),
        power(square),
        harmonics.distortion(HIGHEST).orElse(0),
        relative,
        meanCurrent(valves(), ElectrodeCurrents.ANODE),
        screened.isEmpty()
            ? OptionalDouble.empty()
            : OptionalDouble.of(meanCurrent(screened, ElectrodeCurrents.SCREEN)),
        meanPower(valves(), ElectrodeCurrents.ANODE),
        meanPower(screened, ElectrodeCurrents.SCREEN),
        peakCurrent(),
        Optional.empty(),
        gridCurrent());
  }

  private OptionalDouble power(double square) {
    OptionalDouble taker = OutputLoad.powerTaker(model, model.mainOutput());
    return taker.isPresent()
        ? OptionalDouble.of(square / taker.getAsDouble())
        : OptionalDouble.empty();
  }

  private List<Integer> valves() {
    return model.stage().devices().stream()
        .map(StageDevice::ref)
        .map(model.circuit()::element)
        .toList();
  }

  private List<Integer> screened() {
    return valves().stream().filter(e -> valve(e).law().kind() == LawKind.PENTODE).toList();
  }

  private Valve valve(int element) {
    return (Valve) model.circuit().elements().get(element);
  }

  private double meanCurrent(List<Integer> valves, int electrode) {
    return valves.stream().mapToDouble(v -> cycle.meanElectrodeCurrent(v, electrode)).sum();
  }

  private List<Double> meanPower(List<Integer> valves, int electrode) {
    return valves.stream().map(v -> cycle.meanElectrodePower(v, electrode)).toList();
  }

  private double peakCurrent() {
    return valves().stream()
        .mapToDouble(v -> Arrays.stream(cycle.current(v)).max().orElse(0))
        .max()
        .orElse(0);
  }

  private boolean gridCurrent() {
    for (int element : valves()) {
      Valve valve = valve(element);
      double highest = Arrays.stream(cycle.voltage(valve.grid(), valve.cathode())).max().orElse(0);
      if (highest > valve.law().gridCurrentOnset()) {
        return true;
      }
    }
    return false;
  }
}
