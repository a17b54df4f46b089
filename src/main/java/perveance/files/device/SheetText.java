package perveance.files.device;

import java.util.ArrayList;
import java.util.List;
import perveance.engine.base.Unit;
import perveance.engine.device.Capacitances;
import perveance.engine.device.Evidence;
import perveance.engine.device.Heater;
import perveance.engine.device.Ratings;

/** What is published of a device, as it stands in its file. */
final class SheetText {
  private SheetText() {}

  /** The blocks in their usual order, the keys at the top first. */
  static List<String> blocks(DeviceSheet sheet) {
    List<String> blocks = new ArrayList<>();
    blocks.add(top(sheet));
    sheet.heaters().forEach(heater -> blocks.add(heater(heater)));
    sheet.ratings().forEach(ratings -> blocks.add(ratings(ratings)));
    if (!sheet.capacitances().equals(Capacitances.NONE)) {
      blocks.add(capacitances(sheet.capacitances()));
    }
    sheet.rectifier().ifPresent(rectifier -> blocks.addAll(RectifierText.blocks(rectifier)));
    sheet.evidence().forEach(evidence -> blocks.add(evidence(evidence)));
    return blocks;
  }

  private static String top(DeviceSheet sheet) {
    List<String> pins = new ArrayList<>();
    sheet.pins().forEach((pin, electrode) -> pins.add(pin + " " + electrode));
    return new Values()
        .raw("perveance_device", Integer.toString(DeviceReader.VERSION))
        .text("type", sheet.type())
        .texts("aliases", sheet.aliases())
        .text("kind", sheet.kind())
        .raw("sections", Integer.toString(sheet.sections()))
        .text("base", sheet.base())
        .texts("pins", pins)
        .texts("notes", sheet.notes())
        .block("");
  }

  private static String heater(Heater heater) {
    Values values =
        new Values()
            .quantity("voltage", heater.voltage(), Unit.VOLT)
            .quantity("current", heater.current(), Unit.AMPERE)
            .text("pins", heater.pins());
    return (heater.directlyHeated() ? values.raw("directly_heated", "true") : values)
        .block("[[heater]]");
  }

  private static String ratings(Ratings r) {
    return new Values()
        .text("type", r.type())
        .text("system", r.system().word())
        .quantity("anode_voltage", r.anodeVoltage(), Unit.VOLT)
        .quantity("cold_anode_voltage", r.coldAnodeVoltage(), Unit.VOLT)
        .quantity("anode_dissipation", r.anodeDissipation(), Unit.WATT)
        .quantity("both_anodes_dissipation", r.bothAnodesDissipation(), Unit.WATT)
        .quantity("screen_voltage", r.screenVoltage(), Unit.VOLT)
        .quantity("screen_dissipation", r.screenDissipation(), Unit.WATT)
        .quantity("cathode_current", r.cathodeCurrent(), Unit.AMPERE)
        .quantity("grid_leak_fixed", r.gridLeakFixed(), Unit.OHM)
        .quantity("grid_leak_cathode", r.gridLeakCathode(), Unit.OHM)
        .quantity("heater_negative", r.heaterNegative(), Unit.VOLT)
        .quantity("heater_positive", r.heaterPositive(), Unit.VOLT)
        .text("source", r.source())
        .text("how", r.how())
        .block("[[rating]]");
  }

  private static String capacitances(Capacitances c) {
    return new Values()
        .quantity("grid_anode", c.gridAnode(), Unit.FARAD)
        .quantity("grid_cathode", c.gridCathode(), Unit.FARAD)
        .quantity("anode_cathode", c.anodeCathode(), Unit.FARAD)
        .block("[capacitance]");
  }

  static String evidence(Evidence e) {
    return new Values()
        .text("connection", e.connection())
        .text("kind", e.kind())
        .quantity("anode_voltage", e.anodeVoltage(), Unit.VOLT)
        .quantity("grid_voltage", e.gridVoltage(), Unit.VOLT)
        .quantity("screen_voltage", e.screenVoltage(), Unit.VOLT)
        .quantity("anode_current", e.anodeCurrent(), Unit.AMPERE)
        .quantity("screen_current", e.screenCurrent(), Unit.AMPERE)
        .quantity("mu", e.amplificationFactor(), Unit.RATIO)
        .quantity("ra", e.anodeResistance(), Unit.OHM)
        .quantity("gm", e.mutualConductance(), Unit.SIEMENS)
        .raw("fit", Boolean.toString(e.fit()))
        .text("source", e.source())
        .text("how", e.how())
        .text("confidence", e.confidence())
        .text("note", e.note())
        .block("[[evidence]]");
  }
}
