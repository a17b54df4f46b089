package perveance.engine.circuit;

/**
 * Junction law: I = Is (exp(V / (n VT)) - 1) forward in series with a resistance, and a reverse
 * breakdown at a stated voltage (zener).
 *
 * @param label type or colour, for reports
 * @param saturation Is [A]
 * @param emissionVoltage n VT [V]
 * @param series series resistance [ohm]
 * @param breakdown reverse breakdown, positive; positive infinity for none [V]
 * @param breakdownEmission slope voltage of the breakdown exponential [V]
 */
public record JunctionLaw(
    String label,
    double saturation,
    double emissionVoltage,
    double series,
    double breakdown,
    double breakdownEmission) {}
