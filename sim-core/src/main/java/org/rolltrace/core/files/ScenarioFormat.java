package org.rolltrace.core.files;

import java.io.IOException;
import java.nio.file.Files;
import java.nio.file.InvalidPathException;
import java.nio.file.Path;
import java.util.ArrayList;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import java.util.OptionalDouble;
import java.util.stream.Collectors;
import org.rolltrace.core.atmosphere.FlightCondition;
import org.rolltrace.core.measures.MeasureOptions;
import org.rolltrace.core.motion.Disturbance;
import org.rolltrace.core.motion.SlipTreatment;
import org.rolltrace.core.motion.SteadyState;
import org.rolltrace.core.pilot.HeldSideslip;
import org.rolltrace.core.pilot.PilotInput;
import org.rolltrace.core.pilot.PilotProgramme;
import org.rolltrace.core.propeller.PropellerMoments;
import org.rolltrace.core.propeller.PropellerSetting;
import org.rolltrace.core.quantity.Dimension;
import org.rolltrace.core.quantity.Quantity;
import org.rolltrace.core.scenario.AeroplaneData;
import org.rolltrace.core.scenario.Scenario;
import org.rolltrace.core.scenario.ScenarioFault;
import org.rolltrace.core.scenario.Start;

/** A scenario. */
final class ScenarioFormat {
  static final int LONGEST_TITLE = 200;
  static final int MOST_INPUTS = 200;
  static final int MOST_BANK_ANGLES = 100;
  static final int MOST_SLIP_POINTS = 1000;

  private static final String AEROPLANE = "aeroplane";
  private static final String VARIANT = "variant";
  private static final String INPUTS = "inputs";
  private static final String HELD_SLIP = "heldSlip";
  private static final String BANK_ANGLES = "bankAngles";

  private static final Range DURATION =
      Range.aboveZeroTo(Scenario.LONGEST, "a duration above 0 and at most 3600 s");
  private static final Range HELD =
      Range.fromTo(-HeldSideslip.LARGEST, HeldSideslip.LARGEST, "at most 90 deg either way");
  private static final Range BAND = Range.fromTo(0.001, 0.5, "a fraction from 0.001 to 0.5");
  private static final Range LEAN =
      Range.fromTo(
          Math.nextUp(-Math.PI / 2), Math.nextDown(Math.PI / 2), "inside 90 deg either way");
  private static final double LARGEST_BANK_CHANGE = 3600;

  static final Keys SCENARIO =
      Keys.of("a scenario")
          .required(FormatName.KEY, "title", AEROPLANE, "condition", "slip", "duration")
          .optional(VARIANT, "start", HELD_SLIP, INPUTS, "measures", "note");

  static final Keys HELD_SLIP_POINT = Keys.of("a held slip").required("time", "sideslip");

  static final Keys START = Keys.of("the start").optional("bank", "rollRate", "sideslip", "trim");
  static final Keys TRIM =
      Keys.of("the trim")
          .optional(
              "state",
              "bank",
              "sideslip",
              SettingFormat.POWER,
              SettingFormat.PROPELLER_ROLL_MOMENT);
  static final Keys MEASURES = Keys.of("the measures").optional("settlingBand", BANK_ANGLES);

  private ScenarioFormat() {}

  static Optional<Scenario> read(
      JsonValue.ObjectValue object, Faults faults, Map<String, String> carried) {
    if (!FormatName.mayBe(FormatName.SCENARIO, object, faults)) {
      return Optional.empty();
    }
    ObjectCursor in = ObjectCursor.of(object, SCENARIO, faults);
    Optional<String> title = in.text("title", LONGEST_TITLE);
    in.freeText("note", JsonTree.LONGEST_TEXT);
    Optional<AeroplaneData> data = aeroplane(in);
    Optional<FlightCondition> condition = Optional.empty();
    Optional<PropellerSetting> propeller = Optional.of(PropellerMoments.NONE);
    Optional<ObjectCursor> air = in.object("condition", ConditionFormat.CONDITION);
    if (air.isPresent()) {
      condition = ConditionFormat.read(air.get());
      propeller = SettingFormat.read(air.get(), PropellerMoments.NONE);
    }
    Optional<SlipTreatment> slip = slip(in);
    Optional<Start> start = start(in, propeller.orElse(PropellerMoments.NONE));
    Optional<PilotProgramme> programme = programme(in, carried);
    Optional<HeldSideslip> held = heldSideslip(in);
    programme = programme.flatMap(inputs -> held.map(inputs::holding));
    double duration = in.quantity("duration", Dimension.TIME, DURATION);
    Optional<MeasureOptions> measures = measures(in);

    if (data.isPresent() && slip.isPresent() && propeller.isPresent()) {
      addWhatDoesNotFit(
          in,
          Scenario.faults(
              data.get(),
              propeller.get(),
              slip.get(),
              start.orElse(new Start(propeller.get(), Disturbance.NONE)),
              programme.orElse(PilotProgramme.of(List.of()))));
    }
    if (data.isPresent()
        && data.get().aeroplane().geometry().isPresent()
        && condition.isPresent()
        && !(condition.get().mach() < 1)) {
      in.refuse(
          "condition",
          "it is at Mach "
              + condition.get().mach()
              + ", but derivatives follow from a shape only below the speed of sound; fly slower, or"
              + " give the derivatives and take the wing out");
    }
    if (faults.count() > 0) {
      return Optional.empty();
    }
    return Optional.of(
        new Scenario(
            title.orElseThrow(),
            data.orElseThrow(),
            condition.orElseThrow(),
            propeller.orElseThrow(),
            slip.orElseThrow(),
            start.orElseThrow(),
            programme.orElseThrow(),
            duration,
            measures.orElseThrow()));
  }

  private static Optional<AeroplaneData> aeroplane(ObjectCursor in) {
    Optional<JsonValue> value = in.value(AEROPLANE);
    Optional<String> variant = in.text(VARIANT, AeroplaneFormat.LONGEST_NAME);
    if (value.isEmpty()) {
      return Optional.empty();
    }
    if (value.get() instanceof JsonValue.ObjectValue object) {
      return variant(in, object, variant, AeroplaneFormat.INLINE, in.faults());
    }
    if (value.get() instanceof JsonValue.Text text) {
      return aeroplaneFile(in, text.text(), variant);
    }
    in.addWrongType(
        value.get(), "the path of an aeroplane file in quotation marks, or the aeroplane itself");
    return Optional.empty();
  }

  /** The aeroplane, or the variant of it that the scenario picks. */
  private static Optional<AeroplaneData> variant(
      ObjectCursor in,
      JsonValue.ObjectValue aeroplane,
      Optional<String> variant,
      Keys keys,
      Faults faults) {
    if (variant.isEmpty()) {
      return AeroplaneFormat.read(aeroplane, keys, faults);
    }
    List<String> names = Variants.names(aeroplane);
    if (!names.contains(variant.get())) {
      in.refuse(
          VARIANT,
          names.isEmpty()
              ? "the aeroplane has no variants; take it out"
              : "the aeroplane has no variant "
                  + Shown.text(variant.get())
                  + "; expected one of "
                  + names.stream().map(Shown::text).collect(Collectors.joining(", ")));
      return AeroplaneFormat.read(aeroplane, keys, faults);
    }
    return AeroplaneFormat.readVariant(aeroplane, variant.get(), keys, faults);
  }

  private static Optional<AeroplaneData> aeroplaneFile(
      ObjectCursor in, String name, Optional<String> variant) {
    if (name.isBlank()) {
      in.refuse(AEROPLANE, "the path is blank; expected one from here to an aeroplane file");
      return Optional.empty();
    }
    Path scenario = in.faults().file();
    Path file;
    byte[] bytes;
    try {
      file = scenario.resolveSibling(name);
      if (isSameFile(file, scenario)) {
        in.refuse(
            AEROPLANE,
            Shown.text(name) + " is this scenario itself; expected the path of an aeroplane file");
        return Optional.empty();
      }
      bytes = TextFile.bytes(file);
    } catch (InvalidPathException e) {
      in.refuse(AEROPLANE, Shown.text(name) + " is no path; expected one to an aeroplane file");
      return Optional.empty();
    } catch (UnusableFileException e) {
      in.refuse(
          AEROPLANE,
          "the aeroplane file "
              + Shown.text(name)
              + " "
              + e.getMessage()
              + ". The path counts from the directory of the scenario");
      return Optional.empty();
    }
    Faults faults = in.faults().of(file);
    Optional<JsonValue.ObjectValue> object = JsonTree.read(bytes, faults);
    return object.isPresent()
        ? variant(in, object.get(), variant, AeroplaneFormat.IN_FILE, faults)
        : Optional.empty();
  }

  private static boolean isSameFile(Path one, Path other) {
    try {
      return Files.isSameFile(one, other);
    } catch (IOException e) {
      return false; // what is wrong with it shows when it is read
    }
  }

  private static Optional<SlipTreatment> slip(ObjectCursor in) {
    List<String> words = new ArrayList<>();
    for (SlipTreatment treatment : SlipTreatment.values()) {
      words.add(treatment.word());
    }
    String word = in.word("slip", words).orElse("");
    for (SlipTreatment treatment : SlipTreatment.values()) {
      if (treatment.word().equals(word)) {
        return Optional.of(treatment);
      }
    }
    return Optional.empty();
  }

  private static Optional<Start> start(ObjectCursor scenario, PropellerSetting propeller) {
    if (!scenario.has("start")) {
      return Optional.of(new Start(propeller, Disturbance.NONE));
    }
    Optional<ObjectCursor> object = scenario.object("start", START);
    if (object.isEmpty()) {
      return Optional.empty();
    }
    ObjectCursor in = object.get();
    double bank = in.quantity("bank", Dimension.ANGLE, Range.ANY, 0);
    double rollRate = in.quantity("rollRate", Dimension.ANGULAR_RATE, Range.ANY, 0);
    double sideslip = in.quantity("sideslip", Dimension.ANGLE, Range.ANY, 0);
    Optional<PropellerSetting> trimmedWith = Optional.of(propeller);
    Optional<SteadyState> state = Optional.of(SteadyState.WINGS_LEVEL);
    Optional<ObjectCursor> trim = in.object("trim", TRIM);
    if (trim.isPresent()) {
      state = state(trim.get());
      trimmedWith = SettingFormat.read(trim.get(), propeller);
    }
    return in.isSound()
        ? Optional.of(
            new Start(
                state.orElseThrow(),
                trimmedWith.orElseThrow(),
                new Disturbance(bank, rollRate, sideslip)))
        : Optional.empty();
  }

  private static Optional<SteadyState> state(ObjectCursor in) {
    List<String> words = new ArrayList<>();
    for (SteadyState.Kind kind : SteadyState.Kind.values()) {
      words.add(kind.word());
    }
    OptionalDouble bank = in.optionalQuantity("bank", Dimension.ANGLE, LEAN);
    OptionalDouble sideslip = in.optionalQuantity("sideslip", Dimension.ANGLE, LEAN);
    String word = in.word("state", words).orElse(in.has("state") ? "" : words.get(0));
    if (word.isEmpty()) {
      return Optional.empty();
    }
    SteadyState.Kind kind = SteadyState.Kind.ofWord(word);
    switch (kind) {
      case WINGS_LEVEL -> {
        for (String key : List.of("bank", "sideslip")) {
          if (in.has(key)) {
            in.refuse(
                key,
                "wings-level trim has no "
                    + key
                    + "; choose another state, or put it beside \"trim\" as what displaces the"
                    + " trimmed aeroplane");
          }
        }
      }
      case STRAIGHT_SIDESLIP -> {
        if (in.has("bank") == in.has("sideslip")) {
          in.faults()
              .add(
                  in.place(),
                  (in.has("bank") ? "both sideslip and bank are" : "neither sideslip nor bank is")
                      + " given; a straight sideslip takes one of them, the other follows");
        }
      }
      case STEADY_TURN -> {
        if (!in.has("bank")) {
          in.addMissing("bank", "a steady turn must have it");
        }
        if (in.has("sideslip")) {
          in.refuse(
              "sideslip",
              "a steady turn takes no sideslip; it follows from the ball in the middle");
        }
      }
    }
    return in.isSound() ? Optional.of(new SteadyState(kind, bank, sideslip)) : Optional.empty();
  }

  private static Optional<PilotProgramme> programme(ObjectCursor in, Map<String, String> carried) {
    List<JsonValue> elements = in.list(INPUTS, MOST_INPUTS);
    List<PilotInput> inputs = new ArrayList<>();
    for (JsonValue element : elements) {
      if (element instanceof JsonValue.ObjectValue object) {
        Optional<PilotInput> input = InputFormat.read(object, in.faults(), carried);
        if (input.isPresent()) {
          inputs.add(input.get());
        }
      } else {
        in.addWrongType(element, "an input in braces { }");
      }
    }
    return inputs.size() == elements.size()
        ? Optional.of(PilotProgramme.of(inputs))
        : Optional.empty();
  }

  private static Optional<HeldSideslip> heldSideslip(ObjectCursor scenario) {
    List<JsonValue> elements = scenario.list(HELD_SLIP, MOST_SLIP_POINTS);
    List<HeldSideslip.Point> points = new ArrayList<>();
    for (JsonValue element : elements) {
      if (!(element instanceof JsonValue.ObjectValue object)) {
        scenario.addWrongType(element, "a time and a sideslip in braces { }");
        continue;
      }
      ObjectCursor in = ObjectCursor.of(object, HELD_SLIP_POINT, scenario.faults());
      double time = in.quantity("time", Dimension.TIME, Range.ZERO_OR_MORE);
      double sideslip = in.quantity("sideslip", Dimension.ANGLE, HELD);
      if (!in.isSound()) {
        continue;
      }
      if (!points.isEmpty() && !(time > points.get(points.size() - 1).time())) {
        in.refuse(
            "time",
            "the time is not after the one before, "
                + points.get(points.size() - 1).time()
                + " s; expected increasing times");
        continue;
      }
      points.add(new HeldSideslip.Point(time, sideslip));
    }
    return points.size() == elements.size()
        ? Optional.of(HeldSideslip.of(points))
        : Optional.empty();
  }

  private static Optional<MeasureOptions> measures(ObjectCursor scenario) {
    Optional<ObjectCursor> object = scenario.object("measures", MEASURES);
    if (object.isEmpty()) {
      return Optional.of(MeasureOptions.DEFAULT);
    }
    ObjectCursor in = object.get();
    double band = in.number("settlingBand", BAND, MeasureOptions.DEFAULT.settlingBand());
    List<Double> changes = new ArrayList<>(MeasureOptions.DEFAULT.bankChanges());
    Range range =
        Range.aboveZeroTo(
            Quantity.parse("3600 deg", Dimension.ANGLE), "a change above 0 and at most 3600 deg");
    for (JsonValue element : in.list(BANK_ANGLES, MOST_BANK_ANGLES)) {
      double change = in.quantity(element, Dimension.ANGLE, range);
      if (!Double.isNaN(change)) {
        changes.add(inDegrees(change));
      }
    }
    return in.isSound() ? Optional.of(new MeasureOptions(band, changes)) : Optional.empty();
  }

  /** Whole again where it was written whole, so that 45 deg is the same as the default. */
  private static double inDegrees(double angle) {
    double fine = 1e9;
    double degrees = Math.round(Quantity.toUnit(angle, "deg") * fine) / fine;
    return degrees > 0 ? Math.min(degrees, LARGEST_BANK_CHANGE) : Quantity.toUnit(angle, "deg");
  }

  private static void addWhatDoesNotFit(ObjectCursor scenario, List<ScenarioFault> faults) {
    for (ScenarioFault fault : faults) {
      JsonValue.Place place = scenario.placeAt(fault.path());
      scenario
          .faults()
          .add(new JsonValue.Place(fault.path(), place.line(), place.column()), fault.message());
    }
  }
}
