package perveance.engine.circuit;

/**
 * Everything at one accepted time.
 *
 * @param time [s]
 * @param voltage by node [V]
 * @param current by element [A]
 * @param electrode by valve and electrode, three a valve [A]
 */
record TransientRow(double time, double[] voltage, double[] current, double[] electrode) {
  static final int ELECTRODES = 3;

  static TransientRow of(double time, double[] voltage, CurrentLedger ledger, ValveBank valves) {
    double[] electrode = new double[ELECTRODES * valves.count];
    for (int v = 0; v < valves.count; v++) {
      for (int e = 0; e < ELECTRODES; e++) {
        electrode[ELECTRODES * v + e] = valves.point[v].current(e);
      }
    }
    return new TransientRow(time, voltage.clone(), ledger.current.clone(), electrode);
  }
}
