package perveance.files.json;

import java.io.IOException;
import perveance.engine.analysis.Discharge;
import perveance.engine.base.Finding;
import perveance.engine.base.Remedy;
import perveance.engine.base.Unit;

/** Writes findings and stored charges. */
final class FindingJson {
  private FindingJson() {}

  static void write(Finding finding, JsonSink sink) throws IOException {
    sink.text("code", finding.code().code());
    sink.text("severity", finding.severity().code());
    sink.text("where", finding.where());
    sink.number("value", finding.value());
    sink.number("limit", finding.limit());
    sink.text("unit", finding.unit().map(Unit::plainSymbol));
    sink.text("text", finding.text());
    sink.text("remedy", finding.remedy().map(Remedy::text));
    if (finding.remedy().isPresent()) {
      sink.texts("remedy_edits", finding.remedy().get().edits());
    }
    sink.text("part", finding.part());
  }

  static void write(Discharge discharge, JsonSink sink) throws IOException {
    sink.text("where", discharge.where());
    sink.number("capacitance_F", discharge.capacitance());
    sink.number("voltage_V", discharge.voltage());
    sink.number("energy_J", discharge.energy());
    sink.number("threshold_V", discharge.threshold());
    // without a path to drain it there is no number, and that is said in words
    sink.number("resistance_ohm", discharge.resistance());
    sink.number("seconds", discharge.seconds());
    sink.someText("drained_by", discharge.drainedBy());
  }
}
