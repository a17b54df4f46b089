package perveance.engine.analysis;

import java.util.List;
import perveance.engine.base.PhysicalConstants;
import perveance.engine.circuit.ValveNoise;

/** Hand sum of the noise at the grid, and of the corner that the grid's circuit sets. */
final class NoiseSums {
  /** Width of the audio band that the engine counts noise in [Hz]. */
  private static final double BAND = 20e3 - 20;

  private NoiseSums() {}

  /**
   * Noise of the grid's circuit and of the valve's equivalent resistance (D. O. North and others
   * 1940: 2.5 / gm for a triode), and the low-pass of that circuit with the input capacitance.
   *
   * @param model a stage with its signal on the grid
   * @param answer its small signals
   * @param point its valve's operating point
   */
  static List<HandSum> of(StageModel model, SmallSignalAnswer answer, DevicePoint point) {
    double before = model.signal().midbandOutputResistance(model.valve(point.ref()).grid(), 0);
    if (!(before > 0) || !(point.anodeCurrent() > 0)) {
      return List.of();
    }
    double valve =
        ValveNoise.resistance(
            point.anodeCurrent(), point.screenCurrent().orElse(0), point.mutualConductance());
    double temperature = PhysicalConstants.STANDARD_NOISE_TEMPERATURE;
    double noise =
        Math.sqrt(4 * PhysicalConstants.BOLTZMANN * temperature * (before + valve) * BAND);
    HandSum thermal =
        new HandSum(
            "noise at the grid",
            "En = sqrt(4 k T (Rs + Req) B)",
            "sqrt(4 k x 290 K x ("
                + Sum.ohms(before)
                + " + "
                + Sum.ohms(valve)
                + ") x "
                + Sum.hertz(BAND)
                + ")",
            Sum.volts(noise) + " rms",
            "Rs is what the grid sees, Req the valve's own; the engine adds the parts at cathode,"
                + " screen and anode, and leaves out what lies above the upper corner");
    if (!(answer.inputCapacitance() > 0)) {
      return List.of(thermal);
    }
    double corner = 1 / (2 * Math.PI * before * answer.inputCapacitance());
    HandSum upper =
        new HandSum(
            "upper corner of the input",
            "f = 1 / (2 pi Rs Cin)",
            "1 / (2 pi x " + Sum.ohms(before) + " x " + Sum.farads(answer.inputCapacitance()) + ")",
            Sum.hertz(corner),
            model.atSource()
                ? "the output's own corner, Zout with what hangs on it, comes on top"
                : "it is told as the upper corner of the stage before, whose output this is");
    return List.of(thermal, upper);
  }
}
