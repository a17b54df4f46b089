/** Tests of charts and drawings. */
@org.jspecify.annotations.NullMarked
package perveance.plot;
