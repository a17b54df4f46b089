package perveance.desktop;

import java.util.ArrayList;
import java.util.List;
import perveance.desktop.viewmodel.Engine;
import perveance.engine.analysis.AnalysisOptions;
import perveance.engine.analysis.ChassisAnswer;
import perveance.engine.base.Finding;
import perveance.engine.base.Progress;
import perveance.engine.base.RatingMessage;
import perveance.engine.base.Remedy;
import perveance.engine.base.Severity;
import perveance.engine.base.Unit;
import perveance.engine.device.DeviceLibrary;
import perveance.engine.stage.Chassis;
import perveance.engine.stage.Setting;

/** Adds a finding of known wording, so that a test of the window does not hang on a limit. */
record GridLeakWarner(Engine engine) implements Engine {
  private static final double LIMIT = 2e6;

  @Override
  public ChassisAnswer answer(Chassis chassis, AnalysisOptions options, Progress progress) {
    ChassisAnswer a = engine.answer(chassis, options, progress);
    List<Finding> findings = new ArrayList<>(a.findings());
    for (var stage : chassis.stages()) {
      if (stage.settings().get("grid_leak") instanceof Setting.Number n && n.value() > LIMIT) {
        findings.add(0, finding(stage.ref(), n.value()));
      }
    }
    return new ChassisAnswer(
        a.chassis(),
        a.supplies(),
        a.stages(),
        a.failures(),
        a.discharges(),
        a.highestVoltage(),
        a.chains(),
        findings);
  }

  private static Finding finding(String ref, double value) {
    return Finding.of(
            RatingMessage.GRID_LEAK_OVER, Severity.OVER_LIMIT, ref, ref, "10M", "2M", "a test")
        .withValue(value, LIMIT, Unit.OHM)
        .onPart("grid_leak")
        .withRemedy(Remedy.set("1M keeps the grid within its limit.", "grid_leak", "1M"));
  }

  @Override
  public List<String> complaints(Chassis chassis) {
    return engine.complaints(chassis);
  }

  @Override
  public DeviceLibrary devices() {
    return engine.devices();
  }
}
