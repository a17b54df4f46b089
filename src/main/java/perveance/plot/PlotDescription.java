package perveance.plot;

import java.util.List;

/**
 * A chart as plain data: what tests check and what every output draws.
 *
 * @param title one line; may be empty
 * @param x horizontal axis
 * @param y vertical axis
 * @param series in drawing order
 * @param labels text inside the plot
 */
public record PlotDescription(
    String title, PlotAxis x, PlotAxis y, List<PlotSeries> series, List<Label> labels) {
  /** Copies the lists. */
  public PlotDescription {
    series = List.copyOf(series);
    labels = List.copyOf(labels);
  }

  /**
   * Text at a point.
   *
   * @param text the words
   * @param at where, in axis units
   * @param anchor which corner of the text stands there
   * @param emphasis bold when true
   * @param along where else it may stand, the best first; where nothing of it is free it is left
   *     out. Empty for a text that has to stand
   */
  public record Label(
      String text, PlotPoint at, Anchor anchor, boolean emphasis, List<PlotPoint> along) {
    /** Copies the list. */
    public Label {
      along = List.copyOf(along);
    }

    /**
     * A text that has to stand.
     *
     * @param text the words
     * @param at where, in axis units
     * @param anchor which corner of the text stands there
     * @param emphasis bold when true
     */
    public Label(String text, PlotPoint at, Anchor anchor, boolean emphasis) {
      this(text, at, anchor, emphasis, List.of());
    }
  }

  /** Which corner of a label stands at its point. */
  public enum Anchor {
    /** Text to the right and above. */
    BOTTOM_LEFT,
    /** Text to the left and above. */
    BOTTOM_RIGHT,
    /** Text to the right and below. */
    TOP_LEFT,
    /** Text to the left and below. */
    TOP_RIGHT,
    /** Text to the left, centred in height. */
    CENTRE_RIGHT,
    /** Centred below. */
    TOP_CENTRE
  }
}
