/** Readings of a valve's currents, in a table as spreadsheets and curve tracers write it. */
@NullMarked
package perveance.files.readings;

import org.jspecify.annotations.NullMarked;
