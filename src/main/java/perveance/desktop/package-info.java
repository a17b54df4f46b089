/** The desktop: the sheet, alive. */
@NullMarked
package perveance.desktop;

import org.jspecify.annotations.NullMarked;
