package perveance.engine.stage;

import java.util.List;

/**
 * Puts the keys of the parts of a stage into one list, each key once, in the order of the parts.
 */
final class KeyList {
  private KeyList() {}

  static List<KeySpec> of(List<List<KeySpec>> groups) {
    return groups.stream().flatMap(List::stream).distinct().toList();
  }
}
