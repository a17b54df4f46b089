package perveance.desktop.viewmodel;

import java.nio.file.Path;
import java.util.List;
import java.util.Optional;
import perveance.engine.stage.Chassis;

/** Where chassis files are kept. */
public interface Documents {
  /**
   * A chassis with the text that it stands in.
   *
   * @param file its file, empty for one never saved
   * @param text its text, empty for one never saved
   * @param marked whether the file begins with a byte order mark
   * @param chassis what the text says
   */
  record Opened(Optional<Path> file, String text, boolean marked, Chassis chassis) {}

  /**
   * What an ended program left unsaved.
   *
   * @param id for {@link Documents#forget(Left)}
   * @param original the file that was being edited, empty for one never saved
   * @param when when it was kept last, in words
   * @param text the text as last edited
   */
  record Left(Path id, Optional<Path> original, String when, String text) {}

  /**
   * Reads a chassis file.
   *
   * @param file the file
   * @return what it says
   * @throws DocumentException when it cannot be used
   */
  Opened open(Path file) throws DocumentException;

  /**
   * Reads a text.
   *
   * @param name what it is called in messages
   * @param text the text
   * @return what it says, without a file
   * @throws DocumentException when it cannot be used
   */
  Opened read(String name, String text) throws DocumentException;

  /**
   * Writes a changed chassis, whole or not at all; comments and order stay.
   *
   * @param before as opened or saved last
   * @param now as it shall be
   * @param target where to
   * @return as it is saved
   * @throws DocumentException when it cannot be written; an older file is then still there
   */
  Opened save(Opened before, Chassis now, Path target) throws DocumentException;

  /**
   * Keeps what is not saved for the case that the program is killed.
   *
   * @param before as opened or saved last
   * @param now as it is
   * @throws DocumentException when it cannot be kept
   */
  void keep(Opened before, Chassis now) throws DocumentException;

  /**
   * Forgets what was kept.
   *
   * @throws DocumentException when it cannot be removed
   */
  void forget() throws DocumentException;

  /**
   * Forgets what an ended program left.
   *
   * @param left one of {@link #left()}
   * @throws DocumentException when it cannot be removed
   */
  void forget(Left left) throws DocumentException;

  /**
   * What ended programs have left.
   *
   * @return the latest first
   */
  List<Left> left();

  /**
   * Files opened or saved lately.
   *
   * @return the latest first
   */
  List<Path> recent();

  /**
   * Notes a file as opened or saved.
   *
   * @param file the file
   */
  void used(Path file);

  /**
   * Writes an export, whole or not at all.
   *
   * @param target where to
   * @param content the file
   * @throws DocumentException when it cannot be written
   */
  void write(Path target, byte[] content) throws DocumentException;
}
