/** Proposals: values and devices for a goal. */
@NullMarked
package perveance.engine.search;

import org.jspecify.annotations.NullMarked;
