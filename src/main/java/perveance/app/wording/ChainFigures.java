package perveance.app.wording;

import java.util.ArrayList;
import java.util.List;
import perveance.engine.analysis.SignalChain;
import perveance.engine.base.QuantityFormat;
import perveance.engine.base.Unit;

/** Stages in a row in words: which overloads first, and the level at each of them. */
public final class ChainFigures {
  private ChainFigures() {}

  /**
   * What limits a row of stages, in a sentence.
   *
   * @param chain stages in a row
   * @return for example "V2 overloads first, by grid current at V2a, with 48 mV peak at V1a."
   */
  public static String sentence(SignalChain chain) {
    String at =
        chain.limitedAt().isEmpty() || chain.limitedAt().equals(chain.clipsFirst())
            ? ""
            : " at " + chain.limitedAt();
    return chain.clipsFirst()
        + " overloads first, by "
        + chain.limitedBy().told()
        + at
        + ", with "
        + Figures.reading(chain.inputPeak(), Unit.VOLT)
        + " peak into "
        + chain.links().get(0).ref()
        + "; the last stage then gives "
        + Figures.reading(chain.outputPeak(), Unit.VOLT)
        + " peak.";
  }

  /**
   * The whole path for a line of text: levels between the stages, then what limits it.
   *
   * @param chain stages in a row
   * @return for example "37 mV → V1a ×36 → 1.4 V → V2 ×26 → 35 V peak. V2 overloads first ..."
   */
  public static String inOneLine(SignalChain chain) {
    StringBuilder path = new StringBuilder(level(chain.inputPeak()));
    for (SignalChain.Link link : chain.links()) {
      path.append(" \u2192 ")
          .append(link.ref())
          .append(" \u00d7")
          .append(Figures.reading(Math.abs(link.gain()), Unit.RATIO, 2))
          .append(" \u2192 ")
          .append(level(link.outputPeak()));
    }
    return path + " peak. " + sentence(chain);
  }

  /**
   * What a stage's own headroom is worth in its row.
   *
   * @param chains all rows of the chassis
   * @param ref a stage
   * @return for example "V3 overloads before it"; empty for a stage in no row
   */
  public static String beside(List<SignalChain> chains, String ref) {
    return chains.stream()
        .filter(c -> c.links().stream().anyMatch(l -> l.ref().equals(ref)))
        .findFirst()
        .map(
            c ->
                c.clipsFirst().equals(ref)
                    ? "the first of its row to overload"
                    : c.clipsFirst() + " overloads before it")
        .orElse("");
  }

  private static String level(double volts) {
    return Figures.reading(volts, Unit.VOLT, 2);
  }

  /**
   * One row for each stage: its gain, the levels before and behind it when the first one overloads,
   * and what it has to spare then.
   *
   * @param chain stages in a row
   * @return rows in signal order
   */
  public static List<FigureRow> rows(SignalChain chain) {
    List<FigureRow> rows = new ArrayList<>();
    for (SignalChain.Link link : chain.links()) {
      rows.add(
          new FigureRow(
              link.ref(),
              "gain " + Figures.reading(link.gain(), Unit.RATIO),
              Figures.reading(link.inputPeak(), Unit.VOLT)
                  + " in, "
                  + Figures.reading(link.outputPeak(), Unit.VOLT)
                  + " out",
              link.ref().equals(chain.clipsFirst())
                  ? "overloads first"
                  : QuantityFormat.TYPESET.level(link.spare(), 1) + " to spare"));
    }
    return rows;
  }
}
