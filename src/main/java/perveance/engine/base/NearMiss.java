package perveance.engine.base;

import java.util.Collection;
import java.util.Locale;
import java.util.Optional;

/** Finds the known word that a misspelt one was probably meant to be. */
public final class NearMiss {
  private NearMiss() {}

  /**
   * Returns the known word nearest to the given one, if one is near enough to be worth naming: at
   * most one slip in three letters. Case, spaces, hyphens and underscores do not count as slips.
   *
   * @param word what stands there
   * @param known the words that would be right
   * @return the nearest known word; of equally near ones the one that begins most like the given
   *     one, and of those the first
   */
  public static Optional<String> suggest(String word, Collection<String> known) {
    String plain = plain(word);
    int allowed = Math.max(1, plain.length() / 3);
    Optional<String> nearest = Optional.empty();
    int least = allowed + 1;
    int alike = 0;
    for (String candidate : known) {
      String plainCandidate = plain(candidate);
      if (Math.abs(plainCandidate.length() - plain.length()) > Math.min(least, allowed)) {
        continue;
      }
      int slips = slips(plain, plainCandidate);
      int same = sameBeginning(plain, plainCandidate);
      boolean nearer = slips < least || (slips == least && slips <= allowed && same > alike);
      if (nearer && slips < plainCandidate.length()) {
        least = slips;
        alike = same;
        nearest = Optional.of(candidate);
      }
    }
    return nearest;
  }

  private static int sameBeginning(String a, String b) {
    int same = 0;
    while (same < Math.min(a.length(), b.length()) && a.charAt(same) == b.charAt(same)) {
      same++;
    }
    return same;
  }

  private static String plain(String word) {
    String lower = word.length() > 64 ? word.substring(0, 64) : word;
    return lower.toLowerCase(Locale.ROOT).replaceAll("[\\s_-]", "");
  }

  /**
   * Counts the letters to insert, drop, change or swap with their neighbour (optimal string
   * alignment distance).
   */
  static int slips(String a, String b) {
    int[] beforeLast = new int[b.length() + 1];
    int[] last = new int[b.length() + 1];
    int[] row = new int[b.length() + 1];
    for (int j = 0; j <= b.length(); j++) {
      last[j] = j;
    }
    for (int i = 1; i <= a.length(); i++) {
      row[0] = i;
      for (int j = 1; j <= b.length(); j++) {
        int change = a.charAt(i - 1) == b.charAt(j - 1) ? 0 : 1;
        row[j] = Math.min(Math.min(row[j - 1], last[j]) + 1, last[j - 1] + change);
        boolean swapped =
            i > 1
                && j > 1
                && a.charAt(i - 1) == b.charAt(j - 2)
                && a.charAt(i - 2) == b.charAt(j - 1);
        if (swapped) {
          row[j] = Math.min(row[j], beforeLast[j - 2] + 1);
        }
      }
      int[] free = beforeLast;
      beforeLast = last;
      last = row;
      row = free;
    }
    return last[b.length()];
  }
}
