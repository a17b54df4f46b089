package perveance.engine.stage;

import static perveance.engine.stage.StageKeys.LEAKAGE_INDUCTANCE;
import static perveance.engine.stage.StageKeys.LOAD_CAPACITANCE;
import static perveance.engine.stage.StageKeys.LOAD_FREQUENCY;
import static perveance.engine.stage.StageKeys.LOAD_INDUCTANCE;
import static perveance.engine.stage.StageKeys.PRIMARY;
import static perveance.engine.stage.StageKeys.PRIMARY_INDUCTANCE;
import static perveance.engine.stage.StageKeys.SECONDARY_LOAD;
import static perveance.engine.stage.StageKeys.SECONDARY_RESISTANCE;
import static perveance.engine.stage.StageKeys.TAP;
import static perveance.engine.stage.StageKeys.WINDING_RESISTANCE;

import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import perveance.engine.circuit.Element;
import perveance.engine.circuit.Element.Winding;
import perveance.engine.stage.StageCircuit.PartType;

/**
 * The output transformer with its load: the primary presents the stated load to the valves apart
 * from its winding resistance. Where the secondary's load is not stated the load stands on a
 * secondary of equal turns, so that output voltage and resistance are those of the primary.
 */
final class OutputTransformer {
  /** Keys. */
  static final List<KeySpec> KEYS =
      List.of(
          PRIMARY.asRequired(),
          WINDING_RESISTANCE,
          PRIMARY_INDUCTANCE,
          LEAKAGE_INDUCTANCE,
          SECONDARY_LOAD,
          SECONDARY_RESISTANCE,
          LOAD_INDUCTANCE,
          LOAD_CAPACITANCE,
          LOAD_FREQUENCY);

  private final StageWiring wiring;
  private final List<Winding> windings = new ArrayList<>();
  private final double primaryTurns;

  /**
   * A transformer to be wired.
   *
   * @param primaryTurns turns of the whole primary: 1, or 2 for a pair [1]
   */
  OutputTransformer(StageWiring wiring, double primaryTurns) {
    this.wiring = wiring;
    this.primaryTurns = primaryTurns;
  }

  /** Whether the screens are joined to taps of the primary. */
  static boolean tapped(StageValues values) {
    return values.has(TAP.key());
  }

  /**
   * Adds a half or the whole of the primary from the rail to an anode.
   *
   * @param sense 1 when the anode is the start of the winding, -1 when it is the end
   * @return node of the tap, the anode's where there is none
   */
  int primary(int rail, int anode, int sense, String suffix) {
    if (!tapped(wiring.values())) {
      winding(rail, anode, sense, 1);
      return anode;
    }
    int tap = wiring.node("tap" + suffix);
    double share = wiring.values().number(TAP.key());
    winding(rail, tap, sense, share);
    winding(tap, anode, sense, 1 - share);
    return tap;
  }

  private void winding(int near, int far, int sense, double turns) {
    StageValues values = wiring.values();
    double share = turns / primaryTurns;
    double resistance = share * values.number(WINDING_RESISTANCE.key(), 0);
    double leakage = share * values.number(LEAKAGE_INDUCTANCE.key(), 0);
    int start = sense > 0 ? far : near;
    int end = sense > 0 ? near : far;
    windings.add(new Winding(start, end, turns, resistance, leakage));
  }

  /** Adds the secondary with its load and puts the transformer into the circuit. */
  void finish() {
    StageValues values = wiring.values();
    double primary = values.number(PRIMARY.key());
    double load = values.number(SECONDARY_LOAD.key(), primary);
    double turns = primaryTurns * Math.sqrt(load / primary);
    int out = wiring.node("output");
    windings.add(new Winding(out, 0, turns, values.number(SECONDARY_RESISTANCE.key(), 0), 0));
    wiring.element(
        new Element.Transformer(wiring.name(PRIMARY.key()), windings, magnetising(values)));
    wiring.part(PRIMARY.key(), PRIMARY, PartType.TRANSFORMER, primary, "output transformer");
    if (values.has(SECONDARY_LOAD.key())) {
      wiring.resistor(SECONDARY_LOAD, out, 0, "load");
    } else {
      wiring.outerResistor(SECONDARY_LOAD.key(), out, 0, load);
      wiring.assume("The secondary's load is not stated; output figures hold at the primary.");
    }
    if (values.has(LOAD_CAPACITANCE.key())) {
      wiring.stray(LOAD_CAPACITANCE.key(), out, 0, values.number(LOAD_CAPACITANCE.key()));
    }
    wiring.output("output", out, 0, Optional.of(wiring.name(SECONDARY_LOAD.key())));
    assume(values);
  }

  private double magnetising(StageValues values) {
    if (!values.has(PRIMARY_INDUCTANCE.key())) {
      return Double.POSITIVE_INFINITY;
    }
    double first = windings.get(0).turns() / primaryTurns;
    return values.number(PRIMARY_INDUCTANCE.key()) * first * first;
  }

  private void assume(StageValues values) {
    List<String> missing = new ArrayList<>();
    for (KeySpec key : List.of(WINDING_RESISTANCE, PRIMARY_INDUCTANCE, LEAKAGE_INDUCTANCE)) {
      if (!values.has(key.key())) {
        missing.add(key.key());
      }
    }
    if (!missing.isEmpty()) {
      wiring.assume(
          "The transformer is ideal in what is not stated: " + String.join(", ", missing) + ".");
    }
  }

  /** What the primary's resistance takes at rest [V]. */
  static double drop(StageValues values, double currentOfOneSide, double primaryTurns) {
    return values.number(WINDING_RESISTANCE.key(), 0) / primaryTurns * currentOfOneSide;
  }
}
