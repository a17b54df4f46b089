package perveance.desktop.viewmodel;

import java.nio.file.Path;
import java.util.List;
import java.util.Optional;

/** Questions to the person; tests answer them without a dialog. */
public interface Asking {
  /**
   * Which file to open.
   *
   * @return file, empty when the person changed their mind
   */
  Optional<Path> fileToOpen();

  /**
   * Where to write.
   *
   * @param what what will be written, for the title
   * @param proposed proposed name
   * @param ending ending of the name without a dot
   * @return file, empty when the person changed their mind
   */
  Optional<Path> fileToWrite(String what, String proposed, String ending);

  /** What shall become of unsaved changes. */
  enum Unsaved {
    /** Save them first. */
    SAVE,
    /** Give them up. */
    DISCARD,
    /** Stay here. */
    STAY
  }

  /**
   * Asks about unsaved changes.
   *
   * @param title what has changed
   * @return the person's will
   */
  Unsaved unsaved(String title);

  /**
   * Asks which one.
   *
   * @param question a question
   * @param choices what there is
   * @return index of the choice, empty when none
   */
  Optional<Integer> choose(String question, List<String> choices);

  /**
   * Asks for a word.
   *
   * @param question a question
   * @param proposed what stands there first
   * @return the word, empty when the person changed their mind
   */
  Optional<String> word(String question, String proposed);

  /**
   * Tells of trouble.
   *
   * @param what what happened
   * @param why the reason as found
   * @param remedy what to do
   */
  void tell(String what, String why, String remedy);
}
