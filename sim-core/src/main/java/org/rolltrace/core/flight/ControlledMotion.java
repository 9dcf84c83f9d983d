package org.rolltrace.core.flight;

import java.util.Optional;
import org.rolltrace.core.history.Channel;
import org.rolltrace.core.motion.LateralMotion;
import org.rolltrace.core.motion.StalledRoll;
import org.rolltrace.core.pilot.Control;
import org.rolltrace.core.pilot.Movement;
import org.rolltrace.core.propeller.AddedMoments;

/**
 * The equations of motion with stick, pedals and power: one state for all that has inertia or lag.
 */
final class ControlledMotion {
  private final FlightPlan plan;
  private final LateralMotion motion;
  private final SurfaceDrive stick;
  private final SurfaceDrive pedal;
  private final PowerDrive power;
  private final Optional<StalledRoll> stalled;
  private final AddedMoments withStall = new AddedMoments();
  private final int states;

  ControlledMotion(FlightPlan plan, Movement stickMovement, Movement pedalMovement) {
    this.plan = plan;
    this.motion = plan.motion();
    int next = motion.dimension();
    this.stick =
        new SurfaceDrive(
            Control.STICK,
            plan.stickRun(),
            stickMovement,
            plan.trim().stick().orElse(0),
            plan.trim().aileron(),
            next);
    next += stick.hasState() ? 1 : 0;
    this.pedal =
        new SurfaceDrive(
            Control.PEDAL,
            plan.pedalRun(),
            pedalMovement,
            plan.trim().pedal().orElse(0),
            plan.trim().rudder(),
            next);
    next += pedal.hasState() ? 1 : 0;
    this.power = new PowerDrive(plan.propulsion(), plan.programme().power(), next);
    next += power.states();
    this.stalled = plan.stalled();
    this.states = next;
  }

  SurfaceDrive stick() {
    return stick;
  }

  SurfaceDrive pedal() {
    return pedal;
  }

  PowerDrive power() {
    return power;
  }

  int dimension() {
    return states;
  }

  /** The state at 0 s: in trim, displaced by the disturbance. */
  double[] start() {
    double[] state = new double[states];
    state[LateralMotion.BANK] = plan.trim().bank() + plan.disturbance().bank();
    state[LateralMotion.ROLL_RATE] = plan.trim().rollRate() + plan.disturbance().rollRate();
    if (motion.dimension() > LateralMotion.SIDESLIP) {
      state[LateralMotion.SIDESLIP] = plan.trim().sideslip() + plan.disturbance().sideslip();
      state[LateralMotion.YAW_RATE] = plan.trim().yawRate();
    }
    stick.initialise(state);
    pedal.initialise(state);
    power.initialise(state);
    return state;
  }

  /** All channels of a state; controls are where they are at {@code controlTime}. */
  void row(double controlTime, double[] state, double[] row) {
    double aileron = stick.angle(controlTime, state);
    double rudder = pedal.angle(controlTime, state);
    AddedMoments added = added(controlTime, state, aileron, rudder);
    double sideslip = motion.sideslip(controlTime, state, aileron, rudder, added);
    double yawRate = motion.yawRate(controlTime, state, aileron, rudder, added);
    row[Channel.BANK.column()] = state[LateralMotion.BANK];
    row[Channel.ROLL_RATE.column()] = state[LateralMotion.ROLL_RATE];
    row[Channel.YAW_RATE.column()] = yawRate;
    row[Channel.SIDESLIP.column()] = sideslip;
    row[Channel.STICK.column()] = stick.position(controlTime);
    row[Channel.PEDAL.column()] = pedal.position(controlTime);
    row[Channel.AILERON.column()] = aileron;
    row[Channel.RUDDER.column()] = rudder;
    row[Channel.ROLL_ACCELERATION.column()] =
        motion.rollAcceleration(state, sideslip, yawRate, aileron, rudder, added);
    row[Channel.POWER.column()] = power.power(controlTime, state);
    row[Channel.PROPELLER_ROLL_MOMENT.column()] = power.rollMoment();
    row[Channel.PROPELLER_YAW_MOMENT.column()] = power.yawMoment();
  }

  /** What propellers and stalled sections add; the next call changes what it returns. */
  private AddedMoments added(double time, double[] state, double aileron, double rudder) {
    AddedMoments byPower = power.added(time, state);
    if (stalled.isEmpty()) {
      return byPower;
    }
    double lost =
        stalled
            .get()
            .moment(
                state[LateralMotion.ROLL_RATE],
                motion.yawRate(time, state, aileron, rudder, byPower),
                motion.sideslip(time, state, aileron, rudder, byPower),
                aileron);
    withStall.set(byPower.roll() + lost, byPower.yaw());
    return withStall;
  }

  /** The equations between two breakpoints; controls never pass {@code last}. */
  Equations until(double last) {
    return new Stretch(last);
  }

  private final class Stretch extends Equations {
    private final double last;

    Stretch(double last) {
      super(states);
      this.last = last;
    }

    @Override
    void rates(double time, double[] state, double[] rates) {
      double within = Math.min(time, last);
      double aileron = stick.angle(within, state);
      double rudder = pedal.angle(within, state);
      motion.rates(within, state, aileron, rudder, added(within, state, aileron, rudder), rates);
      stick.rate(within, state, rates);
      pedal.rate(within, state, rates);
      power.rate(within, state, rates);
    }
  }
}
