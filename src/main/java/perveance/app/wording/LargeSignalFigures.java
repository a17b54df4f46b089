package perveance.app.wording;

import java.util.ArrayList;
import java.util.List;
import perveance.engine.analysis.LargeSignalAnswer;
import perveance.engine.analysis.ReactiveAnswer;
import perveance.engine.analysis.Recovery;
import perveance.engine.base.Unit;

/** Rows about overload and reactive load. */
final class LargeSignalFigures {
  private LargeSignalFigures() {}

  static List<FigureRow> of(LargeSignalAnswer answer) {
    List<FigureRow> rows = new ArrayList<>();
    answer.recovery().filter(r -> r.seconds() > 0).ifPresent(r -> rows.add(recovery(r)));
    answer.reactive().ifPresent(r -> reactive(r, rows));
    return rows;
  }

  private static FigureRow recovery(Recovery recovery) {
    return new FigureRow(
        "recovery from overload",
        Figures.reading(recovery.seconds(), Unit.SECOND, 2),
        "",
        "after " + Figures.reading(recovery.inputPeak(), Unit.VOLT) + " peak in");
  }

  private static void reactive(ReactiveAnswer reactive, List<FigureRow> rows) {
    String at = "at " + Figures.reading(reactive.frequency(), Unit.HERTZ);
    rows.add(
        new FigureRow(
            "power, reactive load", Figures.reading(reactive.power(), Unit.WATT), "", at));
    rows.add(
        new FigureRow(
            "anode peak, reactive load",
            Figures.reading(reactive.anodePeak(), Unit.VOLT),
            "",
            reactive.cutOff() ? "cut off in part of the cycle" : "never cut off"));
    rows.add(
        new FigureRow(
            "peak dissipation",
            Figures.reading(reactive.dissipationPeak(), Unit.WATT),
            "",
            crossing(reactive)));
  }

  private static String crossing(ReactiveAnswer reactive) {
    if (reactive.dissipationLimit().isEmpty()) {
      return "no limit known";
    }
    String limit = Figures.reading(reactive.dissipationLimit().getAsDouble(), Unit.WATT) + " limit";
    double mean = reactive.anodeDissipation().stream().mapToDouble(w -> w).max().orElse(0);
    return (reactive.crossesDissipation() ? "beyond the " : "within the ")
        + limit
        + ", mean "
        + Figures.reading(mean, Unit.WATT);
  }
}
