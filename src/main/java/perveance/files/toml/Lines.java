package perveance.files.toml;

/**
 * The lines of a text, for edits that leave every other character as it is.
 *
 * @param text the text
 */
record Lines(String text) {
  /** The line end that the text uses. */
  String separator() {
    return text.contains("\r\n") ? "\r\n" : "\n";
  }

  /** Where the line begins that holds this offset. */
  int start(int offset) {
    return text.lastIndexOf('\n', offset - 1) + 1;
  }

  /** Where the next line begins; the end of the text on the last line. */
  int next(int offset) {
    int end = text.indexOf('\n', offset);
    return end < 0 ? text.length() : end + 1;
  }

  /** The spaces at the beginning of the line that holds this offset. */
  String indent(int offset) {
    int start = start(offset);
    int at = start;
    while (at < text.length() && (text.charAt(at) == ' ' || text.charAt(at) == '\t')) {
      at++;
    }
    return text.substring(start, at);
  }

  boolean isBlank(int lineStart) {
    return text.substring(lineStart, next(lineStart)).isBlank();
  }

  boolean isComment(int lineStart) {
    return text.substring(lineStart, next(lineStart)).stripLeading().startsWith("#");
  }

  /** Where the comment lines begin that stand right above a line, without a blank between. */
  int withCommentsAbove(int lineStart) {
    int at = lineStart;
    while (at > 0 && isComment(start(at - 1))) {
      at = start(at - 1);
    }
    return at;
  }

  /** Where the comment lines end that stand right below a line, without a blank between. */
  int withCommentsBelow(int nextLine) {
    int at = nextLine;
    while (at < text.length() && isComment(at)) {
      at = next(at);
    }
    return at;
  }
}
