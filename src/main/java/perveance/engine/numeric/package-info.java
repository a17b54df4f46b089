/**
 * Numerical methods: small dense linear systems for the inner loops (own code, no allocation), and
 * roots, least squares, harmonics, quadrature, differential equations, interpolation and statistics
 * (mostly Apache Commons Math, which nothing outside this package sees).
 */
@NullMarked
package perveance.engine.numeric;

import org.jspecify.annotations.NullMarked;
