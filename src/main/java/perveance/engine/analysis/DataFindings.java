package perveance.engine.analysis;

import java.util.ArrayList;
import java.util.Comparator;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Optional;
import java.util.stream.Collectors;
import perveance.engine.analysis.Band.Share;
import perveance.engine.base.DataMessage;
import perveance.engine.base.Finding;
import perveance.engine.base.QuantityFormat;
import perveance.engine.base.Remedy;
import perveance.engine.base.Severity;
import perveance.engine.base.Unit;
import perveance.engine.device.Device;
import perveance.engine.device.Evidence;
import perveance.engine.device.LawParameter;
import perveance.engine.device.fit.LawReadings;
import perveance.engine.device.fit.Residual;
import perveance.engine.stage.ChassisNames;
import perveance.engine.stage.StageCircuit.Part;
import perveance.engine.stage.StageCircuit.StageDevice;

/** Findings about how far the answer can be trusted, and what would narrow it. */
final class DataFindings {
  /** A law that misses its data by more than this is loose [1]. */
  private static final double LOOSE = 0.10;

  /** A device file keeps its worst error to three figures [1]. */
  private static final double ROUNDING = 0.01;

  /** A cause with this share of a band is worth measuring [1]. */
  private static final double MOST = 0.4;

  private final FindingContext context;
  private final List<Finding> findings = new ArrayList<>();

  private DataFindings(FindingContext context) {
    this.context = context;
  }

  static List<Finding> of(FindingContext context) {
    DataFindings all = new DataFindings(context);
    for (DevicePoint point : context.answer().points()) {
      all.outside(point);
    }
    context.answer().circuit().devices().stream()
        .collect(
            Collectors.toMap(StageDevice::device, d -> d, (one, other) -> one, LinkedHashMap::new))
        .values()
        .forEach(
            d -> {
              all.fit(d);
              all.spreadOfGrid(d.device());
            });
    context.answer().points().stream().findFirst().ifPresent(all::cause);
    return all.findings;
  }

  private void outside(DevicePoint point) {
    point
        .outsideEvidence()
        .ifPresent(
            what ->
                findings.add(
                    Finding.of(
                            DataMessage.OUTSIDE_EVIDENCE,
                            Severity.CAUTION,
                            context.ref(),
                            point.ref(),
                            what)
                        .onPart(point.ref())));
  }

  /** The figure that the law misses most, of those that are for this way of connecting it. */
  private void fit(StageDevice valve) {
    Device device = valve.device();
    if (device.fit().worstError() <= LOOSE) {
      return;
    }
    boolean tied = valve.connection().equals("triode");
    List<Evidence> fitted =
        device.evidence().stream()
            .filter(e -> e.fit() && e.connection().equals("triode") == tied)
            .toList();
    // what is further off was distrusted when the law was fitted
    double most = device.fit().worstError() * (1 + ROUNDING);
    new LawReadings(device.law())
        .compare(fitted).stream()
            .filter(r -> Math.abs(r.relativeError()) > LOOSE && Math.abs(r.relativeError()) <= most)
            .max(Comparator.comparingDouble(r -> Math.abs(r.relativeError())))
            .ifPresent(r -> findings.add(loose(device.type(), r)));
  }

  private Finding loose(String type, Residual worst) {
    double error = Math.abs(worst.relativeError());
    String place =
        Words.of(worst.evidence().anodeVoltage(), Unit.VOLT)
            + worst.evidence().gridVoltage().stream()
                .mapToObj(v -> " and " + Words.of(v, Unit.VOLT) + " of bias")
                .findFirst()
                .orElse("");
    return Finding.of(
            DataMessage.FIT_LOOSE,
            Severity.NOTE,
            context.ref(),
            type,
            worst.figure().word(),
            place,
            Words.percent(error))
        .withValue(error, LOOSE, Unit.RATIO);
  }

  /** With one published point nothing tells how uneven the grid is; its class does. */
  private void spreadOfGrid(Device device) {
    List<Evidence> fitted = device.evidence().stream().filter(Evidence::fit).toList();
    Optional<LawParameter> spread =
        device.law().parameters().stream().filter(p -> p.key().equals("spread")).findFirst();
    if (fitted.size() == 1 && spread.isPresent()) {
      findings.add(
          Finding.of(
              DataMessage.SPREAD_ASSUMED,
              Severity.NOTE,
              context.ref(),
              device.type(),
              Words.roughly(spread.get().value(), Unit.RATIO)));
    }
  }

  /** The part or supply behind most of the doubt in the anode voltage: worth measuring. */
  private void cause(DevicePoint point) {
    boolean fed =
        context
            .answer()
            .loadLine()
            .filter(l -> l.ref().equals(point.ref()) && BiasFindings.resistive(l))
            .isPresent();
    Band band = point.bands().get("anodeChassis");
    if (!fed || band == null || onSupply(point)) {
      return;
    }
    band.shares().stream()
        .max(Comparator.comparingDouble(Share::fraction))
        .filter(s -> s.fraction() >= MOST && !ofValve(s.cause()))
        .ifPresent(s -> findings.add(worthMeasuring(point, band, s)));
  }

  /** An anode on the supply itself says nothing that the supply does not. */
  private boolean onSupply(DevicePoint point) {
    int anode = context.model().valve(point.ref()).anode();
    String node = context.model().circuit().nodes().get(anode);
    return node.startsWith(ChassisNames.supply(""));
  }

  private static boolean ofValve(String cause) {
    return cause.endsWith("conduction") || cause.endsWith("contact potential");
  }

  /** Whether a cause is a supply node or one of its parts. */
  private static boolean ofSupply(String cause) {
    return cause.startsWith("supply ");
  }

  /** The supply or stage that a cause outside this stage belongs to: "supply B", "V1a". */
  private static String owner(String cause) {
    int end = cause.indexOf(' ', ofSupply(cause) ? "supply ".length() : 0);
    return end < 0 ? cause : cause.substring(0, end);
  }

  /** A cause outside this stage as a person would say it: "the dropper of supply B". */
  private static String said(String cause) {
    String owner = owner(cause);
    return owner.equals(cause)
        ? cause
        : "the " + cause.substring(owner.length() + 1).replace('_', ' ') + " of " + owner;
  }

  private Finding worthMeasuring(DevicePoint point, Band band, Share most) {
    Optional<Part> part =
        context.answer().circuit().parts().stream()
            .filter(p -> p.element().equals(context.ref() + "." + most.cause()))
            .findFirst();
    String named = part.map(context::named).orElse(said(most.cause()));
    double middle = 0.5 * (band.low() + band.high());
    double half = 0.5 * (band.high() - band.low()) * Math.sqrt(1 - most.fraction());
    Finding finding =
        Finding.of(
                DataMessage.BAND_CAUSE,
                Severity.NOTE,
                part.isPresent() ? context.ref() : owner(most.cause()),
                point.ref(),
                Words.percent(most.fraction()),
                "anode voltage",
                named,
                QuantityFormat.TYPESET.range(middle - half, middle + half, Unit.VOLT))
            .withValue(most.fraction(), Unit.RATIO)
            .withRemedy(Remedy.byHand("Measure " + named + " and state what you find."));
    return part.map(p -> finding.onPart(p.element())).orElse(finding);
  }
}
