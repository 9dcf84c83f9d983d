package org.rolltrace.core.flight;

import java.util.Optional;
import org.rolltrace.core.aeroplane.SurfaceDynamics;
import org.rolltrace.core.controls.ControlRun;
import org.rolltrace.core.controls.SurfaceMode;
import org.rolltrace.core.pilot.Control;
import org.rolltrace.core.pilot.Movement;

/**
 * One control and its surface during a flight. A surface with a rate limit or a lag has its angle
 * as a state; one without is where the control puts it.
 */
final class SurfaceDrive {
  private final Travel travel;
  private final Optional<ControlRun> run;
  private final double trimPosition;
  private final double trimAngle;
  private final int stateIndex;
  private SurfaceMode mode = SurfaceMode.FOLLOWING;

  /**
   * A drive.
   *
   * @param nextState the index of the next free state, which this drive takes if it needs one
   */
  SurfaceDrive(
      Control control,
      Optional<ControlRun> run,
      Movement movement,
      double trimPosition,
      double trimAngle,
      int nextState) {
    this.travel = new Travel(control, movement, trimPosition, -1, 1);
    this.run = run;
    this.trimPosition = trimPosition;
    this.trimAngle = trimAngle;
    this.stateIndex = run.isPresent() && !run.get().dynamics().isDirect() ? nextState : -1;
  }

  Travel travel() {
    return travel;
  }

  Control control() {
    return travel.control();
  }

  boolean hasState() {
    return stateIndex >= 0;
  }

  boolean hasRateLimit() {
    return hasState() && dynamics().rateLimit() != Double.POSITIVE_INFINITY;
  }

  double position(double time) {
    return travel.position(time);
  }

  private double demand(double time) {
    return run.isPresent() ? run.get().angleAt(travel.wanted(time)) : trimAngle;
  }

  private double demandRate(double time) {
    return run.orElseThrow().angleRateAt(travel.wanted(time), travel.wantedRate(time));
  }

  double angle(double time, double[] state) {
    return hasState() ? state[stateIndex] : demand(time);
  }

  /** Puts the surface where the trimmed control holds it. */
  void initialise(double[] state) {
    if (hasState()) {
      state[stateIndex] = run.orElseThrow().angleAt(trimPosition);
    }
  }

  private SurfaceDynamics dynamics() {
    return run.orElseThrow().dynamics();
  }

  boolean isSlewing() {
    return mode == SurfaceMode.SLEWING_UP || mode == SurfaceMode.SLEWING_DOWN;
  }

  void chooseMode(double time, double[] state) {
    if (hasState()) {
      mode = SurfaceMode.of(dynamics(), demand(time), demandRate(time), state[stateIndex]);
    }
  }

  void switchMode(double time, double[] state) {
    mode = mode.next(dynamics(), demand(time), demandRate(time), state[stateIndex]);
  }

  double switching(double time, double[] state) {
    return mode.switching(dynamics(), demand(time), demandRate(time), state[stateIndex]);
  }

  void rate(double time, double[] state, double[] rates) {
    if (hasState()) {
      rates[stateIndex] = mode.rate(dynamics(), demand(time), demandRate(time), state[stateIndex]);
    }
  }
}
