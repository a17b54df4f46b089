package perveance.architecture;

import java.util.ArrayList;
import java.util.Comparator;
import java.util.List;
import java.util.Optional;

/**
 * The allow-lists, from the innermost layer outwards. A new package must be placed here, and
 * placing it is a decision to be recorded.
 */
final class Layers {
  private static final List<String> ENGINE_JDK =
      List.of(
          "java.lang",
          "java.lang.annotation",
          "java.math",
          "java.util",
          "java.util.function",
          "java.util.regex",
          "java.util.stream",
          "org.jspecify.annotations");

  private static final List<String> OUTER_JDK =
      with(
          ENGINE_JDK,
          "java.lang.ref",
          "java.nio.charset",
          "java.text",
          "java.time..",
          "java.util.concurrent..");

  private static final List<String> FILE_JDK =
      with(OUTER_JDK, "java.io", "java.net", "java.nio", "java.nio.file..");

  private static final List<String> DRAWING = List.of("java.awt..", "org.jfree.chart..");

  private static final List<String> ENGINE =
      List.of(
          "engine.base",
          "engine.numeric",
          "engine.device",
          "engine.circuit",
          "engine.stage",
          "engine.analysis",
          "engine.search",
          "engine.bench");

  static final List<Layer> ALL =
      List.of(
          new Layer("engine.base", List.of(), ENGINE_JDK),
          new Layer(
              "engine.numeric",
              ENGINE.subList(0, 1),
              with(ENGINE_JDK, "org.apache.commons.math3..")),
          new Layer("engine.device", ENGINE.subList(0, 2), ENGINE_JDK),
          new Layer("engine.circuit", ENGINE.subList(0, 3), ENGINE_JDK),
          new Layer("engine.stage", ENGINE.subList(0, 4), ENGINE_JDK),
          new Layer("engine.analysis", ENGINE.subList(0, 5), ENGINE_JDK),
          // search and bench ignore each other
          new Layer("engine.search", ENGINE.subList(0, 6), ENGINE_JDK),
          new Layer("engine.bench", ENGINE.subList(0, 6), ENGINE_JDK),
          // ports of the use cases may name a place and a failed access, not open anything
          new Layer("app", ENGINE, with(OUTER_JDK, "java.nio.file.Path", "java.io.IOException")),
          new Layer(
              "files",
              with(ENGINE, "app"),
              // the program's own device files are listed out of its jar, wherever that lies
              with(
                  FILE_JDK,
                  "java.nio.channels",
                  "java.security",
                  "java.util.zip",
                  "com.fasterxml.jackson.core..")),
          new Layer(
              "plot",
              with(ENGINE, "app"),
              with(
                  with(OUTER_JDK, DRAWING),
                  "java.io",
                  "javax.imageio..",
                  "javax.xml.parsers",
                  "org.apache.batik..",
                  "org.jfree.data..",
                  "org.w3c.dom")),
          new Layer(
              "report",
              with(ENGINE, "app", "plot"),
              with(
                  with(FILE_JDK, DRAWING),
                  "de.rototor.pdfbox..",
                  "javax.xml.transform",
                  "org.apache.fontbox..",
                  "org.apache.pdfbox..",
                  "org.apache.xmpbox..")),
          new Layer(
              "cli", with(ENGINE, "app", "files", "plot", "report"), with(FILE_JDK, "picocli..")),
          // inside the desktop: task, then what is shown, then how it is shown
          new Layer(
              "desktop.task",
              with(ENGINE, "app"),
              with(OUTER_JDK, "javafx.application", "javafx.util")),
          new Layer(
              "desktop.viewmodel",
              with(ENGINE, "app", "plot", "desktop.task"),
              with(
                  OUTER_JDK,
                  // as the use cases, it may name a place, not open anything
                  "java.nio.file.Path",
                  "javafx.beans..",
                  "javafx.collections..",
                  "javafx.util..")),
          new Layer(
              "desktop.view",
              with(ENGINE, "app", "plot", "desktop.task", "desktop.viewmodel"),
              with(
                  with(OUTER_JDK, DRAWING),
                  "java.io",
                  "java.nio.file..",
                  "javafx..",
                  "org.jfree.fx..")),
          new Layer(
              "desktop",
              with(
                  ENGINE,
                  "app",
                  "files",
                  "plot",
                  "report",
                  "desktop.task",
                  "desktop.viewmodel",
                  "desktop.view"),
              with(FILE_JDK, "javafx..", "javax.print..")),
          new Layer(
              "launch",
              with(ENGINE, "app", "files", "plot", "report", "cli", "desktop"),
              FILE_JDK));

  private Layers() {}

  /**
   * The layer that a package belongs to: the one with the longest matching name.
   *
   * @param packageName full name of the package
   * @return its layer, empty for a stray package
   */
  static Optional<Layer> of(String packageName) {
    return ALL.stream()
        .filter(layer -> layer.holds(packageName))
        .max(Comparator.comparingInt(layer -> layer.name().length()));
  }

  private static List<String> with(List<String> list, String... more) {
    return with(list, List.of(more));
  }

  private static List<String> with(List<String> list, List<String> more) {
    List<String> all = new ArrayList<>(list);
    all.addAll(more);
    return List.copyOf(all);
  }
}
