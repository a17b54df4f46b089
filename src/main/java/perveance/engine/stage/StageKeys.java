package perveance.engine.stage;

import java.util.List;
import perveance.engine.base.Unit;
import perveance.engine.stage.KeySpec.Form;

/**
 * Every key that a stage kind may read, once, with its unit, the range that is physically possible
 * and what it means. A kind picks from here, so that a key means the same in every kind.
 */
final class StageKeys {
  // What the stage is made of and fed from.
  static final KeySpec DEVICE = device("device", "valve").asRequired();
  static final KeySpec DEVICE2 = device("device2", "second valve, where it is another type");
  static final KeySpec REF2 = word("ref2", "name of the second valve on the drawing");
  static final KeySpec SECTIONS =
      new KeySpec(
          "sections", Form.QUANTITY, Unit.RATIO, 1, 6, false, List.of(), "sections in parallel");
  static final KeySpec SUPPLY = supply("supply", "supply node that feeds the stage");
  static final KeySpec SCREEN_SUPPLY = supply("screen_supply", "supply node that feeds the screen");
  static final KeySpec TAIL_SUPPLY = supply("tail_supply", "supply node at the foot of the tail");
  static final KeySpec HEATER_ELEVATION =
      volts("heater_elevation", -5000, 5000, "heater supply to chassis");
  static final KeySpec CONNECTION =
      new KeySpec(
          "connection",
          Form.WORD,
          Unit.RATIO,
          0,
          0,
          false,
          List.of("triode", "pentode", "beam", "tetrode", "ultra-linear"),
          "what the screen is joined to");

  // Anode.
  static final KeySpec ANODE_LOAD = ohms("anode_load", "resistor from the supply to the anode");
  static final KeySpec ANODE_LOAD2 =
      ohms("anode_load2", "resistor from the supply to the second anode");
  static final KeySpec ANODE_CHOKE = henries("anode_choke", "choke from the supply to the anode");
  static final KeySpec CHOKE_RESISTANCE =
      ohms("choke_resistance", "winding resistance of the choke");
  static final KeySpec ANODE_CURRENT =
      amperes("anode_current", "current source from the supply to the anode");
  static final KeySpec CURRENT_SOURCE_RESISTANCE =
      ohms("current_source_resistance", "resistance of the current source for signals");
  static final KeySpec ANODE_VOLTAGE =
      volts("anode_voltage", 1, 5000, "anode to cathode at idle, behind an ideal transformer");

  // Screen.
  static final KeySpec SCREEN_RESISTOR = ohms("screen_resistor", "resistor that feeds the screen");
  static final KeySpec SCREEN_DROPPER =
      ohms("screen_dropper", "resistor that feeds the screens of all valves together");
  static final KeySpec SCREEN_BYPASS = farads("screen_bypass", "capacitor from the screen");
  static final KeySpec SCREEN_VOLTAGE =
      volts("screen_voltage", 1, 5000, "voltage that feeds the screen");
  static final KeySpec TAP = share("tap", "share of the primary at which the screen is tapped");

  // Cathode.
  static final KeySpec CATHODE_RESISTOR =
      ohms("cathode_resistor", "resistor at the cathode that makes the bias");
  static final KeySpec CATHODE_VOLTAGE =
      volts("cathode_voltage", 0.05, 1000, "voltage of the diode at the cathode");
  static final KeySpec CATHODE_DIODE =
      new KeySpec(
          "cathode_diode",
          Form.WORD,
          Unit.RATIO,
          0,
          0,
          false,
          List.of("silicon", "led", "zener"),
          "what makes the cathode voltage");
  static final KeySpec CATHODE_BYPASS =
      farads("cathode_bypass", "capacitor across the cathode resistor");
  static final KeySpec CATHODE_LOAD =
      ohms("cathode_load", "resistor below the cathode that carries the signal");
  static final KeySpec CATHODE_CURRENT =
      amperes("cathode_current", "current source from the cathode");
  static final KeySpec SHARED =
      new KeySpec(
          "shared",
          Form.FLAG,
          Unit.RATIO,
          0,
          0,
          false,
          List.of(),
          "whether both valves share one cathode resistor");
  static final KeySpec TAIL_RESISTOR = ohms("tail_resistor", "resistor of the tail");
  static final KeySpec TAIL_CURRENT = amperes("tail_current", "current source in the tail");

  // Grid.
  static final KeySpec GRID_LEAK = ohms("grid_leak", "resistor from the grid to its bias");
  static final KeySpec GRID_STOPPER = ohms("grid_stopper", "resistor in series with the grid");
  static final KeySpec GRID_BIAS =
      volts("grid_bias", -5000, 5000, "voltage to chassis at the foot of the grid leak");
  static final KeySpec BIAS_SUPPLY =
      volts("bias_supply", -5000, -0.1, "negative voltage that the bias is taken from");
  static final KeySpec BIAS_TOP =
      ohms("bias_top", "resistor from the bias supply to the bias control");
  static final KeySpec BIAS_POT = ohms("bias_pot", "potentiometer that sets the bias");
  static final KeySpec BIAS_BOTTOM =
      ohms("bias_bottom", "resistor from the bias control to chassis");
  static final KeySpec BIAS_HOLD =
      ohms("bias_hold", "resistor from the wiper of the bias control to the bias supply");
  static final KeySpec GRID_BYPASS = farads("grid_bypass", "capacitor from the grid to chassis");
  static final KeySpec SECOND_GRID_LEAK =
      ohms("second_grid_leak", "resistor that biases the second grid");
  static final KeySpec SECOND_GRID_BYPASS =
      farads("second_grid_bypass", "capacitor that holds the second grid still");
  static final KeySpec FEEDBACK_SHUNT =
      ohms("feedback_shunt", "resistor at the foot of the tail where feedback enters");

  // The upper valve of a stack.
  static final KeySpec UPPER_RESISTOR =
      ohms("upper_resistor", "resistor between the two valves that biases the upper one");
  static final KeySpec UPPER_GRID_VOLTAGE =
      volts("upper_grid_voltage", 1, 5000, "voltage to chassis on the upper grid");
  static final KeySpec UPPER_GRID_TOP =
      ohms("upper_grid_top", "resistor from the supply to the upper grid");
  static final KeySpec UPPER_GRID_BOTTOM =
      ohms("upper_grid_bottom", "resistor from the upper grid to chassis");
  static final KeySpec UPPER_GRID_BYPASS =
      farads("upper_grid_bypass", "capacitor that holds the upper grid still");
  static final KeySpec UPPER_GRID_LEAK =
      ohms("upper_grid_leak", "resistor that biases the upper grid");
  static final KeySpec UPPER_COUPLING =
      farads("upper_coupling", "capacitor from the lower anode to the upper grid");
  static final KeySpec LOWER_GRID_LEAK =
      ohms("lower_grid_leak", "resistor from the lower grid to chassis");
  static final KeySpec LOWER_COUPLING =
      farads("lower_coupling", "capacitor from the upper anode to the lower grid");

  // A paraphase pair.
  static final KeySpec DIVIDER_TOP =
      ohms("divider_top", "resistor from the first output to the second grid");
  static final KeySpec DIVIDER_BOTTOM =
      ohms("divider_bottom", "resistor from the second grid to chassis");
  static final KeySpec DIVIDER_SECOND =
      ohms("divider_second", "resistor from the second output to the second grid");

  // What drives it and what it drives.
  static final KeySpec SOURCE = ohms("source", "resistance of what drives the stage");
  static final KeySpec INPUT_COUPLING =
      farads("input_coupling", "capacitor between the source and the stage");
  static final KeySpec COUPLING = farads("coupling", "capacitor from the output to the next stage");
  static final KeySpec LOAD = ohms("load", "resistance of what the stage drives");
  static final KeySpec LOAD2 = ohms("load2", "resistance of what the second output drives");
  static final KeySpec LOAD_CAPACITANCE =
      farads("load_capacitance", "capacitance of what the stage drives");
  static final KeySpec LOAD_INDUCTANCE =
      henries("load_inductance", "inductance in series with the load's resistance");
  static final KeySpec LOAD_FREQUENCY =
      quantity("load_frequency", Unit.HERTZ, 1, 1e6, "frequency for the figures into that load");
  static final KeySpec DRIVES =
      new KeySpec(
          "drives", Form.STAGE, Unit.RATIO, 0, 0, false, List.of(), "stage that the output drives");
  static final KeySpec DRIVE = volts("drive", 1e-6, 5000, "peak input for the driven figures");

  // Output transformer.
  static final KeySpec PRIMARY =
      ohms("primary", "load that the primary presents, anode to anode for a pair");
  static final KeySpec PRIMARY_INDUCTANCE =
      henries("primary_inductance", "inductance of the whole primary");
  static final KeySpec LEAKAGE_INDUCTANCE =
      henries("leakage_inductance", "leakage seen at the whole primary");
  static final KeySpec WINDING_RESISTANCE =
      ohms("winding_resistance", "resistance of the whole primary winding");
  static final KeySpec SECONDARY_RESISTANCE =
      ohms("secondary_resistance", "resistance of the secondary winding");
  static final KeySpec SECONDARY_LOAD = ohms("secondary_load", "load on the secondary");

  // Wiring capacitances.
  static final KeySpec STRAY_GRID_ANODE =
      stray("stray_grid_anode", "wiring capacitance between grid and anode");
  static final KeySpec STRAY_GRID = stray("stray_grid", "wiring capacitance of the grid");
  static final KeySpec STRAY_ANODE = stray("stray_anode", "wiring capacitance of the anode");

  private StageKeys() {}

  private static KeySpec quantity(String key, Unit unit, double low, double high, String meaning) {
    return new KeySpec(key, Form.QUANTITY, unit, low, high, false, List.of(), meaning);
  }

  private static KeySpec ohms(String key, String meaning) {
    return quantity(key, Unit.OHM, 0.01, 100e6, meaning);
  }

  private static KeySpec farads(String key, String meaning) {
    return quantity(key, Unit.FARAD, 1e-12, 1, meaning);
  }

  private static KeySpec stray(String key, String meaning) {
    return quantity(key, Unit.FARAD, 1e-14, 1e-6, meaning);
  }

  private static KeySpec henries(String key, String meaning) {
    return quantity(key, Unit.HENRY, 1e-6, 10e3, meaning);
  }

  private static KeySpec amperes(String key, String meaning) {
    return quantity(key, Unit.AMPERE, 1e-6, 10, meaning);
  }

  private static KeySpec volts(String key, double low, double high, String meaning) {
    return quantity(key, Unit.VOLT, low, high, meaning);
  }

  private static KeySpec share(String key, String meaning) {
    return quantity(key, Unit.RATIO, 0.01, 0.99, meaning);
  }

  private static KeySpec word(String key, String meaning) {
    return new KeySpec(key, Form.WORD, Unit.RATIO, 0, 0, false, List.of(), meaning);
  }

  private static KeySpec device(String key, String meaning) {
    return new KeySpec(key, Form.DEVICE, Unit.RATIO, 0, 0, false, List.of(), meaning);
  }

  private static KeySpec supply(String key, String meaning) {
    return new KeySpec(key, Form.SUPPLY, Unit.RATIO, 0, 0, false, List.of(), meaning);
  }
}
