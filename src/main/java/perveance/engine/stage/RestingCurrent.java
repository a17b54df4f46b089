package perveance.engine.stage;

import perveance.engine.device.DeviceLaw;
import perveance.engine.device.ElectrodeCurrents;

/**
 * Where a device rests on a plain load line, found from its law alone. It tells at which current a
 * diode is to have its stated voltage; the circuit engine gives every answer.
 */
final class RestingCurrent {
  /** Halvings of the bracket: to 1e-12 of the line's end. */
  private static final int HALVINGS = 40;

  private RestingCurrent() {}

  /**
   * The cathode current on the line V = supply - I R.
   *
   * @param law device law
   * @param supply across load and device [V]
   * @param resistance of the load line, zero allowed [ohm]
   * @param grid grid to cathode [V]
   * @param screen screen to cathode [V]
   * @return cathode current, zero when cut off [A]
   */
  static double onLine(
      DeviceLaw law, double supply, double resistance, double grid, double screen) {
    ElectrodeCurrents out = new ElectrodeCurrents();
    double low = 0;
    double high = Math.max(0, supply);
    for (int i = 0; i < HALVINGS; i++) {
      double anode = 0.5 * (low + high);
      law.evaluate(anode, grid, screen, out);
      boolean above = anode + resistance * out.current(ElectrodeCurrents.ANODE) > supply;
      if (above) {
        high = anode;
      } else {
        low = anode;
      }
    }
    law.evaluate(0.5 * (low + high), grid, screen, out);
    return out.cathode();
  }
}
