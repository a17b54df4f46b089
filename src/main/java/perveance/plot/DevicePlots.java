package perveance.plot;

import java.util.OptionalDouble;
import perveance.engine.device.CurveFamily;
import perveance.engine.device.Device;
import perveance.engine.device.Evidence;
import perveance.engine.device.LawKind;
import perveance.engine.device.Ratings;

/** The plot of a device by itself. */
public final class DevicePlots {
  private static final double USUAL_SCREEN = 250;

  private DevicePlots() {}

  /**
   * Anode characteristics over the region that the evidence covers and a little more.
   *
   * @param device the device
   * @return description; of a pentode at the screen voltage of its first published point
   */
  public static PlotDescription characteristics(Device device) {
    CurveFamily family =
        family(device, usualScreen(device), OptionalDouble.empty(), OptionalDouble.empty());
    return CharacteristicsPlot.of(family, dissipation(device));
  }

  /**
   * The curves of a device to stated or usual ends of the axes.
   *
   * @param device the device
   * @param screen screen voltage, {@link CurveFamily#SCREEN_TIED}, or zero for a triode [V]
   * @param volts end of the voltage axis; empty for a little past the evidence [V]
   * @param amperes end of the current axis; empty for a little past the evidence [A]
   * @return the family
   */
  public static CurveFamily family(
      Device device, double screen, OptionalDouble volts, OptionalDouble amperes) {
    double usualVolts = StagePlots.roundUp(device.validity().highestAnodeVoltage() * 1.2);
    double usualAmperes = 1e-3 * StagePlots.roundUp(1e3 * device.validity().highestCurrent() * 1.6);
    return CurveFamily.of(device, screen, volts.orElse(usualVolts), amperes.orElse(usualAmperes));
  }

  /**
   * The anode's limit, which a family carries as a hyperbola.
   *
   * @param device the device
   * @return anode dissipation of its usual rating, empty when not known [W]
   */
  public static OptionalDouble dissipation(Device device) {
    return device.defaultRatings().map(Ratings::anodeDissipation).orElse(OptionalDouble.empty());
  }

  /**
   * The screen voltage at which a device is usually shown.
   *
   * @param device the device
   * @return that of its first published point; zero for a triode [V]
   */
  public static double usualScreen(Device device) {
    if (device.law().kind() != LawKind.PENTODE) {
      return 0;
    }
    return device.evidence().stream()
        .filter(e -> e.connection().equals("pentode"))
        .map(Evidence::screenVoltage)
        .flatMapToDouble(OptionalDouble::stream)
        .findFirst()
        .orElse(USUAL_SCREEN);
  }
}
