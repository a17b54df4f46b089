package perveance.engine.device;

import java.util.OptionalDouble;

/**
 * One published figure or reading that a law answers to.
 *
 * @param connection {@code triode}, {@code pentode} or {@code diode}
 * @param kind {@code point} (tabulated), {@code curve} (read off a chart), {@code cut-off}
 * @param anodeVoltage anode to cathode [V]
 * @param gridVoltage grid to cathode [V]
 * @param screenVoltage screen to cathode [V]; empty for a triode; equal to the anode when tied
 * @param anodeCurrent anode current, or cathode current where tied [A]
 * @param screenCurrent screen current [A]
 * @param amplificationFactor mu (mu g1-g2 for a pentode) [1]
 * @param anodeResistance ra [ohm]
 * @param mutualConductance gm [S]
 * @param fit true where the law was fitted to it, false where it only checks
 * @param source publication
 * @param how {@code found} or {@code memory}
 * @param confidence {@code high}, {@code medium} or {@code low}
 * @param note remark, may be empty
 */
public record Evidence(
    String connection,
    String kind,
    double anodeVoltage,
    OptionalDouble gridVoltage,
    OptionalDouble screenVoltage,
    OptionalDouble anodeCurrent,
    OptionalDouble screenCurrent,
    OptionalDouble amplificationFactor,
    OptionalDouble anodeResistance,
    OptionalDouble mutualConductance,
    boolean fit,
    String source,
    String how,
    String confidence,
    String note) {}
