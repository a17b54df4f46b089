package perveance.files.toml;

import java.util.ArrayList;
import java.util.Collection;
import java.util.List;
import java.util.Optional;
import perveance.engine.base.NearMiss;

/**
 * What a person may have meant by a key that does not belong where it stands.
 *
 * @param keys the keys that share a word with it, or all; without those that rate the part of
 *     another key, which would hide the rest
 * @param suggestion the one that was probably meant, if one stands out
 */
record LikelyKeys(List<String> keys, Optional<String> suggestion) {
  private static final List<String> RATING_ENDS = List.of("_power", "_voltage");

  /** Shorter words, such as "to", say nothing. */
  private static final int SHORTEST_WORD = 3;

  static LikelyKeys of(String key, Collection<String> known) {
    List<String> all = new ArrayList<>();
    List<String> akin = new ArrayList<>();
    for (String one : known) {
      if (!rates(one, known)) {
        all.add(one);
        if (sharesWord(key, one)) {
          akin.add(one);
        }
      }
    }
    Optional<String> suggestion = NearMiss.suggest(key, known).or(() -> spelledOut(key, known));
    if (suggestion.isEmpty() && akin.size() == 1) {
      suggestion = Optional.of(akin.get(0));
    }
    return new LikelyKeys(akin.isEmpty() ? all : akin, suggestion);
  }

  private static boolean rates(String key, Collection<String> known) {
    for (String end : RATING_ENDS) {
      if (key.endsWith(end) && known.contains(key.substring(0, key.length() - end.length()))) {
        return true;
      }
    }
    return false;
  }

  private static boolean sharesWord(String key, String known) {
    List<String> words = List.of(known.split("_"));
    for (String word : key.split("_")) {
      if (word.length() >= SHORTEST_WORD && words.contains(word)) {
        return true;
      }
    }
    return false;
  }

  /** The longest known key that the given one only adds words to: cathode_bypass_capacitor. */
  private static Optional<String> spelledOut(String key, Collection<String> known) {
    Optional<String> longest = Optional.empty();
    for (String one : known) {
      if (key.startsWith(one + "_") && one.length() > longest.map(String::length).orElse(0)) {
        longest = Optional.of(one);
      }
    }
    return longest;
  }
}
