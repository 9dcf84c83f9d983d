package org.rolltrace.core.run;

import java.util.ArrayList;
import java.util.EnumMap;
import java.util.EnumSet;
import java.util.List;
import java.util.Map;
import java.util.Objects;
import java.util.Optional;
import java.util.Set;
import java.util.function.Function;
import org.rolltrace.core.aeroplane.Aeroplane;
import org.rolltrace.core.aeroplane.Geometry;
import org.rolltrace.core.atmosphere.FlightCondition;
import org.rolltrace.core.derivatives.Coefficient;
import org.rolltrace.core.derivatives.Estimate;
import org.rolltrace.core.derivatives.EstimateMethod;
import org.rolltrace.core.derivatives.GeometryEstimate;
import org.rolltrace.core.motion.CalculationException;
import org.rolltrace.core.scenario.AeroplaneData;

/**
 * An aeroplane, or one of its variants, with all derivatives and what follows from them.
 *
 * @param variant its name; empty for the base
 * @param data the aeroplane with given and estimated derivatives
 * @param shape the estimates with their loadings; empty when shape or condition are not known
 * @param figures in the order of their kinds, one of each
 * @param cautions sentences that belong beside them
 */
public record DerivedAeroplane(
    String variant,
    AeroplaneData data,
    Optional<GeometryEstimate> shape,
    List<DerivedFigure> figures,
    List<String> cautions) {

  public DerivedAeroplane {
    figures = List.copyOf(figures);
    cautions = List.copyOf(cautions);
  }

  static DerivedAeroplane of(
      String variant, AeroplaneData given, Optional<FlightCondition> condition) {
    Optional<GeometryEstimate> shape = condition.flatMap(given::estimate);
    AeroplaneData data =
        shape
            .map(
                estimates ->
                    new AeroplaneData(
                        given.aeroplane(),
                        given.derivatives().completedBy(estimates),
                        given.theory()))
            .orElse(given);
    for (Coefficient coefficient : Coefficient.values()) {
      checkFinite(coefficient.symbol(), data.derivatives().value(coefficient), given);
      data.derivatives()
          .estimate(coefficient)
          .ifPresent(estimate -> checkFinite(coefficient.symbol(), estimate.value(), given));
    }
    List<DerivedFigure> figures = DerivedFigures.of(data, shape, condition);
    figures.forEach(
        figure ->
            figure.value().ifPresent(value -> checkFinite(figure.kind().title(), value, given)));
    return new DerivedAeroplane(
        variant, data, shape, figures, DerivativeCautions.of(data, condition, shape));
  }

  private static void checkFinite(String what, double value, AeroplaneData data) {
    if (!(Math.abs(value) <= Double.MAX_VALUE)) {
      throw new CalculationException(
          what
              + " of "
              + data.aeroplane().name()
              + " comes out as "
              + value
              + ", which is no finite number; look for a dimension that is far too large or small");
    }
  }

  /**
   * A figure.
   *
   * @param kind which one
   * @return the figure
   */
  public DerivedFigure figure(DerivedFigure.Kind kind) {
    return figures.stream().filter(figure -> figure.kind() == kind).findFirst().orElseThrow();
  }

  /**
   * What it is called beside others.
   *
   * @return the name of the variant, or "base"
   */
  public String label() {
    return variant.isEmpty() ? "base" : variant;
  }

  /**
   * The methods by which anything was estimated.
   *
   * @return in the order of the enumeration
   */
  public Set<EstimateMethod> methods() {
    Set<EstimateMethod> methods = EnumSet.noneOf(EstimateMethod.class);
    for (Coefficient coefficient : Coefficient.values()) {
      data.derivatives().estimate(coefficient).map(Estimate::terms).orElse(List.of()).stream()
          .map(Estimate.Term::method)
          .forEach(methods::add);
    }
    return methods;
  }

  /**
   * The parts in which it differs from another aeroplane.
   *
   * @param other such as its base
   * @return words such as "wing", "propellers"; empty when there is no difference
   */
  public List<String> differsFrom(DerivedAeroplane other) {
    List<String> parts = new ArrayList<>();
    Aeroplane mine = data.aeroplane();
    Aeroplane its = other.data.aeroplane();
    addShape(parts, "wing", geometry -> Optional.of(geometry.wing()), mine, its);
    addShape(parts, "place of the ailerons", Geometry::ailerons, mine, its);
    addShape(parts, "tailplane", Geometry::tailplane, mine, its);
    addShape(parts, "fin", Geometry::fin, mine, its);
    addShape(parts, "body", Geometry::body, mine, its);
    add(parts, "aileron travel", Aeroplane::ailerons, mine, its);
    add(parts, "rudder travel", Aeroplane::rudder, mine, its);
    add(parts, "mass", Aeroplane::mass, mine, its);
    add(parts, "inertia", Aeroplane::inertia, mine, its);
    add(parts, "lateral imbalance", Aeroplane::imbalance, mine, its);
    add(parts, "propellers", Aeroplane::propellers, mine, its);
    add(parts, "limits", Aeroplane::limits, mine, its);
    if (!given().equals(other.given())) {
      parts.add("given derivatives");
    }
    if (data.theory() != other.data.theory()) {
      parts.add("theory of the wing");
    }
    return parts;
  }

  private Map<Coefficient, Double> given() {
    Map<Coefficient, Double> given = new EnumMap<>(Coefficient.class);
    for (Coefficient coefficient : Coefficient.values()) {
      switch (data.derivatives().origin(coefficient)) {
        case GIVEN, SET -> given.put(coefficient, data.derivatives().value(coefficient));
        case ESTIMATED, ABSENT -> {}
      }
    }
    return given;
  }

  private static void add(
      List<String> parts,
      String part,
      Function<Aeroplane, Object> of,
      Aeroplane mine,
      Aeroplane its) {
    if (!Objects.equals(of.apply(mine), of.apply(its))) {
      parts.add(part);
    }
  }

  private static void addShape(
      List<String> parts,
      String part,
      Function<Geometry, Optional<?>> of,
      Aeroplane mine,
      Aeroplane its) {
    add(parts, part, aeroplane -> aeroplane.geometry().flatMap(of), mine, its);
  }
}
