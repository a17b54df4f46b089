package perveance.desktop;

import java.util.List;
import perveance.desktop.viewmodel.Engine;
import perveance.engine.analysis.AnalysisOptions;
import perveance.engine.analysis.ChassisAnalysis;
import perveance.engine.analysis.ChassisAnswer;
import perveance.engine.base.Progress;
import perveance.engine.device.DeviceLibrary;
import perveance.engine.stage.Chassis;
import perveance.engine.stage.ChassisChecks;
import perveance.engine.stage.ChassisComplaint;

/** The engine with a library of valves. */
final class EngineRoom implements Engine {
  private final DeviceLibrary devices;
  private final ChassisAnalysis analysis;

  EngineRoom(DeviceLibrary devices) {
    this.devices = devices;
    this.analysis = new ChassisAnalysis(devices);
  }

  @Override
  public ChassisAnswer answer(Chassis chassis, AnalysisOptions options, Progress progress) {
    return analysis.answer(chassis, options, progress);
  }

  @Override
  public List<String> complaints(Chassis chassis) {
    return ChassisChecks.all(chassis, devices).stream().map(ChassisComplaint::message).toList();
  }

  @Override
  public DeviceLibrary devices() {
    return devices;
  }
}
