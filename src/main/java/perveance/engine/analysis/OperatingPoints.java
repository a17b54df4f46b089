package perveance.engine.analysis;

import static perveance.engine.device.ElectrodeCurrents.ANODE;
import static perveance.engine.device.ElectrodeCurrents.GRID;
import static perveance.engine.device.ElectrodeCurrents.SCREEN;

import java.util.ArrayList;
import java.util.List;
import java.util.Map;
import java.util.OptionalDouble;
import perveance.engine.circuit.DcSolution;
import perveance.engine.circuit.ValvePoint;
import perveance.engine.device.LawKind;
import perveance.engine.stage.StageCircuit;
import perveance.engine.stage.StageCircuit.StageDevice;

/** Reads the operating point of a stage's devices off a dc solution. */
final class OperatingPoints {
  private OperatingPoints() {}

  /** Points of all sections of a stage, without bands. */
  static List<DevicePoint> of(StageCircuit stage, DcSolution dc) {
    List<DevicePoint> points = new ArrayList<>();
    for (StageDevice device : stage.devices()) {
      points.add(of(device, dc.valve(device.ref())));
    }
    return points;
  }

  private static DevicePoint of(StageDevice device, ValvePoint valve) {
    double cathode = valve.cathodeVoltage();
    boolean screened = device.device().law().kind() == LawKind.PENTODE;
    return new DevicePoint(
        device.ref(),
        device.device().type(),
        valve.voltage(ANODE),
        valve.voltage(GRID),
        only(screened, valve.voltage(SCREEN)),
        valve.voltage(ANODE) + cathode,
        cathode,
        valve.voltage(GRID) + cathode,
        only(screened, valve.voltage(SCREEN) + cathode),
        valve.current(ANODE),
        only(screened, valve.current(SCREEN)),
        valve.current(GRID),
        valve.mutualConductance(),
        valve.anodeResistance(),
        valve.amplificationFactor(),
        valve.power(ANODE),
        only(screened, valve.power(SCREEN)),
        Map.of(),
        EvidenceRegion.outside(device.device().validity(), valve));
  }

  private static OptionalDouble only(boolean present, double value) {
    return present ? OptionalDouble.of(value) : OptionalDouble.empty();
  }
}
