package perveance.reference;

import java.util.ArrayList;
import java.util.List;
import perveance.engine.circuit.CapacitorRole;
import perveance.engine.circuit.Circuit;
import perveance.engine.circuit.DcSolution;
import perveance.engine.circuit.Element;
import perveance.engine.circuit.Element.Capacitor;
import perveance.engine.circuit.Element.Transformer;
import perveance.engine.circuit.Element.Valve;
import perveance.engine.circuit.MidbandSolution;
import perveance.engine.device.LawKind;

/** What the simulator says of a case. */
final class SimulatorAnswers {
  private final ReferenceCase c;
  private final Simulator simulator;
  private final DcSolution near;
  private final Answers answers = new Answers();

  SimulatorAnswers(ReferenceCase c, Simulator simulator) {
    this.c = c;
    this.simulator = simulator;
    this.near = EngineAnswers.rest(c);
  }

  Answers all() {
    List<String> netlist = SpiceNetlist.linear(c.circuit(), c.input(), near);
    rest(netlist);
    List<String> outputs = new ArrayList<>();
    for (ReferenceCase.Output out : c.outputs()) {
      String minus = out.minus() == 0 ? "" : "-v(" + out.minus() + ")";
      outputs.add("v(" + out.plus() + ")" + minus);
    }
    double[][] harmonics = cycle(outputs);
    for (int k = 0; k < outputs.size(); k++) {
      String name = c.outputs().get(k).name();
      for (double f : c.frequencies()) {
        double[] row = simulator.run(netlist, "ac lin 1 " + f + " " + f, outputs).get(0);
        answers.put(Answers.signal(name, f, "re"), row[1 + 2 * k]);
        answers.put(Answers.signal(name, f, "im"), row[2 + 2 * k]);
      }
      for (int n = 1; n <= ReferenceCase.HARMONICS; n++) {
        answers.put(Answers.harmonic(name, n), harmonics[k][n]);
      }
    }
    return answers;
  }

  private void rest(List<String> netlist) {
    Circuit circuit = c.circuit();
    List<String> vectors = new ArrayList<>();
    List<String> names = new ArrayList<>();
    for (int node = 1; node < circuit.nodes().size(); node++) {
      vectors.add("v(" + node + ")");
      names.add(Answers.voltage(circuit.nodes().get(node)));
    }
    for (int i = 0; i < circuit.elements().size(); i++) {
      if (circuit.elements().get(i) instanceof Valve valve) {
        LawKind kind = valve.law().kind();
        vectors.add("i(vx" + i + "_as)");
        names.add(Answers.current(valve.name(), "anode"));
        vectors.add(kind == LawKind.DIODE ? "0*v(1)" : "i(vx" + i + "_gs)");
        names.add(Answers.current(valve.name(), "grid"));
        vectors.add(kind == LawKind.PENTODE ? "i(vx" + i + "_ss)" : "0*v(1)");
        names.add(Answers.current(valve.name(), "screen"));
      }
    }
    double[] row = simulator.run(netlist, "op", vectors).get(0);
    for (int i = 0; i < vectors.size(); i++) {
      answers.put(names.get(i), row[1 + i]);
    }
  }

  /** Cosine parts of the harmonics of each output; what holds is checked for balance on the way. */
  private double[][] cycle(List<String> outputs) {
    int count = ReferenceCase.SAMPLES;
    double[] drive = new double[count];
    for (int k = 0; k < count; k++) {
      drive[k] = c.peak() * Math.cos(2 * Math.PI * k / count);
    }
    MidbandSolution state = EngineAnswers.cycle(c, near);
    List<String> netlist = SpiceNetlist.cycle(c.circuit(), c.input(), near, state, drive);
    List<String> vectors = new ArrayList<>(outputs);
    vectors.addAll(balances());
    List<double[]> samples = new ArrayList<>();
    for (double[] row : simulator.run(netlist, "tran 1 " + count + " 0 1", vectors)) {
      long second = Math.round(row[0]);
      if (second == samples.size() + 1 && Math.abs(row[0] - second) < 1e-6) {
        samples.add(row);
      }
    }
    if (samples.size() != count) {
      throw new IllegalStateException(c.name() + ": " + samples.size() + " samples");
    }
    for (int b = outputs.size(); b < vectors.size(); b++) {
      answers.put("mean " + vectors.get(b), cosinePart(samples, 1 + b, 0) / 2);
    }
    double[][] parts = new double[outputs.size()][ReferenceCase.HARMONICS + 1];
    for (int k = 0; k < parts.length; k++) {
      for (int n = 1; n < parts[k].length; n++) {
        parts[k][n] = cosinePart(samples, 1 + k, n);
      }
    }
    return parts;
  }

  /** Currents of capacitors that hold and volts per turn of cores: nothing in the mean. */
  private List<String> balances() {
    List<String> vectors = new ArrayList<>();
    for (int i = 0; i < c.circuit().elements().size(); i++) {
      Element element = c.circuit().elements().get(i);
      if (element instanceof Capacitor e && e.role() == CapacitorRole.HOLDS) {
        vectors.add("i(v" + i + ")");
      } else if (element instanceof Transformer) {
        vectors.add("v(x" + i + "_u)");
      }
    }
    return vectors;
  }

  private static double cosinePart(List<double[]> rows, int column, int order) {
    double sum = 0;
    for (int k = 0; k < rows.size(); k++) {
      sum += rows.get(k)[column] * Math.cos(2 * Math.PI * order * k / rows.size());
    }
    return 2 * sum / rows.size();
  }
}
