package perveance.desktop.task;

import java.util.concurrent.Executor;
import java.util.concurrent.atomic.AtomicLong;
import java.util.function.BiFunction;
import java.util.function.Consumer;
import perveance.engine.base.Progress;

/**
 * Answers only the latest question: while one is worked on, newer ones replace each other and the
 * work is told that it is no longer wanted. With executors that run at once everything happens on
 * the caller's thread, which is how tests use it.
 *
 * @param <Q> question
 * @param <A> answer
 */
public final class LatestOnly<Q, A> {
  private final Executor background;
  private final Executor foreground;
  private final BiFunction<Q, Progress, A> work;
  private final Consumer<A> done;
  private final Consumer<RuntimeException> failed;
  private final AtomicLong newest = new AtomicLong();

  /**
   * A queue of length one.
   *
   * @param background where the work runs, one at a time
   * @param foreground where answers are delivered
   * @param work answers a question
   * @param done receives the answer of the newest question
   * @param failed receives what went wrong with the newest question
   */
  public LatestOnly(
      Executor background,
      Executor foreground,
      BiFunction<Q, Progress, A> work,
      Consumer<A> done,
      Consumer<RuntimeException> failed) {
    this.background = background;
    this.foreground = foreground;
    this.work = work;
    this.done = done;
    this.failed = failed;
  }

  /**
   * Asks; answers to older questions will not be delivered.
   *
   * @param question the newest question
   */
  public void ask(Q question) {
    long number = newest.incrementAndGet();
    background.execute(() -> answer(question, number));
  }

  /** Nobody waits any more: whatever was asked will not be delivered. */
  public void cancel() {
    newest.incrementAndGet();
  }

  private void answer(Q question, long number) {
    if (superseded(number)) {
      return;
    }
    try {
      A answer = work.apply(question, new Watch(number));
      foreground.execute(() -> deliver(() -> done.accept(answer), number));
    } catch (RuntimeException e) {
      foreground.execute(() -> deliver(() -> failed.accept(e), number));
    }
  }

  private void deliver(Runnable delivery, long number) {
    if (!superseded(number)) {
      delivery.run();
    }
  }

  private boolean superseded(long number) {
    return newest.get() != number;
  }

  /** Tells the work when a newer question has come. */
  private final class Watch implements Progress {
    private final long number;

    Watch(long number) {
      this.number = number;
    }

    @Override
    public void report(double fraction, String what) {}

    @Override
    public boolean cancelled() {
      return superseded(number);
    }
  }
}
