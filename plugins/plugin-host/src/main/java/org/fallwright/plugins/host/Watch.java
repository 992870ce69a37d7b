package org.fallwright.plugins.host;

import java.time.Duration;
import java.util.concurrent.Callable;
import java.util.concurrent.CancellationException;
import java.util.concurrent.ExecutionException;
import java.util.concurrent.FutureTask;
import java.util.concurrent.SynchronousQueue;
import java.util.concurrent.ThreadPoolExecutor;
import java.util.concurrent.TimeUnit;
import java.util.concurrent.TimeoutException;
import java.util.function.Supplier;

/**
 * Runs what plugins do on threads of their own and waits for it no longer than a limit. A thread
 * that does not come back is interrupted and given up: it cannot be ended by force, but it holds
 * nobody and does not keep the program from closing.
 *
 * <p>Handing over a single call costs some twenty microseconds. A search that asks a million times
 * hands over whole pieces of its work instead, see {@link #piece}: the calls in it only note when
 * they begin and end, and whoever waits for the piece looks at that note.
 */
final class Watch implements AutoCloseable {
  /** What a call may take. A good one takes less than a thousandth of it. Planning allowance. */
  static final Duration USUAL = Duration.ofSeconds(5);

  private static final long IDLE_S = 10;

  private final Duration limit;
  private final ThreadPoolExecutor threads =
      new ThreadPoolExecutor(
          0, Integer.MAX_VALUE, IDLE_S, TimeUnit.SECONDS, new SynchronousQueue<>(), Watched::new);

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

  /** Whoever asked was told to stop. */
  static final class Stopped extends CancellationException {
    private static final long serialVersionUID = 1L;
  }

  /**
   * A call into a plugin that is going on.
   *
   * @param sinceNs when it began
   * @param late what to throw where it takes too long
   */
  private record Going(long sinceNs, Supplier<? extends RuntimeException> late) {}

  /** A thread that runs plugins. */
  private static final class Watched extends Thread {
    private volatile Going going;

    private Watched(Runnable work) {
      super(work, "plugin call");
      setDaemon(true);
    }
  }

  /** Work that knows the thread that does it. */
  private static final class Piece<T> extends FutureTask<Outcome<T>> {
    private volatile Watched by;

    private Piece(Callable<T> work) {
      super(() -> outcome(work));
    }

    @Override
    public void run() {
      by = (Watched) Thread.currentThread();
      super.run();
    }
  }

  /** What came of work; a task's own way to say so would ask what was thrown for its message. */
  private record Outcome<T>(T value, Throwable thrown) {}

  private static <T> Outcome<T> outcome(Callable<T> work) {
    try {
      return new Outcome<>(work.call(), null);
    } catch (Throwable thrown) {
      return new Outcome<>(null, thrown);
    }
  }

  /**
   * What one call into a plugin gives.
   *
   * @throws TooLong if it does not come back in time
   * @throws Throwable whatever the call throws
   */
  <T> T within(Callable<T> call) throws Throwable {
    return within(call, this::tooLong);
  }

  /**
   * What one call into a plugin gives.
   *
   * @param late makes what is thrown if it does not come back in time; asked on the waiting thread
   * @throws Throwable whatever the call throws
   */
  <T> T within(Callable<T> call, Supplier<? extends RuntimeException> late) throws Throwable {
    if (!(Thread.currentThread() instanceof Watched self)) {
      return piece(() -> noted(call, late, (Watched) Thread.currentThread()));
    }
    return noted(call, late, self);
  }

  private static <T> T noted(
      Callable<T> call, Supplier<? extends RuntimeException> late, Watched self) throws Exception {
    self.going = new Going(System.nanoTime(), late);
    try {
      return call.call();
    } finally {
      self.going = null;
    }
  }

  /**
   * Does a piece of work that may take long and that calls plugins; it is given up only if one of
   * these calls takes too long.
   *
   * @throws Stopped where the waiting thread is told to stop
   * @throws Throwable whatever the work throws
   */
  <T> T piece(Callable<T> work) throws Throwable {
    Piece<T> piece = new Piece<>(work);
    threads.execute(piece);
    while (true) {
      try {
        Outcome<T> outcome = piece.get(limit.toNanos() / 4, TimeUnit.NANOSECONDS);
        if (outcome.thrown() != null) {
          throw outcome.thrown();
        }
        return outcome.value();
      } catch (TimeoutException e) {
        Watched by = piece.by;
        Going going = by == null ? null : by.going;
        if (going != null && System.nanoTime() - going.sinceNs() > limit.toNanos()) {
          piece.cancel(true);
          throw going.late().get();
        }
      } catch (InterruptedException e) { // whoever asked is told to stop: no fault of the plugin
        piece.cancel(true);
        Thread.currentThread().interrupt();
        throw new Stopped();
      } catch (ExecutionException e) { // nothing but a broken machine: the outcome holds the rest
        throw e.getCause();
      }
    }
  }

  /** How a call that took too long is described. */
  TooLong tooLong() {
    return new TooLong(limit);
  }

  /** Lets the threads go. */
  @Override
  public void close() {
    threads.shutdownNow();
  }
}
