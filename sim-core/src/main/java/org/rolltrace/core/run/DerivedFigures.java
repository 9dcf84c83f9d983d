package org.rolltrace.core.run;

import java.util.ArrayList;
import java.util.EnumMap;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import java.util.OptionalDouble;
import org.rolltrace.core.aeroplane.Aeroplane;
import org.rolltrace.core.aeroplane.Ailerons;
import org.rolltrace.core.aeroplane.Inertia;
import org.rolltrace.core.atmosphere.FlightCondition;
import org.rolltrace.core.derivatives.Coefficient;
import org.rolltrace.core.derivatives.GeometryEstimate;
import org.rolltrace.core.derivatives.Origin;
import org.rolltrace.core.motion.LateralModel;
import org.rolltrace.core.motion.LateralModes;
import org.rolltrace.core.motion.Mode;
import org.rolltrace.core.propeller.PropellerMoments;
import org.rolltrace.core.run.DerivedFigure.Kind;
import org.rolltrace.core.scenario.AeroplaneData;

/** Works out the figures that go with a set of derivatives. */
final class DerivedFigures {
  private static final String NO_CONDITION = "no condition is known";

  private final AeroplaneData data;
  private final Map<Kind, DerivedFigure> figures = new EnumMap<>(Kind.class);

  private DerivedFigures(AeroplaneData data) {
    this.data = data;
  }

  static List<DerivedFigure> of(
      AeroplaneData data, Optional<GeometryEstimate> shape, Optional<FlightCondition> condition) {
    DerivedFigures all = new DerivedFigures(data);
    all.addAeroplane();
    all.addWing(shape, condition);
    if (condition.isPresent()) {
      LateralModel model =
          LateralModel.of(
              data.aeroplane(), data.derivatives(), condition.get(), PropellerMoments.NONE);
      all.addRoll(model);
      all.addModes(FreeModes.of(model, data.derivatives()));
    }
    List<DerivedFigure> list = new ArrayList<>();
    for (Kind kind : Kind.values()) {
      list.add(all.figures.getOrDefault(kind, DerivedFigure.missing(kind, NO_CONDITION)));
    }
    return list;
  }

  private void add(Kind kind, double value) {
    figures.put(kind, DerivedFigure.of(kind, value));
  }

  private void add(Kind kind, OptionalDouble value, String otherwise) {
    figures.put(kind, DerivedFigure.of(kind, value, otherwise));
  }

  private void addAeroplane() {
    Aeroplane aeroplane = data.aeroplane();
    Inertia inertia = aeroplane.loadedInertia();
    add(Kind.SPAN, aeroplane.span());
    add(Kind.WING_AREA, aeroplane.wingArea());
    add(Kind.ASPECT_RATIO, aeroplane.span() * aeroplane.span() / aeroplane.wingArea());
    add(Kind.MASS, aeroplane.mass(), "the aeroplane file does not give it");
    add(Kind.ROLL_INERTIA, inertia.roll());
    add(Kind.YAW_INERTIA, inertia.yaw(), "the aeroplane file does not give it");
    add(
        Kind.PRODUCT,
        inertia.yaw().isPresent() ? OptionalDouble.of(inertia.product()) : OptionalDouble.empty(),
        "the aeroplane file gives no inertia in yaw");
  }

  private void addWing(Optional<GeometryEstimate> shape, Optional<FlightCondition> condition) {
    if (condition.isEmpty()) {
      return;
    }
    add(
        Kind.LIFT_COEFFICIENT,
        data.liftCoefficient(condition.get()),
        "it needs the mass, which the aeroplane file does not give");
    String noShape = "it needs the shape of the wing, which the aeroplane file does not give";
    add(Kind.LIFT_SLOPE, of(shape.map(estimate -> estimate.wing().liftSlope())), noShape);
    add(Kind.ANGLE_OF_ATTACK, of(shape.map(estimate -> estimate.wing().angleOfAttack())), noShape);
  }

  private static OptionalDouble of(Optional<Double> value) {
    return value.isPresent() ? OptionalDouble.of(value.get()) : OptionalDouble.empty();
  }

  private void addRoll(LateralModel model) {
    double root = model.rollDampingRoot();
    double damping = data.derivatives().value(Coefficient.CL_P);
    OptionalDouble timeConstant = root < 0 ? OptionalDouble.of(-1 / root) : OptionalDouble.empty();
    boolean unknown = data.derivatives().origin(Coefficient.CL_P) == Origin.ABSENT;
    String undamped =
        unknown ? "Cl_p is neither given nor estimated" : "the roll is not damped: no steady rate";
    add(Kind.ROLL_TIME_CONSTANT, timeConstant, undamped);
    String reason = undamped;
    OptionalDouble helix = OptionalDouble.empty();
    Optional<Ailerons> ailerons = data.aeroplane().ailerons();
    if (ailerons.isEmpty()) {
      reason = "the aeroplane file does not give the travel of the ailerons";
    } else if (data.derivatives().origin(Coefficient.CL_DA) == Origin.ABSENT) {
      reason = "Cl_da is neither given nor estimated";
    } else if (root < 0) {
      helix =
          OptionalDouble.of(
              -data.derivatives().value(Coefficient.CL_DA) * ailerons.get().fullAngle() / damping);
    }
    add(Kind.FULL_HELIX_ANGLE, helix, reason);
    add(
        Kind.FULL_ROLL_RATE,
        helix.isPresent()
            ? OptionalDouble.of(helix.getAsDouble() * 2 * model.speed() / data.aeroplane().span())
            : helix,
        reason);
  }

  private void addModes(FreeModes free) {
    if (free.modes().isEmpty()) {
      for (Kind kind :
          List.of(Kind.SPIRAL_ROOT, Kind.DUTCH_ROLL_FREQUENCY, Kind.DUTCH_ROLL_DAMPING)) {
        figures.put(kind, DerivedFigure.missing(kind, free.remark()));
      }
      return;
    }
    LateralModes modes = free.modes().get();
    add(
        Kind.SPIRAL_ROOT,
        of(modes.spiral().map(Mode.Aperiodic::root)),
        "roll and spiral are coupled into one swinging mode");
    String noSwing = "slip and yaw do not swing";
    add(
        Kind.DUTCH_ROLL_FREQUENCY,
        of(modes.dutchRoll().map(Mode.Oscillatory::naturalFrequency)),
        noSwing);
    add(
        Kind.DUTCH_ROLL_DAMPING,
        of(modes.dutchRoll().map(Mode.Oscillatory::dampingRatio)),
        noSwing);
  }
}
