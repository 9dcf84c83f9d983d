package org.rolltrace.core.files;

import java.util.List;
import java.util.Map;
import java.util.Optional;
import java.util.OptionalDouble;
import org.rolltrace.core.aeroplane.Aeroplane;
import org.rolltrace.core.aeroplane.AileronPlace;
import org.rolltrace.core.aeroplane.Ailerons;
import org.rolltrace.core.aeroplane.Inertia;
import org.rolltrace.core.aeroplane.LateralImbalance;
import org.rolltrace.core.aeroplane.Limits;
import org.rolltrace.core.aeroplane.Propeller;
import org.rolltrace.core.aeroplane.Rudder;
import org.rolltrace.core.aeroplane.SurfaceDynamics;
import org.rolltrace.core.aeroplane.Wing;
import org.rolltrace.core.derivatives.LateralDerivatives;
import org.rolltrace.core.quantity.Dimension;
import org.rolltrace.core.scenario.AeroplaneData;

/** An aeroplane with its derivatives, in a file of its own or inside a scenario. */
final class AeroplaneFormat {
  static final int LONGEST_NAME = 200;

  private static final String UNNAMED = "Unnamed aeroplane";

  private static final Range TRAVEL =
      Range.aboveZeroTo(Math.PI / 2, "a travel above 0 and at most 90 deg");
  private static final Range TRAVEL_OR_NONE = Range.fromTo(0, Math.PI / 2, "from 0 to 90 deg");

  private static final String SPAN = "span";
  private static final String AREA = "wingArea";
  private static final String DERIVATIVES = "derivatives";
  private static final String AILERONS_KEY = "ailerons";
  private static final String AXES = "axes";
  private static final String ANGLE_OF_ATTACK = "angleOfAttack";
  private static final String IMBALANCE = "lateralImbalance";
  private static final String PROPELLERS = "propellers";
  private static final Range ANGLES =
      Range.fromTo(
          Math.nextUp(-Math.PI / 2), Math.nextDown(Math.PI / 2), "inside 90 deg either way");

  static final List<String> AXES_WORDS = List.of("stability", "body");

  static final Keys IN_FILE = withTheRest(Keys.of("an aeroplane").required(FormatName.KEY));
  static final Keys INLINE = withTheRest(Keys.of("an aeroplane").optional(FormatName.KEY));
  static final Keys INERTIA = Keys.of("the inertia").required("roll").optional("yaw", "product");
  static final Keys AILERONS =
      Keys.of("the ailerons")
          .required("up", "down")
          .optional("rateLimit", "lag", "from", "to", "chordShare");
  static final Keys RUDDER =
      Keys.of("the rudder").required("left", "right").optional("rateLimit", "lag");
  static final Keys LATERAL_IMBALANCE = Keys.of("the imbalance").required("mass", "arm");
  static final Keys LIMITS =
      Keys.of("the limits")
          .optional(
              "manoeuvringSpeed", "neverExceedSpeed", "rollingLoadFactor", "rollRate", "bank");

  /** How far span and area may be from those of the panels. */
  private static final double MISFIT = 1e-3;

  private AeroplaneFormat() {}

  private static Keys withTheRest(Keys format) {
    return format
        .optional(SPAN, AREA, MassFormat.INERTIA, DERIVATIVES)
        .optional("name", "mass", AILERONS_KEY, "rudder", "axes", "limits", "note")
        .optional(ANGLE_OF_ATTACK, IMBALANCE, PROPELLERS, MassFormat.MASSES, Variants.KEY)
        .optional(
            GeometryFormat.WING, GeometryFormat.TAILPLANE, GeometryFormat.FIN, GeometryFormat.BODY);
  }

  /** Reads the aeroplane as its variants take it for their base. */
  static Optional<AeroplaneData> read(JsonValue.ObjectValue object, Keys keys, Faults faults) {
    if (!FormatName.mayBe(FormatName.AEROPLANE, object, faults)) {
      return Optional.empty();
    }
    Variants.check(object, faults);
    return readOne(object, keys, faults, "");
  }

  /** Reads one of its variants, which must be there. */
  static Optional<AeroplaneData> readVariant(
      JsonValue.ObjectValue object, String variant, Keys keys, Faults faults) {
    if (!FormatName.mayBe(FormatName.AEROPLANE, object, faults)) {
      return Optional.empty();
    }
    Variants.check(object, faults);
    Optional<JsonValue.ObjectValue> merged = Variants.of(object, variant);
    return merged.isPresent()
        ? readOne(
            merged.get(),
            keys,
            faults.about("as variant " + Shown.text(variant) + ", "),
            " (" + variant + ")")
        : Optional.empty();
  }

  private static Optional<AeroplaneData> readOne(
      JsonValue.ObjectValue object, Keys keys, Faults faults, String suffix) {
    ObjectCursor in = ObjectCursor.of(object, keys, faults);
    Optional<String> name = in.text("name", LONGEST_NAME);
    GeometryFormat.ReadWing wing = GeometryFormat.wing(in);
    ReadAilerons ailerons = ailerons(in, wing.shape());
    GeometryFormat.Shape shape = GeometryFormat.read(in, wing.shape(), ailerons.place());
    double span = ofWing(in, SPAN, Dimension.LENGTH, wing.shape().map(Wing::span));
    double wingArea = ofWing(in, AREA, Dimension.AREA, wing.shape().map(Wing::area));
    OptionalDouble given = in.optionalQuantity("mass", Dimension.MASS, Range.ABOVE_ZERO);
    MassFormat.Masses masses = MassFormat.read(in, given, inertia(in), span, shape.body());
    OptionalDouble mass = masses.mass();
    if (in.has(GeometryFormat.WING) && !in.has("mass") && !in.has(MassFormat.MASSES)) {
      in.addMissing("mass", "the lift of the wing, on which its derivatives depend, carries it");
    }
    double turn = angleOfAttack(in);
    in.freeText("note", JsonTree.LONGEST_TEXT);
    Optional<Inertia> inertia = masses.inertia();
    Optional<Rudder> rudder = rudder(in);
    Limits limits = limits(in);
    Optional<LateralImbalance> imbalance = imbalance(in, mass);
    List<Propeller> propellers = PropellerFormat.read(in, PROPELLERS);
    boolean described = in.isSound();
    Optional<DerivativesFormat.Body> body =
        described
            ? Optional.of(
                new DerivativesFormat.Body(span, wingArea, mass, inertia.orElseThrow(), turn))
            : Optional.empty();
    Optional<LateralDerivatives> derivatives = derivatives(in, body);
    Optional<Inertia> turned = described ? turned(in, inertia.orElseThrow(), turn) : inertia;
    if (!in.isSound()) {
      return Optional.empty();
    }
    return Optional.of(
        new AeroplaneData(
            new Aeroplane(
                name.orElse(UNNAMED) + suffix,
                span,
                wingArea,
                mass,
                turned.orElseThrow(),
                ailerons.travel(),
                rudder,
                limits,
                imbalance,
                propellers,
                shape.geometry(),
                masses.basis()),
            derivatives.orElseThrow(),
            wing.theory()));
  }

  /** What follows from the wing and may be given as well, but not otherwise. */
  private static double ofWing(
      ObjectCursor in, String key, Dimension dimension, Optional<Double> wing) {
    if (!in.has(key)) {
      if (wing.isEmpty() && !in.has(GeometryFormat.WING)) {
        in.addMissing(key, "an aeroplane must have it, or a \"wing\"");
      }
      return wing.orElse(Double.NaN);
    }
    double given = in.quantity(key, dimension, Range.ABOVE_ZERO);
    if (wing.isPresent()
        && !Double.isNaN(given)
        && !(Math.abs(given - wing.get()) <= MISFIT * wing.get())) {
      in.refuse(
          key,
          "the panels of the wing make it "
              + wing.get()
              + (dimension.equals(Dimension.AREA) ? " m2" : " m")
              + "; expected the same to 0.1 %, or no "
              + Shown.text(key));
    }
    return wing.orElse(given);
  }

  private static Optional<LateralDerivatives> derivatives(
      ObjectCursor in, Optional<DerivativesFormat.Body> body) {
    Optional<ObjectCursor> set = in.object(DERIVATIVES, DerivativesFormat.DERIVATIVES);
    if (set.isPresent()) {
      return DerivativesFormat.read(set.get(), body);
    }
    if (!in.has(DERIVATIVES)) {
      if (in.has(GeometryFormat.WING)) {
        return Optional.of(LateralDerivatives.ofGiven(Map.of(), "")); // all follow from the shape
      }
      in.addMissing(DERIVATIVES, "an aeroplane must have them, or a \"wing\" they follow from");
    }
    return Optional.empty();
  }

  /** The angle by which the axes of the file are turned to stability axes; NaN when refused. */
  private static double angleOfAttack(ObjectCursor in) {
    Optional<String> axes = in.word(AXES, AXES_WORDS);
    double angle = in.quantity(ANGLE_OF_ATTACK, Dimension.ANGLE, ANGLES, 0);
    boolean body = axes.isPresent() && axes.get().equals("body");
    if (body && !in.has(ANGLE_OF_ATTACK)) {
      in.addMissing(
          ANGLE_OF_ATTACK, "body axes are turned to stability axes by the angle of attack");
    }
    if (!body && in.has(ANGLE_OF_ATTACK) && (axes.isPresent() || !in.has(AXES))) {
      in.refuse(
          ANGLE_OF_ATTACK,
          "the axes are stability axes, which are not turned; write \"axes\": \"body\", or leave"
              + " the angle of attack out");
    }
    return body ? angle : 0;
  }

  private static Optional<Inertia> turned(ObjectCursor in, Inertia inertia, double angle) {
    try {
      return Optional.of(inertia.turned(angle));
    } catch (IllegalArgumentException e) {
      in.refuse(ANGLE_OF_ATTACK, e);
      return Optional.empty();
    }
  }

  private static Optional<LateralImbalance> imbalance(
      ObjectCursor aeroplane, OptionalDouble whole) {
    Optional<ObjectCursor> object = aeroplane.object(IMBALANCE, LATERAL_IMBALANCE);
    if (object.isEmpty()) {
      return Optional.empty();
    }
    ObjectCursor in = object.get();
    double mass = in.quantity("mass", Dimension.MASS, Range.ABOVE_ZERO);
    double arm = in.quantity("arm", Dimension.LENGTH, Range.ANY);
    if (whole.isPresent() && mass >= whole.getAsDouble()) {
      in.refuse(
          "mass",
          new IllegalArgumentException(
              "not below the mass of the aeroplane, which counts it; expected a part of that"));
    }
    return in.isSound() ? Optional.of(new LateralImbalance(mass, arm)) : Optional.empty();
  }

  private static Optional<Inertia> inertia(ObjectCursor aeroplane) {
    Optional<ObjectCursor> object = aeroplane.object("inertia", INERTIA);
    if (object.isEmpty()) {
      return Optional.empty();
    }
    ObjectCursor in = object.get();
    double roll = in.quantity("roll", Dimension.INERTIA, Range.ABOVE_ZERO);
    OptionalDouble yaw = in.optionalQuantity("yaw", Dimension.INERTIA, Range.ABOVE_ZERO);
    double product = in.quantity("product", Dimension.INERTIA, Range.ANY, 0);
    boolean usable =
        !Double.isNaN(roll) && !Double.isNaN(product) && in.has("yaw") == yaw.isPresent();
    if (!usable) {
      return Optional.empty();
    }
    try {
      return Optional.of(new Inertia(roll, yaw, product));
    } catch (IllegalArgumentException e) {
      in.refuse("product", e); // each by itself is in range
      return Optional.empty();
    }
  }

  /** The travel of the ailerons, and where on the wing they are. */
  private record ReadAilerons(Optional<Ailerons> travel, Optional<AileronPlace> place) {}

  private static ReadAilerons ailerons(ObjectCursor aeroplane, Optional<Wing> wing) {
    Optional<ObjectCursor> object = aeroplane.object(AILERONS_KEY, AILERONS);
    if (object.isEmpty()) {
      return new ReadAilerons(Optional.empty(), Optional.empty());
    }
    ObjectCursor in = object.get();
    double up = in.quantity("up", Dimension.ANGLE, TRAVEL);
    double down = in.quantity("down", Dimension.ANGLE, TRAVEL_OR_NONE);
    Optional<SurfaceDynamics> dynamics = dynamics(in);
    Optional<AileronPlace> place = GeometryFormat.place(in, aeroplane, wing);
    return new ReadAilerons(
        in.isSound()
            ? Optional.of(new Ailerons(up, down, dynamics.orElseThrow()))
            : Optional.empty(),
        place);
  }

  private static Optional<Rudder> rudder(ObjectCursor aeroplane) {
    Optional<ObjectCursor> object = aeroplane.object("rudder", RUDDER);
    if (object.isEmpty()) {
      return Optional.empty();
    }
    ObjectCursor in = object.get();
    double left = in.quantity("left", Dimension.ANGLE, TRAVEL);
    double right = in.quantity("right", Dimension.ANGLE, TRAVEL);
    Optional<SurfaceDynamics> dynamics = dynamics(in);
    return in.isSound()
        ? Optional.of(new Rudder(left, right, dynamics.orElseThrow()))
        : Optional.empty();
  }

  private static Optional<SurfaceDynamics> dynamics(ObjectCursor in) {
    double rate =
        in.quantity(
            "rateLimit", Dimension.ANGULAR_RATE, Range.ABOVE_ZERO, Double.POSITIVE_INFINITY);
    double lag = in.quantity("lag", Dimension.TIME, Range.ZERO_OR_MORE, 0);
    if (Double.isNaN(rate) || Double.isNaN(lag)) {
      return Optional.empty();
    }
    try {
      return Optional.of(new SurfaceDynamics(rate, lag));
    } catch (IllegalArgumentException e) {
      in.refuse("lag", e); // not 0, and too short
      return Optional.empty();
    }
  }

  private static Limits limits(ObjectCursor aeroplane) {
    Optional<ObjectCursor> object = aeroplane.object("limits", LIMITS);
    if (object.isEmpty()) {
      return Limits.NONE;
    }
    ObjectCursor in = object.get();
    return new Limits(
        in.optionalQuantity("manoeuvringSpeed", Dimension.SPEED, Range.ABOVE_ZERO),
        in.optionalQuantity("neverExceedSpeed", Dimension.SPEED, Range.ABOVE_ZERO),
        in.optionalNumber("rollingLoadFactor", Range.ABOVE_ZERO),
        in.optionalQuantity("rollRate", Dimension.ANGULAR_RATE, Range.ABOVE_ZERO),
        in.optionalQuantity("bank", Dimension.ANGLE, Range.ABOVE_ZERO));
  }
}
