package perveance.engine.circuit;

import java.util.List;

/** What came of the search for a dc operating point. */
public sealed interface DcOutcome {
  /** What was needed to find a point. */
  enum Method {
    /** Damped Newton from the start that was given. */
    NEWTON,
    /** Leaks from every node to chassis, reduced step by step to none. */
    GMIN_STEPPING,
    /** Sources raised step by step to their value. */
    SOURCE_STEPPING,
    /** Every node held where it was, less and less, as if each had a capacitor. */
    PSEUDO_TIME
  }

  /** Why there is no point. */
  enum Cause {
    /** A node has no path for dc to chassis. */
    FLOATING_NODE,
    /** Ideal sources and windings without resistance form a loop. */
    SOURCE_LOOP,
    /** The equations determine no point. */
    SINGULAR,
    /** Rounding of such high voltages across such low resistances leaves more than 1 nA. */
    ROUNDING,
    /** The search ended without a point at which Kirchhoff's law holds. */
    NO_CONVERGENCE
  }

  /**
   * A point at which Kirchhoff's law holds.
   *
   * @param solution the point
   * @param method what was needed
   * @param iterations Newton iterations, all steps together
   * @param residual largest current left over at any node [A]
   */
  record Converged(DcSolution solution, Method method, int iterations, double residual)
      implements DcOutcome {}

  /**
   * No point.
   *
   * @param cause why
   * @param reason why, in a sentence that names the place
   * @param place node or element concerned, empty when none stands out
   * @param lastVoltages node voltages of the last point tried, in the order of the nodes; empty
   *     when the circuit was refused before [V]
   * @param residual largest current left over at the last point; 0 when refused before [A]
   */
  record NotConverged(
      Cause cause, String reason, String place, List<Double> lastVoltages, double residual)
      implements DcOutcome {
    /** Copies the list. */
    public NotConverged {
      lastVoltages = List.copyOf(lastVoltages);
    }
  }
}
