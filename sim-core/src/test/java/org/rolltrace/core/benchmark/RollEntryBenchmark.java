package org.rolltrace.core.benchmark;

import java.util.List;
import java.util.concurrent.TimeUnit;
import org.ejml.simple.SimpleMatrix;
import org.openjdk.jmh.annotations.Benchmark;
import org.openjdk.jmh.annotations.BenchmarkMode;
import org.openjdk.jmh.annotations.Fork;
import org.openjdk.jmh.annotations.Measurement;
import org.openjdk.jmh.annotations.Mode;
import org.openjdk.jmh.annotations.OutputTimeUnit;
import org.openjdk.jmh.annotations.Scope;
import org.openjdk.jmh.annotations.Setup;
import org.openjdk.jmh.annotations.State;
import org.openjdk.jmh.annotations.Warmup;
import org.rolltrace.core.measures.Measure;
import org.rolltrace.core.motion.LateralModel;
import org.rolltrace.core.motion.LateralMotion;
import org.rolltrace.core.motion.SlipTreatment;
import org.rolltrace.core.pilot.Movement;
import org.rolltrace.core.propeller.PropellerMoments;
import org.rolltrace.core.run.RunResult;
import org.rolltrace.core.run.ScenarioRun;
import org.rolltrace.core.scenario.Scenario;
import org.rolltrace.core.testing.Shipped;

/**
 * One 10 s roll entry of the light single, two breakpoints, 0.15 s of hand movement, 100 samples a
 * second, with trim, modes, all measures and cautions; beside it a hand-written Runge-Kutta of the
 * fourth order at equal accuracy and the exact linear step, both of which give the history alone.
 * {@link BenchmarkRunner} prints the ratios.
 */
@State(Scope.Benchmark)
@BenchmarkMode(Mode.AverageTime)
@OutputTimeUnit(TimeUnit.MICROSECONDS)
@Warmup(iterations = 4, time = 1)
@Measurement(iterations = 5, time = 1)
@Fork(2)
public class RollEntryBenchmark {
  /** With this step the fourth-order method keeps every sample within 5e-3 deg/s, s. */
  private static final double FIXED_STEP = 0.01;

  private static final int SAMPLES = 1001;

  private Scenario free;
  private Scenario held;
  private LateralMotion motion;
  private Movement stick;
  private double fullAileron;
  private double[][] linearStep;
  private double[] linearPush;

  /** Reads the scenario once. */
  @Setup
  public void prepare() {
    free = Shipped.scenario("light-single-roll-entry");
    held = heldLike(free);
    LateralModel model =
        LateralModel.of(
            free.data().aeroplane(),
            free.data().derivatives(),
            free.condition(),
            PropellerMoments.NONE);
    motion = LateralMotion.of(SlipTreatment.FREE, model);
    stick = free.programme().stick();
    fullAileron = free.data().aeroplane().ailerons().orElseThrow().fullAngle();
    prepareLinearStep();
  }

  /** The same scenario with held slip. */
  static Scenario heldLike(Scenario scenario) {
    return new Scenario(
        scenario.title(),
        scenario.data(),
        scenario.condition(),
        scenario.propeller(),
        SlipTreatment.HELD,
        scenario.start(),
        scenario.programme(),
        scenario.duration(),
        scenario.measures());
  }

  private void prepareLinearStep() {
    double[] rates = new double[4];
    motion.rates(0, new double[4], 1, 0, rates);
    SimpleMatrix augmented = new SimpleMatrix(5, 5);
    double[][] a = motion.linearised();
    for (int i = 0; i < 4; i++) {
      for (int j = 0; j < 4; j++) {
        augmented.set(i, j, a[i][j] * FIXED_STEP);
      }
      augmented.set(i, 4, rates[i] * FIXED_STEP);
    }
    SimpleMatrix sum = SimpleMatrix.identity(5);
    SimpleMatrix term = sum;
    for (int k = 1; k < 30; k++) {
      term = term.mult(augmented).divide(k);
      sum = sum.plus(term);
    }
    linearStep = new double[4][4];
    linearPush = new double[4];
    for (int i = 0; i < 4; i++) {
      for (int j = 0; j < 4; j++) {
        linearStep[i][j] = sum.get(i, j);
      }
      linearPush[i] = sum.get(i, 4);
    }
  }

  /** The whole run with free slip. */
  @Benchmark
  public RunResult free() {
    return ScenarioRun.execute(free);
  }

  /** The whole run with held slip. */
  @Benchmark
  public RunResult held() {
    return ScenarioRun.execute(held);
  }

  /** Its measures only, with free slip. */
  @Benchmark
  public List<Measure> freeMeasures() {
    return ScenarioRun.measure(free);
  }

  /** Its measures only, with held slip. */
  @Benchmark
  public List<Measure> heldMeasures() {
    return ScenarioRun.measure(held);
  }

  /** The whole run with held slip, flown free once more to say how far it is from that. */
  @Benchmark
  public RunResult heldAgainstFree() {
    return ScenarioRun.compareWithFreeSlip(ScenarioRun.execute(held));
  }

  /** The history alone, by the classical Runge-Kutta method at a fixed step. */
  @Benchmark
  public double[] rungeKutta() {
    double[] history = new double[4 * SAMPLES];
    double[] x = new double[4];
    double[] y = new double[4];
    double[][] k = new double[4][4];
    double h = FIXED_STEP;
    for (int n = 0; n < SAMPLES; n++) {
      System.arraycopy(x, 0, history, 4 * n, 4);
      double t = n * h;
      motion.rates(t, x, aileron(t), 0, k[0]);
      advance(x, k[0], 0.5 * h, y);
      motion.rates(t + 0.5 * h, y, aileron(t + 0.5 * h), 0, k[1]);
      advance(x, k[1], 0.5 * h, y);
      motion.rates(t + 0.5 * h, y, aileron(t + 0.5 * h), 0, k[2]);
      advance(x, k[2], h, y);
      motion.rates(t + h, y, aileron(t + h), 0, k[3]);
      for (int i = 0; i < 4; i++) {
        x[i] += h / 6 * (k[0][i] + 2 * k[1][i] + 2 * k[2][i] + k[3][i]);
      }
    }
    return history;
  }

  private double aileron(double time) {
    return fullAileron * stick.positionAt(time);
  }

  private static void advance(double[] x, double[] rate, double h, double[] y) {
    for (int i = 0; i < 4; i++) {
      y[i] = x[i] + h * rate[i];
    }
  }

  /** The history alone of the linear equations, by the exact step. */
  @Benchmark
  public double[] exactLinearStep() {
    double[] history = new double[4 * SAMPLES];
    double[] x = new double[4];
    double[] y = new double[4];
    for (int n = 0; n < SAMPLES; n++) {
      System.arraycopy(x, 0, history, 4 * n, 4);
      double push = aileron((n + 0.5) * FIXED_STEP);
      for (int i = 0; i < 4; i++) {
        double[] row = linearStep[i];
        y[i] = row[0] * x[0] + row[1] * x[1] + row[2] * x[2] + row[3] * x[3] + linearPush[i] * push;
      }
      double[] swap = x;
      x = y;
      y = swap;
    }
    return history;
  }
}
