/** The boundaries between packages and the habits of the sources, as tests without exemptions. */
@NullMarked
package perveance.architecture;

import org.jspecify.annotations.NullMarked;
