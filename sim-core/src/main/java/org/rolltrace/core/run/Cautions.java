package org.rolltrace.core.run;

import static org.rolltrace.core.measures.MeasureDefinition.PEDAL_TO_HOLD_SLIP;

import java.util.ArrayList;
import java.util.List;
import java.util.Locale;
import java.util.Optional;
import java.util.OptionalDouble;
import java.util.stream.Collectors;
import org.rolltrace.core.aeroplane.Limits;
import org.rolltrace.core.aeroplane.Propeller;
import org.rolltrace.core.derivatives.Coefficient;
import org.rolltrace.core.flight.FlightEvent;
import org.rolltrace.core.flight.Flown;
import org.rolltrace.core.history.Channel;
import org.rolltrace.core.measures.Measure;
import org.rolltrace.core.motion.LateralModel;
import org.rolltrace.core.motion.SlipTreatment;
import org.rolltrace.core.motion.SteadyState;
import org.rolltrace.core.motion.Trim;
import org.rolltrace.core.pilot.Control;
import org.rolltrace.core.propeller.PropellerMoments;
import org.rolltrace.core.propeller.Propulsion;
import org.rolltrace.core.propeller.TurningPropeller;
import org.rolltrace.core.scenario.Scenario;

/**
 * The limits that a result met: the aeroplane's own, those of the model, and what the data leave
 * open. The thresholds without a source are common practice.
 */
final class Cautions {
  private static final double KNOT = 1852.0 / 3600;
  private static final double FULL_TRAVEL = 1 - 1e-6;

  /** Share of aileron travel for which an aeroplane is built at its design dive speed. */
  private static final double SHARE_AT_DIVE_SPEED = 1.0 / 3;

  private static final double LARGEST_SLIP = Math.toRadians(15);
  private static final double LARGEST_BANK_AT_CONSTANT_SPEED = Math.toRadians(60);
  private static final double LONGEST_AT_CONSTANT_SPEED = 10;
  private static final double LARGEST_MACH = 0.7;

  /** Propellers are kept below this (common practice). */
  private static final double LARGEST_TIP_MACH = 1;

  private static final double LOAD_FACTOR_AWAY = 0.05;

  private final Scenario scenario;
  private final Flown flown;
  private final double stick;
  private final double bank;
  private final double rate;
  private final List<String> sentences = new ArrayList<>();

  private Cautions(Scenario scenario, Flown flown) {
    this.scenario = scenario;
    this.flown = flown;
    this.stick = largest(Channel.STICK);
    this.bank = largest(Channel.BANK);
    this.rate = largest(Channel.ROLL_RATE);
  }

  static List<String> of(
      Scenario scenario,
      LateralModel model,
      Trim trim,
      Flown flown,
      List<Measure> measures,
      StallMeasure stall) {
    Cautions cautions = new Cautions(scenario, flown);
    cautions.addTrim(trim);
    cautions.addOwnLimits();
    cautions.addSigns(model);
    cautions.addLateInputs();
    cautions.addStops();
    cautions.addPower();
    cautions.addModelLimits(model);
    cautions.addDerivatives();
    cautions.addHeldSlip(measures);
    cautions.addStall(stall);
    return cautions.sentences;
  }

  private void addTrim(Trim trim) {
    for (String shortfall : trim.shortfalls()) {
      add(
          "%s trim: %s; the manoeuvre starts at the stop and out of trim",
          trim.state().kind().word(), shortfall);
    }
    double steady =
        Math.cos(scenario.condition().flightPathAngle()) / Math.cos(trim.state().bankOfTurn());
    double given = scenario.condition().loadFactor();
    if (trim.state().kind() == SteadyState.Kind.STEADY_TURN
        && Math.abs(given - steady) > LOAD_FACTOR_AWAY) {
      add(
          "load factor %.2f is given, but a steady turn at %.0f deg of bank has %.2f: the flight"
              + " path curves %s",
          given,
          Math.toDegrees(Math.abs(trim.state().bankOfTurn())),
          steady,
          given > steady ? "up" : "down");
    }
  }

  private void addOwnLimits() {
    Limits limits = scenario.data().aeroplane().limits();
    double speed = scenario.condition().calibratedAirspeed();
    if (exceeds(speed, limits.manoeuvringSpeed()) && stick >= FULL_TRAVEL) {
      add(
          "full stick at %.1f kt CAS, above the manoeuvring speed of %.1f kt",
          speed / KNOT, limits.manoeuvringSpeed().getAsDouble() / KNOT);
    }
    if (exceeds(speed, limits.neverExceedSpeed())) {
      add(
          "%.1f kt CAS is above the never-exceed speed of %.1f kt",
          speed / KNOT, limits.neverExceedSpeed().getAsDouble() / KNOT);
      if (stick > SHARE_AT_DIVE_SPEED) {
        add("more than a third of the stick above the never-exceed speed");
      }
    }
    if (exceeds(scenario.condition().loadFactor(), limits.rollingLoadFactor())) {
      add(
          "load factor %.2f is above the rolling limit of %.2f",
          scenario.condition().loadFactor(), limits.rollingLoadFactor().getAsDouble());
    }
    if (exceeds(rate, limits.rollRate())) {
      add(
          "roll rate of %.1f deg/s is above the aeroplane's limit of %.1f deg/s",
          Math.toDegrees(rate), Math.toDegrees(limits.rollRate().getAsDouble()));
    }
    if (exceeds(bank, limits.bank())) {
      add(
          "bank of %.1f deg is above the aeroplane's limit of %.1f deg",
          Math.toDegrees(bank), Math.toDegrees(limits.bank().getAsDouble()));
    }
  }

  private void addSigns(LateralModel model) {
    boolean stick =
        scenario.programme().inputs().stream().anyMatch(input -> input.control() == Control.STICK);
    if (stick && !(model.rollMoment().perAileron() > 0)) {
      add(
          "right stick does not roll right: Cl_da is %.4g; look at the aileron sign of the set",
          scenario.data().derivatives().value(Coefficient.CL_DA));
    }
    if (!(model.rollMoment().perRollRate() < 0)) {
      add(
          "the roll is not damped: Cl_p is %.4g",
          scenario.data().derivatives().value(Coefficient.CL_P));
    }
  }

  private void addLateInputs() {
    scenario.programme().inputs().stream()
        .filter(input -> input.shape().start() >= scenario.duration())
        .forEach(
            input ->
                add(
                    "the %s input at %.2f s starts after the end of the manoeuvre",
                    input.control().word(), input.shape().start()));
  }

  private void addStops() {
    addStop("stick", Channel.STICK, stick);
    addStop("pedal", Channel.PEDAL, largest(Channel.PEDAL));
    flown.events().stream()
        .filter(FlightEvent.RateLimit.class::isInstance)
        .map(FlightEvent.RateLimit.class::cast)
        .filter(FlightEvent.RateLimit::began)
        .findFirst()
        .ifPresent(
            event ->
                add(
                    "the surface moved by the %s is at its largest rate from %.2f s",
                    event.control().word(), event.time()));
  }

  private void addStop(String control, Channel channel, double largest) {
    if (largest < FULL_TRAVEL) {
      return;
    }
    for (int i = 0; i < flown.history().size(); i++) {
      if (Math.abs(flown.history().value(channel, i)) >= FULL_TRAVEL) {
        add("the %s is on its stop from %.2f s", control, flown.history().time(i));
        return;
      }
    }
  }

  private void addPower() {
    List<Propeller> propellers = scenario.data().aeroplane().propellers();
    if (scenario.propeller() instanceof PropellerMoments given) {
      if (!propellers.isEmpty() && given.equals(PropellerMoments.NONE)) {
        add(
            "the aeroplane has %s, but the condition gives no power: what power does is left out",
            propellers.size() == 1 ? "a propeller" : "propellers");
      }
      return;
    }
    Propulsion propulsion = scenario.propulsion();
    addLeverStops(propulsion);
    if (largest(Channel.POWER) > 0) {
      add(
          "of what power does, swirl at the fin, uneven load of the blades at incidence and"
              + " gyroscopic moments are left out");
      for (Propeller propeller : propellers) {
        if (propeller.position().y() != 0 && propeller.efficiency().isEmpty()) {
          add(
              "the propeller %s is off the centre line and gives no efficiency: the yaw of its"
                  + " thrust is left out",
              propeller.name());
        }
      }
    }
    for (TurningPropeller propeller : propulsion.propellers()) {
      addTips(propeller, propulsion.share());
    }
  }

  private void addLeverStops(Propulsion propulsion) {
    flown.events().stream()
        .filter(FlightEvent.Stop.class::isInstance)
        .map(FlightEvent.Stop.class::cast)
        .filter(stop -> stop.control() == Control.POWER && stop.reached())
        .forEach(
            stop ->
                add(
                    propulsion.share() + scenario.programme().power().positionAt(stop.time()) > 0.5
                        ? "the power input goes beyond the rated power from %.2f s; the lever stops"
                            + " there"
                        : "the power input goes below no power from %.2f s; the lever stops there",
                    stop.time()));
  }

  private void addTips(TurningPropeller propeller, double share) {
    OptionalDouble diameter = propeller.propeller().diameter();
    if (diameter.isEmpty()) {
      return;
    }
    double mach =
        Math.hypot(
                scenario.condition().trueAirspeed(),
                0.5 * diameter.getAsDouble() * propeller.speed(share))
            / scenario.condition().speedOfSound();
    if (mach > LARGEST_TIP_MACH) {
      add(
          "the tips of the propeller %s move at Mach %.2f; is its speed that of the engine, before"
              + " the gear?",
          propeller.propeller().name(), mach);
    }
  }

  private void addModelLimits(LateralModel model) {
    double slip = largest(Channel.SIDESLIP);
    if (slip > LARGEST_SLIP) {
      add(
          "sideslip reaches %.1f deg; beyond 15 deg derivatives no longer hold",
          Math.toDegrees(slip));
    }
    double mach = scenario.condition().mach();
    if (mach > LARGEST_MACH) {
      add("Mach %.3f is above 0.7; the model has no compressibility beyond given values", mach);
    }
    addCoupling(model);
    List<String> why = new ArrayList<>();
    if (bank > LARGEST_BANK_AT_CONSTANT_SPEED) {
      why.add(format("the bank reaches %.0f deg", Math.toDegrees(bank)));
    }
    if (scenario.duration() > LONGEST_AT_CONSTANT_SPEED) {
      why.add(format("the manoeuvre lasts %.0f s", scenario.duration()));
    }
    if (!why.isEmpty()) {
      add(
          "speed and load factor are held constant, although %s",
          why.stream().collect(Collectors.joining(" and ")));
    }
  }

  /**
   * Roll coupling: W.H. Phillips, Effect of Steady Rolling on Longitudinal and Directional
   * Stability, NACA TN 1627, 1948 (from memory): a steady roll rate beyond the lower of the natural
   * frequencies in pitch and yaw may diverge. Only the one in yaw is known here.
   */
  private void addCoupling(LateralModel model) {
    OptionalDouble yawInertia = model.inertia().yaw();
    double stiffness = model.yawMoment().perSideslip();
    if (yawInertia.isEmpty() || !(stiffness > 0)) {
      return;
    }
    double frequency = Math.sqrt(stiffness / yawInertia.getAsDouble());
    if (rate > frequency) {
      add(
          "roll rate of %.0f deg/s is above the natural frequency in yaw, %.0f deg/s: roll coupling,"
              + " which is not modelled, may matter",
          Math.toDegrees(rate), Math.toDegrees(frequency));
    }
  }

  private void addDerivatives() {
    sentences.addAll(
        DerivativeCautions.ofOrigin(scenario.data(), Optional.of(scenario.condition())));
    if (scenario.slip() == SlipTreatment.SETTLED
        && !(scenario.data().derivatives().value(Coefficient.CN_BETA) > 0)) {
      add("Cn_beta is not positive: sideslip does not settle, and settled slip is a guess");
    }
    if (scenario.slip() != SlipTreatment.HELD) {
      List<Coefficient> absent = scenario.data().derivatives().absentAmong(FreeModes.NEEDED);
      if (!absent.isEmpty()) {
        add(
            "absent and taken as 0: %s; sideslip and yaw mean little without them",
            absent.stream().map(Coefficient::symbol).collect(Collectors.joining(", ")));
      }
    }
  }

  private void addStall(StallMeasure stall) {
    if (!Double.isNaN(stall.dampingLost())) {
      add(
          "roll damping is lost at %.2f s: sections beyond their stall, from %.2f s, make the wing go"
              + " on by itself; what follows is a guess",
          stall.dampingLost(), stall.firstStalled());
    } else if (!Double.isNaN(stall.firstStalled())) {
      add(
          "sections of the wing are beyond their stall from %.2f s; their damping is a guess",
          stall.firstStalled());
    }
  }

  private void addHeldSlip(List<Measure> measures) {
    measures.stream()
        .filter(measure -> measure.definition().equals(PEDAL_TO_HOLD_SLIP))
        .filter(measure -> measure.value().isPresent())
        .mapToDouble(measure -> Math.abs(measure.value().getAsDouble()))
        .filter(pedal -> pedal > 1)
        .forEach(pedal -> add("holding the slip needs %.0f %% of the pedal travel", 100 * pedal));
  }

  private static boolean exceeds(double value, OptionalDouble limit) {
    return limit.isPresent() && value > limit.getAsDouble();
  }

  private double largest(Channel channel) {
    return flown.history().largest(channel);
  }

  private void add(String pattern, Object... values) {
    sentences.add(format(pattern, values));
  }

  private static String format(String pattern, Object... values) {
    return String.format(Locale.ROOT, pattern, values);
  }
}
