/**
 * The device library against everything published that is at hand: laws fitted again and compared,
 * and a table of errors by type and kind of evidence.
 */
@NullMarked
package perveance.accuracy;

import org.jspecify.annotations.NullMarked;
