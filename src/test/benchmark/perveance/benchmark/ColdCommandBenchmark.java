package perveance.benchmark;

import java.io.IOException;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.ArrayList;
import java.util.List;
import java.util.concurrent.TimeUnit;
import org.openjdk.jmh.annotations.Benchmark;
import org.openjdk.jmh.annotations.BenchmarkMode;
import org.openjdk.jmh.annotations.Fork;
import org.openjdk.jmh.annotations.Measurement;
import org.openjdk.jmh.annotations.Mode;
import org.openjdk.jmh.annotations.OutputTimeUnit;
import org.openjdk.jmh.annotations.Scope;
import org.openjdk.jmh.annotations.Setup;
import org.openjdk.jmh.annotations.State;
import org.openjdk.jmh.annotations.TearDown;
import org.openjdk.jmh.annotations.Warmup;

/**
 * The commands as a person starts them: a new process of {@code target/perveance.jar} each time,
 * which {@code mvn package} makes first, from a warm disk.
 */
@State(Scope.Thread)
@BenchmarkMode(Mode.SingleShotTime)
@OutputTimeUnit(TimeUnit.MILLISECONDS)
@Fork(1)
@Warmup(iterations = 2)
@Measurement(iterations = 15)
public class ColdCommandBenchmark {
  private static final Path JAR = Path.of("target", "perveance.jar");

  private Path sheet = Path.of("");

  /** Refuses to measure without the program. */
  @Setup
  public void prepare() throws IOException {
    if (!Files.exists(JAR)) {
      throw new IllegalStateException(JAR + " is missing: run mvn package first");
    }
    sheet = Files.createTempFile("sheet", ".pdf");
  }

  /** Takes the sheet away. */
  @TearDown
  public void clean() throws IOException {
    Files.deleteIfExists(sheet);
  }

  @Benchmark
  public int check() throws IOException, InterruptedException {
    return run("check", "examples/line-stage.toml");
  }

  @Benchmark
  public int sheet() throws IOException, InterruptedException {
    return run("sheet", "examples/line-stage.toml", "-o", sheet.toString());
  }

  private static int run(String... arguments) throws IOException, InterruptedException {
    List<String> command = new ArrayList<>();
    command.add(Path.of(System.getProperty("java.home"), "bin", "java").toString());
    command.add("-jar");
    command.add(JAR.toString());
    command.addAll(List.of(arguments));
    int status =
        new ProcessBuilder(command)
            .redirectOutput(ProcessBuilder.Redirect.DISCARD)
            .redirectErrorStream(true)
            .start()
            .waitFor();
    if (status != 0) {
      throw new IllegalStateException(String.join(" ", command) + " ended with " + status);
    }
    return status;
  }
}
