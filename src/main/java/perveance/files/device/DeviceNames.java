package perveance.files.device;

import java.util.ArrayList;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Locale;
import java.util.Map;
import java.util.Optional;
import java.util.OptionalInt;
import perveance.engine.base.BadInputException;
import perveance.engine.base.Problem;
import perveance.files.toml.Problems;
import perveance.files.toml.SourceText;
import perveance.files.toml.StrictTable;
import perveance.files.toml.TomlParser;

/** Which file of a shelf holds which device, told from the heads of the files alone. */
final class DeviceNames {
  private record Claim(String file, String shownFile, int line) {}

  /** Names stand at the top; a file whose aliases reach further is found by its type. */
  private static final int HEAD_BYTES = 4096;

  private final Map<String, Claim> claims = new LinkedHashMap<>();
  private final List<String> names = new ArrayList<>();
  private final List<Problem> problems = new ArrayList<>();

  static DeviceNames of(Shelf shelf) {
    DeviceNames found = new DeviceNames();
    try {
      for (String file : shelf.files()) {
        found.add(shelf, file);
      }
    } catch (BadInputException e) {
      found.problems.addAll(e.problems());
    }
    return found;
  }

  private void add(Shelf shelf, String file) {
    try {
      SourceText head = shelf.readHead(file, HEAD_BYTES);
      add(file, SourceText.of(head.file(), namesAlone(head.text())));
    } catch (BadInputException e) {
      problems.addAll(e.problems());
    }
  }

  private void add(String file, SourceText head) {
    // faults are told when the device is read
    Problems untold = new Problems(head.file());
    StrictTable table = new StrictTable(TomlParser.parse(head, untold), "", head, untold);
    Optional<String> type = table.text("type");
    claim(file, head, table, "type", type.orElse(stem(file)));
    for (String alias : table.texts("aliases")) {
      claim(file, head, table, "aliases", alias);
    }
  }

  /** The lines above the first header that tell names, the others blank, so that lines count. */
  static String namesAlone(String text) {
    StringBuilder names = new StringBuilder();
    boolean within = false;
    int at = 0;
    while (at < text.length() && text.charAt(at) != '[') {
      int end = text.indexOf('\n', at);
      int next = end < 0 ? text.length() : end + 1;
      if (within || text.startsWith("type", at) || text.startsWith("aliases", at)) {
        within = within || text.startsWith("aliases", at);
        names.append(text, at, next);
        int close = text.indexOf(']', at);
        within = within && (close < 0 || close >= next);
      } else {
        names.append('\n');
      }
      at = next;
    }
    return names.toString();
  }

  private void claim(String file, SourceText head, StrictTable table, String key, String name) {
    names.add(name);
    int line = table.lineOf(key);
    Claim earlier = claims.putIfAbsent(plain(name), new Claim(file, head.file(), line));
    // one file may spell a name in two ways, with and without a hyphen
    if (earlier != null && !earlier.file().equals(file)) {
      problems.add(
          new Problem(
              head.file(),
              OptionalInt.of(line),
              key,
              "\"" + name + "\" a second time",
              "a name of one device only; "
                  + (earlier.shownFile() + " claims it in line " + earlier.line()),
              Optional.empty()));
    }
  }

  static String stem(String file) {
    return file.substring(0, file.length() - Shelf.SUFFIX.length());
  }

  /** The file of a device, if one claims the name. */
  Optional<String> fileOf(String name) {
    Claim claim = claims.get(plain(name));
    if (claim == null) {
      // tables and sleeves print both names at once: EL84/6BQ5, 6C45P-E (6S45P)
      claim = claims.get(plain(name.split("[/,(]", 2)[0]));
    }
    return claim == null ? Optional.empty() : Optional.of(claim.file());
  }

  List<String> names() {
    return names;
  }

  List<Problem> problems() {
    return problems;
  }

  /** The name that our own file of a type has. */
  static String fileFor(String type) {
    String lower = type.strip().toLowerCase(Locale.ROOT);
    // a name is typed by a person and must not lead out of the folder
    boolean plainName = lower.indexOf('/') < 0 && lower.indexOf('\\') < 0;
    return (plainName ? lower : "") + Shelf.SUFFIX;
  }

  /** A name without what people write differently: case, spaces, hyphens. */
  static String plain(String name) {
    return name.toLowerCase(Locale.ROOT).replace(" ", "").replace("-", "");
  }
}
