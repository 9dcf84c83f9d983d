package org.rolltrace.ui.task;

import java.time.Duration;
import java.util.function.Consumer;
import java.util.function.Supplier;

/** Does work, perhaps on another thread, and hands over what came of it. */
public interface Runner {
  /**
   * Does work soon. Work that still waits when newer work comes is dropped, what has begun is not;
   * results are handed over in the order of the calls.
   *
   * @param work makes the result
   * @param done takes the result, on the thread that owns the state
   * @param failed takes what was thrown instead, on the same thread
   * @param <T> what comes of it
   */
  <T> void run(Supplier<T> work, Consumer<? super T> done, Consumer<? super Throwable> failed);

  /**
   * Does work beside the other, with a pause between one such work and the next. Work that waits
   * when newer work of this kind comes is dropped.
   *
   * @param pause least time from one start to the next
   * @param work makes the result
   * @param done takes the result, on the thread that owns the state
   * @param failed takes what was thrown instead, on the same thread
   * @param <T> what comes of it
   */
  <T> void spaced(
      Duration pause,
      Supplier<T> work,
      Consumer<? super T> done,
      Consumer<? super Throwable> failed);
}
