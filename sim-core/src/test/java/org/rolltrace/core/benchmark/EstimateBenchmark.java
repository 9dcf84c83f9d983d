package org.rolltrace.core.benchmark;

import java.util.List;
import java.util.Optional;
import java.util.OptionalDouble;
import java.util.concurrent.TimeUnit;
import org.openjdk.jmh.annotations.Benchmark;
import org.openjdk.jmh.annotations.BenchmarkMode;
import org.openjdk.jmh.annotations.Fork;
import org.openjdk.jmh.annotations.Measurement;
import org.openjdk.jmh.annotations.Mode;
import org.openjdk.jmh.annotations.OutputTimeUnit;
import org.openjdk.jmh.annotations.Scope;
import org.openjdk.jmh.annotations.State;
import org.openjdk.jmh.annotations.Warmup;
import org.rolltrace.core.aeroplane.AileronPlace;
import org.rolltrace.core.aeroplane.Ailerons;
import org.rolltrace.core.aeroplane.Body;
import org.rolltrace.core.aeroplane.Fin;
import org.rolltrace.core.aeroplane.Geometry;
import org.rolltrace.core.aeroplane.Rudder;
import org.rolltrace.core.aeroplane.Section;
import org.rolltrace.core.aeroplane.SurfaceDynamics;
import org.rolltrace.core.aeroplane.Tailplane;
import org.rolltrace.core.aeroplane.Wing;
import org.rolltrace.core.aeroplane.WingPanel;
import org.rolltrace.core.derivatives.GeometryEstimate;
import org.rolltrace.core.derivatives.WingEstimate;

/**
 * A full set of derivatives from the shape of an aeroplane: 120 terms of the lifting line, or 120
 * strips of the lifting surface, factored once for all symmetric and once for all antisymmetric
 * causes.
 */
@State(Scope.Benchmark)
@BenchmarkMode(Mode.AverageTime)
@OutputTimeUnit(TimeUnit.MICROSECONDS)
@Warmup(iterations = 4, time = 2)
@Measurement(iterations = 5, time = 2)
@Fork(1)
public class EstimateBenchmark {
  private final Section section =
      new Section(5.9, -0.035, OptionalDouble.of(0.26), Section.USUAL_FALL, 0.009);
  private final Geometry geometry =
      new Geometry(
          new Wing(
              List.of(
                  new WingPanel(0, 2.4, 1.5, 1.5, 0, 0.09, 0, section),
                  new WingPanel(2.4, 4.8, 1.5, 1.1, 0, 0.09, -0.035, section)),
              0.035,
              -0.4),
          Optional.of(new AileronPlace(2.6, 4.6, 0.22)),
          Optional.of(new Tailplane(2.4, 3.2, 4.2, 0)),
          Optional.of(new Fin(1.3, 1.4, 4.3, 0.8, 0.44, OptionalDouble.of(0.4))),
          Optional.of(new Body(7.3, 1.1, 1.2)));
  private final Optional<Ailerons> ailerons =
      Optional.of(new Ailerons(0.38, 0.3, SurfaceDynamics.DIRECT));
  private final Optional<Rudder> rudder =
      Optional.of(new Rudder(0.44, 0.44, SurfaceDynamics.DIRECT));

  /**
   * By the lifting line.
   *
   * @return the estimates
   */
  @Benchmark
  public GeometryEstimate liftingLine() {
    return GeometryEstimate.of(
        geometry, ailerons, rudder, WingEstimate.Theory.LIFTING_LINE, 0.17, 0.4);
  }

  /**
   * By the lifting surface.
   *
   * @return the estimates
   */
  @Benchmark
  public GeometryEstimate liftingSurface() {
    return GeometryEstimate.of(
        geometry, ailerons, rudder, WingEstimate.Theory.LIFTING_SURFACE, 0.17, 0.4);
  }
}
