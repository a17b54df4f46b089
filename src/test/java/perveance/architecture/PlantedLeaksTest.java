package perveance.architecture;

import static com.tngtech.archunit.library.dependencies.SlicesRuleDefinition.slices;
import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;

import com.tngtech.archunit.core.domain.JavaClasses;
import com.tngtech.archunit.core.importer.ClassFileImporter;
import java.nio.file.Path;
import java.util.List;
import java.util.stream.Stream;
import javax.tools.ToolProvider;
import org.apache.commons.math3.util.FastMath;
import org.jfree.chart.JFreeChart;
import org.junit.jupiter.api.BeforeAll;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.TestInstance;
import org.junit.jupiter.api.io.TempDir;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.EnumSource;

/** The rules themselves are tested on a small program that breaks each of them. */
@TestInstance(TestInstance.Lifecycle.PER_CLASS)
class PlantedLeaksTest {
  private static final Path LEAKS =
      Path.of("src", "test", "resources", "perveance", "architecture", "leaks.txt");

  private JavaClasses planted = new ClassFileImporter().importClasses();

  @BeforeAll
  void compileTheLeaks(@TempDir Path out) {
    String libraries = Program.classPath(FastMath.class, JFreeChart.class);
    List<String> options =
        List.of("-proc:none", "-Xlint:none", "-classpath", libraries, "-d", out.toString());
    assertTrue(
        ToolProvider.getSystemJavaCompiler()
            .getTask(null, null, null, options, null, sources())
            .call());
    planted = new ClassFileImporter().importPath(out);
  }

  @ParameterizedTest
  @EnumSource
  void theRuleSeesItsLeak(Wardens warden) {
    assertTrue(warden.rule.evaluate(planted).hasViolation());
  }

  @Test
  void theAllowListsSeeEveryForbiddenUse() {
    assertBreaches("engine.device", "java.io.File", "java.awt.Color", "java.awt.Point", "Answer");
    assertBreaches("engine.device", "org.apache.commons.math3.complex.Complex");
    assertBreaches("files", "org.jfree.chart.JFreeChart");
  }

  @Test
  void theCycleRuleSeesThem() {
    assertTrue(
        slices()
            .matching("perveance.(**)")
            .should()
            .beFreeOfCycles()
            .evaluate(planted)
            .hasViolation());
  }

  @Test
  void aStrayPackageHasNoLayer() {
    assertTrue(Layers.of("perveance.stray").isEmpty());
    assertTrue(Layers.of("perveance.engine").isEmpty());
    assertTrue(Layers.of("perveance").isEmpty());
    assertEquals("desktop.view", Layers.of("perveance.desktop.view.paper").orElseThrow().name());
  }

  private void assertBreaches(String layerName, String... uses) {
    Layer layer = Layers.of("perveance." + layerName).orElseThrow();
    List<String> breaches = layer.breaches(planted);
    for (String use : uses) {
      assertTrue(
          breaches.stream().anyMatch(line -> line.contains(use)),
          () -> use + " is missing among " + breaches);
    }
  }

  /** The resource holds several sources, each under a line with its path. */
  private static List<TextSource> sources() {
    String all = String.join("\n", Sources.lines(LEAKS));
    return Stream.of(all.split("(?m)^// file "))
        .filter(part -> part.startsWith("perveance/"))
        .map(part -> new TextSource(part.lines().findFirst().orElseThrow(), "// " + part))
        .toList();
  }
}
