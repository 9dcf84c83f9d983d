package org.rolltrace.ui.task;

import java.time.Duration;
import java.util.concurrent.Executor;
import java.util.concurrent.Executors;
import java.util.concurrent.ScheduledExecutorService;
import java.util.concurrent.TimeUnit;
import java.util.concurrent.atomic.AtomicInteger;
import java.util.concurrent.atomic.AtomicReference;
import java.util.function.Consumer;
import java.util.function.LongSupplier;
import java.util.function.Supplier;

/**
 * Does work on two threads of its own, one for each kind, so that a slow disk does not hold up
 * curves. They do not keep the program alive. Work that has begun is finished and handed over; of
 * the work that waits, only the newest is done.
 *
 * <p>Handing work to a thread and back can cost more than brief work itself. So when the last work
 * was brief and none is under way, the next is done on the spot; but not again so soon that the
 * caller's thread would do little else.
 */
public final class Background implements Runner, AutoCloseable {
  /** Work that takes no longer than this holds nobody up: half a frame of the screen. */
  static final Duration BRIEF = Duration.ofMillis(8);

  /** The least time from one work on the spot to the next: about a frame. */
  static final Duration BETWEEN = Duration.ofMillis(16);

  private final Executor handOver;
  private final LongSupplier clock;
  private final Lane soon = new Lane("work");
  private final Lane spaced = new Lane("spaced work");

  /** Work that was asked for and whose outcome has neither been taken nor dropped. */
  private final AtomicInteger underWay = new AtomicInteger();

  private volatile long lastTook = Long.MAX_VALUE;
  private volatile long lastOnTheSpot;
  private volatile boolean wasOnTheSpot;

  /**
   * A runner.
   *
   * @param handOver runs what takes the results, in order, on the thread that asks for the work,
   *     such as {@code Platform::runLater}
   */
  public Background(Executor handOver) {
    this(handOver, System::nanoTime);
  }

  Background(Executor handOver, LongSupplier clock) {
    this.handOver = handOver;
    this.clock = clock;
  }

  @Override
  public <T> void run(
      Supplier<T> work, Consumer<? super T> done, Consumer<? super Throwable> failed) {
    if (mayDoOnTheSpot()) {
      wasOnTheSpot = true;
      lastOnTheSpot = clock.getAsLong();
      outcome(timed(work), done, failed).run();
      return;
    }
    underWay.incrementAndGet();
    boolean replaces =
        soon.put(
            Duration.ZERO,
            () -> {
              Runnable outcome = outcome(timed(work), done, failed);
              handOver.execute(
                  () -> {
                    underWay.decrementAndGet();
                    outcome.run();
                  });
            });
    if (replaces) {
      underWay.decrementAndGet();
    }
  }

  private boolean mayDoOnTheSpot() {
    return underWay.get() == 0
        && lastTook <= BRIEF.toNanos()
        && !(wasOnTheSpot && clock.getAsLong() - lastOnTheSpot < BETWEEN.toNanos())
        && !soon.isClosed();
  }

  private <T> Supplier<T> timed(Supplier<T> work) {
    return () -> {
      long begun = clock.getAsLong();
      try {
        return work.get();
      } finally {
        lastTook = clock.getAsLong() - begun;
      }
    };
  }

  @Override
  public <T> void spaced(
      Duration pause,
      Supplier<T> work,
      Consumer<? super T> done,
      Consumer<? super Throwable> failed) {
    spaced.put(pause, () -> handOver.execute(outcome(work, done, failed)));
  }

  /** Does the work; what is returned tells of it. */
  private static <T> Runnable outcome(
      Supplier<T> work, Consumer<? super T> done, Consumer<? super Throwable> failed) {
    try {
      T result = work.get();
      return () -> done.accept(result);
    } catch (RuntimeException | Error thrown) {
      return () -> failed.accept(thrown);
    }
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

    /** Lets a job wait, and says whether it took the place of one that waited. */
    boolean put(Duration pause, Runnable job) {
      boolean isAwaited = waiting.getAndSet(job) != null;
      if (isAwaited || thread.isShutdown()) {
        return isAwaited; // who came before has called the thread
      }
      long since = System.nanoTime() - begun;
      long delay = hasBegun ? Math.max(0, pause.toNanos() - since) : 0;
      var unused = thread.schedule(this::next, delay, TimeUnit.NANOSECONDS);
      return false;
    }

    private void next() {
      begun = System.nanoTime();
      hasBegun = true;
      Runnable job = waiting.getAndSet(null);
      if (job != null) {
        job.run();
      }
    }

    boolean isClosed() {
      return thread.isShutdown();
    }

    void close() {
      waiting.set(null);
      thread.shutdownNow();
    }
  }
}
