/** Device files: read, written, found by any of their names. */
@NullMarked
package perveance.files.device;

import org.jspecify.annotations.NullMarked;
