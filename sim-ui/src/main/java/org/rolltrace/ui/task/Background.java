package org.rolltrace.ui.task;

import java.time.Duration;
import java.util.concurrent.Executor;
import java.util.concurrent.Executors;
import java.util.concurrent.ScheduledExecutorService;
import java.util.concurrent.TimeUnit;
import java.util.concurrent.atomic.AtomicReference;
import java.util.function.Consumer;
import java.util.function.Supplier;

/**
 * Does work on two threads of its own, one for each kind, so that a slow disk does not hold up
 * curves. They do not keep the program alive. Work that has begun is finished and handed over; of
 * the work that waits, only the newest is done.
 */
public final class Background implements Runner, AutoCloseable {
  private final Executor handOver;
  private final Lane soon = new Lane("work");
  private final Lane spaced = new Lane("spaced work");

  /**
   * A runner.
   *
   * @param handOver runs what takes the results, in order, such as {@code Platform::runLater}
   */
  public Background(Executor handOver) {
    this.handOver = handOver;
  }

  @Override
  public <T> void run(
      Supplier<T> work, Consumer<? super T> done, Consumer<? super Throwable> failed) {
    soon.put(Duration.ZERO, job(work, done, failed));
  }

  @Override
  public <T> void spaced(
      Duration pause,
      Supplier<T> work,
      Consumer<? super T> done,
      Consumer<? super Throwable> failed) {
    spaced.put(pause, job(work, done, failed));
  }

  private <T> Runnable job(
      Supplier<T> work, Consumer<? super T> done, Consumer<? super Throwable> failed) {
    return () -> {
      Runnable outcome;
      try {
        T result = work.get();
        outcome = () -> done.accept(result);
      } catch (RuntimeException | Error thrown) {
        outcome = () -> failed.accept(thrown);
      }
      handOver.execute(outcome);
    };
  }

  /** Drops what waits; what has begun is finished. */
  @Override
  public void close() {
    soon.close();
    spaced.close();
  }

  /** One thread and the job that waits for it. */
  private static final class Lane {
    private final AtomicReference<Runnable> waiting = new AtomicReference<>();
    private final ScheduledExecutorService thread;
    private volatile long begun;
    private volatile boolean hasBegun;

    Lane(String name) {
      thread =
          Executors.newSingleThreadScheduledExecutor(
              task -> {
                Thread made = new Thread(task, name);
                made.setDaemon(true);
                return made;
              });
    }

    void put(Duration pause, Runnable job) {
      boolean isAwaited = waiting.getAndSet(job) != null;
      if (isAwaited || thread.isShutdown()) {
        return; // who came before has called the thread
      }
      long since = System.nanoTime() - begun;
      long delay = hasBegun ? Math.max(0, pause.toNanos() - since) : 0;
      var unused = thread.schedule(this::next, delay, TimeUnit.NANOSECONDS);
    }

    private void next() {
      begun = System.nanoTime();
      hasBegun = true;
      Runnable job = waiting.getAndSet(null);
      if (job != null) {
        job.run();
      }
    }

    void close() {
      waiting.set(null);
      thread.shutdownNow();
    }
  }
}
