/** Files that describe the electrodes of a valve. */
@NullMarked
package perveance.files.geometry;

import org.jspecify.annotations.NullMarked;
