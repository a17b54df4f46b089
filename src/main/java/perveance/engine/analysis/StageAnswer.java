package perveance.engine.analysis;

import java.util.List;
import java.util.Optional;
import perveance.engine.base.Finding;
import perveance.engine.stage.Drawing;
import perveance.engine.stage.StageCircuit;

/**
 * Everything a stage answers; the same shape for every kind.
 *
 * @param ref reference
 * @param kind name of the kind
 * @param circuit what is where
 * @param drawing the schematic
 * @param points operating point of each valve section
 * @param limits use of every published limit
 * @param smallSignal small-signal figures
 * @param clean clean swing
 * @param driven at the stated drive, empty when none is stated
 * @param levels against level, rising
 * @param large overload and reactive load
 * @param biasSupply how far a fixed bias can be set, empty where the stage states no control
 * @param parts what each part has to stand
 * @param readings expected meter readings in measuring order
 * @param loadLine load lines, empty when the kind has none
 * @param sums hand sums
 * @param assumptions what the figures assume
 * @param findings worst first
 */
public record StageAnswer(
    String ref,
    String kind,
    StageCircuit circuit,
    Drawing drawing,
    List<DevicePoint> points,
    List<LimitUse> limits,
    SmallSignalAnswer smallSignal,
    CleanSwing clean,
    Optional<DrivenAnswer> driven,
    List<DrivenAnswer> levels,
    LargeSignalAnswer large,
    Optional<BiasSupplyAnswer> biasSupply,
    List<PartDuty> parts,
    List<ExpectedReading> readings,
    Optional<LoadLineView> loadLine,
    List<HandSum> sums,
    List<String> assumptions,
    List<Finding> findings) {
  /** Copies the lists. */
  public StageAnswer {
    points = List.copyOf(points);
    limits = List.copyOf(limits);
    levels = List.copyOf(levels);
    parts = List.copyOf(parts);
    readings = List.copyOf(readings);
    sums = List.copyOf(sums);
    assumptions = List.copyOf(assumptions);
    findings = List.copyOf(findings);
  }

  /**
   * The same with findings.
   *
   * @param found findings, worst first
   * @return the changed answer
   */
  public StageAnswer withFindings(List<Finding> found) {
    return new StageAnswer(
        ref,
        kind,
        circuit,
        drawing,
        points,
        limits,
        smallSignal,
        clean,
        driven,
        levels,
        large,
        biasSupply,
        parts,
        readings,
        loadLine,
        sums,
        assumptions,
        found);
  }
}
