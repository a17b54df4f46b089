package perveance.engine.analysis;

import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import perveance.engine.base.BiasMessage;
import perveance.engine.base.Finding;
import perveance.engine.base.Remedy;
import perveance.engine.base.Severity;
import perveance.engine.base.Unit;
import perveance.engine.circuit.Element.Valve;
import perveance.engine.device.ElectrodeCurrents;
import perveance.engine.stage.StageCircuit.Part;

/** Findings about where the valves idle. */
final class BiasFindings {
  /** Below this a receiving valve is as good as cut off [A]. */
  private static final double CUT_OFF = 20e-6;

  /** Published points end well above this; common practice to mark what lies below [A]. */
  private static final double LOW = 100e-6;

  /** Grid current that counts, the makers' criterion [A]. */
  private static final double GRID_CURRENT = 0.3e-6;

  /** Share of the open-circuit voltage from which the anode hardly swings up any more [1]. */
  private static final double NEAR_SUPPLY = 0.9;

  /** Share of it below which the valve is bottomed [1]. */
  private static final double BOTTOMED = 0.1;

  /** Ratio of the ends of the band from which an idle current must be set by measurement [1]. */
  private static final double WIDE = 1.8;

  /** A cathode that stands up by less than this of the bias leaves the bias to the grid [1]. */
  private static final double HELD_BY_GRID = 0.5;

  /** A grid this far above a cold cathode may arc or pull emission when it warms [V]. */
  private static final double COLD_GRID = 30;

  /** A remedy must not cost more clean output than this leaves [1]. */
  static final double KEPT = 0.8;

  private final FindingContext context;
  private final List<Finding> findings = new ArrayList<>();

  private BiasFindings(FindingContext context) {
    this.context = context;
  }

  static List<Finding> of(FindingContext context) {
    BiasFindings all = new BiasFindings(context);
    for (DevicePoint point : context.answer().points()) {
      all.cutOff(point);
      all.lowCurrent(point);
      all.gridCurrent(point);
      all.spread(point);
      all.coldGrid(point);
    }
    context.answer().loadLine().ifPresent(all::onLine);
    return all.findings;
  }

  private void add(Finding finding, DevicePoint point, Optional<Remedy> remedy) {
    Finding on = finding.onPart(point.ref());
    findings.add(remedy.map(on::withRemedy).orElse(on));
  }

  private void cutOff(DevicePoint point) {
    if (point.anodeCurrent() >= CUT_OFF) {
      return;
    }
    Finding finding =
        Finding.of(
                BiasMessage.CUT_OFF_IDLE,
                Severity.CAUTION,
                context.ref(),
                point.ref(),
                Words.of(point.anodeCurrent(), Unit.AMPERE))
            .withValue(point.anodeCurrent(), CUT_OFF, Unit.AMPERE);
    add(
        finding,
        point,
        context.remedies().smallest(biasParts(), v -> current(v, point.ref()) > 5 * CUT_OFF));
  }

  private void lowCurrent(DevicePoint point) {
    if (point.anodeCurrent() < CUT_OFF || point.anodeCurrent() >= LOW) {
      return;
    }
    Finding finding =
        Finding.of(
                BiasMessage.LOW_CURRENT,
                Severity.NOTE,
                context.ref(),
                point.ref(),
                Words.of(point.anodeCurrent(), Unit.AMPERE),
                Words.of(LOW, Unit.AMPERE))
            .withValue(point.anodeCurrent(), LOW, Unit.AMPERE);
    add(
        finding,
        point,
        context.remedies().smallest(biasParts(), v -> current(v, point.ref()) >= LOW));
  }

  private static double current(Variant variant, String ref) {
    return variant.points().stream()
        .filter(p -> p.ref().equals(ref))
        .mapToDouble(DevicePoint::anodeCurrent)
        .sum();
  }

  private void gridCurrent(DevicePoint point) {
    if (point.gridCurrent() < GRID_CURRENT) {
      return;
    }
    Finding finding =
        Finding.of(
                BiasMessage.GRID_CURRENT_IDLE,
                Severity.CAUTION,
                context.ref(),
                point.ref(),
                Words.of(point.gridCurrent(), Unit.AMPERE),
                Words.of(point.grid(), Unit.VOLT))
            .withValue(point.gridCurrent(), GRID_CURRENT, Unit.AMPERE);
    add(
        finding,
        point,
        context
            .remedies()
            .smallest(
                biasParts(),
                v ->
                    v.points().stream()
                            .filter(p -> p.ref().equals(point.ref()))
                            .allMatch(p -> p.gridCurrent() < GRID_CURRENT)
                        && v.clean().outputPeak() > KEPT * context.answer().clean().outputPeak()));
  }

  /** Before the valves warm, a grid wired straight to an anode stands at the whole supply. */
  private void coldGrid(DevicePoint point) {
    double volts =
        context.cold().map(dc -> dc.valve(point.ref()).voltage(ElectrodeCurrents.GRID)).orElse(0.0);
    if (volts > COLD_GRID) {
      add(
          Finding.of(
                  BiasMessage.COLD_START_GRID,
                  Severity.CAUTION,
                  context.ref(),
                  point.ref(),
                  Words.of(volts, Unit.VOLT))
              .withValue(volts, COLD_GRID, Unit.VOLT),
          point,
          Optional.of(
              Remedy.byHand(
                  "A diode or a neon lamp from cathode to grid holds them together until the"
                      + " valves conduct.")));
    }
  }

  /**
   * A band so wide that only measurement sets the current, as with a fixed bias. Where the cathode
   * makes the bias, alone or following a grid that is wired to an anode, there is nothing to set.
   */
  private void spread(DevicePoint point) {
    Band band = point.bands().get("anodeCurrent");
    if (band == null || !(band.low() > 0) || band.high() < WIDE * band.low()) {
      return;
    }
    if (Math.abs(point.cathodeChassis()) >= HELD_BY_GRID * Math.abs(point.grid())) {
      return;
    }
    Finding finding =
        Finding.of(
                BiasMessage.FIXED_BIAS_SPREAD,
                Severity.CAUTION,
                context.ref(),
                point.ref(),
                Words.roughly(band.low(), Unit.AMPERE),
                Words.roughly(band.high(), Unit.AMPERE))
            .withValue(band.high(), Unit.AMPERE);
    add(
        finding,
        point,
        Optional.of(
            Remedy.byHand("Set the idle current by measurement, starting from the cold side.")));
  }

  private void onLine(LoadLineView view) {
    Optional<DevicePoint> point =
        context.answer().points().stream().filter(p -> p.ref().equals(view.ref())).findFirst();
    double open = view.anode() + view.current() * view.dcResistance();
    if (point.isEmpty() || !resistive(view)) {
      return;
    }
    if (view.anode() > NEAR_SUPPLY * open) {
      Finding finding =
          Finding.of(
                  BiasMessage.ANODE_NEAR_SUPPLY,
                  Severity.CAUTION,
                  context.ref(),
                  view.ref(),
                  Words.of(view.anode(), Unit.VOLT),
                  Words.of(open, Unit.VOLT))
              .withValue(view.anode(), open, Unit.VOLT);
      add(finding, point.get(), moreSwing());
    } else if (view.anode() < BOTTOMED * open) {
      Finding finding =
          Finding.of(
                  BiasMessage.ANODE_BOTTOMED,
                  Severity.CAUTION,
                  context.ref(),
                  view.ref(),
                  Words.of(view.anode(), Unit.VOLT))
              .withValue(view.anode(), Unit.VOLT);
      add(finding, point.get(), moreSwing());
    }
  }

  /** Whether a resistor feeds the anode, and not a winding or a current source. */
  static boolean resistive(LoadLineView view) {
    double drop = view.dcResistance() * view.current();
    return drop > 0.02 * (view.anode() + drop)
        && view.acResistance() < 3 * view.dcResistance()
        && view.dcResistance() < 5e6;
  }

  private Optional<Remedy> moreSwing() {
    Remedies remedies = context.remedies();
    double now = context.answer().clean().outputPeak();
    return biasParts().stream()
        .flatMap(p -> remedies.best(p, now, v -> v.clean().outputPeak(), 1.1).stream())
        .findFirst()
        .map(remedies::remedy);
  }

  /** Resistors that make the bias: those at a cathode. */
  private List<Part> biasParts() {
    return biasParts(context);
  }

  /** A load or a tail makes the signal and not only the bias. */
  private static boolean carriesSignal(Part part) {
    return part.role().contains("load") || part.role().contains("tail");
  }

  static List<Part> biasParts(FindingContext context) {
    List<Part> found = new ArrayList<>();
    for (Part part : context.remedies().resistors()) {
      for (DevicePoint point : context.answer().points()) {
        Valve valve = context.model().valve(point.ref());
        if (valve.cathode() != 0
            && !carriesSignal(part)
            && PartRoles.touches(context.model(), part, valve.cathode())
            && !found.contains(part)) {
          found.add(part);
        }
      }
    }
    return found;
  }
}
