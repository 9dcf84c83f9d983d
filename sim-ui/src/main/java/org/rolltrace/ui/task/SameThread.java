package org.rolltrace.ui.task;

import java.time.Duration;
import java.util.function.Consumer;
import java.util.function.Supplier;

/** Does all work at once, where it is asked for. */
public final class SameThread implements Runner {
  @Override
  public <T> void run(
      Supplier<T> work, Consumer<? super T> done, Consumer<? super Throwable> failed) {
    T result;
    try {
      result = work.get();
    } catch (RuntimeException | Error thrown) {
      failed.accept(thrown);
      return;
    }
    done.accept(result);
  }

  @Override
  public <T> void spaced(
      Duration pause,
      Supplier<T> work,
      Consumer<? super T> done,
      Consumer<? super Throwable> failed) {
    run(work, done, failed);
  }
}
