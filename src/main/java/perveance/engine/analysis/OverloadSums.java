package perveance.engine.analysis;

import java.util.ArrayList;
import java.util.List;
import java.util.OptionalDouble;

/** Hand sums of the clean swing and of the headroom over the stated drive. */
final class OverloadSums {
  private OverloadSums() {}

  /**
   * The sums that apply.
   *
   * @param clean the stage's clean swing
   * @param point the valve that the signal meets first
   * @param onset grid voltage at which grid current begins [V]
   * @param drive stated peak input, empty when none [V]
   * @param onGrid whether the signal is on a grid whose cathode stands still for it
   */
  static List<HandSum> of(
      CleanSwing clean, DevicePoint point, double onset, OptionalDouble drive, boolean onGrid) {
    List<HandSum> sums = new ArrayList<>();
    if (onGrid && clean.limitedBy() == CleanSwing.Limit.GRID_CURRENT) {
      sums.add(
          new HandSum(
              "clean input",
              "Vin = Von - Vgk",
              Sum.volts(onset) + " - (" + Sum.volts(point.grid()) + ")",
              Sum.volts(onset - point.grid()),
              "at Von the grid draws 0.3 \u00b5A; the engine also has the loss between source and"
                  + " grid"));
    }
    if (clean.headroom().isPresent() && drive.isPresent()) {
      sums.add(
          new HandSum(
              "headroom",
              "20 log10(clean input / drive)",
              "20 log10("
                  + Sum.volts(clean.inputPeak())
                  + " / "
                  + Sum.volts(drive.getAsDouble())
                  + ")",
              Sum.plain(clean.headroom().getAsDouble()) + " dB",
              ""));
    }
    return sums;
  }
}
