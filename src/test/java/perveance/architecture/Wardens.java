package perveance.architecture;

import static com.tngtech.archunit.base.DescribedPredicate.describe;
import static com.tngtech.archunit.lang.syntax.ArchRuleDefinition.classes;
import static com.tngtech.archunit.lang.syntax.ArchRuleDefinition.fields;
import static com.tngtech.archunit.lang.syntax.ArchRuleDefinition.noClasses;

import com.tngtech.archunit.core.domain.JavaAccess;
import com.tngtech.archunit.core.domain.JavaClass;
import com.tngtech.archunit.core.domain.JavaModifier;
import com.tngtech.archunit.lang.ArchRule;
import com.tngtech.archunit.library.GeneralCodingRules;
import java.io.PrintStream;
import java.io.PrintWriter;
import java.util.Locale;
import java.util.Random;
import java.util.Set;
import org.jspecify.annotations.NullMarked;

/** Things that only one place may do, and things that nobody may do. */
enum Wardens {
  ENGINE_KNOWS_NO_THREAD_PROCESS_CLOCK_OR_LOADER(
      noClasses()
          .that()
          .resideInAPackage("perveance.engine..")
          .should()
          .dependOnClassesThat(
              describe(
                  "are kept from the engine",
                  (JavaClass type) -> Reserved.JDK_NOT_FOR_ENGINE.contains(type.getFullName())))),

  ENGINE_ASKS_THE_SYSTEM_FOR_NOTHING(
      noClasses()
          .that()
          .resideInAPackage("perveance.engine..")
          .should()
          .accessTargetWhere(
              describe(
                  "it belongs to System and is not " + Reserved.SYSTEM_FOR_ENGINE,
                  access ->
                      belongs(access, System.class)
                          && !Reserved.SYSTEM_FOR_ENGINE.contains(name(access))))),

  ENGINE_FINDS_NOTHING_BY_NAME(
      noClasses()
          .that()
          .resideInAPackage("perveance.engine..")
          .should()
          .accessTargetWhere(
              describe(
                  "it belongs to Class and is not " + Reserved.TYPE_FOR_ENGINE,
                  access ->
                      belongs(access, Class.class)
                          && !Reserved.TYPE_FOR_ENGINE.contains(name(access))))),

  ENGINE_RUNS_IN_THE_THREAD_THAT_CALLS_IT(
      noClasses()
          .that()
          .resideInAPackage("perveance.engine..")
          .should()
          .accessTargetWhere(
              describe(
                  "it starts parallel work",
                  access -> Set.of("parallel", "parallelStream").contains(name(access))))),

  /** Two runs with the same input give the same figures. */
  CHANCE_IS_SEEDED(
      noClasses()
          .should()
          .callMethod(Math.class, "random")
          .orShould()
          .callConstructor(Random.class)),

  ONLY_THE_COMMAND_LINE_TOUCHES_THE_STANDARD_STREAMS(
      noClasses()
          .that()
          .resideOutsideOfPackage("perveance.cli..")
          .should(GeneralCodingRules.ACCESS_STANDARD_STREAMS)),

  NOBODY_PRINTS_A_TRACE(
      noClasses()
          .should()
          .callMethodWhere(
              describe("it prints a trace", call -> name(call).equals("printStackTrace")))),

  ONLY_THE_LAUNCHERS_END_THE_PROGRAM(
      noClasses()
          .that()
          .resideOutsideOfPackage("perveance.launch..")
          .should()
          .callMethod(System.class, "exit", int.class)),

  NOBODY_THROWS_A_GENERIC_EXCEPTION(GeneralCodingRules.NO_CLASSES_SHOULD_THROW_GENERIC_EXCEPTIONS),

  NO_STATIC_FIELD_CHANGES(fields().that().haveModifier(JavaModifier.STATIC).should().beFinal()),

  /** A figure must not change its decimal mark with the machine it is printed on. */
  NUMBERS_ARE_PRINTED_WITH_A_STATED_LOCALE(
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
          .callMethod(Locale.class, "getDefault")),

  PACKAGE_DESCRIPTIONS_ARE_NULL_MARKED(
      classes().that().haveSimpleName("package-info").should().beAnnotatedWith(NullMarked.class));

  final ArchRule rule;

  Wardens(ArchRule rule) {
    this.rule = rule;
  }

  private static boolean belongs(JavaAccess<?> access, Class<?> type) {
    return access.getTargetOwner().isEquivalentTo(type);
  }

  private static String name(JavaAccess<?> access) {
    return access.getTarget().getName();
  }

  /** Parts of {@code java.lang} and {@code java.util} that an allow-list of packages lets pass. */
  private static final class Reserved {
    /** The only methods of the class {@code System} that the engine has a use for. */
    static final Set<String> SYSTEM_FOR_ENGINE = Set.of("arraycopy", "identityHashCode");

    /** Questions about a type; everything else on {@code Class} finds things by name. */
    static final Set<String> TYPE_FOR_ENGINE =
        Set.of("getSimpleName", "isInstance", "cast", "desiredAssertionStatus", "getEnumConstants");

    static final Set<String> JDK_NOT_FOR_ENGINE =
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
  }
}
