package org.fallwright.ui.task;

import java.util.concurrent.Executor;
import java.util.concurrent.atomic.AtomicLong;
import java.util.function.BooleanSupplier;
import java.util.function.DoubleConsumer;

/**
 * Runs jobs in the background. Starting a job asks the one before it to stop, and what that one
 * still delivers is dropped: the answer shown always belongs to the last question.
 */
public final class NewestWins {
  /** A piece of work that tells its progress and asks whether to stop. */
  @FunctionalInterface
  public interface Job<T> {
    T run(DoubleConsumer progress, BooleanSupplier cancelled) throws Exception;
  }

  /** What becomes of a job; called on the delivering thread. */
  public interface Outcome<T> {
    void progress(double share);

    void done(T result);

    void failed(Exception cause);
  }

  private final Executor worker;
  private final Executor delivery;
  private final AtomicLong newest = new AtomicLong();

  /**
   * @param worker where jobs run
   * @param delivery where outcomes are told, such as the event thread
   */
  public NewestWins(Executor worker, Executor delivery) {
    this.worker = worker;
    this.delivery = delivery;
  }

  /** Starts a job; an older one is asked to stop. */
  public <T> void start(Job<T> job, Outcome<T> outcome) {
    long number = newest.incrementAndGet();
    worker.execute(
        () -> {
          if (number != newest.get()) {
            return;
          }
          try {
            T result =
                job.run(
                    share -> deliver(number, () -> outcome.progress(share)),
                    () -> number != newest.get());
            deliver(number, () -> outcome.done(result));
          } catch (Exception e) {
            deliver(number, () -> outcome.failed(e));
          }
        });
  }

  /** Asks the running job to stop; it delivers nothing more. */
  public void cancel() {
    newest.incrementAndGet();
  }

  private void deliver(long number, Runnable telling) {
    delivery.execute(
        () -> {
          if (number == newest.get()) {
            telling.run();
          }
        });
  }
}
