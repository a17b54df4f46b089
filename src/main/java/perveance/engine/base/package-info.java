/**
 * The ground everything stands on: quantities with units and how the trade writes them, preferred
 * values, physical constants, findings with their message catalogue, and problems of bad input.
 */
@NullMarked
package perveance.engine.base;

import org.jspecify.annotations.NullMarked;
