package org.rolltrace.core.files;

import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import java.util.OptionalDouble;
import org.rolltrace.core.aeroplane.AileronPlace;
import org.rolltrace.core.aeroplane.Body;
import org.rolltrace.core.aeroplane.Fin;
import org.rolltrace.core.aeroplane.Geometry;
import org.rolltrace.core.aeroplane.Section;
import org.rolltrace.core.aeroplane.Tailplane;
import org.rolltrace.core.aeroplane.Wing;
import org.rolltrace.core.aeroplane.WingPanel;
import org.rolltrace.core.derivatives.WingEstimate;
import org.rolltrace.core.quantity.Dimension;

/** The shape of an aeroplane. */
final class GeometryFormat {
  static final int MOST_PANELS = 200;

  static final String WING = "wing";
  static final String TAILPLANE = "tailplane";
  static final String FIN = "fin";
  static final String BODY = "body";

  private static final String PANELS = "panels";
  private static final String SECTION = "section";
  private static final String STALL = "stall";
  private static final String FROM = "from";
  private static final String TO = "to";
  private static final String CHORD_SHARE = "chordShare";
  private static final String RUDDER_SHARE = "rudderShare";
  private static final String THEORY = "theory";
  private static final String HEIGHT = "height";
  private static final String WIDTH = "width";
  private static final String SWEEP = "sweep";
  private static final String OUTER_CHORD = "outerChord";
  private static final List<String> PLACE = List.of(FROM, TO, CHORD_SHARE);
  private static final String NOTHING_WITHOUT_WING =
      "it says nothing without the wing; give the wing too, or take it out";

  static final List<String> THEORIES =
      List.of(WingEstimate.Theory.LIFTING_SURFACE.word(), WingEstimate.Theory.LIFTING_LINE.word());

  static final Keys WING_KEYS =
      Keys.of("a wing").required(PANELS).optional(SECTION, "incidence", HEIGHT, THEORY);
  static final Keys PANEL =
      Keys.of("a panel")
          .required(FROM, TO, "innerChord", OUTER_CHORD)
          .optional(SWEEP, "dihedral", "twist", SECTION);
  static final Keys SECTION_KEYS =
      Keys.of("a section").optional("liftSlope", "zeroLift", STALL, "stallFall", "profileDrag");
  static final Keys TAILPLANE_KEYS =
      Keys.of("a tailplane").required("area", "span", "arm").optional(HEIGHT);
  static final Keys FIN_KEYS =
      Keys.of("a fin").required("area", "span", "arm", HEIGHT).optional(SWEEP, RUDDER_SHARE);
  static final Keys BODY_KEYS = Keys.of("a body").required("length", WIDTH, HEIGHT);

  private static final Range SHARE =
      Range.aboveZeroTo(Math.nextDown(1), "a share above 0 and below 1");

  /** Wings with a wider tip than root have been built, but none so wide. */
  private static final double WIDEST_TIP = 2;

  private static final Range STATION = Range.fromTo(0, 1000, "from 0 to 1000 m");
  private static final Range CHORD = Range.fromTo(1e-3, 1000, "a chord from 1 mm to 1000 m");
  private static final Range LEAN = either(60);
  private static final Range TILT = either(15);
  private static final Range FIN_SWEEP = either(70);
  private static final Range SLOPE =
      Range.aboveZeroTo(
          8, "a lift slope above 0 and at most 8 per radian; thin sections have 6.28");
  private static final Range ZERO_LIFT = either(17);
  private static final Range STALLS =
      Range.aboveZeroTo(Math.toRadians(60), "an incidence above 0 and at most 60 deg");

  private GeometryFormat() {}

  private static Range either(int degrees) {
    return Range.fromTo(
        -Math.toRadians(degrees), Math.toRadians(degrees), "up to " + degrees + " deg either way");
  }

  /** What was read of a wing, and the theory by which it is estimated. */
  record ReadWing(Optional<Wing> shape, WingEstimate.Theory theory) {}

  /** The wing, if there is one. */
  static ReadWing wing(ObjectCursor aeroplane) {
    Optional<ObjectCursor> wing = aeroplane.object(WING, WING_KEYS);
    return wing.isPresent()
        ? new ReadWing(shape(wing.get()), theory(wing.get()))
        : new ReadWing(Optional.empty(), WingEstimate.Theory.LIFTING_SURFACE);
  }

  /** What was read of a shape; a body may be known without a wing. */
  record Shape(Optional<Geometry> geometry, Optional<Body> body) {}

  /** The shape about a wing; without one, tail and fin are faults, as they say nothing. */
  static Shape read(ObjectCursor aeroplane, Optional<Wing> wing, Optional<AileronPlace> ailerons) {
    Optional<Tailplane> tailplane = tailplane(aeroplane);
    Optional<Fin> fin = fin(aeroplane);
    Optional<Body> body = body(aeroplane, wing);
    for (String part : List.of(TAILPLANE, FIN)) {
      if (aeroplane.has(part) && !aeroplane.has(WING)) {
        aeroplane.refuse(part, NOTHING_WITHOUT_WING);
      }
    }
    return new Shape(
        aeroplane.isSound()
            ? wing.map(shape -> new Geometry(shape, ailerons, tailplane, fin, body))
            : Optional.empty(),
        body);
  }

  private static WingEstimate.Theory theory(ObjectCursor wing) {
    String word = wing.word(THEORY, THEORIES).orElse("");
    return word.equals(WingEstimate.Theory.LIFTING_LINE.word())
        ? WingEstimate.Theory.LIFTING_LINE
        : WingEstimate.Theory.LIFTING_SURFACE;
  }

  private static Optional<Wing> shape(ObjectCursor in) {
    double incidence = in.quantity("incidence", Dimension.ANGLE, TILT, 0);
    double height = in.quantity(HEIGHT, Dimension.LENGTH, Range.ANY, 0);
    Optional<Section> section = section(in, Section.thin());
    List<WingPanel> panels = new ArrayList<>();
    List<JsonValue> elements = in.list(PANELS, MOST_PANELS);
    if (elements.isEmpty() && in.isSound()) {
      in.refuse(PANELS, "there are no panels; expected at least one, from 0 m to the tip");
    }
    double end = 0;
    ObjectCursor each = in;
    for (JsonValue element : elements) {
      if (!(element instanceof JsonValue.ObjectValue object)) {
        in.addWrongType(element, "a panel in braces { }");
        continue;
      }
      each = ObjectCursor.of(object, PANEL, in.faults());
      Optional<WingPanel> panel = panel(each, section.orElse(Section.thin()));
      if (panel.isPresent()) {
        if (!(Math.abs(panel.get().from() - end) <= Wing.JOINT)) {
          each.refuse(
              FROM,
              panel.get().from() < end
                  ? "this panel overlaps the one before it, which ends at "
                      + end
                      + " m; expected panels that join"
                  : "there is a gap to the panel before it, or to the plane of symmetry, at "
                      + end
                      + " m; expected panels that join, the first from 0 m");
        }
        end = panel.get().to();
        panels.add(panel.get());
      }
    }
    if (in.isSound()) {
      checkTip(each, panels);
    }
    return in.isSound() ? Optional.of(new Wing(panels, incidence, height)) : Optional.empty();
  }

  /** A tip so wide is a slip of the pen. */
  private static void checkTip(ObjectCursor last, List<WingPanel> panels) {
    double tip = panels.get(panels.size() - 1).outerChord();
    double root = panels.get(0).innerChord();
    if (!(tip <= WIDEST_TIP * root)) {
      last.refuse(
          OUTER_CHORD,
          "the tip is "
              + tip
              + " m wide, the root "
              + root
              + " m; expected at most twice the root");
    }
  }

  private static Optional<WingPanel> panel(ObjectCursor in, Section ofWing) {
    double from = in.quantity(FROM, Dimension.LENGTH, STATION);
    double to = in.quantity(TO, Dimension.LENGTH, STATION);
    double innerChord = in.quantity("innerChord", Dimension.LENGTH, CHORD);
    double outerChord = in.quantity(OUTER_CHORD, Dimension.LENGTH, CHORD);
    double sweep = in.quantity(SWEEP, Dimension.ANGLE, LEAN, 0);
    double dihedral = in.quantity("dihedral", Dimension.ANGLE, LEAN, 0);
    double twist = in.quantity("twist", Dimension.ANGLE, TILT, 0);
    Optional<Section> section = section(in, ofWing);
    if (!in.isSound()) {
      return Optional.empty();
    }
    if (!(to > from)) {
      in.refuse(
          TO,
          "the panel begins at "
              + from
              + " m and ends at "
              + to
              + " m; expected an outer end further out");
      return Optional.empty();
    }
    return Optional.of(
        new WingPanel(
            from, to, innerChord, outerChord, sweep, dihedral, twist, section.orElseThrow()));
  }

  private static Optional<Section> section(ObjectCursor owner, Section usual) {
    Optional<ObjectCursor> object = owner.object(SECTION, SECTION_KEYS);
    if (object.isEmpty()) {
      return Optional.of(usual);
    }
    ObjectCursor in = object.get();
    double slope = in.number("liftSlope", SLOPE, usual.liftSlope());
    double zeroLift = in.quantity("zeroLift", Dimension.ANGLE, ZERO_LIFT, usual.zeroLift());
    OptionalDouble stall =
        in.has(STALL) ? in.optionalQuantity(STALL, Dimension.ANGLE, STALLS) : usual.stall();
    double fall = in.number("stallFall", Range.ZERO_OR_MORE, usual.stallFall());
    double drag = in.number("profileDrag", Range.ZERO_OR_MORE, usual.profileDrag());
    if (!in.isSound()) {
      return Optional.empty();
    }
    try {
      return Optional.of(new Section(slope, zeroLift, stall, fall, drag));
    } catch (IllegalArgumentException e) {
      in.refuse(STALL, e); // each by itself is in range
      return Optional.empty();
    }
  }

  /**
   * Where the ailerons are, if that is known.
   *
   * @param in the object of the ailerons
   * @param aeroplane the one they are on
   * @param wing its wing; empty when there is none or it has faults
   */
  static Optional<AileronPlace> place(
      ObjectCursor in, ObjectCursor aeroplane, Optional<Wing> wing) {
    List<String> given = PLACE.stream().filter(in::has).toList();
    if (given.isEmpty()) {
      return Optional.empty();
    }
    if (!aeroplane.has(WING)) {
      in.refuse(given.get(0), NOTHING_WITHOUT_WING);
      return Optional.empty();
    }
    for (String key : PLACE) {
      if (!in.has(key)) {
        in.addMissing(key, "the place of an aileron needs \"from\", \"to\" and \"chordShare\"");
      }
    }
    double from = in.quantity(FROM, Dimension.LENGTH, Range.ZERO_OR_MORE);
    double to = in.quantity(TO, Dimension.LENGTH, Range.ABOVE_ZERO);
    double share = in.number(CHORD_SHARE, SHARE);
    if (Double.isNaN(from) || Double.isNaN(to) || Double.isNaN(share)) {
      return Optional.empty();
    }
    if (!(to > from)) {
      in.refuse(
          TO,
          "the aileron begins at "
              + from
              + " m and ends at "
              + to
              + " m; expected an outer end further out");
      return Optional.empty();
    }
    if (wing.isPresent() && !(to <= wing.get().halfSpan() + Wing.JOINT)) {
      in.refuse(
          TO,
          "the aileron ends at "
              + to
              + " m, beyond the tip of the wing at "
              + wing.get().halfSpan()
              + " m; expected an aileron on the wing");
      return Optional.empty();
    }
    return Optional.of(new AileronPlace(from, to, share));
  }

  private static Optional<Tailplane> tailplane(ObjectCursor aeroplane) {
    Optional<ObjectCursor> object = aeroplane.object(TAILPLANE, TAILPLANE_KEYS);
    if (object.isEmpty()) {
      return Optional.empty();
    }
    ObjectCursor in = object.get();
    double area = in.quantity("area", Dimension.AREA, Range.ABOVE_ZERO);
    double span = in.quantity("span", Dimension.LENGTH, Range.ABOVE_ZERO);
    double arm = in.quantity("arm", Dimension.LENGTH, Range.ABOVE_ZERO);
    double height = in.quantity(HEIGHT, Dimension.LENGTH, Range.ANY, 0);
    return in.isSound() ? Optional.of(new Tailplane(area, span, arm, height)) : Optional.empty();
  }

  private static Optional<Fin> fin(ObjectCursor aeroplane) {
    Optional<ObjectCursor> object = aeroplane.object(FIN, FIN_KEYS);
    if (object.isEmpty()) {
      return Optional.empty();
    }
    ObjectCursor in = object.get();
    double area = in.quantity("area", Dimension.AREA, Range.ABOVE_ZERO);
    double span = in.quantity("span", Dimension.LENGTH, Range.ABOVE_ZERO);
    double arm = in.quantity("arm", Dimension.LENGTH, Range.ABOVE_ZERO);
    double height = in.quantity(HEIGHT, Dimension.LENGTH, Range.ANY);
    double sweep = in.quantity(SWEEP, Dimension.ANGLE, FIN_SWEEP, 0);
    OptionalDouble rudder = in.optionalNumber(RUDDER_SHARE, SHARE);
    return in.isSound()
        ? Optional.of(new Fin(area, span, arm, height, sweep, rudder))
        : Optional.empty();
  }

  private static Optional<Body> body(ObjectCursor aeroplane, Optional<Wing> wing) {
    Optional<ObjectCursor> object = aeroplane.object(BODY, BODY_KEYS);
    if (object.isEmpty()) {
      return Optional.empty();
    }
    ObjectCursor in = object.get();
    double length = in.quantity("length", Dimension.LENGTH, Range.ABOVE_ZERO);
    double width = in.quantity(WIDTH, Dimension.LENGTH, Range.ABOVE_ZERO);
    double height = in.quantity(HEIGHT, Dimension.LENGTH, Range.ABOVE_ZERO);
    if (wing.isPresent() && width >= wing.get().span()) {
      in.refuse(
          WIDTH,
          "the body is "
              + width
              + " m wide, and the wing spans "
              + wing.get().span()
              + " m; expected a wing that sticks out of the body");
    }
    return in.isSound() ? Optional.of(new Body(length, width, height)) : Optional.empty();
  }
}
