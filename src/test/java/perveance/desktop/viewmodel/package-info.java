/** Tests of the view models, without a toolkit. */
@org.jspecify.annotations.NullMarked
package perveance.desktop.viewmodel;
