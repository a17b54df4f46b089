package perveance.engine.analysis;

import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import perveance.engine.circuit.Element;
import perveance.engine.circuit.Element.Resistor;
import perveance.engine.circuit.Element.Valve;
import perveance.engine.stage.StageCircuit.StageDevice;

/** Hand sums of the operating point: Ohm's law at each electrode, and the dissipation. */
final class PointSums {
  private final StageModel model;
  private final List<HandSum> sums = new ArrayList<>();

  PointSums(StageModel model) {
    this.model = model;
  }

  List<HandSum> of(List<DevicePoint> points) {
    for (DevicePoint point : points) {
      StageDevice device =
          model.stage().devices().stream()
              .filter(d -> d.ref().equals(point.ref()))
              .findFirst()
              .orElseThrow();
      Valve valve = model.valve(device.ref());
      anode(point, valve);
      cathode(point, valve);
      dissipation(point);
    }
    return sums;
  }

  private void anode(DevicePoint point, Valve valve) {
    Optional<Resistor> load = only(valve.anode());
    if (load.isEmpty()) {
      return;
    }
    Resistor r = load.get();
    double far = model.dc().voltage(r.a() == valve.anode() ? r.b() : r.a());
    double current = (far - point.anodeChassis()) / r.resistance();
    sums.add(
        new HandSum(
            point.ref() + " anode current",
            "Ia = (Vb - Va) / Ra",
            "("
                + Sum.volts(far)
                + " - "
                + Sum.volts(point.anodeChassis())
                + ") / "
                + Sum.ohms(r.resistance()),
            Sum.amperes(current),
            "Vb is the voltage at the far end of the anode load"));
  }

  private void cathode(DevicePoint point, Valve valve) {
    Optional<Resistor> below = only(valve.cathode());
    if (valve.cathode() == 0 || below.isEmpty()) {
      return;
    }
    Resistor r = below.get();
    double far = model.dc().voltage(r.a() == valve.cathode() ? r.b() : r.a());
    double current = (point.cathodeChassis() - far) / r.resistance();
    sums.add(
        new HandSum(
            point.ref() + " cathode voltage",
            "Vk = Ik Rk",
            Sum.amperes(current) + " x " + Sum.ohms(r.resistance()),
            Sum.volts(current * r.resistance()),
            ""));
  }

  private void dissipation(DevicePoint point) {
    sums.add(
        new HandSum(
            point.ref() + " anode dissipation",
            "Pa = (Va - Vk) Ia",
            "("
                + Sum.volts(point.anodeChassis())
                + " - "
                + Sum.volts(point.cathodeChassis())
                + ") x "
                + Sum.amperes(point.anodeCurrent()),
            Sum.watts(point.anode() * point.anodeCurrent()),
            "voltage to the cathode, not to chassis"));
  }

  /** The only part resistor at a node; a sum needs it to be the only one. */
  private Optional<Resistor> only(int node) {
    List<Resistor> found = new ArrayList<>();
    for (Element element : model.circuit().elements()) {
      if (element instanceof Resistor r
          && (r.a() == node || r.b() == node)
          && PartRoles.isPart(model, r)) {
        found.add(r);
      }
    }
    return found.size() == 1 ? Optional.of(found.get(0)) : Optional.empty();
  }
}
