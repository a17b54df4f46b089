package perveance.cli;

import java.util.ArrayList;
import java.util.List;
import java.util.Locale;
import perveance.app.wording.Figures;
import perveance.app.wording.Vocabulary;
import perveance.engine.base.Unit;
import perveance.engine.device.Device;
import perveance.engine.device.Evidence;
import perveance.engine.device.LawParameter;
import perveance.engine.device.fit.LawFit;
import perveance.engine.device.fit.Residual;
import perveance.engine.device.fit.SpecimenFit;

/** A fit in words and figures. */
final class FitReportText {
  private static final int WIDTH = 100;

  private FitReportText() {}

  static String of(FitInput input, LawFit fit, Vocabulary vocabulary) {
    List<String> lines = new ArrayList<>();
    lines.addAll(TextTable.wrap(head(input, fit), WIDTH));
    lines.add("");
    lines.addAll(parameters(fit));
    lines.add("");
    lines.addAll(residuals(fit));
    for (Evidence e : fit.distrusted()) {
      lines.add(
          String.format(
              Locale.ROOT,
              "Distrusted: %s, %.0f %% off; it was given little weight. Measure it again.",
              place(e),
              100 * worst(fit, e)));
    }
    for (String assumption : fit.summary().assumptions()) {
      lines.addAll(TextTable.wrap("Assumed: " + assumption, WIDTH));
    }
    lines.add(
        String.format(
            Locale.ROOT,
            "Covers anode %s to %s, currents %s to %s; outside that it extrapolates.",
            Figures.reading(fit.validity().lowestAnodeVoltage(), Unit.VOLT),
            Figures.reading(fit.validity().highestAnodeVoltage(), Unit.VOLT),
            Figures.reading(fit.validity().lowestCurrent(), Unit.AMPERE),
            Figures.reading(fit.validity().highestCurrent(), Unit.AMPERE)));
    return vocabulary.say(String.join("\n", lines)) + "\n";
  }

  private static String head(FitInput input, LawFit fit) {
    return String.format(
        Locale.ROOT,
        "%s: %s; error %.1f %% median, %.1f %% at worst%s",
        input.sheet().type(),
        fit.summary().method(),
        100 * fit.summary().medianError(),
        100 * fit.summary().worstError(),
        fit.distrusted().isEmpty() ? "" : " without what is distrusted");
  }

  private static List<String> parameters(LawFit fit) {
    TextTable table = new TextTable(2, WIDTH);
    List<LawParameter> parameters = fit.law().parameters();
    for (LawParameter p : parameters) {
      int fitted = fit.fittedKeys().indexOf(p.key());
      String error =
          fitted < 0
              ? "assumed"
              : String.format(
                  Locale.ROOT, "\u00b1 %.2g", Math.sqrt(fit.covariance()[fitted][fitted]));
      table.row(
          p.key(), String.format(Locale.ROOT, "%.5g", rounded(p)), error, p.unit(), p.meaning());
    }
    return table.lines();
  }

  /** A parameter that a fit drove against zero is zero, not 7e-37. */
  private static double rounded(LawParameter parameter) {
    return Math.abs(parameter.value()) < 1e-12 ? 0 : parameter.value();
  }

  private static List<String> residuals(LawFit fit) {
    TextTable table = new TextTable(2, WIDTH);
    for (Residual r : fit.residuals()) {
      table.row(
          place(r.evidence()),
          r.figure().word(),
          String.format(Locale.ROOT, "%.4g", r.published()),
          String.format(Locale.ROOT, "law %.4g", r.predicted()),
          String.format(Locale.ROOT, "%+.1f %%", 100 * r.relativeError()));
    }
    return table.lines();
  }

  private static double worst(LawFit fit, Evidence evidence) {
    return fit.residuals().stream()
        .filter(r -> r.evidence().equals(evidence))
        .mapToDouble(r -> Math.abs(r.relativeError()))
        .max()
        .orElse(0);
  }

  private static String place(Evidence e) {
    String grid =
        e.gridVoltage().isPresent()
            ? " / " + Figures.reading(e.gridVoltage().getAsDouble(), Unit.VOLT)
            : "";
    return Figures.reading(e.anodeVoltage(), Unit.VOLT) + grid;
  }

  static String scaled(Device device, SpecimenFit.Scaled scaled) {
    return String.format(
        Locale.ROOT,
        "%s: this valve conducts %.0f %% of a typical one, which would draw %s at these voltages.%n"
            + "Derived from your reading; one direct reading does not prove a valve good or bad.%n",
        device.type(),
        scaled.percentOfTypical(),
        Figures.reading(scaled.typicalCurrent(), Unit.AMPERE));
  }
}
