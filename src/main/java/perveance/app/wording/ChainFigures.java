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
