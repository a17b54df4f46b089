package perveance.files.toml;

import java.util.ArrayList;
import java.util.Comparator;
import java.util.List;
import java.util.Optional;
import java.util.OptionalInt;
import perveance.engine.base.BadInputException;
import perveance.engine.base.Problem;

/** Gathers everything that is wrong with one file, so that it is told at once. */
public final class Problems {
  /** Nobody mends more than this in one go, and a damaged file could have one in every line. */
  static final int MOST = 100;

  private static final int LONGEST_WORDS = 600;

  private final String file;
  private final List<Problem> problems = new ArrayList<>();
  private int unlisted;

  /**
   * Starts an empty list.
   *
   * @param file the file as the person named it
   */
  public Problems(String file) {
    this.file = file;
  }

  /**
   * Adds a problem at a line.
   *
   * @param line line, counted from 1
   * @param key the key concerned, may be empty
   * @param found what stands there
   * @param expected what should
   */
  public void add(int line, String key, String found, String expected) {
    add(line, key, found, expected, Optional.empty());
  }

  /**
   * Adds a problem at a line with what was probably meant.
   *
   * @param line line, counted from 1
   * @param key the key concerned, may be empty
   * @param found what stands there
   * @param expected what should
   * @param suggestion the nearest thing that would be right, if any
   */
  public void add(
      int line, String key, String found, String expected, Optional<String> suggestion) {
    add(
        new Problem(
            file,
            OptionalInt.of(line),
            oneLine(key),
            oneLine(found),
            oneLine(expected),
            suggestion));
  }

  /**
   * Adds a problem of the file as a whole.
   *
   * @param key the key concerned, may be empty
   * @param found what is there, or nothing
   * @param expected what should be
   */
  public void addWhole(String key, String found, String expected) {
    add(
        new Problem(
            file,
            OptionalInt.empty(),
            oneLine(key),
            oneLine(found),
            oneLine(expected),
            Optional.empty()));
  }

  /**
   * Adds problems found elsewhere, for instance in a device file that this file names.
   *
   * @param others problems with their own file
   */
  public void addAll(List<Problem> others) {
    others.forEach(this::add);
  }

  /** What a file holds may not garble the terminal it is told on, nor fill it. */
  private static String oneLine(String words) {
    String whole =
        words.length() > LONGEST_WORDS ? words.substring(0, LONGEST_WORDS) + "\u2026" : words;
    StringBuilder plain = new StringBuilder(whole);
    for (int i = 0; i < plain.length(); i++) {
      if (Character.isISOControl(plain.charAt(i))) {
        plain.setCharAt(i, '?');
      }
    }
    return plain.toString();
  }

  private void add(Problem problem) {
    if (problems.size() < MOST) {
      if (!problems.contains(problem)) {
        problems.add(problem);
      }
    } else {
      unlisted++;
    }
  }

  /**
   * The file that is read.
   *
   * @return the file as the person named it
   */
  public String file() {
    return file;
  }

  /**
   * How much is wrong so far.
   *
   * @return number of problems
   */
  public int count() {
    return problems.size() + unlisted;
  }

  /**
   * Whether nothing is wrong so far.
   *
   * @return true when there is no problem
   */
  public boolean isEmpty() {
    return problems.isEmpty();
  }

  /**
   * The problems in the order of the file; those without a line, and those of other files, last.
   *
   * @return problems, at most a hundred and one that counts the rest
   */
  public List<Problem> list() {
    List<Problem> sorted = new ArrayList<>(problems);
    sorted.sort(
        Comparator.comparing((Problem p) -> !p.file().equals(file))
            .thenComparingInt(p -> p.line().orElse(Integer.MAX_VALUE)));
    if (unlisted > 0) {
      sorted.add(
          new Problem(
              file,
              OptionalInt.empty(),
              "",
              unlisted + " more problems",
              "the ones above to be mended first",
              Optional.empty()));
    }
    return sorted;
  }

  /**
   * Refuses the file when anything is wrong with it.
   *
   * @throws BadInputException with all problems
   */
  public void refuse() throws BadInputException {
    if (!problems.isEmpty()) {
      throw new BadInputException(list());
    }
  }
}
