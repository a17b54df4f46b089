package perveance.architecture;

import java.net.URI;
import javax.tools.SimpleJavaFileObject;

/** A Java source that is no file of the program. */
final class TextSource extends SimpleJavaFileObject {
  private final String text;

  /**
   * Takes a text.
   *
   * @param path where it would be, such as {@code perveance/cli/Sample.java}
   * @param text a whole Java source
   */
  TextSource(String path, String text) {
    super(URI.create("string:///" + path), Kind.SOURCE);
    this.text = text;
  }

  @Override
  public CharSequence getCharContent(boolean ignoreEncodingErrors) {
    return text;
  }
}
