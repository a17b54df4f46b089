package perveance.engine.analysis;

import java.util.List;
import java.util.Locale;
import java.util.Map;
import java.util.Optional;
import java.util.OptionalDouble;
import perveance.engine.device.Capacitances;
import perveance.engine.device.Device;
import perveance.engine.device.DeviceLaw;
import perveance.engine.device.DeviceLibrary;
import perveance.engine.device.FitSummary;
import perveance.engine.device.Heater;
import perveance.engine.device.RatingSystem;
import perveance.engine.device.Ratings;
import perveance.engine.device.Validity;

/** A drawer with one type of valve, for tests that state the law themselves. */
final class SampleDevices implements DeviceLibrary {
  private final String type;
  private final Device device;

  SampleDevices(String type, DeviceLaw law) {
    this(type, law, List.of(ratings(type, OptionalDouble.of(10))));
  }

  /** A known type whose file states no anode dissipation. */
  static SampleDevices unrated(String type) {
    DeviceLaw law = Bench.LIBRARY.find(type).orElseThrow().law();
    return new SampleDevices(type, law, List.of(ratings(type, OptionalDouble.empty())));
  }

  private SampleDevices(String type, DeviceLaw law, List<Ratings> ratings) {
    this.type = type.toLowerCase(Locale.ROOT);
    this.device =
        new Device(
            type,
            List.of(),
            1,
            "B9A",
            Map.of("1", "a", "2", "g", "3", "k"),
            List.of(new Heater(6.3, 0.3, "4-5", false)),
            ratings,
            new Capacitances(1.7e-12, 1.6e-12, 0.46e-12),
            List.of(),
            law,
            new FitSummary("stated", 0, 0, List.of(), List.of()),
            new Validity(0, 1000, 0, 1, -100, 10),
            List.of());
  }

  private static Ratings ratings(String type, OptionalDouble dissipation) {
    OptionalDouble none = OptionalDouble.empty();
    return new Ratings(
        type,
        RatingSystem.UNSTATED,
        "stated for the test",
        "stated",
        OptionalDouble.of(1000),
        none,
        dissipation,
        none,
        none,
        none,
        none,
        none,
        none,
        none,
        none);
  }

  @Override
  public Optional<Device> find(String name) {
    return name.toLowerCase(Locale.ROOT).equals(type) ? Optional.of(device) : Optional.empty();
  }

  @Override
  public List<String> names() {
    return List.of(device.type());
  }
}
