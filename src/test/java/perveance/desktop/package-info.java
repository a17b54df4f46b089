/** Tests of the desktop: view models without a toolkit, real windows drawn into memory. */
@org.jspecify.annotations.NullMarked
package perveance.desktop;
