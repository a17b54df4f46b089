package perveance.engine.stage;

import static perveance.engine.stage.StageKeys.ANODE_VOLTAGE;
import static perveance.engine.stage.StageKeys.CATHODE_RESISTOR;
import static perveance.engine.stage.StageKeys.CATHODE_VOLTAGE;
import static perveance.engine.stage.StageKeys.GRID_BIAS;
import static perveance.engine.stage.StageKeys.SCREEN_VOLTAGE;

import perveance.engine.device.DeviceLaw;
import perveance.engine.device.ElectrodeCurrents;

/**
 * An output stage at rest on the electrode voltages that it states, as data sheets do: to cathode,
 * with the rail raised by whatever the cathode, the winding and the screen resistor take.
 *
 * @param cathode cathode to chassis [V]
 * @param anodeCurrent of one valve [A]
 * @param screenCurrent of one valve [A]
 */
record OutputIdle(double cathode, double anodeCurrent, double screenCurrent) {
  /** Halvings of the bracket: 5 kV to below a nanovolt. */
  private static final int HALVINGS = 60;

  private static final double HIGHEST = 5000;

  /** Whether a stage states its electrode voltages instead of a supply. */
  static boolean stated(StageValues values) {
    return values.has(ANODE_VOLTAGE.key());
  }

  /** Screen to cathode at rest; the anode's where it is tied or not stated. */
  static double screenVoltage(StageValues values, String connection) {
    double anode = values.number(ANODE_VOLTAGE.key());
    boolean own = connection.equals(ValveWiring.PENTODE);
    return own ? values.number(SCREEN_VOLTAGE.key(), anode) : anode;
  }

  /**
   * Finds the rest point.
   *
   * @param values a stage that states its electrode voltages
   * @param connection what the screen is joined to
   * @param sharing valves whose current runs through one cathode resistor
   */
  static OutputIdle of(StageValues values, String connection, int sharing) {
    DeviceLaw law = values.device().law();
    double anode = values.number(ANODE_VOLTAGE.key());
    double screen = screenVoltage(values, connection);
    double bias = values.number(GRID_BIAS.key(), 0);
    ElectrodeCurrents out = new ElectrodeCurrents();
    double cathode = values.number(CATHODE_VOLTAGE.key(), 0);
    if (values.has(CATHODE_RESISTOR.key())) {
      double resistance = sharing * values.number(CATHODE_RESISTOR.key());
      double low = 0;
      double high = HIGHEST;
      for (int i = 0; i < HALVINGS; i++) {
        cathode = 0.5 * (low + high);
        law.evaluate(anode, bias - cathode, screen, out);
        boolean above = resistance * out.cathode() > cathode;
        low = above ? cathode : low;
        high = above ? high : cathode;
      }
    }
    law.evaluate(anode, bias - cathode, screen, out);
    return new OutputIdle(
        cathode, out.current(ElectrodeCurrents.ANODE), out.current(ElectrodeCurrents.SCREEN));
  }
}
