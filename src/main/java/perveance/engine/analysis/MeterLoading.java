package perveance.engine.analysis;

import java.util.ArrayList;
import java.util.List;
import perveance.engine.circuit.Circuit;
import perveance.engine.circuit.DcSolution;
import perveance.engine.circuit.DcSolver;
import perveance.engine.circuit.Element;
import perveance.engine.circuit.Element.Resistor;

/**
 * What a meter shows at a node: the whole circuit solved again with the meter's resistance from the
 * node to chassis, since what the meter takes shifts the operating point.
 */
final class MeterLoading {
  /** A meter that is not connected [ohm]. */
  private static final double LIFTED = 1e15;

  private final DcSolution without;
  private final DcSolver solver;
  private final List<Integer> nodes;
  private final int firstMeter;
  private final double resistance;

  /**
   * Prepares the circuit.
   *
   * @param without dc point without a meter
   * @param nodes nodes to be measured
   * @param resistance of the meter [ohm]
   */
  MeterLoading(DcSolution without, List<Integer> nodes, double resistance) {
    this.without = without;
    this.nodes = List.copyOf(nodes);
    this.resistance = resistance;
    Circuit circuit = without.circuit();
    List<Element> elements = new ArrayList<>(circuit.elements());
    this.firstMeter = elements.size();
    for (int i = 0; i < nodes.size(); i++) {
      elements.add(new Resistor("meter." + i, nodes.get(i), 0, LIFTED));
    }
    this.solver = new DcSolver(new Circuit(circuit.nodes(), elements));
  }

  /**
   * Reading at one of the nodes.
   *
   * @param index place of the node in the list
   * @return what the meter shows, or the true voltage where no point is found with the meter [V]
   */
  double reading(int index) {
    int node = nodes.get(index);
    if (node == 0) {
      return 0;
    }
    solver.setResistance(firstMeter + index, resistance);
    double[] point = new double[solver.pointLength()];
    boolean found = solver.solveInto(point);
    solver.setResistance(firstMeter + index, LIFTED);
    return found ? solver.voltage(node) : without.voltage(node);
  }
}
