package perveance.engine.analysis;

import java.util.List;

/**
 * The load lines that a device sees: the Thevenin line of the same circuit.
 *
 * @param ref valve section
 * @param dc dc load line, anode to cathode volts against anode current
 * @param ac ac load line through the operating point; of a pair in push-pull the composite line,
 *     the difference of the two currents against one valve's anode voltage, from the resting
 *     voltage on
 * @param excursion path of the driven or clean swing
 * @param reactive closed path into a reactive load, empty where none is stated
 * @param anode operating point [V]
 * @param current operating point [A]
 * @param dcResistance slope of the dc line [ohm]
 * @param acResistance slope of the ac line [ohm]
 */
public record LoadLineView(
    String ref,
    List<Point> dc,
    List<Point> ac,
    List<Point> excursion,
    List<Point> reactive,
    double anode,
    double current,
    double dcResistance,
    double acResistance) {
  /** Copies the lists. */
  public LoadLineView {
    dc = List.copyOf(dc);
    ac = List.copyOf(ac);
    excursion = List.copyOf(excursion);
    reactive = List.copyOf(reactive);
  }

  /**
   * A point of a line.
   *
   * @param voltage anode to cathode [V]
   * @param current anode current [A]
   */
  public record Point(double voltage, double current) {}
}
