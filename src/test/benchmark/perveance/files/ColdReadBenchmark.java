package perveance.files;

import java.nio.file.Path;
import java.util.List;
import java.util.concurrent.TimeUnit;
import org.openjdk.jmh.annotations.Benchmark;
import org.openjdk.jmh.annotations.BenchmarkMode;
import org.openjdk.jmh.annotations.Fork;
import org.openjdk.jmh.annotations.Measurement;
import org.openjdk.jmh.annotations.Mode;
import org.openjdk.jmh.annotations.OutputTimeUnit;
import org.openjdk.jmh.annotations.Warmup;
import perveance.engine.base.BadInputException;
import perveance.engine.device.Device;
import perveance.engine.stage.Chassis;
import perveance.files.chassis.ChassisReader;
import perveance.files.device.DeviceFiles;

/**
 * What a program that has just started pays for its files: each measurement is the first thing that
 * a new process does, with nothing loaded or compiled.
 */
@BenchmarkMode(Mode.SingleShotTime)
@OutputTimeUnit(TimeUnit.MILLISECONDS)
@Fork(10)
@Warmup(iterations = 0)
@Measurement(iterations = 1)
public class ColdReadBenchmark {
  @Benchmark
  public Device oneDeviceByItsType() throws BadInputException {
    return new DeviceFiles(List.of()).load("12AX7").orElseThrow();
  }

  /** An alias costs a look at the heads of all files. */
  @Benchmark
  public Device oneDeviceByAnAlias() throws BadInputException {
    return new DeviceFiles(List.of()).load("ECC83").orElseThrow();
  }

  @Benchmark
  public int wholeLibrary() throws BadInputException {
    DeviceFiles library = new DeviceFiles(List.of());
    int sections = 0;
    for (String name : library.names()) {
      sections += library.load(name).orElseThrow().sections();
    }
    return sections;
  }

  @Benchmark
  public Chassis chassisOfThreeStages() throws BadInputException {
    ChassisReader reader = new ChassisReader(new DeviceFiles(List.of()));
    return reader.read(
        Path.of("src", "test", "resources", "perveance", "files", "chassis", "three-stages.toml"));
  }
}
