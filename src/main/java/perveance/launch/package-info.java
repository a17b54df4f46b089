/** The main class and the wiring: sees everything, decides nothing. */
@NullMarked
package perveance.launch;

import org.jspecify.annotations.NullMarked;
