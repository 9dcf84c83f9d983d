package org.rolltrace.core.files;

import java.util.EnumMap;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import org.rolltrace.core.atmosphere.FlightCondition;
import org.rolltrace.core.derivatives.Coefficient;
import org.rolltrace.core.derivatives.LateralDerivatives;
import org.rolltrace.core.derivatives.PrintedConvention;
import org.rolltrace.core.derivatives.PrintedConvention.AileronAngle;
import org.rolltrace.core.derivatives.PrintedConvention.AileronSign;
import org.rolltrace.core.derivatives.PrintedConvention.AngleUnit;

/** The derivatives of an aeroplane file, in the convention that it states. */
final class DerivativesFormat {
  private static final String SOURCE = "source";
  private static final String SIGN = "aileronSign";
  private static final String PER = "per";
  private static final String ANGLE = "aileronAngle";
  private static final String VALID_AT = "validAt";
  private static final String VALUES = "values";

  static final List<String> SIGNS = List.of("right-roll-positive", "left-roll-positive");
  static final List<String> UNITS = List.of("radian", "degree");
  static final List<String> ANGLES = List.of("mean", "total", "one-side");

  static final Keys DERIVATIVES =
      Keys.of("a set of derivatives").required(VALUES).optional(SOURCE, SIGN, PER, ANGLE, VALID_AT);

  static final Keys COEFFICIENTS = Keys.of("the values").optional(symbols());

  private DerivativesFormat() {}

  private static String[] symbols() {
    Coefficient[] all = Coefficient.values();
    String[] symbols = new String[all.length];
    for (int i = 0; i < all.length; i++) {
      symbols[i] = all[i].symbol();
    }
    return symbols;
  }

  static Optional<LateralDerivatives> read(ObjectCursor in) {
    Optional<String> source = in.text(SOURCE, JsonTree.LONGEST_TEXT);
    PrintedConvention convention =
        new PrintedConvention(
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
    Optional<FlightCondition> validAt = Optional.empty();
    Optional<ObjectCursor> condition = in.object(VALID_AT, ConditionFormat.VALID_AT);
    if (condition.isPresent()) {
      validAt = ConditionFormat.read(condition.get());
    }
    Map<Coefficient, Double> values = new EnumMap<>(Coefficient.class);
    Optional<ObjectCursor> printed = in.object(VALUES, COEFFICIENTS);
    if (printed.isPresent()) {
      readValues(printed.get(), convention, values);
    }
    if (!in.isSound()) {
      return Optional.empty();
    }
    LateralDerivatives set = LateralDerivatives.ofGiven(values, source.orElse(""));
    return Optional.of(validAt.isPresent() ? set.validAt(validAt.get()) : set);
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
}
