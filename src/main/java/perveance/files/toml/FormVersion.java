package perveance.files.toml;

import java.util.OptionalInt;

/** The number at the head of a file that tells the version of its form. */
public final class FormVersion {
  private FormVersion() {}

  /**
   * Complains unless a file's form is one that is read.
   *
   * @param table the file
   * @param key where the version stands
   * @param latest the latest version that is read; earlier ones are read too
   */
  public static void check(StrictTable table, String key, int latest) {
    table.require(key, "the version of the file's form, " + latest);
    OptionalInt version = table.whole(key, 1, Integer.MAX_VALUE);
    if (version.isPresent() && version.getAsInt() > latest) {
      table.complain(
          key,
          version.getAsInt() + ", a form that a later version of the program writes",
          latest == 1 ? "form 1" : "a form from 1 to " + latest);
    }
  }
}
