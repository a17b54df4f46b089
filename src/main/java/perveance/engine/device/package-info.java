/** Device laws, ratings, evidence and the device record. */
@NullMarked
package perveance.engine.device;

import org.jspecify.annotations.NullMarked;
