package perveance.accuracy;

import java.util.ArrayList;
import java.util.LinkedHashMap;
import java.util.LinkedHashSet;
import java.util.List;
import java.util.Map;
import java.util.Set;
import perveance.engine.device.Device;
import perveance.engine.device.Evidence;
import perveance.engine.device.fit.Figure;
import perveance.engine.device.fit.LawReadings;
import perveance.engine.device.fit.Residual;

/** Every device's own evidence, whatever its kind: lines by type and kind of evidence. */
final class LibraryEvidence implements AccuracySource {
  @Override
  public List<AccuracyLine> lines() {
    List<AccuracyLine> lines = new ArrayList<>();
    Set<String> seen = new LinkedHashSet<>();
    for (String name : Library.names().stream().sorted().toList()) {
      Device device = Library.device(name);
      if (device.type().equals(name) && seen.add(name)) {
        lines.addAll(of(device));
      }
    }
    return lines;
  }

  private static List<AccuracyLine> of(Device device) {
    Map<String, List<Residual>> byKind = new LinkedHashMap<>();
    for (Residual residual : new LawReadings(device.law()).compare(device.evidence())) {
      String kind = kind(residual);
      if (residual.evidence().confidence().equals("low")) {
        kind = kind + ", marked low";
      } else if (!residual.evidence().fit()) {
        kind = kind + ", check only";
      }
      byKind.computeIfAbsent(kind, k -> new ArrayList<>()).add(residual);
    }
    List<AccuracyLine> lines = new ArrayList<>();
    byKind.forEach(
        (kind, residuals) ->
            lines.add(
                AccuracyLine.relative(
                    device.type(),
                    kind,
                    residuals.get(0).evidence().fit(),
                    residuals.stream().map(Residual::relativeError).toList(),
                    sources(residuals))));
    return lines;
  }

  static String kind(Residual residual) {
    Evidence evidence = residual.evidence();
    String tied =
        evidence.connection().equals("triode") && evidence.screenVoltage().isPresent()
            ? "triode-connected "
            : "";
    if (evidence.kind().equals("curve")) {
      return tied + "chart";
    }
    if (evidence.kind().equals("cut-off") && residual.figure() == Figure.MUTUAL_CONDUCTANCE) {
      return "gm at remote cut-off";
    }
    if (evidence.connection().equals("pentode")) {
      return pentode(residual.figure());
    }
    return tied
        + switch (residual.figure()) {
          case CURRENT ->
              evidence.connection().equals("diode")
                  ? "current at the printed drop"
                  : "tabulated current";
          case SCREEN_CURRENT -> "tabulated screen current";
          case AMPLIFICATION, ANODE_RESISTANCE, MUTUAL_CONDUCTANCE -> "tabulated mu, ra, gm";
          case CUT_OFF -> "cut-off voltage";
        };
  }

  private static String pentode(Figure figure) {
    return switch (figure) {
      case CURRENT -> "tabulated current";
      case SCREEN_CURRENT -> "tabulated screen current";
      case AMPLIFICATION, MUTUAL_CONDUCTANCE -> "tabulated gm, mu(g1-g2)";
      case ANODE_RESISTANCE -> "tabulated ra";
      case CUT_OFF -> "cut-off voltage";
    };
  }

  static String sources(List<Residual> residuals) {
    Set<String> sources = new LinkedHashSet<>();
    for (Residual residual : residuals) {
      sources.add(shortened(residual.evidence()));
    }
    String first = sources.iterator().next();
    return sources.size() == 1 ? first : first + " and " + (sources.size() - 1) + " more";
  }

  /** The publication without its page, and how it was had. */
  private static String shortened(Evidence evidence) {
    String source = evidence.source();
    int end = source.length();
    for (String mark : new String[] {" (", ";", ","}) {
      int at = source.indexOf(mark);
      end = at > 0 ? Math.min(end, at) : end;
    }
    return source.substring(0, end) + " (" + evidence.how() + ")";
  }
}
