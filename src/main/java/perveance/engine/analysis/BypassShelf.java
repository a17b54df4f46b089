package perveance.engine.analysis;

import java.util.Optional;
import perveance.engine.analysis.SmallSignalAnswer.Shelf;
import perveance.engine.circuit.Element;
import perveance.engine.circuit.Element.Capacitor;
import perveance.engine.circuit.Element.Valve;
import perveance.engine.circuit.SmallSignal;
import perveance.engine.stage.StageCircuit.StageDevice;

/**
 * The shelf of a cathode bypass. One capacitor alone makes a gain (H0 + s R C Hm) / (1 + s R C),
 * where R is the resistance the capacitor sees, H0 the gain without it and Hm the gain with it
 * shorted: the pole is 1 / (2 pi R C), the zero H0/Hm times that, the step Hm/H0. Exact for any
 * circuit; all other capacitors are at mid-band.
 */
final class BypassShelf {
  private BypassShelf() {}

  /** The capacitor between a cathode of the stage and chassis. */
  static Optional<Capacitor> capacitor(StageModel model) {
    for (StageDevice device : model.stage().devices()) {
      Valve valve = model.valve(device.ref());
      for (Element element : model.circuit().elements()) {
        if (element instanceof Capacitor c && PartRoles.isPart(model, c) && bypasses(c, valve)) {
          return Optional.of(c);
        }
      }
    }
    return Optional.empty();
  }

  private static boolean bypasses(Capacitor capacitor, Valve valve) {
    return valve.cathode() != 0
        && ((capacitor.a() == valve.cathode() && capacitor.b() == 0)
            || (capacitor.b() == valve.cathode() && capacitor.a() == 0));
  }

  static Optional<Shelf> of(StageModel model) {
    return capacitor(model).flatMap(c -> shelf(model, c));
  }

  private static Optional<Shelf> shelf(StageModel model, Capacitor capacitor) {
    return WithoutCapacitor.signal(model, capacitor)
        .map(open -> shelf(model, capacitor, open))
        .filter(shelf -> Double.isFinite(shelf.step()) && Double.isFinite(shelf.pole()));
  }

  private static Shelf shelf(StageModel model, Capacitor capacitor, SmallSignal open) {
    double seen = open.midbandOutputResistance(capacitor.a(), capacitor.b());
    double pole = 1 / (2 * Math.PI * seen * capacitor.capacitance());
    int plus = model.mainOutput().plus();
    int minus = model.mainOutput().minus();
    double without = open.midbandGain(model.source(), plus, minus);
    double with = model.signal().midbandGain(model.source(), plus, minus);
    double ratio = Math.abs(without / with);
    return new Shelf(pole * ratio, pole, -20 * Math.log10(ratio));
  }
}
