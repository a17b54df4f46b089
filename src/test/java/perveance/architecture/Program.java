package perveance.architecture;

import com.tngtech.archunit.core.domain.JavaClasses;
import com.tngtech.archunit.core.importer.ClassFileImporter;
import java.net.URL;
import java.nio.file.Path;
import java.util.List;
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
   * The place of a source folder; tests run in the project's folder.
   *
   * @param first first name of the path
   * @param more further names
   * @return the path
   */
  static Path folder(String first, String... more) {
    return Path.of(first, more);
  }
}
