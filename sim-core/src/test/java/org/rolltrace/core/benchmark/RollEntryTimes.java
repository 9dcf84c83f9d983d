package org.rolltrace.core.benchmark;

import java.util.Locale;
import java.util.function.Supplier;
import org.rolltrace.core.run.ScenarioRun;
import org.rolltrace.core.scenario.Scenario;
import org.rolltrace.core.testing.Shipped;

/**
 * The times of the same roll entry as in {@link RollEntryBenchmark}, taken quickly for {@code
 * compare-speed}: one line for each kind of run, its name and its time in µs.
 */
public final class RollEntryTimes {
  private static final long WARM_UP = 3_000_000_000L;
  private static final long MEASURE = 2_000_000_000L;
  private static final int RUNS = 100;

  private static Object kept;

  private RollEntryTimes() {}

  /** Measures and prints; takes no arguments. */
  public static void main(String[] arguments) {
    Scenario free = Shipped.scenario("light-single-roll-entry");
    Scenario held = RollEntryBenchmark.heldLike(free);
    print("free", () -> ScenarioRun.execute(free));
    print("held", () -> ScenarioRun.execute(held));
    print("freeMeasures", () -> ScenarioRun.measure(free));
    print("heldMeasures", () -> ScenarioRun.measure(held));
  }

  private static void print(String name, Supplier<Object> run) {
    bestOf(run, WARM_UP);
    System.out.printf(Locale.ROOT, "time %s %.2f%n", name, bestOf(run, MEASURE));
  }

  /** The best mean of some runs, µs: what the machine does besides is not of interest. */
  private static double bestOf(Supplier<Object> run, long nanoseconds) {
    double best = Double.POSITIVE_INFINITY;
    for (long begin = System.nanoTime(); System.nanoTime() - begin < nanoseconds; ) {
      long start = System.nanoTime();
      for (int i = 0; i < RUNS; i++) {
        kept = run.get();
      }
      best = Math.min(best, (System.nanoTime() - start) / (1e3 * RUNS));
    }
    return kept == null ? Double.NaN : best;
  }
}
