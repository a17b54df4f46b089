package perveance.engine.analysis;

import java.util.Optional;
import perveance.engine.stage.PartRatings;
import perveance.engine.stage.StageCircuit;

/**
 * What a part has to stand, and what to buy.
 *
 * @param part the part
 * @param designator for example {@code R1}
 * @param idleVoltage across it at idle [V]
 * @param idlePower [W]
 * @param workingPower at idle or at the stated drive, whichever is more [W]
 * @param worstVoltage in the worst case (valve shorted, or drive) [V]
 * @param worstPower in the worst case [W]
 * @param worstCase what the worst case is
 * @param coldVoltage across it with cold valves [V]
 * @param nearest nearest preferred value, in the part's unit [1]
 * @param buy rating to buy, in words: {@code 1 W, 350 V or more}
 * @param rated what the stage states of the part that is fitted
 */
public record PartDuty(
    StageCircuit.Part part,
    String designator,
    double idleVoltage,
    double idlePower,
    double workingPower,
    double worstVoltage,
    double worstPower,
    String worstCase,
    double coldVoltage,
    double nearest,
    Optional<String> buy,
    PartRatings rated) {}
