/** Work off the UI thread: only the latest question is answered. */
@NullMarked
package perveance.desktop.task;

import org.jspecify.annotations.NullMarked;
