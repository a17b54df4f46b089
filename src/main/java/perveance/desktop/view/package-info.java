/** How it is shown. */
@NullMarked
package perveance.desktop.view;

import org.jspecify.annotations.NullMarked;
