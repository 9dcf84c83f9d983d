package org.rolltrace.core.aeroplane;

import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import java.util.OptionalDouble;
import org.rolltrace.core.quantity.Check;

/**
 * An aeroplane without its derivatives.
 *
 * @param name what it is called on screens and in results
 * @param span b, m, above 0
 * @param wingArea S, m², above 0
 * @param mass m, kg, above 0; empty when not known, which leaves only held slip
 * @param inertia moments of inertia
 * @param ailerons aileron travel; empty when not known, which leaves the stick unused
 * @param rudder rudder travel; empty when not known, which leaves the pedals unused
 * @param limits the aeroplane's own limits
 * @param imbalance what hangs on one side only; empty for nothing. The mass counts it, the inertia
 *     does not
 * @param propellers each with a name and a place of its own; none for an aeroplane without, or
 *     whose propellers are not known
 * @param geometry its shape; empty when not known, which leaves only given derivatives
 * @param inertiaBasis where the moments of inertia come from
 */
public record Aeroplane(
    String name,
    double span,
    double wingArea,
    OptionalDouble mass,
    Inertia inertia,
    Optional<Ailerons> ailerons,
    Optional<Rudder> rudder,
    Limits limits,
    Optional<LateralImbalance> imbalance,
    List<Propeller> propellers,
    Optional<Geometry> geometry,
    InertiaBasis inertiaBasis) {

  public Aeroplane {
    propellers = List.copyOf(propellers);
    if (name.isBlank()) {
      throw new IllegalArgumentException("aeroplane name is blank; expected some text");
    }
    Check.positive("span, m,", span);
    Check.positive("wing area, m2,", wingArea);
    if (mass.isPresent()) {
      Check.positive("mass, kg,", mass.getAsDouble());
    }
    for (int i = 0; i < propellers.size(); i++) {
      for (int j = 0; j < i; j++) {
        checkApart(propellers.get(j), propellers.get(i));
      }
    }
  }

  private static void checkApart(Propeller one, Propeller other) {
    if (one.name().equals(other.name())) {
      throw new IllegalArgumentException(
          "two propellers are called " + one.name() + "; expected a name of its own for each");
    }
    if (one.position().equals(other.position())) {
      throw new IllegalArgumentException(
          "the propellers "
              + one.name()
              + " and "
              + other.name()
              + " are at one place; expected a position of its own for each");
    }
  }

  /**
   * The rated power of all propellers together.
   *
   * @return W; 0 without propellers
   */
  public double ratedPower() {
    double sum = 0;
    for (Propeller propeller : propellers) {
      sum += propeller.engine().ratedPower();
    }
    return sum;
  }

  /**
   * The inertia with the lateral imbalance, if there is one: Ixx and Izz grow by m_f y_f².
   *
   * @return the inertia that flies
   */
  public Inertia loadedInertia() {
    if (imbalance.isEmpty()) {
      return inertia;
    }
    double more = imbalance.get().massMoment() * imbalance.get().arm();
    return new Inertia(
        inertia.roll() + more,
        inertia.yaw().isPresent()
            ? OptionalDouble.of(inertia.yaw().getAsDouble() + more)
            : OptionalDouble.empty(),
        inertia.product());
  }

  /**
   * Starts an aeroplane from what every calculation needs.
   *
   * @param name what it is called
   * @param span b, m
   * @param wingArea S, m²
   * @param inertia moments of inertia
   * @return a builder with everything else still missing
   */
  public static Builder builder(String name, double span, double wingArea, Inertia inertia) {
    return new Builder(name, span, wingArea, inertia);
  }

  /** Collects the parts that may be missing. */
  public static final class Builder {
    private final String name;
    private final double span;
    private final double wingArea;
    private final Inertia inertia;
    private OptionalDouble mass = OptionalDouble.empty();
    private Optional<Ailerons> ailerons = Optional.empty();
    private Optional<Rudder> rudder = Optional.empty();
    private Limits limits = Limits.NONE;
    private Optional<LateralImbalance> imbalance = Optional.empty();
    private Optional<Geometry> geometry = Optional.empty();
    private InertiaBasis inertiaBasis = InertiaBasis.GIVEN;
    private final List<Propeller> propellers = new ArrayList<>();

    private Builder(String name, double span, double wingArea, Inertia inertia) {
      this.name = name;
      this.span = span;
      this.wingArea = wingArea;
      this.inertia = inertia;
    }

    /**
     * Sets the mass.
     *
     * @param value m, kg
     * @return this builder
     */
    public Builder mass(double value) {
      mass = OptionalDouble.of(value);
      return this;
    }

    /**
     * Sets the aileron travel.
     *
     * @param value the ailerons
     * @return this builder
     */
    public Builder ailerons(Ailerons value) {
      ailerons = Optional.of(value);
      return this;
    }

    /**
     * Sets the rudder travel.
     *
     * @param value the rudder
     * @return this builder
     */
    public Builder rudder(Rudder value) {
      rudder = Optional.of(value);
      return this;
    }

    /**
     * Sets the aeroplane's own limits.
     *
     * @param value the limits
     * @return this builder
     */
    public Builder limits(Limits value) {
      limits = value;
      return this;
    }

    /**
     * Hangs something on one side.
     *
     * @param value what and where
     * @return this builder
     */
    public Builder imbalance(LateralImbalance value) {
      imbalance = Optional.of(value);
      return this;
    }

    /**
     * Adds a propeller.
     *
     * @param value one more
     * @return this builder
     */
    public Builder propeller(Propeller value) {
      propellers.add(value);
      return this;
    }

    /**
     * Sets the shape.
     *
     * @param value the shape
     * @return this builder
     */
    public Builder geometry(Geometry value) {
      geometry = Optional.of(value);
      return this;
    }

    /**
     * Says where the moments of inertia come from.
     *
     * @param value given unless this is called
     * @return this builder
     */
    public Builder inertiaBasis(InertiaBasis value) {
      inertiaBasis = value;
      return this;
    }

    /**
     * Makes the aeroplane.
     *
     * @return the aeroplane
     * @throws IllegalArgumentException when a value is out of range
     */
    public Aeroplane build() {
      return new Aeroplane(
          name,
          span,
          wingArea,
          mass,
          inertia,
          ailerons,
          rudder,
          limits,
          imbalance,
          propellers,
          geometry,
          inertiaBasis);
    }
  }
}
