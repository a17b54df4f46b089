/**
 * The same circuits in a general-purpose circuit simulator (ngspice): netlists with the same laws
 * as behavioural sources, its recorded answers, and the comparison.
 */
@NullMarked
package perveance.reference;

import org.jspecify.annotations.NullMarked;
