package perveance.engine.stage;

/** How nodes and elements of a chassis are named. */
public final class ChassisNames {
  /** What a name may be, in words. */
  public static final String FORM = "a short name without a point, such as \"V1a\"";

  private static final int LONGEST = 40;

  private ChassisNames() {}

  /**
   * Whether a name can stand in front of the names of nodes and elements.
   *
   * @param name reference of a stage or name of a supply
   * @return false for names that are empty, long, padded, hold a point or are taken
   */
  public static boolean wellFormed(String name) {
    return !name.isEmpty()
        && name.length() <= LONGEST
        && name.equals(name.strip())
        && name.chars().noneMatch(c -> c == '.' || Character.isISOControl(c))
        && !name.equals("chassis")
        && !name.equals("supply");
  }

  /**
   * Name of a supply's node, and of the source or dropper that feeds it.
   *
   * @param supply name of the supply in the chassis
   * @return for example {@code supply.A}
   */
  public static String supply(String supply) {
    return "supply." + supply;
  }

  /**
   * Reference of one of several valve sections in a stage: a letter behind a number, a number
   * behind anything else.
   *
   * @param ref reference of the stage
   * @param index which section, from 0 [1]
   * @return for example {@code V1b}
   */
  public static String section(String ref, int index) {
    boolean endsInDigit = !ref.isEmpty() && Character.isDigit(ref.charAt(ref.length() - 1));
    return endsInDigit ? ref + (char) ('a' + index) : ref + "." + (index + 1);
  }
}
