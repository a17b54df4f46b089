package perveance.engine.device;

/**
 * The region that a law's evidence covers; outside it a result says so.
 *
 * @param lowestAnodeVoltage [V]
 * @param highestAnodeVoltage [V]
 * @param lowestCurrent smallest anode current with evidence [A]
 * @param highestCurrent largest anode current with evidence [A]
 * @param lowestGridVoltage most negative grid voltage with evidence [V]
 * @param highestGridVoltage most positive grid voltage with evidence [V]
 */
public record Validity(
    double lowestAnodeVoltage,
    double highestAnodeVoltage,
    double lowestCurrent,
    double highestCurrent,
    double lowestGridVoltage,
    double highestGridVoltage) {}
