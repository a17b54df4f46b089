package perveance.engine.device;

/**
 * A place at which a law is tried.
 *
 * @param anode anode voltage [V]
 * @param grid grid voltage [V]
 * @param screen screen voltage [V]
 */
record ElectrodeVoltages(double anode, double grid, double screen) {
  ElectrodeVoltages moved(int electrode, double by) {
    return new ElectrodeVoltages(
        anode + (electrode == ElectrodeCurrents.ANODE ? by : 0),
        grid + (electrode == ElectrodeCurrents.GRID ? by : 0),
        screen + (electrode == ElectrodeCurrents.SCREEN ? by : 0));
  }

  ElectrodeVoltages towards(ElectrodeVoltages other, double share) {
    return new ElectrodeVoltages(
        anode + share * (other.anode - anode),
        grid + share * (other.grid - grid),
        screen + share * (other.screen - screen));
  }

  double component(int electrode) {
    return switch (electrode) {
      case ElectrodeCurrents.ANODE -> anode;
      case ElectrodeCurrents.GRID -> grid;
      default -> screen;
    };
  }
}
