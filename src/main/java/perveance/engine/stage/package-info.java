/** Named stages that build a circuit from the values a builder knows; supplies; the chassis. */
@NullMarked
package perveance.engine.stage;

import org.jspecify.annotations.NullMarked;
