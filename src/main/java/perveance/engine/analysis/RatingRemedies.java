package perveance.engine.analysis;

import java.util.List;
import java.util.Map;
import java.util.Optional;
import perveance.engine.base.PreferredSeries;
import perveance.engine.base.QuantityFormat;
import perveance.engine.base.Remedy;
import perveance.engine.base.Unit;
import perveance.engine.circuit.Element.Valve;
import perveance.engine.stage.StageCircuit.Part;

/** Cures for a valve over one of its limits. */
final class RatingRemedies {
  /** A cure leaves this much of the limit unused [1]. */
  private static final double TARGET = 0.95;

  private RatingRemedies() {}

  static Optional<Remedy> of(FindingContext context, LimitUse use) {
    if (use.what().startsWith("heater-cathode")) {
      return elevate(context, use);
    } else if (use.what().startsWith("grid leak")) {
      return lowerLeak(context, use);
    } else if (use.when().equals(LimitShares.COLD)) {
      return Optional.empty();
    }
    Remedies remedies = context.remedies();
    List<Part> setters = setters(context);
    return remedies.smallest(setters, v -> cured(v, use));
  }

  /** Resistors that set the working point: those that carry the valve's current. */
  private static List<Part> setters(FindingContext context) {
    return context.remedies().resistors().stream().filter(p -> carriesCurrent(context, p)).toList();
  }

  private static boolean carriesCurrent(FindingContext context, Part part) {
    int element = context.model().circuit().element(part.element());
    double current =
        Math.abs(
            context.model().dc().current(context.model().circuit().elements().get(element).name()));
    double largest =
        context.answer().points().stream().mapToDouble(DevicePoint::anodeCurrent).max().orElse(0);
    return current > 0.02 * largest;
  }

  private static boolean cured(Variant variant, LimitUse use) {
    return variant.limits().stream()
        .filter(
            u ->
                u.ref().equals(use.ref())
                    && u.what().equals(use.what())
                    && u.when().equals(use.when())
                    && u.source().equals(use.source()))
        .allMatch(u -> u.share() <= TARGET);
  }

  /** Lifts the heaters to half the cathode's voltage, as far as the other limit allows. */
  private static Optional<Remedy> elevate(FindingContext context, LimitUse use) {
    double cathode =
        context.answer().points().stream()
            .filter(p -> p.ref().equals(use.ref()))
            .mapToDouble(DevicePoint::cathodeChassis)
            .max()
            .orElse(0);
    if (!(cathode > 0)) {
      return Optional.empty();
    }
    for (double share : new double[] {0.3, 0.4, 0.5, 0.6}) {
      double volts = 5 * Math.round(share * cathode / 5);
      String text = QuantityFormat.PLAIN.part(volts, Unit.VOLT);
      Optional<Variant> tried =
          context.retry().with(context.ref(), Map.of("heater_elevation", text));
      if (tried.isPresent() && heatersWithin(tried.get(), use)) {
        return Optional.of(
            Remedy.set(
                "Heaters lifted to "
                    + Words.part(volts, Unit.VOLT)
                    + " by a divider keep heater to cathode within the limit, cold and warm.",
                "heater_elevation",
                text));
      }
    }
    return Optional.of(
        Remedy.byHand(
            "Feed the heater of "
                + use.ref()
                + " from a winding of its own that is lifted to about "
                + Words.roughly(cathode, Unit.VOLT)
                + "."));
  }

  private static boolean heatersWithin(Variant variant, LimitUse use) {
    return variant.limits().stream()
        .filter(u -> u.what().startsWith("heater-cathode") && u.source().equals(use.source()))
        .allMatch(u -> u.share() <= 1);
  }

  /** The largest preferred leak within the limit, for the resistor from grid to its foot. */
  private static Optional<Remedy> lowerLeak(FindingContext context, LimitUse use) {
    Valve valve = context.model().valve(use.ref());
    Remedies remedies = context.remedies();
    Optional<Part> leak =
        remedies.resistors().stream()
            .filter(p -> p.value() > 0.5 * use.value())
            .filter(
                p ->
                    PartRoles.touches(context.model(), p, valve.grid())
                        || p.role().contains("grid leak"))
            .findFirst();
    return leak.flatMap(
        p ->
            remedies
                .trial(p, PreferredSeries.E12.below(p.value() * use.limit() / use.value()))
                .map(remedies::remedy));
  }
}
