package perveance.engine.device.geometry;

import java.util.List;
import perveance.engine.base.PhysicalConstants;

/**
 * A cathode surface: the most current that it gives, whatever pulls.
 *
 * <p>{@code J0 = A T^2 exp(-phi e / (k T))} (O. W. Richardson 1914; S. Dushman, Phys. Rev. 21, 623,
 * 1923). Real cathodes scatter about their class's values, oxide ones by a factor of ten in A, and
 * the continuous current allowed in receiving valves is far below J0.
 *
 * @param name of the surface
 * @param constant A, above 0 [A m^-2 K^-2]
 * @param workFunction phi, above 0 [eV]
 * @param lowestTemperature usual working range [K]
 * @param highestTemperature usual working range [K]
 * @param source publication
 */
public record Emitter(
    String name,
    double constant,
    double workFunction,
    double lowestTemperature,
    double highestTemperature,
    String source) {
  private static final double PER_SQUARE_METRE = 1e4;

  /** Pure tungsten. */
  public static final Emitter TUNGSTEN =
      new Emitter(
          "tungsten",
          60.2 * PER_SQUARE_METRE,
          4.52,
          2400,
          2600,
          "Dushman, Rev. Mod. Phys. 2, 381, 1930 (from memory)");

  /** Tungsten with a layer of thorium; the work function is 30 500 K times k/e. */
  public static final Emitter THORIATED_TUNGSTEN =
      new Emitter(
          "thoriated tungsten",
          3.0 * PER_SQUARE_METRE,
          30_500 * PhysicalConstants.BOLTZMANN / PhysicalConstants.ELEMENTARY_CHARGE,
          1900,
          2000,
          "Dushman and Ewald, 1925, abstract: I = 3 T^2 exp(-30500/T)");

  /** Barium and strontium oxide; reported A from 0.001 to 0.1 A/cm^2/K^2, phi 1.0 to 1.1 eV. */
  public static final Emitter OXIDE =
      new Emitter(
          "oxide",
          0.01 * PER_SQUARE_METRE,
          1.05,
          950,
          1100,
          "usual handbook values, from memory, confidence medium");

  /** Checks the constants. */
  public Emitter {
    Dimension.positive("constant", constant);
    Dimension.positive("workFunction", workFunction);
  }

  /**
   * The surfaces with known constants.
   *
   * @return tungsten, thoriated tungsten, oxide
   */
  public static List<Emitter> known() {
    return List.of(TUNGSTEN, THORIATED_TUNGSTEN, OXIDE);
  }

  /**
   * Emission ceiling.
   *
   * @param temperature of the surface, above 0 [K]
   * @return J0 [A m^-2]
   */
  public double currentDensity(double temperature) {
    Dimension.positive("temperature", temperature);
    double exponent = workFunction / PhysicalConstants.thermalVoltage(temperature);
    return constant * temperature * temperature * Math.exp(-exponent);
  }
}
