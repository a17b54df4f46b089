/** What each stage answers: operating point, limits, small signal, overload, start and fault. */
@NullMarked
package perveance.engine.analysis;

import org.jspecify.annotations.NullMarked;
