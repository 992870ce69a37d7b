package org.fallwright.ui.task;

import static org.assertj.core.api.Assertions.assertThat;

import java.util.ArrayDeque;
import java.util.ArrayList;
import java.util.List;
import java.util.Queue;
import java.util.function.BooleanSupplier;
import org.junit.jupiter.api.Test;

/** Worker and delivery are queues that the test empties by hand, so that no time is involved. */
class NewestWinsTest {
  private final Queue<Runnable> work = new ArrayDeque<>();
  private final Queue<Runnable> deliveries = new ArrayDeque<>();
  private final List<String> told = new ArrayList<>();
  private final NewestWins tasks = new NewestWins(work::add, deliveries::add);

  @Test
  void aJobTellsItsProgressAndItsResult() {
    tasks.start(
        (progress, cancelled) -> {
          progress.accept(0.5);
          return "plan";
        },
        outcome());
    runAll(work);
    runAll(deliveries);
    assertThat(told).containsExactly("0.5", "done plan");
  }

  @Test
  void theOlderJobIsAskedToStopAndItsResultIsDropped() {
    List<BooleanSupplier> asked = new ArrayList<>();
    tasks.start(
        (progress, cancelled) -> {
          asked.add(cancelled);
          return "old";
        },
        outcome());
    work.remove().run();
    assertThat(asked.get(0).getAsBoolean()).isFalse();
    tasks.start((progress, cancelled) -> "new", outcome());
    assertThat(asked.get(0).getAsBoolean()).isTrue();
    runAll(work);
    runAll(deliveries);
    assertThat(told).containsExactly("done new");
  }

  @Test
  void aJobOvertakenBeforeItBeganIsNotRun() {
    tasks.start((progress, cancelled) -> told.add("ran"), new Silent());
    tasks.start((progress, cancelled) -> "new", outcome());
    runAll(work);
    runAll(deliveries);
    assertThat(told).containsExactly("done new");
  }

  @Test
  void aStoppedJobTellsNothing() {
    tasks.start((progress, cancelled) -> "plan", outcome());
    runAll(work);
    tasks.cancel();
    runAll(deliveries);
    assertThat(told).isEmpty();
  }

  @Test
  void aFaultIsTold() {
    tasks.start(
        (progress, cancelled) -> {
          throw new IllegalStateException("no line");
        },
        outcome());
    runAll(work);
    runAll(deliveries);
    assertThat(told).containsExactly("failed no line");
  }

  private static void runAll(Queue<Runnable> queue) {
    while (!queue.isEmpty()) {
      queue.remove().run();
    }
  }

  private NewestWins.Outcome<String> outcome() {
    return new NewestWins.Outcome<>() {
      @Override
      public void progress(double share) {
        told.add(String.valueOf(share));
      }

      @Override
      public void done(String result) {
        told.add("done " + result);
      }

      @Override
      public void failed(Exception cause) {
        told.add("failed " + cause.getMessage());
      }
    };
  }

  private static final class Silent implements NewestWins.Outcome<Boolean> {
    @Override
    public void progress(double share) {}

    @Override
    public void done(Boolean result) {}

    @Override
    public void failed(Exception cause) {}
  }
}
