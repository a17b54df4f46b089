package perveance.plot;

/**
 * A point in the units of the axes.
 *
 * @param x in the unit of the horizontal axis [1]
 * @param y in the unit of the vertical axis [1]
 */
public record PlotPoint(double x, double y) {}
