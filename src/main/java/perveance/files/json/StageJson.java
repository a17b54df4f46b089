package perveance.files.json;

import java.io.IOException;
import java.util.HashMap;
import java.util.Map;
import perveance.engine.analysis.Band;
import perveance.engine.analysis.BiasSupplyAnswer;
import perveance.engine.analysis.CleanSwing;
import perveance.engine.analysis.DevicePoint;
import perveance.engine.analysis.DrivenAnswer;
import perveance.engine.analysis.SmallSignalAnswer;
import perveance.engine.analysis.StageAnswer;
import perveance.engine.stage.Chassis;
import perveance.engine.stage.Setting;

/** Writes what a stage answers. */
final class StageJson {
  private final Chassis chassis;
  private final JsonSink sink;

  StageJson(Chassis chassis, JsonSink sink) {
    this.chassis = chassis;
    this.sink = sink;
  }

  void write(StageAnswer stage) throws IOException {
    sink.text("ref", stage.ref());
    sink.text("kind", stage.kind());
    sink.text("device", device(stage));
    sink.objects("operating_point", stage.points(), this::point);
    smallSignal(stage.smallSignal());
    sink.object("clean", () -> clean(stage.clean()));
    if (stage.driven().isPresent()) {
      DrivenAnswer driven = stage.driven().get();
      sink.object("driven", () -> driven(driven));
    }
    sink.objects("levels", stage.levels(), this::level);
    new LargeSignalJson(sink).write(stage.large());
    if (stage.biasSupply().isPresent()) {
      BiasSupplyAnswer supply = stage.biasSupply().get();
      sink.object("bias_supply", () -> biasSupply(supply));
    }
    Map<String, Band> bands = new HashMap<>(stage.smallSignal().bands());
    bands.putAll(stage.clean().bands());
    BandJson.write(bands, sink);
    PartJson.write(stage, sink);
    sink.texts("assumptions", stage.assumptions());
  }

  /** The device as the person names it; its own file may use another of its names. */
  private String device(StageAnswer stage) {
    return chassis
        .stage(stage.ref())
        .map(entry -> entry.settings().get("device"))
        .map(Setting::text)
        .orElse(stage.points().isEmpty() ? "" : stage.points().get(0).type());
  }

  private void point(DevicePoint point) throws IOException {
    sink.text("ref", point.ref());
    sink.text("type", point.type());
    sink.number("anode_V", point.anode());
    sink.number("grid_V", point.grid());
    sink.number("screen_V", point.screen());
    sink.number("anode_chassis_V", point.anodeChassis());
    sink.number("cathode_chassis_V", point.cathodeChassis());
    sink.number("grid_chassis_V", point.gridChassis());
    sink.number("screen_chassis_V", point.screenChassis());
    sink.number("anode_A", point.anodeCurrent());
    sink.number("screen_A", point.screenCurrent());
    sink.number("grid_A", point.gridCurrent());
    sink.number("gm_S", point.mutualConductance());
    sink.number("ra_ohm", point.anodeResistance());
    sink.number("mu", point.amplificationFactor());
    sink.number("anode_W", point.anodeDissipation());
    sink.number("screen_W", point.screenDissipation());
    BandJson.write(point.bands(), sink);
    sink.text("outside_evidence", point.outsideEvidence());
  }

  private void biasSupply(BiasSupplyAnswer supply) throws IOException {
    sink.number("voltage_V", supply.raw());
    sink.number("current_A", supply.current());
    sink.number("most_negative_V", supply.most());
    sink.number("least_negative_V", supply.least());
    sink.number("setting", supply.setting());
    sink.number("open_wiper_V", supply.openWiper());
  }

  private void smallSignal(SmallSignalAnswer answer) throws IOException {
    sink.number("gain", answer.gain());
    sink.number("gain2", answer.secondGain());
    sink.number("output_ohm", answer.outputResistance());
    sink.number("input_F", answer.inputCapacitance());
    sink.number("low_3dB_Hz", answer.lowCorner());
    sink.number("high_3dB_Hz", answer.highCorner());
    sink.number("coupling_3dB_Hz", answer.couplingCorner());
    if (answer.shelf().isPresent()) {
      SmallSignalAnswer.Shelf shelf = answer.shelf().get();
      sink.object(
          "shelf",
          () -> {
            sink.number("zero_Hz", shelf.zero());
            sink.number("pole_Hz", shelf.pole());
            sink.number("step_dB", shelf.step());
          });
    }
    sink.number("noise_input_V_rms", answer.noiseInput());
  }

  private void clean(CleanSwing clean) throws IOException {
    sink.number("input_peak_V", clean.inputPeak());
    sink.number("output_peak_V", clean.outputPeak());
    sink.text("limited_by", clean.limitedBy().word());
    sink.someText("limited_at", clean.limitedAt());
    sink.number("positive_peak_V", clean.positivePeak());
    sink.text("positive_limit", clean.positiveLimit().word());
    sink.number("negative_peak_V", clean.negativePeak());
    sink.text("negative_limit", clean.negativeLimit().word());
    sink.number("zero_bias_peak_V", clean.toZeroBias());
    sink.number("headroom_dB", clean.headroom());
  }

  private void driven(DrivenAnswer driven) throws IOException {
    sink.number("input_peak_V", driven.inputPeak());
    sink.number("output_V_rms", driven.output());
    sink.number("output_W", driven.power());
    sink.number("thd", driven.distortion());
    for (int i = 0; i < driven.harmonics().size(); i++) {
      sink.number("h" + (i + 2), driven.harmonics().get(i));
    }
    twoTones(driven);
    sink.number("anode_A", driven.meanAnodeCurrent());
    sink.number("screen_A", driven.meanScreenCurrent());
    sink.number("peak_anode_A", driven.peakAnodeCurrent());
    sink.flag("grid_current", driven.gridCurrentFlows());
  }

  private void twoTones(DrivenAnswer driven) throws IOException {
    if (driven.intermodulation().isPresent()) {
      sink.number("imd_smpte", driven.intermodulation().get().smpte());
      sink.number("imd_ccif", driven.intermodulation().get().ccif());
    }
  }

  private void level(DrivenAnswer level) throws IOException {
    sink.number("input_peak_V", level.inputPeak());
    sink.number("output_V_rms", level.output());
    sink.number("output_W", level.power());
    sink.number("thd", level.distortion());
    sink.numbers("h", level.harmonics());
    twoTones(level);
  }
}
