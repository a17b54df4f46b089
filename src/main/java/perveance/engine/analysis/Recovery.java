package perveance.engine.analysis;

/**
 * Recovery from an overload: grid current charges the capacitor before the grid until the drive
 * ends, and the bias is too deep until the charge has leaked away.
 *
 * @param capacitor the capacitor before the grid
 * @param inputPeak peak of the overload, held until the charge no longer grows [V]
 * @param charge volts that the overload adds across the capacitor [V]
 * @param resistance through which they leak away [ohm]
 * @param left difference from its bias at which the grid counts as recovered [V]
 * @param seconds until then, zero where the charge is no more than that [s]
 */
public record Recovery(
    InputCapacitor capacitor,
    double inputPeak,
    double charge,
    double resistance,
    double left,
    double seconds) {}
