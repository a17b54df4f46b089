package perveance.accuracy;

import java.util.ArrayList;
import java.util.List;

/** Published pentode stages and rectifier outputs. */
final class PentodeStageAccuracy implements AccuracySource {
  private static final String SHEETS = "RCA and Philips sheets (memory)";

  @Override
  public List<AccuracyLine> lines() {
    List<AccuracyLine> lines = new ArrayList<>();
    List<OutputPentodesTest.Row> single = OutputPentodesTest.singleEnded();
    List<OutputPentodesTest.Row> pair = OutputPentodesTest.pushPull();
    for (String type : new String[] {"EL84", "EL34", "6L6", "6F6", "6V6GT"}) {
      add(lines, type, "class A", single, true);
      add(lines, type, "class A, set the knee of its class:", single, false);
      add(lines, type, "push-pull", pair, true);
    }
    String philips = "Philips EF86 sheet (memory, one row found)";
    lines.add(
        AccuracyLine.relative(
            "EF86",
            "resistance-coupled current",
            false,
            CoupledPentodesTest.currentErrors(),
            philips));
    lines.add(
        AccuracyLine.relative(
            "EF86", "resistance-coupled gain", false, CoupledPentodesTest.gainErrors(), philips));
    for (String type : new String[] {"GZ34", "5Y3GT"}) {
      lines.add(
          AccuracyLine.relative(
              type, "output at the reservoir", false, RectifiersTest.outputErrors(type), SHEETS));
    }
    return lines;
  }

  private static void add(
      List<AccuracyLine> lines,
      String type,
      String kind,
      List<OutputPentodesTest.Row> rows,
      boolean predicted) {
    List<OutputPentodesTest.Row> own =
        rows.stream()
            .filter(row -> row.type().equals(type) && row.predicted() == predicted)
            .toList();
    if (own.isEmpty()) {
      return;
    }
    lines.add(
        AccuracyLine.relative(
            type,
            kind + " power",
            !predicted,
            own.stream().map(OutputPentodesTest.Row::power).toList(),
            SHEETS));
    lines.add(
        AccuracyLine.points(
            type,
            kind + " distortion",
            !predicted,
            own.stream().map(OutputPentodesTest.Row::distortion).toList(),
            SHEETS));
    List<Double> screens = own.stream().flatMap(row -> row.screen().stream().boxed()).toList();
    if (!screens.isEmpty()) {
      lines.add(
          AccuracyLine.relative(
              type, kind + " screen current at drive", !predicted, screens, SHEETS));
    }
  }
}
