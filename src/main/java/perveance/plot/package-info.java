/**
 * Plot descriptions to charts, and the drawn schematic: the same objects for the sheet and the
 * window.
 */
@NullMarked
package perveance.plot;

import org.jspecify.annotations.NullMarked;
