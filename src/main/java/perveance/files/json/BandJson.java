package perveance.files.json;

import java.io.IOException;
import java.util.List;
import java.util.Map;
import java.util.TreeMap;
import perveance.engine.analysis.Band;

/** Writes bands under the names of the figures that they belong to. */
final class BandJson {
  /** Name in the contract by name of the component. */
  private static final Map<String, String> NAMES =
      Map.ofEntries(
          Map.entry("anode", "anode_V"),
          Map.entry("grid", "grid_V"),
          Map.entry("screen", "screen_V"),
          Map.entry("anodeChassis", "anode_chassis_V"),
          Map.entry("cathodeChassis", "cathode_chassis_V"),
          Map.entry("gridChassis", "grid_chassis_V"),
          Map.entry("screenChassis", "screen_chassis_V"),
          Map.entry("anodeCurrent", "anode_A"),
          Map.entry("screenCurrent", "screen_A"),
          Map.entry("gridCurrent", "grid_A"),
          Map.entry("mutualConductance", "gm_S"),
          Map.entry("anodeResistance", "ra_ohm"),
          Map.entry("amplificationFactor", "mu"),
          Map.entry("anodeDissipation", "anode_W"),
          Map.entry("screenDissipation", "screen_W"),
          Map.entry("gain", "gain"),
          Map.entry("secondGain", "gain2"),
          Map.entry("outputResistance", "output_ohm"),
          Map.entry("inputCapacitance", "input_F"),
          Map.entry("lowCorner", "low_3dB_Hz"),
          Map.entry("highCorner", "high_3dB_Hz"),
          Map.entry("noiseInput", "noise_input_V_rms"),
          Map.entry("inputPeak", "input_peak_V"),
          Map.entry("outputPeak", "output_peak_V"),
          Map.entry("headroom", "headroom_dB"));

  private BandJson() {}

  /** Writes a member {@code band}; left out when there is none of a named figure. */
  static void write(Map<String, Band> bands, JsonSink sink) throws IOException {
    Map<String, Band> named = new TreeMap<>();
    bands.forEach(
        (component, band) -> {
          String name = NAMES.get(component);
          if (name != null && Double.isFinite(band.low()) && Double.isFinite(band.high())) {
            named.put(name, band);
          }
        });
    if (named.isEmpty()) {
      return;
    }
    sink.object(
        "band",
        () -> {
          for (Map.Entry<String, Band> one : named.entrySet()) {
            sink.numbers(one.getKey(), List.of(one.getValue().low(), one.getValue().high()));
          }
        });
  }
}
