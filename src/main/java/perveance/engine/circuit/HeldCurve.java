package perveance.engine.circuit;

import java.util.Arrays;
import java.util.Map;
import perveance.engine.device.ElectrodeCurrents;

/**
 * The mid-band characteristic through a dc point: the state of the circuit when its sources stand
 * at some level and coupling and bypass capacitors, chokes and cores hold the charge and current of
 * the dc point. Strays and leakage are left out.
 *
 * <p>Predicts what a signal sees before anything held has time to move: how far a swing may go each
 * way. What a long signal settles to is told by {@link MidbandSolver}. Allocates nothing after
 * construction. Not for use by two threads at once.
 */
public final class HeldCurve {
  private static final int DEEPEST = 6;

  private final MidbandEquations equations;
  private final Newton newton;
  private final double[] hold;
  private final double[] rest;
  private final double[] point;
  private final double[][] before;
  private double level;

  /**
   * Prepares a circuit.
   *
   * @param circuit the circuit
   * @param shares factor of the level by element index of each driven source [1]
   */
  private HeldCurve(Circuit circuit, Map<Integer, Double> shares) {
    this.equations = new MidbandEquations(circuit, shares);
    this.newton = new Newton(equations.system);
    this.hold = new double[equations.holds];
    this.rest = new double[equations.system.size];
    this.point = new double[equations.system.size];
    this.before = new double[DEEPEST + 1][equations.system.size];
  }

  /**
   * The characteristic through a dc point.
   *
   * @param rest dc point
   * @param shares factor of the level by element index of each driven source [1]
   */
  public HeldCurve(DcSolution rest, Map<Integer, Double> shares) {
    this(rest.circuit(), shares);
    newton.prepare();
    System.arraycopy(equations.holdsAt(rest), 0, hold, 0, hold.length);
    System.arraycopy(equations.unknownsAt(rest), 0, this.rest, 0, this.rest.length);
    toRest();
  }

  /**
   * The characteristic through the last point of a solver, for repeated use with {@link #take}.
   *
   * @param solver solver whose last solve found a point
   * @param at that point, as {@link DcSolver#solveInto} left it [V, A]
   * @param shares factor of the level by element index of each driven source [1]
   */
  public HeldCurve(DcSolver solver, double[] at, Map<Integer, Double> shares) {
    this(solver.circuit(), shares);
    take(solver, at);
  }

  /**
   * Takes the last point and the present values of the solver it was made for. Allocates nothing.
   *
   * @param solver solver whose last solve found a point
   * @param at that point, as {@link DcSolver#solveInto} left it [V, A]
   * @return whether the characteristic passes through the point
   */
  public boolean take(DcSolver solver, double[] at) {
    if (solver.system().topology.nodeCount != equations.topology.nodeCount
        || solver.circuit().elements().size() != equations.plan.branchOf.length) {
      throw new IllegalArgumentException("solver belongs to another circuit");
    }
    equations.take(solver.values());
    newton.prepare();
    equations.holdsAt(solver, at, hold);
    int[] row = equations.topology.row;
    for (int node = 0; node < row.length; node++) {
      if (row[node] >= 0) {
        rest[row[node]] = solver.voltage(node);
      }
    }
    toRest();
    boolean found = settle(0);
    if (found) {
      System.arraycopy(point, 0, rest, 0, rest.length);
    }
    return found;
  }

  private void toRest() {
    System.arraycopy(rest, 0, point, 0, rest.length);
    level = 0;
  }

  /**
   * Moves the sources.
   *
   * @param to level above rest; each source gets its share of it [V]
   * @return whether a state was found; otherwise the last one remains the start of the next
   */
  public boolean move(double to) {
    if (to == 0) {
      toRest();
      return settle(0);
    }
    return approach(to, DEEPEST);
  }

  private boolean approach(double to, int depth) {
    double from = level;
    double[] kept = before[depth];
    System.arraycopy(point, 0, kept, 0, point.length);
    if (settle(to)) {
      return true;
    }
    System.arraycopy(kept, 0, point, 0, point.length);
    level = from;
    return depth > 0 && approach(0.5 * (from + to), depth - 1) && approach(to, depth - 1);
  }

  private boolean settle(double to) {
    equations.set(to, hold);
    boolean found = newton.solve(point) == Newton.End.CONVERGED;
    if (found) {
      level = to;
    }
    return found;
  }

  /**
   * Voltage of a node in the last state.
   *
   * @param node node number
   * @return node to chassis [V]
   */
  public double voltage(int node) {
    return equations.system.voltage[node];
  }

  /**
   * Currents and slopes of a valve in the last state; overwritten by the next move.
   *
   * @param element element index
   * @return currents into its electrodes and their slopes
   */
  public ElectrodeCurrents valve(int element) {
    int place = Arrays.binarySearch(equations.system.valves.element, element);
    if (place < 0) {
      throw new IllegalArgumentException("element " + element + " is no valve");
    }
    return equations.system.valves.point[place];
  }
}
