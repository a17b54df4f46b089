package perveance.engine.stage;

import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;

/**
 * Puts the keys of the parts of a stage into one list, each key once, in the order of the parts,
 * and the keys for the ratings of the parts behind them.
 */
final class KeyList {
  private KeyList() {}

  static List<KeySpec> of(List<List<KeySpec>> groups) {
    // by name: hashing a record sets up its methods at run time, which a cold start feels
    Map<String, KeySpec> keys = new LinkedHashMap<>();
    groups.forEach(group -> add(keys, group));
    add(keys, PartRatings.keys(List.copyOf(keys.values())));
    return List.copyOf(keys.values());
  }

  private static void add(Map<String, KeySpec> keys, List<KeySpec> group) {
    group.forEach(spec -> keys.putIfAbsent(spec.key(), spec));
  }
}
