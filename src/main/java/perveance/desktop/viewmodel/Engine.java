package perveance.desktop.viewmodel;

import java.util.List;
import perveance.engine.analysis.AnalysisOptions;
import perveance.engine.analysis.ChassisAnswer;
import perveance.engine.base.Progress;
import perveance.engine.device.DeviceLibrary;
import perveance.engine.stage.Chassis;

/** What the window asks of the engine. */
public interface Engine {
  /**
   * Works a chassis out.
   *
   * @param chassis without complaints
   * @param options how thoroughly
   * @param progress can ask to stop
   * @return answer
   */
  ChassisAnswer answer(Chassis chassis, AnalysisOptions options, Progress progress);

  /**
   * What keeps a chassis from being built.
   *
   * @param chassis any chassis
   * @return sentences, empty when it can be worked out
   */
  List<String> complaints(Chassis chassis);

  /**
   * The valves.
   *
   * @return library
   */
  DeviceLibrary devices();
}
