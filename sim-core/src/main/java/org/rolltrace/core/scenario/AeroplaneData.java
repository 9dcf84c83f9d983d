package org.rolltrace.core.scenario;

import java.util.Optional;
import java.util.OptionalDouble;
import org.rolltrace.core.aeroplane.Aeroplane;
import org.rolltrace.core.atmosphere.FlightCondition;
import org.rolltrace.core.derivatives.GeometryEstimate;
import org.rolltrace.core.derivatives.LateralDerivatives;
import org.rolltrace.core.derivatives.WingEstimate;

/**
 * An aeroplane beside its derivatives, as one aeroplane file holds them.
 *
 * @param aeroplane what it is
 * @param derivatives how it answers; in a scenario with what follows from its shape
 * @param theory the theory by which its wing is estimated
 */
public record AeroplaneData(
    Aeroplane aeroplane, LateralDerivatives derivatives, WingEstimate.Theory theory) {

  /**
   * An aeroplane whose wing, if its shape is known, is estimated in the usual way.
   *
   * @param aeroplane what it is
   * @param derivatives how it answers
   */
  public AeroplaneData(Aeroplane aeroplane, LateralDerivatives derivatives) {
    this(aeroplane, derivatives, WingEstimate.Theory.LIFTING_SURFACE);
  }

  /**
   * The estimates from the shape in a condition.
   *
   * @param condition the condition, whose lift the wing carries
   * @return the estimates; empty when shape or mass are not known
   */
  public Optional<GeometryEstimate> estimate(FlightCondition condition) {
    OptionalDouble lift = liftCoefficient(condition);
    if (lift.isEmpty() || !(condition.mach() < 1)) {
      return Optional.empty();
    }
    return aeroplane
        .geometry()
        .map(
            geometry ->
                GeometryEstimate.of(
                    geometry,
                    aeroplane.ailerons(),
                    aeroplane.rudder(),
                    theory,
                    condition.mach(),
                    lift.getAsDouble()));
  }

  /**
   * The same aeroplane with the estimates from its shape in a condition.
   *
   * @param condition the condition
   * @return this one when its shape is not known
   */
  public AeroplaneData in(FlightCondition condition) {
    return estimate(condition)
        .map(shape -> new AeroplaneData(aeroplane, derivatives.completedBy(shape), theory))
        .orElse(this);
  }

  /**
   * The lift coefficient in a condition.
   *
   * @param condition the condition
   * @return CL = n m g/(q̄ S); empty when the mass is not known
   */
  public OptionalDouble liftCoefficient(FlightCondition condition) {
    if (aeroplane.mass().isEmpty()) {
      return OptionalDouble.empty();
    }
    return OptionalDouble.of(
        condition.loadFactor()
            * aeroplane.mass().getAsDouble()
            * FlightCondition.STANDARD_GRAVITY
            / (condition.dynamicPressure() * aeroplane.wingArea()));
  }
}
