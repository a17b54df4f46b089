package perveance.engine.stage;

import java.util.Objects;
import java.util.Optional;

/**
 * Something in a chassis that cannot be built, with its place. Whoever read the chassis from a file
 * adds the line.
 *
 * @param place which table of the chassis it is in
 * @param index which of the tables of that sort, from 0; 0 for the conditions [1]
 * @param name name of the supply or reference of the stage
 * @param key key to change, empty when it is the table as a whole
 * @param found what stands there, in words that follow "found"
 * @param expected what would do, in words that follow "expected"
 * @param suggestion the nearest name that would be right
 */
public record ChassisComplaint(
    Place place,
    int index,
    String name,
    String key,
    String found,
    String expected,
    Optional<String> suggestion) {
  /** Checks for absent parts. */
  public ChassisComplaint {
    Objects.requireNonNull(place, "place");
    Objects.requireNonNull(suggestion, "suggestion");
  }

  /** Which sort of table. */
  public enum Place {
    /** The conditions. */
    CONDITIONS,
    /** A supply node. */
    SUPPLY,
    /** A stage. */
    STAGE
  }

  /**
   * Says it in one line.
   *
   * @return the sentence
   */
  public String message() {
    String where =
        place == Place.CONDITIONS ? "conditions" : place == Place.SUPPLY ? "supply " : "stage ";
    String near = suggestion.map(s -> "; did you mean \"" + s + "\"?").orElse("");
    return (where + name + " " + key).strip()
        + ": found "
        + found
        + ", expected "
        + expected
        + near;
  }
}
