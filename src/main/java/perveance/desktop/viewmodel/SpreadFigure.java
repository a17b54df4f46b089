package perveance.desktop.viewmodel;

import java.util.ArrayList;
import java.util.List;
import java.util.Map;
import java.util.OptionalDouble;
import org.jspecify.annotations.Nullable;
import perveance.engine.analysis.Band;
import perveance.engine.analysis.DevicePoint;
import perveance.engine.analysis.LimitUse;
import perveance.engine.analysis.StageAnswer;
import perveance.engine.base.Unit;

/**
 * A figure of a stage that has a band.
 *
 * @param name for people
 * @param value as computed for typical parts, in its unit [1]
 * @param unit its unit
 * @param band its band
 * @param limit the maker's limit, empty where there is none, in its unit [1]
 */
public record SpreadFigure(String name, double value, Unit unit, Band band, OptionalDouble limit) {
  /**
   * All figures of a stage that have a band.
   *
   * @param answer the stage's answer
   * @return the operating points first
   */
  public static List<SpreadFigure> all(StageAnswer answer) {
    List<SpreadFigure> all = new ArrayList<>();
    answer.points().forEach(p -> add(all, answer, p));
    Map<String, Band> small = answer.smallSignal().bands();
    add(all, "gain", answer.smallSignal().gain(), Unit.RATIO, small, "gain");
    add(
        all,
        "output resistance",
        answer.smallSignal().outputResistance(),
        Unit.OHM,
        small,
        "outputResistance");
    Map<String, Band> clean = answer.clean().bands();
    add(all, "clean input, peak", answer.clean().inputPeak(), Unit.VOLT, clean, "inputPeak");
    add(all, "clean output, peak", answer.clean().outputPeak(), Unit.VOLT, clean, "outputPeak");
    return all;
  }

  private static void add(List<SpreadFigure> all, StageAnswer answer, DevicePoint p) {
    Map<String, Band> bands = p.bands();
    String ref = p.ref() + " ";
    add(all, ref + "anode to chassis", p.anodeChassis(), Unit.VOLT, bands, "anodeChassis");
    add(all, ref + "anode current", p.anodeCurrent(), Unit.AMPERE, bands, "anodeCurrent");
    add(all, ref + "cathode to chassis", p.cathodeChassis(), Unit.VOLT, bands, "cathodeChassis");
    limited(all, answer, p.ref(), "anode voltage", bands.get("anode"));
    limited(all, answer, p.ref(), "anode dissipation", bands.get("anodeDissipation"));
    limited(all, answer, p.ref(), "screen dissipation", bands.get("screenDissipation"));
  }

  private static void limited(
      List<SpreadFigure> all, StageAnswer answer, String ref, String what, @Nullable Band band) {
    for (LimitUse use : answer.limits()) {
      boolean meant = use.ref().equals(ref) && use.what().equals(what) && use.when().equals("idle");
      if (meant && band != null && band.high() > band.low()) {
        all.add(
            new SpreadFigure(
                ref + " " + what, use.value(), use.unit(), band, OptionalDouble.of(use.limit())));
        return;
      }
    }
  }

  private static void add(
      List<SpreadFigure> all,
      String name,
      double value,
      Unit unit,
      Map<String, Band> bands,
      String key) {
    Band band = bands.get(key);
    if (band != null && band.high() > band.low()) {
      all.add(new SpreadFigure(name, value, unit, band, OptionalDouble.empty()));
    }
  }
}
