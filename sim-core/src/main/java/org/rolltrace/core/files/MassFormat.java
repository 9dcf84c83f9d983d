package org.rolltrace.core.files;

import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import java.util.OptionalDouble;
import org.rolltrace.core.aeroplane.Body;
import org.rolltrace.core.aeroplane.Inertia;
import org.rolltrace.core.aeroplane.InertiaBasis;
import org.rolltrace.core.aeroplane.MassBreakdown;
import org.rolltrace.core.aeroplane.MassItem;
import org.rolltrace.core.aeroplane.RadiiOfGyration;
import org.rolltrace.core.quantity.Dimension;

/** Mass and inertia: given, summed over parts, or estimated. */
final class MassFormat {
  static final String INERTIA = "inertia";
  static final String MASSES = "masses";
  static final int MOST_ITEMS = 500;

  /** How far the parts may be from a mass that is given beside them. */
  private static final double MISFIT = 0.01;

  static final Keys ITEM =
      Keys.of("a mass")
          .required("name", "mass")
          .optional("x", "y", "z", "length", "width", "height", "pair");

  private MassFormat() {}

  /** What was read. */
  record Masses(OptionalDouble mass, Optional<Inertia> inertia, InertiaBasis basis) {}

  /**
   * Reads mass and inertia.
   *
   * @param given a given inertia; empty when there is none or it has faults
   */
  static Masses read(
      ObjectCursor in,
      OptionalDouble mass,
      Optional<Inertia> given,
      double span,
      Optional<Body> body) {
    Optional<MassBreakdown> parts = breakdown(in);
    OptionalDouble whole = mass;
    if (parts.isPresent() && !in.has("mass")) {
      whole = OptionalDouble.of(parts.get().mass());
    } else if (parts.isPresent()
        && mass.isPresent()
        && !(Math.abs(parts.get().mass() - mass.getAsDouble()) <= MISFIT * mass.getAsDouble())) {
      in.refuse(
          MASSES,
          "together they are "
              + parts.get().mass()
              + " kg, the mass is given as "
              + mass.getAsDouble()
              + " kg; expected the same to 1 %, or no mass");
    }
    if (in.has(INERTIA)) {
      return new Masses(whole, given, InertiaBasis.GIVEN);
    }
    if (in.has(MASSES)) {
      try {
        return new Masses(whole, parts.map(MassBreakdown::inertia), InertiaBasis.MASSES);
      } catch (IllegalArgumentException e) {
        in.refuse(MASSES, "they have no extent: " + e.getMessage());
        return new Masses(whole, Optional.empty(), InertiaBasis.MASSES);
      }
    }
    if (body.isPresent() && whole.isPresent() && span > 0) {
      return new Masses(
          whole,
          Optional.of(RadiiOfGyration.inertia(whole.getAsDouble(), span, body.get().length())),
          InertiaBasis.RADII_OF_GYRATION);
    }
    if (!in.has(GeometryFormat.BODY) || !in.has("mass")) {
      in.addMissing(
          INERTIA,
          "an aeroplane must have it, or \"masses\" at stations; with \"mass\" and \"body\" it can"
              + " be estimated by radii of gyration");
    }
    return new Masses(whole, Optional.empty(), InertiaBasis.GIVEN);
  }

  private static Optional<MassBreakdown> breakdown(ObjectCursor aeroplane) {
    if (!aeroplane.has(MASSES)) {
      return Optional.empty();
    }
    int before = aeroplane.faults().count();
    List<MassItem> items = new ArrayList<>();
    List<JsonValue> elements = aeroplane.list(MASSES, MOST_ITEMS);
    if (elements.isEmpty() && aeroplane.faults().count() == before) {
      aeroplane.refuse(MASSES, "there are no masses; expected at least one, or an inertia");
    }
    for (JsonValue element : elements) {
      if (!(element instanceof JsonValue.ObjectValue object)) {
        aeroplane.addWrongType(element, "a mass in braces { }");
        continue;
      }
      item(ObjectCursor.of(object, ITEM, aeroplane.faults())).ifPresent(items::add);
    }
    if (aeroplane.faults().count() != before) {
      return Optional.empty();
    }
    MassBreakdown parts = new MassBreakdown(items);
    if (!(parts.mass() <= Double.MAX_VALUE)) {
      aeroplane.refuse(MASSES, "together they are too large to be computed with");
      return Optional.empty();
    }
    return Optional.of(parts);
  }

  private static Optional<MassItem> item(ObjectCursor in) {
    Optional<String> name = in.text("name", AeroplaneFormat.LONGEST_NAME);
    double mass = in.quantity("mass", Dimension.MASS, Range.ABOVE_ZERO);
    double x = in.quantity("x", Dimension.LENGTH, Range.ANY, 0);
    double y = in.quantity("y", Dimension.LENGTH, Range.ANY, 0);
    double z = in.quantity("z", Dimension.LENGTH, Range.ANY, 0);
    double length = in.quantity("length", Dimension.LENGTH, Range.ZERO_OR_MORE, 0);
    double width = in.quantity("width", Dimension.LENGTH, Range.ZERO_OR_MORE, 0);
    double height = in.quantity("height", Dimension.LENGTH, Range.ZERO_OR_MORE, 0);
    boolean pair = in.flag("pair").orElse(false);
    return in.isSound()
        ? Optional.of(new MassItem(name.orElseThrow(), mass, x, y, z, length, width, height, pair))
        : Optional.empty();
  }
}
