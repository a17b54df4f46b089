package perveance.files.chassis;

import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import java.util.function.Function;

/** Tells which thing of before has become which thing of after. */
final class Pairing {
  private Pairing() {}

  /**
   * Pairs by name; what is left over and stands at the same place on both sides was renamed.
   *
   * @return index before by index after; what is new has none
   */
  static <T> Map<Integer, Integer> of(List<T> before, List<T> after, Function<T, String> name) {
    List<String> old = before.stream().map(name).toList();
    List<String> now = after.stream().map(name).toList();
    Map<Integer, Integer> pairs = new LinkedHashMap<>();
    for (int i = 0; i < now.size(); i++) {
      int index = old.indexOf(now.get(i));
      if (index >= 0) {
        pairs.put(i, index);
      } else if (i < old.size() && !now.contains(old.get(i))) {
        pairs.put(i, i);
      }
    }
    return pairs;
  }
}
