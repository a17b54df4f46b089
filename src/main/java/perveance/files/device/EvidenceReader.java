package perveance.files.device;

import java.util.List;
import java.util.OptionalDouble;
import perveance.engine.device.Evidence;
import perveance.files.toml.StrictTable;

/** Reads one piece of evidence of a device file. */
final class EvidenceReader {
  static final List<String> CONNECTIONS = List.of("triode", "pentode", "diode");
  static final List<String> KINDS = List.of("point", "curve", "cut-off");

  private EvidenceReader() {}

  static Evidence read(StrictTable table, String usualConnection) {
    Evidence evidence =
        new Evidence(
            table.word("connection", CONNECTIONS).orElse(usualConnection),
            table.word("kind", KINDS).orElse("point"),
            table.requiredQuantity("anode_voltage", Ranges.ANY_VOLTAGE),
            table.quantity("grid_voltage", Ranges.GRID_VOLTAGE),
            table.quantity("screen_voltage", Ranges.ANY_VOLTAGE),
            table.quantity("anode_current", Ranges.CURRENT_OR_NONE),
            table.quantity("screen_current", Ranges.CURRENT_OR_NONE),
            table.quantity("mu", Ranges.FACTOR),
            table.quantity("ra", Ranges.RESISTANCE),
            table.quantity("gm", Ranges.CONDUCTANCE),
            table.flag("fit").orElse(true),
            table.requiredText("source", "RCA Receiving Tube Manual"),
            table.word("how", RatingsReader.HOW).orElse(""),
            table.word("confidence", RatingsReader.CONFIDENCE).orElse(""),
            table.text("note").orElse(""));
    if (saysNothing(evidence) && !table.table().damaged()) {
      table.complain("anode_current", "no figure", "a current, mu, ra or gm");
    }
    table.refuseOthers();
    return evidence;
  }

  private static boolean saysNothing(Evidence e) {
    boolean current = e.anodeCurrent().isPresent() || e.screenCurrent().isPresent();
    boolean slope = any(e.amplificationFactor(), e.anodeResistance(), e.mutualConductance());
    return !current && !slope && !e.kind().equals("cut-off");
  }

  private static boolean any(OptionalDouble a, OptionalDouble b, OptionalDouble c) {
    return a.isPresent() || b.isPresent() || c.isPresent();
  }
}
