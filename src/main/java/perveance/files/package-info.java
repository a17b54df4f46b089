/** Files as wholes: written completely or not at all, recovered after a crash. */
@NullMarked
package perveance.files;

import org.jspecify.annotations.NullMarked;
