/** The build sheet as a PDF: the only package that touches the PDF library. */
@NullMarked
package perveance.report;

import org.jspecify.annotations.NullMarked;
