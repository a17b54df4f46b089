package perveance.files.json;

import java.io.IOException;
import java.io.OutputStream;
import perveance.engine.device.geometry.ElectrodeAnswer;
import perveance.engine.device.geometry.GapPoint;
import perveance.engine.device.geometry.GapProfile;
import perveance.engine.device.geometry.GeometryReport;
import perveance.engine.device.geometry.ThermalDiode;

/** Writes what dimensions tell as one JSON object; names hold their SI units. */
public final class GeometryJson {
  private static final int VERSION = 1;

  private GeometryJson() {}

  /**
   * Writes an answer, in UTF-8 and with a line end behind it.
   *
   * @param answer the answer
   * @param out where to; stays open
   * @throws IOException when it cannot be written
   */
  public static void write(ElectrodeAnswer answer, OutputStream out) throws IOException {
    JsonReport.write(out, sink -> write(answer, sink));
  }

  private static void write(ElectrodeAnswer answer, JsonSink sink) throws IOException {
    sink.whole("perveance_geometry", VERSION);
    sink.text("title", answer.design().title());
    sink.number("perveance_A_V1.5", answer.perveance());
    if (answer.triode().isPresent()) {
      triode(answer.triode().get(), sink);
    }
    sink.number("working_V", answer.workingVoltage());
    sink.number("current_A", answer.current());
    sink.number("current_density_A_m2", answer.currentDensity());
    sink.number("effective_ohm", answer.effectiveResistance());
    sink.number("slope_ohm", answer.slopeResistance());
    sink.number("emission_A_m2", answer.emission());
    sink.number("emission_A", answer.emission() * answer.working().cathodeArea());
    if (answer.thermal().isPresent()) {
      thermal(answer.thermal().get(), sink);
    }
    if (answer.profile().isPresent()) {
      profile(answer.profile().get(), sink);
    }
  }

  private static void triode(GeometryReport report, JsonSink sink) throws IOException {
    sink.number("mu", report.amplificationFactor());
    sink.number("gm_S", report.mutualConductance());
    sink.number("loading_factor", report.loadingFactor());
    sink.number("spread", report.spread());
  }

  private static void thermal(ThermalDiode.State state, JsonSink sink) throws IOException {
    sink.object(
        "initial_velocities",
        () -> {
          sink.number("current_density_A_m2", state.currentDensity());
          sink.number("minimum_V", state.minimum());
          sink.number("minimum_distance_m", state.minimumDistance());
        });
  }

  private static void profile(GapProfile profile, JsonSink sink) throws IOException {
    sink.objects("gap", profile.points(), point -> point(point, sink));
  }

  private static void point(GapPoint point, JsonSink sink) throws IOException {
    sink.number("distance_m", point.distance());
    sink.number("potential_V", point.potential());
    sink.number("field_V_m", point.field());
    sink.number("charge_density_C_m3", point.chargeDensity());
    sink.number("speed_m_s", point.speed());
    sink.number("potential_without_charge_V", point.emptyPotential());
    sink.number("field_without_charge_V_m", point.emptyField());
  }
}
