/** The words and rows that terminal, sheet and window show alike. */
@NullMarked
package perveance.app.wording;

import org.jspecify.annotations.NullMarked;
