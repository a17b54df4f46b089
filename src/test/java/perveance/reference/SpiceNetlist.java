package perveance.reference;

import static perveance.reference.SpiceLaw.number;

import java.util.ArrayList;
import java.util.List;
import perveance.engine.circuit.CapacitorRole;
import perveance.engine.circuit.Circuit;
import perveance.engine.circuit.DcSolution;
import perveance.engine.circuit.Element;
import perveance.engine.circuit.Element.Capacitor;
import perveance.engine.circuit.Element.CurrentSource;
import perveance.engine.circuit.Element.Inductor;
import perveance.engine.circuit.Element.Junction;
import perveance.engine.circuit.Element.Resistor;
import perveance.engine.circuit.Element.Transformer;
import perveance.engine.circuit.Element.Valve;
import perveance.engine.circuit.Element.VoltageSource;
import perveance.engine.circuit.Element.Winding;
import perveance.engine.circuit.JunctionLaw;
import perveance.engine.circuit.PeriodicState;

/**
 * Any circuit as a netlist: node n is called n, chassis 0; elements are numbered. Transformers are
 * controlled sources about a node whose voltage is the volts per turn.
 */
final class SpiceNetlist {
  /** Stands for an ideal core: one over it is lost in the figures compared [H at one turn]. */
  private static final double IDEAL_CORE = 1e12;

  private final Circuit circuit;
  private final List<String> lines = new ArrayList<>();

  /** At rest the smallest grid currents are compared, which are themselves below 1e-13 A. */
  private static final String REST = "1e-16";

  /**
   * In a cycle currents of 0.1 A pass through zero, where nothing but this ends the search: it must
   * stand above their rounding, some 1e-16 A, or the simulator gives up at a corner of the drive
   * for one order of the lines in twenty. In the output it is 1e-12 V.
   */
  private static final String CYCLE = "1e-13";

  private SpiceNetlist(Circuit circuit, String title, String smallestCurrent) {
    this.circuit = circuit;
    lines.add("* " + title);
    lines.add(
        ".options reltol=1e-10 vntol=1e-11 gmin=1e-18 itl1=2000 itl4=500 numdgt=15 abstol="
            + smallestCurrent);
  }

  /** The circuit with capacitors and inductors; one source carries a small signal of one. */
  static List<String> linear(Circuit circuit, String input, DcSolution near) {
    SpiceNetlist netlist = new SpiceNetlist(circuit, "dc and small signal", REST);
    for (int i = 0; i < circuit.elements().size(); i++) {
      Element element = circuit.elements().get(i);
      String signal = element.name().equals(input) ? " ac 1" : "";
      netlist.element(i, element, signal);
    }
    netlist.startAt(near);
    return netlist.lines;
  }

  /**
   * The circuit without memory: what holds is a source of its solved value, and the drive is a
   * course of straight lines with a corner at each sample.
   *
   * @param state solved cycle, from which only what holds is taken
   * @param drive value of the driving source at each sample, added to its dc value
   */
  static List<String> cycle(
      Circuit circuit, String input, DcSolution near, PeriodicState state, double[] drive) {
    SpiceNetlist netlist = new SpiceNetlist(circuit, "one cycle at mid-band", CYCLE);
    for (int i = 0; i < circuit.elements().size(); i++) {
      Element element = circuit.elements().get(i);
      if (element.name().equals(input)) {
        netlist.element(i, element, course(dcOf(element), drive));
      } else {
        netlist.held(i, element, state);
      }
    }
    netlist.startAt(near);
    return netlist.lines;
  }

  private static double dcOf(Element source) {
    return source instanceof VoltageSource e ? e.voltage() : ((CurrentSource) source).current();
  }

  /** Sample k stands at k + 1 seconds; the first is held from zero. */
  private static String course(double dc, double[] drive) {
    StringBuilder text = new StringBuilder(" pwl(0 " + number(dc + drive[0]));
    for (int k = 0; k < drive.length; k++) {
      text.append(' ').append(k + 1).append(' ').append(number(dc + drive[k]));
    }
    return text.append(')').toString();
  }

  private void element(int i, Element element, String signal) {
    if (element instanceof Resistor e) {
      add("R%d %d %d %s", i, e.a(), e.b(), number(e.resistance()));
    } else if (element instanceof Capacitor e) {
      add("C%d %d %d %s", i, e.a(), e.b(), number(e.capacitance()));
    } else if (element instanceof Inductor e) {
      coil(i + "", e.a() + "", e.b() + "", e.resistance(), e.inductance());
    } else if (element instanceof VoltageSource e) {
      add("V%d %d %d dc %s%s", i, e.plus(), e.minus(), number(e.voltage()), signal);
    } else if (element instanceof CurrentSource e) {
      add("I%d %d %d dc %s%s", i, e.from(), e.to(), number(e.current()), signal);
    } else if (element instanceof Junction e) {
      junction(i, e);
    } else if (element instanceof Valve e) {
      List<String> nodes =
          List.of(e.anode() + "", e.grid() + "", e.screen() + "", e.cathode() + "");
      new SpiceLaw(lines, "x" + i, e.law(), nodes).write(e.law());
    } else if (element instanceof Transformer e) {
      windings(i, e, false);
      double turns = e.windings().get(0).turns();
      double core =
          Double.isInfinite(e.magnetising()) ? IDEAL_CORE : e.magnetising() / (turns * turns);
      add("L%d_core x%d_u 0 %s", i, i, number(core));
    }
  }

  /** At mid-band: holding capacitors are voltages, strays gone, inductors and cores currents. */
  private void held(int i, Element element, PeriodicState state) {
    if (element instanceof Capacitor e) {
      if (e.role() == CapacitorRole.HOLDS) {
        add("V%d %d %d dc %s", i, e.a(), e.b(), number(state.voltage(e.a(), e.b())[0]));
      }
    } else if (element instanceof Inductor e) {
      add("I%d %d %d dc %s", i, e.a(), e.b(), number(state.current(i)[0]));
    } else if (element instanceof Transformer e) {
      windings(i, e, true);
      add("I%d_core x%d_u 0 dc %s", i, i, number(ampereTurns(i, e, state)));
    } else {
      element(i, element, "");
    }
  }

  private static double ampereTurns(int i, Transformer e, PeriodicState state) {
    double sum = 0;
    for (int w = 0; w < e.windings().size(); w++) {
      sum += e.windings().get(w).turns() * state.windingCurrent(i, w)[0];
    }
    return sum;
  }

  private void coil(String id, String a, String b, double resistance, double inductance) {
    if (resistance == 0) {
      add("L%s %s %s %s", id, a, b, number(inductance));
    } else {
      add("R%s_w %s x%s_w %s", id, a, id, number(resistance));
      add("L%s x%s_w %s %s", id, id, b, number(inductance));
    }
  }

  private void windings(int i, Transformer transformer, boolean midband) {
    for (int w = 0; w < transformer.windings().size(); w++) {
      Winding winding = transformer.windings().get(w);
      String id = i + "_" + w;
      String at = "x" + id + "_a";
      add("V%s %d %s 0", id, winding.start(), at);
      if (winding.resistance() > 0) {
        add("R%s %s x%s_b %s", id, at, id, number(winding.resistance()));
        at = "x" + id + "_b";
      }
      if (winding.leakage() > 0 && !midband) {
        add("L%s %s x%s_c %s", id, at, id, number(winding.leakage()));
        at = "x" + id + "_c";
      }
      add("E%s %s %d x%d_u 0 %s", id, at, winding.end(), i, number(winding.turns()));
      add("F%s 0 x%d_u V%s %s", id, i, id, number(winding.turns()));
    }
  }

  private void junction(int i, Junction e) {
    JunctionLaw law = e.law();
    String inner = law.series() > 0 ? "x" + i + "_f" : e.anode() + "";
    if (law.series() > 0) {
      add("R%d_f %d %s %s", i, e.anode(), inner, number(law.series()));
    }
    add(
        "B%d_f %s %d I=%s*(exp(min(v(%s,%d)/%s,200))-1)",
        i,
        inner,
        e.cathode(),
        number(law.saturation()),
        inner,
        e.cathode(),
        number(law.emissionVoltage()));
    if (law.breakdown() < Double.POSITIVE_INFINITY) {
      breakdown(i, e, law);
    }
  }

  private void breakdown(int i, Junction e, JunctionLaw law) {
    String inner = law.series() > 0 ? "x" + i + "_r" : e.anode() + "";
    if (law.series() > 0) {
      add("R%d_r %d %s %s", i, e.anode(), inner, number(law.series()));
    }
    double start = law.breakdown() - law.breakdownCurrent() * law.series();
    add(
        "B%d_r %s %d I=-%s*exp(min((v(%d,%s)-%s)/%s,200))",
        i,
        inner,
        e.cathode(),
        number(law.breakdownCurrent()),
        e.cathode(),
        inner,
        number(start),
        number(law.breakdownEmission()));
  }

  /** A start for the search only; the simulator settles on its own point. */
  private void startAt(DcSolution near) {
    StringBuilder text = new StringBuilder(".nodeset");
    for (int node = 1; node < circuit.nodes().size(); node++) {
      text.append(" v(%d)=%s".formatted(node, number(near.voltage(node))));
    }
    lines.add(text.toString());
  }

  private void add(String format, Object... values) {
    lines.add(format.formatted(values));
  }
}
