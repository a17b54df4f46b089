/** Fitting device laws to published evidence and to readings, and scaling them to one valve. */
@NullMarked
package perveance.engine.device.fit;

import org.jspecify.annotations.NullMarked;
