package perveance.engine.analysis;

import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import perveance.engine.analysis.SignalPath.Way;

/**
 * Hand sums of gain and output resistance of a stage with one valve (linear triode, methods of any
 * handbook: A = mu RL / (ra + RL + (mu + 1) Rk) and its relatives).
 */
final class GainSums {
  private final SignalPath path;
  private final DevicePoint point;
  private final double load;

  /**
   * Sums for one valve.
   *
   * @param path how the signal passes it
   * @param point its operating point
   * @param seen mid-band resistance that the valve works into, between anode and cathode [ohm]
   */
  GainSums(SignalPath path, DevicePoint point, double seen) {
    this.path = path;
    this.point = point;
    this.load = seen - path.cathodeResistance();
  }

  List<HandSum> all(Optional<Double> anodeLoad) {
    List<HandSum> sums = new ArrayList<>();
    sums.add(parameters());
    sums.add(gain());
    anodeLoad.ifPresent(ra -> sums.add(outputResistance(ra)));
    return sums;
  }

  private HandSum parameters() {
    double gm = point.mutualConductance();
    double ra = point.anodeResistance();
    return new HandSum(
        point.ref() + " mu",
        "mu = gm ra",
        Sum.siemens(gm) + " x " + Sum.ohms(ra),
        Sum.plain(gm * ra),
        "slopes of the law at the operating point");
  }

  private HandSum gain() {
    double mu = point.amplificationFactor();
    double ra = point.anodeResistance();
    double rk = path.cathodeResistance();
    String m = Sum.plain(mu);
    String m1 = Sum.plain(mu + 1);
    String l = Sum.ohms(load);
    String a = Sum.ohms(ra);
    if (path.way() == Way.FOLLOWER) {
      return gain(
          "A = mu RL / (ra + (mu + 1) RL)",
          m + " x " + l + " / (" + a + " + " + m1 + " x " + l + ")",
          mu * load / (ra + (mu + 1) * load));
    } else if (path.way() == Way.GROUNDED_GRID) {
      return gain(
          "A = (mu + 1) RL / (ra + RL), from the cathode",
          m1 + " x " + l + " / (" + a + " + " + l + ")",
          (mu + 1) * load / (ra + load));
    } else if (rk > 0) {
      return gain(
          "A = -mu RL / (ra + RL + (mu + 1) Rk)",
          Sum.plain(-mu)
              + " x "
              + l
              + " / ("
              + a
              + " + "
              + l
              + " + "
              + m1
              + " x "
              + Sum.ohms(rk)
              + ")",
          -mu * load / (ra + load + (mu + 1) * rk));
    }
    return gain(
        "A = -mu RL / (ra + RL)",
        Sum.plain(-mu) + " x " + l + " / (" + a + " + " + l + ")",
        -mu * load / (ra + load));
  }

  private static HandSum gain(String formula, String numbers, double result) {
    return new HandSum(
        "gain",
        formula,
        numbers,
        Sum.plain(result),
        "RL is what the valve works into at mid-band, without ra; the engine's gain also has the"
            + " loss between source and grid");
  }

  private HandSum outputResistance(double anodeLoad) {
    double mu = point.amplificationFactor();
    double ra = point.anodeResistance();
    double rk = path.cathodeResistance();
    String r = Sum.ohms(anodeLoad);
    if (path.way() == Way.FOLLOWER) {
      double cathode = ra / (mu + 1);
      return new HandSum(
          "output resistance",
          "Zout = Rk || ra / (mu + 1)",
          r + " || " + Sum.ohms(ra) + " / " + Sum.plain(mu + 1),
          Sum.ohms(1 / (1 / anodeLoad + 1 / cathode)),
          "");
    }
    double valve = ra + (mu + 1) * rk;
    return new HandSum(
        "output resistance",
        rk > 0 ? "Zout = Ra || (ra + (mu + 1) Rk)" : "Zout = Ra || ra",
        rk > 0
            ? r + " || (" + Sum.ohms(ra) + " + " + Sum.plain(mu + 1) + " x " + Sum.ohms(rk) + ")"
            : r + " || " + Sum.ohms(ra),
        Sum.ohms(1 / (1 / anodeLoad + 1 / valve)),
        "");
  }
}
