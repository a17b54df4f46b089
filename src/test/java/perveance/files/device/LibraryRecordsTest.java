package perveance.files.device;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertFalse;

import java.io.IOException;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.ArrayList;
import java.util.List;
import java.util.stream.IntStream;
import java.util.stream.Stream;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.MethodSource;
import org.tomlj.Toml;
import org.tomlj.TomlArray;
import org.tomlj.TomlParseResult;
import org.tomlj.TomlTable;

/**
 * Nothing in a shipped device file stands without its source, and what is not known is said. Read
 * with another TOML reader than the program's own.
 */
class LibraryRecordsTest {
  static List<Path> files() throws IOException {
    try (Stream<Path> files = Files.list(Path.of("device-curves"))) {
      return files.filter(f -> f.toString().endsWith(".toml")).sorted().toList();
    }
  }

  @ParameterizedTest
  @MethodSource("files")
  void everyFigureHasItsSource(Path file) throws IOException {
    TomlParseResult device = Toml.parse(file);
    assertFalse(device.hasErrors(), () -> device.errors().toString());
    List<String> bare = new ArrayList<>();
    bare.addAll(lacking(device, "heater", "source", "how"));
    bare.addAll(lacking(device, "rating", "source", "system", "how", "confidence"));
    bare.addAll(lacking(device, "evidence", "source", "how", "confidence"));
    for (String list : List.of("limit", "resistance", "output")) {
      bare.addAll(lacking(device, "rectifier." + list, "source", "how", "confidence"));
    }
    if (device.contains("capacitance") && !device.contains("capacitance.source")) {
      bare.add("capacitance.source");
    }
    if (!device.contains("base_source")) {
      bare.add("base_source");
    }
    assertEquals(List.of(), bare);
  }

  @ParameterizedTest
  @MethodSource("files")
  void whatIsNotKnownIsSaid(Path file) throws IOException {
    TomlParseResult device = Toml.parse(file);
    boolean rectifier = "rectifier".equals(device.getString("kind"));
    List<String> silent = new ArrayList<>();
    for (String part : List.of("base", "heater", "evidence", "law", "fit", "validity")) {
      if (!device.contains(part)) {
        silent.add(part);
      }
    }
    if (!device.contains("pins") && !noted(device, "Pins are not known")) {
      silent.add("pins");
    }
    if (!rectifier && !device.contains("rating")) {
      silent.add("rating");
    }
    if (rectifier && !device.contains("rectifier.limit")) {
      silent.add("rectifier.limit");
    }
    if (!rectifier
        && !device.contains("capacitance")
        && !noted(device, "Capacitances are not known")) {
      silent.add("capacitance");
    }
    assertEquals(List.of(), silent);
  }

  private static List<String> lacking(TomlParseResult device, String tables, String... keys) {
    TomlArray all = device.getArray(tables);
    if (all == null) {
      return List.of();
    }
    List<String> lacking = new ArrayList<>();
    for (int i = 0; i < all.size(); i++) {
      TomlTable one = all.getTable(i);
      for (String key : keys) {
        String value = one.getString(key);
        if (value == null || value.isBlank()) {
          lacking.add(tables + " " + (i + 1) + ": " + key);
        }
      }
    }
    return lacking;
  }

  private static boolean noted(TomlParseResult device, String words) {
    TomlArray notes = device.getArrayOrEmpty("notes");
    return IntStream.range(0, notes.size())
        .anyMatch(i -> String.valueOf(notes.get(i)).startsWith(words));
  }
}
