package perveance.files.json;

import java.io.IOException;
import perveance.engine.analysis.LargeSignalAnswer;
import perveance.engine.analysis.ReactiveAnswer;
import perveance.engine.analysis.Recovery;

/** Writes what a stage does after an overload and into a reactive load. */
final class LargeSignalJson {
  private final JsonSink sink;

  LargeSignalJson(JsonSink sink) {
    this.sink = sink;
  }

  void write(LargeSignalAnswer answer) throws IOException {
    if (answer.recovery().isPresent()) {
      Recovery recovery = answer.recovery().get();
      sink.object("recovery", () -> recovery(recovery));
    }
    if (answer.reactive().isPresent()) {
      ReactiveAnswer reactive = answer.reactive().get();
      sink.object("reactive", () -> reactive(reactive));
    }
  }

  private void recovery(Recovery recovery) throws IOException {
    sink.number("input_peak_V", recovery.inputPeak());
    sink.text("capacitor", recovery.capacitor().owner() + "." + recovery.capacitor().key());
    sink.number("capacitor_F", recovery.capacitor().capacitance());
    sink.number("charge_V", recovery.charge());
    sink.number("leak_ohm", recovery.resistance());
    sink.number("recovery_s", recovery.seconds());
  }

  private void reactive(ReactiveAnswer reactive) throws IOException {
    sink.number("frequency_Hz", reactive.frequency());
    sink.number("input_peak_V", reactive.inputPeak());
    sink.number("output_V_rms", reactive.output());
    sink.number("output_W", reactive.power());
    sink.number("peak_anode_V", reactive.anodePeak());
    sink.number("peak_anode_A", reactive.currentPeak());
    sink.numbers("anode_W", reactive.anodeDissipation());
    sink.number("peak_anode_W", reactive.dissipationPeak());
    sink.flag("crosses_dissipation", reactive.crossesDissipation());
    sink.flag("cut_off", reactive.cutOff());
  }
}
