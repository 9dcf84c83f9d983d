package org.rolltrace.ui.task;

import java.time.Duration;
import java.util.concurrent.Executor;
import java.util.function.Consumer;
import java.util.function.Supplier;

/** Does work on a thread of its own, which does not keep the program alive. */
public final class Background implements Runner, AutoCloseable {
  private final Executor handOver;

  /**
   * A runner.
   *
   * @param handOver runs what takes the results, such as {@code Platform::runLater}
   */
  public Background(Executor handOver) {
    this.handOver = handOver;
  }

  @Override
  public <T> void run(
      Supplier<T> work, Consumer<? super T> done, Consumer<? super Throwable> failed) {
    handOver.execute(() -> new SameThread().run(work, done, failed));
  }

  @Override
  public <T> void spaced(
      Duration pause,
      Supplier<T> work,
      Consumer<? super T> done,
      Consumer<? super Throwable> failed) {
    run(work, done, failed);
  }

  @Override
  public void close() {}
}
