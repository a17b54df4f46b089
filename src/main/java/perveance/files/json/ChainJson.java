package perveance.files.json;

import java.io.IOException;
import perveance.engine.analysis.SignalChain;

/** Writes stages in a row: gain budget, levels, what overloads first. */
final class ChainJson {
  private ChainJson() {}

  static void write(SignalChain chain, JsonSink sink) throws IOException {
    sink.number("gain", chain.gain());
    sink.text("clips_first", chain.clipsFirst());
    sink.text("limited_by", chain.limitedBy().word());
    sink.someText("limited_at", chain.limitedAt());
    sink.number("input_peak_V", chain.inputPeak());
    sink.number("output_peak_V", chain.outputPeak());
    sink.number("drive_peak_V", chain.drive());
    sink.objects("stages", chain.links(), link -> link(link, sink));
  }

  private static void link(SignalChain.Link link, JsonSink sink) throws IOException {
    sink.text("ref", link.ref());
    sink.number("gain", link.gain());
    sink.number("input_peak_V", link.inputPeak());
    sink.number("output_peak_V", link.outputPeak());
    sink.number("spare_dB", link.spare());
    sink.number("driven_input_peak_V", link.drivenInput());
    sink.number("driven_output_peak_V", link.drivenOutput());
  }
}
