package perveance.plot;

/**
 * An axis.
 *
 * @param label with unit
 * @param low start, in the axis unit [1]
 * @param high end, in the axis unit [1]
 * @param logarithmic whether decades are equally long
 */
public record PlotAxis(String label, double low, double high, boolean logarithmic) {}
