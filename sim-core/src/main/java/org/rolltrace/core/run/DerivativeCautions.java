package org.rolltrace.core.run;

import java.util.ArrayList;
import java.util.List;
import java.util.Locale;
import java.util.Optional;
import java.util.OptionalDouble;
import java.util.stream.Collectors;
import java.util.stream.Stream;
import org.rolltrace.core.aeroplane.InertiaBasis;
import org.rolltrace.core.atmosphere.FlightCondition;
import org.rolltrace.core.derivatives.Coefficient;
import org.rolltrace.core.derivatives.GeometryEstimate;
import org.rolltrace.core.derivatives.LateralDerivatives;
import org.rolltrace.core.derivatives.Origin;
import org.rolltrace.core.scenario.AeroplaneData;

/**
 * What to beware of in a set of derivatives, before anything is flown with it. The thresholds
 * without a source are common practice.
 */
final class DerivativeCautions {
  private static final double LIFT_COEFFICIENT_AWAY = 0.1;
  private static final double MACH_AWAY = 0.05;

  /** What plain wings carry without flaps, about. */
  private static final double LARGEST_LIFT = 1.4;

  /** Without these a roll is not described, or the sideslip and yaw that go with it. */
  private static final List<Coefficient> NEEDED =
      Stream.concat(Stream.of(Coefficient.CL_P, Coefficient.CL_DA), FreeModes.NEEDED.stream())
          .toList();

  private final AeroplaneData data;
  private final LateralDerivatives derivatives;
  private final List<String> sentences = new ArrayList<>();

  private DerivativeCautions(AeroplaneData data) {
    this.data = data;
    this.derivatives = data.derivatives();
  }

  /** Of a set that is looked at by itself. */
  static List<String> of(
      AeroplaneData data, Optional<FlightCondition> condition, Optional<GeometryEstimate> shape) {
    DerivativeCautions cautions = new DerivativeCautions(data);
    condition.ifPresent(cautions::addCondition);
    cautions.addSigns();
    cautions.sentences.addAll(ofOrigin(data, condition));
    if (shape.isPresent()) {
      cautions.addContradictions();
    }
    return cautions.sentences;
  }

  /** Where the values come from, and whether they hold in a condition. */
  static List<String> ofOrigin(AeroplaneData data, Optional<FlightCondition> condition) {
    DerivativeCautions cautions = new DerivativeCautions(data);
    boolean given = cautions.derivatives.hasGiven();
    if (given && cautions.derivatives.source().isBlank()) {
      cautions.add("the aeroplane file does not say where its derivatives are from");
    }
    cautions.addEstimates();
    if (given && cautions.derivatives.validAt().isEmpty()) {
      cautions.add("the aeroplane file does not say at which condition its derivatives hold");
    } else if (given && condition.isPresent()) {
      cautions.addOffCondition(condition.get(), cautions.derivatives.validAt().get());
    }
    return cautions.sentences;
  }

  private void addEstimates() {
    List<Coefficient> estimated = derivatives.of(Origin.ESTIMATED);
    if (!estimated.isEmpty()) {
      add(
          "estimated from the shape and never checked in flight: %s",
          !derivatives.hasGiven() ? "all derivatives" : symbols(estimated));
    }
    estimated.stream()
        .map(coefficient -> derivatives.estimate(coefficient).orElseThrow().extrapolated())
        .filter(words -> !words.isEmpty())
        .distinct()
        .forEach(words -> add("estimates are extrapolated: %s", words));
    if (data.aeroplane().inertiaBasis() == InertiaBasis.RADII_OF_GYRATION) {
      add("the moments of inertia are estimated by radii of gyration, a fifth either way");
    }
  }

  private static String symbols(List<Coefficient> some) {
    return some.stream().map(Coefficient::symbol).collect(Collectors.joining(", "));
  }

  private void addOffCondition(FlightCondition here, FlightCondition there) {
    boolean weightless = there.loadFactor() == 0;
    double liftRatio =
        here.loadFactor() * there.dynamicPressure() / (there.loadFactor() * here.dynamicPressure());
    if (!weightless && !(Math.abs(liftRatio - 1) <= LIFT_COEFFICIENT_AWAY)) {
      add(
          "derivatives are flown off their condition: the lift coefficient is %.3g times that for"
              + " which they hold",
          liftRatio);
    }
    if (Math.abs(here.mach() - there.mach()) > MACH_AWAY) {
      add(
          "derivatives are flown off their condition: Mach %.2f instead of %.2f",
          here.mach(), there.mach());
    }
  }

  private void addCondition(FlightCondition condition) {
    OptionalDouble lift = data.liftCoefficient(condition);
    if (lift.isPresent() && !(Math.abs(lift.getAsDouble()) <= LARGEST_LIFT)) {
      add(
          "a lift coefficient of %.3g is beyond what a plain wing carries: below the stalling speed,"
              + " nothing here holds",
          lift.getAsDouble());
    }
    if (condition.mach() > GeometryEstimate.LARGEST_MACH) {
      add(
          "Mach %.3f is above 0.7; the model has no compressibility beyond given values",
          condition.mach());
    }
  }

  private void addSigns() {
    if (derivatives.origin(Coefficient.CL_DA) != Origin.ABSENT
        && !(derivatives.value(Coefficient.CL_DA) > 0)) {
      add(
          "right stick does not roll right: Cl_da is %.4g; look at the aileron sign of the set",
          derivatives.value(Coefficient.CL_DA));
    }
    if (derivatives.origin(Coefficient.CL_P) != Origin.ABSENT
        && !(derivatives.value(Coefficient.CL_P) < 0)) {
      add("the roll is not damped: Cl_p is %.4g", derivatives.value(Coefficient.CL_P));
    }
    List<Coefficient> absent = derivatives.absentAmong(NEEDED);
    if (!absent.isEmpty()) {
      add("neither given nor estimated, and taken as 0: %s", symbols(absent));
    }
  }

  private void addContradictions() {
    List<Coefficient> opposite =
        derivatives.of(Origin.SET).stream()
            .filter(
                coefficient ->
                    derivatives.value(coefficient)
                            * derivatives.estimate(coefficient).orElseThrow().value()
                        < 0)
            .toList();
    if (!opposite.isEmpty()) {
      add(
          "given and estimated values have opposite signs, look at the signs of the set: %s",
          symbols(opposite));
    }
  }

  private void add(String pattern, Object... values) {
    sentences.add(String.format(Locale.ROOT, pattern, values));
  }
}
