package perveance.engine.base;

/** Where a long computation tells how far it is, and learns that nobody waits for it any more. */
public interface Progress {
  /**
   * Tells how far the work is.
   *
   * @param fraction the part done, from 0 to 1 [1]
   * @param what what is being done, in a few words
   */
  void report(double fraction, String what);

  /**
   * Tells whether the work should stop at the next convenient point.
   *
   * @return true once the result is no longer wanted
   */
  boolean cancelled();

  /**
   * Returns a progress that nobody watches and that never cancels.
   *
   * @return the silent progress
   */
  static Progress none() {
    return Silent.INSTANCE;
  }

  /** The progress that nobody watches. */
  enum Silent implements Progress {
    INSTANCE;

    @Override
    public void report(double fraction, String what) {
      // Nobody watches.
    }

    @Override
    public boolean cancelled() {
      return false;
    }
  }
}
