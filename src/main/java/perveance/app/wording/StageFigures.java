package perveance.app.wording;

import java.util.ArrayList;
import java.util.List;
import perveance.engine.analysis.BiasSupplyAnswer;
import perveance.engine.analysis.CleanSwing;
import perveance.engine.analysis.DevicePoint;
import perveance.engine.analysis.DrivenAnswer;
import perveance.engine.analysis.SmallSignalAnswer;
import perveance.engine.analysis.StageAnswer;
import perveance.engine.base.Unit;

/** What a stage should do, row by row. */
public final class StageFigures {
  private StageFigures() {}

  /**
   * The operating point of one valve section.
   *
   * @param point operating point
   * @return rows
   */
  public static List<FigureRow> point(DevicePoint point) {
    List<FigureRow> rows = new ArrayList<>();
    rows.add(banded(point, "anode", point.anodeChassis(), Unit.VOLT, "anodeChassis"));
    rows.add(banded(point, "cathode", point.cathodeChassis(), Unit.VOLT, "cathodeChassis"));
    rows.add(new FigureRow("grid to cathode", Figures.reading(point.grid(), Unit.VOLT), "", ""));
    point
        .screenChassis()
        .ifPresent(v -> rows.add(banded(point, "screen", v, Unit.VOLT, "screenChassis")));
    rows.add(banded(point, "anode current", point.anodeCurrent(), Unit.AMPERE, "anodeCurrent"));
    point
        .screenCurrent()
        .ifPresent(i -> rows.add(banded(point, "screen current", i, Unit.AMPERE, "screenCurrent")));
    rows.add(
        new FigureRow(
            "mutual conductance",
            Figures.reading(point.mutualConductance() * 1e3, Unit.RATIO) + " mA/V",
            "",
            "mu "
                + Figures.reading(point.amplificationFactor(), Unit.RATIO)
                + ", ra "
                + Figures.reading(point.anodeResistance(), Unit.OHM)));
    rows.add(
        new FigureRow(
            "anode dissipation", Figures.reading(point.anodeDissipation(), Unit.WATT), "", ""));
    point
        .screenDissipation()
        .ifPresent(
            w ->
                rows.add(
                    new FigureRow("screen dissipation", Figures.reading(w, Unit.WATT), "", "")));
    return rows;
  }

  private static FigureRow banded(
      DevicePoint point, String label, double value, Unit unit, String name) {
    return new FigureRow(
        label,
        Figures.value(value, unit, point.bands(), name),
        Figures.band(point.bands(), name, unit),
        "");
  }

  /**
   * Signal behaviour.
   *
   * @param answer the stage's answer
   * @return rows
   */
  public static List<FigureRow> signal(StageAnswer answer) {
    List<FigureRow> rows = new ArrayList<>();
    smallSignal(answer, rows);
    clean(answer, rows);
    answer.driven().ifPresent(d -> driven(d, rows));
    rows.addAll(LargeSignalFigures.of(answer.large()));
    answer.biasSupply().ifPresent(b -> rows.add(biasRange(b)));
    SmallSignalAnswer small = answer.smallSignal();
    rows.add(
        new FigureRow(
            "noise at the grid",
            small.noiseInput().isPresent()
                ? Figures.reading(small.noiseInput().getAsDouble(), Unit.VOLT, 2) + " rms"
                : "not determined",
            "",
            "20 Hz to 20 kHz"));
    return rows;
  }

  private static FigureRow biasRange(BiasSupplyAnswer supply) {
    String range =
        Figures.reading(supply.least(), Unit.VOLT)
            + " to "
            + Figures.reading(supply.most(), Unit.VOLT);
    return new FigureRow(
        "bias can be set", range, "", Figures.reading(supply.current(), Unit.AMPERE) + " taken");
  }

  private static void smallSignal(StageAnswer answer, List<FigureRow> rows) {
    SmallSignalAnswer small = answer.smallSignal();
    rows.add(
        new FigureRow(
            "gain",
            Figures.value(small.gain(), Unit.RATIO, small.bands(), "gain"),
            Figures.band(small.bands(), "gain", Unit.RATIO),
            Figures.decibels(small.gain())));
    small
        .secondGain()
        .ifPresent(
            g ->
                rows.add(
                    new FigureRow(
                        "gain to the second output", Figures.reading(g, Unit.RATIO), "", "")));
    rows.add(
        new FigureRow(
            "output resistance",
            Figures.value(small.outputResistance(), Unit.OHM, small.bands(), "outputResistance"),
            Figures.band(small.bands(), "outputResistance", Unit.OHM),
            ""));
    rows.add(
        new FigureRow(
            "input capacitance",
            Figures.reading(small.inputCapacitance(), Unit.FARAD, 2),
            "",
            "with Miller effect"));
    response(small, lowestCorner(answer), rows);
  }

  /** What is said where no low corner was found: a transformer has one, stated or not. */
  private static String lowestCorner(StageAnswer answer) {
    boolean transformer =
        answer.circuit().parts().stream().anyMatch(part -> part.key().equals("primary"));
    return transformer ? "not stated" : "down to dc";
  }

  private static void response(
      SmallSignalAnswer small, String withoutLowCorner, List<FigureRow> rows) {
    rows.add(
        new FigureRow(
            "\u22123 dB below",
            Figures.frequency(small.lowCorner(), withoutLowCorner),
            Figures.band(small.bands(), "lowCorner", Unit.HERTZ),
            small
                .shelf()
                .map(
                    s ->
                        "bypass shelf "
                            + Figures.reading(s.zero(), Unit.HERTZ, 2)
                            + " to "
                            + Figures.reading(s.pole(), Unit.HERTZ, 2))
                .orElse("")));
    rows.add(
        new FigureRow(
            "\u22123 dB above",
            Figures.frequency(small.highCorner(), "no limit found"),
            Figures.band(small.bands(), "highCorner", Unit.HERTZ),
            ""));
  }

  private static void clean(StageAnswer answer, List<FigureRow> rows) {
    CleanSwing clean = answer.clean();
    rows.add(
        new FigureRow(
            "clean input",
            Figures.value(clean.inputPeak(), Unit.VOLT, clean.bands(), "inputPeak") + " peak",
            Figures.band(clean.bands(), "inputPeak", Unit.VOLT),
            ending(answer)));
    rows.add(
        new FigureRow(
            "clean output",
            Figures.value(clean.outputPeak(), Unit.VOLT, clean.bands(), "outputPeak") + " peak",
            Figures.band(clean.bands(), "outputPeak", Unit.VOLT),
            clean.headroom().stream()
                .mapToObj(
                    h -> "headroom " + perveance.engine.base.QuantityFormat.TYPESET.level(h, 1))
                .findFirst()
                .orElse("")));
  }

  /** What ends the clean swing, and the valve where it does when the stage has several or none. */
  private static String ending(StageAnswer answer) {
    CleanSwing clean = answer.clean();
    boolean only =
        answer.points().size() == 1 && answer.points().get(0).ref().equals(clean.limitedAt());
    return "ended by "
        + clean.limitedBy().told()
        + (only || clean.limitedAt().isEmpty() ? "" : " at " + clean.limitedAt());
  }

  private static void driven(DrivenAnswer driven, List<FigureRow> rows) {
    String at = "at " + Figures.reading(driven.inputPeak(), Unit.VOLT) + " peak in";
    rows.add(new FigureRow("output", Figures.reading(driven.output(), Unit.VOLT) + " rms", "", at));
    driven
        .power()
        .ifPresent(w -> rows.add(new FigureRow("power", Figures.reading(w, Unit.WATT), "", at)));
    String second =
        driven.harmonics().isEmpty() ? "" : "second " + Figures.percent(driven.harmonics().get(0));
    String third =
        driven.harmonics().size() < 2
            ? ""
            : ", third " + Figures.percent(driven.harmonics().get(1));
    rows.add(new FigureRow("distortion", Figures.percent(driven.distortion()), "", second + third));
    driven
        .intermodulation()
        .ifPresent(
            i ->
                rows.add(
                    new FigureRow(
                        "intermodulation",
                        Figures.percent(i.smpte()),
                        "",
                        "SMPTE 4 to 1; CCIF " + Figures.percent(i.ccif()))));
  }
}
