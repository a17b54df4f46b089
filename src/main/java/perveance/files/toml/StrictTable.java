package perveance.files.toml;

import java.util.ArrayList;
import java.util.LinkedHashSet;
import java.util.List;
import java.util.Optional;
import java.util.OptionalDouble;
import java.util.OptionalInt;
import java.util.Set;
import perveance.engine.base.NearMiss;

/**
 * Reads a table strictly: every value must be of the form asked for and within its range, and what
 * was never asked for is refused at the end. A complaint goes to the list of problems and reading
 * goes on, so each method also says what it returns after a complaint.
 */
public final class StrictTable {
  private final TomlTable table;
  private final Complaints complaints;
  private final Set<String> known = new LinkedHashSet<>();

  /**
   * Starts to read a table.
   *
   * @param table the table
   * @param place how messages name it, may be empty
   * @param source the text it stands in
   * @param problems receives the complaints
   */
  public StrictTable(TomlTable table, String place, SourceText source, Problems problems) {
    this.table = table;
    this.complaints = new Complaints(place, source, problems);
  }

  /**
   * The same table under another name in messages, once its reference is known.
   *
   * @param newPlace how messages name it from now on
   * @return a reader that knows what was asked for already
   */
  public StrictTable named(String newPlace) {
    StrictTable renamed = below(table, newPlace);
    renamed.known.addAll(known);
    return renamed;
  }

  /** The table that is read. */
  public TomlTable table() {
    return table;
  }

  /** The line on which the table is opened, counted from 1. */
  public int line() {
    return table.span().line();
  }

  /**
   * The line on which a key stands.
   *
   * @param key the key
   * @return its line; the table's where the key is absent
   */
  public int lineOf(String key) {
    Optional<TomlEntry> entry = table.find(key);
    return entry.isPresent() ? entry.get().line() : line();
  }

  /**
   * Whether a key stands there, readable or not.
   *
   * @param key the key
   * @return true when it does
   */
  public boolean has(String key) {
    return table.find(key).isPresent();
  }

  /** Accepts a key without reading it yet. */
  public void allow(String key) {
    known.add(key);
  }

  /**
   * Whether a key stands there whose value could not be read, which is told already.
   *
   * @param key the key
   * @return true when it does
   */
  public boolean unreadable(String key) {
    Optional<TomlEntry> entry = table.find(key);
    return entry.isPresent() && entry.get().value() instanceof TomlValue.Unreadable;
  }

  /**
   * A value as text: without the quotes of a text, without the grouping or base of a number.
   *
   * @param key a key that stands there
   * @return its text
   */
  public String written(String key) {
    TomlValue value = table.find(key).orElseThrow().value();
    if (value instanceof TomlValue.Text text) {
      return text.text();
    }
    return value instanceof TomlValue.Whole whole
        ? Long.toString(whole.number())
        : complaints.source().slice(value.span()).replace("_", "");
  }

  /**
   * A text.
   *
   * @param key the key
   * @return the text; empty when absent or after a complaint
   */
  public Optional<String> text(String key) {
    Optional<TomlEntry> entry = entry(key);
    if (entry.isEmpty()) {
      return Optional.empty();
    }
    if (entry.get().value() instanceof TomlValue.Text value) {
      return Optional.of(value.text());
    }
    complaints.refuse(entry.get(), "text in quotes");
    return Optional.empty();
  }

  /**
   * A text that must be there and not be blank.
   *
   * @param key the key
   * @param example what such a text looks like
   * @return the text; an empty one after a complaint
   */
  public String requiredText(String key, String example) {
    require(key, "text, for example \"" + example + "\"");
    Optional<String> text = text(key);
    if (text.isPresent() && text.get().isBlank()) {
      complain(key, "an empty text", "text, for example \"" + example + "\"");
    }
    return text.orElse("");
  }

  /**
   * A word out of a list.
   *
   * @param key the key
   * @param choices the words accepted
   * @return the word; empty when absent or after a complaint
   */
  public Optional<String> word(String key, List<String> choices) {
    Optional<String> word = text(key);
    if (word.isPresent() && !choices.contains(word.get())) {
      complain(
          key,
          "\"" + Cursor.shorten(word.get()) + "\"",
          "one of " + String.join(", ", choices),
          NearMiss.suggest(word.get(), choices));
      return Optional.empty();
    }
    return word;
  }

  /**
   * True or false.
   *
   * @param key the key
   * @return the flag; empty when absent or after a complaint
   */
  public Optional<Boolean> flag(String key) {
    Optional<TomlEntry> entry = entry(key);
    if (entry.isEmpty()) {
      return Optional.empty();
    }
    if (entry.get().value() instanceof TomlValue.Flag value) {
      return Optional.of(value.flag());
    }
    complaints.refuse(entry.get(), "true or false without quotes");
    return Optional.empty();
  }

  /**
   * A whole number.
   *
   * @param key the key
   * @param lowest smallest accepted
   * @param highest largest accepted
   * @return the number; empty when absent or after a complaint
   */
  public OptionalInt whole(String key, int lowest, int highest) {
    Optional<TomlEntry> entry = entry(key);
    if (entry.isEmpty()) {
      return OptionalInt.empty();
    }
    if (entry.get().value() instanceof TomlValue.Whole value
        && value.number() >= lowest
        && value.number() <= highest) {
      return OptionalInt.of((int) value.number());
    }
    complaints.refuse(entry.get(), "a whole number from " + lowest + " to " + highest);
    return OptionalInt.empty();
  }

  /**
   * A number with a unit, or a plain number in that unit.
   *
   * @param key the key
   * @param range its unit and what is accepted
   * @return the value in the unit; empty when absent or after a complaint [1]
   */
  public OptionalDouble quantity(String key, Range range) {
    Optional<TomlEntry> entry = entry(key);
    return entry.isEmpty()
        ? OptionalDouble.empty()
        : QuantityValue.read(entry.get().value(), key, range, complaints);
  }

  /**
   * A quantity that must be there.
   *
   * @param key the key
   * @param range its unit and what is accepted
   * @return the value in the unit; the lowest accepted after a complaint [1]
   */
  public double requiredQuantity(String key, Range range) {
    require(key, range.unit().quantityWord() + ", for example \"" + range.unit().example() + "\"");
    return quantity(key, range).orElse(range.lowest());
  }

  /**
   * A list of texts.
   *
   * @param key the key
   * @return the texts; empty when absent
   */
  public List<String> texts(String key) {
    List<String> texts = new ArrayList<>();
    for (TomlValue value : items(key)) {
      if (value instanceof TomlValue.Text text) {
        texts.add(text.text());
      } else {
        complaints.add(value.span(), key, complaints.shown(value), "text in quotes");
      }
    }
    return texts;
  }

  /**
   * A list of quantities.
   *
   * @param key the key
   * @param range unit and range of each
   * @return those that were in order; empty when absent [in the unit of the range]
   */
  public List<Double> quantities(String key, Range range) {
    List<Double> values = new ArrayList<>();
    for (TomlValue value : items(key)) {
      OptionalDouble number = QuantityValue.read(value, key, range, complaints);
      if (number.isPresent()) {
        values.add(number.getAsDouble());
      }
    }
    return values;
  }

  /**
   * The values of a list.
   *
   * @param key the key
   * @return the values; empty when absent or after a complaint
   */
  public List<TomlValue> items(String key) {
    Optional<TomlEntry> entry = entry(key);
    if (entry.isEmpty()) {
      return List.of();
    }
    if (entry.get().value() instanceof TomlValue.Items value) {
      return value.values();
    }
    complaints.refuse(entry.get(), "a list in square brackets");
    return List.of();
  }

  /**
   * A table below this one.
   *
   * @param key its name
   * @return the table; empty when absent or after a complaint
   */
  public Optional<StrictTable> table(String key) {
    Optional<TomlEntry> entry = entry(key);
    if (entry.isEmpty()) {
      return Optional.empty();
    }
    if (entry.get().value() instanceof TomlValue.Table value) {
      return Optional.of(below(value.table(), complaints.within(key)));
    }
    complaints.refuse(entry.get(), "a table under [" + header(key) + "]");
    return Optional.empty();
  }

  /**
   * The tables under a repeated header.
   *
   * @param key its name
   * @return the tables in order; empty when absent or after a complaint
   */
  public List<StrictTable> tables(String key) {
    Optional<TomlEntry> entry = entry(key);
    if (entry.isEmpty()) {
      return List.of();
    }
    List<StrictTable> tables = new ArrayList<>();
    if (entry.get().value() instanceof TomlValue.Tables value) {
      for (TomlTable one : value.tables()) {
        tables.add(below(one, complaints.within(key)));
      }
    } else {
      complaints.refuse(entry.get(), "tables under [[" + header(key) + "]]");
    }
    return tables;
  }

  /** Complains of every key that was not asked for. */
  public void refuseOthers() {
    for (TomlEntry entry : table.entries()) {
      if (!known.contains(entry.key())) {
        LikelyKeys likely = LikelyKeys.of(entry.key(), known);
        complaints.add(
            entry.keySpan(),
            entry.key(),
            "an unknown key",
            likely.suggestion().isPresent()
                ? "a key that belongs here"
                : "one of " + String.join(", ", likely.keys()),
            likely.suggestion());
      }
    }
  }

  /**
   * Complains when a key is absent, unless its line may be the one that could not be read.
   *
   * @param key the key
   * @param expected what should stand there
   */
  public void require(String key, String expected) {
    known.add(key);
    if (!has(key) && !table.damaged()) {
      complaints.add(table.span(), key, "nothing", expected);
    }
  }

  /**
   * Complains of the value of a key.
   *
   * @param key the key; where it is absent the table's line is named
   * @param found what stands there
   * @param expected what should
   */
  public void complain(String key, String found, String expected) {
    complain(key, found, expected, Optional.empty());
  }

  /**
   * Complains of the value of a key and says what was probably meant.
   *
   * @param key the key; where it is absent the table's line is named
   * @param found what stands there
   * @param expected what should
   * @param suggestion the nearest thing that would be right, if any
   */
  public void complain(String key, String found, String expected, Optional<String> suggestion) {
    Optional<TomlEntry> entry = table.find(key);
    Span span = entry.isPresent() ? entry.get().keySpan() : table.span();
    complaints.add(span, key, found, expected, suggestion);
  }

  private Optional<TomlEntry> entry(String key) {
    known.add(key);
    Optional<TomlEntry> entry = table.find(key);
    return unreadable(key) ? Optional.empty() : entry;
  }

  private StrictTable below(TomlTable other, String otherPlace) {
    return new StrictTable(other, otherPlace, complaints.source(), complaints.problems());
  }

  private String header(String key) {
    return table.name().isEmpty() ? key : table.name() + "." + key;
  }
}
