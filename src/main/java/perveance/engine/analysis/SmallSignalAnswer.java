package perveance.engine.analysis;

import java.util.List;
import java.util.Map;
import java.util.Optional;
import java.util.OptionalDouble;

/**
 * Small-signal figures under the real load.
 *
 * @param gain mid-band, from the source behind its resistance to the main output, signed [1]
 * @param secondGain of the second output, empty when there is one output [1]
 * @param outputResistance at the main output with the load lifted off [ohm]
 * @param inputCapacitance with the Miller effect [F]
 * @param lowCorner -3 dB at the low end, empty when the response is flat to dc [Hz]
 * @param highCorner -3 dB at the high end, empty when nothing limits it [Hz]
 * @param shelf corners of the cathode bypass, empty when there is none
 * @param couplingCorner corner of the coupling capacitor with its true source and load, empty when
 *     there is none [Hz]
 * @param noiseInput equivalent input noise, 20 Hz to 20 kHz, rms; empty where the circuit leaves it
 *     undetermined [V]
 * @param noiseShares share of the noise power by element, largest first
 * @param bands bands by component name
 * @param response magnitude and phase against frequency, rising frequency
 */
public record SmallSignalAnswer(
    double gain,
    OptionalDouble secondGain,
    double outputResistance,
    double inputCapacitance,
    OptionalDouble lowCorner,
    OptionalDouble highCorner,
    Optional<Shelf> shelf,
    OptionalDouble couplingCorner,
    OptionalDouble noiseInput,
    List<Band.Share> noiseShares,
    Map<String, Band> bands,
    List<ResponsePoint> response) {
  /** Copies the collections. */
  public SmallSignalAnswer {
    noiseShares = List.copyOf(noiseShares);
    bands = Map.copyOf(bands);
    response = List.copyOf(response);
  }

  /**
   * The same with other bands.
   *
   * @param newBands bands by component name
   * @return the changed answer
   */
  public SmallSignalAnswer withBands(Map<String, Band> newBands) {
    return new SmallSignalAnswer(
        gain,
        secondGain,
        outputResistance,
        inputCapacitance,
        lowCorner,
        highCorner,
        shelf,
        couplingCorner,
        noiseInput,
        noiseShares,
        newBands,
        response);
  }

  /**
   * The shelf of a bypass capacitor.
   *
   * @param zero lower corner [Hz]
   * @param pole upper corner [Hz]
   * @param step height [dB]
   */
  public record Shelf(double zero, double pole, double step) {}

  /**
   * One point of the response.
   *
   * @param frequency [Hz]
   * @param magnitude of the gain [1]
   * @param phase of the gain, radian [1]
   */
  public record ResponsePoint(double frequency, double magnitude, double phase) {}
}
