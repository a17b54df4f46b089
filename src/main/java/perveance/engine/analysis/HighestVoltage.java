package perveance.engine.analysis;

import java.util.Optional;
import perveance.engine.circuit.DcSolution;

/**
 * The highest voltage anywhere in a chassis, loaded or with cold valves.
 *
 * @param node where it is; empty where nothing is solved
 * @param voltage magnitude to chassis [V]
 */
record HighestVoltage(String node, double voltage) {
  static HighestVoltage of(ChassisModel model, Optional<DcSolution> cold) {
    HighestVoltage highest = new HighestVoltage("", 0);
    for (int node = 0; node < model.whole().circuit().nodes().size(); node++) {
      int n = node;
      double loaded = model.dc().map(p -> Math.abs(p.voltage(n))).orElse(0.0);
      double atStart = cold.map(p -> Math.abs(p.voltage(n))).orElse(0.0);
      // what differs by rounding alone is the same; the supply node comes first
      if (Math.max(loaded, atStart) > highest.voltage() * (1 + 1e-6)) {
        String name = model.whole().circuit().nodes().get(node);
        highest = new HighestVoltage(name, Math.max(loaded, atStart));
      }
    }
    return highest;
  }
}
