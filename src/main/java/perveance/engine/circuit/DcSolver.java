package perveance.engine.circuit;

import java.util.ArrayList;
import java.util.Arrays;
import java.util.List;
import java.util.Optional;
import perveance.engine.circuit.DcOutcome.Cause;
import perveance.engine.circuit.DcOutcome.Converged;
import perveance.engine.circuit.DcOutcome.Method;
import perveance.engine.circuit.DcOutcome.NotConverged;
import perveance.engine.circuit.Element.Capacitor;
import perveance.engine.circuit.Element.CurrentSource;
import perveance.engine.circuit.Element.Resistor;
import perveance.engine.circuit.Element.VoltageSource;
import perveance.engine.device.DeviceLaw;
import perveance.engine.device.ElectrodeCurrents;

/**
 * Finds the dc operating point of a circuit. It is made once for a circuit; then values may be
 * changed by element index ({@link Circuit#element}) and the point found again without allocating
 * ({@link #solveInto}), for spread sampling and dragging.
 *
 * <p>Damped Newton first; where that stalls, leaks to chassis that are taken away step by step,
 * then sources that are raised step by step. Every answer obeys Kirchhoff's law to 1e-10 A at each
 * node.
 *
 * <p>Not for use by two threads at once.
 */
public final class DcSolver {
  /** What the sum of the currents at any node of an answer is below, element by element [A]. */
  private static final double RESIDUAL = 1e-9;

  private final Circuit circuit;
  private final ElementValues values;
  private final DcEquations equations;
  private final Newton newton;
  private final DcStepping stepping;
  private final Optional<NotConverged> refusal;
  private long revision;

  /**
   * Compiles a circuit.
   *
   * @param circuit circuit to solve
   */
  public DcSolver(Circuit circuit) {
    this.circuit = circuit;
    this.values = new ElementValues(circuit);
    this.equations = new DcEquations(new Topology(circuit), values);
    this.newton = new Newton(equations.system);
    this.stepping = new DcStepping(equations, newton);
    this.refusal = DcPaths.refusal(circuit);
  }

  /**
   * The circuit as it was given.
   *
   * @return circuit
   */
  public Circuit circuit() {
    return circuit;
  }

  /**
   * Changes a resistor.
   *
   * @param element element index
   * @param resistance above zero [ohm]
   */
  public void setResistance(int element, double resistance) {
    ElementChecks.positive("resistance", resistance);
    revision++;
    values.set(element, Resistor.class, resistance);
  }

  /**
   * Changes a capacitor, for small signals about the point found.
   *
   * @param element element index
   * @param capacitance above zero [F]
   */
  public void setCapacitance(int element, double capacitance) {
    ElementChecks.positive("capacitance", capacitance);
    revision++;
    values.set(element, Capacitor.class, capacitance);
  }

  /**
   * Changes a voltage source.
   *
   * @param element element index
   * @param voltage new dc value [V]
   */
  public void setVoltage(int element, double voltage) {
    ElementChecks.finite("voltage", voltage);
    revision++;
    values.set(element, VoltageSource.class, voltage);
  }

  /**
   * Changes a current source.
   *
   * @param element element index
   * @param current new dc value [A]
   */
  public void setCurrent(int element, double current) {
    ElementChecks.finite("current", current);
    revision++;
    values.set(element, CurrentSource.class, current);
  }

  /**
   * Changes the law of a valve.
   *
   * @param element element index
   * @param law new law of the same kind
   */
  public void setLaw(int element, DeviceLaw law) {
    revision++;
    values.setLaw(element, law);
  }

  /**
   * Finds the operating point from nothing.
   *
   * @return the point, or why there is none
   */
  public DcOutcome solve() {
    return solve(new double[pointLength()]);
  }

  /**
   * Finds the operating point from a nearby one of the same circuit.
   *
   * @param previous point to start from
   * @return the point, or why there is none
   * @throws IllegalArgumentException when the point belongs to a circuit of another shape
   */
  public DcOutcome solveFrom(DcSolution previous) {
    if (previous.unknowns().length != pointLength()) {
      throw new IllegalArgumentException(
          "previous has " + previous.unknowns().length + " unknowns, not " + pointLength());
    }
    return solve(previous.unknowns().clone());
  }

  private DcOutcome solve(double[] point) {
    if (refusal.isPresent()) {
      return refusal.get();
    }
    revision++;
    Newton.End end = stepping.solve(point);
    double left = newton.kirchhoffResidual();
    if (end == Newton.End.CONVERGED) {
      DcSolution solution = new DcSolution(equations, point);
      left = solution.residual();
      if (left < RESIDUAL) {
        return new Converged(solution, stepping.method(), stepping.iterations(), left);
      }
      return failed(
          Cause.ROUNDING,
          "resistances are so low for such voltages that rounding alone leaves currents over",
          left);
    }
    return end == Newton.End.SINGULAR
        ? failed(Cause.SINGULAR, "the wiring does not determine every voltage and current", left)
        : failed(
            Cause.NO_CONVERGENCE,
            "no operating point was found at which the currents balance",
            left);
  }

  private NotConverged failed(Cause cause, String reason, double left) {
    List<Double> last = new ArrayList<>();
    for (double v : equations.system.voltage) {
      last.add(v);
    }
    return new NotConverged(cause, reason, "", last, left);
  }

  /**
   * Length of a point for {@link #solveInto}.
   *
   * @return number of unknowns
   */
  public int pointLength() {
    return equations.system.size;
  }

  /**
   * Finds the operating point without allocating. On success node voltages and valve currents are
   * read with {@link #voltage} and {@link #valve} until the next solve.
   *
   * @param point where to start, all zeros when nothing is known; overwritten with the point found,
   *     left with the last point tried on failure; node voltages [V], then branch currents [A]
   * @return whether a point was found
   */
  public boolean solveInto(double[] point) {
    if (point.length != pointLength()) {
      throw new IllegalArgumentException(
          "point has " + point.length + " entries, not " + pointLength());
    }
    revision++;
    return refusal.isEmpty() && stepping.solve(point) == Newton.End.CONVERGED;
  }

  /**
   * Voltage of a node at the last point.
   *
   * @param node node number
   * @return node to chassis [V]
   */
  public double voltage(int node) {
    return equations.system.voltage[node];
  }

  /**
   * Currents and slopes of a valve at the last point; the object is overwritten by the next solve.
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

  /**
   * What the last solve needed.
   *
   * @return method
   */
  public Method method() {
    return stepping.method();
  }

  /**
   * Iterations of the last solve, all steps together.
   *
   * @return Newton iterations
   */
  public int iterations() {
    return stepping.iterations();
  }

  /**
   * Largest current left over at any node at the last point.
   *
   * @return current [A]
   */
  public double residual() {
    return newton.kirchhoffResidual();
  }

  /** Row of the first branch current of an inductor or transformer in a point. */
  int branchRow(int element) {
    return equations.system.branchRow(equations.branchOf[element]);
  }

  /** Changes with every solve and every change of a value. */
  long revision() {
    return revision;
  }

  NodalSystem system() {
    return equations.system;
  }

  ElementValues values() {
    return values;
  }
}
