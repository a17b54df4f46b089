package perveance.architecture;

import com.tngtech.archunit.core.domain.JavaClasses;
import com.tngtech.archunit.core.importer.ClassFileImporter;
import java.io.File;
import java.net.URL;
import java.util.List;
import java.util.stream.Collectors;
import java.util.stream.Stream;
import perveance.launch.Main;

/** The compiled classes of the program itself: no tests, no libraries. */
final class Program {
  static final JavaClasses CLASSES = imported();

  private Program() {}

  private static JavaClasses imported() {
    URL classes = Main.class.getProtectionDomain().getCodeSource().getLocation();
    return new ClassFileImporter().importUrls(List.of(classes));
  }

  /**
   * A class path for the compiler that holds chosen libraries and nothing else.
   *
   * @param types one class of each library
   * @return their archives
   */
  static String classPath(Class<?>... types) {
    return Stream.of(types)
        .map(type -> type.getProtectionDomain().getCodeSource().getLocation().getPath())
        .collect(Collectors.joining(File.pathSeparator));
  }
}
