package perveance.files.toml;

import java.util.List;

/** A value as it stands in a file, with its place. */
public sealed interface TomlValue {
  /**
   * Where the value stands; for a table, its header.
   *
   * @return the place
   */
  Span span();

  /**
   * What the value is, in words that follow "found" and "expected".
   *
   * @return for example {@code text}
   */
  String what();

  /**
   * A text in quotes.
   *
   * @param text the text without quotes, escapes resolved
   * @param span place of the quoted text
   */
  record Text(String text, Span span) implements TomlValue {
    @Override
    public String what() {
      return "text";
    }
  }

  /**
   * A whole number.
   *
   * @param number the number
   * @param span its place
   */
  record Whole(long number, Span span) implements TomlValue {
    @Override
    public String what() {
      return "a whole number";
    }
  }

  /**
   * A number with a fraction or exponent; may be infinite or NaN, for TOML can say so.
   *
   * @param number the number [1]
   * @param span its place
   */
  record Real(double number, Span span) implements TomlValue {
    @Override
    public String what() {
      return "a number";
    }
  }

  /**
   * True or false.
   *
   * @param flag the value
   * @param span its place
   */
  record Flag(boolean flag, Span span) implements TomlValue {
    @Override
    public String what() {
      return "true or false";
    }
  }

  /**
   * A list in square brackets.
   *
   * @param values the values in order
   * @param span place of the list with its brackets
   */
  record Items(List<TomlValue> values, Span span) implements TomlValue {
    /** Copies the list. */
    public Items {
      values = List.copyOf(values);
    }

    @Override
    public String what() {
      return "a list";
    }
  }

  /**
   * A table, under a header, dotted or in braces.
   *
   * @param table its keys
   */
  record Table(TomlTable table) implements TomlValue {
    @Override
    public Span span() {
      return table.span();
    }

    @Override
    public String what() {
      return "a table";
    }
  }

  /**
   * The tables under one repeated double-bracket header.
   *
   * @param tables the tables in order, at least one; grows while the file is read
   */
  record Tables(List<TomlTable> tables) implements TomlValue {
    @Override
    public Span span() {
      return tables.get(0).span();
    }

    @Override
    public String what() {
      return "a list of tables";
    }
  }

  /**
   * A value that could not be read; the fault is already told, so nobody else complains of it.
   *
   * @param span its place
   */
  record Unreadable(Span span) implements TomlValue {
    @Override
    public String what() {
      return "something unreadable";
    }
  }
}
