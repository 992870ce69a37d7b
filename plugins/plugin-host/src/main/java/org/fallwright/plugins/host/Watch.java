package org.fallwright.plugins.host;

import java.time.Duration;
import java.util.concurrent.Callable;
import java.util.concurrent.CancellationException;
import java.util.concurrent.FutureTask;
import java.util.concurrent.SynchronousQueue;
import java.util.concurrent.ThreadPoolExecutor;
import java.util.concurrent.TimeUnit;
import java.util.concurrent.TimeoutException;

/**
 * Runs what plugins do on threads of their own and waits for it no longer than a limit. A thread
 * that does not come back is interrupted and given up: it cannot be ended by force, but it holds
 * nobody and does not keep the program from closing. The threads are kept and used again, so that a
 * call costs a hand-over and no new thread.
 */
final class Watch implements AutoCloseable {
  /** What a call may take. A good one takes less than a thousandth of it. */
  static final Duration USUAL = Duration.ofSeconds(5);

  private static final long IDLE_S = 10;

  private final Duration limit;
  private final ThreadPoolExecutor threads =
      new ThreadPoolExecutor(
          0,
          Integer.MAX_VALUE,
          IDLE_S,
          TimeUnit.SECONDS,
          new SynchronousQueue<>(),
          task -> {
            Thread thread = new Thread(task, "plugin call");
            thread.setDaemon(true);
            return thread;
          });

  Watch(Duration limit) {
    this.limit = limit;
  }

  /** It took longer than the limit. */
  static final class TooLong extends RuntimeException {
    private static final long serialVersionUID = 1L;

    private TooLong(Duration limit) {
      super("no answer within " + limit.toMillis() / 1000.0 + " s");
    }
  }

  /**
   * What the call gives.
   *
   * @throws TooLong if it does not come back in time
   * @throws Throwable whatever the call throws
   */
  <T> T within(Callable<T> what) throws Throwable {
    FutureTask<Outcome<T>> call = new FutureTask<>(() -> outcome(what));
    threads.execute(call);
    Outcome<T> outcome;
    try {
      outcome = call.get(limit.toNanos(), TimeUnit.NANOSECONDS);
    } catch (TimeoutException e) {
      call.cancel(true);
      throw new TooLong(limit);
    } catch (InterruptedException e) { // whoever asked is told to stop: no fault of the plugin
      call.cancel(true);
      Thread.currentThread().interrupt();
      throw new Stopped();
    }
    if (outcome.thrown() != null) {
      throw outcome.thrown();
    }
    return outcome.value();
  }

  /** What came of a call; a task's own way to say so would ask what was thrown for its message. */
  private record Outcome<T>(T value, Throwable thrown) {}

  private static <T> Outcome<T> outcome(Callable<T> what) {
    try {
      return new Outcome<>(what.call(), null);
    } catch (Throwable thrown) {
      return new Outcome<>(null, thrown);
    }
  }

  /** Whoever asked was told to stop. */
  static final class Stopped extends CancellationException {
    private static final long serialVersionUID = 1L;
  }

  /** Lets the threads go. */
  @Override
  public void close() {
    threads.shutdownNow();
  }
}
