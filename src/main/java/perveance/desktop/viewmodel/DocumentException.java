package perveance.desktop.viewmodel;

/** A file that cannot be read or written, told so that a person can act. */
public final class DocumentException extends Exception {
  private static final long serialVersionUID = 1L;

  private final String what;
  private final String remedy;

  /**
   * What went wrong.
   *
   * @param what what happened, a sentence
   * @param why the reason as found, one line each
   * @param remedy what to do, a sentence
   */
  public DocumentException(String what, String why, String remedy) {
    super(why);
    this.what = what;
    this.remedy = remedy;
  }

  /**
   * What happened.
   *
   * @return a sentence
   */
  public String what() {
    return what;
  }

  /**
   * The reason as found.
   *
   * @return one line each
   */
  public String why() {
    return String.valueOf(getMessage());
  }

  /**
   * What to do.
   *
   * @return a sentence
   */
  public String remedy() {
    return remedy;
  }
}
