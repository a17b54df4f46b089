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
    double volts = StagePlots.roundUp(device.validity().highestAnodeVoltage() * 1.2);
    double amperes = 1e-3 * StagePlots.roundUp(1e3 * device.validity().highestCurrent() * 1.6);
    OptionalDouble watts =
        device.defaultRatings().map(Ratings::anodeDissipation).orElse(OptionalDouble.empty());
    return CharacteristicsPlot.of(CurveFamily.of(device, screen(device), volts, amperes), watts);
  }

  private static double screen(Device device) {
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
