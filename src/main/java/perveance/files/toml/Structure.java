package perveance.files.toml;

import java.util.List;
import java.util.Optional;

/** Finds and makes the tables that headers name, by the rules of TOML on what may be reopened. */
final class Structure {
  private final TomlTable root;

  Structure(TomlTable root) {
    this.root = root;
  }

  /** The table under a {@code [header]}. */
  TomlTable open(List<String> parts, Span header) throws TomlFault {
    TomlTable parent = parent(parts, header);
    String key = parts.get(parts.size() - 1);
    Optional<TomlEntry> existing = parent.find(key);
    if (existing.isEmpty()) {
      TomlTable made = parent.child(key, TomlTable.Form.HEADER, header);
      parent.put(new TomlEntry(key, header, new TomlValue.Table(made)));
      return made;
    }
    if (existing.get().value() instanceof TomlValue.Table found
        && found.table().form() == TomlTable.Form.IMPLIED) {
      found.table().open(header);
      return found.table();
    }
    throw repeated(String.join(".", parts), existing.get(), header.line());
  }

  /** One more table under a {@code [[header]]}. */
  TomlTable append(List<String> parts, Span header) throws TomlFault {
    TomlTable parent = parent(parts, header);
    String key = parts.get(parts.size() - 1);
    TomlTable made = parent.child(key, TomlTable.Form.HEADER, header);
    Optional<TomlEntry> existing = parent.find(key);
    if (existing.isEmpty()) {
      parent.put(new TomlEntry(key, header, TomlTable.tablesOf(made)));
    } else if (existing.get().value() instanceof TomlValue.Tables found) {
      found.tables().add(made);
    } else {
      throw repeated(String.join(".", parts), existing.get(), header.line());
    }
    return made;
  }

  private TomlTable parent(List<String> parts, Span header) throws TomlFault {
    TomlTable at = root;
    for (String part : parts.subList(0, parts.size() - 1)) {
      Optional<TomlEntry> existing = at.find(part);
      if (existing.isEmpty()) {
        TomlTable made = at.child(part, TomlTable.Form.IMPLIED, header);
        at.put(new TomlEntry(part, header, new TomlValue.Table(made)));
        at = made;
      } else {
        at = below(part, existing.get(), header);
      }
    }
    return at;
  }

  private static TomlTable below(String part, TomlEntry entry, Span header) throws TomlFault {
    if (entry.value() instanceof TomlValue.Table found
        && found.table().form() != TomlTable.Form.BRACES) {
      return found.table();
    }
    if (entry.value() instanceof TomlValue.Tables found) {
      return found.tables().get(found.tables().size() - 1);
    }
    throw repeated(part, entry, header.line());
  }

  /** The fault of naming something twice, with both lines. */
  static TomlFault repeated(String name, TomlEntry earlier, int line) {
    return new TomlFault(
        line,
        name + " a second time",
        "it once only; it stands in line " + earlier.line() + " already");
  }
}
