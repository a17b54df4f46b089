package perveance.files.chassis;

import java.util.HashSet;
import java.util.Set;
import perveance.files.toml.StrictTable;

/** A table of a chassis as far as it was read, so that nothing is complained of twice. */
final class ReadTable {
  private final StrictTable table;
  private final Set<String> told = new HashSet<>();
  private boolean sound = true;

  ReadTable(StrictTable table) {
    this.table = table;
  }

  StrictTable table() {
    return table;
  }

  /** Something in the table was refused, so what is missing or contradictory may only seem so. */
  void unsound() {
    sound = false;
  }

  boolean sound() {
    return sound;
  }

  /** What is wrong with a key is told already. */
  void told(String key) {
    told.add(key);
    sound = false;
  }

  boolean isTold(String key) {
    return told.contains(key);
  }
}
