package perveance.app.wording;

/**
 * One figure as it is shown.
 *
 * @param label what it is
 * @param value figure with unit
 * @param band 95 % band, empty when none
 * @param note what limits or explains it, may be empty
 */
public record FigureRow(String label, String value, String band, String note) {}
