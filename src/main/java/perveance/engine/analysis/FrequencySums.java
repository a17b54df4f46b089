package perveance.engine.analysis;

import java.util.ArrayList;
import java.util.List;
import java.util.OptionalDouble;
import perveance.engine.circuit.Element.Capacitor;
import perveance.engine.device.Capacitances;

/** Hand sums of corners and of the input capacitance. */
final class FrequencySums {
  private final StageModel model;
  private final SmallSignalAnswer answer;
  private final List<HandSum> sums = new ArrayList<>();

  FrequencySums(StageModel model, SmallSignalAnswer answer) {
    this.model = model;
    this.answer = answer;
  }

  List<HandSum> all(DevicePoint point, double load) {
    BypassShelf.capacitor(model).ifPresent(c -> shelf(c, point, load));
    PartRoles.coupling(model, model.mainOutput()).ifPresent(this::coupling);
    if (SignalPath.of(model).filter(p -> p.way() == SignalPath.Way.COMMON_CATHODE).isPresent()) {
      miller();
    }
    return sums;
  }

  private void shelf(Capacitor c, DevicePoint point, double load) {
    OptionalDouble below = SignalPath.resistance(model, c.a(), c.b());
    if (below.isEmpty()) {
      return;
    }
    double rk = below.getAsDouble();
    double zero = 1 / (2 * Math.PI * rk * c.capacitance());
    double mu = point.amplificationFactor();
    double rise = 1 + (mu + 1) * rk / (point.anodeResistance() + load);
    sums.add(
        new HandSum(
            "bypass, lower corner",
            "f1 = 1 / (2 pi Rk Ck)",
            "1 / (2 pi x " + Sum.ohms(rk) + " x " + Sum.farads(c.capacitance()) + ")",
            Sum.hertz(zero),
            ""));
    sums.add(
        new HandSum(
            "bypass, upper corner",
            "f2 = f1 (1 + (mu + 1) Rk / (ra + RL))",
            Sum.hertz(zero)
                + " x (1 + "
                + Sum.plain(mu + 1)
                + " x "
                + Sum.ohms(rk)
                + " / ("
                + Sum.ohms(point.anodeResistance())
                + " + "
                + Sum.ohms(load)
                + "))",
            Sum.hertz(zero * rise),
            "f2 / f1 is the height of the shelf, " + Sum.plain(20 * Math.log10(rise)) + " dB"));
  }

  private void coupling(Capacitor c) {
    double far = 1 / OutputLoad.conductance(model, model.mainOutput());
    if (!Double.isFinite(far)) {
      return;
    }
    double corner = 1 / (2 * Math.PI * c.capacitance() * (answer.outputResistance() + far));
    sums.add(
        new HandSum(
            "coupling corner",
            "f = 1 / (2 pi C (Zout + Rg))",
            "1 / (2 pi x "
                + Sum.farads(c.capacitance())
                + " x ("
                + Sum.ohms(answer.outputResistance())
                + " + "
                + Sum.ohms(far)
                + "))",
            Sum.hertz(corner),
            ""));
  }

  private void miller() {
    Capacitances own = model.stage().devices().get(0).device().capacitances();
    double gain = Math.abs(answer.gain());
    double sum = own.gridCathode() + own.gridAnode() * (1 + gain);
    sums.add(
        new HandSum(
            "input capacitance",
            "Cin = Cgk + Cga (1 + |A|)",
            Sum.farads(own.gridCathode())
                + " + "
                + Sum.farads(own.gridAnode())
                + " x (1 + "
                + Sum.plain(gain)
                + ")",
            Sum.farads(sum),
            "wiring comes on top: the engine counts it, with what stands between grid and anode"
                + " multiplied in the same way"));
  }
}
