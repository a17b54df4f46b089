package perveance.cli;

import java.io.PrintWriter;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.ArrayList;
import java.util.List;
import perveance.engine.analysis.ChassisAnalysis;
import perveance.engine.base.BadInputException;
import perveance.engine.stage.Chassis;
import perveance.files.chassis.ChassisReader;
import perveance.files.device.DeviceFiles;

/** What the commands work with; made when a command needs it, so that help stays quick. */
final class Workshop {
  private final DeviceFiles devices;

  Workshop(List<Path> folders) {
    this.devices = new DeviceFiles(withUsualFolder(folders));
  }

  /** Folders named on the command line first, then the user's own folder where there is one. */
  private static List<Path> withUsualFolder(List<Path> folders) {
    List<Path> all = new ArrayList<>(folders);
    Path usual = DeviceFiles.usualFolder();
    if (Files.isDirectory(usual)) {
      all.add(usual);
    }
    return all;
  }

  DeviceFiles devices() {
    return devices;
  }

  /** Says what is wrong with the user's own device files, a line each; the others still serve. */
  void warn(PrintWriter err) {
    devices.warnings().forEach(line -> err.println("Device files: " + line));
    err.flush();
  }

  Chassis read(Path file) throws BadInputException {
    return new ChassisReader(devices).read(file);
  }

  ChassisAnalysis analysis() {
    return new ChassisAnalysis(devices);
  }
}
