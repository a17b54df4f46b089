package perveance.engine.stage;

import java.util.ArrayList;
import java.util.LinkedHashSet;
import java.util.List;
import java.util.Set;

/**
 * Puts the keys of the parts of a stage into one list, each key once, in the order of the parts,
 * and the keys for the ratings of the parts behind them.
 */
final class KeyList {
  private KeyList() {}

  static List<KeySpec> of(List<List<KeySpec>> groups) {
    Set<KeySpec> keys = new LinkedHashSet<>();
    groups.forEach(keys::addAll);
    keys.addAll(PartRatings.keys(new ArrayList<>(keys)));
    return List.copyOf(keys);
  }
}
