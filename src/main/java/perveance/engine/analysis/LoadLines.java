package perveance.engine.analysis;

import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import perveance.engine.analysis.LoadLineView.Point;
import perveance.engine.device.ElectrodeCurrents;

/** Draws the load lines of a valve from what it sees. */
final class LoadLines {
  /** A line this steep has no end on the current axis worth showing [ohm]. */
  private static final double STEEP = 1;

  /** How far a steep line is drawn, in idle currents [1]. */
  private static final double STEEP_REACH = 10;

  private static final int BENT_POINTS = 9;

  private LoadLines() {}

  /**
   * Both lines through a valve's operating point.
   *
   * @param seen what the valve sees
   * @param ref the valve
   * @param excursion path of the swing
   * @param reactive path into a reactive load
   * @return the view; empty when the circuit without the valve has no answer
   */
  static Optional<LoadLineView> of(
      LoadSeen seen, String ref, List<Point> excursion, List<Point> reactive) {
    double anode = seen.point().voltage(ElectrodeCurrents.ANODE);
    double current = seen.point().current(ElectrodeCurrents.ANODE);
    Optional<Double> open = seen.dcVoltage(0);
    Optional<Double> ac = seen.acResistance();
    if (open.isEmpty() || ac.isEmpty() || !(current > 0)) {
      return Optional.empty();
    }
    double dcResistance = (open.get() - anode) / current;
    List<Point> dc =
        seen.straight() || dcResistance < STEEP
            ? straight(anode, current, dcResistance)
            : bent(seen, open.get(), dcResistance);
    return Optional.of(
        new LoadLineView(
            ref,
            dc,
            straight(anode, seen.composite() ? 0 : current, ac.get()),
            excursion,
            reactive,
            anode,
            current,
            dcResistance,
            ac.get()));
  }

  /** A straight line through the point, from no current to no voltage. */
  private static List<Point> straight(double anode, double current, double resistance) {
    Point foot = new Point(anode + current * resistance, 0);
    double reach = current > 0 ? STEEP_REACH * current : anode / STEEP;
    if (resistance < STEEP || current + anode / resistance > 1e3 * reach) {
      return List.of(foot, new Point(foot.voltage() - reach * resistance, reach));
    }
    return List.of(foot, new Point(0, current + anode / resistance));
  }

  /** A line through solved points, where something else in the circuit is not linear. */
  private static List<Point> bent(LoadSeen seen, double open, double resistance) {
    List<Point> points = new ArrayList<>();
    double end = open / resistance;
    for (int i = 0; i < BENT_POINTS; i++) {
      double at = end * i / (BENT_POINTS - 1);
      Optional<Double> voltage = seen.dcVoltage(at);
      if (voltage.isEmpty()) {
        break;
      }
      points.add(new Point(voltage.get(), at));
      if (voltage.get() < 0) {
        break;
      }
    }
    return points;
  }
}
