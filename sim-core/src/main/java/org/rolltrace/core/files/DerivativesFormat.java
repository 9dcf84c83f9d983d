package org.rolltrace.core.files;

import java.util.EnumMap;
import java.util.List;
import java.util.Locale;
import java.util.Map;
import java.util.Optional;
import java.util.OptionalDouble;
import java.util.Set;
import org.rolltrace.core.aeroplane.Inertia;
import org.rolltrace.core.atmosphere.FlightCondition;
import org.rolltrace.core.derivatives.Coefficient;
import org.rolltrace.core.derivatives.DimensionalSet;
import org.rolltrace.core.derivatives.LateralDerivatives;
import org.rolltrace.core.derivatives.PrintedConvention;
import org.rolltrace.core.derivatives.PrintedConvention.AileronAngle;
import org.rolltrace.core.derivatives.PrintedConvention.AileronSign;
import org.rolltrace.core.derivatives.PrintedConvention.AngleUnit;
import org.rolltrace.core.derivatives.TurnedAxes;
import org.rolltrace.core.quantity.Dimension;

/** The derivatives of an aeroplane file, in the convention that it states. */
final class DerivativesFormat {
  private static final String SOURCE = "source";
  private static final String SIGN = "aileronSign";
  private static final String PER = "per";
  private static final String ANGLE = "aileronAngle";
  private static final String VALID_AT = "validAt";
  private static final String VALUES = "values";
  private static final String DIMENSIONAL = "dimensional";
  private static final String PRIMED = "primed";

  static final List<String> SIGNS = List.of("right-roll-positive", "left-roll-positive");
  static final List<String> UNITS = List.of("radian", "degree");
  static final List<String> ANGLES = List.of("mean", "total", "one-side");

  static final Keys DERIVATIVES =
      Keys.of("a set of derivatives")
          .optional(VALUES, SOURCE, SIGN, PER, ANGLE, VALID_AT, DIMENSIONAL, PRIMED);

  static final Keys COEFFICIENTS = Keys.of("the values").optional(symbols());

  /** Derivatives by the sideways speed, each instead of one by sideslip. */
  private static final Map<String, Coefficient> BY_SPEED =
      Map.of("Y_v", Coefficient.CY_BETA, "L_v", Coefficient.CL_BETA, "N_v", Coefficient.CN_BETA);

  static final Keys DIMENSIONAL_VALUES =
      Keys.of("the dimensional values")
          .optional(dimensionalSymbols())
          .optional("Y_v", "L_v", "N_v");

  /** What conversion takes from the aeroplane, about the axes of the file. */
  record Body(
      double span, double wingArea, OptionalDouble mass, Inertia inertia, double angleOfAttack) {}

  private DerivativesFormat() {}

  private static String[] symbols() {
    Coefficient[] all = Coefficient.values();
    String[] symbols = new String[all.length];
    for (int i = 0; i < all.length; i++) {
      symbols[i] = all[i].symbol();
    }
    return symbols;
  }

  private static String[] dimensionalSymbols() {
    Coefficient[] all = Coefficient.values();
    String[] symbols = new String[all.length];
    for (int i = 0; i < all.length; i++) {
      symbols[i] = all[i].dimensionalSymbol();
    }
    return symbols;
  }

  /** Reads a set; without the body, because that has faults, only what can be judged alone. */
  static Optional<LateralDerivatives> read(ObjectCursor in, Optional<Body> body) {
    Optional<String> source = in.text(SOURCE, JsonTree.LONGEST_TEXT);
    PrintedConvention convention = convention(in);
    Optional<FlightCondition> validAt = Optional.empty();
    Optional<ObjectCursor> condition = in.object(VALID_AT, ConditionFormat.VALID_AT);
    if (condition.isPresent()) {
      validAt = ConditionFormat.read(condition.get());
    }
    checkForm(in);
    Optional<Boolean> primed = in.flag(PRIMED);
    Map<Coefficient, Double> values = new EnumMap<>(Coefficient.class);
    Optional<ObjectCursor> printed = in.object(VALUES, COEFFICIENTS);
    if (printed.isPresent()) {
      readValues(printed.get(), convention, values);
    }
    Map<Coefficient, Double> dimensional = new EnumMap<>(Coefficient.class);
    Optional<ObjectCursor> sized = in.object(DIMENSIONAL, DIMENSIONAL_VALUES);
    if (sized.isPresent()) {
      readDimensional(sized.get(), convention, validAt, dimensional);
    }
    if (!in.isSound() || body.isEmpty()) {
      return Optional.empty();
    }
    Optional<DimensionalSet> form = Optional.empty();
    if (sized.isPresent()) {
      form =
          Optional.of(
              new DimensionalSet(
                  body.get().span(),
                  body.get().wingArea(),
                  body.get().mass(),
                  body.get().inertia(),
                  validAt.orElseThrow(),
                  primed.orElseThrow()));
    }
    values = converted(in, form, body.get(), sized.isPresent() ? dimensional : values);
    if (!in.isSound()) {
      return Optional.empty();
    }
    LateralDerivatives set =
        LateralDerivatives.ofGiven(values, source.orElse(""))
            .printedAs(words(convention, primed, body.get().angleOfAttack()));
    return Optional.of(validAt.isPresent() ? set.validAt(validAt.get()) : set);
  }

  private static PrintedConvention convention(ObjectCursor in) {
    return new PrintedConvention(
        switch (in.word(SIGN, SIGNS).orElse("")) {
          case "left-roll-positive" -> AileronSign.LEFT_ROLL_POSITIVE;
          default -> AileronSign.RIGHT_ROLL_POSITIVE;
        },
        switch (in.word(PER, UNITS).orElse("")) {
          case "degree" -> AngleUnit.DEGREE;
          default -> AngleUnit.RADIAN;
        },
        switch (in.word(ANGLE, ANGLES).orElse("")) {
          case "total" -> AileronAngle.TOTAL;
          case "one-side" -> AileronAngle.ONE_SIDE;
          default -> AileronAngle.MEAN;
        });
  }

  private static String words(
      PrintedConvention convention, Optional<Boolean> primed, double angleOfAttack) {
    String form =
        primed.isEmpty()
            ? "non-dimensional"
            : primed.get() ? "dimensional, primed" : "dimensional, not primed";
    String axes =
        angleOfAttack == 0
            ? "stability axes"
            : String.format(
                Locale.ROOT,
                "body axes at %.4g deg angle of attack",
                Math.toDegrees(angleOfAttack));
    return form + ", " + convention.words() + "; " + axes;
  }

  /** Either non-dimensional values, or dimensional ones with all that these need. */
  private static void checkForm(ObjectCursor in) {
    if (in.has(VALUES) && in.has(DIMENSIONAL)) {
      in.refuse(
          DIMENSIONAL, "values and dimensional stand together; expected one of the two forms");
    } else if (!in.has(VALUES) && !in.has(DIMENSIONAL)) {
      in.faults()
          .add(
              in.place(),
              "there are no derivatives; expected \"values\", or a \"dimensional\" set with"
                  + " \"primed\" and \"validAt\"");
    } else if (in.has(DIMENSIONAL)) {
      if (!in.has(PRIMED)) {
        in.addMissing(
            PRIMED,
            "a dimensional set must say whether the product of inertia is worked in (true) or not"
                + " (false)");
      }
      if (!in.has(VALID_AT)) {
        in.addMissing(
            VALID_AT, "a dimensional set holds at one speed and density, which it must state");
      }
    } else if (in.has(PRIMED)) {
      in.refuse(PRIMED, "only a dimensional set is primed or not; leave it out beside \"values\"");
    }
  }

  private static void readValues(
      ObjectCursor in, PrintedConvention convention, Map<Coefficient, Double> values) {
    for (Coefficient coefficient : Coefficient.values()) {
      String key = coefficient.symbol();
      double printed = in.number(key, Range.ANY);
      if (Double.isNaN(printed)) {
        continue;
      }
      double value = convention.toModel(coefficient, printed);
      if (Double.isInfinite(value)) {
        in.refuse(
            key, printed + " is too large to be computed with; expected a number below 1e300");
      } else {
        values.put(coefficient, value);
      }
    }
  }

  private static void readDimensional(
      ObjectCursor in,
      PrintedConvention convention,
      Optional<FlightCondition> validAt,
      Map<Coefficient, Double> values) {
    for (Coefficient coefficient : Coefficient.values()) {
      String key = coefficient.dimensionalSymbol();
      double printed = in.quantity(key, dimension(key), Range.ANY);
      if (!Double.isNaN(printed)) {
        values.put(coefficient, convention.toModel(coefficient, printed));
      }
    }
    for (String key : List.of("Y_v", "L_v", "N_v")) {
      Coefficient coefficient = BY_SPEED.get(key);
      double printed = in.quantity(key, dimension(key), Range.ANY);
      if (in.has(key) && in.has(coefficient.dimensionalSymbol())) {
        in.refuse(
            key,
            key
                + " and "
                + coefficient.dimensionalSymbol()
                + " say the same and stand together; keep one");
      } else if (!Double.isNaN(printed) && validAt.isPresent()) {
        values.put(coefficient, printed * validAt.get().trueAirspeed());
      }
    }
  }

  /** The dimension of a force by mass or a moment by inertia, for what it is taken by. */
  private static Dimension dimension(String key) {
    boolean force = key.charAt(0) == 'Y';
    return switch (key.substring(2)) {
      case "v" -> force ? Dimension.FREQUENCY : Dimension.FREQUENCY.per(Dimension.LENGTH);
      case "p", "r" -> force ? Dimension.SPEED : Dimension.FREQUENCY;
      default -> force ? Dimension.ACCELERATION : Dimension.FREQUENCY.power(2);
    };
  }

  /** Non-dimensional values in stability axes. */
  private static Map<Coefficient, Double> converted(
      ObjectCursor in, Optional<DimensionalSet> form, Body body, Map<Coefficient, Double> printed) {
    String where = form.isPresent() ? DIMENSIONAL : VALUES;
    TurnedAxes axes = new TurnedAxes(body.angleOfAttack());
    addMissing(
        in,
        where,
        axes.missingBeside(printed.keySet()),
        "in body axes it turns into others of the set; give it, 0 when there is none");
    if (form.isPresent() && in.isSound()) {
      addMissing(
          in,
          where,
          form.get().missingBeside(printed.keySet()),
          "a primed set with a product of inertia needs L and N of the same motion together; give"
              + " it, 0 when there is none");
    }
    if (!in.isSound()) {
      return printed;
    }
    Map<Coefficient, Double> values = printed;
    if (form.isPresent()) {
      try {
        values = form.get().toCoefficients(values);
      } catch (IllegalArgumentException e) {
        in.refuse(DIMENSIONAL, e.getMessage());
        return printed;
      }
    }
    values = axes.turn(values);
    for (Map.Entry<Coefficient, Double> entry : values.entrySet()) {
      if (!(Math.abs(entry.getValue()) <= Double.MAX_VALUE)) {
        in.refuse(
            where,
            entry.getKey().symbol()
                + " comes out too large to be computed with; look for a value or unit that is"
                + " wrong by orders of magnitude");
        break; // one that is out of range takes others with it
      }
    }
    return values;
  }

  private static void addMissing(
      ObjectCursor in, String where, Set<Coefficient> missing, String why) {
    for (Coefficient coefficient : missing) {
      String key = where.equals(VALUES) ? coefficient.symbol() : coefficient.dimensionalSymbol();
      in.faults()
          .add(in.placeOf(where).within(key), "the key " + Shown.text(key) + " is missing; " + why);
    }
  }
}
