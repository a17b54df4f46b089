package perveance.engine.device;

import java.util.ArrayList;
import java.util.List;

/**
 * Anode characteristics of a law: anode current against anode voltage at steps of the grid voltage.
 *
 * @param type device type
 * @param screen screen voltage of the family, zero for a triode; negative when the screen is tied
 *     to the anode [V]
 * @param highestVoltage end of the voltage axis [V]
 * @param highestCurrent end of the current axis [A]
 * @param curves from the most positive grid voltage down
 */
public record CurveFamily(
    String type, double screen, double highestVoltage, double highestCurrent, List<Curve> curves) {
  /** Stands for a screen that follows the anode. */
  public static final double SCREEN_TIED = -1;

  private static final int POINTS = 160;
  private static final int MOST_CURVES = 16;

  /** Copies the list. */
  public CurveFamily {
    curves = List.copyOf(curves);
  }

  /**
   * One curve.
   *
   * @param grid grid to cathode [V]
   * @param points anode voltage and current, rising voltage
   */
  public record Curve(double grid, List<Point> points) {
    /** Copies the list. */
    public Curve {
      points = List.copyOf(points);
    }
  }

  /**
   * A point of a curve.
   *
   * @param anode anode to cathode [V]
   * @param current anode current [A]
   */
  public record Point(double anode, double current) {}

  /**
   * The family with a round step of the grid voltage that gives about ten curves.
   *
   * @param device device
   * @param screen screen voltage, {@link #SCREEN_TIED} or zero for a triode [V]
   * @param highestVoltage end of the voltage axis, above zero [V]
   * @param highestCurrent end of the current axis, above zero [A]
   * @return the family
   */
  public static CurveFamily of(
      Device device, double screen, double highestVoltage, double highestCurrent) {
    if (!(highestVoltage > 0) || !(highestCurrent > 0)) {
      throw new IllegalArgumentException(
          "the axes must end above zero: " + highestVoltage + " V, " + highestCurrent + " A");
    }
    double step = gridStep(device.law(), screen, highestVoltage, highestCurrent);
    List<Curve> curves = new ArrayList<>();
    for (int i = 0; i < MOST_CURVES; i++) {
      Curve curve = curve(device.law(), -i * step, screen, highestVoltage);
      double last = curve.points().get(POINTS).current();
      if (i > 0 && last < 0.004 * highestCurrent) {
        break;
      }
      curves.add(curve);
    }
    return new CurveFamily(device.type(), screen, highestVoltage, highestCurrent, curves);
  }

  private static Curve curve(DeviceLaw law, double grid, double screen, double highest) {
    ElectrodeCurrents out = new ElectrodeCurrents();
    List<Point> points = new ArrayList<>(POINTS + 1);
    for (int i = 0; i <= POINTS; i++) {
      double anode = highest * i / POINTS;
      law.evaluate(anode, grid, screen < 0 ? anode : screen, out);
      points.add(new Point(anode, Math.max(0, out.current(ElectrodeCurrents.ANODE))));
    }
    return new Curve(grid, points);
  }

  /** A round step: the grid range that matters runs from zero to cut-off at the highest voltage. */
  private static double gridStep(DeviceLaw law, double screen, double voltage, double current) {
    ElectrodeCurrents out = new ElectrodeCurrents();
    double reach = 0.25;
    while (reach < 4096) {
      law.evaluate(voltage, -reach, screen < 0 ? voltage : screen, out);
      if (out.current(ElectrodeCurrents.ANODE) < 0.004 * current) {
        break;
      }
      reach *= 1.15;
    }
    double raw = reach / 13;
    double decade = Math.pow(10, Math.floor(Math.log10(raw)));
    for (double nice : new double[] {1, 2, 2.5, 5, 10}) {
      if (raw <= nice * decade * 1.01) {
        return nice * decade;
      }
    }
    return 10 * decade;
  }
}
