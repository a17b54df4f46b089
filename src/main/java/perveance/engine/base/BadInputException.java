package perveance.engine.base;

import java.util.List;
import java.util.stream.Collectors;

/** Input that cannot be used, with every problem of it told at once. */
public final class BadInputException extends Exception {
  private static final long serialVersionUID = 1L;

  private final transient List<Problem> problems;

  /**
   * Creates the refusal.
   *
   * @param problems all problems, at least one, in the order of the file
   */
  public BadInputException(List<Problem> problems) {
    super(problems.stream().map(Problem::message).collect(Collectors.joining("\n")));
    if (problems.isEmpty()) {
      throw new IllegalArgumentException("problems is empty");
    }
    this.problems = List.copyOf(problems);
  }

  /**
   * Creates the refusal for a single problem.
   *
   * @param problem the problem
   */
  public BadInputException(Problem problem) {
    this(List.of(problem));
  }

  /**
   * Returns every problem, in the order of the file.
   *
   * @return the problems, at least one
   */
  public List<Problem> problems() {
    return problems;
  }
}
