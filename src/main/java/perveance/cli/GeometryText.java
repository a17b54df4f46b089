package perveance.cli;

import java.util.ArrayList;
import java.util.List;
import java.util.Locale;
import java.util.OptionalDouble;
import perveance.app.wording.Figures;
import perveance.app.wording.Vocabulary;
import perveance.engine.base.Unit;
import perveance.engine.device.geometry.ElectrodeAnswer;
import perveance.engine.device.geometry.ElectrodeDesign;
import perveance.engine.device.geometry.GeometryReport;
import perveance.engine.device.geometry.ThermalDiode;

/** What dimensions tell, in words and figures. */
final class GeometryText {
  private static final int WIDTH = 100;
  private static final double PER_SQUARE_CENTIMETRE = 1e-4;
  private static final double MICRO = 1e-6;

  /** Below this spread nothing of the wires' pattern shows in the curves [1]. */
  private static final double UNSEEN = 0.02;

  private final ElectrodeAnswer answer;
  private final TextTable table = new TextTable(2, WIDTH);

  private GeometryText(ElectrodeAnswer answer) {
    this.answer = answer;
  }

  static String of(ElectrodeAnswer answer, Vocabulary vocabulary) {
    GeometryText text = new GeometryText(answer);
    List<String> lines = new ArrayList<>();
    ElectrodeDesign design = answer.design();
    lines.add(design.title().isEmpty() ? "Electrodes" : design.title());
    text.constants();
    text.point();
    text.emission();
    answer.thermal().ifPresent(text::thermal);
    lines.addAll(text.table.lines());
    lines.addAll(TextTable.wrap(text.closing(), WIDTH));
    return vocabulary.say(String.join("\n", lines)) + "\n";
  }

  private void constants() {
    table.row("perveance", number(answer.perveance() / MICRO) + " \u00b5A/V^1.5", "");
    answer.triode().ifPresent(this::triode);
  }

  private void triode(GeometryReport report) {
    String thin =
        answer
            .design()
            .triode()
            .map(t -> number(t.grid().thinWireFactor()) + " by the formula for thin wires")
            .orElse("");
    table.row("amplification factor mu", number(report.amplificationFactor()), thin);
    table.row(
        "equivalent diode",
        Figures.reading(report.effectiveVoltage(), Unit.VOLT),
        "(Vg + Va / mu) / " + number(report.loadingFactor()) + ", in the grid's place");
    table.row(
        "spread of the penetration factor",
        Figures.percent(report.spread()),
        report.spread() < UNSEEN
            ? "the cathode does not see single wires"
            : "the cathode sees single wires: mu falls towards cut-off");
  }

  private void point() {
    ElectrodeDesign design = answer.design();
    String at = "anode " + Figures.reading(design.anodeVoltage(), Unit.VOLT);
    String grid =
        answer.triode().isPresent()
            ? ", grid " + Figures.reading(design.gridVoltage(), Unit.VOLT)
            : "";
    String limit = answer.saturated() ? "; emission ends it" : "";
    table.row("cathode current", Figures.reading(answer.current(), Unit.AMPERE), at + grid + limit);
    answer
        .triode()
        .filter(t -> !answer.saturated())
        .ifPresent(
            t ->
                table.row("mutual conductance", number(t.mutualConductance() * 1e3) + " mA/V", ""));
    resistance("effective resistance", answer.effectiveResistance(), "voltage over current");
    resistance(
        answer.triode().isPresent() ? "anode resistance" : "slope resistance",
        answer.slopeResistance(),
        answer.triode().isPresent() ? "mu over gm" : "two thirds of the effective resistance");
  }

  private void resistance(String name, OptionalDouble ohms, String note) {
    ohms.ifPresent(r -> table.row(name, Figures.reading(r, Unit.OHM), note));
  }

  private void emission() {
    ElectrodeDesign design = answer.design();
    table.row(
        "emission ceiling",
        Figures.reading(answer.emission() * answer.working().cathodeArea(), Unit.AMPERE),
        String.format(
            Locale.ROOT,
            "%s at %s; %.3g A/cm\u00b2, of which %s is drawn",
            design.emitter().name(),
            Figures.part(design.temperature(), Unit.KELVIN),
            answer.emission() * PER_SQUARE_CENTIMETRE,
            Figures.percent(answer.currentDensity() / answer.emission())));
  }

  private void thermal(ThermalDiode.State state) {
    table.row(
        "with initial velocities",
        Figures.reading(state.currentDensity() * answer.working().cathodeArea(), Unit.AMPERE),
        String.format(
            Locale.ROOT,
            "potential minimum of %s at %.3g \u00b5m from the cathode",
            Figures.reading(state.minimum(), Unit.VOLT),
            state.minimumDistance() / MICRO));
  }

  private String closing() {
    if (!(answer.workingVoltage() > 0)) {
      return "Cut off: the grid holds all electrons back, so nothing is drawn across the gap.";
    }
    return "From dimensions alone: contact potential, end effects and supports are left out, and"
        + " oxide cathodes scatter by a factor of ten in emission. Measure before relying on it.";
  }

  private static String number(double value) {
    return String.format(Locale.ROOT, "%.4g", value);
  }
}
