package perveance.engine.analysis;

import java.util.ArrayList;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import perveance.engine.base.BiasMessage;
import perveance.engine.base.Finding;
import perveance.engine.base.PreferredSeries;
import perveance.engine.base.QuantityFormat;
import perveance.engine.base.Remedy;
import perveance.engine.base.Severity;
import perveance.engine.base.Unit;

/** Findings about the control of a fixed bias: its range, and what an open wiper does. */
final class BiasSupplyFindings {
  /** Room left at either end of a range that is worked out, in parts of the bias [1]. */
  private static final double ROOM = 0.05;

  private final FindingContext context;
  private final BiasSupplyAnswer supply;
  private final double bias;
  private final List<Finding> findings = new ArrayList<>();

  private BiasSupplyFindings(FindingContext context, BiasSupplyAnswer supply) {
    this.context = context;
    this.supply = supply;
    this.bias = context.values().number("grid_bias");
  }

  static List<Finding> of(FindingContext context) {
    Optional<BiasSupplyAnswer> supply = context.answer().biasSupply();
    if (supply.isEmpty()) {
      return List.of();
    }
    BiasSupplyFindings all = new BiasSupplyFindings(context, supply.get());
    all.range();
    all.wiper();
    return all.findings;
  }

  /** Settings that valves as they differ want: the idle current of each brought to the typical. */
  private double wanted(int end) {
    double furthest = bias;
    for (DevicePoint point : context.answer().points()) {
      Band band = point.bands().get("anodeCurrent");
      if (band != null && point.mutualConductance() > 0) {
        double current = end < 0 ? band.high() : band.low();
        double at = bias - (current - point.anodeCurrent()) / point.mutualConductance();
        furthest = end < 0 ? Math.min(furthest, at) : Math.max(furthest, at);
      }
    }
    return Math.min(0, furthest);
  }

  private void range() {
    double most = wanted(-1);
    double least = wanted(1);
    boolean reached = supply.setting().isPresent();
    if (reached && supply.most() <= most && supply.least() >= least) {
      return;
    }
    Finding finding =
        reached
            ? Finding.of(
                BiasMessage.BIAS_RANGE_SMALL,
                Severity.NOTE,
                context.ref(),
                context.ref(),
                Words.of(supply.least(), Unit.VOLT),
                Words.of(supply.most(), Unit.VOLT),
                Words.roughly(least, Unit.VOLT),
                Words.roughly(most, Unit.VOLT))
            : Finding.of(
                    BiasMessage.BIAS_OUT_OF_RANGE,
                    Severity.CAUTION,
                    context.ref(),
                    context.ref(),
                    Words.of(bias, Unit.VOLT),
                    Words.of(supply.least(), Unit.VOLT),
                    Words.of(supply.most(), Unit.VOLT))
                .withValue(bias, supply.most(), Unit.VOLT);
    findings.add(finding.withRemedy(remedy(most, least)));
  }

  /** Resistors on either side of the same control that give the range wanted. */
  private Remedy remedy(double most, double least) {
    double far = (1 + ROOM) * most;
    double near = (1 - ROOM) * least;
    double pot = context.values().number("bias_pot");
    if (far <= supply.raw() || !(near < 0)) {
      return Remedy.byHand(
          "It takes a bias supply more negative than " + Words.of(far, Unit.VOLT) + ".");
    }
    BiasDivider exact = BiasDivider.reaching(supply.raw(), pot, far, near);
    double top = PreferredSeries.E24.below(exact.top());
    double bottom = PreferredSeries.E24.nearest(exact.bottom());
    Map<String, String> edits = new LinkedHashMap<>();
    edits.put("bias_top", QuantityFormat.PLAIN.part(top, Unit.OHM));
    edits.put("bias_bottom", QuantityFormat.PLAIN.part(bottom, Unit.OHM));
    String text =
        Words.part(top, Unit.OHM)
            + " to the bias supply and "
            + Words.part(bottom, Unit.OHM)
            + " to chassis make it "
            + Words.of(near, Unit.VOLT)
            + " to "
            + Words.of(far, Unit.VOLT)
            + ", about.";
    return new Remedy(text, edits);
  }

  /** Without a resistor that holds it the grids float when the wiper loses its track. */
  private void wiper() {
    if (supply.openWiper().isPresent()) {
      return;
    }
    double hold = PreferredSeries.E12.nearest(10 * context.values().number("bias_pot"));
    Finding finding =
        Finding.of(BiasMessage.BIAS_WIPER_OPEN, Severity.CAUTION, context.ref(), context.ref());
    findings.add(
        finding.withRemedy(
            Remedy.set(
                Words.part(hold, Unit.OHM)
                    + " from the wiper to the bias supply takes the grids to "
                    + Words.of(supply.raw(), Unit.VOLT)
                    + " instead.",
                "bias_hold",
                QuantityFormat.PLAIN.part(hold, Unit.OHM))));
  }
}
