package perveance.report;

import java.time.LocalDate;
import perveance.app.wording.Vocabulary;

/**
 * How a sheet is printed.
 *
 * @param paper paper size
 * @param vocabulary which words
 * @param zigzag true for zigzag resistors
 * @param date print date
 * @param version program version for the foot
 */
public record SheetOptions(
    PaperSize paper, Vocabulary vocabulary, boolean zigzag, LocalDate date, String version) {}
