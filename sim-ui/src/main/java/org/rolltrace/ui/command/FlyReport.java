package org.rolltrace.ui.command;

import java.io.PrintWriter;
import java.util.ArrayList;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import java.util.OptionalDouble;
import java.util.stream.Collectors;
import org.rolltrace.core.aeroplane.Aeroplane;
import org.rolltrace.core.atmosphere.FlightCondition;
import org.rolltrace.core.derivatives.Coefficient;
import org.rolltrace.core.derivatives.LateralDerivatives;
import org.rolltrace.core.derivatives.Origin;
import org.rolltrace.core.measures.Measure;
import org.rolltrace.core.motion.Disturbance;
import org.rolltrace.core.motion.LateralModes;
import org.rolltrace.core.motion.Mode;
import org.rolltrace.core.motion.SteadyState;
import org.rolltrace.core.motion.Trim;
import org.rolltrace.core.pilot.DoubletInput;
import org.rolltrace.core.pilot.HeldSideslip;
import org.rolltrace.core.pilot.HoldInput;
import org.rolltrace.core.pilot.InputShape;
import org.rolltrace.core.pilot.MultistepInput;
import org.rolltrace.core.pilot.PilotInput;
import org.rolltrace.core.pilot.RampInput;
import org.rolltrace.core.pilot.SweepInput;
import org.rolltrace.core.pilot.TraceInput;
import org.rolltrace.core.propeller.PowerSetting;
import org.rolltrace.core.propeller.PropellerMoments;
import org.rolltrace.core.propeller.PropellerSetting;
import org.rolltrace.core.propeller.Propulsion;
import org.rolltrace.core.propeller.TurningPropeller;
import org.rolltrace.core.quantity.Quantity;
import org.rolltrace.core.run.RunResult;
import org.rolltrace.core.run.Safety;
import org.rolltrace.core.scenario.Scenario;

/** A result as text in aligned columns, in the units that engineers read beside SI. */
final class FlyReport extends TextReport {
  private static final int LABEL = 34;
  private static final int VALUE = 12;

  private final RunResult result;

  FlyReport(RunResult result) {
    this.result = result;
  }

  void print(PrintWriter out) {
    Scenario scenario = result.scenario();
    line(scenario.title());
    addAeroplane(scenario);
    addCondition(scenario.condition());
    addManoeuvre(scenario);
    addDerivatives(scenario.data().derivatives());
    addTrim();
    addModes();
    addMeasures();
    line("");
    wrapped("", Safety.NOTICE);
    printTo(out);
  }

  private void addAeroplane(Scenario scenario) {
    Aeroplane aeroplane = scenario.data().aeroplane();
    row("  aeroplane", aeroplane.name());
    row("  size and mass", sizeAndMass(aeroplane));
    aeroplane
        .imbalance()
        .ifPresent(
            one ->
                row(
                    "  on one side",
                    format(
                        "%.4g kg of the mass, %.4g m to the %s",
                        one.mass(), Math.abs(one.arm()), one.arm() < 0 ? "left" : "right")));
    row("  control travel", travel(aeroplane));
    addSource(scenario.data().derivatives());
  }

  private void addCondition(FlightCondition condition) {
    addAir(condition);
    OptionalDouble lift = result.liftCoefficient();
    row(
        "  load factor",
        format("%.3f", condition.loadFactor())
            + (lift.isPresent() ? format(", lift coefficient %.3f", lift.getAsDouble()) : "")
            + (condition.flightPathAngle() == 0
                ? ""
                : format(", flight path %+.2f deg", Math.toDegrees(condition.flightPathAngle()))));
    addPower(result.scenario());
  }

  private void addPower(Scenario scenario) {
    Propulsion propulsion = scenario.propulsion();
    if (scenario.propeller() instanceof PowerSetting setting) {
      row(
          "  power",
          format(
              "%s, %s %% of the rated power",
              power(setting.power()), plain(round(100 * propulsion.share()))));
      for (TurningPropeller propeller : propulsion.propellers()) {
        wrapped(padded("  propeller", 20), describe(propeller, propulsion.share()));
      }
    }
    PropellerMoments moments = propulsion.moments();
    if (moments.roll() != 0 || moments.yaw() != 0) {
      row(
          "  propeller moment",
          moment(moments.roll())
              + " in roll"
              + (moments.yaw() == 0 ? "" : ", " + moment(moments.yaw()) + " in yaw"));
    }
  }

  private static String power(double watts) {
    return format("%.4g kW (%.4g hp)", Quantity.toUnit(watts, "kW"), Quantity.toUnit(watts, "hp"));
  }

  private static double round(double percent) {
    return Math.rint(percent * 10) / 10;
  }

  private static String describe(TurningPropeller propeller, double share) {
    OptionalDouble thrust = propeller.thrust(share);
    return format(
            "%s: %s, %.0f rpm, torque %.1f N m",
            propeller.propeller().name(),
            propeller.propeller().rotation().word(),
            Quantity.toUnit(propeller.speed(share), "rpm"),
            propeller.torque(share))
        + (thrust.isPresent() ? format(", thrust %.0f N", thrust.getAsDouble()) : "");
  }

  private void addManoeuvre(Scenario scenario) {
    row("  slip", scenario.slip().word() + held(scenario.programme().heldSideslip()));
    Disturbance disturbance = scenario.start().disturbance();
    if (!disturbance.isNone()) {
      row(
          "  start",
          format(
              "displaced from trim by bank %s deg, roll rate %s deg/s, sideslip %s deg",
              plain(Math.toDegrees(disturbance.bank())),
              plain(Math.toDegrees(disturbance.rollRate())),
              plain(Math.toDegrees(disturbance.sideslip()))));
    }
    for (PilotInput input : scenario.programme().inputs()) {
      row("  input", describe(input));
    }
    row("  duration", plain(scenario.duration()) + " s");
  }

  /** A sideslip against time, by its first points. */
  private static String held(HeldSideslip held) {
    if (held.isNone()) {
      return "";
    }
    int shown = 4;
    List<HeldSideslip.Point> points = held.points();
    return points.stream()
        .limit(shown)
        .map(
            point ->
                format(
                    "%s deg at %s s", plain(Math.toDegrees(point.sideslip())), plain(point.time())))
        .collect(Collectors.joining(", ", ": sideslip ", points.size() > shown ? ", and on" : ""));
  }

  private static String describe(PilotInput input) {
    InputShape shape = input.shape();
    return format(
        "%s %s, %s %% %s at %s s%s",
        input.control().word(),
        shape.name(),
        plain(100 * Math.abs(shape.size())),
        input.control().way(shape.size()),
        plain(shape.start()),
        course(shape));
  }

  private static String course(InputShape shape) {
    if (shape instanceof RampInput ramp) {
      return ", reached in " + plain(ramp.duration()) + " s";
    }
    if (shape instanceof SweepInput sweep) {
      return format(
          ", %s from %s to %s Hz in %s s",
          sweep.law().word(),
          plain(sweep.from() / (2 * Math.PI)),
          plain(sweep.to() / (2 * Math.PI)),
          plain(sweep.duration()));
    }
    if (shape instanceof TraceInput trace) {
      return format(
          ", %s times %s, from %s s", trace.trace(), plain(trace.scale()), plain(trace.shift()));
    }
    return length(shape) + ", hand takes " + plain(shape.handTime()) + " s";
  }

  private static String length(InputShape shape) {
    if (shape instanceof HoldInput hold) {
      return " for " + plain(hold.duration()) + " s";
    }
    if (shape instanceof DoubletInput doublet) {
      return ", width " + plain(doublet.width()) + " s";
    }
    if (shape instanceof MultistepInput multistep) {
      return ", "
          + multistep.pattern().stream().map(String::valueOf).collect(Collectors.joining("-"))
          + " units of "
          + plain(multistep.unit())
          + " s";
    }
    return "";
  }

  private void addDerivatives(LateralDerivatives derivatives) {
    line("");
    line("Derivatives, per rad and per pb/2V or rb/2V");
    line(format("  %-8s%10s%10s%10s%10s%10s", "", "beta", "p", "r", "da", "dr"));
    StringBuilder row = new StringBuilder();
    for (Coefficient coefficient : Coefficient.values()) {
      if (row.isEmpty()) {
        String axis = coefficient.symbol().substring(0, coefficient.symbol().indexOf('_'));
        row.append(format("  %-8s", axis));
      }
      row.append(
          derivatives.origin(coefficient) == Origin.ABSENT
              ? format("%10s", "absent")
              : format("%10s", derivative(derivatives.value(coefficient))));
      if (coefficient.symbol().endsWith("_dr")) {
        line(row.toString());
        row.setLength(0);
      }
    }
    for (Origin origin : List.of(Origin.ESTIMATED, Origin.SET)) {
      List<Coefficient> some = derivatives.of(origin);
      if (!some.isEmpty()) {
        wrapped(
            "  ",
            origin.word()
                + ": "
                + some.stream().map(Coefficient::symbol).collect(Collectors.joining(", ")));
      }
    }
  }

  private void addTrim() {
    line("");
    Scenario scenario = result.scenario();
    PropellerSetting trimmedWith = scenario.start().trimmedWith();
    Trim trim = result.trim();
    String state = trim.state().kind().word().replace('-', ' ');
    line(
        trimmedWith.equals(scenario.propeller())
            ? "Trim, " + state
            : format(
                "Trim, %s, with %sa propeller moment of %s",
                state,
                trimmedWith instanceof PowerSetting setting ? power(setting.power()) + " and " : "",
                moment(scenario.propulsion().moments(trimmedWith).roll())));
    surface("aileron", trim.aileron(), "stick", trim.stick());
    surface("rudder", trim.rudder(), "pedal", trim.pedal());
    two("sideslip", format("%.2f deg", Math.toDegrees(trim.sideslip())), "");
    if (trim.state().kind() != SteadyState.Kind.WINGS_LEVEL) {
      two("bank", format("%.2f deg", Math.toDegrees(trim.bank())), "");
      two("yaw rate", format("%.2f deg/s", Math.toDegrees(trim.yawRate())), "");
    }
    for (String shortfall : trim.shortfalls()) {
      line("  " + shortfall);
    }
  }

  private void surface(String name, double angle, String control, OptionalDouble position) {
    two(
        name,
        format("%.2f deg", Math.toDegrees(angle)),
        position.isPresent()
            ? format("%s %.1f %%", control, 100 * position.getAsDouble())
            : "no travel given");
  }

  private void addModes() {
    line("");
    line("Modes of the free equations");
    if (result.modes().isEmpty()) {
      wrapped("  not available: ", result.modesRemark());
      return;
    }
    LateralModes modes = result.modes().get();
    modes.roll().ifPresent(mode -> aperiodic("roll", mode));
    modes.spiral().ifPresent(mode -> aperiodic("spiral", mode));
    oscillatory("coupled roll and spiral", modes.rollSpiral());
    oscillatory("dutch roll", modes.dutchRoll());
    modes.aperiodicYaw().forEach(mode -> aperiodic("slip and yaw, no swing", mode));
  }

  private void aperiodic(String name, Mode.Aperiodic mode) {
    two(
        name,
        format("%.4g 1/s", mode.root()),
        mode.root() == 0
            ? "neutral"
            : format(
                "%s, time constant %.4g s",
                format(
                    mode.root() < 0 ? "halves in %.4g s" : "doubles in %.4g s",
                    mode.timeToHalfOrDouble()),
                mode.timeConstant()));
  }

  private void oscillatory(String name, Optional<Mode.Oscillatory> mode) {
    mode.ifPresent(
        m ->
            two(
                name,
                format("%.4g rad/s", m.naturalFrequency()),
                format("damping ratio %.3f, period %.4g s", m.dampingRatio(), m.period())));
  }

  private void addMeasures() {
    line("");
    line("Measures, right positive");
    Map<String, List<String>> missing = new LinkedHashMap<>();
    for (Measure measure : result.measures()) {
      String title = measure.definition().title();
      if (measure.value().isEmpty()) {
        missing.computeIfAbsent(measure.remark(), reason -> new ArrayList<>()).add(title);
        continue;
      }
      double value = measure.value().getAsDouble();
      switch (measure.definition().unit()) {
        case "rad" -> {
          if (measure.definition().name().startsWith("helix")) {
            measured(title, value, "rad", Math.toDegrees(value), "deg");
          } else {
            measured(title, Math.toDegrees(value), "deg", value, "rad");
          }
        }
        case "rad/s" -> measured(title, Math.toDegrees(value), "deg/s", value, "rad/s");
        case "rad/s2" -> measured(title, Math.toDegrees(value), "deg/s2", value, "rad/s2");
        case "1" -> measured(title, 100 * value, "%", value, "");
        default -> line(measureRow(title, value, measure.definition().unit()).stripTrailing());
      }
      if (!measure.remark().isEmpty()) {
        wrapped(" ".repeat(LABEL + 2), measure.remark());
      }
    }
    if (!missing.isEmpty()) {
      line("");
      line("Not to be had from this manoeuvre");
      missing.forEach(
          (reason, titles) -> {
            wrapped("  ", String.join("; ", titles));
            wrapped("    - ", reason);
          });
    }
  }

  private void measured(String title, double shown, String unit, double si, String siUnit) {
    line((measureRow(title, shown, unit) + number(si) + " " + siUnit).stripTrailing());
  }

  private static String measureRow(String title, double value, String unit) {
    return "  " + padded(title, LABEL) + format("%" + VALUE + "s %-8s", number(value), unit);
  }

  /** Of a big single or of a model: hundreds of N m, or fractions of one. */
  private static String moment(double value) {
    return (value > 0 ? "+" : "") + number(value) + " N m";
  }

  private void two(String label, String value, String more) {
    line(("  " + padded(label, LABEL) + padded(value, VALUE + 8) + more).stripTrailing());
  }
}
