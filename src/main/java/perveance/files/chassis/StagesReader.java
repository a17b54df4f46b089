package perveance.files.chassis;

import java.util.ArrayList;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import perveance.engine.stage.StageEntry;
import perveance.engine.stage.StageKind;
import perveance.engine.stage.StageKinds;
import perveance.files.device.DeviceFiles;
import perveance.files.toml.Problems;
import perveance.files.toml.StrictTable;

/** Reads all stages, each by itself. */
final class StagesReader {
  private final DeviceFiles library;
  private final Problems problems;
  private final List<ReadTable> tables = new ArrayList<>();
  private final List<StageEntry> stages = new ArrayList<>();
  private final Map<String, Integer> lineOfRef = new LinkedHashMap<>();

  StagesReader(DeviceFiles library, Problems problems) {
    this.library = library;
    this.problems = problems;
  }

  void read(StrictTable unnamed) {
    String ref = unnamed.requiredText("ref", "V1a");
    ReadTable read = new ReadTable(unnamed.named(ref.isBlank() ? "stage" : "stage " + ref));
    checkRef(ref, read);
    StrictTable table = read.table();
    table.require("kind", "the kind of stage, such as \"" + StageKinds.all().get(0).name() + "\"");
    String name = table.text("kind").orElse("");
    if (name.isEmpty()) {
      read.told("kind");
    }
    // a kind that is misspelt is told with the other names; the keys are judged by what was meant
    Optional<StageKind> kind =
        StageKinds.find(name).or(() -> StageKinds.nearest(name).flatMap(StageKinds::find));
    tables.add(read);
    stages.add(
        new StageEntry(
            ref,
            name,
            kind.isPresent()
                ? new StageReader(kind.get(), read, library, problems).read()
                : Map.of()));
  }

  private void checkRef(String ref, ReadTable read) {
    if (ref.isBlank()) {
      read.told("ref");
      return;
    }
    int line = read.table().lineOf("ref");
    Integer earlier = lineOfRef.putIfAbsent(ref, line);
    if (earlier != null) {
      read.table()
          .complain(
              "ref",
              "\"" + ref + "\" a second time",
              "a name of its own; it stands in line " + earlier + " already");
      read.told("ref");
    }
  }

  List<ReadTable> tables() {
    return tables;
  }

  List<StageEntry> stages() {
    return stages;
  }
}
