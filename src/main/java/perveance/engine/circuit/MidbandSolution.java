package perveance.engine.circuit;

/** A steady cycle at mid-band; immutable. */
public final class MidbandSolution extends PeriodicState {
  private final double peak;

  MidbandSolution(
      MidbandEquations equations,
      Waveform waveform,
      double[][] points,
      double[] hold,
      double peak) {
    super(equations.topology.circuit, record(equations, waveform, points, hold, peak));
    this.peak = peak;
  }

  private static CycleRecord record(
      MidbandEquations equations,
      Waveform waveform,
      double[][] points,
      double[] hold,
      double peak) {
    NodalSystem system = equations.system;
    int count = waveform.count();
    CycleRecord cycle = new CycleRecord(equations.topology, system.valves, count);
    CurrentLedger ledger = new CurrentLedger(equations.topology, system.valves, system.junctions);
    for (int k = 0; k < points.length; k++) {
      double[] x = points[k];
      double drive = peak * waveform.sample(k);
      equations.set(drive, hold);
      system.evaluate(x);
      ledger.fill(
          equations.valuesAt(drive),
          system.voltage,
          (element, winding) -> equations.branchCurrent(x, hold, element, winding));
      boolean mirrored = points.length < count && k > 0 && k < count / 2;
      cycle.write(k, mirrored, system.voltage, ledger, system.valves);
    }
    return cycle;
  }

  /**
   * Peak of the drive.
   *
   * @return peak of the waveform [V] or [A]
   */
  public double peak() {
    return peak;
  }
}
