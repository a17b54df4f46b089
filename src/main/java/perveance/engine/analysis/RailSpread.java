package perveance.engine.analysis;

import java.util.Arrays;
import java.util.HashMap;
import java.util.LinkedHashSet;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import java.util.Set;
import perveance.engine.circuit.Circuit;
import perveance.engine.circuit.DcSolution;
import perveance.engine.circuit.DcSolver;
import perveance.engine.circuit.Element.VoltageSource;

/**
 * Voltages of the supply nodes over the specimens. A node that a stated source holds follows that
 * source; a node behind a dropper depends on all the stages together, so the whole circuit is then
 * solved for each specimen.
 */
final class RailSpread {
  private final Map<String, double[]> samples = new HashMap<>();
  private final Set<String> computed = new LinkedHashSet<>();
  private final SampleDraws draws;
  private final Causes causes;

  /**
   * Works all supply nodes out.
   *
   * @param dc nominal point of the whole circuit
   * @param rails supply nodes
   * @param draws deviates
   * @param causes what varies
   */
  RailSpread(DcSolution dc, List<Integer> rails, SampleDraws draws, Causes causes) {
    this.draws = draws;
    this.causes = causes;
    Circuit circuit = dc.circuit();
    boolean all = true;
    for (int rail : rails) {
      String name = circuit.nodes().get(rail);
      if (stated(circuit, name)) {
        samples.put(name, stated(dc.voltage(rail), causes, name, draws));
      } else {
        computed.add(name);
        samples.put(name, new double[draws.samples()]);
        all = false;
      }
    }
    if (!all) {
      solveTogether(new DcSolver(circuit), draws, causes);
    }
  }

  private static boolean stated(Circuit circuit, String rail) {
    return circuit.elements().stream()
        .anyMatch(e -> e instanceof VoltageSource s && s.name().equals(rail));
  }

  private static double[] stated(double voltage, Causes causes, String rail, SampleDraws draws) {
    double[] samples = new double[draws.samples()];
    int cause = causes.place(rail);
    for (int s = 0; s < samples.length; s++) {
      double deviate = cause < 0 ? 0 : draws.of(cause, s);
      samples[s] = voltage * (1 + causes.supplyDeviation() * deviate);
    }
    return samples;
  }

  private void solveTogether(DcSolver solver, SampleDraws draws, Causes causes) {
    Specimen specimen = new Specimen(solver, draws, causes, Set.of());
    double[] nominal = new double[solver.pointLength()];
    solver.solveInto(nominal);
    double[] point = new double[nominal.length];
    int[] nodes = computed.stream().mapToInt(solver.circuit()::node).toArray();
    List<double[]> voltages = computed.stream().map(this::samplesOf).toList();
    for (int s = 0; s < draws.samples(); s++) {
      specimen.take(s);
      System.arraycopy(nominal, 0, point, 0, point.length);
      boolean found = solver.solveInto(point);
      for (int rail = 0; rail < nodes.length; rail++) {
        voltages.get(rail)[s] = found ? solver.voltage(nodes[rail]) : Double.NaN;
      }
    }
  }

  /** Rails whose voltage comes from solving everything together. */
  Set<String> computed() {
    return Set.copyOf(computed);
  }

  /** Band of a rail's voltage; empty when too few samples have an answer. */
  Optional<Band> band(String rail) {
    double[] voltages = of(rail);
    long solved = Arrays.stream(voltages).filter(Double::isFinite).count();
    return 2 * solved > voltages.length
        ? Optional.of(new BandBuilder(draws, causes.names()).band(voltages))
        : Optional.empty();
  }

  /** Voltages of a rail over the samples; not-a-number where a sample has no answer [V]. */
  double[] of(String rail) {
    return samplesOf(rail).clone();
  }

  private double[] samplesOf(String rail) {
    double[] found = samples.get(rail);
    if (found == null) {
      throw new IllegalArgumentException("no supply node named " + rail);
    }
    return found;
  }
}
