package perveance.files.toml;

import java.util.ArrayList;
import java.util.Collection;
import java.util.Collections;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import java.util.Optional;

/** A table of a file: its keys in the order of the file. Written by the parser alone. */
public final class TomlTable {
  /** How a table came to be, which decides what may still be added to it and how. */
  public enum Form {
    /** The file itself. */
    ROOT,
    /** Under its own header. */
    HEADER,
    /** Named only as a part of a longer header. */
    IMPLIED,
    /** Made by a dotted key. */
    DOTTED,
    /** In braces. */
    BRACES
  }

  private final String name;
  private final Map<String, TomlEntry> entries = new LinkedHashMap<>();
  private Form form;
  private Span span;
  private boolean damaged;

  TomlTable(String name, Form form, Span span) {
    this.name = name;
    this.form = form;
    this.span = span;
  }

  /**
   * Full name, parts joined by dots; empty for the file itself.
   *
   * @return for example {@code supply.A}
   */
  public String name() {
    return name;
  }

  /**
   * How the table came to be.
   *
   * @return the form
   */
  public Form form() {
    return form;
  }

  /**
   * Where the table is opened: its header, its braces or its first dotted key.
   *
   * @return the place
   */
  public Span span() {
    return span;
  }

  /**
   * Whether a line that belongs here could not be read, so that a key may seem missing without
   * being so.
   *
   * @return true after a fault that was already told
   */
  public boolean damaged() {
    return damaged;
  }

  /**
   * Finds a key.
   *
   * @param key the key
   * @return its entry, or empty
   */
  public Optional<TomlEntry> find(String key) {
    return Optional.ofNullable(entries.get(key));
  }

  /**
   * All entries in the order of the file.
   *
   * @return entries
   */
  public Collection<TomlEntry> entries() {
    return Collections.unmodifiableCollection(entries.values());
  }

  /**
   * The tables under a repeated header.
   *
   * @param key name of the header
   * @return tables in order; empty when there is none of that name
   */
  public List<TomlTable> tables(String key) {
    TomlEntry entry = entries.get(key);
    return entry != null && entry.value() instanceof TomlValue.Tables found
        ? Collections.unmodifiableList(found.tables())
        : List.of();
  }

  /**
   * A table below this one.
   *
   * @param key its name
   * @return the table, or empty
   */
  public Optional<TomlTable> table(String key) {
    TomlEntry entry = entries.get(key);
    return entry != null && entry.value() instanceof TomlValue.Table found
        ? Optional.of(found.table())
        : Optional.empty();
  }

  void put(TomlEntry entry) {
    entries.put(entry.key(), entry);
  }

  void damage() {
    damaged = true;
  }

  /** An implied table gets its own header after all. */
  void open(Span header) {
    form = Form.HEADER;
    span = header;
  }

  /** The place of braces is known only once they close. */
  void close(Span braces) {
    span = braces;
  }

  TomlTable child(String key, Form childForm, Span place) {
    // concat, because linking the + of strings costs milliseconds on a cold start
    return new TomlTable(name.isEmpty() ? key : name.concat(".").concat(key), childForm, place);
  }

  static TomlValue.Tables tablesOf(TomlTable first) {
    List<TomlTable> list = new ArrayList<>();
    list.add(first);
    return new TomlValue.Tables(list);
  }
}
