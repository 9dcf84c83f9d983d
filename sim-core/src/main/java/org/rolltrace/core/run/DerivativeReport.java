package org.rolltrace.core.run;

import java.util.ArrayList;
import java.util.EnumSet;
import java.util.List;
import java.util.Map;
import java.util.OptionalDouble;
import java.util.Set;
import org.rolltrace.core.derivatives.Coefficient;
import org.rolltrace.core.derivatives.EstimateMethod;
import org.rolltrace.core.derivatives.LateralDerivatives;
import org.rolltrace.core.derivatives.Origin;
import org.rolltrace.core.scenario.AeroplaneData;

/**
 * The derivatives of an aeroplane and of its variants in one condition.
 *
 * @param condition in which
 * @param base the aeroplane without any variant
 * @param variants in the order asked for
 */
public record DerivativeReport(
    ChosenCondition condition, DerivedAeroplane base, List<DerivedAeroplane> variants) {

  /**
   * Below this part of itself a difference is rounding on the way through the estimates, not what a
   * variant changes.
   */
  private static final double ROUNDING = 1e-12;

  public DerivativeReport {
    variants = List.copyOf(variants);
  }

  /**
   * Derives all of an aeroplane.
   *
   * @param base the aeroplane
   * @param variants its variants by name, in the order in which they are shown; none or some
   * @param condition in which; the same for all
   * @return the report
   * @throws org.rolltrace.core.motion.CalculationException when something comes out as no finite
   *     number
   */
  public static DerivativeReport of(
      AeroplaneData base, Map<String, AeroplaneData> variants, ChosenCondition condition) {
    List<DerivedAeroplane> derived = new ArrayList<>();
    variants.forEach(
        (name, data) -> derived.add(DerivedAeroplane.of(name, data, condition.condition())));
    return new DerivativeReport(
        condition, DerivedAeroplane.of("", base, condition.condition()), derived);
  }

  /**
   * Base and variants.
   *
   * @return the base first
   */
  public List<DerivedAeroplane> all() {
    List<DerivedAeroplane> all = new ArrayList<>();
    all.add(base);
    all.addAll(variants);
    return all;
  }

  /**
   * The methods by which anything was estimated.
   *
   * @return in the order of the enumeration
   */
  public Set<EstimateMethod> methods() {
    Set<EstimateMethod> methods = EnumSet.noneOf(EstimateMethod.class);
    all().forEach(each -> methods.addAll(each.methods()));
    return methods;
  }

  /**
   * What a variant changes.
   *
   * @param variant one of them
   * @return the figures and derivatives that are not those of the base
   */
  public List<FigureChange> changes(DerivedAeroplane variant) {
    List<FigureChange> changes = new ArrayList<>();
    for (DerivedFigure.Kind kind : DerivedFigure.Kind.values()) {
      addChange(
          changes,
          new FigureChange(
              kind.label(),
              kind.title(),
              kind.unit(),
              base.figure(kind).value(),
              variant.figure(kind).value()));
    }
    for (Coefficient coefficient : Coefficient.values()) {
      addChange(
          changes,
          new FigureChange(
              coefficient.symbol(),
              coefficient.symbol(),
              "1",
              value(base.data().derivatives(), coefficient),
              value(variant.data().derivatives(), coefficient)));
    }
    return changes;
  }

  private static OptionalDouble value(LateralDerivatives derivatives, Coefficient coefficient) {
    return derivatives.origin(coefficient) == Origin.ABSENT
        ? OptionalDouble.empty()
        : OptionalDouble.of(derivatives.value(coefficient));
  }

  private static void addChange(List<FigureChange> changes, FigureChange change) {
    OptionalDouble difference = change.difference();
    boolean same =
        difference.isPresent()
            ? Math.abs(difference.getAsDouble())
                <= ROUNDING
                    * Math.max(
                        Math.abs(change.base().getAsDouble()),
                        Math.abs(change.variant().getAsDouble()))
            : change.base().equals(change.variant());
    if (!same) {
      changes.add(change);
    }
  }

  /**
   * The cautions of all.
   *
   * @return those of the base, then what variants add to them, with their names
   */
  public List<String> cautions() {
    List<String> cautions = new ArrayList<>(base.cautions());
    for (DerivedAeroplane variant : variants) {
      variant.cautions().stream()
          .filter(caution -> !base.cautions().contains(caution))
          .forEach(caution -> cautions.add(variant.label() + ": " + caution));
    }
    return cautions;
  }
}
