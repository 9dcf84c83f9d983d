package org.rolltrace.core.pilot;

import java.util.Arrays;
import java.util.stream.DoubleStream;

/** Several movements of one control, added. */
final class SummedMovement implements Movement {
  private final Movement[] parts;

  SummedMovement(Movement[] parts) {
    this.parts = parts;
  }

  @Override
  public double positionAt(double time) {
    double sum = 0;
    for (Movement part : parts) {
      sum += part.positionAt(time);
    }
    return sum;
  }

  @Override
  public double rateAt(double time) {
    double sum = 0;
    for (Movement part : parts) {
      sum += part.rateAt(time);
    }
    return sum;
  }

  @Override
  public Stroke from(double start) {
    return this;
  }

  @Override
  public double[] breakpoints() {
    return Arrays.stream(parts)
        .flatMapToDouble(part -> DoubleStream.of(part.breakpoints()))
        .sorted()
        .distinct()
        .toArray();
  }

  @Override
  public double largestPosition() {
    return Arrays.stream(parts).mapToDouble(Movement::largestPosition).sum();
  }
}
