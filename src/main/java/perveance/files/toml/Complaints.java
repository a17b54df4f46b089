package perveance.files.toml;

import java.util.Optional;

/**
 * Words what is wrong in one table.
 *
 * @param place how messages name the table, may be empty
 * @param source the text it stands in
 * @param problems receives the complaints
 */
record Complaints(String place, SourceText source, Problems problems) {
  /** How messages name a key of the table. */
  String within(String key) {
    if (key.isEmpty()) {
      return place;
    }
    String shown = Cursor.shorten(key);
    return place.isEmpty() ? shown : place.concat(" ").concat(shown);
  }

  void add(Span span, String key, String found, String expected) {
    problems.add(span.line(), within(key), found, expected);
  }

  void add(Span span, String key, String found, String expected, Optional<String> suggestion) {
    problems.add(span.line(), within(key), found, expected, suggestion);
  }

  void refuse(TomlEntry entry, String expected) {
    add(entry.keySpan(), entry.key(), shown(entry.value()), expected);
  }

  String shown(TomlValue value) {
    boolean table = value instanceof TomlValue.Table || value instanceof TomlValue.Tables;
    return table ? value.what() : Cursor.shorten(source.slice(value.span()));
  }
}
