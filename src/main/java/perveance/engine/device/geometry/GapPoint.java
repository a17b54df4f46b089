package perveance.engine.device.geometry;

/**
 * State at one place between cathode and anode.
 *
 * @param distance from the cathode [m]
 * @param potential with space charge [V]
 * @param field slope of the potential with space charge [V/m]
 * @param chargeDensity magnitude of the space charge [C m^-3]
 * @param speed of the electrons [m/s]
 * @param emptyPotential potential were there no charge [V]
 * @param emptyField slope of the potential were there no charge [V/m]
 */
public record GapPoint(
    double distance,
    double potential,
    double field,
    double chargeDensity,
    double speed,
    double emptyPotential,
    double emptyField) {}
