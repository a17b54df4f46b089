package perveance.engine.device;

import java.util.ArrayList;
import java.util.List;
import perveance.engine.base.QuantityFormat;
import perveance.engine.base.Unit;

/**
 * Anode characteristics of a law: anode current against anode voltage at steps of the grid voltage.
 *
 * @param type device type
 * @param gridless true for a diode, whose only curve is told for a grid of 0 V
 * @param screen screen voltage of the family, zero for a triode; negative when the screen is tied
 *     to the anode [V]
 * @param highestVoltage end of the voltage axis [V]
 * @param highestCurrent end of the current axis [A]
 * @param curves from the most positive grid voltage down
 */
public record CurveFamily(
    String type,
    boolean gridless,
    double screen,
    double highestVoltage,
    double highestCurrent,
    List<Curve> curves) {
  /** Stands for a screen that follows the anode. */
  public static final double SCREEN_TIED = -1;

  private static final int POINTS = 160;
  private static final int FINE_STEPS = 3;
  private static final int FINER = 10;
  private static final int MOST_CURVES = 16;

  /** Copies the list. */
  public CurveFamily {
    curves = List.copyOf(curves);
  }

  /**
   * What the family shows, for a heading.
   *
   * @return the type, with what the screen does where there is one
   */
  public String title() {
    if (screen == 0) {
      return type;
    }
    return screen < 0
        ? type + ", screen tied to the anode"
        : type + ", screen at " + QuantityFormat.TYPESET.reading(screen, Unit.VOLT, 3);
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
   * The family with a round step of the grid voltage that gives about ten curves; of a diode its
   * one curve, told for a grid of 0 V.
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
    List<Curve> curves = new ArrayList<>();
    if (device.law().kind() == LawKind.DIODE) {
      curves.add(curve(device.law(), 0, 0, highestVoltage));
      return new CurveFamily(device.type(), true, 0, highestVoltage, highestCurrent, curves);
    }
    double step = gridStep(device.law(), screen, highestVoltage, highestCurrent);
    for (int i = 0; i < MOST_CURVES; i++) {
      Curve curve = curve(device.law(), -i * step, screen, highestVoltage);
      double last = curve.points().get(curve.points().size() - 1).current();
      if (i > 0 && last < 0.004 * highestCurrent) {
        break;
      }
      curves.add(curve);
    }
    return new CurveFamily(device.type(), false, screen, highestVoltage, highestCurrent, curves);
  }

  private static Curve curve(DeviceLaw law, double grid, double screen, double highest) {
    ElectrodeCurrents out = new ElectrodeCurrents();
    List<Point> points = new ArrayList<>(POINTS + FINE_STEPS * FINER);
    for (double anode : voltages(highest)) {
      law.evaluate(anode, grid, screen < 0 ? anode : screen, out);
      points.add(new Point(anode, Math.max(0, out.current(ElectrodeCurrents.ANODE))));
    }
    return new Curve(grid, points);
  }

  /** Even steps; the first few are finer, because the current rises steeply from nothing there. */
  private static List<Double> voltages(double highest) {
    List<Double> voltages = new ArrayList<>();
    for (int i = 0; i < FINE_STEPS * FINER; i++) {
      voltages.add(highest * i / (POINTS * FINER));
    }
    for (int i = FINE_STEPS; i <= POINTS; i++) {
      voltages.add(highest * i / POINTS);
    }
    return voltages;
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
