package perveance.files.toml;

/** One block of a file as it shall be. */
public sealed interface BlockWanted {
  /**
   * A block that is there already.
   *
   * @param table its table
   */
  record Kept(TomlTable table) implements BlockWanted {}

  /**
   * A block that is new.
   *
   * @param text its text, whole lines
   */
  record New(String text) implements BlockWanted {}
}
