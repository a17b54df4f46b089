package perveance.engine.analysis;

import java.util.ArrayList;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import java.util.OptionalDouble;
import perveance.engine.circuit.DcSolution;
import perveance.engine.device.Ratings;
import perveance.engine.stage.StageCircuit.StageDevice;
import perveance.engine.stage.StageCircuit.TestPoint;

/** Expected meter readings of a stage, in measuring order. */
final class MeterFigures {
  private static final String BASIS = "predicted from typical data";

  private final DcSolution whole;
  private final double meter;
  private int next = 1;

  /**
   * Readings on a whole chassis; points are counted through it.
   *
   * @param whole dc point of the whole chassis
   * @param meter resistance of the meter [ohm]
   */
  MeterFigures(DcSolution whole, double meter) {
    this.whole = whole;
    this.meter = meter;
  }

  /**
   * Readings of one stage.
   *
   * @param model the stage
   * @param points its operating points
   * @param bands bands of the voltages by node name, empty without bands
   */
  List<ExpectedReading> of(StageModel model, List<DevicePoint> points, Map<String, Band> bands) {
    List<TestPoint> tests = model.stage().testPoints();
    List<Integer> nodes = new ArrayList<>();
    for (TestPoint test : tests) {
      nodes.add(whole.circuit().node(model.circuit().nodes().get(test.node())));
    }
    MeterLoading loading = new MeterLoading(whole, nodes, meter);
    List<ExpectedReading> readings = new ArrayList<>();
    for (int i = 0; i < tests.size(); i++) {
      TestPoint test = tests.get(i);
      String node = whole.circuit().nodes().get(nodes.get(i));
      double truth = whole.voltage(nodes.get(i));
      double reading = loading.reading(i);
      double ratio = truth == 0 ? 1 : reading / truth;
      Optional<Band> band = Optional.ofNullable(bands.get(node));
      readings.add(
          new ExpectedReading(
              next++,
              test.device(),
              test.electrode(),
              pin(model, test),
              node,
              truth,
              reading,
              band.map(b -> b.low() * ratio).orElse(reading),
              band.map(b -> b.high() * ratio).orElse(reading),
              stop(model, test, points),
              BASIS));
    }
    return readings;
  }

  private static String pin(StageModel model, TestPoint test) {
    return model.stage().devices().stream()
        .filter(d -> d.ref().equals(test.device()))
        .findFirst()
        .flatMap(d -> Pins.of(d.device(), d.ref(), test.electrode()))
        .orElse("");
  }

  /** The maker's limit as a reading against chassis, where there is one for this electrode. */
  private static OptionalDouble stop(StageModel model, TestPoint test, List<DevicePoint> points) {
    Optional<DevicePoint> point =
        points.stream().filter(p -> p.ref().equals(test.device())).findFirst();
    if (point.isEmpty()) {
      return OptionalDouble.empty();
    }
    StageDevice device = model.device(test.device());
    Optional<Ratings> ratings = device.device().defaultRatings();
    return ratings.map(r -> stop(r, test, point.get(), model)).orElse(OptionalDouble.empty());
  }

  private static OptionalDouble stop(
      Ratings ratings, TestPoint test, DevicePoint point, StageModel model) {
    return switch (test.electrode()) {
      case "anode" -> plus(ratings.anodeVoltage(), point.cathodeChassis());
      case "screen" -> plus(ratings.screenVoltage(), point.cathodeChassis());
      case "cathode" -> cathodeStop(ratings, point, model);
      default -> OptionalDouble.empty();
    };
  }

  private static OptionalDouble plus(OptionalDouble limit, double cathode) {
    return limit.isPresent()
        ? OptionalDouble.of(limit.getAsDouble() + cathode)
        : OptionalDouble.empty();
  }

  /**
   * Cathode volts at which the current of every valve on the resistor reaches a limit, where a
   * resistor turns one into the other.
   */
  private static OptionalDouble cathodeStop(Ratings r, DevicePoint point, StageModel model) {
    int cathode = model.valve(point.ref()).cathode();
    OptionalDouble resistance = SignalPath.resistance(model, cathode, 0);
    if (resistance.isEmpty() || !(point.anode() > 0)) {
      return OptionalDouble.empty();
    }
    double current = r.cathodeCurrent().orElse(Double.POSITIVE_INFINITY);
    if (r.anodeDissipation().isPresent() && point.anodeCurrent() > 0) {
      double screenShare = point.screenCurrent().orElse(0) / point.anodeCurrent();
      double anodeCurrent = r.anodeDissipation().getAsDouble() / point.anode();
      current = Math.min(current, anodeCurrent * (1 + screenShare));
    }
    long sharing =
        model.stage().devices().stream()
            .filter(d -> model.valve(d.ref()).cathode() == cathode)
            .count();
    return Double.isFinite(current)
        ? OptionalDouble.of(sharing * current * resistance.getAsDouble())
        : OptionalDouble.empty();
  }
}
