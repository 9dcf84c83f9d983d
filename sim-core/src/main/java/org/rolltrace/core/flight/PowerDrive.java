package org.rolltrace.core.flight;

import org.rolltrace.core.pilot.Control;
import org.rolltrace.core.pilot.Movement;
import org.rolltrace.core.propeller.AddedMoments;
import org.rolltrace.core.propeller.PropellerMoments;
import org.rolltrace.core.propeller.Propulsion;
import org.rolltrace.core.propeller.TurningPropeller;

/**
 * The power levers and the propellers during a flight. An engine with a lag has the part of its
 * rated power as a state; one without gives what its lever asks for. While nobody moves the levers
 * nothing is worked out: the equations of motion have the steady moments already.
 */
final class PowerDrive {
  private final Propulsion propulsion;
  private final TurningPropeller[] propellers;
  private final Travel lever;
  private final PropellerMoments steady;
  private final AddedMoments added = new AddedMoments();

  /** Of each propeller the index of its state; −1 for one without lag. */
  private final int[] stateIndex;

  private final int states;

  /**
   * A drive.
   *
   * @param nextState the index of the next free state, from which on this drive takes what it needs
   */
  PowerDrive(Propulsion propulsion, Movement movement, int nextState) {
    this.propulsion = propulsion;
    this.propellers = propulsion.propellers().toArray(TurningPropeller[]::new);
    this.lever = new Travel(Control.POWER, movement, propulsion.share(), 0, 1);
    this.steady = propulsion.moments();
    this.stateIndex = new int[propellers.length];
    int next = nextState;
    for (int i = 0; i < propellers.length; i++) {
      stateIndex[i] = lever.isMoved() && lag(i) > 0 ? next++ : -1;
    }
    this.states = next - nextState;
  }

  private double lag(int i) {
    return propellers[i].propeller().engine().lag();
  }

  Travel lever() {
    return lever;
  }

  /** How many states it takes. */
  int states() {
    return states;
  }

  /** Puts the engines at the power of the start. */
  void initialise(double[] state) {
    for (int index : stateIndex) {
      if (index >= 0) {
        state[index] = propulsion.share();
      }
    }
  }

  private double share(int i, double time, double[] state) {
    return stateIndex[i] >= 0 ? state[stateIndex[i]] : lever.position(time);
  }

  private double shareRate(int i, double time, double[] state) {
    return stateIndex[i] >= 0 ? (lever.position(time) - state[stateIndex[i]]) / lag(i) : 0;
  }

  void rate(double time, double[] state, double[] rates) {
    for (int i = 0; i < propellers.length; i++) {
      if (stateIndex[i] >= 0) {
        rates[stateIndex[i]] = shareRate(i, time, state);
      }
    }
  }

  /** The moments beside those of the steady power; the next call changes what it returns. */
  AddedMoments added(double time, double[] state) {
    if (lever.isMoved()) {
      double roll = -steady.roll();
      double yaw = -steady.yaw();
      for (int i = 0; i < propellers.length; i++) {
        double share = share(i, time, state);
        roll += propellers[i].rollMoment(share, shareRate(i, time, state));
        yaw += propellers[i].yawMoment(share);
      }
      added.set(roll, yaw);
    }
    return added;
  }

  /** All of the moment in roll at the last instant that {@link #added} was asked for. */
  double rollMoment() {
    return steady.roll() + added.roll();
  }

  /** The same in yaw. */
  double yawMoment() {
    return steady.yaw() + added.yaw();
  }

  /** The part of the rated power that all propellers together get. */
  double power(double time, double[] state) {
    if (!lever.isMoved()) {
      return propulsion.share();
    }
    double power = 0;
    for (int i = 0; i < propellers.length; i++) {
      power += propellers[i].power(share(i, time, state));
    }
    return power / propulsion.ratedPower();
  }
}
