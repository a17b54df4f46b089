package perveance.architecture;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;

import com.tngtech.archunit.base.DescribedPredicate;
import com.tngtech.archunit.core.domain.JavaClass;
import java.util.List;
import java.util.Set;
import java.util.TreeSet;
import java.util.stream.Collectors;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.EnumSource;

/** The program keeps every rule in {@link Wardens}, and two that count. */
class WardensTest {
  @ParameterizedTest
  @EnumSource
  void theRuleIsKept(Wardens warden) {
    warden.rule.check(Program.CLASSES);
  }

  @Test
  void everyPackageHasADescription() {
    Set<String> packages =
        Program.CLASSES.stream()
            .map(JavaClass::getPackageName)
            .collect(Collectors.toCollection(TreeSet::new));
    Set<String> described =
        Program.CLASSES.stream()
            .filter(type -> type.getSimpleName().equals("package-info"))
            .map(JavaClass::getPackageName)
            .collect(Collectors.toCollection(TreeSet::new));
    assertEquals(packages, described, "packages, and those with a package-info.java");
  }

  /** A chart is shown by a single node; the rest of the desktop speaks JavaFX alone. */
  @Test
  void atMostOneDesktopClassKnowsTheChartLibrary() {
    DescribedPredicate<JavaClass> drawing =
        JavaClass.Predicates.resideInAnyPackage("java.awt..", "org.jfree..");
    List<String> nodes =
        Program.CLASSES.stream()
            .filter(type -> type.getPackageName().startsWith("perveance.desktop"))
            .filter(
                type ->
                    type.getDirectDependenciesFromSelf().stream()
                        .anyMatch(dependency -> drawing.test(dependency.getTargetClass())))
            .map(type -> type.getFullName().replaceFirst("\\$.*", ""))
            .distinct()
            .toList();
    assertTrue(nodes.size() <= 1, nodes::toString);
  }
}
