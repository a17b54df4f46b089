package perveance.architecture;

import java.io.ByteArrayOutputStream;
import java.io.PrintStream;
import java.nio.charset.StandardCharsets;
import java.util.Objects;
import org.junit.jupiter.api.extension.AfterAllCallback;
import org.junit.jupiter.api.extension.BeforeAllCallback;
import org.junit.jupiter.api.extension.ExtensionContext;
import org.junit.jupiter.api.extension.ExtensionContext.Namespace;

/**
 * Fails every test class of the engine during which something was printed. JUnit finds it by
 * itself, so no test has to ask for it.
 */
public final class SilentEngine implements BeforeAllCallback, AfterAllCallback {
  private static final Namespace NAMESPACE = Namespace.create(SilentEngine.class);
  private static final String KEY = "streams";

  /** What was in place before, and what caught the output meanwhile. */
  private record Streams(PrintStream out, PrintStream err, ByteArrayOutputStream caught) {}

  @Override
  public void beforeAll(ExtensionContext context) {
    if (concerns(context)) {
      ByteArrayOutputStream caught = new ByteArrayOutputStream();
      PrintStream catcher = new PrintStream(caught, true, StandardCharsets.UTF_8);
      context.getStore(NAMESPACE).put(KEY, new Streams(System.out, System.err, caught));
      System.setOut(catcher);
      System.setErr(catcher);
    }
  }

  @Override
  public void afterAll(ExtensionContext context) {
    if (concerns(context)) {
      Streams before =
          Objects.requireNonNull(context.getStore(NAMESPACE).remove(KEY, Streams.class));
      System.setOut(before.out());
      System.setErr(before.err());
      String printed = before.caught().toString(StandardCharsets.UTF_8);
      if (!printed.isEmpty()) {
        throw new AssertionError(
            context.getRequiredTestClass().getName() + ": printed by the engine:\n" + printed);
      }
    }
  }

  /** A nested class is within the watch of the class around it. */
  private static boolean concerns(ExtensionContext context) {
    Class<?> type = context.getRequiredTestClass();
    return type.getName().startsWith("perveance.engine.") && type.getEnclosingClass() == null;
  }
}
