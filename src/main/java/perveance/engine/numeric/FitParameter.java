package perveance.engine.numeric;

import java.util.Objects;

/**
 * One parameter of a fit.
 *
 * @param name what it is called in messages
 * @param start where the fit starts, inside the domain [unit of the parameter]
 * @param domain where it may lie
 */
public record FitParameter(String name, double start, ParameterDomain domain) {
  /** Refuses starts outside the domain. */
  public FitParameter {
    Objects.requireNonNull(name, "name");
    if (!domain.contains(start)) {
      throw new IllegalArgumentException("start of " + name + " is outside its domain: " + start);
    }
  }

  /**
   * A parameter that may be any number.
   *
   * @param name what it is called in messages
   * @param start where the fit starts [unit of the parameter]
   * @param scale a change that matters, above 0 [unit of the parameter]
   * @return the parameter
   */
  public static FitParameter free(String name, double start, double scale) {
    return new FitParameter(name, start, new ParameterDomain.Free(scale));
  }

  /**
   * A parameter above zero.
   *
   * @param name what it is called in messages
   * @param start where the fit starts, above 0 [unit of the parameter]
   * @return the parameter
   */
  public static FitParameter positive(String name, double start) {
    return new FitParameter(name, start, new ParameterDomain.Positive());
  }

  /**
   * A parameter between two bounds.
   *
   * @param name what it is called in messages
   * @param start where the fit starts, strictly between the bounds [unit of the parameter]
   * @param low the lower bound [unit of the parameter]
   * @param high the upper bound [unit of the parameter]
   * @return the parameter
   */
  public static FitParameter between(String name, double start, double low, double high) {
    return new FitParameter(name, start, new ParameterDomain.Between(low, high));
  }
}
