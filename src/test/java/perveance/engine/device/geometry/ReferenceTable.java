package perveance.engine.device.geometry;

import java.io.IOException;
import java.io.InputStream;
import java.io.UncheckedIOException;
import java.nio.charset.StandardCharsets;
import java.util.Arrays;
import java.util.List;
import java.util.Objects;

/** Reads the tab-separated tables beside these tests: comment lines, one line of names, numbers. */
final class ReferenceTable {
  private ReferenceTable() {}

  static List<double[]> rows(String name) {
    try (InputStream in =
        Objects.requireNonNull(ReferenceTable.class.getResourceAsStream(name), name)) {
      return new String(in.readAllBytes(), StandardCharsets.UTF_8)
          .lines()
          .filter(line -> !line.startsWith("#"))
          .skip(1)
          .map(line -> Arrays.stream(line.split("\t")).mapToDouble(Double::parseDouble).toArray())
          .toList();
    } catch (IOException e) {
      throw new UncheckedIOException(e);
    }
  }
}
