package perveance.desktop;

import java.util.concurrent.Callable;
import java.util.concurrent.CountDownLatch;
import java.util.concurrent.FutureTask;
import java.util.concurrent.TimeUnit;
import javafx.animation.AnimationTimer;
import javafx.application.Platform;

/** Starts the window toolkit without a display, once. */
final class Toolkit {
  private static final String NEEDS =
      "The window toolkit did not start. On Debian install the package libpangoft2-1.0-0;"
          + " the tests draw into memory and need no display.";

  private static final int FRAMES = 4;

  private Toolkit() {}

  static void start() {
    try {
      CountDownLatch started = new CountDownLatch(1);
      Platform.startup(started::countDown);
      Platform.setImplicitExit(false);
      if (!started.await(30, TimeUnit.SECONDS)) {
        throw new AssertionError(NEEDS);
      }
    } catch (IllegalStateException e) {
      // it runs already
      return;
    } catch (UnsatisfiedLinkError | NoClassDefFoundError | UnsupportedOperationException e) {
      throw new AssertionError(NEEDS, e);
    } catch (InterruptedException e) {
      Thread.currentThread().interrupt();
      throw new AssertionError(e);
    }
  }

  /** Runs on the toolkit's thread and waits. */
  static <T> T on(Callable<T> work) {
    FutureTask<T> task = new FutureTask<>(work);
    Platform.runLater(task);
    try {
      return task.get(60, TimeUnit.SECONDS);
    } catch (java.util.concurrent.ExecutionException e) {
      throw new AssertionError(e.getCause());
    } catch (java.util.concurrent.TimeoutException e) {
      throw new AssertionError("the window does not answer", e);
    } catch (InterruptedException e) {
      Thread.currentThread().interrupt();
      throw new AssertionError(e);
    }
  }

  /** Lets the window be laid out and drawn; sizes stand still after a few frames. */
  static void frames() {
    CountDownLatch seen = new CountDownLatch(FRAMES);
    AnimationTimer timer =
        new AnimationTimer() {
          @Override
          public void handle(long now) {
            seen.countDown();
          }
        };
    run(timer::start);
    try {
      if (!seen.await(60, TimeUnit.SECONDS)) {
        throw new AssertionError("the window is not drawn");
      }
    } catch (InterruptedException e) {
      Thread.currentThread().interrupt();
      throw new AssertionError(e);
    } finally {
      run(timer::stop);
    }
  }

  static void run(Runnable work) {
    on(
        () -> {
          work.run();
          return Boolean.TRUE;
        });
  }
}
