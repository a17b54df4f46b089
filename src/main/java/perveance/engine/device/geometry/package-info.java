/** Valve constants from electrode dimensions: perveance, amplification factor, fields, emission. */
@NullMarked
package perveance.engine.device.geometry;

import org.jspecify.annotations.NullMarked;
