package perveance.architecture;

import static com.tngtech.archunit.base.DescribedPredicate.describe;
import static com.tngtech.archunit.lang.syntax.ArchRuleDefinition.fields;
import static com.tngtech.archunit.lang.syntax.ArchRuleDefinition.noClasses;
import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;

import com.tngtech.archunit.base.DescribedPredicate;
import com.tngtech.archunit.core.domain.JavaAccess;
import com.tngtech.archunit.core.domain.JavaClass;
import com.tngtech.archunit.core.domain.JavaModifier;
import com.tngtech.archunit.library.GeneralCodingRules;
import java.io.PrintStream;
import java.io.PrintWriter;
import java.util.List;
import java.util.Locale;
import java.util.Random;
import java.util.Set;
import java.util.TreeSet;
import java.util.stream.Collectors;
import org.jspecify.annotations.NullMarked;
import org.junit.jupiter.api.Test;

/** Things that only one place may do, and things that nobody may do. */
class WardensTest {
  private static final String ENGINE = "perveance.engine..";

  /** The only methods of the class {@code System} that the engine has a use for. */
  private static final Set<String> SYSTEM_FOR_ENGINE = Set.of("arraycopy", "identityHashCode");

  /** Questions about a type; everything else on {@code Class} finds things by name. */
  private static final Set<String> TYPE_FOR_ENGINE =
      Set.of("getSimpleName", "isInstance", "cast", "desiredAssertionStatus", "getEnumConstants");

  private static final Set<String> JDK_NOT_FOR_ENGINE =
      Set.of(
          "java.lang.ClassLoader",
          "java.lang.Process",
          "java.lang.ProcessBuilder",
          "java.lang.Runtime",
          "java.lang.Thread",
          "java.lang.ThreadGroup",
          "java.lang.ThreadLocal",
          "java.util.Calendar",
          "java.util.Date",
          "java.util.GregorianCalendar",
          "java.util.Properties",
          "java.util.ResourceBundle",
          "java.util.Scanner",
          "java.util.ServiceLoader",
          "java.util.Timer",
          "java.util.TimerTask",
          "java.util.UUID");

  @Test
  void theEngineKnowsNoThreadProcessClockOrLoader() {
    noClasses()
        .that()
        .resideInAPackage(ENGINE)
        .should()
        .dependOnClassesThat(
            describe(
                "are kept from the engine",
                (JavaClass type) -> JDK_NOT_FOR_ENGINE.contains(type.getFullName())))
        .check(Program.CLASSES);
  }

  @Test
  void theEngineAsksTheSystemForNothing() {
    noClasses()
        .that()
        .resideInAPackage(ENGINE)
        .should()
        .accessTargetWhere(
            describe(
                "it belongs to System and is not " + SYSTEM_FOR_ENGINE,
                access -> owner(access, System.class) && !SYSTEM_FOR_ENGINE.contains(name(access))))
        .check(Program.CLASSES);
  }

  @Test
  void theEngineFindsNothingByName() {
    noClasses()
        .that()
        .resideInAPackage(ENGINE)
        .should()
        .accessTargetWhere(
            describe(
                "it belongs to Class and is not " + TYPE_FOR_ENGINE,
                access -> owner(access, Class.class) && !TYPE_FOR_ENGINE.contains(name(access))))
        .check(Program.CLASSES);
  }

  @Test
  void theEngineRunsInTheThreadThatCallsIt() {
    noClasses()
        .that()
        .resideInAPackage(ENGINE)
        .should()
        .accessTargetWhere(
            describe(
                "it starts parallel work",
                access -> Set.of("parallel", "parallelStream").contains(name(access))))
        .check(Program.CLASSES);
  }

  /** Two runs with the same input give the same figures. */
  @Test
  void chanceIsAlwaysSeeded() {
    noClasses().should().callMethod(Math.class, "random").check(Program.CLASSES);
    noClasses().should().callConstructor(Random.class).check(Program.CLASSES);
  }

  @Test
  void onlyTheCommandLineTouchesTheStandardStreams() {
    noClasses()
        .that()
        .resideOutsideOfPackage("perveance.cli..")
        .should(GeneralCodingRules.ACCESS_STANDARD_STREAMS)
        .check(Program.CLASSES);
    noClasses()
        .should()
        .callMethodWhere(
            describe("it prints a trace", call -> name(call).equals("printStackTrace")))
        .check(Program.CLASSES);
  }

  @Test
  void onlyTheLaunchersEndTheProgram() {
    noClasses()
        .that()
        .resideOutsideOfPackage("perveance.launch..")
        .should()
        .callMethod(System.class, "exit", int.class)
        .check(Program.CLASSES);
  }

  @Test
  void nobodyThrowsAGenericException() {
    GeneralCodingRules.NO_CLASSES_SHOULD_THROW_GENERIC_EXCEPTIONS.check(Program.CLASSES);
  }

  @Test
  void noStaticFieldCanChange() {
    fields().that().haveModifier(JavaModifier.STATIC).should().beFinal().check(Program.CLASSES);
  }

  /** A figure must not change its decimal mark with the machine it is printed on. */
  @Test
  void numbersArePrintedWithAStatedLocale() {
    noClasses()
        .should()
        .callMethod(String.class, "format", String.class, Object[].class)
        .orShould()
        .callMethod(String.class, "formatted", Object[].class)
        .orShould()
        .callMethod(PrintStream.class, "printf", String.class, Object[].class)
        .orShould()
        .callMethod(PrintStream.class, "format", String.class, Object[].class)
        .orShould()
        .callMethod(PrintWriter.class, "printf", String.class, Object[].class)
        .orShould()
        .callMethod(PrintWriter.class, "format", String.class, Object[].class)
        .orShould()
        .callMethod(Locale.class, "getDefault")
        .check(Program.CLASSES);
  }

  @Test
  void everyPackageIsNullMarked() {
    Set<String> packages =
        Program.CLASSES.stream()
            .map(JavaClass::getPackageName)
            .collect(Collectors.toCollection(TreeSet::new));
    Set<String> marked =
        Program.CLASSES.stream()
            .filter(type -> type.getSimpleName().equals("package-info"))
            .filter(type -> type.isAnnotatedWith(NullMarked.class))
            .map(JavaClass::getPackageName)
            .collect(Collectors.toCollection(TreeSet::new));
    assertEquals(packages, marked, "packages, and those with @NullMarked in package-info.java");
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

  private static boolean owner(JavaAccess<?> access, Class<?> type) {
    return access.getTargetOwner().isEquivalentTo(type);
  }

  private static String name(JavaAccess<?> access) {
    return access.getTarget().getName();
  }
}
