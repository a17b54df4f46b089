package perveance.accuracy;

import java.util.List;
import java.util.Locale;
import java.util.stream.Collectors;
import perveance.engine.device.FitSummary;
import perveance.engine.device.LawParameter;
import perveance.engine.device.Validity;
import perveance.engine.device.fit.LawFit;

/** The part of a device file that a fit writes. */
final class FittedSections {
  private static final String START = "\n[law]\n";
  private static final String AFTER = "\n[rectifier]\n";

  private FittedSections() {}

  /** The file's text with its law, fit and validity replaced. */
  static String replace(String text, String lawName, LawFit fit) {
    int start = text.indexOf(START);
    String head = start < 0 ? text.stripTrailing() + "\n" : text.substring(0, start);
    int after = text.indexOf(AFTER);
    String tail = after < 0 ? "" : text.substring(after);
    return head + START + "name = \"" + lawName + "\"\n" + of(fit) + tail;
  }

  private static String of(LawFit fit) {
    String law =
        fit.law().parameters().stream()
            .map(FittedSections::parameter)
            .collect(Collectors.joining("\n", "", "\n"));
    return law + summary(fit.summary()) + validity(fit.validity());
  }

  private static String parameter(LawParameter parameter) {
    return parameter.key() + " = " + number(parameter.value());
  }

  private static String summary(FitSummary summary) {
    return "\n[fit]\nmethod = "
        + quoted(summary.method())
        + "\nmedian_error = "
        + number(summary.medianError(), 3)
        + "\nworst_error = "
        + number(summary.worstError(), 3)
        + "\nstandard_errors = "
        + summary.standardErrors().stream()
            .map(error -> number(error, 3))
            .collect(Collectors.joining(", ", "[", "]"))
        + "\nassumptions = "
        + list(summary.assumptions())
        + "\n";
  }

  private static String list(List<String> texts) {
    if (texts.isEmpty()) {
      return "[]";
    }
    return texts.stream()
        .map(FittedSections::quoted)
        .collect(Collectors.joining(",\n  ", "[\n  ", ",\n]"));
  }

  private static String validity(Validity validity) {
    return "\n[validity]\nanode_voltage = "
        + pair(validity.lowestAnodeVoltage(), validity.highestAnodeVoltage(), 1, "V")
        + "\nanode_current = "
        + pair(validity.lowestCurrent(), validity.highestCurrent(), 1e3, "mA")
        + "\ngrid_voltage = "
        + pair(validity.lowestGridVoltage(), validity.highestGridVoltage(), 1, "V")
        + "\n";
  }

  private static String pair(double low, double high, double factor, String unit) {
    return "[\""
        + number(low * factor, 4)
        + " "
        + unit
        + "\", \""
        + number(high * factor, 4)
        + " "
        + unit
        + "\"]";
  }

  private static String number(double value) {
    return number(value, 6);
  }

  private static String number(double value, int figures) {
    if (value == 0) {
      return "0";
    }
    java.math.BigDecimal rounded =
        new java.math.BigDecimal(value)
            .round(new java.math.MathContext(figures))
            .stripTrailingZeros();
    double size = Math.abs(value);
    return size >= 1e-3 && size < 1e6
        ? rounded.toPlainString()
        : String.format(Locale.ROOT, "%." + (figures - 1) + "e", value);
  }

  private static String quoted(String text) {
    return '"' + text.replace("\\", "\\\\").replace("\"", "\\\"") + '"';
  }
}
