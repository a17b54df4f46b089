package perveance.desktop.viewmodel;

import java.util.List;
import perveance.engine.analysis.AnalysisOptions;
import perveance.engine.analysis.ChassisAnalysis;
import perveance.engine.analysis.ChassisAnswer;
import perveance.engine.base.Progress;
import perveance.engine.device.DeviceLibrary;
import perveance.engine.stage.Chassis;
import perveance.engine.stage.ChassisChecks;
import perveance.engine.stage.ChassisComplaint;
import perveance.files.device.DeviceFiles;

/** The engine with the program's own devices. */
final class RealEngine implements Engine {
  private final DeviceLibrary devices = new DeviceFiles(List.of());

  @Override
  public ChassisAnswer answer(Chassis chassis, AnalysisOptions options, Progress progress) {
    // bands of few specimens are enough to see that they come
    AnalysisOptions fewer = options.samples() > 0 ? options.withSamples(40) : options;
    return new ChassisAnalysis(devices).answer(chassis, fewer, progress);
  }

  @Override
  public List<String> complaints(Chassis chassis) {
    return ChassisChecks.all(chassis, devices).stream().map(ChassisComplaint::message).toList();
  }

  @Override
  public DeviceLibrary devices() {
    return devices;
  }

  static Workbench bench() {
    return new Workbench(
        Starters.example(Settings.USUAL),
        new RealEngine(),
        new Desks(Runnable::run, Runnable::run, Runnable::run));
  }
}
