package perveance.engine.analysis;

import java.util.Map;
import java.util.Optional;
import java.util.OptionalDouble;

/**
 * Operating point of one valve section.
 *
 * @param ref reference, for example {@code V1a}
 * @param type device type
 * @param anode anode to cathode [V]
 * @param grid grid to cathode [V]
 * @param screen screen to cathode, empty for a triode [V]
 * @param anodeChassis anode to chassis [V]
 * @param cathodeChassis cathode to chassis [V]
 * @param gridChassis grid to chassis [V]
 * @param screenChassis screen to chassis, empty for a triode [V]
 * @param anodeCurrent [A]
 * @param screenCurrent empty for a triode [A]
 * @param gridCurrent [A]
 * @param mutualConductance gm [S]
 * @param anodeResistance ra [ohm]
 * @param amplificationFactor mu [1]
 * @param anodeDissipation [W]
 * @param screenDissipation empty for a triode [W]
 * @param bands bands by the name of the component, for example {@code anodeChassis}
 * @param outsideEvidence what lies outside the region of published evidence, empty when inside
 */
public record DevicePoint(
    String ref,
    String type,
    double anode,
    double grid,
    OptionalDouble screen,
    double anodeChassis,
    double cathodeChassis,
    double gridChassis,
    OptionalDouble screenChassis,
    double anodeCurrent,
    OptionalDouble screenCurrent,
    double gridCurrent,
    double mutualConductance,
    double anodeResistance,
    double amplificationFactor,
    double anodeDissipation,
    OptionalDouble screenDissipation,
    Map<String, Band> bands,
    Optional<String> outsideEvidence) {
  /** Copies the map. */
  public DevicePoint {
    bands = Map.copyOf(bands);
  }

  /**
   * The same with other bands.
   *
   * @param newBands bands by component name
   * @return the changed answer
   */
  public DevicePoint withBands(Map<String, Band> newBands) {
    return new DevicePoint(
        ref,
        type,
        anode,
        grid,
        screen,
        anodeChassis,
        cathodeChassis,
        gridChassis,
        screenChassis,
        anodeCurrent,
        screenCurrent,
        gridCurrent,
        mutualConductance,
        anodeResistance,
        amplificationFactor,
        anodeDissipation,
        screenDissipation,
        newBands,
        outsideEvidence);
  }
}
