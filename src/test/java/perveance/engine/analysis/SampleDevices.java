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
import perveance.engine.device.SpreadTriodeLaw;
import perveance.engine.device.SpreadTriodeParameters;
import perveance.engine.device.Validity;

/** A drawer of devices for tests that need no file. */
final class SampleDevices implements DeviceLibrary {
  static final DeviceLaw LAW_12AX7 =
      new SpreadTriodeLaw(
          new SpreadTriodeParameters(
              1.16123e-3, 0.618048, 9.2964e-3, 0.406786, 4, 4.0643e-4, -0.6, 0.0862));

  private final Map<String, Device> devices;

  SampleDevices() {
    this(Map.of());
  }

  SampleDevices(Map<String, Device> more) {
    devices = new java.util.LinkedHashMap<>(more);
    devices.putIfAbsent("12ax7", triode("12AX7", LAW_12AX7));
  }

  static Device triode(String type, DeviceLaw law) {
    return new Device(
        type,
        List.of(),
        2,
        "B9A",
        Map.of("1", "a2", "2", "g2", "3", "k2", "6", "a1", "7", "g1", "8", "k1"),
        List.of(new Heater(12.6, 0.15, "4-5", false)),
        List.of(ratings(type)),
        new Capacitances(1.7e-12, 1.6e-12, 0.46e-12),
        List.of(),
        law,
        new FitSummary("stated", 0, 0, List.of(), List.of()),
        new Validity(50, 300, 1e-4, 4e-3, -4, 0),
        List.of());
  }

  private static Ratings ratings(String type) {
    OptionalDouble none = OptionalDouble.empty();
    return new Ratings(
        type,
        RatingSystem.DESIGN_CENTRE,
        "RCA Receiving Tube Manual",
        "memory",
        OptionalDouble.of(300),
        none,
        OptionalDouble.of(1),
        none,
        none,
        none,
        OptionalDouble.of(8e-3),
        OptionalDouble.of(1e6),
        OptionalDouble.of(2.2e6),
        OptionalDouble.of(180),
        OptionalDouble.of(180));
  }

  @Override
  public Optional<Device> find(String name) {
    return Optional.ofNullable(devices.get(name.toLowerCase(Locale.ROOT)));
  }

  @Override
  public List<String> names() {
    return List.copyOf(devices.keySet());
  }
}
