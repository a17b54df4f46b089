/** Tests of the proposals. */
@org.jspecify.annotations.NullMarked
package perveance.engine.search;
