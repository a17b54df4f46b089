package perveance.engine.analysis;

import java.util.OptionalDouble;

/**
 * What a meter should read at a test point, against chassis.
 *
 * @param testPoint number on the sheet [1]
 * @param device section, empty for a supply node
 * @param electrode {@code anode}, {@code cathode}, ...; empty for a supply node
 * @param pin pin on the base, empty when not known
 * @param node circuit node
 * @param trueValue without a meter [V]
 * @param reading with the stated meter on it and today's mains [V]
 * @param low 95 % band of the reading [V]
 * @param high 95 % band of the reading [V]
 * @param stop reading beyond which to switch off, from a maker's or a hazard limit [V]
 * @param basis which of the three statements it is: predicted from typical data
 */
public record ExpectedReading(
    int testPoint,
    String device,
    String electrode,
    String pin,
    String node,
    double trueValue,
    double reading,
    double low,
    double high,
    OptionalDouble stop,
    String basis) {}
