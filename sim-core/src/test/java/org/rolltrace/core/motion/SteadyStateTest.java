package org.rolltrace.core.motion;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.assertThatExceptionOfType;
import static org.assertj.core.api.Assertions.assertThatIllegalArgumentException;
import static org.assertj.core.api.Assertions.within;

import java.util.EnumMap;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import java.util.OptionalDouble;
import java.util.Random;
import org.hipparchus.linear.MatrixUtils;
import org.hipparchus.linear.RealMatrix;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;
import org.junit.jupiter.params.provider.ValueSource;
import org.rolltrace.core.aeroplane.Aeroplane;
import org.rolltrace.core.aeroplane.Ailerons;
import org.rolltrace.core.aeroplane.Inertia;
import org.rolltrace.core.aeroplane.LateralImbalance;
import org.rolltrace.core.atmosphere.AirspeedKind;
import org.rolltrace.core.atmosphere.FlightCondition;
import org.rolltrace.core.controls.ControlRun;
import org.rolltrace.core.derivatives.Coefficient;
import org.rolltrace.core.derivatives.LateralDerivatives;
import org.rolltrace.core.pilot.HeldSideslip;
import org.rolltrace.core.propeller.PropellerMoments;
import org.rolltrace.core.testing.RandomAeroplane;

/** Trims against closed forms; the relations are those of any steady flight (common practice). */
class SteadyStateTest {
  private static final double GRAVITY = 9.80665;

  /** 22 500 N and 225 000 N m for a coefficient of 1 at 50 m/s and 1.2 kg/m³; b/2V = 0.1 s. */
  private static final FlightCondition LEVEL =
      FlightCondition.ofDensity(0, 1.2, AirspeedKind.TRUE, 50);

  private static final Map<Coefficient, Double> SIMPLE =
      Map.of(
          Coefficient.CY_BETA, -0.5,
          Coefficient.CL_BETA, -0.08,
          Coefficient.CL_P, -0.5,
          Coefficient.CL_R, 0.12,
          Coefficient.CL_DA, 0.16,
          Coefficient.CN_BETA, 0.09,
          Coefficient.CN_R, -0.12,
          Coefficient.CN_DR, -0.06);

  private static LateralModel model(
      Map<Coefficient, Double> values, FlightCondition condition, double propeller) {
    return LateralModel.of(
        Aeroplane.builder("simple", 10, 15, Inertia.of(1000, 2000, 0)).mass(900).build(),
        LateralDerivatives.ofGiven(values, "test"),
        condition,
        new PropellerMoments(propeller));
  }

  private static Trim trim(SteadyState state, SlipTreatment slip, LateralModel model) {
    return Trim.of(state, slip, model, Optional.empty(), Optional.empty());
  }

  /** Without cross terms each equation gives one unknown: β from φ, then δr, then δa. */
  @ParameterizedTest
  @ValueSource(doubles = {-9, -2, 0.5, 6})
  void straightSideslipWorkedByHand(double degrees) {
    double slip = Math.toRadians(degrees);
    LateralModel model = model(SIMPLE, LEVEL, 0);
    Trim trim = trim(SteadyState.straightAtSideslip(slip), SlipTreatment.FREE, model);
    assertThat(trim.rudder()).isCloseTo(0.09 * slip / 0.06, within(1e-14));
    assertThat(trim.aileron()).isCloseTo(0.08 * slip / 0.16, within(1e-14));
    assertThat(Math.sin(trim.bank()))
        .isCloseTo(22_500 * 0.5 * slip / (900 * GRAVITY), within(1e-14));
    assertThat(trim.yawRate()).isZero();
    assertThat(trim.rollRate()).isZero();
    // asked the other way round it is the same state
    Trim other = trim(SteadyState.straightAtBank(trim.bank()), SlipTreatment.SETTLED, model);
    assertThat(other.sideslip()).isCloseTo(slip, within(1e-14));
    assertThat(other.aileron()).isCloseTo(trim.aileron(), within(1e-14));
    assertThat(other.rudder()).isCloseTo(trim.rudder(), within(1e-14));
  }

  /** r = (g/V) sin φ cos γ; with the ball centred and no cross terms β = 0, δr and δa balance r. */
  @ParameterizedTest
  @ValueSource(doubles = {-60, -30, 5, 45})
  void steadyTurnWorkedByHand(double degrees) {
    double bank = Math.toRadians(degrees);
    LateralModel model = model(SIMPLE, LEVEL.inTurn(bank), -90);
    double r = GRAVITY / 50 * Math.sin(bank);
    Trim trim = trim(SteadyState.turn(bank), SlipTreatment.FREE, model);
    assertThat(trim.bank()).isEqualTo(bank);
    assertThat(trim.yawRate()).isCloseTo(r, within(1e-15));
    assertThat(trim.rollRate()).isZero();
    assertThat(trim.sideslip()).isCloseTo(0, within(1e-15));
    assertThat(trim.rudder()).isCloseTo(-0.12 * 0.1 * r / 0.06, within(1e-14));
    double aileron = (-0.12 * 0.1 * r + 90 / 225_000.0) / 0.16;
    assertThat(trim.aileron()).isCloseTo(aileron, within(1e-14));
    // with held slip the pedals are left alone; here they do not roll
    Trim held = trim(SteadyState.turn(bank), SlipTreatment.HELD, model);
    assertThat(held.aileron()).isCloseTo(aileron, within(1e-14));
    assertThat(held.rudder()).isZero();
    assertThat(held.yawRate()).isCloseTo(r, within(1e-15));
  }

  /** n = cos γ / cos φ: lift's upper part carries the weight across the path (common practice). */
  @Test
  void loadFactorOfATurn() {
    assertThat(LEVEL.inTurn(Math.toRadians(60)).loadFactor()).isCloseTo(2, within(1e-14));
    FlightCondition climb = LEVEL.withFlightPathAngle(0.2);
    assertThat(climb.inTurn(-0.5).loadFactor())
        .isCloseTo(Math.cos(0.2) / Math.cos(0.5), within(1e-15));
    assertThat(climb.inTurn(0.5).inTurn(0)).isEqualTo(climb);
    assertThat(LEVEL.withLoadFactor(1.3).inTurn(0.5).loadFactor()).isEqualTo(1.3);
    assertThatIllegalArgumentException()
        .isThrownBy(() -> LEVEL.inTurn(Math.PI / 2))
        .withMessageContaining("bank of a steady turn");
  }

  /**
   * Kinematics of a climbing turn by rotating the axes themselves, without angles of Euler, with
   * the rates of the trim: after any time the climb and the bank are what they were, and the
   * heading has turned by (g/V) tan φ a second (common practice).
   */
  @ParameterizedTest
  @CsvSource({"20, 6", "-35, 10", "50, -8", "-5, -20"})
  void aClimbingTurnKeepsBankAndClimbAndTurnsSteadily(double bankDeg, double climbDeg) {
    double bank = Math.toRadians(bankDeg);
    double climb = Math.toRadians(climbDeg);
    FlightCondition condition = LEVEL.withFlightPathAngle(climb).inTurn(bank);
    Trim trim = trim(SteadyState.turn(bank), SlipTreatment.FREE, model(SIMPLE, condition, 0));
    // weight is balanced across the path in the plane of symmetry by n g, so q V = g (n − cos γ cos
    // φ)
    double q = GRAVITY / 50 * (condition.loadFactor() - Math.cos(climb) * Math.cos(bank));
    RealMatrix attitude =
        turned(0, 0, 0.3).multiply(turned(0, climb, 0)).multiply(turned(bank, 0, 0));
    for (double time : new double[] {0.5, 7, 40}) {
      RealMatrix later =
          attitude.multiply(turned(trim.rollRate() * time, q * time, trim.yawRate() * time));
      // columns: nose, right wing and belly, seen from the ground with z down
      double[] nose = later.getColumn(0);
      assertThat(Math.asin(-nose[2])).isCloseTo(climb, within(1e-12));
      assertThat(Math.atan2(later.getEntry(2, 1), later.getEntry(2, 2)))
          .isCloseTo(bank, within(1e-12));
      double heading = Math.atan2(nose[1], nose[0]) - 0.3;
      double expected = GRAVITY / 50 * Math.tan(bank) * time;
      assertThat(Math.IEEEremainder(heading - expected, 2 * Math.PI)).isCloseTo(0, within(1e-11));
    }
  }

  /** A rotation about one axis by its length: I + sin θ K + (1 − cos θ) K², O. Rodrigues 1840. */
  private static RealMatrix turned(double x, double y, double z) {
    double angle = Math.sqrt(x * x + y * y + z * z);
    RealMatrix k =
        MatrixUtils.createRealMatrix(new double[][] {{0, -z, y}, {z, 0, -x}, {-y, x, 0}})
            .scalarMultiply(1 / angle);
    return MatrixUtils.createRealIdentityMatrix(3)
        .add(k.scalarMultiply(Math.sin(angle)))
        .add(k.multiply(k).scalarMultiply(1 - Math.cos(angle)));
  }

  /** Whatever the aeroplane: nothing changes in the trimmed state, by the equations of motion. */
  @Test
  void nothingChangesInAnyTrimmedState() {
    for (long seed = 0; seed < 60; seed++) {
      Random random = new Random(seed);
      RandomAeroplane any = RandomAeroplane.of(seed);
      double lean = random.nextDouble() - 0.5;
      for (SteadyState state :
          List.of(
              SteadyState.WINGS_LEVEL,
              SteadyState.turn(2 * lean),
              SteadyState.straightAtBank(0.2 * lean),
              SteadyState.straightAtSideslip(0.2 * lean))) {
        FlightCondition condition =
            any.condition()
                .withFlightPathAngle(0.4 * (random.nextDouble() - 0.5))
                .inTurn(state.bankOfTurn());
        if (random.nextInt(3) == 0) {
          condition = condition.withLoadFactor(1.2);
        }
        Aeroplane plane = any.data().aeroplane();
        LateralModel model =
            LateralModel.of(
                new Aeroplane(
                    plane.name(),
                    plane.span(),
                    plane.wingArea(),
                    plane.mass(),
                    plane.inertia(),
                    plane.ailerons(),
                    plane.rudder(),
                    plane.limits(),
                    Optional.of(new LateralImbalance(20, random.nextDouble() * 4 - 2)),
                    List.of(),
                    plane.geometry(),
                    plane.inertiaBasis()),
                any.data().derivatives(),
                condition,
                new PropellerMoments(-300));
        for (SlipTreatment slip : SlipTreatment.values()) {
          Trim trim = trim(state, slip, model);
          assertSteady(
              trim,
              slip == SlipTreatment.HELD
                  ? LateralMotion.holding(model, HeldSideslip.constant(trim.sideslip()))
                  : LateralMotion.of(slip, model),
              seed);
        }
      }
    }
  }

  private static void assertSteady(Trim trim, LateralMotion motion, long seed) {
    double[] state = {trim.bank(), trim.rollRate(), trim.sideslip(), trim.yawRate()};
    double[] rates = new double[motion.dimension()];
    motion.rates(0, state, trim.aileron(), trim.rudder(), rates);
    // accelerations that would move a wing by a second of arc in an hour
    assertThat(rates)
        .as("seed %s, %s", seed, trim)
        .containsExactly(new double[rates.length], within(1e-11));
    assertThat(motion.yawRate(0, state, trim.aileron(), trim.rudder()))
        .isCloseTo(trim.yawRate(), within(1e-11));
    assertThat(motion.sideslip(0, state, trim.aileron(), trim.rudder()))
        .isCloseTo(trim.sideslip(), within(1e-11));
  }

  /** 20 kg at 1.5 m: L = n g · 30 kg m, so δa = −L/(q̄ S b Cl_δa); Ixx and Izz + 45 kg m². */
  @ParameterizedTest
  @ValueSource(doubles = {1, 2.5, -1})
  void lateralImbalanceWorkedByHand(double loadFactor) {
    Aeroplane aeroplane =
        Aeroplane.builder("one tank full", 10, 15, Inertia.of(1000, 2000, 50))
            .mass(900)
            .imbalance(new LateralImbalance(20, 1.5))
            .build();
    LateralModel model =
        LateralModel.of(
            aeroplane,
            LateralDerivatives.ofGiven(SIMPLE, "test"),
            LEVEL.withLoadFactor(loadFactor),
            new PropellerMoments(-90));
    assertThat(model.inertia()).isEqualTo(Inertia.of(1045, 2045, 50));
    double moment = loadFactor * GRAVITY * 30 - 90;
    Trim trim = trim(SteadyState.WINGS_LEVEL, SlipTreatment.HELD, model);
    assertThat(trim.aileron()).isCloseTo(-moment / (225_000 * 0.16), within(1e-15));
    assertThat(
            Aeroplane.builder("a", 10, 15, Inertia.ofRoll(1000))
                .imbalance(new LateralImbalance(20, -1.5))
                .build()
                .loadedInertia())
        .isEqualTo(Inertia.ofRoll(1045));
  }

  @Test
  void aSideslipThatTheWeightCannotBalanceSaysSo() {
    // sin φ = 22 500 · 0.5 · β/(900 g) passes 1 at 45 deg of sideslip
    assertThatExceptionOfType(CalculationException.class)
        .isThrownBy(
            () ->
                trim(
                    SteadyState.straightAtSideslip(Math.toRadians(60)),
                    SlipTreatment.FREE,
                    model(SIMPLE, LEVEL, 0)))
        .withMessageStartingWith("straight-sideslip trim has no answer: at 60.00 deg of sideslip")
        .withMessageContaining("1.33 times")
        .withMessageEndingWith("ask for less sideslip");
  }

  @Test
  void singularTrimsSayWhy() {
    Map<Coefficient, Double> values = new EnumMap<>(SIMPLE);
    values.remove(Coefficient.CN_DR);
    LateralModel noRudder = model(values, LEVEL, 0);
    assertThatExceptionOfType(CalculationException.class)
        .isThrownBy(() -> trim(SteadyState.straightAtSideslip(0.1), SlipTreatment.FREE, noRudder))
        .withMessageStartingWith("straight-sideslip trim has no single answer")
        .withMessageContaining("Cn_dr");
    assertThatExceptionOfType(CalculationException.class)
        .isThrownBy(() -> trim(SteadyState.turn(0.5), SlipTreatment.SETTLED, noRudder))
        .withMessageStartingWith("steady-turn trim has no single answer");
    values.remove(Coefficient.CL_DA);
    assertThatExceptionOfType(CalculationException.class)
        .isThrownBy(() -> trim(SteadyState.turn(0.5), SlipTreatment.HELD, model(values, LEVEL, 0)))
        .withMessageStartingWith("steady-turn trim has no answer: a rolling moment of");
    values.remove(Coefficient.CY_BETA);
    assertThatExceptionOfType(CalculationException.class)
        .isThrownBy(
            () ->
                trim(SteadyState.straightAtBank(0.1), SlipTreatment.HELD, model(values, LEVEL, 0)))
        .withMessageStartingWith("straight-sideslip trim has no answer: at 5.730 deg of bank")
        .withMessageContaining("CY_beta");
    LateralModel weightless =
        LateralModel.of(
            Aeroplane.builder("no mass", 10, 15, Inertia.ofRoll(1000)).build(),
            LateralDerivatives.ofGiven(SIMPLE, "test"),
            LEVEL,
            PropellerMoments.NONE);
    assertThatIllegalArgumentException()
        .isThrownBy(() -> trim(SteadyState.straightAtSideslip(0), SlipTreatment.HELD, weightless))
        .withMessageStartingWith("a sideslip needs the mass");
  }

  /**
   * Held slip in a straight sideslip: no turn, so the weight balances the side force of the slip,
   * sin φ = −q̄ S CY_β β/(m g cos γ), and the ailerons its dihedral effect. The rudder, which is
   * left alone, adds neither.
   */
  @ParameterizedTest
  @CsvSource({"-9, 0", "-2, 10", "0.5, 0", "6, -8"})
  void heldStraightSideslipWorkedByHand(double degrees, double climbDeg) {
    double slip = Math.toRadians(degrees);
    double climb = Math.toRadians(climbDeg);
    Map<Coefficient, Double> values = new EnumMap<>(SIMPLE);
    values.put(Coefficient.CY_DR, 0.2);
    values.put(Coefficient.CL_DR, 0.02);
    LateralModel model = model(values, LEVEL.withFlightPathAngle(climb), -90);
    Trim trim = trim(SteadyState.straightAtSideslip(slip), SlipTreatment.HELD, model);
    double bank = Math.asin(22_500 * 0.5 * slip / (900 * GRAVITY * Math.cos(climb)));
    assertThat(trim.bank()).isCloseTo(bank, within(1e-14));
    // the bank stays while the path climbs: p = −q sin φ tan γ, q = (g/V) cos γ (1 − cos φ)
    double rollRate = -GRAVITY / 50 * (1 - Math.cos(bank)) * Math.sin(bank) * Math.sin(climb);
    assertThat(trim.rollRate()).isCloseTo(rollRate, within(1e-15));
    assertThat(trim.aileron())
        .isCloseTo((0.08 * slip + 0.5 * 0.1 * rollRate + 90 / 225_000.0) / 0.16, within(1e-14));
    assertThat(trim.rudder()).isZero();
    assertThat(trim.yawRate()).isZero();
    Trim other = trim(SteadyState.straightAtBank(trim.bank()), SlipTreatment.HELD, model);
    assertThat(other.sideslip()).isCloseTo(slip, within(1e-14));
    assertThat(other.aileron()).isCloseTo(trim.aileron(), within(1e-14));
  }

  /** δa = 0.08 β/0.16 = 5 deg at β = 10 deg, of 4 deg: 125 %. */
  @Test
  void sideslipBeyondAStopIsAnAnswer() {
    Trim trim =
        Trim.of(
            SteadyState.straightAtSideslip(Math.toRadians(10)),
            SlipTreatment.FREE,
            model(SIMPLE, LEVEL, 0),
            Optional.of(ControlRun.of(Ailerons.of(Math.toRadians(4.001), Math.toRadians(4.001)))),
            Optional.empty());
    assertThat(trim.shortfalls()).containsExactly("not enough aileron: 125 % needed");
  }

  @Test
  void statesRefuseWhatDoesNotBelongToThem() {
    OptionalDouble none = OptionalDouble.empty();
    OptionalDouble some = OptionalDouble.of(0.1);
    assertThatIllegalArgumentException()
        .isThrownBy(() -> new SteadyState(SteadyState.Kind.WINGS_LEVEL, some, none))
        .withMessageContaining("neither bank nor sideslip");
    assertThatIllegalArgumentException()
        .isThrownBy(() -> new SteadyState(SteadyState.Kind.STRAIGHT_SIDESLIP, some, some))
        .withMessageContaining("either a sideslip or a bank");
    assertThatIllegalArgumentException()
        .isThrownBy(() -> new SteadyState(SteadyState.Kind.STEADY_TURN, none, none))
        .withMessageContaining("takes a bank");
    assertThatIllegalArgumentException()
        .isThrownBy(() -> SteadyState.turn(Math.PI / 2))
        .withMessageContaining("bank, rad, is");
    assertThatIllegalArgumentException()
        .isThrownBy(() -> SteadyState.straightAtSideslip(Double.NaN))
        .withMessageContaining("sideslip, rad, is NaN");
    assertThatIllegalArgumentException()
        .isThrownBy(() -> SteadyState.Kind.ofWord("level"))
        .withMessageContaining("level");
  }
}
