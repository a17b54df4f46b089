/** Use cases shared by the command line and the desktop: the chassis document, edits, undo. */
@NullMarked
package perveance.app;

import org.jspecify.annotations.NullMarked;
