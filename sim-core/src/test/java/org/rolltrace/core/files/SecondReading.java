package org.rolltrace.core.files;

import static org.assertj.core.api.Assertions.assertThat;

import com.fasterxml.jackson.core.StreamReadFeature;
import com.fasterxml.jackson.databind.DeserializationFeature;
import com.fasterxml.jackson.databind.JsonNode;
import com.fasterxml.jackson.databind.json.JsonMapper;
import com.fasterxml.jackson.databind.node.ObjectNode;
import java.io.IOException;
import java.math.BigDecimal;
import java.math.MathContext;
import java.nio.charset.StandardCharsets;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.ArrayList;
import java.util.HashMap;
import java.util.List;
import java.util.Locale;
import java.util.Map;
import java.util.OptionalDouble;
import java.util.function.Function;
import java.util.regex.Matcher;
import java.util.regex.Pattern;
import org.rolltrace.core.aeroplane.Aeroplane;
import org.rolltrace.core.aeroplane.Geometry;
import org.rolltrace.core.aeroplane.Inertia;
import org.rolltrace.core.aeroplane.InertiaBasis;
import org.rolltrace.core.aeroplane.Propeller;
import org.rolltrace.core.aeroplane.Section;
import org.rolltrace.core.aeroplane.SurfaceDynamics;
import org.rolltrace.core.aeroplane.WingPanel;
import org.rolltrace.core.atmosphere.FlightCondition;
import org.rolltrace.core.derivatives.Coefficient;
import org.rolltrace.core.derivatives.LateralDerivatives;
import org.rolltrace.core.derivatives.Origin;
import org.rolltrace.core.pilot.DoubletInput;
import org.rolltrace.core.pilot.HeldSideslip;
import org.rolltrace.core.pilot.HoldInput;
import org.rolltrace.core.pilot.InputShape;
import org.rolltrace.core.pilot.MultistepInput;
import org.rolltrace.core.pilot.PilotInput;
import org.rolltrace.core.pilot.RampInput;
import org.rolltrace.core.pilot.SweepInput;
import org.rolltrace.core.pilot.Trace;
import org.rolltrace.core.pilot.TraceInput;
import org.rolltrace.core.propeller.PowerSetting;
import org.rolltrace.core.propeller.PropellerMoments;
import org.rolltrace.core.propeller.PropellerSetting;
import org.rolltrace.core.scenario.AeroplaneData;
import org.rolltrace.core.scenario.Scenario;

/**
 * Reads accepted files once more, with another JSON reader, decimal arithmetic and units of its
 * own, and compares each value with what the program understood. What is not in the file must be
 * absent or have its default.
 */
final class SecondReading {
  private static final JsonMapper JSON =
      JsonMapper.builder()
          .enable(DeserializationFeature.FAIL_ON_READING_DUP_TREE_KEY)
          .enable(DeserializationFeature.FAIL_ON_TRAILING_TOKENS)
          .enable(DeserializationFeature.USE_BIG_DECIMAL_FOR_FLOATS)
          .enable(DeserializationFeature.USE_BIG_INTEGER_FOR_INTS)
          .enable(StreamReadFeature.STRICT_DUPLICATE_DETECTION)
          .build();

  private static final MathContext DIGITS = new MathContext(40);

  /** π to 40 digits. */
  private static final BigDecimal PI = new BigDecimal("3.141592653589793238462643383279502884197");

  /** Exact definitions: international yard and pound, nautical mile, the SI Brochure. */
  private static final Map<String, BigDecimal> UNITS = units();

  private static Map<String, BigDecimal> units() {
    Map<String, BigDecimal> units = new HashMap<>();
    for (String one : List.of("1", "m", "kg", "s", "K", "degC", "rad", "N", "Hz", "J", "W", "Pa")) {
      units.put(one, BigDecimal.ONE);
    }
    String decimal =
        "cm 0.01, mm 0.001, km 1000, ft 0.3048, in 0.0254, mi 1609.344, NM 1852, g 0.001, t 1000,"
            + " lb 0.45359237, lbf 4.4482216152605, ms 0.001, min 60, h 3600, mrad 0.001,"
            + " kN 1000, kW 1000, hPa 100, kPa 1000, bar 100000, mbar 100";
    for (String unit : decimal.split(", ")) {
      units.put(unit.split(" ")[0], new BigDecimal(unit.split(" ")[1]));
    }
    BigDecimal foot = units.get("ft");
    BigDecimal force = units.get("lbf");
    units.put("oz", units.get("lb").divide(new BigDecimal("16"), DIGITS));
    units.put("slug", force.divide(foot, DIGITS));
    units.put("deg", PI.divide(new BigDecimal("180"), DIGITS));
    units.put("rev", PI.add(PI));
    units.put("rpm", PI.divide(new BigDecimal("30"), DIGITS));
    units.put("kt", units.get("NM").divide(units.get("h"), DIGITS));
    units.put("mph", units.get("mi").divide(units.get("h"), DIGITS));
    units.put("fpm", foot.divide(units.get("min"), DIGITS));
    units.put("psf", force.divide(foot.pow(2), DIGITS));
    units.put("psi", force.divide(units.get("in").pow(2), DIGITS));
    units.put("hp", force.multiply(foot).multiply(new BigDecimal("550")));
    units.put("degF", new BigDecimal("5").divide(new BigDecimal("9"), DIGITS));
    units.put("degR", units.get("degF"));
    return units;
  }

  private static final Pattern QUANTITY =
      Pattern.compile("([+-]?(?:[0-9]+\\.?[0-9]*|\\.[0-9]+)(?:[eE][+-]?[0-9]+)?) +(.+)");
  private static final Pattern FACTOR = Pattern.compile("([A-Za-z]+|1)([0-9]*)");

  /**
   * A double keeps 1.1e-16, and a value goes through a handful of roundings. A stroke more or less
   * in a number of up to twelve digits moves it more than this.
   */
  private static final double ROUNDING = 1e-13;

  /** Airspeeds go through the pitot equation and back. */
  private static final double AIRSPEED = 1e-9;

  private int compared;

  /** How many numbers were compared. */
  int compared() {
    return compared;
  }

  /** The tree of a file that was accepted: it must be JSON for another reader too. */
  static JsonNode tree(byte[] bytes) throws IOException {
    String text = new String(bytes, StandardCharsets.UTF_8);
    return JSON.readTree(text.startsWith("\ufeff") ? text.substring(1) : text);
  }

  /** The SI value of a quantity or a plain number. */
  private static BigDecimal value(JsonNode node) {
    if (node.isNumber()) {
      return node.decimalValue();
    }
    Matcher parts = QUANTITY.matcher(node.textValue());
    assertThat(parts.matches()).as(node.textValue()).isTrue();
    return new BigDecimal(parts.group(1)).multiply(unit(parts.group(2)), DIGITS);
  }

  private static BigDecimal unit(String symbol) {
    BigDecimal factor = BigDecimal.ONE;
    boolean below = false;
    for (String part : symbol.split("(?=/)|[ *]")) {
      below |= part.startsWith("/");
      Matcher single = FACTOR.matcher(part.startsWith("/") ? part.substring(1) : part);
      assertThat(single.matches()).as(symbol).isTrue();
      BigDecimal one = UNITS.get(single.group(1));
      assertThat(one).as("a unit that this reading does not know: " + symbol).isNotNull();
      BigDecimal power = one.pow(single.group(2).isEmpty() ? 1 : Integer.parseInt(single.group(2)));
      factor = below ? factor.divide(power, DIGITS) : factor.multiply(power, DIGITS);
    }
    return factor;
  }

  private void same(String what, double understood, BigDecimal written, double tolerance) {
    compared++;
    double expected = written.doubleValue();
    assertThat(Math.abs(understood - expected))
        .as("%s: understood %s, written %s", what, understood, written)
        .isLessThanOrEqualTo(tolerance * Math.abs(expected));
  }

  private void same(JsonNode object, String key, double understood, double otherwise) {
    if (object.has(key)) {
      same(key, understood, value(object.get(key)), ROUNDING);
    } else {
      assertThat(understood).as(key).isEqualTo(otherwise);
    }
  }

  private void same(JsonNode object, String key, OptionalDouble understood) {
    assertThat(understood.isPresent()).as(key).isEqualTo(object.has(key));
    if (understood.isPresent()) {
      same(key, understood.getAsDouble(), value(object.get(key)), ROUNDING);
    }
  }

  /** Compares an aeroplane and its variants. */
  void aeroplanes(JsonNode file, Map<String, AeroplaneData> all) {
    List<String> names = new ArrayList<>(List.of(""));
    file.path("variants").fieldNames().forEachRemaining(names::add);
    assertThat(all.keySet()).containsExactlyElementsOf(names);
    all.forEach((name, data) -> aeroplane(file, name, data));
  }

  private void aeroplane(JsonNode file, String variant, AeroplaneData data) {
    if (variant.isEmpty()) {
      aeroplane(file, data);
      return;
    }
    ObjectNode changed = merged(file, file.get("variants").get(variant));
    String name = changed.path("name").asText("Unnamed aeroplane");
    aeroplane(changed.put("name", name + " (" + variant + ")"), data);
  }

  /** A scenario with the variant that it picks in place of an aeroplane that stands in it. */
  static JsonNode picked(JsonNode scenario) {
    if (!scenario.has("variant") || !scenario.path("aeroplane").isObject()) {
      return scenario;
    }
    ObjectNode picked = scenario.deepCopy();
    JsonNode aeroplane = scenario.get("aeroplane");
    JsonNode changes = aeroplane.get("variants").get(picked.remove("variant").textValue());
    picked.set("aeroplane", merged(aeroplane, changes));
    return picked;
  }

  /** RFC 7396, section 2. */
  private static ObjectNode merged(JsonNode target, JsonNode patch) {
    ObjectNode result = target.isObject() ? target.deepCopy() : JSON.createObjectNode();
    patch
        .properties()
        .forEach(
            change -> {
              if (change.getValue().isNull()) {
                result.remove(change.getKey());
              } else if (change.getValue().isObject()) {
                result.set(
                    change.getKey(), merged(result.path(change.getKey()), change.getValue()));
              } else {
                result.set(change.getKey(), change.getValue());
              }
            });
    return result;
  }

  private void aeroplane(JsonNode file, AeroplaneData data) {
    Aeroplane aeroplane = data.aeroplane();
    assertThat(aeroplane.name()).isEqualTo(file.path("name").asText("Unnamed aeroplane"));
    shape(file, data);
    if (!file.has("wing")) {
      same(file, "span", aeroplane.span(), Double.NaN);
      same(file, "wingArea", aeroplane.wingArea(), Double.NaN);
    }
    if (file.has("mass")) {
      same(file, "mass", aeroplane.mass());
    }
    double turn =
        file.path("axes").asText().equals("body")
            ? value(file.get("angleOfAttack")).doubleValue()
            : 0;
    assertThat(aeroplane.inertiaBasis())
        .isEqualTo(
            file.has("inertia")
                ? InertiaBasis.GIVEN
                : file.has("masses") ? InertiaBasis.MASSES : InertiaBasis.RADII_OF_GYRATION);
    if (turn == 0 && file.has("masses")) {
      masses(file, aeroplane);
    }
    if (turn == 0 && file.has("inertia")) {
      JsonNode inertia = file.get("inertia");
      same(inertia, "roll", aeroplane.inertia().roll(), Double.NaN);
      same(inertia, "yaw", aeroplane.inertia().yaw());
      same(inertia, "product", aeroplane.inertia().product(), 0);
    }
    assertThat(aeroplane.ailerons().isPresent()).isEqualTo(file.has("ailerons"));
    aeroplane
        .ailerons()
        .ifPresent(
            ailerons -> {
              JsonNode written = file.get("ailerons");
              same(written, "up", ailerons.up(), Double.NaN);
              same(written, "down", ailerons.down(), Double.NaN);
              dynamics(written, ailerons.dynamics());
            });
    assertThat(aeroplane.rudder().isPresent()).isEqualTo(file.has("rudder"));
    aeroplane
        .rudder()
        .ifPresent(
            rudder -> {
              JsonNode written = file.get("rudder");
              same(written, "left", rudder.left(), Double.NaN);
              same(written, "right", rudder.right(), Double.NaN);
              dynamics(written, rudder.dynamics());
            });
    assertThat(aeroplane.propellers()).hasSize(file.path("propellers").size());
    for (int i = 0; i < aeroplane.propellers().size(); i++) {
      propeller(file.get("propellers").get(i), aeroplane.propellers().get(i));
    }
    JsonNode limits = file.path("limits");
    same(limits, "manoeuvringSpeed", aeroplane.limits().manoeuvringSpeed());
    same(limits, "neverExceedSpeed", aeroplane.limits().neverExceedSpeed());
    same(limits, "rollingLoadFactor", aeroplane.limits().rollingLoadFactor());
    same(limits, "rollRate", aeroplane.limits().rollRate());
    same(limits, "bank", aeroplane.limits().bank());
    assertThat(aeroplane.imbalance().isPresent()).isEqualTo(file.has("lateralImbalance"));
    aeroplane
        .imbalance()
        .ifPresent(
            imbalance -> {
              same(file.get("lateralImbalance"), "mass", imbalance.mass(), Double.NaN);
              same(file.get("lateralImbalance"), "arm", imbalance.arm(), Double.NaN);
            });
    if (turn == 0 && file.has("derivatives")) {
      derivatives(file.get("derivatives"), data.derivatives(), aeroplane);
    }
    JsonNode validAt = file.path("derivatives").path("validAt");
    assertThat(data.derivatives().validAt().isPresent()).isEqualTo(!validAt.isMissingNode());
    data.derivatives().validAt().ifPresent(condition -> condition(validAt, condition));
  }

  private void shape(JsonNode file, AeroplaneData data) {
    Aeroplane aeroplane = data.aeroplane();
    assertThat(aeroplane.geometry().isPresent()).isEqualTo(file.has("wing"));
    if (aeroplane.geometry().isEmpty()) {
      return;
    }
    Geometry shape = aeroplane.geometry().get();
    JsonNode wing = file.get("wing");
    same(wing, "incidence", shape.wing().incidence(), 0);
    same(wing, "height", shape.wing().height(), 0);
    assertThat(data.theory().word()).isEqualTo(wing.path("theory").asText("lifting-surface"));
    List<WingPanel> panels = shape.wing().panels();
    assertThat(wing.get("panels")).hasSameSizeAs(panels);
    BigDecimal area = BigDecimal.ZERO;
    for (int i = 0; i < panels.size(); i++) {
      JsonNode written = wing.get("panels").get(i);
      WingPanel panel = panels.get(i);
      same(written, "from", panel.from(), Double.NaN);
      same(written, "to", panel.to(), Double.NaN);
      same(written, "innerChord", panel.innerChord(), Double.NaN);
      same(written, "outerChord", panel.outerChord(), Double.NaN);
      same(written, "sweep", panel.sweep(), 0);
      same(written, "dihedral", panel.dihedral(), 0);
      same(written, "twist", panel.twist(), 0);
      section(written.path("section"), wing.path("section"), panel.section());
      area =
          area.add(
              value(written.get("to"))
                  .subtract(value(written.get("from")))
                  .multiply(
                      value(written.get("innerChord")).add(value(written.get("outerChord")))));
    }
    same("area", aeroplane.wingArea(), area, ROUNDING * 10); // a sum of differences
    BigDecimal tip = value(wing.get("panels").get(panels.size() - 1).get("to"));
    same("span", aeroplane.span(), tip.add(tip), ROUNDING);
    JsonNode ailerons = file.path("ailerons");
    assertThat(shape.ailerons().isPresent()).isEqualTo(ailerons.has("from"));
    shape
        .ailerons()
        .ifPresent(
            place -> {
              same(ailerons, "from", place.from(), Double.NaN);
              same(ailerons, "to", place.to(), Double.NaN);
              same(ailerons, "chordShare", place.chordShare(), Double.NaN);
            });
    assertThat(shape.tailplane().isPresent()).isEqualTo(file.has("tailplane"));
    shape
        .tailplane()
        .ifPresent(
            tail -> {
              same(file.get("tailplane"), "area", tail.area(), Double.NaN);
              same(file.get("tailplane"), "span", tail.span(), Double.NaN);
              same(file.get("tailplane"), "arm", tail.arm(), Double.NaN);
              same(file.get("tailplane"), "height", tail.height(), 0);
            });
    assertThat(shape.fin().isPresent()).isEqualTo(file.has("fin"));
    shape
        .fin()
        .ifPresent(
            fin -> {
              same(file.get("fin"), "area", fin.area(), Double.NaN);
              same(file.get("fin"), "span", fin.span(), Double.NaN);
              same(file.get("fin"), "arm", fin.arm(), Double.NaN);
              same(file.get("fin"), "height", fin.height(), Double.NaN);
              same(file.get("fin"), "sweep", fin.sweep(), 0);
              same(file.get("fin"), "rudderShare", fin.rudderShare());
            });
    assertThat(shape.body().isPresent()).isEqualTo(file.has("body"));
    shape
        .body()
        .ifPresent(
            body -> {
              same(file.get("body"), "length", body.length(), Double.NaN);
              same(file.get("body"), "width", body.width(), Double.NaN);
              same(file.get("body"), "height", body.height(), Double.NaN);
            });
  }

  private void section(JsonNode own, JsonNode ofWing, Section understood) {
    same(own.has("liftSlope") ? own : ofWing, "liftSlope", understood.liftSlope(), 2 * Math.PI);
    same(own.has("zeroLift") ? own : ofWing, "zeroLift", understood.zeroLift(), 0);
    same(own.has("stall") ? own : ofWing, "stall", understood.stall());
    same(own.has("stallFall") ? own : ofWing, "stallFall", understood.stallFall(), 3);
    same(own.has("profileDrag") ? own : ofWing, "profileDrag", understood.profileDrag(), 0.01);
  }

  /** Mass and inertia by the definitions, of both sides one after the other. */
  private void masses(JsonNode file, Aeroplane aeroplane) {
    List<BigDecimal[]> points = new ArrayList<>();
    BigDecimal mass = BigDecimal.ZERO;
    BigDecimal[] moments = {BigDecimal.ZERO, BigDecimal.ZERO, BigDecimal.ZERO};
    for (JsonNode item : file.get("masses")) {
      for (int side = item.path("pair").asBoolean() ? -1 : 1; side <= 1; side += 2) {
        BigDecimal[] point = {
          value(item.get("mass")),
          of(item, "x"),
          of(item, "y").multiply(BigDecimal.valueOf(side)),
          of(item, "z"),
          of(item, "length").pow(2),
          of(item, "width").pow(2),
          of(item, "height").pow(2)
        };
        points.add(point);
        mass = mass.add(point[0]);
        for (int axis = 0; axis < 3; axis++) {
          moments[axis] = moments[axis].add(point[0].multiply(point[1 + axis]));
        }
      }
    }
    if (!file.has("mass")) {
      same("mass", aeroplane.mass().orElseThrow(), mass, ROUNDING);
    }
    if (file.has("inertia")) {
      return;
    }
    BigDecimal roll = BigDecimal.ZERO;
    BigDecimal yaw = BigDecimal.ZERO;
    BigDecimal product = BigDecimal.ZERO;
    BigDecimal twelve = new BigDecimal("12");
    for (BigDecimal[] point : points) {
      BigDecimal[] at = new BigDecimal[3];
      for (int axis = 0; axis < 3; axis++) {
        at[axis] = point[1 + axis].subtract(moments[axis].divide(mass, DIGITS));
      }
      BigDecimal y2 = at[1].pow(2).add(point[5].divide(twelve, DIGITS));
      roll = roll.add(point[0].multiply(y2.add(at[2].pow(2)).add(point[6].divide(twelve, DIGITS))));
      yaw = yaw.add(point[0].multiply(y2.add(at[0].pow(2)).add(point[4].divide(twelve, DIGITS))));
      product = product.add(point[0].multiply(at[0]).multiply(at[2]));
    }
    // positions far from their middle lose figures by their difference
    same("roll inertia", aeroplane.inertia().roll(), roll, AIRSPEED);
    same("yaw inertia", aeroplane.inertia().yaw().orElseThrow(), yaw, AIRSPEED);
    assertThat(Math.abs(aeroplane.inertia().product() - product.doubleValue()))
        .isLessThanOrEqualTo(AIRSPEED * yaw.doubleValue());
    compared++;
  }

  private static BigDecimal of(JsonNode item, String key) {
    return item.has(key) ? value(item.get(key)) : BigDecimal.ZERO;
  }

  private void dynamics(JsonNode surface, SurfaceDynamics dynamics) {
    same(surface, "rateLimit", dynamics.rateLimit(), Double.POSITIVE_INFINITY);
    same(surface, "lag", dynamics.lag(), 0);
  }

  private void derivatives(JsonNode set, LateralDerivatives understood, Aeroplane aeroplane) {
    assertThat(understood.source()).isEqualTo(set.path("source").asText(""));
    for (Coefficient coefficient : Coefficient.values()) {
      String symbol = coefficient.symbol();
      JsonNode printed =
          set.has("values")
              ? set.get("values").path(symbol)
              : dimensional(set.get("dimensional"), symbol);
      Origin origin = understood.origin(coefficient);
      assertThat(origin == Origin.GIVEN || origin == Origin.SET)
          .as(symbol)
          .isEqualTo(!printed.isMissingNode());
      if (printed.isMissingNode()) {
        continue;
      }
      BigDecimal expected = inModel(set, symbol, value(printed));
      if (set.has("dimensional")) {
        if (set.get("primed").booleanValue() && aeroplane.inertia().product() != 0) {
          continue; // both rows of moments mix
        }
        expected = expected.multiply(scale(set, symbol, understood, aeroplane), DIGITS);
        boolean bySpeed = set.get("dimensional").has(symbol.charAt(1) + "_v");
        assertThat(bySpeed).as("derivatives by sideways speed, which no sample has").isFalse();
        same(symbol, understood.value(coefficient), expected, AIRSPEED);
      } else {
        same(symbol, understood.value(coefficient), expected, ROUNDING);
      }
    }
  }

  private static JsonNode dimensional(JsonNode values, String symbol) {
    return values.path(dimensionalName(symbol));
  }

  /** CY_beta is Y_beta, Cl_p is L_p, Cn_r is N_r. */
  private static String dimensionalName(String symbol) {
    return symbol.substring(1, 2).toUpperCase(Locale.ROOT) + symbol.substring(2);
  }

  /** Per radian of the mean right-roll-positive aileron angle, by the meaning of the words. */
  private static BigDecimal inModel(JsonNode set, String symbol, BigDecimal printed) {
    BigDecimal value = printed;
    boolean byRate = symbol.endsWith("_p") || symbol.endsWith("_r");
    if (!byRate && set.path("per").asText().equals("degree")) {
      value = value.multiply(new BigDecimal("180"), DIGITS).divide(PI, DIGITS);
    }
    if (symbol.endsWith("_da")) {
      if (set.path("aileronSign").asText().equals("left-roll-positive")) {
        value = value.negate();
      }
      if (set.path("aileronAngle").asText().equals("total")) {
        value = value.add(value); // a mean angle of one is a total of two
      }
    }
    return value;
  }

  /** What makes a dimensional derivative a coefficient: Y by mass, L and N by their inertia. */
  private static BigDecimal scale(
      JsonNode set, String symbol, LateralDerivatives understood, Aeroplane aeroplane) {
    FlightCondition condition = understood.validAt().orElseThrow();
    Inertia inertia = aeroplane.inertia();
    double q = condition.dynamicPressure() * aeroplane.wingArea();
    double scale =
        switch (symbol.charAt(1)) {
          case 'Y' -> aeroplane.mass().orElseThrow() / q;
          case 'l' -> inertia.roll() / (q * aeroplane.span());
          default -> inertia.yaw().orElseThrow() / (q * aeroplane.span());
        };
    if (symbol.endsWith("_p") || symbol.endsWith("_r")) {
      scale *= 2 * condition.trueAirspeed() / aeroplane.span();
    }
    return new BigDecimal(scale);
  }

  private void condition(JsonNode file, FlightCondition condition) {
    same(file, "pressureAltitude", condition.pressureAltitude(), Double.NaN);
    if (file.has("density")) {
      same(file, "density", condition.density(), Double.NaN);
    } else {
      // made of the temperature and taken from it again: 288 K to the last digits of a double
      double offset =
          file.has("temperatureOffset") ? value(file.get("temperatureOffset")).doubleValue() : 0;
      compared++;
      assertThat(Math.abs(condition.temperatureOffset() - offset)).isLessThanOrEqualTo(1e-12);
    }
    Map<String, Function<FlightCondition, Double>> speeds =
        Map.of(
            "trueAirspeed", FlightCondition::trueAirspeed,
            "equivalentAirspeed", FlightCondition::equivalentAirspeed,
            "calibratedAirspeed", FlightCondition::calibratedAirspeed);
    int given = 0;
    for (Map.Entry<String, Function<FlightCondition, Double>> speed : speeds.entrySet()) {
      if (file.has(speed.getKey())) {
        given++;
        same(
            speed.getKey(),
            speed.getValue().apply(condition),
            value(file.get(speed.getKey())),
            AIRSPEED);
      }
    }
    assertThat(given).isEqualTo(1);
    same(file, "flightPathAngle", condition.flightPathAngle(), 0);
    assertThat(condition.loadFactorGiven()).isEqualTo(file.has("loadFactor"));
    if (file.has("loadFactor")) {
      same(file, "loadFactor", condition.loadFactor(), Double.NaN);
    }
  }

  /** Compares a scenario whose file lies in a folder. */
  void scenario(JsonNode file, Scenario scenario, Path folder) throws IOException {
    assertThat(scenario.title()).isEqualTo(file.get("title").textValue());
    JsonNode aeroplane = file.get("aeroplane");
    if (aeroplane.isTextual()) {
      Path place = folder.resolve(aeroplane.textValue());
      aeroplane = tree(Files.readAllBytes(place));
    }
    aeroplane(aeroplane, file.path("variant").asText(""), scenario.data());
    JsonNode condition = file.get("condition");
    condition(condition, scenario.condition());
    setting(condition, scenario.propeller(), PropellerMoments.NONE);
    assertThat(scenario.slip().word()).isEqualTo(file.get("slip").textValue());
    JsonNode start = file.path("start");
    same(start, "bank", scenario.start().disturbance().bank(), 0);
    same(start, "rollRate", scenario.start().disturbance().rollRate(), 0);
    same(start, "sideslip", scenario.start().disturbance().sideslip(), 0);
    JsonNode trim = start.path("trim");
    assertThat(scenario.start().state().kind().word())
        .isEqualTo(trim.path("state").asText("wings-level"));
    same(trim, "bank", scenario.start().state().bank());
    same(trim, "sideslip", scenario.start().state().sideslip());
    setting(trim, scenario.start().trimmedWith(), scenario.propeller());
    same(file, "duration", scenario.duration(), Double.NaN);
    held(file.path("heldSlip"), scenario.programme().heldSideslip().points());
    List<PilotInput> inputs = scenario.programme().inputs();
    assertThat(inputs).hasSize(file.get("inputs").size());
    for (int i = 0; i < inputs.size(); i++) {
      input(file.get("inputs").get(i), inputs.get(i), folder);
    }
    JsonNode measures = file.path("measures");
    same(measures, "settlingBand", scenario.measures().settlingBand(), 0.05);
    for (JsonNode angle : measures.path("bankAngles")) {
      double degrees = Math.toDegrees(value(angle).doubleValue());
      compared++;
      // kept in degrees, rounded to their ninth decimal
      assertThat(scenario.measures().bankChanges())
          .anySatisfy(kept -> assertThat(Math.abs(kept - degrees)).isLessThanOrEqualTo(1e-9));
    }
  }

  private void setting(JsonNode written, PropellerSetting understood, PropellerSetting otherwise) {
    if (written.has("power")) {
      PowerSetting setting = (PowerSetting) understood;
      same(written, "power", setting.power(), Double.NaN);
      if (written.has("propellerSpeed")) {
        same(written, "propellerSpeed", setting.speed().orElseThrow(), Double.NaN);
      } else {
        assertThat(setting.speed()).isEmpty();
      }
    } else if (written.has("propellerRollMoment")) {
      same(written, "propellerRollMoment", ((PropellerMoments) understood).roll(), Double.NaN);
    } else {
      assertThat(understood).isEqualTo(otherwise);
    }
  }

  private void propeller(JsonNode written, Propeller propeller) {
    assertThat(propeller.name()).isEqualTo(written.get("name").textValue());
    assertThat(propeller.rotation().word()).isEqualTo(written.get("rotation").textValue());
    same(written, "ratedPower", propeller.engine().ratedPower(), Double.NaN);
    same(written, "speed", propeller.speed());
    same(written, "speedWithoutPower", propeller.speedWithoutPower());
    same(written, "gearRatio", propeller.engine().gearRatio(), 1);
    same(written, "engineLag", propeller.engine().lag(), 0);
    same(written.path("rotatingInertia"), "propeller", propeller.inertia(), 0);
    same(written.path("rotatingInertia"), "engine", propeller.engine().inertia(), 0);
    same(written.path("position"), "x", propeller.position().x(), 0);
    same(written.path("position"), "y", propeller.position().y(), 0);
    same(written.path("position"), "z", propeller.position().z(), 0);
    same(written, "straightened", propeller.straightened(), 0);
    same(written, "efficiency", propeller.efficiency());
    same(written, "diameter", propeller.diameter());
    assertThat(propeller.engine().rotation().word())
        .isEqualTo(written.path("engineRotation").asText(written.get("rotation").textValue()));
  }

  private void held(JsonNode written, List<HeldSideslip.Point> points) {
    assertThat(points).hasSize(written.size());
    for (int i = 0; i < points.size(); i++) {
      same(written.get(i), "time", points.get(i).time(), Double.NaN);
      same(written.get(i), "sideslip", points.get(i).sideslip(), Double.NaN);
    }
  }

  private void input(JsonNode written, PilotInput input, Path folder) throws IOException {
    InputShape shape = input.shape();
    assertThat(input.control().word()).isEqualTo(written.get("control").textValue());
    assertThat(shape.name()).isEqualTo(written.get("shape").textValue());
    if (shape instanceof TraceInput trace) {
      same(written, "start", trace.shift(), 0);
      same(written, "size", trace.scale(), 1);
      assertThat(trace.trace().column()).isEqualTo(written.get("column").textValue());
      if (written.has("cutBefore") || written.has("cutAfter")) {
        cut(written, trace.trace()); // what is left has points of its own at the cuts
        return;
      }
      Path csv = folder.resolve(written.get("file").textValue());
      trace(Files.readString(csv), trace.trace());
      return;
    }
    same(written, "start", shape.start(), Double.NaN);
    same(written, "size", shape.size(), Double.NaN);
    if (!(shape instanceof RampInput || shape instanceof SweepInput)) {
      same(written, "movement", shape.handTime(), 0.1);
    }
    if (shape instanceof HoldInput hold) {
      same(written, "duration", hold.duration(), Double.NaN);
    } else if (shape instanceof RampInput ramp) {
      same(written, "duration", ramp.duration(), Double.NaN);
    } else if (shape instanceof DoubletInput doublet) {
      same(written, "width", doublet.width(), Double.NaN);
    } else if (shape instanceof MultistepInput multistep) {
      same(written, "unit", multistep.unit(), Double.NaN);
      List<Integer> pattern = new ArrayList<>();
      written.path("pattern").forEach(stay -> pattern.add(stay.decimalValue().intValueExact()));
      assertThat(multistep.pattern())
          .isEqualTo(written.has("pattern") ? pattern : List.of(3, 2, 1, 1));
    } else if (shape instanceof SweepInput sweep) {
      same(written, "duration", sweep.duration(), Double.NaN);
      same("from", sweep.from(), angular(written.get("from")), ROUNDING);
      same("to", sweep.to(), angular(written.get("to")), ROUNDING);
      assertThat(sweep.law().word()).isEqualTo(written.path("law").asText("linear"));
    }
  }

  private void cut(JsonNode written, Trace trace) {
    compared++;
    if (written.has("cutBefore")) {
      assertThat(trace.begin())
          .isGreaterThanOrEqualTo(value(written.get("cutBefore")).doubleValue() - 1e-9);
    }
    if (written.has("cutAfter")) {
      assertThat(trace.end())
          .isLessThanOrEqualTo(value(written.get("cutAfter")).doubleValue() + 1e-9);
    }
  }

  /** Cycles in a time are turns of 2π; rad/s and deg/s stay. */
  private static BigDecimal angular(JsonNode written) {
    String text = written.textValue();
    boolean byAngle =
        text.contains("rad")
            || text.contains("deg")
            || text.contains("rpm")
            || text.contains("rev");
    return byAngle
        ? value(written)
        : value(written).multiply(PI, DIGITS).multiply(BigDecimal.valueOf(2));
  }

  /** Compares a trace with the text of its file. */
  private void trace(String text, Trace trace) {
    String[] lines = (text.startsWith("\ufeff") ? text.substring(1) : text).split("\r\n|\r|\n");
    int time = -1;
    int moved = -1;
    String[] header = lines[0].split(",", -1);
    for (int i = 0; i < header.length; i++) {
      String name = header[i].strip();
      String bare = name.substring(0, name.indexOf('[')).strip();
      time = bare.equals("time") ? i : time;
      moved = bare.equals(trace.column()) ? i : moved;
    }
    BigDecimal second = unit(inBrackets(header[time]));
    BigDecimal share = new BigDecimal(inBrackets(header[moved]).equals("%") ? "0.01" : "1");
    int row = 0;
    for (int i = 1; i < lines.length; i++) {
      if (lines[i].isBlank()) {
        continue;
      }
      String[] cells = lines[i].split(",", -1);
      assertThat(cells).hasSameSizeAs(header);
      same(
          "time",
          trace.times()[row],
          new BigDecimal(cells[time].strip()).multiply(second, DIGITS),
          ROUNDING);
      same(
          "position",
          trace.positions()[row],
          new BigDecimal(cells[moved].strip()).multiply(share, DIGITS),
          ROUNDING);
      row++;
    }
    assertThat(trace.times()).hasSize(row);
  }

  private static String inBrackets(String title) {
    return title.substring(title.indexOf('[') + 1, title.lastIndexOf(']')).strip();
  }
}
