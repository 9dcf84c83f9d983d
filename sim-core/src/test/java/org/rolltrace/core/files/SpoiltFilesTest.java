package org.rolltrace.core.files;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.tuple;

import java.nio.file.Path;
import java.util.List;
import java.util.stream.Stream;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.io.TempDir;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.MethodSource;

/** Each sample has one thing wrong, and nothing else is reported. */
class SpoiltFilesTest {
  @TempDir Path directory;

  record Spoilt(String text, String path, int line, String message) {
    @Override
    public String toString() {
      return path + ": " + message;
    }
  }

  private static Spoilt spoilt(
      String sample, String part, String replacement, String path, int line, String message) {
    return new Spoilt(Samples.with(sample, part, replacement), path, line, message);
  }

  private static Spoilt ofMultistep(String part, String replacement, String key, String message) {
    return ofInput(3, part, replacement, key, message);
  }

  private static Spoilt ofRamp(String part, String replacement, String key, String message) {
    return ofInput(4, part, replacement, key, message);
  }

  private static Spoilt ofSweep(String part, String replacement, String key, String message) {
    return ofInput(5, part, replacement, key, message);
  }

  private static Spoilt ofTrace(String part, String replacement, String key, String message) {
    return ofInput(6, part, replacement, key, message);
  }

  private static Spoilt ofInput(
      int index, String part, String replacement, String key, String message) {
    return spoilt(
        Samples.SCENARIO_WITH_EVERY_KEY,
        part,
        replacement,
        "$.inputs[" + index + "]." + key,
        32 + index,
        message);
  }

  private static Spoilt ofHeldSlip(String points, String place, String message) {
    return spoilt(
        Samples.SCENARIO,
        "\"slip\": \"free\"",
        "\"slip\": \"held\", \"heldSlip\": [" + points + "]",
        "$.heldSlip" + place,
        6,
        message);
  }

  /** Each trace has one thing wrong, and is reported with its line. */
  static Stream<Spoilt> traces() {
    return Stream.of(
        ofCsv(
            "time[s],stick[-],pedal[%]",
            "", 1, "the first line is blank; expected a header such as time[s],stick[-]"),
        ofCsv(
            "time[s]",
            "time",
            1,
            "\"time\" is no name with a unit; expected a header such as time[s],stick[-]"),
        ofCsv(
            "time[s]",
            "\"time[s]\"",
            1,
            "\"\"time[s]\"\" is quoted; expected a name without quotation marks"),
        ofCsv(
            "time[s]",
            "t[s]",
            1,
            "no column is called time; expected a header such as time[s],stick[-]"),
        ofCsv("time[s]", "time[m]", 1, "the unit of time is \"m\"; expected [s] or [ms]"),
        ofCsv("time[s]", "time[-]", 1, "the unit of time is \"-\"; expected [s] or [ms]"),
        ofCsv(
            "stick[-]",
            "stick[deg]",
            1,
            "the unit of \"stick\" is \"deg\"; expected a fraction or per cent of the travel, [-] or [%]"),
        ofCsv(
            "pedal[%]",
            "stick[%]", 1, "the column \"stick\" stands here again; keep one of the two"),
        ofCsv("0.5,0.25,10", "0.5,0.25", 3, "the line has 2 values; expected 3, as the header"),
        ofCsv("0.5,0.25,10", "0.5;0.25;10", 3, "the line has 1 values; expected 3, as the header"),
        ofCsv(
            "0.5,0.25,10",
            "0.5,,10",
            3,
            "\"\" does not begin with a decimal number; expected a plain number such as \"12\""),
        ofCsv(
            "0.5,0.25,10",
            "0.5,NaN,10",
            3,
            "\"NaN\" does not begin with a decimal number; expected a plain number such as \"12\""),
        ofCsv(
            "0.5,0.25,10",
            "0.5,1e999,10",
            3,
            "\"1e999\" is too large to be computed with; expected a plain number such as \"12\""),
        ofCsv(
            "0.5,0.25,10",
            "0.5,2.1,10",
            3,
            "the position is 2.1, times the size -0.5; expected from -1 to 1, a fraction of the travel"),
        ofCsv(
            "0.5,0.25,10",
            "0,0.25,10",
            3,
            "the time is 0.0 s after 0.0 s; expected increasing times"),
        ofCsv(
            "0,0,0\n",
            "-21,0,0\n",
            2,
            "the time is -21.0 s, and the start 20.0 s; expected a sum of 0 or more: give a later start"),
        ofCsv("0.5,0.25,10", "", 3, "a blank line stands between the samples; take it out"),
        ofCsv(
            "0.5,0.25,10\n1,1,-20\n1.5,0,0\n",
            "",
            2,
            "there are fewer than two samples; expected at least two lines of numbers"));
  }

  private static Spoilt ofCsv(String part, String replacement, int line, String message) {
    return new Spoilt(Samples.with(Samples.TRACE, part, replacement), "$", line, message);
  }

  private static Spoilt trim(String keys, String path, String message) {
    return spoilt(
        Samples.SCENARIO,
        "{ \"bank\": \"0 deg\" }",
        "{ \"trim\": { " + keys + " } }",
        "$.start.trim" + path,
        7,
        message);
  }

  private static Spoilt dimensional(
      String part, String replacement, String path, int line, String message) {
    return spoilt(
        Samples.AEROPLANE_WITH_EVERY_DIMENSIONAL_KEY, part, replacement, path, line, message);
  }

  private static Spoilt power(
      String part, String replacement, String path, int line, String message) {
    return spoilt(Samples.SCENARIO_WITH_POWER, part, replacement, path, line, message);
  }

  private static Spoilt two(String more, String key, String message) {
    return power(
        "{ \"y\": \"1 m\" }, \"efficiency\": 0.8",
        "{ \"y\": \"1 m\" }" + more,
        "$.aeroplane.propellers[1]" + key,
        9,
        message);
  }

  /** Faults of shapes, masses and variants. */
  static Stream<Spoilt> shapes() {
    return Stream.of(
        spoilt(
            Samples.AEROPLANE_WITH_SHAPE,
            "\"from\": \"2 m\", \"to\": \"500 cm\"",
            "\"from\": \"1.9 m\", \"to\": \"500 cm\"",
            "$.wing.panels[1].from",
            7,
            "this panel overlaps the one before it, which ends at 2.0 m; expected panels that join"),
        spoilt(
            Samples.AEROPLANE_WITH_SHAPE,
            "\"from\": \"2 m\", \"to\": \"500 cm\"",
            "\"from\": \"2.1 m\", \"to\": \"500 cm\"",
            "$.wing.panels[1].from",
            7,
            "there is a gap to the panel before it, or to the plane of symmetry, at 2.0 m; expected panels that join, the first from 0 m"),
        spoilt(
            Samples.AEROPLANE_WITH_SHAPE,
            "\"from\": \"0 m\", \"to\": \"2 m\"",
            "\"from\": \"0.1 m\", \"to\": \"2 m\"",
            "$.wing.panels[0].from",
            6,
            "there is a gap to the panel before it, or to the plane of symmetry, at 0.0 m; expected panels that join, the first from 0 m"),
        spoilt(
            Samples.AEROPLANE_WITH_SHAPE,
            "\"500 cm\"",
            "\"100 cm\"",
            "$.wing.panels[1].to",
            7,
            "the panel begins at 2.0 m and ends at 1.0 m; expected an outer end further out"),
        spoilt(
            Samples.AEROPLANE_WITH_SHAPE,
            "\"500 cm\"",
            "\"1e6 m\"",
            "$.wing.panels[1].to",
            7,
            "\"1e6 m\" is out of range; expected from 0 to 1000 m"),
        spoilt(
            Samples.AEROPLANE_WITH_SHAPE,
            "\"outerChord\": \"0.8 m\"",
            "\"outerChord\": \"0 m\"",
            "$.wing.panels[1].outerChord",
            7,
            "\"0 m\" is out of range; expected a chord from 1 mm to 1000 m"),
        spoilt(
            Samples.AEROPLANE_WITH_SHAPE,
            "\"outerChord\": \"0.8 m\"",
            "\"outerChord\": \"3.7 m\"",
            "$.wing.panels[1].outerChord",
            7,
            "the tip is 3.7 m wide, the root 1.8 m; expected at most twice the root"),
        spoilt(
            Samples.AEROPLANE_WITH_SHAPE,
            "\"3 deg\", \"dihedral\"",
            "\"90 deg\", \"dihedral\"",
            "$.wing.panels[1].sweep",
            7,
            "\"90 deg\" is out of range; expected up to 60 deg either way"),
        spoilt(
            Samples.AEROPLANE_WITH_SHAPE,
            "\"-2 deg\"",
            "\"-20 deg\"",
            "$.wing.panels[1].twist",
            7,
            "\"-20 deg\" is out of range; expected up to 15 deg either way"),
        spoilt(
            Samples.AEROPLANE_WITH_SHAPE,
            "\"0.1 rad\"",
            "0.1",
            "$.wing.panels[1].dihedral",
            7,
            "the number stands bare: \"0.1\" has no unit; expected an angle such as \"0.1 deg\" (deg, rad, mrad, rev)"),
        spoilt(
            Samples.AEROPLANE_WITH_SHAPE,
            "\"liftSlope\": 6",
            "\"liftSlope\": 9",
            "$.wing.panels[1].section.liftSlope",
            7,
            "9 is out of range; expected a lift slope above 0 and at most 8 per radian; thin sections have 6.28"),
        spoilt(
            Samples.AEROPLANE_WITH_SHAPE,
            "\"14 deg\"",
            "\"0 deg\"",
            "$.wing.panels[1].section.stall",
            7,
            "\"0 deg\" is out of range; expected an incidence above 0 and at most 60 deg"),
        spoilt(
            Samples.AEROPLANE_WITH_SHAPE,
            "\"zeroLift\": \"-3 deg\", \"stall\": \"14 deg\"",
            "\"zeroLift\": \"5 deg\", \"stall\": \"4 deg\"",
            "$.wing.panels[1].section.stall",
            7,
            "\"4 deg\": stalling incidence is 0.06981317007977318 rad; expected one above the zero-lift incidence, 0.08726646259971647 rad"),
        spoilt(
            Samples.AEROPLANE_WITH_SHAPE,
            "\"profileDrag\": 0.009",
            "\"profileDrag\": -0.009",
            "$.wing.panels[1].section.profileDrag",
            7,
            "-0.009 is out of range; expected 0 or more"),
        spoilt(
            Samples.AEROPLANE_WITH_SHAPE,
            "\"incidence\": \"2 deg\"",
            "\"incidence\": \"20 deg\"",
            "$.wing.incidence",
            10,
            "\"20 deg\" is out of range; expected up to 15 deg either way"),
        spoilt(
            Samples.AEROPLANE_WITH_SHAPE,
            "\"theory\": \"lifting-line\"",
            "\"theory\": \"lifting-lines\"",
            "$.wing.theory",
            12,
            "unknown theory \"lifting-lines\"; expected one of \"lifting-surface\", \"lifting-line\"; did you mean \"lifting-line\"?"),
        spoilt(
            Samples.AEROPLANE_WITH_SHAPE,
            "\"to\": \"190 in\"",
            "\"to\": \"5.1 m\"",
            "$.ailerons.to",
            14,
            "the aileron ends at 5.1 m, beyond the tip of the wing at 5.0 m; expected an aileron on the wing"),
        spoilt(
            Samples.AEROPLANE_WITH_SHAPE,
            "\"from\": \"3 m\"",
            "\"from\": \"5 m\"",
            "$.ailerons.to",
            14,
            "the aileron begins at 5.0 m and ends at 4.826 m; expected an outer end further out"),
        spoilt(
            Samples.AEROPLANE_WITH_SHAPE,
            "\"from\": \"3 m\"",
            "\"from\": \"-3 m\"",
            "$.ailerons.from",
            14,
            "\"-3 m\" is out of range; expected 0 or more"),
        spoilt(
            Samples.AEROPLANE_WITH_SHAPE,
            "\"chordShare\": 0.25",
            "\"chordShare\": 1",
            "$.ailerons.chordShare",
            14,
            "1 is out of range; expected a share above 0 and below 1"),
        spoilt(
            Samples.AEROPLANE_WITH_SHAPE,
            ", \"chordShare\": 0.25",
            "",
            "$.ailerons.chordShare",
            14,
            "the key \"chordShare\" is missing; the place of an aileron needs \"from\", \"to\" and \"chordShare\""),
        spoilt(
            Samples.AEROPLANE_WITH_SHAPE,
            "\"arm\": \"4.5 m\"",
            "\"arm\": \"0 m\"",
            "$.tailplane.arm",
            16,
            "\"0 m\" is out of range; expected a value above 0"),
        spoilt(
            Samples.AEROPLANE_WITH_SHAPE,
            "\"arm\": \"4.4 m\"",
            "\"arm\": \"0 m\"",
            "$.fin.arm",
            17,
            "\"0 m\" is out of range; expected a value above 0"),
        spoilt(
            Samples.AEROPLANE_WITH_SHAPE,
            "\"area\": \"2.5 m2\"",
            "\"area\": \"2.5 m\"",
            "$.tailplane.area",
            16,
            "\"2.5 m\" is a length; expected an area (m2, ft2, in2, cm2)"),
        spoilt(
            Samples.AEROPLANE_WITH_SHAPE,
            "\"rudderShare\": 0.4",
            "\"rudderShare\": 1.4",
            "$.fin.rudderShare",
            17,
            "1.4 is out of range; expected a share above 0 and below 1"),
        spoilt(
            Samples.AEROPLANE_WITH_SHAPE,
            "\"20 deg\", \"rudderShare\"",
            "\"80 deg\", \"rudderShare\"",
            "$.fin.sweep",
            17,
            "\"80 deg\" is out of range; expected up to 70 deg either way"),
        spoilt(
            Samples.AEROPLANE_WITH_SHAPE,
            "\"width\": \"1.1 m\"",
            "\"width\": \"10 m\"",
            "$.body.width",
            18,
            "the body is 10.0 m wide, and the wing spans 10.0 m; expected a wing that sticks out of the body"),
        spoilt(
            Samples.AEROPLANE_WITH_SHAPE,
            "\"length\": \"7 m\", ",
            "",
            "$.body.length",
            18,
            "the key \"length\" is missing; a body must have it"),
        spoilt(
            Samples.AEROPLANE_WITH_SHAPE,
            "\"name\": \"Shape\",",
            "\"name\": \"Shape\", \"span\": \"9.9 m\",",
            "$.span",
            3,
            "the panels of the wing make it 10.0 m; expected the same to 0.1 %, or no \"span\""),
        spoilt(
            Samples.AEROPLANE_WITH_SHAPE,
            "\"name\": \"Shape\",",
            "\"name\": \"Shape\", \"wingArea\": \"14 m2\",",
            "$.wingArea",
            3,
            "the panels of the wing make it 15.0 m2; expected the same to 0.1 %, or no \"wingArea\""),
        spoilt(
            Samples.AEROPLANE_WITH_SHAPE,
            "\"name\": \"Shape\",",
            "\"name\": \"Shape\", \"mass\": \"900 kg\",",
            "$.masses",
            19,
            "together they are 1000.0 kg, the mass is given as 900.0 kg; expected the same to 1 %, or no mass"),
        spoilt(
            Samples.AEROPLANE_WITH_SHAPE,
            "\"mass\": \"400 kg\"",
            "\"mass\": \"0 kg\"",
            "$.masses[0].mass",
            20,
            "\"0 kg\" is out of range; expected a value above 0"),
        spoilt(
            Samples.AEROPLANE_WITH_SHAPE,
            "\"name\": \"back\", ",
            "",
            "$.masses[2].name",
            22,
            "the key \"name\" is missing; a mass must have it"),
        spoilt(
            Samples.AEROPLANE_WITH_SHAPE,
            "\"pair\": true",
            "\"pair\": 1",
            "$.masses[1].pair",
            21,
            "found the number 1; expected true or false, without quotation marks"),
        spoilt(
            Samples.AEROPLANE_WITH_SHAPE,
            "\"clipped\": { \"wing\"",
            "\"\": { \"wing\"",
            "$.variants[\"\"]",
            25,
            "the name of a variant is blank; expected some text"),
        spoilt(
            Samples.AEROPLANE_WITH_SHAPE,
            "\"clipped\": { \"wing\"",
            "\"none\": {}, \"clipped\": { \"wing\"",
            "$.variants.none",
            25,
            "the variant \"none\" changes nothing; name what it changes, or take it out"),
        spoilt(
            Samples.AEROPLANE_WITH_SHAPE,
            "\"clipped\": { \"wing\"",
            "\"none\": \"less span\", \"clipped\": { \"wing\"",
            "$.variants.none",
            25,
            "found the text \"less span\"; expected what the variant changes, in braces { }"),
        spoilt(
            Samples.AEROPLANE_WITH_SHAPE,
            "\"clipped\": { \"wing\"",
            "\"clipped\": { \"format\": \"rolltrace-aeroplane/1\", \"wing\"",
            "$.variants.clipped.format",
            25,
            "a variant cannot change \"format\"; take it out"),
        spoilt(
            Samples.AEROPLANE_WITH_SHAPE,
            "\"clipped\": { \"wing\"",
            "\"clipped\": { \"limits\": null, \"wing\"",
            "$.variants.clipped.limits",
            25,
            "null takes \"limits\" out, which the base does not have; leave it out here as well"),
        spoilt(
            Samples.AEROPLANE_WITH_SHAPE,
            "\"theory\": null",
            "\"stall\": null",
            "$.variants.clipped.wing.stall",
            25,
            "null takes \"stall\" out, which the base does not have; leave it out here as well"),
        spoilt(
            Samples.AEROPLANE_WITH_SHAPE,
            "\"clipped\": { \"wing\"",
            "\"clipped\": { \"wnig\": {}, \"wing\"",
            "$.variants.clipped.wnig",
            25,
            "as variant \"clipped\", unknown key \"wnig\"; did you mean \"wing\"? The keys of an aeroplane are format, span, wingArea, inertia, derivatives, name, mass, ailerons, rudder, axes, limits, note, angleOfAttack, lateralImbalance, propellers, masses, variants, wing, tailplane, fin, body"),
        spoilt(
            Samples.AEROPLANE_WITH_SHAPE,
            "\"to\": \"4.9 m\"",
            "\"to\": \"4.7 m\"",
            "$.ailerons.to",
            14,
            "as variant \"clipped\", the aileron ends at 4.826 m, beyond the tip of the wing at 4.7 m; expected an aileron on the wing"),
        spoilt(
            Samples.AEROPLANE_WITH_SHAPE,
            "\"given\": {",
            "\"clipped\": { \"mass\": \"1 kg\" }, \"given\": {",
            "$.variants.clipped",
            26,
            "the variant \"clipped\" stands here a second time"),
        spoilt(
            Samples.AEROPLANE_WITH_SHAPE,
            "\"theory\": null",
            "\"theory\": null, \"theory\": \"lifting-line\"",
            "$.variants.clipped.wing.theory",
            25,
            "the key \"theory\" stands here again. Keep one of the two"),
        spoilt(
            Samples.AEROPLANE_WITH_SHAPE,
            "\"theory\": null",
            "\"height\": \"1 m\", \"height\": \"2 m\"",
            "$.variants.clipped.wing.height",
            25,
            "the key \"height\" stands here again. Keep one of the two"),
        spoilt(
            Samples.AEROPLANE,
            "\"span\": \"33.4 ft\"",
            "\"fin\": { \"area\": \"1 m2\", \"span\": \"1 m\", \"arm\": \"4 m\", \"height\": \"1 m\" }, \"span\": \"33.4 ft\"",
            "$.fin",
            4,
            "it says nothing without the wing; give the wing too, or take it out"),
        spoilt(
            Samples.AEROPLANE,
            "\"span\": \"33.4 ft\"",
            "\"tailplane\": { \"area\": \"1 m2\", \"span\": \"1 m\", \"arm\": \"4 m\" }, \"span\": \"33.4 ft\"",
            "$.tailplane",
            4,
            "it says nothing without the wing; give the wing too, or take it out"),
        spoilt(
            Samples.AEROPLANE,
            "\"down\": \"20 deg\"",
            "\"down\": \"20 deg\", \"chordShare\": 0.2",
            "$.ailerons.chordShare",
            6,
            "it says nothing without the wing; give the wing too, or take it out"),
        spoilt(
            Samples.AEROPLANE,
            "\"span\": \"33.4 ft\", ",
            "",
            "$.span",
            1,
            "the key \"span\" is missing; an aeroplane must have it, or a \"wing\""),
        spoilt(
            Samples.AEROPLANE,
            "\"span\": \"33.4 ft\"",
            "\"masses\": [], \"span\": \"33.4 ft\"",
            "$.masses",
            4,
            "there are no masses; expected at least one, or an inertia"),
        spoilt(
            Samples.AEROPLANE,
            "\"span\": \"33.4 ft\"",
            "\"masses\": [3], \"span\": \"33.4 ft\"",
            "$.masses[0]",
            4,
            "found the number 3; expected a mass in braces { }"),
        spoilt(
            Samples.AEROPLANE,
            "\"span\": \"33.4 ft\"",
            "\"variants\": [], \"span\": \"33.4 ft\"",
            "$.variants",
            4,
            "found a list; expected variants by name in braces { }"),
        spoilt(
            Samples.AEROPLANE,
            "\"span\": \"33.4 ft\"",
            "\"wing\": { \"panels\": [] }, \"span\": \"33.4 ft\"",
            "$.wing.panels",
            4,
            "there are no panels; expected at least one, from 0 m to the tip"),
        spoilt(
            Samples.AEROPLANE,
            "\"span\": \"33.4 ft\"",
            "\"wing\": { \"panels\": [7] }, \"span\": \"33.4 ft\"",
            "$.wing.panels[0]",
            4,
            "found the number 7; expected a panel in braces { }"),
        spoilt(
            Samples.AEROPLANE,
            "\"inertia\": { \"roll\": \"1048 slug ft2\", \"yaw\": \"3530 slug ft2\", \"product\": \"0 slug ft2\" }",
            "\"masses\": [ { \"name\": \"a\", \"mass\": \"2750 lb\", \"x\": \"1 m\" } ]",
            "$.masses",
            5,
            "they have no extent: roll inertia, kg m2, is 0.0; expected a finite number above 0"),
        spoilt(
            Samples.AEROPLANE,
            "\"inertia\": { \"roll\": \"1048 slug ft2\", \"yaw\": \"3530 slug ft2\", \"product\": \"0 slug ft2\" },",
            "",
            "$.inertia",
            1,
            "the key \"inertia\" is missing; an aeroplane must have it, or \"masses\" at stations; with \"mass\" and \"body\" it can be estimated by radii of gyration"),
        spoilt(
            Samples.AEROPLANE,
            "\"mass\": \"2750 lb\"",
            "\"masses\": [ { \"name\": \"a\", \"mass\": \"1e308 kg\", \"pair\": true } ]",
            "$.masses",
            4,
            "together they are too large to be computed with"));
  }

  /** Faults of a scenario that picks a variant. */
  static Stream<Spoilt> pickedVariants() {
    return Stream.of(
        spoilt(
            Samples.SCENARIO_OF_A_VARIANT,
            "\"variant\": \"clipped\"",
            "\"variant\": \"Clipped\"",
            "$.variant",
            5,
            "the aeroplane has no variant \"Clipped\"; expected one of \"clipped\", \"given\""),
        spoilt(
            Samples.SCENARIO_OF_A_VARIANT,
            "\"variant\": \"clipped\"",
            "\"variant\": \"\"",
            "$.variant",
            5,
            "the text is blank; expected some words"),
        spoilt(
            Samples.SCENARIO_OF_A_VARIANT,
            "\"variant\": \"clipped\"",
            "\"variant\": 1",
            "$.variant",
            5,
            "found the number 1; expected text in double quotation marks"),
        spoilt(
            Samples.SCENARIO_OF_A_VARIANT,
            "\"aeroplanes/shape.json\"",
            "\"aeroplanes/some-aeroplane.json\"",
            "$.variant",
            5,
            "the aeroplane has no variants; take it out"),
        spoilt(
            Samples.SCENARIO_OF_A_VARIANT,
            "\"trueAirspeed\": \"60 m/s\"",
            "\"trueAirspeed\": \"339 m/s\"",
            "$.condition.trueAirspeed",
            6,
            "\"339 m/s\": true airspeed, m/s, is 339.0, which is flight at Mach 1.019459136139584; expected below Mach 1, as the subsonic pitot relation does not hold beyond. Lower the speed or the altitude, and check the unit and the kind of airspeed"));
  }

  /** Faults of propellers, their power, and inputs on it. */
  static Stream<Spoilt> propellers() {
    return Stream.of(
        power(
            "{ \"y\": \"1 m\" }",
            "{ \"y\": \"-1 m\" }",
            "$.aeroplane.propellers[1].position",
            9,
            "it is at the same place as the propeller \"one\"; expected a position of its own for each"),
        power(
            "\"name\": \"two\"",
            "\"name\": \"one\"",
            "$.aeroplane.propellers[1].name",
            9,
            "another propeller is called \"one\" already; expected a name of its own for each"),
        power(
            "\"two\", \"rotation\": \"clockwise\"",
            "\"two\", \"rotation\": \"left\"",
            "$.aeroplane.propellers[1].rotation",
            9,
            "unknown rotation \"left\"; expected one of \"clockwise\", \"anticlockwise\", \"contra-rotating\""),
        two(
            ", \"straightened\": 1.5",
            ".straightened",
            "1.5 is out of range; expected a part from 0 to 1"),
        two(
            ", \"efficiency\": 1.1",
            ".efficiency",
            "1.1 is out of range; expected a part above 0 and at most 1"),
        two(
            ", \"speedWithoutPower\": 0.5",
            ".speedWithoutPower",
            "a propeller of constant speed has none; write \"pitch\": \"fixed\", or leave it out"),
        two(
            ", \"pitch\": \"fixed\", \"engineLag\": \"1 s\"",
            ".speedWithoutPower",
            "the key \"speedWithoutPower\" is missing; with fixed pitch it says how fast the air turns the propeller, as a part of its speed at rated power"),
        two(
            ", \"pitch\": \"fixed\", \"engineLag\": \"1 s\", \"speedWithoutPower\": 1",
            ".speedWithoutPower",
            "1 is out of range; expected a part above 0 and below 1"),
        two(
            ", \"pitch\": \"fixed\", \"speedWithoutPower\": 0.5",
            ".engineLag",
            "the key \"engineLag\" is missing; with fixed pitch the speed follows the power, and without lag it would jump"),
        two(
            ", \"pitch\": \"fixed\", \"speedWithoutPower\": 0.5, \"engineLag\": \"0 s\"",
            ".engineLag",
            "with fixed pitch the speed follows the power, and without lag it would jump; expected a time above 0"),
        two(
            ", \"engineLag\": \"1 us\"".replace("1 us", "1e-5 s"),
            ".engineLag",
            "\"1e-5 s\": engine lag is 1.0E-5 s; expected 0 for none, or at least 1.0E-4 s"),
        spoilt(
            Samples.with(
                Samples.SCENARIO_WITH_POWER,
                "\"two\", \"rotation\": \"clockwise\"",
                "\"two\", \"rotation\": \"contra-rotating\""),
            "{ \"y\": \"1 m\" }, \"efficiency\": 0.8",
            "{ \"y\": \"1 m\" }, \"rotatingInertia\": { \"engine\": \"0.1 kg m2\" }",
            "$.aeroplane.propellers[1].engineRotation",
            9,
            "the key \"engineRotation\" is missing; the engine has an inertia, and the halves of its propeller do not say which way it turns"),
        power(
            "\"power\": \"90 kW\"",
            "\"power\": \"151 kW\"",
            "$.condition.power",
            13,
            "151 kW is beyond the rated power of the propellers, 150 kW in all; expected at most that"),
        power(
            "\"power\": \"30 kW\"",
            "\"power\": \"210 hp\"",
            "$.start.trim.power",
            15,
            "156.597 kW is beyond the rated power of the propellers, 150 kW in all; expected at most that"),
        power(
            "\"power\": \"90 kW\"",
            "\"power\": \"-1 W\"",
            "$.condition.power",
            13,
            "\"-1 W\" is out of range; expected 0 or more"),
        power(
            ", \"propellerSpeed\": \"2400 rpm\"",
            "",
            "$.condition.power",
            13,
            "a power is given, but not how fast the propeller turns; give propellerSpeed beside it, or each propeller its speed"),
        power(
            "\"power\": \"90 kW\"",
            "\"propellerRollMoment\": \"9 N m\", \"power\": \"90 kW\"",
            "$.condition.propellerRollMoment",
            13,
            "power and propellerRollMoment stand together; keep one, the moment follows from the power"),
        power(
            "\"power\": \"90 kW\", ",
            "",
            "$.condition.propellerSpeed",
            13,
            "propellerSpeed says nothing without power; give power, or take it out"),
        power(
            "{ \"power\": \"30 kW\" }",
            "{ \"propellerRollMoment\": \"-100 N m\" }",
            "$.start.trim.propellerRollMoment",
            15,
            "it is trimmed with a propeller moment, but flown with a power; give both as power, or both as propellerRollMoment"),
        spoilt(
            Samples.with(
                Samples.SCENARIO_WITH_POWER,
                "{ \"control\": \"power\", \"shape\": \"step\", \"start\": \"1 s\", \"size\": 0.2 }",
                ""),
            "\"power\": \"90 kW\", \"propellerSpeed\": \"2400 rpm\"",
            "\"propellerRollMoment\": \"-100 N m\"",
            "$.start.trim.power",
            15,
            "it is trimmed at a power, but the condition gives none; give both as power, or both as propellerRollMoment"),
        spoilt(
            Samples.with(Samples.SCENARIO_WITH_POWER, "{ \"power\": \"30 kW\" }", "{ }"),
            ", \"power\": \"90 kW\", \"propellerSpeed\": \"2400 rpm\"",
            "",
            "$.inputs[0].control",
            16,
            "the power moves, but the condition gives none to start from; add \"power\" to it, such as \"0 W\""),
        spoilt(
            Samples.SCENARIO,
            "\"control\": \"stick\"",
            "\"control\": \"power\"",
            "$.inputs[0].control",
            8,
            "the power moves, but the aeroplane has no propellers; add \"propellers\""),
        spoilt(
            Samples.SCENARIO,
            "\"temperatureOffset\": \"0 K\"",
            "\"power\": \"150 kW\"",
            "$.condition.power",
            5,
            "a power is given, but the aeroplane has no propellers; add \"propellers\" to it, or give propellerRollMoment instead"),
        power(
            "\"control\": \"power\"",
            "\"control\": \"throttle\"",
            "$.inputs[0].control",
            16,
            "unknown control \"throttle\"; expected one of \"stick\", \"pedal\", \"power\""));
  }

  /** Faults of the other forms of a set, and of what hangs on one side. */
  static Stream<Spoilt> printedSets() {
    return Stream.of(
        dimensional(
            "\"primed\": true,",
            "",
            "$.derivatives.primed",
            15,
            "the key \"primed\" is missing; a dimensional set must say whether the product of inertia is worked in (true) or not (false)"),
        dimensional(
            "\"primed\": true",
            "\"primed\": \"yes\"",
            "$.derivatives.primed",
            18,
            "found the text \"yes\"; expected true or false, without quotation marks"),
        dimensional(
            "\"primed\": true",
            "\"primed\": null",
            "$.derivatives.primed",
            18,
            "found null; expected true or false, without quotation marks. Where there is nothing to say, leave the key out"),
        dimensional(
            "\"validAt\": { \"pressureAltitude\": \"0 m\", \"density\": \"1.2 kg/m3\", \"trueAirspeed\": \"50 m/s\" },",
            "",
            "$.derivatives.validAt",
            15,
            "the key \"validAt\" is missing; a dimensional set holds at one speed and density, which it must state"),
        dimensional(
            "\"primed\": true",
            "\"values\": { \"Cl_p\": -0.5 }, \"primed\": true",
            "$.derivatives.dimensional",
            19,
            "values and dimensional stand together; expected one of the two forms"),
        spoilt(
            Samples.AEROPLANE,
            "\"values\"",
            "\"primed\": false, \"values\"",
            "$.derivatives.primed",
            9,
            "only a dimensional set is primed or not; leave it out beside \"values\""),
        dimensional(
            "\"-8 1/s\"",
            "-8",
            "$.derivatives.dimensional.L_p",
            21,
            "the number stands bare: \"-8\" has no unit; expected a frequency such as \"-8 Hz\" (Hz, 1/s)"),
        dimensional(
            "\"-16 1/s2\"",
            "\"-16 1/s\"",
            "$.derivatives.dimensional.L_beta",
            21,
            "\"-16 1/s\" is a frequency; expected a frequency squared (1/s2)"),
        dimensional(
            "\"-12 m/s2\"",
            "\"-0.24 1/s\"",
            "$.derivatives.dimensional.Y_beta",
            20,
            "\"-0.24 1/s\" is a frequency; expected an acceleration (m/s2, ft/s2)"),
        dimensional(
            "\"Y_p\"",
            "\"Y_v\": \"-0.24 1/s\", \"Y_p\"",
            "$.derivatives.dimensional.Y_v",
            20,
            "Y_v and Y_beta say the same and stand together; keep one"),
        dimensional(
            "\"L_p\"",
            "\"L_q\"",
            "$.derivatives.dimensional.L_q",
            21,
            "unknown key \"L_q\"; did you mean \"L_p\"? The keys of the dimensional values are Y_beta, Y_p, Y_r, Y_da, Y_dr, L_beta, L_p, L_r, L_da, L_dr, N_beta, N_p, N_r, N_da, N_dr, Y_v, L_v, N_v"),
        dimensional(
            ", \"N_dr\": \"-4.6 1/s2\"",
            "",
            "$.derivatives.dimensional.N_dr",
            19,
            "the key \"N_dr\" is missing; in body axes it turns into others of the set; give it, 0 when there is none"),
        spoilt(
            Samples.with(
                Samples.AEROPLANE_WITH_EVERY_DIMENSIONAL_KEY,
                "\"axes\": \"body\",\n  \"angleOfAttack\": \"6 deg\",",
                "\n"),
            ", \"N_dr\": \"-4.6 1/s2\"",
            "",
            "$.derivatives.dimensional.N_dr",
            19,
            "the key \"N_dr\" is missing; a primed set with a product of inertia needs L and N of the same motion together; give it, 0 when there is none"),
        dimensional(
            "\"mass\": \"1000 kg\",",
            "",
            "$.derivatives.dimensional",
            19,
            "Y_beta is a force by mass; give the mass too"),
        dimensional(
            "\"-8 1/s\"",
            "\"-8e307 1/s\"",
            "$.derivatives.dimensional",
            19,
            "Cl_p comes out too large to be computed with; look for a value or unit that is wrong by orders of magnitude"),
        dimensional(
            "\"6 deg\"",
            "\"90 deg\"",
            "$.angleOfAttack",
            14,
            "\"90 deg\" is out of range; expected inside 90 deg either way"),
        dimensional(
            "\"body\"",
            "\"stability\"",
            "$.angleOfAttack",
            14,
            "the axes are stability axes, which are not turned; write \"axes\": \"body\", or leave the angle of attack out"),
        dimensional(
            "\"20 kg\"",
            "\"0 kg\"",
            "$.lateralImbalance.mass",
            12,
            "\"0 kg\" is out of range; expected a value above 0"),
        dimensional(
            "\"20 kg\"",
            "\"1000.1 kg\"",
            "$.lateralImbalance.mass",
            12,
            "\"1000.1 kg\": not below the mass of the aeroplane, which counts it; expected a part of that"),
        dimensional(
            ", \"arm\": \"-2 m\"",
            "",
            "$.lateralImbalance.arm",
            12,
            "the key \"arm\" is missing; the imbalance must have it"));
  }

  @Test
  void aSetWithoutDerivativesSaysWhatItMayHave() {
    String text = Samples.AEROPLANE.replaceFirst("\"values\": \\{[^}]*\\}", "\"per\": \"radian\"");
    FileFault fault =
        Samples.only(Samples.refusalOfAeroplane(Samples.write(directory, "empty.json", text)));
    assertThat(fault.jsonPath()).isEqualTo("$.derivatives");
    assertThat(fault.message())
        .isEqualTo(
            "there are no derivatives; expected \"values\", or a \"dimensional\" set with"
                + " \"primed\" and \"validAt\"");
  }

  /** Turned axes and primes need the yaw inertia, and a side force the mass. */
  @Test
  void whatTheConversionNeedsOfTheAeroplaneIsAskedFor() {
    String text =
        Samples.with(
            Samples.AEROPLANE_WITH_EVERY_DIMENSIONAL_KEY,
            "\"yaw\": \"2500 kg m2\",\n    \"product\": \"-100 kg m2\"",
            "\"product\": \"0 kg m2\"");
    assertThat(Samples.refusalOfAeroplane(Samples.write(directory, "no-yaw.json", text)).faults())
        .extracting(fault -> fault.jsonPath() + ": " + fault.message())
        .containsExactly(
            "$.angleOfAttack: \"6 deg\": inertias about turned axes need the yaw inertia; give it"
                + " too",
            "$.derivatives.dimensional: N_beta is a moment by yaw inertia; give the yaw inertia"
                + " too");
  }

  @ParameterizedTest
  @MethodSource("printedSets")
  void aFaultOfAPrintedSetIsReportedWhereItStands(Spoilt spoilt) {
    Path file = Samples.write(directory, "aeroplane.json", spoilt.text());
    check(spoilt, file, Samples.refusalOfAeroplane(file));
  }

  static Stream<Spoilt> scenarios() {
    return Stream.of(
        // missing keys
        spoilt(
            Samples.SCENARIO,
            "\"title\": \"Roll entry at cruise\",",
            "",
            "$.title",
            1,
            "the key \"title\" is missing; a scenario must have it"),
        spoilt(
            Samples.SCENARIO,
            "\"slip\": \"free\",",
            "",
            "$.slip",
            1,
            "the key \"slip\" is missing; a scenario must have it"),
        spoilt(
            Samples.SCENARIO,
            "\"pressureAltitude\": \"3000 ft\", ",
            "",
            "$.condition.pressureAltitude",
            5,
            "the key \"pressureAltitude\" is missing; a condition must have it"),
        spoilt(
            Samples.SCENARIO,
            ", \"calibratedAirspeed\": \"120 kt\"",
            "",
            "$.condition",
            5,
            "no speed is given; expected exactly one of trueAirspeed, equivalentAirspeed, calibratedAirspeed"),
        spoilt(
            Samples.SCENARIO,
            "\"step\"",
            "\"doublet\"",
            "$.inputs[0].width",
            8,
            "the key \"width\" is missing; shape \"doublet\" must have it"),
        spoilt(
            Samples.SCENARIO,
            "\"shape\": \"step\", ",
            "",
            "$.inputs[0].shape",
            8,
            "the key \"shape\" is missing; an input must have it"),
        // unknown and duplicate keys
        spoilt(
            Samples.SCENARIO,
            "\"duration\"",
            "\"note\": \"\", \"durations\": 3, \"duration\"",
            "$.durations",
            9,
            "unknown key \"durations\"; did you mean \"duration\"? The keys of a scenario are format, title, aeroplane, condition, slip, duration, variant, start, heldSlip, inputs, measures, note"),
        spoilt(
            Samples.SCENARIO,
            "\"duration\"",
            "\"odd key\": 3, \"duration\"",
            "$[\"odd key\"]",
            9,
            "unknown key \"odd key\". The keys of a scenario are format, title, aeroplane, condition, slip, duration, variant, start, heldSlip, inputs, measures, note"),
        spoilt(
            Samples.SCENARIO,
            "\"size\": 1.0",
            "\"size\": 1.0, \"width\": \"1 s\"",
            "$.inputs[0].width",
            8,
            "unknown key \"width\"; shape \"step\" has none, but shape \"doublet\" has. The keys of shape \"step\" are control, shape, start, size, movement"),
        spoilt(
            Samples.SCENARIO_WITH_EVERY_KEY,
            "\"sideslip\": \"0.05 rad\"",
            "\"sideslip\": \"0.05 rad\", \"yawRate\": \"1 deg/s\"",
            "$.start.yawRate",
            28,
            "unknown key \"yawRate\". The keys of the start are bank, rollRate, sideslip, trim"),
        spoilt(
            Samples.SCENARIO,
            "\"duration\"",
            "\"title\": \"again\", \"duration\"",
            "$.title",
            9,
            "the key \"title\" stands here again; it was on line 3. Keep one of the two"),
        // wrong types
        spoilt(
            Samples.SCENARIO,
            "\"Roll entry at cruise\"",
            "7",
            "$.title",
            3,
            "found the number 7; expected text in double quotation marks"),
        spoilt(
            Samples.SCENARIO,
            "\"free\"",
            "null",
            "$.slip",
            6,
            "found null; expected one of the words \"held\", \"settled\", \"free\". Where there is nothing to say, leave the key out"),
        spoilt(
            Samples.SCENARIO,
            "\"10 s\"",
            "true",
            "$.duration",
            9,
            "found true; expected a quantity with its unit in quotation marks, such as \"1 s\""),
        spoilt(
            Samples.SCENARIO,
            "1.0",
            "\"1.0\"",
            "$.inputs[0].size",
            8,
            "found the text \"1.0\"; expected a plain number such as 0.5, without unit and quotation marks"),
        spoilt(
            Samples.SCENARIO,
            "{ \"bank\": \"0 deg\" }",
            "[]",
            "$.start",
            7,
            "found a list; expected an object in braces { }"),
        spoilt(
            Samples.SCENARIO,
            "[ { \"control\"",
            "[ 7, { \"control\"",
            "$.inputs[0]",
            8,
            "found the number 7; expected an input in braces { }"),
        spoilt(
            Samples.SCENARIO_WITH_EVERY_KEY,
            "[\"50 deg\", \"45 deg\", \"360 deg\"]",
            "{}",
            "$.measures.bankAngles",
            41,
            "found an object; expected a list in brackets [ ]"),
        spoilt(
            Samples.SCENARIO,
            "\"aeroplanes/some-aeroplane.json\"",
            "5",
            "$.aeroplane",
            4,
            "found the number 5; expected the path of an aeroplane file in quotation marks, or the aeroplane itself"),
        spoilt(
            Samples.SCENARIO,
            "\"duration\"",
            "\"note\": 5, \"duration\"",
            "$.note",
            9,
            "found the number 5; expected text in double quotation marks"),
        // units
        spoilt(
            Samples.SCENARIO,
            "\"10 s\"",
            "10",
            "$.duration",
            9,
            "the number stands bare: \"10\" has no unit; expected a time such as \"10 s\" (s, ms, min, h)"),
        spoilt(
            Samples.SCENARIO,
            "\"10 s\"",
            "\"10\"",
            "$.duration",
            9,
            "\"10\" has no unit; expected a time such as \"10 s\" (s, ms, min, h)"),
        spoilt(
            Samples.SCENARIO,
            "\"10 s\"",
            "\"10 m\"",
            "$.duration",
            9,
            "\"10 m\" is a length; expected a time (s, ms, min, h)"),
        spoilt(
            Samples.SCENARIO_WITH_EVERY_KEY,
            "\"50 deg\"",
            "50",
            "$.measures.bankAngles[0]",
            41,
            "the number stands bare: \"50\" has no unit; expected an angle such as \"50 deg\" (deg, rad, mrad, rev)"),
        // ranges
        spoilt(
            Samples.SCENARIO,
            "\"10 s\"",
            "\"3601 s\"",
            "$.duration",
            9,
            "\"3601 s\" is out of range; expected a duration above 0 and at most 3600 s"),
        spoilt(
            Samples.SCENARIO,
            "\"10 s\"",
            "\"0 s\"",
            "$.duration",
            9,
            "\"0 s\" is out of range; expected a duration above 0 and at most 3600 s"),
        spoilt(
            Samples.SCENARIO,
            "1.0",
            "-1.0000001",
            "$.inputs[0].size",
            8,
            "-1.0000001 is out of range; expected from -1 to 1, a fraction of the travel, right positive"),
        spoilt(
            Samples.SCENARIO,
            "\"1 s\"",
            "\"-1 s\"",
            "$.inputs[0].start",
            8,
            "\"-1 s\" is out of range; expected 0 or more"),
        spoilt(
            Samples.SCENARIO,
            "\"0.15 s\"",
            "\"-1 ms\"",
            "$.inputs[0].movement",
            8,
            "\"-1 ms\" is out of range; expected 0 or more"),
        spoilt(
            Samples.SCENARIO,
            "\"step\"",
            "\"hold\", \"duration\": \"0.1 s\"",
            "$.inputs[0].duration",
            8,
            "\"0.1 s\": duration, s, is 0.1; expected at least the movement of the hand, 0.15 s"),
        spoilt(
            Samples.SCENARIO,
            "\"step\"",
            "\"doublet\", \"width\": \"0 s\"",
            "$.inputs[0].width",
            8,
            "\"0 s\" is out of range; expected a value above 0"),
        spoilt(
            Samples.SCENARIO_WITH_EVERY_KEY,
            "0.02",
            "0.6",
            "$.measures.settlingBand",
            41,
            "0.6 is out of range; expected a fraction from 0.001 to 0.5"),
        spoilt(
            Samples.SCENARIO_WITH_EVERY_KEY,
            "\"50 deg\"",
            "\"-50 deg\"",
            "$.measures.bankAngles[0]",
            41,
            "\"-50 deg\" is out of range; expected a change above 0 and at most 3600 deg"),
        spoilt(
            Samples.SCENARIO,
            "\"10 s\"",
            "NaN",
            "$.duration",
            9,
            "NaN is no number in JSON; expected a decimal number"),
        spoilt(
            Samples.SCENARIO,
            "1.0",
            "-Infinity",
            "$.inputs[0].size",
            8,
            "-Infinity is no number in JSON; expected a decimal number"),
        spoilt(
            Samples.SCENARIO,
            "1.0",
            "1e999",
            "$.inputs[0].size",
            8,
            "\"1e999\" is too large to be computed with; expected a plain number such as \"12\""),
        spoilt(
            Samples.SCENARIO,
            "\"10 s\"",
            "\"1e999 s\"",
            "$.duration",
            9,
            "\"1e999 s\" is too large to be computed with; expected a time such as \"12 s\" (s, ms, min, h)"),
        spoilt(
            Samples.SCENARIO,
            "Roll entry at cruise",
            " \\t ",
            "$.title",
            3,
            "the text is blank; expected some words"),
        // shapes of inputs
        ofMultistep(
            "\"unit\": \"0.4 s\", ",
            "",
            "unit",
            "the key \"unit\" is missing; shape \"multistep\" must have it"),
        ofMultistep(
            "0.4 s",
            "50 ms",
            "unit",
            "\"50 ms\": unit, s, is 0.05; expected at least the movement of the hand, 0.1 s"),
        ofMultistep(
            "[2, 1, 1]",
            "[2, 1.5]",
            "pattern[1]",
            "found the number 1.5; expected a whole number from 1 to 1000"),
        ofMultistep(
            "[2, 1, 1]",
            "[0]",
            "pattern[0]",
            "0 is out of range; expected a whole number from 1 to 1000"),
        ofMultistep(
            "[2, 1, 1]",
            "[2, \"1\"]",
            "pattern[1]",
            "found the text \"1\"; expected a plain number such as 0.5, without unit and quotation marks"),
        ofMultistep(
            "[2, 1, 1]",
            "[NaN]",
            "pattern[0]",
            "NaN is no number in JSON; expected a decimal number"),
        ofMultistep(
            "[2, 1, 1]",
            "[]",
            "pattern",
            "the pattern is empty; expected whole numbers such as [3, 2, 1, 1]"),
        ofMultistep(
            "[2, 1, 1]",
            "[" + "1, ".repeat(100) + "1]",
            "pattern",
            "the list has 101 elements; expected at most 100"),
        ofMultistep(
            "[2, 1, 1]",
            "\"3-2-1-1\"",
            "pattern",
            "found the text \"3-2-1-1\"; expected a list in brackets [ ]"),
        ofRamp(
            "\"3 s\"", "\"0 s\"", "duration", "\"0 s\" is out of range; expected a value above 0"),
        ofRamp(
            "\"size\": 0.3",
            "\"size\": 0.3, \"movement\": \"1 s\"",
            "movement",
            "unknown key \"movement\"; shape \"ramp\" has none, but shape \"step\" and shape \"hold\" and shape \"doublet\" and shape \"multistep\" has. The keys of shape \"ramp\" are control, shape, start, size, duration"),
        ofSweep(
            "0.5 Hz",
            "0 Hz",
            "from",
            "\"0 Hz\" is out of range; expected a frequency above 0 and at most 20 Hz"),
        ofSweep(
            "6 rad/s",
            "20.1 Hz",
            "to",
            "\"20.1 Hz\" is out of range; expected a frequency above 0 and at most 20 Hz"),
        ofSweep(
            "6 rad/s",
            "6 rad",
            "to",
            "\"6 rad\" is an angle; expected a frequency (Hz, 1/s) or an angular rate (deg/s, rad/s, rpm, rev/s)"),
        ofSweep(
            "\"0.5 Hz\"",
            "0.5",
            "from",
            "the number stands bare: \"0.5\" has no unit; expected a frequency such as \"0.5 Hz\" (Hz, 1/s)"),
        ofSweep(
            "logarithmic",
            "log",
            "law",
            "unknown law \"log\"; expected one of \"linear\", \"logarithmic\""),
        ofTrace(
            "\"traces/hand.csv\"",
            "\"\"",
            "file",
            "the path is blank; expected one from here to a CSV file"),
        ofTrace(
            "traces/hand.csv",
            "traces/foot.csv",
            "file",
            "the trace file \"traces/foot.csv\" does not exist; check its name and directory. The path counts from the directory of the scenario"),
        ofTrace(
            "traces/hand.csv",
            "traces",
            "file",
            "the trace file \"traces\" is a directory; expected a file. The path counts from the directory of the scenario"),
        ofTrace(
            "\"column\": \"stick\"",
            "\"column\": \"stik\"",
            "column",
            "the trace file has no column \"stik\"; did you mean \"stick\"? Its columns are time, stick, pedal"),
        ofTrace(
            "\"size\": -0.5",
            "\"size\": -1.5",
            "size",
            "-1.5 is out of range; expected from -1 to 1, a fraction of the travel, right positive"),
        ofTrace(
            "\"0.25 s\"",
            "\"0.25 m\"",
            "cutBefore",
            "\"0.25 m\" is a length; expected a time (s, ms, min, h)"),
        ofTrace(
            "\"0.25 s\"",
            "\"1.5 s\"",
            "cutBefore",
            "nothing of the trace is left: it lasts from 0.0 s to 1.5 s, and the cuts leave what is after 1.5 s and before 1.25 s"),
        ofTrace(
            "\"cutBefore\": \"0.25 s\", \"cutAfter\": \"1250 ms\"",
            "\"cutAfter\": \"0 s\"",
            "cutAfter",
            "nothing of the trace is left: it lasts from 0.0 s to 1.5 s, and the cuts leave what is after 0.0 s and before 0.0 s"),
        // held slip
        ofHeldSlip(
            "{ \"time\": \"1 s\" }",
            "[0].sideslip",
            "the key \"sideslip\" is missing; a held slip must have it"),
        ofHeldSlip(
            "{ \"time\": \"-1 s\", \"sideslip\": \"1 deg\" }",
            "[0].time",
            "\"-1 s\" is out of range; expected 0 or more"),
        ofHeldSlip(
            "{ \"time\": \"0 s\", \"sideslip\": \"91 deg\" }",
            "[0].sideslip",
            "\"91 deg\" is out of range; expected at most 90 deg either way"),
        ofHeldSlip(
            "{ \"time\": \"2 s\", \"sideslip\": \"1 deg\" }, { \"time\": \"2 s\", \"sideslip\": \"1 deg\" }",
            "[1].time",
            "the time is not after the one before, 2.0 s; expected increasing times"),
        ofHeldSlip("5", "[0]", "found the number 5; expected a time and a sideslip in braces { }"),
        spoilt(
            Samples.SCENARIO,
            "\"slip\": \"free\"",
            "\"slip\": \"free\", \"heldSlip\": [{ \"time\": \"0 s\", \"sideslip\": \"1 deg\" }]",
            "$.heldSlip",
            6,
            "a sideslip is held against time, but the slip is free; choose held slip, or take heldSlip out"),
        // words
        spoilt(
            Samples.SCENARIO,
            "\"free\"",
            "\"fre\"",
            "$.slip",
            6,
            "unknown slip \"fre\"; expected one of \"held\", \"settled\", \"free\"; did you mean \"free\"?"),
        spoilt(
            Samples.SCENARIO,
            "\"step\"",
            "\"stepp\"",
            "$.inputs[0].shape",
            8,
            "unknown shape \"stepp\"; expected one of \"step\", \"hold\", \"doublet\", \"multistep\", \"ramp\", \"sweep\", \"trace\"; did you mean \"step\"?"),
        spoilt(
            Samples.SCENARIO,
            "\"stick\"",
            "\"yoke\"",
            "$.inputs[0].control",
            8,
            "unknown control \"yoke\"; expected one of \"stick\", \"pedal\", \"power\""),
        spoilt(
            Samples.SCENARIO,
            "{ \"bank\": \"0 deg\" }",
            "{ \"trim\": { \"state\": \"level\" } }",
            "$.start.trim.state",
            7,
            "unknown state \"level\"; expected one of \"wings-level\", \"straight-sideslip\", \"steady-turn\""),
        trim(
            "\"state\": \"steady-turn\"",
            ".bank",
            "the key \"bank\" is missing; a steady turn must have it"),
        trim(
            "\"state\": \"steady-turn\", \"bank\": \"30 deg\", \"sideslip\": \"1 deg\"",
            ".sideslip",
            "a steady turn takes no sideslip; it follows from the ball in the middle"),
        trim(
            "\"state\": \"steady-turn\", \"bank\": \"90 deg\"",
            ".bank",
            "\"90 deg\" is out of range; expected inside 90 deg either way"),
        trim(
            "\"bank\": \"30 deg\"",
            ".bank",
            "wings-level trim has no bank; choose another state, or put it beside \"trim\" as what displaces the trimmed aeroplane"),
        trim(
            "\"state\": \"straight-sideslip\"",
            "",
            "neither sideslip nor bank is given; a straight sideslip takes one of them, the other follows"),
        trim(
            "\"state\": \"straight-sideslip\", \"bank\": \"3 deg\", \"sideslip\": \"1 deg\"",
            "",
            "both sideslip and bank are given; a straight sideslip takes one of them, the other follows"),
        spoilt(
            Samples.with(
                Samples.SCENARIO,
                "\"free\"",
                "\"held\", \"heldSlip\": [{ \"time\": \"0 s\", \"sideslip\": \"2 deg\" }]"),
            "{ \"bank\": \"0 deg\" }",
            "{ \"trim\": { \"state\": \"straight-sideslip\", \"bank\": \"3 deg\" } }",
            "$.heldSlip",
            6,
            "the straight sideslip it starts from is held already; take heldSlip out, or start from another state"),
        new Spoilt(
            Samples.with(
                    Samples.with(Samples.SCENARIO_WITH_EVERY_KEY, "\"mass\": \"1000 kg\",\n", "\n"),
                    "\"wings-level\"",
                    "\"straight-sideslip\", \"sideslip\": \"3 deg\"")
                .replace("\"slip\": \"free\"", "\"slip\": \"held\"")
                .replace("\"sideslip\": \"0.05 rad\",", ""),
            "$.start.trim.state",
            29,
            "a straight sideslip needs mass, which the aeroplane does not give; give it, or choose another state"),
        spoilt(
            Samples.SCENARIO,
            "rolltrace-scenario/1",
            "rolltrace-scenario/2",
            "$.format",
            2,
            "found the text \"rolltrace-scenario/2\"; expected \"rolltrace-scenario/1\""),
        spoilt(
            Samples.SCENARIO,
            "rolltrace-scenario/1",
            "rolltrace-aeroplane/1",
            "$.format",
            2,
            "found the text \"rolltrace-aeroplane/1\"; expected \"rolltrace-scenario/1\". This is an aeroplane, where a scenario is expected"),
        // the air and the speed
        spoilt(
            Samples.SCENARIO,
            "\"3000 ft\"",
            "\"30 km\"",
            "$.condition.pressureAltitude",
            5,
            "\"30 km\": pressure or geopotential altitude, m, is 30000.0; expected a number from -5000.0 to 20000.0"),
        spoilt(
            Samples.SCENARIO,
            "\"0 K\"",
            "\"0 K\", \"density\": \"1 kg/m3\"",
            "$.condition.density",
            5,
            "density and temperatureOffset stand together; keep one, it fixes the other"),
        spoilt(
            Samples.SCENARIO,
            "\"calibratedAirspeed\": \"120 kt\"",
            "\"trueAirspeed\": \"80 kt\", \"calibratedAirspeed\": \"120 kt\"",
            "$.condition.calibratedAirspeed",
            5,
            "trueAirspeed and calibratedAirspeed stand together; expected exactly one speed"),
        spoilt(
            Samples.SCENARIO,
            "\"120 kt\"",
            "\"0 kt\"",
            "$.condition.calibratedAirspeed",
            5,
            "\"0 kt\" is out of range; expected a value above 0"),
        spoilt(
            Samples.SCENARIO,
            "\"0 K\"",
            "\"0 K\", \"flightPathAngle\": \"90 deg\"",
            "$.condition.flightPathAngle",
            5,
            "\"90 deg\" is out of range; expected inside 90 deg either way"),
        spoilt(
            Samples.SCENARIO,
            "\"0 K\"",
            "\"0 K\", \"loadFactor\": \"1 m/s2\"",
            "$.condition.loadFactor",
            5,
            "found the text \"1 m/s2\"; expected a plain number such as 0.5, without unit and quotation marks"),
        // what does not fit together
        spoilt(
            Samples.SCENARIO_WITH_EVERY_KEY,
            "\"slip\": \"free\"",
            "\"slip\": \"settled\"",
            "$.start.sideslip",
            28,
            "a sideslip at the start needs free slip, where it is a state of its own; the slip is settled"),
        spoilt(
            Samples.SCENARIO_WITH_EVERY_KEY,
            "\"mass\": \"1000 kg\",",
            "",
            "$.slip",
            24,
            "free slip needs mass, which the aeroplane does not give; give it, or choose held slip"),
        spoilt(
            Samples.SCENARIO_WITH_EVERY_KEY,
            ", \"yaw\": \"2500 kg m2\"",
            "",
            "$.slip",
            24,
            "free slip needs inertia.yaw, which the aeroplane does not give; give it, or choose held slip"),
        spoilt(
            Samples.SCENARIO_WITH_EVERY_KEY,
            "\"rudder\": { \"left\": \"25 deg\", \"right\": \"20 deg\" },",
            "",
            "$.inputs[2].control",
            34,
            "the pedals move, but the aeroplane does not give the travel of its rudder; add \"rudder\""),
        spoilt(
            Samples.SCENARIO_WITH_EVERY_KEY,
            "\"Cl_p\": -0.5, ",
            "",
            "$.aeroplane",
            5,
            "Cl_p is missing; every roll needs it"),
        // the path of the aeroplane
        spoilt(
            Samples.SCENARIO,
            "aeroplanes/some-aeroplane.json",
            "./scenario.json",
            "$.aeroplane",
            4,
            "\"./scenario.json\" is this scenario itself; expected the path of an aeroplane file"),
        spoilt(
            Samples.SCENARIO,
            "aeroplanes/some-aeroplane.json",
            "aeroplanes",
            "$.aeroplane",
            4,
            "the aeroplane file \"aeroplanes\" is a directory; expected a file. The path counts from the directory of the scenario"),
        spoilt(
            Samples.SCENARIO,
            "aeroplanes/some-aeroplane.json",
            "none.json",
            "$.aeroplane",
            4,
            "the aeroplane file \"none.json\" does not exist; check its name and directory. The path counts from the directory of the scenario"),
        spoilt(
            Samples.SCENARIO,
            "aeroplanes/some-aeroplane.json",
            "/dev/null",
            "$.aeroplane",
            4,
            "the aeroplane file \"/dev/null\" is a device or pipe; expected a file. The path counts from the directory of the scenario"),
        spoilt(
            Samples.SCENARIO,
            "aeroplanes/some-aeroplane.json",
            " ",
            "$.aeroplane",
            4,
            "the path is blank; expected one from here to an aeroplane file"),
        spoilt(
            Samples.SCENARIO,
            "aeroplanes/some-aeroplane.json",
            "a\\u0000b",
            "$.aeroplane",
            4,
            "\"a\\u0000b\" is no path; expected one to an aeroplane file"));
  }

  static Stream<Spoilt> aeroplanes() {
    return Stream.of(
        // keys
        spoilt(
            Samples.AEROPLANE,
            "\"format\": \"rolltrace-aeroplane/1\",",
            "",
            "$.format",
            1,
            "the key \"format\" is missing; an aeroplane must have it"),
        spoilt(
            Samples.AEROPLANE,
            "\"source\": \"where they are from\",",
            "\"source\": \" \",",
            "$.derivatives.source",
            8,
            "the text is blank; expected some words"),
        spoilt(
            Samples.AEROPLANE,
            "\"roll\": \"1048 slug ft2\", ",
            "",
            "$.inertia.roll",
            5,
            "the key \"roll\" is missing; the inertia must have it"),
        spoilt(
            Samples.AEROPLANE,
            ", \"down\": \"20 deg\"",
            "",
            "$.ailerons.down",
            6,
            "the key \"down\" is missing; the ailerons must have it"),
        spoilt(
            Samples.AEROPLANE,
            "\"rudder\"",
            "\"chord\": \"1 m\", \"rudder\"",
            "$.chord",
            7,
            "unknown key \"chord\". The keys of an aeroplane are format, span, wingArea, inertia, derivatives, name, mass, ailerons, rudder, axes, limits, note, angleOfAttack, lateralImbalance, propellers, masses, variants, wing, tailplane, fin, body"),
        spoilt(
            Samples.AEROPLANE,
            "\"Cl_p\"",
            "\"CL_p\"",
            "$.derivatives.values.CL_p",
            9,
            "unknown key \"CL_p\"; did you mean \"Cl_p\"? The keys of the values are CY_beta, CY_p, CY_r, CY_da, CY_dr, Cl_beta, Cl_p, Cl_r, Cl_da, Cl_dr, Cn_beta, Cn_p, Cn_r, Cn_da, Cn_dr"),
        spoilt(
            Samples.AEROPLANE,
            "\"Cl_p\": -0.41",
            "\"Cl_p\": -0.41, \"Cl_p\": -0.41",
            "$.derivatives.values.Cl_p",
            9,
            "the key \"Cl_p\" stands here again; it was on line 9. Keep one of the two"),
        spoilt(
            Samples.AEROPLANE_WITH_EVERY_KEY,
            "\"density\": \"1.1 kg/m3\"",
            "\"density\": \"1.1 kg/m3\", \"propellerRollMoment\": \"1 N m\"",
            "$.derivatives.validAt.propellerRollMoment",
            30,
            "unknown key \"propellerRollMoment\". The keys of the condition of derivatives are pressureAltitude, temperatureOffset, density, trueAirspeed, equivalentAirspeed, calibratedAirspeed, loadFactor, flightPathAngle"),
        // units and types
        spoilt(
            Samples.AEROPLANE,
            "\"33.4 ft\"",
            "33.4",
            "$.span",
            4,
            "the number stands bare: \"33.4\" has no unit; expected a length such as \"33.4 ft\" (m, ft, in, km, cm, ...)"),
        spoilt(
            Samples.AEROPLANE,
            "\"33.4 ft\"",
            "\"33.4 lb\"",
            "$.span",
            4,
            "\"33.4 lb\" is a mass; expected a length (m, ft, in, km, cm, ...)"),
        spoilt(
            Samples.AEROPLANE,
            "\"33.4 ft\"",
            "\"33.4 feet\"",
            "$.span",
            4,
            "\"33.4 feet\" is not a length (m, ft, in, km, cm, ...): unknown unit 'feet'; did you mean 'ft'?"),
        spoilt(
            Samples.AEROPLANE,
            "-0.41",
            "\"-0.41\"",
            "$.derivatives.values.Cl_p",
            9,
            "found the text \"-0.41\"; expected a plain number such as 0.5, without unit and quotation marks"),
        spoilt(
            Samples.AEROPLANE,
            "\"where they are from\"",
            "\"\"",
            "$.derivatives.source",
            8,
            "the text is blank; expected some words"),
        // ranges
        spoilt(
            Samples.AEROPLANE,
            "\"33.4 ft\"",
            "\"-33.4 ft\"",
            "$.span",
            4,
            "\"-33.4 ft\" is out of range; expected a value above 0"),
        spoilt(
            Samples.AEROPLANE,
            "\"1048 slug ft2\"",
            "\"0 slug ft2\"",
            "$.inertia.roll",
            5,
            "\"0 slug ft2\" is out of range; expected a value above 0"),
        spoilt(
            Samples.AEROPLANE_WITH_EVERY_KEY,
            "\"-100 kg m2\"",
            "\"-1600 kg m2\"",
            "$.inertia.product",
            11,
            "\"-1600 kg m2\": product of inertia is -1600.0 kg m2; expected less than the root of roll times yaw inertia, 1581.1388300841897 kg m2, in size: no body has more"),
        spoilt(
            Samples.AEROPLANE_WITH_EVERY_KEY,
            "\"yaw\": \"2500 kg m2\",",
            "",
            "$.inertia.product",
            11,
            "\"-100 kg m2\": product of inertia is -100.0 kg m2 without a yaw inertia; give the yaw inertia too"),
        spoilt(
            Samples.AEROPLANE,
            "\"up\": \"20 deg\"",
            "\"up\": \"0 deg\"",
            "$.ailerons.up",
            6,
            "\"0 deg\" is out of range; expected a travel above 0 and at most 90 deg"),
        spoilt(
            Samples.AEROPLANE,
            "\"down\": \"20 deg\"",
            "\"down\": \"90.1 deg\"",
            "$.ailerons.down",
            6,
            "\"90.1 deg\" is out of range; expected from 0 to 90 deg"),
        spoilt(
            Samples.AEROPLANE,
            "\"left\": \"25 deg\"",
            "\"left\": \"-25 deg\"",
            "$.rudder.left",
            7,
            "\"-25 deg\" is out of range; expected a travel above 0 and at most 90 deg"),
        spoilt(
            Samples.AEROPLANE_WITH_EVERY_KEY,
            "\"1 rad/s\"",
            "\"0 rad/s\"",
            "$.ailerons.rateLimit",
            13,
            "\"0 rad/s\" is out of range; expected a value above 0"),
        spoilt(
            Samples.AEROPLANE_WITH_EVERY_KEY,
            "\"50 ms\"",
            "\"-50 ms\"",
            "$.ailerons.lag",
            13,
            "\"-50 ms\" is out of range; expected 0 or more"),
        spoilt(
            Samples.AEROPLANE_WITH_EVERY_KEY,
            "\"50 ms\"",
            "\"50e-3 ms\"",
            "$.ailerons.lag",
            13,
            "\"50e-3 ms\": lag is 5.0E-5 s; expected 0 for none, or at least 1.0E-4 s"),
        spoilt(
            Samples.AEROPLANE_WITH_EVERY_KEY,
            "2.5,",
            "0,",
            "$.limits.rollingLoadFactor",
            19,
            "0 is out of range; expected a value above 0"),
        spoilt(
            Samples.AEROPLANE,
            "-0.41",
            "-1e400",
            "$.derivatives.values.Cl_p",
            9,
            "\"-1e400\" is too large to be computed with; expected a plain number such as \"12\""),
        spoilt(
            Samples.AEROPLANE,
            "-0.41",
            "1e-400",
            "$.derivatives.values.Cl_p",
            9,
            "\"1e-400\" is too small to be told from 0; expected a plain number such as \"0\""),
        spoilt(
            Samples.AEROPLANE_WITH_EVERY_KEY,
            "\"CY_beta\": -0.01",
            "\"CY_beta\": 1e307",
            "$.derivatives.values.CY_beta",
            36,
            "1.0E307 is too large to be computed with; expected a number below 1e300"),
        // words
        spoilt(
            Samples.AEROPLANE,
            "right-roll-positive",
            "right-positive",
            "$.derivatives.aileronSign",
            8,
            "unknown aileronSign \"right-positive\"; expected one of \"right-roll-positive\", \"left-roll-positive\"; did you mean \"right-roll-positive\"?"),
        spoilt(
            Samples.AEROPLANE_WITH_EVERY_KEY,
            "\"degree\"",
            "\"deg\"",
            "$.derivatives.per",
            26,
            "unknown per \"deg\"; expected one of \"radian\", \"degree\""),
        spoilt(
            Samples.AEROPLANE_WITH_EVERY_KEY,
            "\"total\"",
            "\"sum\"",
            "$.derivatives.aileronAngle",
            27,
            "unknown aileronAngle \"sum\"; expected one of \"mean\", \"total\", \"one-side\""),
        spoilt(
            Samples.AEROPLANE_WITH_EVERY_KEY,
            "\"stability\"",
            "\"body\"",
            "$.angleOfAttack",
            1,
            "the key \"angleOfAttack\" is missing; body axes are turned to stability axes by the angle of attack"),
        spoilt(
            Samples.AEROPLANE_WITH_EVERY_KEY,
            "\"stability\"",
            "\"wind\"",
            "$.axes",
            15,
            "unknown axes \"wind\"; expected one of \"stability\", \"body\""));
  }

  @ParameterizedTest
  @MethodSource({"scenarios", "propellers", "pickedVariants"})
  void aFaultOfAScenarioIsReportedWhereItStands(Spoilt spoilt) {
    Path file = Samples.writeScenario(directory, spoilt.text());
    check(spoilt, file, Samples.refusalOfScenario(file));
  }

  @ParameterizedTest
  @MethodSource("traces")
  void aFaultOfATraceIsReportedWhereItStands(Spoilt spoilt) {
    Path scenario =
        Samples.writeScenario(
            directory,
            // What is cut off may begin before 0 s.
            Samples.with(Samples.SCENARIO_WITH_EVERY_KEY, ", \"cutBefore\": \"0.25 s\"", ""));
    Path file = Samples.write(directory, "traces/hand.csv", spoilt.text());
    check(spoilt, file, Samples.refusalOfScenario(scenario));
    ScenarioDocument document = ScenarioDocument.open(scenario);
    assertThat(document.pathOf(document.check().faults().get(0))).isEqualTo("$.inputs[6].file");
  }

  @Test
  void aTraceMayHaveSoManySamplesAndNoMore() {
    Path scenario = Samples.writeScenario(directory, Samples.SCENARIO_WITH_EVERY_KEY);
    StringBuilder csv = new StringBuilder("time[ms],stick[-]\n");
    for (int i = 0; i < TraceCsv.MOST_ROWS; i++) {
      csv.append(i).append(",0\n");
    }
    Path file = Samples.write(directory, "traces/hand.csv", csv.toString());
    assertThat(ScenarioFile.read(scenario)).isNotNull();
    csv.append("100000,0\n");
    Samples.write(directory, "traces/hand.csv", csv.toString());
    assertThat(Samples.only(Samples.refusalOfScenario(scenario)))
        .hasToString(
            file + ":100002: $: there are more than 100000 samples; shorten or thin the trace");
  }

  @ParameterizedTest
  @MethodSource({"aeroplanes", "shapes"})
  void aFaultOfAnAeroplaneIsReportedWhereItStands(Spoilt spoilt) {
    Path file = Samples.write(directory, "aeroplane.json", spoilt.text());
    check(spoilt, file, Samples.refusalOfAeroplane(file));
  }

  private static void check(Spoilt spoilt, Path file, FileFaultsException refusal) {
    FileFault fault = Samples.only(refusal);
    assertThat(fault.message()).isEqualTo(spoilt.message());
    assertThat(fault.jsonPath()).isEqualTo(spoilt.path());
    assertThat(fault.line()).isEqualTo(spoilt.line());
    assertThat(fault.column()).isPositive();
    assertThat(refusal)
        .hasMessage(file + ":" + spoilt.line() + ": " + spoilt.path() + ": " + spoilt.message());
  }

  @Test
  void aVariantThatIsNoAeroplaneSaysWhichItIs() {
    String text =
        Samples.with(
            Samples.AEROPLANE_WITH_SHAPE,
            "\"given\": { \"masses\": null, \"mass\": \"1000 kg\"",
            "\"given\": { \"masses\": null");
    assertThat(Samples.refusalOfAeroplane(Samples.write(directory, "a.json", text)).faults())
        .extracting(FileFault::jsonPath, fault -> fault.message().split(";")[0])
        .containsExactly(
            tuple("$.inertia", "as variant \"given\", the key \"inertia\" is missing"),
            tuple("$.mass", "as variant \"given\", the key \"mass\" is missing"));
  }

  @Test
  void whatAVariantReplacesIsNotLookedAtWhenAScenarioPicksIt() {
    Path scenario = Samples.writeScenario(directory, Samples.SCENARIO_OF_A_VARIANT);
    Samples.write(
        directory,
        "aeroplanes/shape.json",
        Samples.with(Samples.AEROPLANE_WITH_SHAPE, "\"500 cm\"", "\"500 kg\""));
    assertThat(ScenarioFile.read(scenario).data().aeroplane().span()).isEqualTo(9.8);
  }

  @Test
  void refusalsOfTheAirNameTheKeyThatIsTheCause() {
    String scenario = Samples.SCENARIO;
    assertAt(Samples.with(scenario, "\"0 K\"", "\"288 K\""), "temperatureOffset", "\"288 K\": ");
    assertAt(
        Samples.with(scenario, "\"temperatureOffset\": \"0 K\"", "\"density\": \"1 lb/ft3\""),
        "density",
        "\"1 lb/ft3\": ");
    assertAt(Samples.with(scenario, "120 kt", "700 kt"), "calibratedAirspeed", "\"700 kt\": ");
    assertAt(
        Samples.with(
            scenario, "\"calibratedAirspeed\": \"120 kt\"", "\"trueAirspeed\": \"800 kt\""),
        "trueAirspeed",
        "\"800 kt\": ");
    assertAt(
        Samples.with(
            scenario, "\"calibratedAirspeed\": \"120 kt\"", "\"equivalentAirspeed\": \"800 kt\""),
        "equivalentAirspeed",
        "\"800 kt\": ");
  }

  private void assertAt(String text, String key, String beginning) {
    FileFault fault =
        Samples.only(Samples.refusalOfScenario(Samples.writeScenario(directory, text)));
    assertThat(fault.jsonPath()).isEqualTo("$.condition." + key);
    assertThat(fault.line()).isEqualTo(5);
    assertThat(fault.message()).startsWith(beginning).contains("; expected ");
  }

  @Test
  void allFaultsOfBothFilesAreReportedAtOnceByFileAndLine() {
    Path aeroplane =
        Samples.write(
            directory,
            "bad.json",
            Samples.with(
                Samples.with(Samples.AEROPLANE, "\"33.4 ft\"", "33.4"), "-0.41", "\"-0.41\""));
    String text = Samples.with(Samples.SCENARIO, "aeroplanes/some-aeroplane.json", "bad.json");
    text = Samples.with(text, "\"10 s\"", "\"10 m\"");
    text = Samples.with(text, "\"title\"", "\"titel\"");
    text = Samples.with(text, "1.0", "2.0");
    Path scenario = Samples.writeScenario(directory, text);

    FileFaultsException refusal = Samples.refusalOfScenario(scenario);

    assertThat(refusal.faults())
        .extracting(fault -> fault.file() + ":" + fault.line() + fault.jsonPath())
        .containsExactly(
            scenario + ":1$.title",
            scenario + ":3$.titel",
            scenario + ":8$.inputs[0].size",
            scenario + ":9$.duration",
            aeroplane + ":4$.span",
            aeroplane + ":9$.derivatives.values.Cl_p");
    assertThat(refusal.omitted()).isZero();
    assertThat(refusal.getMessage().lines()).hasSize(6).allMatch(line -> line.contains(".json:"));
  }

  @Test
  void faultsThatDoNotHangTogetherDoNotHideEachOther() {
    // Without a title, and with a spoilt input, the slip still does not fit the aeroplane.
    String text = Samples.with(Samples.SCENARIO_WITH_EVERY_KEY, "\"mass\": \"1000 kg\",", "");
    text = Samples.with(text, "\"title\": \"Every key\",", "");
    text = Samples.with(text, "\"size\": -1 ", "\"size\": -2 ");
    assertThat(Samples.refusalOfScenario(Samples.writeScenario(directory, text)).faults())
        .extracting(FileFault::jsonPath)
        .containsExactly("$.title", "$.slip", "$.inputs[0].size");
  }

  @Test
  void aFileOfAnotherKindIsNotPickedToPieces() {
    Samples.write(directory, "other.json", Samples.SCENARIO);
    String text = Samples.with(Samples.SCENARIO, "aeroplanes/some-aeroplane.json", "other.json");
    FileFault fault =
        Samples.only(Samples.refusalOfScenario(Samples.writeScenario(directory, text)));
    assertThat(fault.file()).isEqualTo(directory.resolve("other.json"));
    assertThat(fault.line()).isEqualTo(2);
    assertThat(fault.message())
        .isEqualTo(
            "found the text \"rolltrace-scenario/1\"; expected \"rolltrace-aeroplane/1\". This is a"
                + " scenario, where an aeroplane is expected");
  }

  @Test
  void aBrokenAeroplaneFileIsReportedInItself() {
    Path aeroplane = Samples.write(directory, "other.json", "{\n  \"format\": oops }");
    String text = Samples.with(Samples.SCENARIO, "aeroplanes/some-aeroplane.json", "other.json");
    FileFault fault =
        Samples.only(Samples.refusalOfScenario(Samples.writeScenario(directory, text)));
    assertThat(fault.file()).isEqualTo(aeroplane);
    assertThat(fault.line()).isEqualTo(2);
    assertThat(fault.column()).isEqualTo(13);
    assertThat(fault.jsonPath()).isEqualTo("$.format");
  }

  @Test
  void longTextsAreRefusedWhereverTheyStand() {
    String longText = "x".repeat(2001);
    String message = "the text has 2001 characters; expected at most 2000";
    for (String part :
        List.of(
            "Roll entry at cruise",
            "rolltrace-scenario/1",
            "aeroplanes/some-aeroplane.json",
            "120 kt",
            "step",
            "stick",
            "0 deg")) {
      String text = Samples.with(Samples.SCENARIO, '"' + part + '"', '"' + longText + '"');
      FileFaultsException refusal =
          Samples.refusalOfScenario(Samples.writeScenario(directory, text));
      assertThat(refusal.faults()).as(part).extracting(FileFault::message).contains(message);
    }
    String fits = Samples.with(Samples.SCENARIO, "Roll entry at cruise", "x".repeat(200));
    assertThat(ScenarioFile.read(Samples.writeScenario(directory, fits)).title()).hasSize(200);
    String titleTooLong = Samples.with(Samples.SCENARIO, "Roll entry at cruise", "x".repeat(201));
    assertThat(
            Samples.only(Samples.refusalOfScenario(Samples.writeScenario(directory, titleTooLong)))
                .message())
        .isEqualTo("the text has 201 characters; expected at most 200");
  }

  @Test
  void noMoreInputsThanAreAccepted() {
    String input =
        "{ \"control\": \"stick\", \"shape\": \"step\", \"start\": \"1 s\", \"size\": 0.001 }";
    String one =
        "{ \"control\": \"stick\", \"shape\": \"step\", \"start\": \"1 s\", \"size\": 1.0,"
            + " \"movement\": \"0.15 s\" }";
    String most = Samples.with(Samples.SCENARIO, one, input + (", " + input).repeat(199));
    assertThat(ScenarioFile.read(Samples.writeScenario(directory, most)).programme().inputs())
        .hasSize(200);
    String more = Samples.with(Samples.SCENARIO, one, input + (", " + input).repeat(200));
    FileFault fault =
        Samples.only(Samples.refusalOfScenario(Samples.writeScenario(directory, more)));
    assertThat(fault.jsonPath()).isEqualTo("$.inputs");
    assertThat(fault.message()).isEqualTo("the list has 201 elements; expected at most 200");
  }

  @Test
  void moreThanTwoHundredFaultsAreCounted() {
    StringBuilder unknown = new StringBuilder();
    for (int i = 0; i < 250; i++) {
      unknown.append("\"unknown").append(i).append("\": ").append(i).append(",\n");
    }
    String text = Samples.with(Samples.SCENARIO, "\"title\"", unknown + "\"title\"");
    FileFaultsException refusal = Samples.refusalOfScenario(Samples.writeScenario(directory, text));
    assertThat(refusal.faults()).hasSize(200);
    assertThat(refusal.omitted()).isEqualTo(50);
    assertThat(refusal.getMessage().lines()).hasSize(201).last().isEqualTo("and 50 more");
  }

  @Test
  void whatIsShownOfAFileIsShortAndVisible() {
    String text =
        Samples.with(
            Samples.SCENARIO, "\"free\"", "\"\\u001b[31m\\u202e\\ud800" + "x".repeat(100) + '"');
    FileFault fault =
        Samples.only(Samples.refusalOfScenario(Samples.writeScenario(directory, text)));
    assertThat(fault.message())
        .startsWith(
            "unknown slip \"\\u001b[31m\\u202e\\ud800" + "x".repeat(33) + "...\"; expected");
  }
}
