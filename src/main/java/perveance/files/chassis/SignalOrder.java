package perveance.files.chassis;

import java.util.ArrayDeque;
import java.util.ArrayList;
import java.util.Deque;
import java.util.HashMap;
import java.util.HashSet;
import java.util.List;
import java.util.Map;
import java.util.Set;
import perveance.files.toml.StrictTable;

/** Which stage drives which: each one is driven once at most, and none drives itself. */
final class SignalOrder {
  private record Drive(String from, String key, String to) {}

  private final Map<String, StrictTable> tables;
  private final List<Drive> drives = new ArrayList<>();
  private final Map<String, String> driverOf = new HashMap<>();

  SignalOrder(Map<String, StrictTable> tables) {
    this.tables = tables;
  }

  void add(String from, String key, String to) {
    drives.add(new Drive(from, key, to));
    String other = driverOf.putIfAbsent(to, from);
    if (other != null) {
      complain(
          from, key, "\"" + to + "\", which " + other + " drives already", "a stage of its own");
    }
  }

  /** Complains of every stage whose output comes back to its own input. */
  void refuseRings() {
    for (Drive drive : drives) {
      if (reaches(drive.to(), drive.from())) {
        String found = "\"" + drive.to() + "\", which leads back to this stage";
        complain(drive.from(), drive.key(), found, "a stage further down");
      }
    }
  }

  private boolean reaches(String start, String goal) {
    Deque<String> open = new ArrayDeque<>(List.of(start));
    Set<String> seen = new HashSet<>();
    while (!open.isEmpty()) {
      String at = open.pop();
      if (at.equals(goal)) {
        return true;
      }
      if (seen.add(at)) {
        drives.stream().filter(d -> d.from().equals(at)).forEach(d -> open.push(d.to()));
      }
    }
    return false;
  }

  private void complain(String ref, String key, String found, String expected) {
    StrictTable table = tables.get(ref);
    if (table != null) {
      table.complain(key, found, expected);
    }
  }
}
