package org.rolltrace.ui.task;

import static org.assertj.core.api.Assertions.assertThat;

import java.time.Duration;
import java.util.List;
import java.util.concurrent.CopyOnWriteArrayList;
import java.util.concurrent.CountDownLatch;
import java.util.concurrent.Executor;
import java.util.concurrent.LinkedBlockingQueue;
import java.util.concurrent.TimeUnit;
import java.util.concurrent.atomic.AtomicLong;
import org.junit.jupiter.api.AfterEach;
import org.junit.jupiter.api.Test;

class BackgroundTest {
  private final LinkedBlockingQueue<Runnable> handedOver = new LinkedBlockingQueue<>();
  private final Executor handOver = handedOver::add;
  private final Background runner = new Background(handOver);
  private final List<String> seen = new CopyOnWriteArrayList<>();

  @AfterEach
  void end() {
    runner.close();
  }

  private void takeOne() throws InterruptedException {
    Runnable outcome = handedOver.poll(20, TimeUnit.SECONDS); // only a hung thread takes so long
    assertThat(outcome).isNotNull();
    outcome.run();
  }

  private static void await(CountDownLatch latch) {
    try {
      assertThat(latch.await(20, TimeUnit.SECONDS)).isTrue();
    } catch (InterruptedException e) {
      throw new IllegalStateException(e);
    }
  }

  @Test
  void ofWhatWaitsOnlyTheNewestIsDone() throws InterruptedException {
    CountDownLatch begun = new CountDownLatch(1);
    CountDownLatch mayGoOn = new CountDownLatch(1);
    runner.run(
        () -> {
          begun.countDown();
          await(mayGoOn);
          return "first";
        },
        seen::add,
        thrown -> seen.add("failed"));
    await(begun);
    for (String word : List.of("second", "third", "fourth")) {
      runner.run(() -> word, seen::add, thrown -> seen.add("failed"));
    }
    mayGoOn.countDown();
    takeOne();
    takeOne();
    assertThat(seen).containsExactly("first", "fourth");
    assertThat(handedOver.poll(50, TimeUnit.MILLISECONDS)).isNull();
  }

  @Test
  void workIsDoneElsewhereAndHandedOverWhereItIsTaken() throws InterruptedException {
    Thread here = Thread.currentThread();
    Thread[] worker = new Thread[1];
    runner.run(
        () -> {
          worker[0] = Thread.currentThread();
          return "done";
        },
        word -> seen.add(word + (Thread.currentThread() == here ? " here" : " elsewhere")),
        thrown -> seen.add("failed"));
    takeOne();
    assertThat(seen).containsExactly("done here");
    assertThat(worker[0]).isNotSameAs(here);
    assertThat(worker[0].isDaemon()).isTrue();
  }

  @Test
  void whatIsThrownIsHandedOverAndTheNextWorkIsDone() throws InterruptedException {
    runner.run(
        () -> {
          throw new StackOverflowError("deep");
        },
        word -> seen.add("done"),
        thrown -> seen.add(thrown.getMessage()));
    takeOne();
    runner.run(() -> "next", seen::add, thrown -> seen.add("failed"));
    if (seen.size() == 1) {
      takeOne(); // it was not done on the spot
    }
    assertThat(seen).containsExactly("deep", "next");
  }

  @Test
  void spacedWorkKeepsItsPause() throws InterruptedException {
    Duration pause = Duration.ofMillis(200);
    long start = System.nanoTime();
    for (int i = 0; i < 50; i++) {
      String word = "spaced " + i;
      runner.spaced(pause, () -> word, seen::add, thrown -> seen.add("failed"));
      TimeUnit.MILLISECONDS.sleep(1);
    }
    while (!seen.contains("spaced 49")) {
      takeOne();
    }
    // Once at the beginning, and once after each pause that went by.
    long pauses = (System.nanoTime() - start) / pause.toNanos();
    assertThat(seen).hasSizeBetween(1, (int) pauses + 1).doesNotContain("failed");
  }

  @Test
  void spacedWorkDoesNotHoldUpTheOther() throws InterruptedException {
    CountDownLatch mayGoOn = new CountDownLatch(1);
    runner.spaced(
        Duration.ZERO,
        () -> {
          await(mayGoOn);
          return "spaced";
        },
        seen::add,
        thrown -> seen.add("failed"));
    runner.run(() -> "other", seen::add, thrown -> seen.add("failed"));
    takeOne();
    mayGoOn.countDown();
    takeOne();
    assertThat(seen).containsExactly("other", "spaced");
  }

  @Test
  void afterTheEndNothingIsDone() throws InterruptedException {
    runner.close();
    runner.run(() -> "late", seen::add, thrown -> seen.add("failed"));
    runner.spaced(Duration.ZERO, () -> "late", seen::add, thrown -> seen.add("failed"));
    assertThat(handedOver.poll(50, TimeUnit.MILLISECONDS)).isNull();
  }

  /** A runner whose clock stands unless it is moved. */
  private Background onAClockOf(AtomicLong nanoTime) {
    return new Background(handOver, nanoTime::get);
  }

  private static void pass(AtomicLong nanoTime, Duration time) {
    nanoTime.addAndGet(time.toNanos());
  }

  @Test
  void afterBriefWorkTheNextIsDoneOnTheSpotButNotTwiceInAFrame() throws InterruptedException {
    AtomicLong nanoTime = new AtomicLong();
    try (Background timed = onAClockOf(nanoTime)) {
      timed.run(() -> "first", seen::add, thrown -> seen.add("failed"));
      takeOne();
      timed.run(() -> "on the spot", seen::add, thrown -> seen.add("failed"));
      assertThat(seen).containsExactly("first", "on the spot");
      timed.run(() -> "same frame", seen::add, thrown -> seen.add("failed"));
      assertThat(seen).hasSize(2);
      takeOne();
      pass(nanoTime, Background.BETWEEN);
      timed.run(() -> "next frame", seen::add, thrown -> seen.add("failed"));
      assertThat(seen).containsExactly("first", "on the spot", "same frame", "next frame");
    }
  }

  @Test
  void afterLongWorkTheNextIsDoneElsewhere() throws InterruptedException {
    AtomicLong nanoTime = new AtomicLong();
    try (Background timed = onAClockOf(nanoTime)) {
      timed.run(() -> "brief", seen::add, thrown -> seen.add("failed"));
      takeOne();
      timed.run(
          () -> {
            pass(nanoTime, Background.BRIEF.plusNanos(1));
            return "long";
          },
          seen::add,
          thrown -> seen.add("failed"));
      pass(nanoTime, Background.BETWEEN);
      timed.run(() -> "elsewhere", seen::add, thrown -> seen.add("failed"));
      assertThat(seen).containsExactly("brief", "long");
      takeOne();
      assertThat(seen).containsExactly("brief", "long", "elsewhere");
    }
  }

  @Test
  void nothingOvertakesWorkThatIsUnderWay() throws InterruptedException {
    AtomicLong nanoTime = new AtomicLong();
    try (Background timed = onAClockOf(nanoTime)) {
      timed.run(() -> "brief", seen::add, thrown -> seen.add("failed"));
      takeOne();
      timed.run(() -> "on the spot", seen::add, thrown -> seen.add("failed"));
      timed.run(() -> "under way", seen::add, thrown -> seen.add("failed"));
      pass(nanoTime, Background.BETWEEN);
      timed.run(() -> "later", seen::add, thrown -> seen.add("failed"));
      assertThat(seen).containsExactly("brief", "on the spot");
      while (!seen.contains("later")) {
        takeOne();
      }
      assertThat(seen.indexOf("later")).isEqualTo(seen.size() - 1);
      pass(nanoTime, Background.BETWEEN);
      timed.run(() -> "on the spot again", seen::add, thrown -> seen.add("failed"));
      assertThat(seen).endsWith("later", "on the spot again");
    }
  }

  @Test
  void whatIsThrownOnTheSpotIsTaken() throws InterruptedException {
    AtomicLong nanoTime = new AtomicLong();
    try (Background timed = onAClockOf(nanoTime)) {
      timed.run(() -> "brief", seen::add, thrown -> seen.add("failed"));
      takeOne();
      timed.run(
          () -> {
            throw new IllegalStateException("broken");
          },
          word -> seen.add("done"),
          thrown -> seen.add(thrown.getMessage()));
      assertThat(seen).containsExactly("brief", "broken");
    }
  }
}
