package perveance.engine.stage;

import java.util.List;
import java.util.stream.Stream;

/**
 * Puts the keys of the parts of a stage into one list, each key once, in the order of the parts.
 */
final class KeyList {
  private KeyList() {}

  @SafeVarargs
  static List<KeySpec> of(List<KeySpec>... groups) {
    return Stream.of(groups).flatMap(List::stream).distinct().toList();
  }
}
