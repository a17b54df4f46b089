package perveance.files.device;

import java.util.List;
import java.util.stream.Collectors;
import perveance.engine.base.QuantityFormat;
import perveance.engine.base.Unit;
import perveance.engine.device.DeviceLaw;
import perveance.engine.device.FitSummary;
import perveance.engine.device.LawKind;
import perveance.engine.device.LawParameter;
import perveance.engine.device.Validity;
import perveance.files.toml.TomlText;

/** The tables that a fit writes, as they stand in a device file. */
final class LawText {
  /** A thousand times finer than any parameter is known. */
  private static final int PARAMETER_FIGURES = 8;

  private static final int ERROR_FIGURES = 3;

  private LawText() {}

  static Values law(DeviceLaw law) {
    Values values = new Values().text("name", LawForm.of(law).word());
    for (LawParameter parameter : law.parameters()) {
      values.raw(parameter.key(), TomlText.number(parameter.value(), PARAMETER_FIGURES));
    }
    return values;
  }

  static Values fit(FitSummary fit) {
    return new Values()
        .text("method", fit.method())
        .raw("median_error", TomlText.number(fit.medianError(), ERROR_FIGURES))
        .raw("worst_error", TomlText.number(fit.worstError(), ERROR_FIGURES))
        .raw(
            "standard_errors",
            fit.standardErrors().stream()
                .map(error -> TomlText.number(error, ERROR_FIGURES))
                .collect(Collectors.joining(", ", "[", "]")))
        .raw("assumptions", TomlText.list(fit.assumptions()));
  }

  static Values validity(Validity validity, LawKind kind) {
    Values values =
        new Values()
            .raw(
                "anode_voltage",
                pair(validity.lowestAnodeVoltage(), validity.highestAnodeVoltage(), Unit.VOLT))
            .raw(
                "anode_current",
                pair(validity.lowestCurrent(), validity.highestCurrent(), Unit.AMPERE));
    return kind == LawKind.DIODE
        ? values
        : values.raw(
            "grid_voltage",
            pair(validity.lowestGridVoltage(), validity.highestGridVoltage(), Unit.VOLT));
  }

  private static String pair(double low, double high, Unit unit) {
    return TomlText.list(
        List.of(QuantityFormat.PLAIN.part(low, unit), QuantityFormat.PLAIN.part(high, unit)));
  }
}
