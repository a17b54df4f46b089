package perveance.report;

import java.util.ArrayList;
import java.util.LinkedHashSet;
import java.util.List;
import java.util.Optional;
import java.util.Set;
import perveance.app.wording.Figures;
import perveance.engine.analysis.ChassisAnswer;
import perveance.engine.analysis.StageAnswer;
import perveance.engine.analysis.SupplyAnswer;
import perveance.engine.device.Device;
import perveance.engine.device.Heater;
import perveance.engine.stage.StageCircuit;

/** Points beside the electrodes: the supply nodes that a stage uses, and its heaters. */
final class OtherPoints {
  /** Heaters want 5 % and stand 10 %, common practice [1]. */
  private static final double WANTED = 0.05;

  private static final double STANDS = 0.10;

  private final SheetOptions options;
  private final ChassisAnswer chassis;
  private final StageAnswer stage;

  OtherPoints(SheetOptions options, ChassisAnswer chassis, StageAnswer stage) {
    this.options = options;
    this.chassis = chassis;
    this.stage = stage;
  }

  /** A point: where, what to expect, where to stop. */
  record Point(String where, String expected, String stop) {}

  List<Point> rows() {
    List<Point> points = new ArrayList<>();
    for (SupplyAnswer supply : chassis.supplies()) {
      if (uses(supply.name())) {
        points.add(
            new Point(
                "supply node " + supply.name(),
                Figures.meterRange(supply.low(), supply.high()),
                "record only"));
      }
    }
    Set<Device> devices = new LinkedHashSet<>();
    stage.circuit().devices().stream().map(StageCircuit.StageDevice::device).forEach(devices::add);
    devices.stream()
        .flatMap(d -> heater(chassis, d).stream())
        .map(this::heater)
        .forEach(points::add);
    return points;
  }

  /** How a valve's heater is wired here: to suit the winding, else as its maker names first. */
  static Optional<Heater> heater(ChassisAnswer chassis, Device device) {
    List<Heater> ways = device.heaters();
    return chassis
        .chassis()
        .conditions()
        .heaters()
        .suited(ways)
        .or(() -> ways.stream().findFirst());
  }

  private boolean uses(String supply) {
    return chassis
        .chassis()
        .stage(stage.ref())
        .map(s -> s.settings().values().stream().anyMatch(v -> v.text().equals(supply)))
        .orElse(false);
  }

  private Point heater(Heater heater) {
    double volts = heater.voltage();
    return new Point(
        options.vocabulary().say(heater.directlyHeated() ? "filament" : "heater")
            + (heater.pins().isEmpty() ? "" : ", pins " + heater.pins()),
        Figures.meterRange(volts * (1 - WANTED), volts * (1 + WANTED)),
        "\u2265 " + Figures.reading(volts * (1 + STANDS), perveance.engine.base.Unit.VOLT));
  }
}
