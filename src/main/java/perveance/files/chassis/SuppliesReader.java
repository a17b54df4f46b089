package perveance.files.chassis;

import java.util.ArrayList;
import java.util.HashSet;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import java.util.Set;
import perveance.engine.base.NearMiss;
import perveance.engine.stage.ChassisComplaint;
import perveance.engine.stage.Supply;
import perveance.engine.stage.SupplyFeed;
import perveance.files.toml.StrictTable;
import perveance.files.toml.TomlEntry;

/** Reads all supply nodes and checks that each one is fed by another that is there. */
final class SuppliesReader {
  private final boolean incomplete;
  private final Map<String, StrictTable> tables = new LinkedHashMap<>();
  private final Map<String, Supply> supplies = new LinkedHashMap<>();

  /**
   * Starts to read.
   *
   * @param incomplete whether a header could not be read, so that a node may only seem to be
   *     missing
   */
  SuppliesReader(boolean incomplete) {
    this.incomplete = incomplete;
  }

  List<Supply> read(StrictTable all) {
    for (TomlEntry entry : all.table().entries()) {
      String name = entry.key();
      Optional<StrictTable> table = all.table(name);
      if (table.isPresent()) {
        tables.put(name, table.get().named("supply " + name));
        SupplyReader.read(name, tables.get(name)).ifPresent(one -> supplies.put(name, one));
      }
    }
    supplies.values().forEach(this::checkFeed);
    return new ArrayList<>(supplies.values());
  }

  /** Names of the nodes that stand in the file, sound or not. */
  Set<String> names() {
    return tables.keySet();
  }

  /** Takes a complaint about the chassis as a whole to the supply that it names. */
  void complain(ChassisComplaint complaint) {
    StrictTable table = tables.get(complaint.name());
    if (table != null) {
      table.complain(
          complaint.key(), complaint.found(), complaint.expected(), complaint.suggestion());
    }
  }

  private void checkFeed(Supply supply) {
    if (!(supply.feed() instanceof SupplyFeed.Dropped fed)) {
      return;
    }
    StrictTable table = tables.get(supply.name());
    if (table == null) {
      return;
    }
    if (incomplete && !names().contains(fed.from())) {
      return;
    }
    if (!names().contains(fed.from())) {
      table.complain(
          "from",
          "\"" + fed.from() + "\"",
          "another supply node: " + String.join(", ", names()),
          NearMiss.suggest(fed.from(), names()));
    } else if (feedsItself(supply)) {
      table.complain("from", "\"" + fed.from() + "\", which is fed from this node", "a node above");
    }
  }

  private boolean feedsItself(Supply supply) {
    Set<String> seen = new HashSet<>();
    Supply at = supply;
    while (at != null && at.feed() instanceof SupplyFeed.Dropped fed) {
      if (fed.from().equals(supply.name())) {
        return true;
      }
      if (!seen.add(at.name())) {
        return false; // a ring further up, which is told there
      }
      at = supplies.get(fed.from());
    }
    return false;
  }
}
