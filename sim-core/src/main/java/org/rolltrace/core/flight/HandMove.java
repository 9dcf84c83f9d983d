package org.rolltrace.core.flight;

import org.rolltrace.core.pilot.Movement;
import org.rolltrace.core.pilot.Stroke;

/** A straight move of a hand that is made while it is flown: the last one is all there is. */
final class HandMove implements Movement {
  private double begin;
  private double from;
  private double to;
  private double rate;

  /** Moves on from where the hand is. */
  void moveOn(double beginTime, double endTime, double position) {
    begin = beginTime;
    from = to;
    to = position;
    rate = (to - from) / (endTime - beginTime);
  }

  /** Where the move ends. */
  double end() {
    return to;
  }

  @Override
  public double positionAt(double time) {
    return from + rate * (time - begin);
  }

  @Override
  public double rateAt(double time) {
    return rate;
  }

  @Override
  public Stroke from(double start) {
    return this;
  }

  @Override
  public double[] breakpoints() {
    return new double[] {begin};
  }

  @Override
  public double largestPosition() {
    return Math.max(Math.abs(from), Math.abs(to));
  }
}
