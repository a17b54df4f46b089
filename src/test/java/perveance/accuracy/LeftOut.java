package perveance.accuracy;

import java.util.ArrayList;
import java.util.LinkedHashMap;
import java.util.LinkedHashSet;
import java.util.List;
import java.util.Map;
import java.util.Set;
import perveance.engine.device.Device;
import perveance.engine.device.Evidence;
import perveance.engine.device.LawKind;
import perveance.engine.device.fit.FitResult;
import perveance.engine.device.fit.LawReadings;
import perveance.engine.device.fit.Residual;

/**
 * How a law fares at points that it was not fitted to: of every type with three tabulated points or
 * more, each point in turn is left out, the law fitted to the rest, and the figures at the point
 * predicted. Two publications of one point are left out together.
 */
final class LeftOut implements AccuracySource {
  private static final int FEWEST = 3;

  /** Where a point stands: connection, anode, grid and screen voltage. */
  private record Place(String connection, double anode, double grid, double screen) {
    static Place of(Evidence e) {
      return new Place(
          e.connection(), e.anodeVoltage(), e.gridVoltage().orElse(0), e.screenVoltage().orElse(0));
    }
  }

  @Override
  public List<AccuracyLine> lines() {
    List<AccuracyLine> lines = new ArrayList<>();
    Set<String> seen = new LinkedHashSet<>();
    for (String name : Library.names().stream().sorted().toList()) {
      Device device = Library.device(name);
      if (device.law().kind() != LawKind.DIODE && seen.add(device.type())) {
        lines.addAll(of(device));
      }
    }
    return lines;
  }

  private static List<AccuracyLine> of(Device device) {
    Set<Place> places = new LinkedHashSet<>();
    device.evidence().stream().filter(LeftOut::tabulated).map(Place::of).forEach(places::add);
    if (places.size() < FEWEST) {
      return List.of();
    }
    Map<String, List<Residual>> byKind = new LinkedHashMap<>();
    for (Place place : places) {
      for (Residual residual : predicted(device, place)) {
        byKind
            .computeIfAbsent(LibraryEvidence.kind(residual), k -> new ArrayList<>())
            .add(residual);
      }
    }
    List<AccuracyLine> lines = new ArrayList<>();
    byKind.forEach(
        (kind, residuals) ->
            lines.add(
                AccuracyLine.relative(
                    device.type(),
                    kind + ", point left out",
                    false,
                    residuals.stream().map(Residual::relativeError).toList(),
                    LibraryEvidence.sources(residuals))));
    return lines;
  }

  private static boolean tabulated(Evidence e) {
    return e.fit() && !e.confidence().equals("low") && e.kind().equals("point");
  }

  /** The figures at a place beside a law that has not seen them. */
  private static List<Residual> predicted(Device device, Place place) {
    List<Evidence> rest = new ArrayList<>();
    List<Evidence> left = new ArrayList<>();
    for (Evidence e : device.evidence()) {
      if (!Place.of(e).equals(place)) {
        rest.add(e);
      } else if (tabulated(e)) {
        left.add(e);
      }
    }
    FitResult result = LibraryFits.fit(kind(device), device.heaters(), rest);
    if (result instanceof FitResult.Fitted fitted) {
      return new LawReadings(fitted.fit().law()).compare(left);
    }
    throw new IllegalStateException(device.type() + " without " + place + ": " + result);
  }

  private static String kind(Device device) {
    if (device.law().kind() == LawKind.TRIODE) {
      return "triode";
    }
    return device.beam() ? "beam" : "pentode";
  }
}
