/** Elements, nodal equations, dc operating point, small signal, noise and periodic steady state. */
@NullMarked
package perveance.engine.circuit;

import org.jspecify.annotations.NullMarked;
