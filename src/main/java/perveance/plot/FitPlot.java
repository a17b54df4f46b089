package perveance.plot;

import java.util.ArrayList;
import java.util.List;
import java.util.OptionalDouble;
import perveance.engine.device.CurveFamily;
import perveance.engine.device.Device;
import perveance.engine.device.Evidence;
import perveance.engine.device.LawKind;
import perveance.engine.device.fit.LawFit;

/** Readings on the curves of the law that was fitted to them. */
public final class FitPlot {
  private static final double MILLI = 1e-3;

  private FitPlot() {}

  /**
   * Describes the picture.
   *
   * @param device the device with its law
   * @param fit the fit
   * @return curves, readings, and readings that the fit distrusts
   */
  public static PlotDescription of(Device device, LawFit fit) {
    double volts = device.validity().highestAnodeVoltage() * 1.15;
    double amperes = device.validity().highestCurrent() * 1.25;
    boolean pentode = device.law().kind() == LawKind.PENTODE;
    double screen =
        pentode
            ? device.evidence().stream()
                .flatMap(e -> e.screenVoltage().stream().boxed())
                .findFirst()
                .orElse(CurveFamily.SCREEN_TIED)
            : 0;
    PlotDescription family =
        CharacteristicsPlot.of(
            CurveFamily.of(device, screen, volts, amperes), OptionalDouble.empty());
    List<PlotSeries> series = new ArrayList<>(family.series());
    List<PlotPoint> trusted = new ArrayList<>();
    List<PlotPoint> distrusted = new ArrayList<>();
    for (Evidence e : device.evidence()) {
      e.anodeCurrent()
          .ifPresent(
              i ->
                  (fit.distrusted().contains(e) ? distrusted : trusted)
                      .add(new PlotPoint(e.anodeVoltage(), i / MILLI)));
    }
    series.add(new PlotSeries("readings", PlotSeries.Role.READINGS, trusted));
    series.add(new PlotSeries("distrusted", PlotSeries.Role.DISTRUSTED, distrusted));
    return new PlotDescription(family.title(), family.x(), family.y(), series, family.labels());
  }
}
