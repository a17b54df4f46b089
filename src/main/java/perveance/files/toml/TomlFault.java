package perveance.files.toml;

import java.util.Optional;

/** A place where the text is not TOML; caught by the parser, which goes on with the next line. */
final class TomlFault extends Exception {
  private static final long serialVersionUID = 1L;

  private final int line;
  private final String found;
  private final String expected;
  private final transient Optional<String> suggestion;

  TomlFault(int line, String found, String expected) {
    this(line, found, expected, Optional.empty());
  }

  TomlFault(int line, String found, String expected, Optional<String> suggestion) {
    super(found, null, false, false);
    this.line = line;
    this.found = found;
    this.expected = expected;
    this.suggestion = suggestion;
  }

  int line() {
    return line;
  }

  String found() {
    return found;
  }

  String expected() {
    return expected;
  }

  Optional<String> suggestion() {
    return suggestion;
  }
}
