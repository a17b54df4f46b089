/** Chassis files: read with everything that is wrong told at once, saved with comments kept. */
@NullMarked
package perveance.files.chassis;

import org.jspecify.annotations.NullMarked;
