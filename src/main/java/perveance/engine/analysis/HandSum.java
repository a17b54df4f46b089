package perveance.engine.analysis;

/**
 * The sum behind a figure with the user's numbers in it.
 *
 * @param figure which figure, for example {@code gain}
 * @param formula in symbols
 * @param numbers the same with numbers
 * @param result the result of the sum, with unit
 * @param note why the engine's figure may differ, may be empty
 */
public record HandSum(String figure, String formula, String numbers, String result, String note) {}
