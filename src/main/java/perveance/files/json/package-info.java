/** Answers as JSON: names with their SI unit, what is absent left out. */
@NullMarked
package perveance.files.json;

import org.jspecify.annotations.NullMarked;
