package perveance.cli;

import java.util.ArrayList;
import java.util.List;
import perveance.app.wording.ChainFigures;
import perveance.app.wording.FigureRow;
import perveance.app.wording.Figures;
import perveance.app.wording.FindingLine;
import perveance.app.wording.FindingLines;
import perveance.app.wording.LimitRows;
import perveance.app.wording.PointRows;
import perveance.app.wording.SafetyBox;
import perveance.app.wording.StageFigures;
import perveance.app.wording.Vocabulary;
import perveance.engine.analysis.ChassisAnswer;
import perveance.engine.analysis.HandSum;
import perveance.engine.analysis.PartDuty;
import perveance.engine.analysis.SignalChain;
import perveance.engine.analysis.StageAnswer;
import perveance.engine.analysis.SupplyAnswer;
import perveance.engine.base.Finding;
import perveance.engine.base.QuantityFormat;
import perveance.engine.base.Unit;

/** The answer for a terminal: read in half a minute, worst first. */
final class TerminalReport {
  private static final int WIDTH = 100;

  private final Ansi ansi;
  private final Vocabulary vocabulary;
  private final boolean explain;
  private final List<String> lines = new ArrayList<>();

  TerminalReport(Ansi ansi, Vocabulary vocabulary, boolean explain) {
    this.ansi = ansi;
    this.vocabulary = vocabulary;
    this.explain = explain;
  }

  /** The whole report, ending with a line end. */
  String print(ChassisAnswer answer) {
    lines.add(ansi.bold(answer.chassis().title()));
    for (String line : TextTable.wrap(say(SafetyBox.of(answer).oneLine()), WIDTH)) {
      lines.add(ansi.red(line));
    }
    lines.add("");
    findings(answer.findings());
    answer.failures().forEach(f -> lines.add(f.ref() + " not solved: " + f.reason()));
    answer.stages().forEach(this::stage);
    answer.chains().forEach(this::chain);
    supplies(answer);
    lines.add("");
    for (String line :
        TextTable.wrap(
            say(
                "Bands hold 95 % of typical valves with the parts as stated: predicted from typical"
                    + " data, not a measurement. Limits are the maker's."),
            WIDTH)) {
      lines.add(ansi.soft(line));
    }
    return String.join("\n", lines) + "\n";
  }

  private void findings(List<Finding> findings) {
    TextTable table = new TextTable(0, WIDTH);
    for (FindingLine line : FindingLines.of(findings)) {
      table.row(line.word(), line.where(), say(line.told()));
    }
    for (String line : table.lines()) {
      lines.add(
          line.startsWith("DANGER") || line.startsWith("OVER LIMIT")
              ? ansi.red(line)
              : line.startsWith("CAUTION") ? ansi.amber(line) : line);
    }
    if (findings.isEmpty()) {
      lines.add("No findings.");
    }
  }

  private void stage(StageAnswer stage) {
    lines.add("");
    String types =
        String.join(
            ", ",
            stage.circuit().devices().stream().map(d -> d.device().type()).distinct().toList());
    lines.add(ansi.bold(stage.ref() + "  " + stage.kind().replace('-', ' ') + ", " + types));
    TextTable table = new TextTable(2, WIDTH);
    PointRows.of(stage).forEach(row -> figure(table, row));
    StageFigures.signal(stage).forEach(row -> figure(table, row));
    LimitRows.of(stage).forEach(row -> figure(table, row));
    lines.addAll(table.lines());
    parts(stage);
    if (explain) {
      sums(stage);
    }
  }

  private void figure(TextTable table, FigureRow row) {
    table.row(say(row.label()), row.value(), row.band(), say(row.note()));
  }

  private void parts(StageAnswer stage) {
    TextTable table = new TextTable(2, WIDTH);
    for (PartDuty duty : stage.parts()) {
      table.row(
          duty.designator(),
          duty.part().key().replace('_', ' '),
          value(duty),
          idle(duty),
          duty.buy().map(this::say).orElse(""));
    }
    lines.addAll(table.lines());
  }

  private static String idle(PartDuty duty) {
    double volts = Math.abs(duty.idleVoltage());
    if (volts < 1e-3) {
      return "no dc";
    }
    return Figures.reading(volts, Unit.VOLT)
        + (duty.idlePower() > 0 ? ", " + Figures.power(duty.idlePower()) : "");
  }

  private static String value(PartDuty duty) {
    return Figures.part(duty.part().value(), duty.part().type().unit());
  }

  private void sums(StageAnswer stage) {
    lines.add("  " + ansi.bold("The sums behind it"));
    TextTable table = new TextTable(2, WIDTH);
    for (HandSum sum : stage.sums()) {
      table.row(say(sum.figure()), sum.formula());
      table.row("", sum.numbers() + " = " + sum.result());
      if (!sum.note().isEmpty()) {
        table.row("", say(sum.note()));
      }
    }
    lines.addAll(table.lines());
    stage.assumptions().forEach(a -> lines.addAll(TextTable.wrap("  " + say(a), WIDTH)));
  }

  private void chain(SignalChain chain) {
    lines.add("");
    lines.add(ansi.bold("Signal path"));
    lines.addAll(TextTable.wrap("  " + say(ChainFigures.sentence(chain)), WIDTH));
    TextTable table = new TextTable(2, WIDTH);
    for (FigureRow row : ChainFigures.rows(chain)) {
      table.row(row.label(), row.value(), row.band(), row.note());
    }
    lines.addAll(table.lines());
  }

  private void supplies(ChassisAnswer answer) {
    if (answer.supplies().isEmpty()) {
      return;
    }
    lines.add("");
    lines.add(ansi.bold("Supply"));
    TextTable table = new TextTable(2, WIDTH);
    for (SupplyAnswer s : answer.supplies()) {
      table.row(
          s.name(),
          Figures.reading(s.voltage(), Unit.VOLT),
          QuantityFormat.TYPESET.range(s.low(), s.high(), Unit.VOLT),
          Figures.reading(s.current(), Unit.AMPERE)
              + ", cold "
              + Figures.reading(s.coldVoltage(), Unit.VOLT));
    }
    lines.addAll(table.lines());
  }

  private String say(String text) {
    return vocabulary.say(text);
  }
}
