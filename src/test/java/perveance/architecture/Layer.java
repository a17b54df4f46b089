package perveance.architecture;

import com.tngtech.archunit.core.domain.JavaClass;
import com.tngtech.archunit.core.domain.JavaClasses;
import java.util.List;

/**
 * One package of the program with all that it may use. What is not listed is forbidden.
 *
 * @param name package below {@code perveance}; its sub-packages belong to it unless they are layers
 *     themselves
 * @param layers other layers that it may use
 * @param outside packages of the JDK and of libraries: exact, or with everything below when the
 *     name ends in {@code ..}; a name whose last part starts with a capital is one class
 */
record Layer(String name, List<String> layers, List<String> outside) {
  static final String ROOT = "perveance.";

  Layer {
    layers = List.copyOf(layers);
    outside = List.copyOf(outside);
  }

  boolean holds(String packageName) {
    return packageName.equals(ROOT + name) || packageName.startsWith(ROOT + name + ".");
  }

  private boolean permitsOutside(JavaClass target) {
    String packageName = target.getPackageName();
    return outside.stream()
        .anyMatch(
            permitted ->
                permitted.endsWith("..")
                    ? (packageName + ".").startsWith(permitted.substring(0, permitted.length() - 1))
                    : packageName.equals(permitted) || target.getFullName().equals(permitted));
  }

  /**
   * Looks for what the layer uses without permission.
   *
   * @param program classes to look at; those of other layers are passed over
   * @return one line for each use, with its place
   */
  List<String> breaches(JavaClasses program) {
    return program.stream()
        .filter(type -> Layers.of(type.getPackageName()).filter(this::equals).isPresent())
        .flatMap(type -> type.getDirectDependenciesFromSelf().stream())
        .filter(dependency -> !permits(dependency.getTargetClass().getBaseComponentType()))
        .map(dependency -> name + " may not use this: " + dependency.getDescription())
        .toList();
  }

  private boolean permits(JavaClass target) {
    if (target.isPrimitive()) {
      return true;
    }
    if (!target.getPackageName().startsWith(ROOT)) {
      return permitsOutside(target);
    }
    return Layers.of(target.getPackageName())
        .filter(other -> other.equals(this) || layers.contains(other.name()))
        .isPresent();
  }
}
