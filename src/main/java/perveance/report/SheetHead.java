package perveance.report;

import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import perveance.app.wording.ChainFigures;
import perveance.app.wording.Figures;
import perveance.engine.analysis.ChassisAnswer;
import perveance.engine.analysis.SignalChain;
import perveance.engine.analysis.SupplyAnswer;
import perveance.engine.base.QuantityFormat;
import perveance.engine.base.Unit;
import perveance.engine.stage.Conditions;

/** Title, conditions and supply of a sheet. */
final class SheetHead {
  private final Typeface faces;
  private final SheetOptions options;
  private final ChassisAnswer answer;

  SheetHead(Typeface faces, SheetOptions options, ChassisAnswer answer) {
    this.faces = faces;
    this.options = options;
    this.answer = answer;
  }

  /** Title with room for job and date. */
  Block title() {
    return new Block() {
      @Override
      public double height(double width) {
        return lines(width).size() * 13 + 15;
      }

      private List<String> lines(double width) {
        return TextBlock.wrap(faces.regular(), answer.chassis().title(), 11, width - 300);
      }

      @Override
      public void draw(Ink ink, double x, double y, double width) {
        ink.text(x, y + 18, faces.bold(), 17, Ink.BLACK, "Build sheet");
        double at = y + 18;
        double left = x + faces.bold().width("Build sheet", 17) + 10;
        for (String line : lines(width)) {
          ink.text(left, at, faces.regular(), 11, Ink.BLACK, line);
          at += 13;
        }
        ink.textRight(
            x + width,
            y + 18,
            faces.regular(),
            9,
            Ink.BLACK,
            "job ______________  printed " + options.date());
      }
    };
  }

  /** What the figures assume, and the supply nodes. */
  List<Block> conditions() {
    List<Block> blocks = new ArrayList<>();
    Conditions c = answer.chassis().conditions();
    blocks.add(
        new TextBlock(
            faces,
            "Conditions",
            options
                .vocabulary()
                .say(
                    String.format(
                        java.util.Locale.ROOT,
                        "mains %s nominal, %s today, %s \u00b7 meter %s \u00b7 no signal \u00b7"
                            + " 20 min warm \u00b7 typical valve, %s resistors \u00b7 bands hold"
                            + " 95 %%",
                        Figures.part(c.mains(), Unit.VOLT),
                        Figures.part(c.mainsActual(), Unit.VOLT),
                        Figures.part(c.mainsFrequency(), Unit.HERTZ),
                        Figures.part(c.meter(), Unit.OHM),
                        Math.round(100 * c.resistorTolerance()) + " %")),
            9,
            Ink.BLACK));
    supply().ifPresent(blocks::add);
    answer.chains().forEach(chain -> blocks.add(path(chain)));
    return blocks;
  }

  private Optional<Block> supply() {
    StringBuilder supply = new StringBuilder();
    for (SupplyAnswer s : answer.supplies()) {
      supply
          .append(supply.isEmpty() ? "" : " \u00b7 ")
          .append(s.name())
          .append(' ')
          .append(QuantityFormat.TYPESET.range(s.low(), s.high(), Unit.VOLT))
          .append(" at ")
          .append(Figures.reading(s.current(), Unit.AMPERE));
      if (s.coldVoltage() > s.voltage() * 1.01) {
        supply.append(", cold ").append(Figures.reading(s.coldVoltage(), Unit.VOLT));
      }
    }
    return supply.isEmpty()
        ? Optional.empty()
        : Optional.of(new TextBlock(faces, "Supply", supply.toString(), 9, Ink.BLACK, false, 6));
  }

  private Block path(SignalChain chain) {
    String told = options.vocabulary().say(ChainFigures.inOneLine(chain));
    return new TextBlock(faces, "Signal", told, 9, Ink.BLACK, false, 6);
  }

  /** Stages that could not be solved, said on paper too. */
  List<Block> failures() {
    List<Block> blocks = new ArrayList<>();
    for (ChassisAnswer.Failure failure : answer.failures()) {
      blocks.add(
          new TextBlock(faces, failure.ref(), "not solved: " + failure.reason(), 9, Ink.BLACK));
    }
    return blocks;
  }
}
