package perveance.engine.analysis;

import perveance.engine.analysis.CleanSwing.Limit;

/**
 * Where a swing ends on one side.
 *
 * @param source voltage of the source above idle, signed [V]
 * @param input voltage at the stage's input above idle, signed [V]
 * @param output main output above idle [V]
 * @param limit what ends it
 */
record SwingEnd(double source, double input, double output, Limit limit) {}
