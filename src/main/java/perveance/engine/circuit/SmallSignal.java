package perveance.engine.circuit;

import java.util.Optional;

/**
 * Small signals about a dc point: every valve and junction replaced by its slopes, every capacitor
 * and inductor by its complex admittance. Mid-band figures take holding capacitors as shorts,
 * strays as open, inductors and magnetising currents as open.
 *
 * <p>Predicts voltages in proportion to one source while all others stay still. Valid for signals
 * so small that the slopes do not change.
 *
 * <p>Not for use by two threads at once.
 */
public final class SmallSignal {
  private static final double REFERENCE_FREQUENCY = 1000;

  private final Topology topology;
  private final LinearStamper full;
  private final LinearStamper held;
  private final FrameSolver atFrequency;
  private final FrameSolver atMidband;
  private double factoredFrequency = -1;
  private boolean midbandFactored;
  private double strayFrequency = -1;
  private final Optional<DcSolver> source;
  private boolean restWanted;
  private long takenRevision;

  private SmallSignal(Circuit circuit, Optional<DcSolver> source) {
    this.source = source;
    this.topology = new Topology(circuit);
    this.full = new LinearStamper(topology, false);
    this.held = new LinearStamper(topology, true);
    this.atFrequency = new FrameSolver(topology, full);
    this.atMidband = new FrameSolver(topology, held);
  }

  /**
   * Small signals about a dc point.
   *
   * @param point dc point
   */
  public SmallSignal(DcSolution point) {
    this(point.circuit(), Optional.empty());
    ElementValues values = new ElementValues(point.circuit());
    ValveBank valves = new ValveBank(point.circuit(), topology);
    JunctionBank junctions = new JunctionBank(point.circuit(), topology);
    double[] voltage = new double[topology.nodeCount];
    for (int node = 0; node < voltage.length; node++) {
      voltage[node] = point.voltage(node);
    }
    valves.take(values);
    valves.evaluate(voltage);
    junctions.evaluate(voltage);
    full.stamp(values, valves, junctions);
    held.stamp(values, valves, junctions);
  }

  /**
   * Small signals about the last point of a solver, for repeated use with {@link #take}.
   *
   * @param solver solver whose last solve found a point
   */
  public SmallSignal(DcSolver solver) {
    this(solver.circuit(), Optional.of(solver));
    take(solver);
  }

  /**
   * Takes the last point and the present values of the solver it was made for. Figures at a
   * frequency must be asked for before the solver is used again, or not at all.
   *
   * @param solver solver whose last solve found a point
   * @throws IllegalArgumentException when it was made for another solver
   */
  public void take(DcSolver solver) {
    if (source.isEmpty() || !source.get().equals(solver)) {
      throw new IllegalArgumentException("solver is not the one this was made for");
    }
    NodalSystem system = solver.system();
    held.stamp(solver.values(), system.valves, system.junctions);
    midbandFactored = false;
    strayFrequency = -1;
    restWanted = true;
    takenRevision = solver.revision();
  }

  /** Spread sampling asks for mid-band alone, so the rest is taken when it is first wanted. */
  private void takeRest(DcSolver solver) {
    if (solver.revision() != takenRevision) {
      throw new IllegalStateException("the solver has moved on since its point was taken");
    }
    NodalSystem system = solver.system();
    full.stamp(solver.values(), system.valves, system.junctions);
    factoredFrequency = -1;
    restWanted = false;
  }

  /**
   * Why nothing can be computed here, for example two windings without resistance that are both
   * held by capacitors.
   *
   * @return reason, empty in the usual case
   */
  public Optional<String> refusal() {
    if (!factorMidband()) {
      return Optional.of("the mid-band equations have no single answer");
    }
    return factor(REFERENCE_FREQUENCY)
        ? Optional.empty()
        : Optional.of("the equations at 1 kHz have no single answer");
  }

  /**
   * Voltage between two nodes for one unit of a source.
   *
   * @param source element index of a voltage or current source
   * @param plus node number
   * @param minus node number, 0 for chassis
   * @param frequency above zero [Hz]
   * @return transfer, without unit for a voltage source, in ohm for a current source
   */
  public Complex transfer(int source, int plus, int minus, double frequency) {
    require(factor(frequency));
    atFrequency.respondTo(source);
    return between(plus, minus);
  }

  /**
   * Impedance that a source sees.
   *
   * @param source element index of a voltage source
   * @param frequency above zero [Hz]
   * @return impedance [ohm]
   */
  public Complex inputImpedance(int source, double frequency) {
    return inputAdmittance(source, frequency).reciprocal();
  }

  /**
   * Admittance that a source sees.
   *
   * @param source element index of a voltage source
   * @param frequency above zero [Hz]
   * @return admittance [S]
   */
  public Complex inputAdmittance(int source, double frequency) {
    require(factor(frequency));
    atFrequency.respondTo(source);
    return atFrequency.delivered(source);
  }

  /**
   * Impedance between two nodes, all sources dead.
   *
   * @param plus node number
   * @param minus node number, 0 for chassis
   * @param frequency above zero [Hz]
   * @return impedance [ohm]
   */
  public Complex outputImpedance(int plus, int minus, double frequency) {
    require(factor(frequency));
    atFrequency.respondToCurrent(minus, plus);
    return between(plus, minus);
  }

  /**
   * Voltage between two nodes for one unit of a source at mid-band, with its sign.
   *
   * @param source element index of a voltage or current source
   * @param plus node number
   * @param minus node number, 0 for chassis
   * @return gain [1], or [ohm] for a current source
   */
  public double midbandGain(int source, int plus, int minus) {
    require(factorMidband());
    atMidband.respondTo(source);
    return atMidband.re(plus) - atMidband.re(minus);
  }

  /**
   * Resistance that a source sees at mid-band.
   *
   * @param source element index of a voltage source
   * @return resistance [ohm]
   */
  public double midbandInputResistance(int source) {
    require(factorMidband());
    atMidband.respondTo(source);
    return 1 / atMidband.delivered(source).re();
  }

  /**
   * Admittance that a source sees where capacitors that hold and inductors count as at mid-band and
   * stray capacitances as at a frequency: what an input's own capacitance adds, without the phase
   * of the coupling behind it.
   *
   * @param source element index of a voltage source
   * @param frequency above zero [Hz]
   * @return admittance [S]
   */
  public Complex strayInputAdmittance(int source, double frequency) {
    factorStrays(frequency);
    atMidband.respondTo(source);
    return atMidband.delivered(source);
  }

  /**
   * Voltage between two nodes for one unit of a source, counted as {@link #strayInputAdmittance}
   * does.
   *
   * @param source element index of a voltage or current source
   * @param plus node number
   * @param minus node number, 0 for chassis
   * @param frequency above zero [Hz]
   * @return transfer, without unit for a voltage source, in ohm for a current source
   */
  public Complex strayTransfer(int source, int plus, int minus, double frequency) {
    factorStrays(frequency);
    atMidband.respondTo(source);
    return new Complex(
        atMidband.re(plus) - atMidband.re(minus), atMidband.im(plus) - atMidband.im(minus));
  }

  /** The mid-band's factors are made anew when they are next wanted. */
  private void factorStrays(double frequency) {
    ElementChecks.positive("frequency", frequency);
    if (frequency != strayFrequency) {
      midbandFactored = false;
      strayFrequency = -1;
      require(atMidband.factor(2 * Math.PI * frequency));
      strayFrequency = frequency;
    }
  }

  /**
   * Resistance between two nodes at mid-band, all sources dead.
   *
   * @param plus node number
   * @param minus node number, 0 for chassis
   * @return resistance [ohm]
   */
  public double midbandOutputResistance(int plus, int minus) {
    require(factorMidband());
    atMidband.respondToCurrent(minus, plus);
    return atMidband.re(plus) - atMidband.re(minus);
  }

  /**
   * Frequencies at which the gain has fallen by 3 dB from its mid-band value.
   *
   * @param source element index of a voltage or current source
   * @param plus node number
   * @param minus node number, 0 for chassis
   * @return corners either side of the flattest part
   */
  public Corners corners(int source, int plus, int minus) {
    double reference = Math.abs(midbandGain(source, plus, minus));
    // where values many decades apart leave no digit, nothing speaks for a corner
    return Corners.search(
        frequency ->
            factor(frequency) ? transfer(source, plus, minus, frequency).magnitude() : reference,
        reference);
  }

  /**
   * Frequencies at which the gain from a node inside the circuit has fallen by 3 dB from its
   * mid-band value: what stands between the source and that node does not count.
   *
   * @param source element index of a voltage or current source
   * @param input node from which the gain is counted
   * @param plus node number
   * @param minus node number, 0 for chassis
   * @return corners either side of the flattest part
   */
  public Corners corners(int source, int input, int plus, int minus) {
    double before = Math.abs(midbandGain(source, input, 0));
    double reference = Math.abs(midbandGain(source, plus, minus)) / before;
    return Corners.search(
        frequency -> {
          if (!factor(frequency)) {
            return reference;
          }
          double output = transfer(source, plus, minus, frequency).magnitude();
          return output / transfer(source, input, 0, frequency).magnitude();
        },
        reference);
  }

  /**
   * Whether the equations have a single answer at a frequency; values many decades apart may leave
   * none at the ends of the range.
   *
   * @param frequency above zero [Hz]
   * @return whether transfers and impedances can be asked for there
   */
  public boolean answers(double frequency) {
    return factor(frequency);
  }

  /** Effect of every node current and branch voltage on an output, at a frequency. */
  FrameSolver effects(int plus, int minus, double frequency) {
    require(factor(frequency));
    atFrequency.effectsOn(plus, minus);
    return atFrequency;
  }

  /** Place of an element's first branch among the answers of {@link #effects}. */
  int place(int element) {
    return full.place(element);
  }

  private Complex between(int plus, int minus) {
    return new Complex(
        atFrequency.re(plus) - atFrequency.re(minus), atFrequency.im(plus) - atFrequency.im(minus));
  }

  private boolean factorMidband() {
    if (!midbandFactored) {
      strayFrequency = -1;
      midbandFactored = atMidband.factor(0);
    }
    return midbandFactored;
  }

  private boolean factor(double frequency) {
    ElementChecks.positive("frequency", frequency);
    if (restWanted) {
      takeRest(source.orElseThrow());
    }
    if (frequency != factoredFrequency) {
      boolean done = atFrequency.factor(2 * Math.PI * frequency);
      factoredFrequency = done ? frequency : -1;
      return done;
    }
    return true;
  }

  private static void require(boolean factored) {
    if (!factored) {
      throw new IllegalStateException("no single answer; ask refusal() first");
    }
  }
}
