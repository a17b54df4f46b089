package perveance.engine.device.fit;

import java.util.Optional;
import java.util.OptionalDouble;

/**
 * What a fit must know beside the evidence.
 *
 * @param filament the filament of a directly heated valve
 * @param gridOnset published grid voltage at 0.3 uA of grid current [V]; empty for the class value
 * @param robust true to trust outliers less and to name them, for readings that may hold a slip
 */
public record FitConditions(Optional<Filament> filament, OptionalDouble gridOnset, boolean robust) {
  /** Indirectly heated, onset unknown, every figure trusted. */
  public static final FitConditions USUAL =
      new FitConditions(Optional.empty(), OptionalDouble.empty(), false);

  /**
   * The same with a filament.
   *
   * @param heated the filament
   * @return conditions of a directly heated valve
   */
  public FitConditions with(Filament heated) {
    return new FitConditions(Optional.of(heated), gridOnset, robust);
  }

  /**
   * The same, robust against slips.
   *
   * @return conditions for readings
   */
  public FitConditions forReadings() {
    return new FitConditions(filament, gridOnset, true);
  }
}
