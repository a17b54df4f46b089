package perveance.engine.device.fit;

import java.util.ArrayList;
import java.util.List;
import java.util.OptionalDouble;
import perveance.engine.device.Evidence;

/**
 * Chooses from the evidence what a fit answers to, and how much each figure counts.
 *
 * <p>Deviations, the same for every type: tabulated current, mu, ra and gm 3 % (printed to two
 * figures and rounded against each other; 3.7 % each where all three slopes of a point are given,
 * because mu = gm ra makes one of them no news), with a floor for small currents of 0.2 % of the
 * highest; chart readings 0.6 % of the chart's highest current and 1 %; cut-off points 4 % of the
 * grid voltage ("approximate" on the sheets). Figures marked low do not count.
 */
final class Observations {
  private static final double TABLE = 0.03;
  private static final double ALL_THREE = Math.sqrt(1.5);
  private static final double TABLE_FLOOR = 0.002;
  private static final double CHART_FLOOR = 0.006;
  private static final double CHART = 0.01;
  private static final double CUT_OFF = 0.04;

  private Observations() {}

  /** Evidence that counts for a triode's fit, told against the filament's middle. */
  static List<Evidence> usable(List<Evidence> evidence, FitConditions conditions) {
    List<Evidence> usable = new ArrayList<>();
    for (Evidence entry : evidence) {
      boolean counts = entry.fit() && !entry.confidence().equals("low");
      if (counts && entry.connection().equals("triode") && entry.gridVoltage().isPresent()) {
        usable.add(conditions.filament().map(filament -> moved(entry, filament)).orElse(entry));
      }
    }
    return usable;
  }

  private static Evidence moved(Evidence entry, Filament filament) {
    if (filament.heating() == Heating.ALTERNATING) {
      return entry;
    }
    return new Evidence(
        entry.connection(),
        entry.kind(),
        filament.toMiddle(entry.anodeVoltage()),
        OptionalDouble.of(filament.toMiddle(entry.gridVoltage().orElseThrow())),
        entry.screenVoltage(),
        entry.anodeCurrent(),
        entry.screenCurrent(),
        entry.amplificationFactor(),
        entry.anodeResistance(),
        entry.mutualConductance(),
        entry.fit(),
        entry.source(),
        entry.how(),
        entry.confidence(),
        entry.note());
  }

  static List<Observation> of(List<Evidence> used) {
    double highestCurve = LawReadings.highestCurve(used);
    double highestPoint = 0;
    for (Evidence entry : used) {
      highestPoint = Math.max(highestPoint, entry.anodeCurrent().orElse(0));
    }
    List<Observation> observations = new ArrayList<>();
    for (Evidence entry : used) {
      double slopes = TABLE * (slopesOf(entry) == 3 ? ALL_THREE : 1);
      for (Figure figure : Figure.values()) {
        OptionalDouble value = LawReadings.published(entry, figure);
        if (value.isEmpty() || figure == Figure.SCREEN_CURRENT) {
          continue;
        }
        double published = value.getAsDouble();
        observations.add(
            switch (figure) {
              case CURRENT, SCREEN_CURRENT ->
                  new Observation(
                      entry,
                      figure,
                      published,
                      entry.kind().equals("curve")
                          ? Math.hypot(CHART_FLOOR * highestCurve, CHART * published)
                          : Math.hypot(TABLE_FLOOR * highestPoint, TABLE * published));
              case CUT_OFF ->
                  new Observation(entry, figure, published, CUT_OFF * Math.abs(published));
              case AMPLIFICATION, ANODE_RESISTANCE, MUTUAL_CONDUCTANCE ->
                  new Observation(entry, figure, Math.log(published), slopes);
            });
      }
    }
    return observations;
  }

  private static int slopesOf(Evidence entry) {
    return (entry.amplificationFactor().isPresent() ? 1 : 0)
        + (entry.anodeResistance().isPresent() ? 1 : 0)
        + (entry.mutualConductance().isPresent() ? 1 : 0);
  }
}
