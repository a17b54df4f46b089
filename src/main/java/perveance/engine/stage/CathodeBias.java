package perveance.engine.stage;

import static perveance.engine.stage.StageKeys.CATHODE_BYPASS;
import static perveance.engine.stage.StageKeys.CATHODE_DIODE;
import static perveance.engine.stage.StageKeys.CATHODE_RESISTOR;
import static perveance.engine.stage.StageKeys.CATHODE_VOLTAGE;

import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import perveance.engine.circuit.Element;
import perveance.engine.stage.Drawing.Side;
import perveance.engine.stage.Drawing.SymbolType;
import perveance.engine.stage.StageCircuit.PartType;
import perveance.engine.stage.StageKind.Complaint;

/**
 * What stands between a cathode and chassis: a resistor with or without bypass, a diode, a wire.
 */
final class CathodeBias {
  /** Keys. */
  static final List<KeySpec> KEYS =
      List.of(CATHODE_RESISTOR, CATHODE_BYPASS, CATHODE_VOLTAGE, CATHODE_DIODE);

  /** How far to the right of the cathode its bypass stands. */
  static final int BYPASS = 6;

  private CathodeBias() {}

  /** Whether anything holds the cathode above chassis. */
  static boolean raised(StageValues values) {
    return values.has(CATHODE_RESISTOR.key()) || values.has(CATHODE_VOLTAGE.key());
  }

  static List<Complaint> check(StageValues values) {
    List<Complaint> complaints = new ArrayList<>();
    boolean resistor = values.has(CATHODE_RESISTOR.key());
    boolean diode = values.has(CATHODE_VOLTAGE.key());
    if (resistor && diode) {
      complaints.add(
          new Complaint(
              CATHODE_VOLTAGE.key(),
              "a diode as well as a cathode_resistor",
              "one of the two in the cathode"));
    }
    if (values.has(CATHODE_BYPASS.key()) && !resistor) {
      complaints.add(
          new Complaint(
              CATHODE_BYPASS.key(),
              "a bypass without a cathode_resistor",
              "a cathode_resistor for it to bypass"));
    }
    if (values.has(CATHODE_DIODE.key()) && !diode) {
      complaints.add(
          new Complaint(
              CATHODE_DIODE.key(), "a diode without its voltage", "a cathode_voltage with it"));
    }
    return complaints;
  }

  /** Checks the cathode, and that something makes a bias for a grid that is not held by a stage. */
  static List<Complaint> checkBias(StageValues values) {
    List<Complaint> complaints = new ArrayList<>(check(values));
    boolean biased = raised(values) || values.has(StageKeys.GRID_BIAS.key());
    if (!biased && !values.has(StageKeys.GRID_LEAK.key()) && !GridInput.direct(values)) {
      complaints.add(
          new Complaint(
              StageKeys.GRID_LEAK.key(),
              "nothing that makes the bias",
              "a cathode_resistor, a cathode_voltage, a grid_bias, or a grid_leak for grid-leak"
                  + " bias"));
    }
    return complaints;
  }

  /**
   * Wires the cathode.
   *
   * @param current roughly what flows, at which a diode has its stated voltage [A]
   * @return the cathode's node, chassis when nothing stands between
   */
  static int wire(StageWiring wiring, double current) {
    StageValues values = wiring.values();
    if (!raised(values)) {
      return 0;
    }
    int cathode = wiring.node("cathode");
    if (values.has(CATHODE_RESISTOR.key())) {
      wiring.resistor(CATHODE_RESISTOR, cathode, 0, "cathode resistor");
    }
    if (values.has(CATHODE_BYPASS.key())) {
      wiring.capacitor(CATHODE_BYPASS, cathode, 0, "cathode bypass");
    }
    if (values.has(CATHODE_VOLTAGE.key())) {
      diode(wiring, cathode, current);
    }
    return cathode;
  }

  private static void diode(StageWiring wiring, int cathode, double current) {
    double voltage = wiring.values().number(CATHODE_VOLTAGE.key());
    BiasDiode diode = BiasDiode.choose(voltage, wiring.values().word(CATHODE_DIODE.key()));
    String name = wiring.name(CATHODE_VOLTAGE.key());
    boolean reversed = diode == BiasDiode.ZENER;
    wiring.element(
        new Element.Junction(
            name, reversed ? 0 : cathode, reversed ? cathode : 0, diode.law(voltage, current)));
    wiring.part(
        CATHODE_VOLTAGE.key(),
        CATHODE_VOLTAGE,
        PartType.JUNCTION,
        voltage,
        "cathode " + diode.word());
    wiring.assume(
        "The cathode diode is taken as "
            + diode.inWords()
            + " that has its stated voltage at the working current.");
  }

  /** Draws everything below a cathode terminal. */
  static void sketch(Sketch sketch, int x, int y) {
    sketch(sketch, x, y, "");
  }

  /** Draws what one of two valves has below its cathode. */
  static void sketch(Sketch sketch, int x, int y, String suffix) {
    StageValues values = sketch.values();
    if (!raised(values)) {
      sketch.ground(x, y);
      return;
    }
    sketch.wire(x, y, x, y + 3);
    sketch.mark(x, y + 2, "cathode" + suffix, Side.LEFT);
    if (values.has(CATHODE_RESISTOR.key())) {
      sketch.upright(SymbolType.RESISTOR, x, y + 5, CATHODE_RESISTOR.key() + suffix, Side.LEFT);
    } else {
      Optional<String> word = values.word(CATHODE_DIODE.key());
      BiasDiode diode = BiasDiode.choose(values.number(CATHODE_VOLTAGE.key()), word);
      sketch.upright(diode.symbol(), x, y + 5, CATHODE_VOLTAGE.key(), Side.LEFT);
    }
    sketch.ground(x, y + 7);
    if (values.has(CATHODE_BYPASS.key())) {
      SymbolType type = StageWiring.capacitorSymbol(values, CATHODE_BYPASS);
      sketch.wire(x, y + 2, x + BYPASS, y + 2, x + BYPASS, y + 3);
      sketch.upright(type, x + BYPASS, y + 5, CATHODE_BYPASS.key() + suffix, Side.RIGHT);
      sketch.ground(x + BYPASS, y + 7);
    }
  }
}
