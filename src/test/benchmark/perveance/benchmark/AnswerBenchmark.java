package perveance.benchmark;

import java.nio.file.Path;
import java.util.List;
import java.util.concurrent.TimeUnit;
import org.openjdk.jmh.annotations.Benchmark;
import org.openjdk.jmh.annotations.BenchmarkMode;
import org.openjdk.jmh.annotations.Fork;
import org.openjdk.jmh.annotations.Measurement;
import org.openjdk.jmh.annotations.Mode;
import org.openjdk.jmh.annotations.OutputTimeUnit;
import org.openjdk.jmh.annotations.Param;
import org.openjdk.jmh.annotations.Scope;
import org.openjdk.jmh.annotations.Setup;
import org.openjdk.jmh.annotations.State;
import org.openjdk.jmh.annotations.Threads;
import org.openjdk.jmh.annotations.Warmup;
import perveance.engine.analysis.AnalysisOptions;
import perveance.engine.analysis.ChassisAnalysis;
import perveance.engine.analysis.ChassisAnswer;
import perveance.engine.base.BadInputException;
import perveance.engine.base.Progress;
import perveance.engine.stage.Chassis;
import perveance.files.chassis.ChassisReader;
import perveance.files.device.DeviceFiles;

/** Everything that is told of a chassis; its figures while a hand moves; a large spread. */
@State(Scope.Thread)
@BenchmarkMode(Mode.AverageTime)
@OutputTimeUnit(TimeUnit.MILLISECONDS)
@Warmup(iterations = 5, time = 2)
@Measurement(iterations = 5, time = 2)
@Fork(1)
public class AnswerBenchmark {
  private static final AnalysisOptions SPREAD =
      new AnalysisOptions(
          100_000, 1, AnalysisOptions.LIVE.levels(), AnalysisOptions.LIVE.details());

  /** One stage; three stages, direct coupled, with a push-pull output. */
  @Param({"line-stage", "push-pull-el34"})
  private String example = "";

  private ChassisAnalysis analysis;
  private Chassis chassis;

  /** Reads the example. */
  @Setup
  public void read() throws BadInputException {
    DeviceFiles devices = new DeviceFiles(List.of());
    chassis = new ChassisReader(devices).read(Path.of("examples", example + ".toml"));
    analysis = new ChassisAnalysis(devices);
  }

  /** All of it, with bands by 1,000 samples. */
  @Benchmark
  public ChassisAnswer full() {
    return analysis.answer(chassis, AnalysisOptions.FULL, Progress.none());
  }

  /** What follows a hand that drags. */
  @Benchmark
  public ChassisAnswer live() {
    return analysis.answer(chassis, AnalysisOptions.LIVE, Progress.none());
  }

  /** The figures with bands by 100,000 samples. */
  @Benchmark
  public ChassisAnswer spreadOf100000() {
    return analysis.answer(chassis, SPREAD, Progress.none());
  }

  /** Half of those samples on each of two threads: the whole spread on two cores. */
  @Benchmark
  @Threads(2)
  public ChassisAnswer spreadOnTwoCores() {
    return analysis.answer(chassis, SPREAD.withSamples(50_000), Progress.none());
  }
}
