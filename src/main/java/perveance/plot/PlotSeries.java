package perveance.plot;

import java.util.List;

/**
 * A line or a set of points.
 *
 * @param name for the reader and the legend
 * @param role how it is drawn
 * @param points in order
 */
public record PlotSeries(String name, Role role, List<PlotPoint> points) {
  /** Copies the list. */
  public PlotSeries {
    points = List.copyOf(points);
  }

  /** How a series is drawn. */
  public enum Role {
    /** A characteristic: thin, labelled at its end. */
    CURVE,
    /** Every other characteristic, drawn lighter. */
    MINOR_CURVE,
    /** A limit, dashed. */
    LIMIT,
    /** A place on the axis, such as a corner; not a limit. */
    MARK,
    /** dc load line, full. */
    DC_LINE,
    /** ac load line, dashed. */
    AC_LINE,
    /** What the signal sweeps, heavy. */
    EXCURSION,
    /** Operating point. */
    POINT,
    /** Readings. */
    READINGS,
    /** Readings that the fit distrusts. */
    DISTRUSTED,
    /** Main line of a simple chart. */
    MAIN,
    /** Second line of a simple chart. */
    SECOND,
    /** Third line of a simple chart. */
    THIRD,
    /** Region filled down to zero. */
    REGION
  }
}
