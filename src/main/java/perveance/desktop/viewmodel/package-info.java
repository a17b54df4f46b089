/** What the window shows and does, without a toolkit's scene. */
@NullMarked
package perveance.desktop.viewmodel;

import org.jspecify.annotations.NullMarked;
