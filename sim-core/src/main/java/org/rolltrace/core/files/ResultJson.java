package org.rolltrace.core.files;

import com.fasterxml.jackson.core.JsonGenerator;
import java.io.IOException;
import java.io.Writer;
import java.util.List;
import java.util.Optional;
import java.util.OptionalDouble;
import org.rolltrace.core.aeroplane.Aeroplane;
import org.rolltrace.core.aeroplane.Ailerons;
import org.rolltrace.core.aeroplane.Propeller;
import org.rolltrace.core.aeroplane.Rudder;
import org.rolltrace.core.aeroplane.SurfaceDynamics;
import org.rolltrace.core.atmosphere.FlightCondition;
import org.rolltrace.core.flight.FlightEvent;
import org.rolltrace.core.measures.Measure;
import org.rolltrace.core.motion.LateralModes;
import org.rolltrace.core.motion.Mode;
import org.rolltrace.core.motion.Trim;
import org.rolltrace.core.pilot.HeldSideslip;
import org.rolltrace.core.pilot.InputShape;
import org.rolltrace.core.pilot.MultistepInput;
import org.rolltrace.core.pilot.PilotInput;
import org.rolltrace.core.pilot.SweepInput;
import org.rolltrace.core.pilot.TraceInput;
import org.rolltrace.core.propeller.PowerSetting;
import org.rolltrace.core.propeller.Propulsion;
import org.rolltrace.core.propeller.TurningPropeller;
import org.rolltrace.core.run.RunResult;
import org.rolltrace.core.run.Safety;
import org.rolltrace.core.scenario.Scenario;

/**
 * A result as JSON, format {@code rolltrace-result/1}: SI units and radians, positive to the right;
 * no number that is not finite, a {@code reason} instead.
 */
public final class ResultJson {
  /** Below this a root neither grows nor fades within any flight, 1/s. */
  private static final double NEUTRAL = 1e-9;

  private final JsonGenerator json;
  private final ResultParts parts;
  private final RunResult result;

  private ResultJson(JsonGenerator json, RunResult result) {
    this.json = json;
    this.parts = new ResultParts(json);
    this.result = result;
  }

  /**
   * Writes a result.
   *
   * @param result what is written
   * @param producedBy the program and its version
   * @param out receives the text; is flushed, not closed
   * @throws IOException when {@code out} fails
   */
  public static void write(RunResult result, String producedBy, Writer out) throws IOException {
    ResultParts.writeDocument(out, json -> new ResultJson(json, result).writeDocument(producedBy));
  }

  private void writeDocument(String producedBy) throws IOException {
    json.writeStartObject();
    json.writeStringField("format", "rolltrace-result/1");
    json.writeStringField("producedBy", producedBy);
    json.writeStringField("notice", Safety.NOTICE);
    writeScenario(result.scenario());
    writeAeroplane(result.scenario().data().aeroplane());
    writeCondition(result.scenario().condition());
    parts.writeDerivatives(result.scenario().data().derivatives());
    writeTrim(result.trim());
    writeModes();
    writeMeasures();
    writeEvents();
    json.writeArrayFieldStart("requirements");
    json.writeEndArray();
    parts.writeTexts("cautions", result.cautions());
    json.writeEndObject();
  }

  private void number(String name, double value) throws IOException {
    parts.number(name, value);
  }

  private void number(String name, OptionalDouble value) throws IOException {
    parts.number(name, value);
  }

  private void writeScenario(Scenario scenario) throws IOException {
    json.writeObjectFieldStart("scenario");
    json.writeStringField("title", scenario.title());
    json.writeStringField("aeroplane", scenario.data().aeroplane().name());
    json.writeStringField("inertiaBasis", scenario.data().aeroplane().inertiaBasis().words());
    json.writeStringField("derivativesSource", scenario.data().derivatives().source());
    json.writeStringField("derivativesConvention", scenario.data().derivatives().convention());
    json.writeStringField("slip", scenario.slip().word());
    writeHeldSlip(scenario.programme().heldSideslip());
    json.writeObjectFieldStart("start");
    number("bank", scenario.start().disturbance().bank());
    number("rollRate", scenario.start().disturbance().rollRate());
    number("sideslip", scenario.start().disturbance().sideslip());
    Propulsion propulsion = scenario.propulsion();
    if (scenario.start().trimmedWith() instanceof PowerSetting trimmedWith) {
      number("trimmedWithPower", trimmedWith.power());
    }
    number(
        "trimmedWithPropellerRollMoment",
        propulsion.moments(scenario.start().trimmedWith()).roll());
    json.writeEndObject();
    json.writeArrayFieldStart("inputs");
    for (PilotInput input : scenario.programme().inputs()) {
      json.writeStartObject();
      json.writeStringField("control", input.control().word());
      json.writeStringField("shape", input.shape().name());
      number("start", input.shape().start());
      number("size", input.shape().size());
      number("movement", input.shape().handTime());
      if (input.shape().end() < Double.POSITIVE_INFINITY) {
        number("end", input.shape().end());
      }
      writeOwn(input.shape());
      json.writeEndObject();
    }
    json.writeEndArray();
    number("duration", scenario.duration());
    number("relativeTolerance", result.settings().relativeTolerance());
    number("absoluteTolerance", result.settings().absoluteTolerance());
    json.writeEndObject();
  }

  /** What only one shape has and what does not follow from start, movement and end. */
  private void writeOwn(InputShape shape) throws IOException {
    if (shape instanceof MultistepInput multistep) {
      number("unit", multistep.unit());
      json.writeArrayFieldStart("pattern");
      for (int stay : multistep.pattern()) {
        json.writeNumber(stay);
      }
      json.writeEndArray();
    } else if (shape instanceof SweepInput sweep) {
      number("from", sweep.from());
      number("to", sweep.to());
      number("duration", sweep.duration());
      json.writeStringField("law", sweep.law().word());
    } else if (shape instanceof TraceInput trace) {
      json.writeStringField("file", trace.trace().file());
      json.writeStringField("column", trace.trace().column());
      number("scale", trace.scale());
      number("shift", trace.shift());
      number("from", trace.trace().begin());
      number("to", trace.trace().end());
    }
  }

  private void writeHeldSlip(HeldSideslip held) throws IOException {
    if (held.isNone()) {
      return;
    }
    json.writeArrayFieldStart("heldSlip");
    for (HeldSideslip.Point point : held.points()) {
      json.writeStartObject();
      number("time", point.time());
      number("sideslip", point.sideslip());
      json.writeEndObject();
    }
    json.writeEndArray();
  }

  private void writeAeroplane(Aeroplane aeroplane) throws IOException {
    json.writeObjectFieldStart("aeroplane");
    json.writeStringField("name", aeroplane.name());
    number("span", aeroplane.span());
    number("wingArea", aeroplane.wingArea());
    number("mass", aeroplane.mass());
    json.writeObjectFieldStart("inertia");
    number("roll", aeroplane.inertia().roll());
    number("yaw", aeroplane.inertia().yaw());
    number("product", aeroplane.inertia().product());
    json.writeEndObject();
    if (aeroplane.imbalance().isPresent()) {
      json.writeObjectFieldStart("lateralImbalance");
      number("mass", aeroplane.imbalance().get().mass());
      number("arm", aeroplane.imbalance().get().arm());
      json.writeEndObject();
    }
    writePropellers(aeroplane.propellers());
    if (aeroplane.ailerons().isPresent()) {
      Ailerons ailerons = aeroplane.ailerons().get();
      json.writeObjectFieldStart("ailerons");
      number("up", ailerons.up());
      number("down", ailerons.down());
      writeDynamics(ailerons.dynamics());
      json.writeEndObject();
    }
    if (aeroplane.rudder().isPresent()) {
      Rudder rudder = aeroplane.rudder().get();
      json.writeObjectFieldStart("rudder");
      number("left", rudder.left());
      number("right", rudder.right());
      writeDynamics(rudder.dynamics());
      json.writeEndObject();
    }
    json.writeEndObject();
  }

  private void writePropellers(List<Propeller> propellers) throws IOException {
    if (propellers.isEmpty()) {
      return;
    }
    json.writeArrayFieldStart("propellers");
    for (Propeller propeller : propellers) {
      json.writeStartObject();
      json.writeStringField("name", propeller.name());
      json.writeStringField("rotation", propeller.rotation().word());
      number("ratedPower", propeller.engine().ratedPower());
      number("speed", propeller.speed());
      json.writeStringField("pitch", propeller.isFixedPitch() ? "fixed" : "constant-speed");
      number("speedWithoutPower", propeller.speedWithoutPower());
      number("gearRatio", propeller.engine().gearRatio());
      json.writeObjectFieldStart("rotatingInertia");
      number("propeller", propeller.inertia());
      number("engine", propeller.engine().inertia());
      json.writeEndObject();
      json.writeStringField("engineRotation", propeller.engine().rotation().word());
      number("engineLag", propeller.engine().lag());
      json.writeObjectFieldStart("position");
      number("x", propeller.position().x());
      number("y", propeller.position().y());
      number("z", propeller.position().z());
      json.writeEndObject();
      number("diameter", propeller.diameter());
      number("efficiency", propeller.efficiency());
      number("straightened", propeller.straightened());
      json.writeEndObject();
    }
    json.writeEndArray();
  }

  private void writeDynamics(SurfaceDynamics dynamics) throws IOException {
    if (dynamics.rateLimit() < Double.POSITIVE_INFINITY) {
      number("rateLimit", dynamics.rateLimit());
    }
    number("lag", dynamics.lag());
  }

  private void writeCondition(FlightCondition condition) throws IOException {
    json.writeObjectFieldStart("condition");
    parts.writeAir(condition);
    number("liftCoefficient", result.liftCoefficient());
    writePower(result.scenario().propulsion());
    json.writeEndObject();
  }

  private void writePower(Propulsion propulsion) throws IOException {
    double share = propulsion.share();
    if (result.scenario().propeller() instanceof PowerSetting setting) {
      number("power", setting.power());
      number("powerFraction", share);
    }
    number("propellerRollMoment", propulsion.moments().roll());
    number("propellerYawMoment", propulsion.moments().yaw());
    if (propulsion.propellers().isEmpty()) {
      return;
    }
    json.writeArrayFieldStart("propellers");
    for (TurningPropeller propeller : propulsion.propellers()) {
      json.writeStartObject();
      json.writeStringField("name", propeller.propeller().name());
      number("power", propeller.power(share));
      number("speed", propeller.speed(share));
      number("torque", propeller.torque(share));
      number("thrust", propeller.thrust(share));
      number("rollMoment", propeller.rollMoment(share, 0));
      number("yawMoment", propeller.yawMoment(share));
      json.writeEndObject();
    }
    json.writeEndArray();
  }

  private void writeTrim(Trim trim) throws IOException {
    json.writeObjectFieldStart("trim");
    json.writeStringField("state", trim.state().kind().word());
    number("aileron", trim.aileron());
    number("rudder", trim.rudder());
    number("bank", trim.bank());
    number("rollRate", trim.rollRate());
    number("sideslip", trim.sideslip());
    number("yawRate", trim.yawRate());
    number("stick", trim.stick());
    number("pedal", trim.pedal());
    json.writeArrayFieldStart("shortfalls");
    for (String shortfall : trim.shortfalls()) {
      json.writeString(shortfall);
    }
    json.writeEndArray();
    json.writeEndObject();
  }

  private void writeModes() throws IOException {
    json.writeObjectFieldStart("modes");
    if (result.modes().isPresent()) {
      LateralModes modes = result.modes().get();
      writeAperiodic("roll", modes.roll());
      writeAperiodic("spiral", modes.spiral());
      writeOscillatory("rollSpiral", modes.rollSpiral());
      writeOscillatory("dutchRoll", modes.dutchRoll());
      if (modes.dutchRoll().isEmpty()) {
        List<Mode.Aperiodic> roots = modes.aperiodicYaw();
        json.writeObjectFieldStart("dutchRoll");
        json.writeStringField(
            "reason",
            "slip and yaw do not swing: their roots are "
                + roots.get(0).root()
                + " and "
                + roots.get(1).root()
                + " 1/s");
        json.writeEndObject();
      }
    } else {
      json.writeStringField("reason", result.modesRemark());
    }
    json.writeEndObject();
  }

  private void writeAperiodic(String name, Optional<Mode.Aperiodic> mode) throws IOException {
    if (mode.isEmpty()) {
      return;
    }
    double root = mode.get().root();
    json.writeObjectFieldStart(name);
    number("root", root);
    if (Math.abs(root) < NEUTRAL) {
      json.writeStringField("reason", "neutral: it neither fades nor grows");
    } else {
      number("timeConstant", mode.get().timeConstant());
      number(root < 0 ? "timeToHalf" : "timeToDouble", mode.get().timeToHalfOrDouble());
    }
    json.writeEndObject();
  }

  private void writeOscillatory(String name, Optional<Mode.Oscillatory> mode) throws IOException {
    if (mode.isEmpty()) {
      return;
    }
    json.writeObjectFieldStart(name);
    number("real", mode.get().real());
    number("imaginary", mode.get().imaginary());
    number("naturalFrequency", mode.get().naturalFrequency());
    number("dampingRatio", mode.get().dampingRatio());
    number("period", mode.get().period());
    json.writeEndObject();
  }

  private void writeMeasures() throws IOException {
    json.writeObjectFieldStart("measures");
    for (Measure measure : result.measures()) {
      json.writeObjectFieldStart(measure.definition().name());
      if (measure.value().isPresent()) {
        number("value", measure.value().getAsDouble());
        json.writeStringField("unit", measure.definition().unit());
        json.writeStringField("definition", measure.definition().definition());
        if (!measure.remark().isEmpty()) {
          json.writeStringField("remark", measure.remark());
        }
      } else {
        json.writeStringField("reason", measure.remark());
      }
      json.writeEndObject();
    }
    json.writeEndObject();
  }

  private void writeEvents() throws IOException {
    json.writeArrayFieldStart("events");
    for (FlightEvent event : result.events()) {
      json.writeStartObject();
      number("time", event.time());
      if (event instanceof FlightEvent.BankCapture capture) {
        json.writeStringField("kind", "bank change");
        number("bankChange", capture.change());
      } else if (event instanceof FlightEvent.Stop stop) {
        json.writeStringField("kind", stop.reached() ? "stop reached" : "stop left");
        json.writeStringField("control", stop.control().word());
      } else if (event instanceof FlightEvent.RateLimit limit) {
        json.writeStringField("kind", limit.began() ? "rate limit reached" : "rate limit left");
        json.writeStringField("control", limit.control().word());
      }
      json.writeEndObject();
    }
    json.writeEndArray();
  }
}
