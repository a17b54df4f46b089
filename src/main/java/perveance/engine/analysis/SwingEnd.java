package perveance.engine.analysis;

import perveance.engine.analysis.CleanSwing.Limit;

/**
 * Where a swing ends on one side.
 *
 * @param source voltage of the source above idle, signed [V]
 * @param input voltage at the stage's input above idle, signed [V]
 * @param output main output above idle [V]
 * @param sign which of the signs of an end it was
 * @param limit what ends it
 * @param at valve section that ends it, which may be of a stage wired straight to this one; empty
 *     for none
 */
record SwingEnd(double source, double input, double output, Sign sign, Limit limit, String at) {
  /** What shows that a swing is at its end. */
  enum Sign {
    /** A grid behind a capacitor, or at a source, begins to draw current. */
    GRID,
    /** A section is down to a tenth of its idle current. */
    CUT_OFF,
    /** The output follows the input half as much as at idle. */
    OUTPUT,
    /** The input follows the source half as much as at idle: what drives it has come to an end. */
    INPUT,
    /** Nothing does within the range tried. */
    NONE
  }
}
