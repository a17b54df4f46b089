/**
 * TOML text: read with the position of everything, told all faults at once, bound strictly, edited
 * in place with comments and order kept.
 */
@NullMarked
package perveance.files.toml;

import org.jspecify.annotations.NullMarked;
