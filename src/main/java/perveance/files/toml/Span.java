package perveance.files.toml;

/**
 * Where something stands in a text.
 *
 * @param start offset of its first character
 * @param end offset behind its last character
 * @param line line of its first character, counted from 1
 */
public record Span(int start, int end, int line) {}
