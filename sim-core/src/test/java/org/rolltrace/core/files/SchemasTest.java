package org.rolltrace.core.files;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.assertThatIllegalArgumentException;

import com.fasterxml.jackson.core.JsonPointer;
import com.fasterxml.jackson.databind.JsonNode;
import com.fasterxml.jackson.databind.ObjectMapper;
import com.fasterxml.jackson.databind.node.ObjectNode;
import com.networknt.schema.Error;
import com.networknt.schema.InputFormat;
import com.networknt.schema.Schema;
import com.networknt.schema.SchemaLocation;
import com.networknt.schema.SchemaRegistry;
import com.networknt.schema.SpecificationVersion;
import java.io.IOException;
import java.io.UncheckedIOException;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.ArrayList;
import java.util.Collections;
import java.util.IdentityHashMap;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import java.util.Set;
import java.util.stream.Stream;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.io.TempDir;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.Arguments;
import org.junit.jupiter.params.provider.MethodSource;
import org.rolltrace.core.quantity.Dimension;
import org.rolltrace.core.quantity.Quantity;
import org.rolltrace.core.quantity.Unit;

/** Schemas and readers agree; judged by a JSON Schema library that is no part of the program. */
class SchemasTest {
  private static final ObjectMapper JSON = new ObjectMapper();
  private static final SchemaRegistry REGISTRY =
      SchemaRegistry.withDefaultDialect(SpecificationVersion.DRAFT_2020_12);
  private static final Schema SCENARIO = REGISTRY.getSchema(Schemas.text("scenario"));
  private static final Schema AEROPLANE = REGISTRY.getSchema(Schemas.text("aeroplane"));

  @TempDir Path directory;

  /** Where the schemas describe the objects that the reader knows. */
  private static Map<String, Keys> scenarioObjects() {
    Map<String, Keys> objects = new LinkedHashMap<>();
    objects.put("", ScenarioFormat.SCENARIO);
    objects.put("/properties/heldSlip/items", ScenarioFormat.HELD_SLIP_POINT);
    objects.put("/properties/start", ScenarioFormat.START);
    objects.put("/properties/start/properties/trim", ScenarioFormat.TRIM);
    objects.put("/properties/measures", ScenarioFormat.MEASURES);
    objects.put("/$defs/condition", ConditionFormat.CONDITION);
    for (ShapeFormat shape : org.rolltrace.core.files.InputFormat.SHAPES) {
      objects.put("/$defs/" + shape.word(), shape.keys());
    }
    objects.put("/$defs/aeroplane", AeroplaneFormat.INLINE);
    objects.putAll(aeroplaneParts());
    return objects;
  }

  private static Map<String, Keys> aeroplaneParts() {
    Map<String, Keys> objects = new LinkedHashMap<>();
    objects.put("/$defs/aeroplane/properties/inertia", AeroplaneFormat.INERTIA);
    objects.put("/$defs/aeroplane/properties/ailerons", AeroplaneFormat.AILERONS);
    objects.put("/$defs/aeroplane/properties/rudder", AeroplaneFormat.RUDDER);
    objects.put("/$defs/aeroplane/properties/limits", AeroplaneFormat.LIMITS);
    objects.put("/$defs/aeroplane/properties/lateralImbalance", AeroplaneFormat.LATERAL_IMBALANCE);
    objects.put("/$defs/aeroplane/properties/wing", GeometryFormat.WING_KEYS);
    objects.put("/$defs/aeroplane/properties/wing/properties/panels/items", GeometryFormat.PANEL);
    objects.put("/$defs/section", GeometryFormat.SECTION_KEYS);
    objects.put("/$defs/aeroplane/properties/tailplane", GeometryFormat.TAILPLANE_KEYS);
    objects.put("/$defs/aeroplane/properties/fin", GeometryFormat.FIN_KEYS);
    objects.put("/$defs/aeroplane/properties/body", GeometryFormat.BODY_KEYS);
    objects.put("/$defs/aeroplane/properties/masses/items", MassFormat.ITEM);
    String propeller = "/$defs/aeroplane/properties/propellers/items";
    objects.put(propeller, PropellerFormat.PROPELLER);
    objects.put(propeller + "/properties/rotatingInertia", PropellerFormat.ROTATING_INERTIA);
    objects.put(propeller + "/properties/position", PropellerFormat.PLACE);
    objects.put("/$defs/derivatives/properties/dimensional", DerivativesFormat.DIMENSIONAL_VALUES);
    objects.put("/$defs/derivatives", DerivativesFormat.DERIVATIVES);
    objects.put("/$defs/derivatives/properties/values", DerivativesFormat.COEFFICIENTS);
    objects.put("/$defs/validAt", ConditionFormat.VALID_AT);
    return objects;
  }

  private static JsonNode tree(String name) {
    try {
      return JSON.readTree(Schemas.text(name));
    } catch (IOException e) {
      throw new UncheckedIOException(e);
    }
  }

  @Test
  void everyObjectOfTheScenarioSchemaHasTheKeysOfTheReader() {
    JsonNode schema = tree("scenario");
    Map<String, Keys> objects = scenarioObjects();
    objects.forEach((pointer, keys) -> assertSameKeys(schema, pointer, keys));
    assertThat(objectsIn(schema)).hasSize(objects.size());
  }

  @Test
  void everyObjectOfTheAeroplaneSchemaHasTheKeysOfTheReader() {
    JsonNode schema = tree("aeroplane");
    Map<String, Keys> objects = aeroplaneParts();
    objects.forEach((pointer, keys) -> assertSameKeys(schema, pointer, keys));
    assertSameKeys(schema, "/$defs/aeroplane", AeroplaneFormat.INLINE);
    // In a file of its own the aeroplane also has to say what it is.
    assertThat(schema.at("/$ref").asText()).isEqualTo("#/$defs/aeroplane");
    List<String> required = texts(schema.at("/required"));
    required.addAll(texts(schema.at("/$defs/aeroplane/required")));
    assertThat(required).containsExactlyInAnyOrderElementsOf(AeroplaneFormat.IN_FILE.required());
    assertThat(objectsIn(schema)).hasSize(objects.size() + 1);
  }

  private static void assertSameKeys(JsonNode schema, String pointer, Keys keys) {
    JsonNode object = schema.at(JsonPointer.compile(pointer));
    List<String> properties = new ArrayList<>();
    object.path("properties").fieldNames().forEachRemaining(properties::add);
    assertThat(properties).as(pointer).containsExactlyInAnyOrderElementsOf(keys.all());
    assertThat(texts(object.path("required")))
        .as(pointer)
        .containsExactlyInAnyOrderElementsOf(keys.required());
    assertThat(object.path("additionalProperties").isBoolean()).as(pointer).isTrue();
    assertThat(object.path("additionalProperties").asBoolean()).as(pointer).isFalse();
  }

  private static List<String> texts(JsonNode array) {
    List<String> texts = new ArrayList<>();
    array.forEach(element -> texts.add(element.asText()));
    return texts;
  }

  /** The descriptions of objects, which have properties. */
  private static Set<JsonNode> objectsIn(JsonNode schema) {
    Set<JsonNode> objects = Collections.newSetFromMap(new IdentityHashMap<>());
    if (schema.path("properties").isObject() && schema.path("type").asText().equals("object")) {
      objects.add(schema);
    }
    schema.forEach(child -> objects.addAll(objectsIn(child)));
    return objects;
  }

  @Test
  void bothSchemasDescribeAnAeroplaneAlike() {
    JsonNode scenario = tree("scenario").path("$defs");
    JsonNode aeroplane = tree("aeroplane").path("$defs");
    aeroplane
        .fieldNames()
        .forEachRemaining(
            name -> assertThat(scenario.path(name)).as(name).isEqualTo(aeroplane.path(name)));
    assertThat(aeroplane.size()).isGreaterThan(10);
  }

  @Test
  void everyKeyIsDescribed() {
    for (String name : Schemas.names()) {
      for (JsonNode object : objectsIn(tree(name))) {
        object
            .path("properties")
            .properties()
            .forEach(
                property ->
                    assertThat(
                            property.getValue().has("description")
                                || property.getValue().has("$ref"))
                        .as(property.getKey())
                        .isTrue());
      }
    }
  }

  @Test
  void schemasFollowTheirOwnSchema() throws IOException {
    Schema metaSchema =
        REGISTRY.getSchema(SchemaLocation.of("https://json-schema.org/draft/2020-12/schema"));
    for (String name : Schemas.names()) {
      assertThat(metaSchema.validate(Schemas.text(name), InputFormat.JSON)).isEmpty();
    }
    assertThat(metaSchema.validate("{ \"type\": \"thing\" }", InputFormat.JSON)).isNotEmpty();
  }

  @Test
  void samplesAreAccepted() {
    assertAccepted(SCENARIO, Samples.SCENARIO);
    assertAccepted(SCENARIO, Samples.SCENARIO_WITH_EVERY_KEY);
    assertAccepted(SCENARIO, Samples.SCENARIO_WITH_POWER);
    assertAccepted(AEROPLANE, Samples.AEROPLANE);
    assertAccepted(AEROPLANE, Samples.AEROPLANE_WITH_EVERY_KEY);
    assertAccepted(AEROPLANE, Samples.AEROPLANE_WITH_EVERY_DIMENSIONAL_KEY);
    assertAccepted(AEROPLANE, Samples.AEROPLANE_WITH_SHAPE);
    assertAccepted(SCENARIO, Samples.SCENARIO_OF_A_VARIANT);
  }

  private static void assertAccepted(Schema schema, String text) {
    List<Error> errors = schema.validate(text, InputFormat.JSON);
    assertThat(errors).isEmpty();
  }

  @Test
  void theSamplesHaveEveryKeyBetweenThem() throws IOException {
    JsonNode scenario = JSON.readTree(Samples.SCENARIO_WITH_EVERY_KEY);
    JsonNode aeroplane = JSON.readTree(Samples.AEROPLANE_WITH_EVERY_KEY);
    assertThat(both(keysOf(scenario), keysOf(JSON.readTree(Samples.SCENARIO_OF_A_VARIANT))))
        .containsExactlyInAnyOrderElementsOf(ScenarioFormat.SCENARIO.all());
    assertThat(keysOf(scenario.path("start")))
        .containsExactlyInAnyOrderElementsOf(ScenarioFormat.START.all());
    assertThat(keysOf(scenario.path("measures")))
        .containsExactlyInAnyOrderElementsOf(ScenarioFormat.MEASURES.all());
    assertThat(scenario.path("inputs")).hasSize(org.rolltrace.core.files.InputFormat.SHAPES.size());
    JsonNode dimensional = JSON.readTree(Samples.AEROPLANE_WITH_EVERY_DIMENSIONAL_KEY);
    assertThat(both(keysOf(aeroplane), keysOf(dimensional)))
        .containsExactlyInAnyOrderElementsOf(AeroplaneFormat.IN_FILE.all());
    assertThat(both(keysOf(aeroplane.path("derivatives")), keysOf(dimensional.path("derivatives"))))
        .containsExactlyInAnyOrderElementsOf(DerivativesFormat.DERIVATIVES.all());
    assertThat(keysOf(aeroplane.at("/propellers/0")))
        .containsExactlyInAnyOrderElementsOf(PropellerFormat.PROPELLER.all());
    JsonNode power = JSON.readTree(Samples.SCENARIO_WITH_POWER);
    Set<String> condition =
        both(keysOf(scenario.path("condition")), keysOf(power.path("condition")));
    condition.addAll(List.of("density", "equivalentAirspeed", "calibratedAirspeed")); // instead
    assertThat(condition).containsExactlyInAnyOrderElementsOf(ConditionFormat.CONDITION.all());
    List<String> values = keysOf(dimensional.at("/derivatives/dimensional"));
    values.addAll(List.of("Y_v", "L_v", "N_v")); // these stand instead of those by beta
    assertThat(values)
        .containsExactlyInAnyOrderElementsOf(DerivativesFormat.DIMENSIONAL_VALUES.all());
    assertThat(keysOf(aeroplane.at("/derivatives/values")))
        .containsExactlyInAnyOrderElementsOf(DerivativesFormat.COEFFICIENTS.all());
  }

  @Test
  void theSampleWithAShapeHasEveryKeyOfShapes() throws IOException {
    JsonNode shape = JSON.readTree(Samples.AEROPLANE_WITH_SHAPE);
    Map<String, Keys> objects =
        Map.of(
            "/wing", GeometryFormat.WING_KEYS,
            "/wing/panels/1", GeometryFormat.PANEL,
            "/wing/panels/1/section", GeometryFormat.SECTION_KEYS,
            "/tailplane", GeometryFormat.TAILPLANE_KEYS,
            "/fin", GeometryFormat.FIN_KEYS,
            "/body", GeometryFormat.BODY_KEYS);
    objects.forEach(
        (pointer, keys) ->
            assertThat(keysOf(shape.at(pointer)))
                .as(pointer)
                .containsExactlyInAnyOrderElementsOf(keys.all()));
    assertThat(both(keysOf(shape.at("/masses/0")), keysOf(shape.at("/masses/1"))))
        .containsExactlyInAnyOrderElementsOf(MassFormat.ITEM.all());
    JsonNode everyKey = JSON.readTree(Samples.AEROPLANE_WITH_EVERY_KEY);
    assertThat(keysOf(everyKey.path("ailerons")))
        .containsExactlyInAnyOrderElementsOf(AeroplaneFormat.AILERONS.all());
  }

  static Stream<Arguments> faultsOfShapes() {
    return Stream.of(
        Arguments.of(
            "\"innerChord\": \"1.8 m\", \"outerChord\": \"1.8 m\"", "\"innerChord\": \"1.8 m\""),
        Arguments.of("\"to\": \"2 m\"", "\"to\": 2"),
        Arguments.of("\"twist\": \"-2 deg\"", "\"twist\": -2"),
        Arguments.of("\"liftSlope\": 6", "\"liftSlope\": 8.1"),
        Arguments.of("\"liftSlope\": 6", "\"liftSlope\": 0"),
        Arguments.of("\"profileDrag\": 0.009", "\"profileDrag\": -0.009"),
        Arguments.of("\"stallFall\": 1.2", "\"stallFall\": -1"),
        Arguments.of("\"stallFall\": 1.2", "\"fall\": 1"),
        Arguments.of("\"lifting-line\"", "\"strips\""),
        Arguments.of("\"chordShare\": 0.25", "\"chordShare\": 1"),
        Arguments.of(", \"chordShare\": 0.25", ""),
        Arguments.of("\"from\": \"3 m\", ", ""),
        Arguments.of("\"rudderShare\": 0.4", "\"rudderShare\": 0"),
        Arguments.of("\"wing\": {\n    \"panels\"", "\"wings\": {\n    \"panels\""),
        Arguments.of("\"arm\": \"4.5 m\", ", ""),
        Arguments.of("\"arm\": \"4.4 m\", ", ""),
        Arguments.of("\"width\": \"1.1 m\", ", ""),
        Arguments.of("\"name\": \"front\", ", ""),
        Arguments.of("\"name\": \"front\"", "\"name\": \" \""),
        Arguments.of("\"mass\": \"150 kg\", ", ""),
        Arguments.of("\"pair\": true", "\"pair\": \"yes\""),
        Arguments.of("\"clipped\": { \"wing\"", "\" \": { \"wing\""),
        Arguments.of("\"clipped\": { \"wing\"", "\"" + "x".repeat(201) + "\": { \"wing\""),
        Arguments.of("\"clipped\": { \"wing\"", "\"clipped\": {}, \"more\": { \"wing\""),
        Arguments.of("\"clipped\": { \"wing\"", "\"clipped\": 3, \"more\": { \"wing\""),
        Arguments.of("\"clipped\": { \"wing\"", "\"clipped\": { \"variants\": null, \"wing\""));
  }

  @ParameterizedTest
  @MethodSource("faultsOfShapes")
  void whatIsStructurallyWrongWithAShapeIsRefusedByBoth(String part, String replacement) {
    String text = Samples.with(Samples.AEROPLANE_WITH_SHAPE, part, replacement);
    assertThat(AEROPLANE.validate(text, InputFormat.JSON)).isNotEmpty();
    Path file = Samples.write(directory, "a.json", text);
    assertThat(Samples.refusalOfAeroplane(file).faults()).isNotEmpty();
  }

  /** What may be left out when something else says the same. */
  @Test
  void eitherAShapeOrWhatFollowsFromItMustBeThere() throws IOException {
    for (String text : List.of(Samples.AEROPLANE_WITH_SHAPE, Samples.AEROPLANE_WITH_EVERY_KEY)) {
      for (int without = 0; without < 1 << 8; without++) {
        ObjectNode file = (ObjectNode) JSON.readTree(text);
        String[] keys = {
          "wing", "span", "wingArea", "derivatives", "inertia", "masses", "mass", "body"
        };
        for (int i = 0; i < keys.length; i++) {
          if ((without >> i & 1) == 1) {
            file.remove(keys[i]);
          }
        }
        file.remove("variants");
        if (!file.has("wing")) {
          file.remove(List.of("tailplane", "fin"));
          ((ObjectNode) file.path("ailerons")).remove(List.of("from", "to", "chordShare"));
        }
        boolean bySchema = AEROPLANE.validate(file.toString(), InputFormat.JSON).isEmpty();
        boolean byReader = true;
        try {
          AeroplaneFile.read(Samples.write(directory, "a.json", file.toString()));
        } catch (FileFaultsException e) {
          byReader = false;
        }
        assertThat(byReader).as(file.toString()).isEqualTo(bySchema);
      }
    }
  }

  private static Set<String> both(List<String> one, List<String> other) {
    Set<String> all = new java.util.TreeSet<>(one);
    all.addAll(other);
    return all;
  }

  private static List<String> keysOf(JsonNode object) {
    List<String> keys = new ArrayList<>();
    object.fieldNames().forEachRemaining(keys::add);
    return keys;
  }

  static Stream<Arguments> structuralFaults() {
    return Stream.of(
        Arguments.of("\"title\": \"Every key\",", ""),
        Arguments.of("\"Every key\"", "\" \""),
        Arguments.of("\"Every key\"", "\"" + "x".repeat(201) + "\""),
        Arguments.of("\"Every key\"", "7"),
        Arguments.of("\"title\": \"Every key\"", "\"titel\": \"Every key\""),
        Arguments.of("rolltrace-scenario/1", "rolltrace-scenario/2"),
        Arguments.of("rolltrace-aeroplane/1", "rolltrace-aeroplane/2"),
        Arguments.of("\"slip\": \"free\"", "\"slip\": \"none\""),
        Arguments.of("\"slip\": \"free\"", "\"slip\": null"),
        Arguments.of("\"0.5 min\"", "30"),
        Arguments.of("\"0.5 min\"", "\"30\""),
        Arguments.of("\"0.5 min\"", "\"30s\""),
        Arguments.of("\"0.5 min\"", "\"30,5 s\""),
        Arguments.of("\"0.5 min\"", "\" 30 s\""),
        Arguments.of("\"0.5 min\"", "\"thirty s\""),
        Arguments.of("\"span\": \"10 m\"", "\"span\": 10"),
        Arguments.of("\"span\": \"10 m\",", ""),
        Arguments.of("\"span\": \"10 m\"", "\"span\": \"10 m\", \"chord\": \"1 m\""),
        Arguments.of("\"roll\": \"1000 kg m2\", ", ""),
        Arguments.of("\"up\": \"20 deg\", ", ""),
        Arguments.of("\"left\": \"25 deg\", ", ""),
        Arguments.of("\"source\": \"made up\", ", "\"source\": 3, "),
        Arguments.of("\"Cl_p\": -0.5", "\"Cl_p\": \"-0.5\""),
        Arguments.of("\"Cl_p\": -0.5", "\"CL_p\": -0.5"),
        Arguments.of("\"source\": \"made up\"", "\"source\": \"made up\", \"per\": \"grad\""),
        Arguments.of("\"source\": \"made up\"", "\"source\": \"x\", \"aileronSign\": \"left\""),
        Arguments.of("\"name\": \"Inline\"", "\"name\": \"Inline\", \"axes\": \"body\""),
        Arguments.of("\"pressureAltitude\": \"1000 m\",", ""),
        Arguments.of("\"trueAirspeed\": \"216 km/h\",", ""),
        Arguments.of("\"216 km/h\"", "\"216 km/h\", \"equivalentAirspeed\": \"50 m/s\""),
        Arguments.of("\"9 degF\"", "\"9 degF\", \"density\": \"1.1 kg/m3\""),
        Arguments.of("\"loadFactor\": 1.5", "\"loadFactor\": \"1.5\""),
        Arguments.of("\"wings-level\"", "\"steady-turn\""),
        Arguments.of("\"wings-level\"", "\"wings-level\", \"bank\": \"1 deg\""),
        Arguments.of("\"wings-level\"", "\"straight-sideslip\""),
        Arguments.of(
            "\"wings-level\"",
            "\"straight-sideslip\", \"bank\": \"1 deg\", \"sideslip\": \"1 deg\""),
        Arguments.of(
            "\"wings-level\"", "\"steady-turn\", \"bank\": \"1 deg\", \"sideslip\": \"1 deg\""),
        Arguments.of("\"name\": \"Inline\"", "\"name\": \"Inline\", \"angleOfAttack\": \"1 deg\""),
        Arguments.of("\"source\": \"made up\"", "\"source\": \"made up\", \"primed\": true"),
        Arguments.of("\"source\": \"made up\"", "\"source\": \"made up\", \"dimensional\": {}"),
        Arguments.of("\"values\": {", "\"dimensional\": {"),
        Arguments.of(
            "\"mass\": \"1000 kg\"",
            "\"mass\": \"1000 kg\", \"lateralImbalance\": { \"mass\": \"1 kg\" }"),
        Arguments.of("\"stick\", \"shape\": \"step\"", "\"yoke\", \"shape\": \"step\""),
        Arguments.of("\"shape\": \"step\"", "\"shape\": \"ramp\""),
        Arguments.of("\"shape\": \"step\"", "\"shape\": \"slope\""),
        Arguments.of("[2, 1, 1]", "[2, 1.5, 1]"),
        Arguments.of("[2, 1, 1]", "[2, 0]"),
        Arguments.of("[2, 1, 1]", "[1001]"),
        Arguments.of("[2, 1, 1]", "[]"),
        Arguments.of("[2, 1, 1]", "\"2-1-1\""),
        Arguments.of("\"unit\": \"0.4 s\", ", ""),
        Arguments.of("\"size\": 0.3, ", "\"size\": 0.3, \"movement\": \"0.1 s\", "),
        Arguments.of(", \"duration\": \"3 s\"", ""),
        Arguments.of("\"0.5 Hz\"", "0.5"),
        Arguments.of("\"from\": \"0.5 Hz\", ", ""),
        Arguments.of("\"to\": \"6 rad/s\", ", ""),
        Arguments.of("\"logarithmic\"", "\"log\""),
        Arguments.of("\"file\": \"traces/hand.csv\", ", ""),
        Arguments.of("\"traces/hand.csv\"", "\" \""),
        Arguments.of(", \"column\": \"stick\"", ""),
        Arguments.of("\"heldSlip\": []", "\"heldSlip\": {}"),
        Arguments.of("\"heldSlip\": []", "\"heldSlip\": [{ \"time\": \"1 s\" }]"),
        Arguments.of("\"heldSlip\": []", "\"heldSlip\": [{ \"sideslip\": \"1 deg\" }]"),
        Arguments.of("\"shape\": \"step\"", "\"shape\": \"step\", \"width\": \"1 s\""),
        Arguments.of("\"shape\": \"step\"", "\"shape\": \"step\", \"duration\": \"1 s\""),
        Arguments.of(", \"duration\": \"2 s\"", ""),
        Arguments.of(", \"width\": \"0.5 s\"", ""),
        Arguments.of("\"size\": -1 ", "\"size\": -1.01 "),
        Arguments.of("\"size\": -1 ", "\"size\": \"-1\" "),
        Arguments.of("0.02", "0.51"),
        Arguments.of("0.02", "0.0009"),
        Arguments.of("\"50 deg\"", "50"),
        Arguments.of("[\"50 deg\", \"45 deg\", \"360 deg\"]", "\"50 deg\""),
        Arguments.of("\"note\": \"a note", "\"remark\": \"a note"),
        Arguments.of("\"a note\\non two lines\"", "[]"));
  }

  @ParameterizedTest
  @MethodSource("structuralFaults")
  void whatIsStructurallyWrongIsRefusedBySchemaAndReader(String part, String replacement) {
    String text = Samples.with(Samples.SCENARIO_WITH_EVERY_KEY, part, replacement);
    assertThat(SCENARIO.validate(text, InputFormat.JSON)).isNotEmpty();
    Path file = Samples.writeScenario(directory, text);
    assertThat(Samples.refusalOfScenario(file).faults()).isNotEmpty();
  }

  static Stream<Arguments> faultsOfPropellers() {
    return Stream.of(
        Arguments.of("\"name\": \"two\", ", ""),
        Arguments.of("\"ratedPower\": \"50 kW\"", "\"ratedPower\": 50"),
        Arguments.of("\"ratedPower\": \"50 kW\", ", ""),
        Arguments.of("{ \"y\": \"1 m\" }", "{ \"y\": 1 }"),
        Arguments.of("{ \"y\": \"1 m\" }", "{ \"y\": \"1 m\", \"w\": \"1 m\" }"),
        Arguments.of("{ \"y\": \"1 m\" }", "{ \"y\": \"1 m\" }, \"straightened\": 1.1"),
        Arguments.of("{ \"y\": \"1 m\" }", "{ \"y\": \"1 m\" }, \"straightened\": -0.1"),
        Arguments.of("{ \"y\": \"1 m\" }", "{ \"y\": \"1 m\" }, \"speedWithoutPower\": 0.5"),
        Arguments.of("{ \"y\": \"1 m\" }", "{ \"y\": \"1 m\" }, \"pitch\": \"fixed\""),
        Arguments.of(
            "{ \"y\": \"1 m\" }",
            "{ \"y\": \"1 m\" }, \"pitch\": \"fixed\", \"speedWithoutPower\": 0.5"),
        Arguments.of("{ \"y\": \"1 m\" }", "{ \"y\": \"1 m\" }, \"engineRotation\": \"both\""),
        Arguments.of("{ \"y\": \"1 m\" }", "{ \"y\": \"1 m\" }, \"gearRatio\": 0"),
        Arguments.of(
            "\"power\": \"90 kW\"", "\"power\": \"90 kW\", \"propellerRollMoment\": \"1 N m\""),
        Arguments.of("\"power\": \"90 kW\", ", ""),
        Arguments.of(
            "\"power\": \"30 kW\"", "\"power\": \"30 kW\", \"propellerRollMoment\": \"1 N m\""),
        Arguments.of("\"power\": \"30 kW\"", "\"power\": \"30 kN\", \"speed\": \"1 rpm\""),
        Arguments.of("\"control\": \"power\"", "\"control\": \"throttle\""));
  }

  @ParameterizedTest
  @MethodSource("faultsOfPropellers")
  void whatIsStructurallyWrongWithPropellersIsRefusedByBoth(String part, String replacement) {
    String text = Samples.with(Samples.SCENARIO_WITH_POWER, part, replacement);
    assertThat(SCENARIO.validate(text, InputFormat.JSON)).isNotEmpty();
    Path file = Samples.writeScenario(directory, text);
    assertThat(Samples.refusalOfScenario(file).faults()).isNotEmpty();
  }

  @Test
  void anAeroplaneFileWithoutFormatIsRefusedBySchemaAndReader() {
    String text = Samples.with(Samples.AEROPLANE, "\"format\": \"rolltrace-aeroplane/1\",", "");
    assertThat(AEROPLANE.validate(text, InputFormat.JSON)).isNotEmpty();
    Path file = Samples.write(directory, "a.json", text);
    assertThat(Samples.only(Samples.refusalOfAeroplane(file)).jsonPath()).isEqualTo("$.format");
  }

  @Test
  void theSchemaRefusesNoQuantityThatTheReaderAccepts() {
    List<String> numbers = List.of("1", "+1.5", "1.", ".5", "1e-3", "2.5E+2", "1  ");
    List<String> units = new ArrayList<>(Unit.symbolsOf(Dimension.TIME));
    units.addAll(List.of("m s/m", "1/Hz", "s2*s-1", "ft/kt"));
    for (String number : numbers) {
      for (String unit : units) {
        String quantity = "\"" + number + " " + unit + "\"";
        String text =
            Samples.with(Samples.SCENARIO_WITH_EVERY_KEY, "\"0.5 s\"", quantity)
                .replace("\"movement\": \"200 ms\", ", "\"movement\": \"0 s\", ");
        assertAccepted(SCENARIO, text);
        assertThat(ScenarioFile.read(Samples.writeScenario(directory, text)))
            .as(quantity)
            .isNotNull();
      }
    }
  }

  @Test
  void examplesInTheSchemasAreQuantitiesOfTheirDimension() {
    Map<String, Dimension> dimensions =
        Map.ofEntries(
            Map.entry("length", Dimension.LENGTH),
            Map.entry("area", Dimension.AREA),
            Map.entry("mass", Dimension.MASS),
            Map.entry("time", Dimension.TIME),
            Map.entry("temperatureDifference", Dimension.TEMPERATURE_DIFFERENCE),
            Map.entry("angle", Dimension.ANGLE),
            Map.entry("speed", Dimension.SPEED),
            Map.entry("angularRate", Dimension.ANGULAR_RATE),
            Map.entry("inertia", Dimension.INERTIA),
            Map.entry("moment", Dimension.MOMENT),
            Map.entry("power", Dimension.POWER),
            Map.entry("density", Dimension.DENSITY),
            Map.entry("acceleration", Dimension.ACCELERATION),
            Map.entry("perTime", Dimension.FREQUENCY),
            Map.entry("frequencySquared", Dimension.FREQUENCY.power(2)),
            Map.entry("frequencyPerLength", Dimension.FREQUENCY.per(Dimension.LENGTH)));
    JsonNode definitions = tree("scenario").path("$defs");
    dimensions.forEach(
        (name, dimension) -> {
          JsonNode definition = definitions.path(name);
          assertThat(definition.path("examples")).as(name).isNotEmpty();
          definition
              .path("examples")
              .forEach(
                  example -> assertThat(Quantity.parse(example.asText(), dimension)).isFinite());
          // The description lists the units that messages offer.
          assertThat(definition.path("description").asText())
              .contains(String.join(", ", Unit.symbolsOf(dimension)));
        });
  }

  @Test
  void examplesOfFrequenciesAreSomeAndTheirUnitsAreOffered() {
    JsonNode definition = tree("scenario").at("/$defs/frequency");
    assertThat(definition.path("examples")).hasSize(2);
    definition
        .path("examples")
        .forEach(example -> assertThat(Quantity.parseFrequency(example.asText())).isPositive());
    assertThat(definition.path("description").asText())
        .contains(String.join(", ", Unit.symbolsOf(Dimension.FREQUENCY)))
        .contains(String.join(", ", Unit.symbolsOf(Dimension.ANGULAR_RATE)));
  }

  @Test
  void textsAreThoseBesideTheScenarios() throws IOException {
    for (String name : Schemas.names()) {
      Path file = Path.of("..", "scenarios", name + ".schema.json");
      assertThat(Schemas.text(name)).isEqualTo(Files.readString(file));
    }
  }

  @Test
  void unknownSchemasAreRefused() {
    assertThatIllegalArgumentException()
        .isThrownBy(() -> Schemas.text("senario"))
        .withMessage(
            "no schema is called \"senario\"; expected one of scenario, aeroplane; did you mean"
                + " \"scenario\"?");
  }
}
