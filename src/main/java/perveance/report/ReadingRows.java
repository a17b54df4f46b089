package perveance.report;

import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import perveance.app.wording.Figures;
import perveance.engine.analysis.ChassisAnswer;
import perveance.engine.analysis.ExpectedReading;
import perveance.engine.analysis.PartDuty;
import perveance.engine.analysis.StageAnswer;
import perveance.engine.base.Unit;

/** Expected meter readings with boxes to write in, and the sums that check them. */
final class ReadingRows {
  private static final double[] SHARES = {0.05, 0.21, 0.16, 0.11, 0.145, 0.145, 0.18};
  private static final double ROW = 23.5;

  /** A limit is left out above this multiple of the highest voltage: mains 10 % high [1]. */
  private static final double UNREACHABLE = 1.1;

  private final Typeface faces;
  private final SheetOptions options;
  private final ChassisAnswer chassis;
  private final StageAnswer stage;

  ReadingRows(Typeface faces, SheetOptions options, ChassisAnswer chassis, StageAnswer stage) {
    this.faces = faces;
    this.options = options;
    this.chassis = chassis;
    this.stage = stage;
  }

  /** Headline, caution at the act, column heads. */
  List<Block> opening() {
    List<Block> blocks = new ArrayList<>();
    blocks.add(
        new TextBlock(
            faces,
            "Readings",
            say(
                "meter minus on chassis, clip it before power, one hand; expected already includes"
                    + " the meter and today's mains"),
            9,
            Ink.BLACK,
            false,
            2));
    if (chassis.highestVoltage() > chassis.chassis().conditions().threshold()) {
      blocks.add(
          new TextBlock(
              faces,
              "DANGER",
              "up to "
                  + Figures.reading(chassis.highestVoltage(), Unit.VOLT)
                  + " while these are taken. Stop here and pass to a qualified person if any step"
                  + " is in doubt.",
              9,
              Ink.BLACK,
              true,
              3));
    }
    blocks.add(columnHeads());
    return blocks;
  }

  private Block columnHeads() {
    return new RowBlock(
        faces,
        SHARES,
        List.of(
            Cell.bold("tp"),
            Cell.bold("where"),
            Cell.bold("expected"),
            Cell.bold("stop at"),
            Cell.bold("first reading"),
            Cell.bold("after repair"),
            Cell.plain("")),
        8.5,
        14,
        0.8);
  }

  /** One row for each point. */
  List<Block> rows() {
    List<Block> rows = new ArrayList<>();
    for (ExpectedReading r : stage.readings()) {
      String pin = r.pin().isEmpty() ? "" : " pin " + r.pin();
      String where =
          r.device().isEmpty()
              ? "supply node " + r.electrode()
              : r.device() + pin + ", " + r.electrode();
      rows.add(
          row(
              Integer.toString(r.testPoint()),
              where,
              Figures.meterRange(r.low(), r.high()),
              stop(r)));
    }
    rows.addAll(new OtherPoints(options, chassis, stage).rows().stream().map(this::row).toList());
    return rows;
  }

  /** The limit as a reading; one far above every voltage in the chassis stops nobody. */
  private String stop(ExpectedReading reading) {
    return reading.stop().stream()
        .filter(v -> v < UNREACHABLE * chassis.highestVoltage())
        .mapToObj(v -> "\u2265 " + Figures.reading(v, Unit.VOLT))
        .findFirst()
        .orElse("record only");
  }

  private Block row(OtherPoints.Point point) {
    return row("", point.where(), point.expected(), point.stop());
  }

  /** Rows without expectation for what else is measured. */
  List<Block> spare() {
    List<Block> rows = new ArrayList<>();
    rows.add(new Spaced(6, new TextBlock(faces, "", "Other readings", 10.5, Ink.BLACK, true, 3)));
    for (int i = 0; i < 4; i++) {
      rows.add(row("", "__________________", "record only", ""));
    }
    return rows;
  }

  private Block row(String point, String where, String expected, String stop) {
    return new RowBlock(
        faces,
        SHARES,
        List.of(
            Cell.bold(point),
            Cell.plain(say(where)),
            Cell.bold(expected),
            Cell.plain(stop),
            Cell.box("V"),
            Cell.box("V"),
            Cell.ticks("in look stop")),
        9.5,
        ROW,
        0.4);
  }

  /** How the readings check each other, with this stage's designators. */
  List<Block> sums() {
    Optional<String> load = designator("anode_load");
    Optional<String> cathode = designator("cathode_resistor");
    if (load.isEmpty() || cathode.isEmpty()) {
      return List.of();
    }
    String text =
        String.format(
            java.util.Locale.ROOT,
            "Ia from %1$s = (supply \u2212 anode) / %1$s = ________ mA  \u00b7  Ik from %2$s ="
                + " cathode / %2$s = ________ mA  \u00b7  ratio ________ near 1: the parts agree;"
                + " away from 1: measure %1$s and %2$s cold.",
            load.get(),
            cathode.get());
    return List.of(new Spaced(5, new TextBlock(faces, "Then", text, 8.5, Ink.BLACK, false, 4)));
  }

  private Optional<String> designator(String key) {
    return stage.parts().stream()
        .filter(p -> p.part().key().equals(key))
        .map(PartDuty::designator)
        .findFirst();
  }

  private String say(String text) {
    return options.vocabulary().say(text);
  }
}
