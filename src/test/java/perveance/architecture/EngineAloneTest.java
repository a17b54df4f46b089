package perveance.architecture;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertFalse;

import java.io.IOException;
import java.nio.charset.StandardCharsets;
import java.nio.file.Path;
import java.util.List;
import java.util.Locale;
import javax.tools.DiagnosticCollector;
import javax.tools.JavaCompiler;
import javax.tools.JavaFileObject;
import javax.tools.StandardJavaFileManager;
import javax.tools.ToolProvider;
import org.apache.commons.math3.util.FastMath;
import org.jspecify.annotations.NullMarked;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.io.TempDir;

/**
 * The engine compiles with nothing but its permitted libraries and {@code java.base} in sight. This
 * sees what compiled classes no longer show: inlined constants, types in a catch, links in Javadoc.
 */
class EngineAloneTest {
  @Test
  void theEngineCompilesAlone(@TempDir Path out) throws IOException {
    List<Path> sources = Sources.under(Path.of("src", "main", "java", "perveance", "engine"));
    assertFalse(sources.isEmpty());
    List<String> options =
        List.of(
            "-proc:none",
            "-implicit:none",
            "--limit-modules",
            "java.base",
            "-sourcepath",
            "",
            "-classpath",
            Program.classPath(FastMath.class, NullMarked.class),
            "-d",
            out.toString());
    assertEquals("", String.join("\n", errors(sources, options)));
  }

  private static List<String> errors(List<Path> sources, List<String> options) throws IOException {
    JavaCompiler compiler = ToolProvider.getSystemJavaCompiler();
    DiagnosticCollector<JavaFileObject> found = new DiagnosticCollector<>();
    try (StandardJavaFileManager files =
        compiler.getStandardFileManager(found, Locale.ROOT, StandardCharsets.UTF_8)) {
      Iterable<? extends JavaFileObject> units = files.getJavaFileObjectsFromPaths(sources);
      boolean compiled = compiler.getTask(null, files, found, options, null, units).call();
      List<String> errors =
          found.getDiagnostics().stream()
              .filter(one -> one.getKind() == javax.tools.Diagnostic.Kind.ERROR)
              .map(one -> one.toString())
              .toList();
      assertEquals(errors.isEmpty(), compiled, "the compiler failed without saying why");
      return errors;
    }
  }
}
