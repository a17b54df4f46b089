package perveance.engine.analysis;

import java.util.Optional;
import java.util.OptionalDouble;
import perveance.engine.circuit.CapacitorRole;
import perveance.engine.circuit.Element;
import perveance.engine.circuit.Element.Capacitor;
import perveance.engine.circuit.Element.Resistor;
import perveance.engine.circuit.Element.Valve;
import perveance.engine.circuit.Element.VoltageSource;

/**
 * How the signal passes a stage's only valve, told from the wiring and not from the kind's name: in
 * at grid or cathode, out at anode or cathode, and what stands between cathode and chassis for
 * signals. Decides which handbook formula a hand sum uses.
 *
 * @param valve the valve
 * @param way how the signal passes
 * @param cathodeResistance unbypassed resistance from cathode to chassis, zero where the cathode
 *     stands still [ohm]
 */
record SignalPath(Valve valve, Way way, double cathodeResistance) {
  /** How a signal passes a valve. */
  enum Way {
    /** Grid to anode. */
    COMMON_CATHODE,
    /** Grid to cathode. */
    FOLLOWER,
    /** Cathode to anode. */
    GROUNDED_GRID
  }

  /** The path through a stage of one valve; empty for stages of several. */
  static Optional<SignalPath> of(StageModel model) {
    if (model.stage().devices().size() != 1 || model.stage().outputs().size() != 1) {
      return Optional.empty();
    }
    String ref = model.stage().devices().get(0).ref();
    Valve valve = model.valve(ref);
    Joined joined = new Joined(model);
    int out = model.mainOutput().plus();
    int in = model.stage().inputNode();
    boolean still = joined.same(valve.cathode(), 0);
    if (joined.same(out, valve.cathode())) {
      return Optional.of(new SignalPath(valve, Way.FOLLOWER, 0));
    } else if (!joined.same(out, valve.anode())) {
      return Optional.empty();
    } else if (joined.same(in, valve.cathode())) {
      return Optional.of(new SignalPath(valve, Way.GROUNDED_GRID, 0));
    }
    OptionalDouble below = still ? OptionalDouble.of(0) : resistance(model, valve.cathode(), 0);
    return below.isPresent()
        ? Optional.of(new SignalPath(valve, Way.COMMON_CATHODE, below.getAsDouble()))
        : Optional.empty();
  }

  /** Resistance of the parts that join two nodes directly, empty when none does [ohm]. */
  static OptionalDouble resistance(StageModel model, int a, int b) {
    double sum = 0;
    for (Element element : model.circuit().elements()) {
      if (element instanceof Resistor r
          && ((r.a() == a && r.b() == b) || (r.a() == b && r.b() == a))) {
        sum += 1 / r.resistance();
      }
    }
    return sum > 0 ? OptionalDouble.of(1 / sum) : OptionalDouble.empty();
  }

  /** Nodes that are one for signals: joined by holding capacitors and by sources. */
  private static final class Joined {
    private final int[] group;

    Joined(StageModel model) {
      group = new int[model.circuit().nodes().size()];
      for (int i = 0; i < group.length; i++) {
        group[i] = i;
      }
      for (Element element : model.circuit().elements()) {
        if (element instanceof Capacitor c && c.role() == CapacitorRole.HOLDS) {
          join(c.a(), c.b());
        } else if (element instanceof VoltageSource s && !s.name().equals(input(model))) {
          join(s.plus(), s.minus());
        }
      }
    }

    private static String input(StageModel model) {
      return model.circuit().elements().get(model.source()).name();
    }

    private void join(int a, int b) {
      int from = group[a];
      int to = group[b];
      for (int i = 0; i < group.length; i++) {
        if (group[i] == from) {
          group[i] = to;
        }
      }
    }

    boolean same(int a, int b) {
      return group[a] == group[b];
    }
  }
}
