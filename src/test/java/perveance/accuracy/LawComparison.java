package perveance.accuracy;

import java.util.ArrayList;
import java.util.List;
import java.util.Locale;
import perveance.engine.device.Device;
import perveance.engine.device.DeviceLaw;
import perveance.engine.device.Evidence;
import perveance.engine.device.fit.LawReadings;
import perveance.engine.device.fit.Residual;
import perveance.engine.numeric.Statistics;

/** Tables that set laws side by side. */
final class LawComparison {
  private LawComparison() {}

  /** The project's law and second opinions at the tabulated points of a type, Markdown. */
  static String secondOpinions() {
    StringBuilder text =
        new StringBuilder(
            """
            | type | law | tabulated figures | median error | worst error |
            | --- | --- | --- | --- | --- |
            """);
    for (String type : new String[] {"12AX7", "12AU7", "12AT7", "6DJ8", "2A3", "300B"}) {
      Device device = Library.device(type);
      text.append(row(type, "this library", device.law(), device.evidence()));
      text.append(row(type, "Koren 1996", SecondOpinions.koren(type), device.evidence()));
      if (type.equals("12AX7")) {
        for (String specimen : new String[] {"RSD-1", "RSD-2", "EHX-1"}) {
          DeviceLaw law = SecondOpinions.dempwolf(specimen);
          text.append(row(type, "Dempwolf and Zoelzer 2011, " + specimen, law, device.evidence()));
        }
      }
      if (type.equals("2A3")) {
        text.append(
            row(type, "Najnudel et al. 2020", SecondOpinions.najnudel(type), device.evidence()));
      }
    }
    for (String type : new String[] {"EL34", "6L6GC", "KT88", "6550"}) {
      Device device = Library.device(type);
      List<Evidence> evidence =
          device.evidence().stream().filter(e -> e.connection().equals("pentode")).toList();
      text.append(row(type, "this library", device.law(), evidence));
      text.append(row(type, "Koren 1996", FormulaPentode.koren(type), evidence));
    }
    return text.toString();
  }

  private static String row(String type, String law, DeviceLaw tried, List<Evidence> evidence) {
    List<Double> sizes = new ArrayList<>();
    for (Residual residual : new LawReadings(tried).compare(evidence)) {
      Evidence entry = residual.evidence();
      if (entry.kind().equals("point") && !entry.confidence().equals("low")) {
        sizes.add(Math.abs(residual.relativeError()));
      }
    }
    return String.format(
        Locale.ROOT,
        "| %s | %s | %d | %.1f %% | %.1f %% |%n",
        type,
        law,
        sizes.size(),
        100 * ResistanceCoupledTriodesTest.median(sizes),
        100 * ResistanceCoupledTriodesTest.worst(sizes));
  }

  /** What the tapering spread and the uneven cathode change, and the published laws beside it. */
  static String lowCurrent() {
    StringBuilder text =
        new StringBuilder(
            """
            | stage rows | figure | even spread (before) | this library |
            | --- | --- | --- | --- |
            """);
    List<List<Double>> before = StageErrors.gain6sl7gt(EvenSpreadTriode.of("6SL7GT"));
    List<List<Double>> now = StageErrors.gain6sl7gt(Library.device("6SL7GT").law());
    String[] rows = {"90 V, 0.08 to 0.25 mA", "180 V, 0.18 to 0.7 mA", "300 V, 0.3 to 1.2 mA"};
    for (int i = 0; i < rows.length; i++) {
      text.append(
          String.format(
              Locale.ROOT,
              "| 6SL7GT at %s | gain, mean and range | %s | %s |%n",
              rows[i],
              spread(before.get(i)),
              spread(now.get(i))));
    }
    StageErrors first = StageErrors.ecc83(EvenSpreadTriode.of("12AX7"));
    StageErrors then = StageErrors.ecc83(Library.device("12AX7").law());
    text.append(medians("current", first.current(), then.current(), 100, "%"));
    text.append(medians("gain", first.gain(), then.gain(), 100, "%"));
    text.append(medians("distortion", first.distortion(), then.distortion(), 1, "points"));
    return text.toString();
  }

  private static String medians(
      String figure, List<Double> before, List<Double> now, double factor, String unit) {
    return String.format(
        Locale.ROOT,
        "| ECC83, 15 rows | %s, median | %.1f %s | %.1f %s |%n",
        figure,
        factor * ResistanceCoupledTriodesTest.median(before),
        unit,
        factor * ResistanceCoupledTriodesTest.median(now),
        unit);
  }

  private static String spread(List<Double> errors) {
    double[] values = errors.stream().mapToDouble(e -> 100 * e).toArray();
    double low = Double.POSITIVE_INFINITY;
    double high = Double.NEGATIVE_INFINITY;
    for (double value : values) {
      low = Math.min(low, value);
      high = Math.max(high, value);
    }
    return String.format(
        Locale.ROOT, "%+.1f %% (%+.1f to %+.1f)", Statistics.mean(values), low, high);
  }
}
