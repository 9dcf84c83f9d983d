package org.rolltrace.core.benchmark;

import java.util.LinkedHashMap;
import java.util.List;
import java.util.Locale;
import java.util.Map;
import org.openjdk.jmh.results.RunResult;
import org.openjdk.jmh.runner.Runner;
import org.openjdk.jmh.runner.RunnerException;
import org.openjdk.jmh.runner.options.OptionsBuilder;

/**
 * Runs {@link RollEntryBenchmark} and says how its figures stand to one another and to the bounds.
 */
public final class BenchmarkRunner {
  /** What a run may cost, µs: the whole of it, and with measures only half of that. */
  private static final Map<String, Double> BOUNDS = bounds();

  private static final List<String> YARDSTICKS = List.of("rungeKutta", "exactLinearStep");

  private BenchmarkRunner() {}

  private static Map<String, Double> bounds() {
    Map<String, Double> bounds = new LinkedHashMap<>();
    bounds.put("free", 350.0);
    bounds.put("held", 150.0);
    bounds.put("freeMeasures", 175.0);
    bounds.put("heldMeasures", 75.0);
    return bounds;
  }

  /** Measures and prints; takes no arguments. */
  public static void main(String[] arguments) throws RunnerException {
    Map<String, Double> times = new LinkedHashMap<>();
    for (RunResult result :
        new Runner(new OptionsBuilder().include(RollEntryBenchmark.class.getName()).build())
            .run()) {
      times.put(result.getPrimaryResult().getLabel(), result.getPrimaryResult().getScore());
    }
    line("%n%-18s%10s%10s", "one run", "µs", "bound");
    for (String yardstick : YARDSTICKS) {
      line("%18s", "× " + yardstick);
    }
    line("%n");
    times.forEach((name, time) -> print(name, time, times));
    System.out.flush();
  }

  private static void print(String name, double time, Map<String, Double> times) {
    line("%-18s%10.1f", name, time);
    Double bound = BOUNDS.get(name);
    line("%10s", bound == null ? "" : String.format(Locale.ROOT, "%.0f", bound));
    for (String yardstick : YARDSTICKS) {
      line("%18.2f", time / times.get(yardstick));
    }
    line("%s%n", bound != null && time > bound ? "  over its bound" : "");
  }

  private static void line(String pattern, Object... values) {
    System.out.printf(Locale.ROOT, pattern, values);
  }
}
