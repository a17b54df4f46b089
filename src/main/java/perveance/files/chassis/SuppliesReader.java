package perveance.files.chassis;

import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import java.util.OptionalDouble;
import perveance.engine.stage.Supply;
import perveance.engine.stage.SupplyFeed;
import perveance.files.toml.Problems;
import perveance.files.toml.StrictTable;
import perveance.files.toml.TomlEntry;

/** Reads all supply nodes. */
final class SuppliesReader {
  private final List<ReadTable> tables = new ArrayList<>();
  private final List<Supply> supplies = new ArrayList<>();

  void read(StrictTable all, Problems problems) {
    for (TomlEntry entry : all.table().entries()) {
      String name = entry.key();
      Optional<StrictTable> table = all.table(name);
      if (table.isEmpty()) {
        continue;
      }
      int before = problems.count();
      ReadTable read = new ReadTable(table.get().named("supply " + name));
      Optional<Supply> supply = SupplyReader.read(name, read.table());
      if (problems.count() > before || supply.isEmpty()) {
        read.unsound();
      }
      tables.add(read);
      supplies.add(supply.isEmpty() ? placeOf(name) : supply.get());
    }
  }

  /** Stands for a node that was refused, so that those who name it are not blamed. */
  private static Supply placeOf(String name) {
    return new Supply(
        name, new SupplyFeed.Stated(1), OptionalDouble.empty(), OptionalDouble.empty());
  }

  List<ReadTable> tables() {
    return tables;
  }

  List<Supply> supplies() {
    return supplies;
  }
}
