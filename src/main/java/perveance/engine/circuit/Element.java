package perveance.engine.circuit;

import perveance.engine.device.DeviceLaw;

/**
 * A circuit element. The current of a two-terminal element is counted from its first node through
 * the element to its second, so that voltage times current is the power it takes; sources that
 * deliver have a negative power.
 *
 * <p>Nodes are numbers handed out by {@link Circuit.Builder#node}; 0 is chassis. The name is the
 * part's key, unique in its circuit, for example {@code V1a.anode_load}.
 */
public sealed interface Element {
  /**
   * Name of the part, unique in the circuit.
   *
   * @return name
   */
  String name();

  /**
   * A resistor.
   *
   * @param name unique name
   * @param a node
   * @param b node
   * @param resistance above zero [ohm]
   */
  record Resistor(String name, int a, int b, double resistance) implements Element {
    /** Checks the value. */
    public Resistor {
      ElementChecks.named(name);
      ElementChecks.positive("resistance", resistance);
    }
  }

  /**
   * A capacitor.
   *
   * @param name unique name
   * @param a node
   * @param b node
   * @param capacitance above zero [F]
   * @param role what it does at audio frequency
   */
  record Capacitor(String name, int a, int b, double capacitance, CapacitorRole role)
      implements Element {
    /** Checks the value. */
    public Capacitor {
      ElementChecks.named(name);
      ElementChecks.positive("capacitance", capacitance);
    }
  }

  /**
   * An inductor with its winding resistance.
   *
   * @param name unique name
   * @param a node
   * @param b node
   * @param inductance above zero [H]
   * @param resistance winding resistance, zero allowed [ohm]
   */
  record Inductor(String name, int a, int b, double inductance, double resistance)
      implements Element {
    /** Checks the values. */
    public Inductor {
      ElementChecks.named(name);
      ElementChecks.positive("inductance", inductance);
      ElementChecks.notNegative("resistance", resistance);
    }
  }

  /**
   * Coupled windings on one core. All winding voltages are in proportion to their turns behind
   * resistance and leakage.
   *
   * @param name unique name
   * @param windings at least two; the first carries the magnetising inductance
   * @param magnetising inductance seen at the first winding; positive infinity for an ideal core
   *     [H]
   */
  record Transformer(String name, java.util.List<Winding> windings, double magnetising)
      implements Element {
    /** Copies the list and checks the values. */
    public Transformer {
      ElementChecks.named(name);
      windings = java.util.List.copyOf(windings);
      if (windings.size() < 2) {
        throw new IllegalArgumentException("windings of " + name + ": " + windings.size());
      }
      if (!(magnetising > 0)) {
        throw new IllegalArgumentException("magnetising is not above zero: " + magnetising);
      }
    }
  }

  /**
   * One winding.
   *
   * @param start node at the dot
   * @param end node
   * @param turns relative turns, above zero [1]
   * @param resistance winding resistance, zero allowed [ohm]
   * @param leakage leakage inductance of this winding, zero allowed [H]
   */
  record Winding(int start, int end, double turns, double resistance, double leakage) {
    /** Checks the values. */
    public Winding {
      ElementChecks.positive("turns", turns);
      ElementChecks.notNegative("resistance", resistance);
      ElementChecks.notNegative("leakage", leakage);
    }
  }

  /**
   * A voltage source; also the input of a stage.
   *
   * @param name unique name
   * @param plus node
   * @param minus node
   * @param voltage dc value [V]
   */
  record VoltageSource(String name, int plus, int minus, double voltage) implements Element {
    /** Checks the value. */
    public VoltageSource {
      ElementChecks.named(name);
      ElementChecks.finite("voltage", voltage);
    }
  }

  /**
   * A current source.
   *
   * @param name unique name
   * @param from node the current is taken from
   * @param to node the current flows into
   * @param current dc value [A]
   */
  record CurrentSource(String name, int from, int to, double current) implements Element {
    /** Checks the value. */
    public CurrentSource {
      ElementChecks.named(name);
      ElementChecks.finite("current", current);
    }
  }

  /**
   * A junction: rectifier diode, zener or LED.
   *
   * @param name unique name
   * @param anode node
   * @param cathode node
   * @param law forward and reverse law
   */
  record Junction(String name, int anode, int cathode, JunctionLaw law) implements Element {
    /** Checks the name. */
    public Junction {
      ElementChecks.named(name);
    }
  }

  /**
   * A valve section. A grid or screen that the law does not have is tied to the cathode node.
   *
   * @param name reference on the drawing, for example {@code V1a}
   * @param law device law
   * @param anode node
   * @param grid node
   * @param screen node
   * @param cathode node
   */
  record Valve(String name, DeviceLaw law, int anode, int grid, int screen, int cathode)
      implements Element {
    /** Checks the name. */
    public Valve {
      ElementChecks.named(name);
    }
  }
}
