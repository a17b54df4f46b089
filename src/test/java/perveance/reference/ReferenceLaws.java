package perveance.reference;

import java.util.List;
import java.util.Locale;
import java.util.Map;
import java.util.Optional;
import perveance.engine.device.Capacitances;
import perveance.engine.device.Device;
import perveance.engine.device.DeviceLaw;
import perveance.engine.device.DeviceLibrary;
import perveance.engine.device.FitSummary;
import perveance.engine.device.SpreadPentodeLaw;
import perveance.engine.device.SpreadPentodeParameters;
import perveance.engine.device.SpreadTriodeLaw;
import perveance.engine.device.SpreadTriodeParameters;
import perveance.engine.device.Validity;

/**
 * Devices for the comparison, with constants that stay: near a high-mu and a medium-mu double
 * triode, a power triode, a small pentode and a beam tetrode. The library's own files may be fitted
 * anew without new answers.
 */
final class ReferenceLaws implements DeviceLibrary {
  static final DeviceLaw HIGH_MU = triode(1.13e-3, 0.59, 0.0096, 0.21, 0.3, 3, 3.9e-4, -0.6);
  static final DeviceLaw MEDIUM_MU = triode(1.7e-3, 0.5, 0.052, 0.25, 0.3, 3, 6e-4, -0.6);
  static final DeviceLaw POWER_TRIODE = triode(8e-4, 1, 0.24, 0.15, 2, 5, 3e-4, -0.7);
  static final DeviceLaw SMALL_PENTODE =
      pentode(1.2e-3, 0.6, 0.028, 0.2, 0.3, 4e-4, 0.2, 0.1, 0.1, 0, 0.08, 1.5);
  static final DeviceLaw BEAM_TETRODE =
      pentode(3.3e-3, 0.9, 0.12, 0.1, 0.5, 6e-3, 0.14, 0.6, 0.2, 1.2, 0.12, 3);

  private static final Map<String, Device> DEVICES =
      Map.of(
          "high", device("HIGH", HIGH_MU, new Capacitances(1.7e-12, 1.6e-12, 0.46e-12)),
          "medium", device("MEDIUM", MEDIUM_MU, new Capacitances(1.5e-12, 1.6e-12, 0.5e-12)),
          "power", device("POWER", POWER_TRIODE, new Capacitances(16e-12, 7.5e-12, 5.5e-12)),
          "pentode", device("PENTODE", SMALL_PENTODE, new Capacitances(5e-14, 3.8e-12, 5.3e-12)),
          "beam", device("BEAM", BEAM_TETRODE, new Capacitances(6e-13, 10e-12, 6.5e-12)));

  private static DeviceLaw triode(
      double g, double vc, double d, double s, double c, double turn, double gg, double onset) {
    return new SpreadTriodeLaw(new SpreadTriodeParameters(g, vc, d, s, c, turn, gg, onset, 0.0862));
  }

  private static DeviceLaw pentode(
      double g,
      double vc,
      double d,
      double s,
      double c,
      double l,
      double k,
      double b,
      double x0,
      double r0,
      double knee,
      double n) {
    return new SpreadPentodeLaw(
        new SpreadPentodeParameters(
            g, vc, d, s, c, 0, 1, l, k, b, x0, r0, knee, n, 5e-4, -0.6, 0.0862));
  }

  private static Device device(String type, DeviceLaw law, Capacitances capacitances) {
    return new Device(
        type,
        List.of(),
        2,
        "",
        Map.of(),
        List.of(),
        List.of(),
        capacitances,
        List.of(),
        law,
        new FitSummary("stated", 0, 0, List.of(), List.of()),
        new Validity(0, 1000, 0, 1, -100, 0),
        List.of());
  }

  @Override
  public Optional<Device> find(String name) {
    return Optional.ofNullable(DEVICES.get(name.toLowerCase(Locale.ROOT)));
  }

  @Override
  public List<String> names() {
    return List.copyOf(DEVICES.keySet());
  }
}
