package perveance.plot;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.nio.file.Path;
import java.util.List;
import java.util.Optional;
import java.util.OptionalDouble;
import org.junit.jupiter.api.Test;
import perveance.engine.analysis.Band;
import perveance.engine.analysis.DevicePoint;
import perveance.engine.base.BadInputException;
import perveance.engine.base.Unit;

/** The histogram of a real spread, and of one made by hand. */
class SpreadPlotTest {
  @Test
  void samplesBandValueAndLimitAreDrawn() throws BadInputException {
    DevicePoint point =
        Examples.answer(Path.of("examples/line-stage.toml")).stages().get(0).points().get(0);
    Band band = Optional.ofNullable(point.bands().get("anodeCurrent")).orElseThrow();
    double limit = 1.2 * point.anodeCurrent();
    PlotDescription plot =
        SpreadPlot.of(
                "anode current", Unit.AMPERE, band, point.anodeCurrent(), OptionalDouble.of(limit))
            .orElseThrow();
    assertEquals("anode current, mA", plot.x().label());
    assertEquals(1e3 * point.anodeCurrent(), at(plot, "typical"), 1e-9);
    assertEquals(1e3 * band.low(), at(plot, "2.5 %"), 1e-9);
    assertEquals(1e3 * band.high(), at(plot, "97.5 %"), 1e-9);
    assertEquals(1e3 * limit, at(plot, "limit"), 1e-9);
    assertTrue(plot.x().high() > 1e3 * limit, "the limit lies within the picture");
    double area =
        plot.series().get(0).points().stream().mapToDouble(PlotPoint::y).max().orElseThrow();
    assertTrue(area < plot.y().high(), "the steps lie within the picture");
  }

  @Test
  void aBandWithoutSamplesHasNoHistogram() {
    assertEquals(
        Optional.empty(),
        SpreadPlot.of("gain", Unit.RATIO, new Band(1, 2, List.of()), 1.5, OptionalDouble.empty()));
  }

  private static double at(PlotDescription plot, String line) {
    return plot.series().stream()
        .filter(s -> s.name().equals(line))
        .findFirst()
        .orElseThrow()
        .points()
        .get(0)
        .x();
  }
}
