/** Commands; the only package that prints. */
@NullMarked
package perveance.cli;

import org.jspecify.annotations.NullMarked;
