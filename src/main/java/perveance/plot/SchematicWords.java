package perveance.plot;

import java.util.HashMap;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import java.util.Set;
import perveance.app.wording.Figures;
import perveance.app.wording.Pins;
import perveance.engine.analysis.ChassisAnswer;
import perveance.engine.analysis.DevicePoint;
import perveance.engine.analysis.ExpectedReading;
import perveance.engine.analysis.LimitUse;
import perveance.engine.analysis.PartDuty;
import perveance.engine.analysis.StageAnswer;
import perveance.engine.analysis.SupplyAnswer;
import perveance.engine.base.Finding;
import perveance.engine.base.QuantityFormat;
import perveance.engine.base.Severity;
import perveance.engine.base.Unit;
import perveance.engine.stage.StageCircuit;

/** What stands beside the symbols of a stage's schematic. */
public final class SchematicWords {
  private final List<SupplyAnswer> supplies;
  private final StageAnswer answer;
  private final boolean sheet;

  /**
   * Words for one stage.
   *
   * @param chassis the chassis' answer, for its supply nodes
   * @param answer the stage's answer
   * @param sheet true for paper: bands and test points; false for the window: value above its band
   */
  public SchematicWords(ChassisAnswer chassis, StageAnswer answer, boolean sheet) {
    this.supplies = chassis.supplies();
    this.answer = answer;
    this.sheet = sheet;
  }

  /**
   * The words.
   *
   * @param chosen element names drawn as chosen
   * @param zigzag true for zigzag resistors
   * @return text for the painter
   */
  public SchematicText text(Set<String> chosen, boolean zigzag) {
    Map<String, SchematicText.PartText> parts = new HashMap<>();
    for (PartDuty duty : answer.parts()) {
      parts.put(duty.part().element(), part(duty));
    }
    Map<String, SchematicText.PinText> pins = new HashMap<>();
    for (StageCircuit.StageDevice device : answer.circuit().devices()) {
      parts.put(device.ref(), valve(device));
      pins.put(device.ref(), pins(device));
    }
    return new SchematicText(parts, nodes(), pins, chosen, zigzag);
  }

  private SchematicText.PartText part(PartDuty duty) {
    String value =
        duty.designator() + " " + Figures.part(duty.part().value(), duty.part().type().unit());
    String under =
        switch (duty.part().type()) {
          case RESISTOR ->
              duty.idlePower() < 1e-4
                  ? ""
                  : Figures.reading(duty.idleVoltage(), Unit.VOLT)
                      + ", "
                      + Figures.reading(duty.idlePower(), Unit.WATT, 2);
          case CAPACITOR, ELECTROLYTIC -> Figures.reading(Math.abs(duty.idleVoltage()), Unit.VOLT);
          default -> "";
        };
    return new SchematicText.PartText(value, under, over(duty.part().element()));
  }

  /** A word where a finding says that this part is over a limit. */
  private Optional<String> over(String element) {
    return answer.findings().stream()
        .filter(f -> f.severity().compareTo(Severity.OVER_LIMIT) >= 0)
        .filter(f -> f.part().isPresent() && element.endsWith(f.part().get()))
        .map(Finding::severity)
        .findFirst()
        .map(s -> "over limit");
  }

  private SchematicText.PartText valve(StageCircuit.StageDevice device) {
    String duty = "";
    for (DevicePoint p : answer.points()) {
      if (p.ref().equals(device.ref())) {
        duty =
            Figures.value(p.anodeCurrent(), Unit.AMPERE, p.bands(), "anodeCurrent")
                + ", "
                + Figures.reading(p.anodeDissipation(), Unit.WATT, 2)
                + limit(device.ref());
      }
    }
    return new SchematicText.PartText(
        device.ref() + " " + device.device().type(), duty, over(device.ref()));
  }

  private String limit(String ref) {
    for (LimitUse use : answer.limits()) {
      if (use.ref().equals(ref)
          && use.what().equals("anode dissipation")
          && use.when().equals("idle")) {
        return " of " + Figures.reading(use.limit(), Unit.WATT, 2);
      }
    }
    return "";
  }

  private static SchematicText.PinText pins(StageCircuit.StageDevice device) {
    Pins pins = new Pins(device.device(), device.ref());
    return new SchematicText.PinText(pins.of("a"), pins.of("g"), pins.of("k"), pins.of("g2"));
  }

  private Map<String, SchematicText.NodeText> nodes() {
    Map<String, SchematicText.NodeText> nodes = new HashMap<>();
    for (ExpectedReading reading : answer.readings()) {
      String band = Figures.meterRange(reading.low(), reading.high());
      String value =
          Math.abs(reading.trueValue()) < 1e-3
              ? "0 V"
              : QuantityFormat.TYPESET.toBand(
                  reading.trueValue(), reading.low(), reading.high(), Unit.VOLT);
      nodes.put(
          reading.node(),
          sheet
              ? new SchematicText.NodeText(band, "test point " + reading.testPoint())
              : new SchematicText.NodeText(value, band));
    }
    for (SupplyAnswer supply : supplies) {
      nodes.put(
          "supply." + supply.name(),
          new SchematicText.NodeText(
              QuantityFormat.TYPESET.toBand(
                  supply.voltage(), supply.low(), supply.high(), Unit.VOLT),
              ""));
    }
    return nodes;
  }
}
