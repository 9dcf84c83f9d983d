package org.rolltrace.core.run;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.within;
import static org.rolltrace.core.motion.LateralMotion.BANK;
import static org.rolltrace.core.motion.LateralMotion.ROLL_RATE;
import static org.rolltrace.core.motion.LateralMotion.SIDESLIP;
import static org.rolltrace.core.motion.LateralMotion.YAW_RATE;

import org.assertj.core.data.Percentage;
import org.hipparchus.linear.MatrixUtils;
import org.hipparchus.linear.RealMatrix;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;
import org.rolltrace.core.derivatives.Coefficient;
import org.rolltrace.core.derivatives.LateralDerivatives;
import org.rolltrace.core.history.Channel;
import org.rolltrace.core.history.TimeHistory;
import org.rolltrace.core.motion.LateralModel;
import org.rolltrace.core.motion.LateralModes;
import org.rolltrace.core.motion.LateralMotion;
import org.rolltrace.core.motion.Mode;
import org.rolltrace.core.motion.SlipTreatment;
import org.rolltrace.core.scenario.Scenario;
import org.rolltrace.core.testing.Shipped;

/** The shipped published aeroplanes against the answers printed with them. */
class PublishedExamplesValidationTest {

  private static LateralModes modes(Scenario scenario) {
    return ScenarioRun.execute(scenario).modes().orElseThrow();
  }

  private static LateralModel model(Scenario scenario) {
    return ScenarioRun.model(scenario, scenario.propeller());
  }

  /** The characteristic polynomial from the linearised matrix, by Faddeev and Leverrier. */
  private static double[] characteristicPolynomial(Scenario scenario) {
    RealMatrix a =
        MatrixUtils.createRealMatrix(
            LateralMotion.of(SlipTreatment.FREE, model(scenario)).linearised());
    double[] c = {1, 0, 0, 0, 0};
    RealMatrix m = MatrixUtils.createRealMatrix(4, 4);
    RealMatrix unit = MatrixUtils.createRealIdentityMatrix(4);
    for (int k = 1; k <= 4; k++) {
      m = a.multiply(m).add(unit.scalarMultiply(c[k - 1]));
      c[k] = -a.multiply(m).getTrace() / k;
    }
    return c;
  }

  /**
   * R.C. Nelson, Flight Stability and Automatic Control, 2nd ed. 1998, examples of ch. 5: roll
   * −8.435, spiral −0.00877, dutch roll −0.487 ± 2.335 i (from memory). The book works with rounded
   * dimensional derivatives; the roots of the full-precision ones are −8.43134, −0.00819 and
   * −0.48670 ± 2.34670 i. Tolerances span both: the spiral is a small difference of large terms.
   */
  @Test
  void lightSingle() {
    LateralModes modes = modes(Shipped.scenario("light-single-roll-entry"));
    assertThat(modes.roll().orElseThrow().root()).isCloseTo(-8.435, within(0.01));
    assertThat(modes.spiral().orElseThrow().root()).isCloseTo(-0.00877, within(0.0007));
    Mode.Oscillatory dutchRoll = modes.dutchRoll().orElseThrow();
    assertThat(dutchRoll.real()).isCloseTo(-0.487, within(0.003));
    assertThat(dutchRoll.imaginary()).isCloseTo(2.335, within(0.015));
  }

  /** The same book's dimensional derivatives, printed to three figures (from memory). */
  @Test
  void lightSingleDimensionalDerivatives() {
    LateralModel model = model(Shipped.scenario("light-single-roll-entry"));
    double ixx = model.inertia().roll();
    double izz = model.inertia().yaw().orElseThrow();
    double mv = model.mass().orElseThrow() * model.speed();
    Percentage threeFigures = Percentage.withPercentage(0.7);
    assertThat(model.sideForce().perSideslip() / mv).isCloseTo(-0.254, threeFigures);
    assertThat(model.rollMoment().perSideslip() / ixx).isCloseTo(-16.02, threeFigures);
    assertThat(model.rollMoment().perRollRate() / ixx).isCloseTo(-8.4, threeFigures);
    assertThat(model.rollMoment().perYawRate() / ixx).isCloseTo(2.19, threeFigures);
    assertThat(model.yawMoment().perSideslip() / izz).isCloseTo(4.49, Percentage.withPercentage(2));
    // two figures printed
    assertThat(model.yawMoment().perRollRate() / izz)
        .isCloseTo(-0.35, Percentage.withPercentage(2));
    assertThat(model.yawMoment().perYawRate() / izz).isCloseTo(-0.76, Percentage.withPercentage(2));
  }

  /**
   * J. Roskam, Airplane Flight Dynamics and Automatic Flight Controls, part I, table B1: roll 0.077
   * s, spiral 55.9 s, dutch roll 3.2448 rad/s at 0.2066 (all from memory). 0.5 % for three-figure
   * inputs; the roll's two figures allow 0.0005 s.
   */
  @Test
  void fourPlaceSingle() {
    LateralModes modes = modes(Shipped.scenario("four-place-single-roll-entry"));
    Percentage half = Percentage.withPercentage(0.5);
    assertThat(modes.roll().orElseThrow().timeConstant()).isCloseTo(0.077, within(0.0005));
    assertThat(modes.spiral().orElseThrow().timeConstant()).isCloseTo(55.9, half);
    assertThat(modes.dutchRoll().orElseThrow().naturalFrequency()).isCloseTo(3.2448, half);
    assertThat(modes.dutchRoll().orElseThrow().dampingRatio()).isCloseTo(0.2066, half);
  }

  /**
   * B. Etkin and L.D. Reid, Dynamics of Flight, 3rd ed. 1996, sec. 6.7, eq. 6.7,2 (re-read): roots
   * −0.56248, −0.0072973, −0.033011 ± 0.94655 i. From the non-dimensional set 0.5 % on roll and
   * dutch roll and 1 % on the spiral: inputs of four figures, g = 32.2 ft/s² in the book.
   */
  @Test
  void largeJet() {
    LateralModes modes = modes(Shipped.scenario("large-jet-roll-entry"));
    Percentage half = Percentage.withPercentage(0.5);
    assertThat(modes.roll().orElseThrow().root()).isCloseTo(-0.56248, half);
    assertThat(modes.spiral().orElseThrow().root())
        .isCloseTo(-0.0072973, Percentage.withPercentage(1));
    Mode.Oscillatory dutchRoll = modes.dutchRoll().orElseThrow();
    assertThat(dutchRoll.real()).isCloseTo(-0.033011, half);
    assertThat(dutchRoll.imaginary()).isCloseTo(0.94655, half);
    double[] printed = {1, 0.6358, 0.9388, 0.5114, 0.003682};
    double[] found = characteristicPolynomial(Shipped.scenario("large-jet-roll-entry"));
    for (int i = 0; i < printed.length; i++) {
      assertThat(found[i]).isCloseTo(printed[i], Percentage.withPercentage(i == 4 ? 1 : 0.5));
    }
  }

  /** The matrix of the same equation (re-read), whose sideways speed is βV in ft/s. */
  @Test
  void largeJetMatrixWithItsProductOfInertia() {
    Scenario scenario = Shipped.scenario("large-jet-roll-entry");
    double[][] a = LateralMotion.of(SlipTreatment.FREE, model(scenario)).linearised();
    double feet = 774;
    Percentage close =
        Percentage.withPercentage(0.5); // inputs of four figures, two of them of three
    assertThat(a[SIDESLIP][SIDESLIP]).isCloseTo(-0.0558, close);
    assertThat(a[SIDESLIP][YAW_RATE] * feet).isCloseTo(-774, close);
    assertThat(a[SIDESLIP][BANK] * feet).isCloseTo(32.2, close);
    assertThat(a[ROLL_RATE][SIDESLIP] / feet).isCloseTo(-0.003865, close);
    assertThat(a[ROLL_RATE][ROLL_RATE]).isCloseTo(-0.4342, close);
    assertThat(a[ROLL_RATE][YAW_RATE]).isCloseTo(0.4136, close);
    assertThat(a[YAW_RATE][SIDESLIP] / feet).isCloseTo(0.001086, close);
    assertThat(a[YAW_RATE][ROLL_RATE]).isCloseTo(-0.006112, Percentage.withPercentage(2));
    assertThat(a[YAW_RATE][YAW_RATE]).isCloseTo(-0.1458, close);
  }

  /**
   * L.V. Schmidt, Introduction to Aircraft Flight Dynamics, 1998, app. B.4 (re-read): dimensional
   * derivatives with the product of inertia worked in (primed). The non-dimensional values have
   * three or four figures and q̄ three, so the dimensional ones agree to about 1 %, the small ones
   * to a unit of the last digit.
   */
  @ParameterizedTest
  @CsvSource({
    "four-engine-jet-approach-roll-entry, -1.327, -0.95, 0.609, 0.756, -0.124, -0.264, 0.726",
    "four-engine-jet-cruise-roll-entry, -4.424, -1.184, 0.335, 2.148, -0.021, -0.228, 2.12"
  })
  void fourEngineJetDimensionalDerivatives(
      String name,
      double lBeta,
      double lp,
      double lr,
      double nBeta,
      double np,
      double nr,
      double lAileron) {
    Scenario scenario = Shipped.scenario(name);
    LateralModel model = model(scenario);
    LateralMotion motion = LateralMotion.of(SlipTreatment.FREE, model);
    double[][] a = motion.linearised();
    Percentage close = Percentage.withPercentage(1);
    assertThat(a[ROLL_RATE][SIDESLIP]).isCloseTo(lBeta, close);
    assertThat(a[ROLL_RATE][ROLL_RATE]).isCloseTo(lp, close);
    assertThat(a[ROLL_RATE][YAW_RATE]).isCloseTo(lr, close);
    assertThat(a[YAW_RATE][SIDESLIP]).isCloseTo(nBeta, close);
    assertThat(a[YAW_RATE][ROLL_RATE]).isCloseTo(np, within(0.002));
    assertThat(a[YAW_RATE][YAW_RATE]).isCloseTo(nr, close);
    double[] rates = new double[4];
    motion.rates(0, new double[4], 1, 0, rates);
    assertThat(rates[ROLL_RATE]).isCloseTo(lAileron, close);
  }

  /**
   * The roots in the transfer function printed for the approach condition: roll −1.121, spiral
   * +0.013, dutch roll s² + 0.22 s + 0.99 (an examination question that quotes the same data,
   * re-read). Last digits as printed; the spiral, two figures of a small difference, to 5 %.
   */
  @Test
  void fourEngineJetApproach() {
    LateralModes modes = modes(Shipped.scenario("four-engine-jet-approach-roll-entry"));
    assertThat(modes.roll().orElseThrow().root()).isCloseTo(-1.121, Percentage.withPercentage(0.5));
    assertThat(modes.spiral().orElseThrow().root()).isCloseTo(0.013, within(0.00065));
    Mode.Oscillatory dutchRoll = modes.dutchRoll().orElseThrow();
    assertThat(-2 * dutchRoll.real()).isCloseTo(0.22, within(0.005));
    assertThat(Math.pow(dutchRoll.naturalFrequency(), 2)).isCloseTo(0.99, within(0.005));
  }

  /**
   * Roots worked out from the re-read dimensional rows of the cruise condition: 0.5 %, spiral 5 %.
   */
  @Test
  void fourEngineJetCruise() {
    LateralModes modes = modes(Shipped.scenario("four-engine-jet-cruise-roll-entry"));
    assertThat(modes.roll().orElseThrow().root())
        .isCloseTo(-1.258007, Percentage.withPercentage(0.5));
    assertThat(modes.spiral().orElseThrow().root())
        .isCloseTo(-0.0039942784, Percentage.withPercentage(5));
    assertThat(modes.dutchRoll().orElseThrow().naturalFrequency())
        .isCloseTo(1.4979003, Percentage.withPercentage(0.5));
    assertThat(modes.dutchRoll().orElseThrow().dampingRatio())
        .isCloseTo(0.079092121, Percentage.withPercentage(0.5));
  }

  /**
   * R.C. Nelson, example problem 5.1 (from memory): 5 deg of aileron at 87 m/s lead to 0.31 rad/s
   * with a time constant of 0.77 s; two-figure answers, 2 %. Recomputed: 0.310128 rad/s and
   * 0.762100 s.
   */
  @Test
  void oneDegreeRollStep() {
    Scenario scenario = Shipped.scenario("one-degree-roll-step");
    RunResult result = ScenarioRun.execute(scenario);
    Percentage twoFigures = Percentage.withPercentage(2);
    double steady = result.measure("steadyRollRate").orElseThrow().value().orElseThrow();
    double constant = result.measure("rollModeTimeConstant").orElseThrow().value().orElseThrow();
    assertThat(scenario.condition().dynamicPressure()).isCloseTo(4636, within(0.5));
    assertThat(steady).isCloseTo(0.31, twoFigures).isCloseTo(0.310128, within(2e-5));
    assertThat(constant).isCloseTo(0.77, twoFigures).isCloseTo(0.762100, within(1e-6));

    // samples of the closed form p = K δ T (1 − e^(−t/T)) of the recomputed example
    TimeHistory history = result.history();
    double start = scenario.programme().inputs().get(0).shape().start();
    double hand = scenario.programme().inputs().get(0).shape().handTime();
    assertThat(hand).isZero();
    double[][] samples = {
      {0.25, 4.969405233, 0.655076722},
      {0.5, 8.549035038, 2.369301837},
      {0.77, 11.299589960, 5.070746229},
      {1, 12.984963175, 7.873204033},
      {2, 16.480996244, 22.977925368},
      {3, 17.422257844, 40.029639028}
    };
    for (double[] sample : samples) {
      int index = history.lastAt(start + sample[0] + 1e-9);
      assertThat(history.time(index)).isCloseTo(start + sample[0], within(1e-9));
      assertThat(Math.toDegrees(history.value(Channel.ROLL_RATE, index)))
          .isCloseTo(sample[1], within(1e-6));
      assertThat(Math.toDegrees(history.value(Channel.BANK, index)))
          .isCloseTo(sample[2], within(1e-6));
    }
  }

  /**
   * The light single by the book's rounded dimensional derivatives (from memory): the book's own
   * way, so its roots −8.435, −0.00877 and −0.487 ± 2.335 i, with the tolerances above.
   */
  @Test
  void lightSingleByItsDimensionalSet() {
    LateralModes modes = modes(Shipped.scenario("light-single-dimensional-roll-entry"));
    assertThat(modes.roll().orElseThrow().root()).isCloseTo(-8.435, within(0.01));
    assertThat(modes.spiral().orElseThrow().root()).isCloseTo(-0.00877, within(0.0007));
    Mode.Oscillatory dutchRoll = modes.dutchRoll().orElseThrow();
    assertThat(dutchRoll.real()).isCloseTo(-0.487, within(0.003));
    assertThat(dutchRoll.imaginary()).isCloseTo(2.335, within(0.015));
  }

  /**
   * The four-engine jet by its primed rows (re-read), against the roots that a matrix library finds
   * for these rows with g 32.174 ft/s²: nothing is rounded between, so six figures agree; and
   * against the control power L'_δa, printed.
   */
  @ParameterizedTest
  @CsvSource({
    "approach, -1.1208812, 0.013118609, -0.10877713, 0.98961009, 0.726",
    "cruise, -1.258007, -0.0039942784, -0.11847211, 1.4932078, 2.12"
  })
  void fourEngineJetByItsPrimedSet(
      String condition, double roll, double spiral, double real, double imaginary, double power) {
    Scenario scenario = Shipped.scenario("four-engine-jet-" + condition + "-primed-roll-entry");
    LateralModes modes = modes(scenario);
    assertThat(modes.roll().orElseThrow().root()).isCloseTo(roll, within(1e-6));
    assertThat(modes.spiral().orElseThrow().root()).isCloseTo(spiral, within(1e-7));
    assertThat(modes.dutchRoll().orElseThrow().real()).isCloseTo(real, within(1e-6));
    assertThat(modes.dutchRoll().orElseThrow().imaginary()).isCloseTo(imaginary, within(1e-6));
    double[] rates = new double[4];
    LateralMotion.of(SlipTreatment.FREE, model(scenario)).rates(0, new double[4], 1, 0, rates);
    assertThat(rates[ROLL_RATE]).isCloseTo(power, within(1e-12));
  }

  /**
   * M.V. Cook, Flight Dynamics Principles, example 7.1 (from memory): bank from aileron is 1.62 (s²
   * + 0.362 s + 1.359) / ((s + 0.0065)(s + 1.329)(s² + 0.254 s + 1.433)); spiral 154 s, roll 0.75
   * s, dutch roll 1.2 rad/s at 0.106. Last digits as printed. The numerator holds the derivatives
   * of the ailerons to their mark: its roots are those of slip and yaw rate with the bank held at
   * zero by the ailerons.
   */
  @Test
  void fourEngineJetHolding() {
    Scenario scenario = Shipped.scenario("four-engine-jet-holding-roll-entry");
    LateralModes modes = modes(scenario);
    assertThat(modes.roll().orElseThrow().root()).isCloseTo(-1.329, within(0.0005));
    assertThat(modes.roll().orElseThrow().timeConstant()).isCloseTo(0.75, within(0.005));
    assertThat(modes.spiral().orElseThrow().root()).isCloseTo(-0.0065, within(0.00005));
    assertThat(modes.spiral().orElseThrow().timeConstant()).isCloseTo(154, within(0.5));
    Mode.Oscillatory dutchRoll = modes.dutchRoll().orElseThrow();
    assertThat(-2 * dutchRoll.real()).isCloseTo(0.254, within(0.0005));
    assertThat(Math.pow(dutchRoll.naturalFrequency(), 2)).isCloseTo(1.433, within(0.0005));
    assertThat(dutchRoll.naturalFrequency()).isCloseTo(1.2, within(0.05));
    assertThat(dutchRoll.dampingRatio()).isCloseTo(0.106, within(0.0005));

    LateralMotion motion = LateralMotion.of(SlipTreatment.FREE, model(scenario));
    double[][] a = motion.linearised();
    double[] aileron = new double[4];
    motion.rates(0, new double[4], 1, 0, aileron);
    assertThat(aileron[ROLL_RATE]).isCloseTo(1.62, within(1e-9));
    double yawForRoll = aileron[YAW_RATE] / aileron[ROLL_RATE];
    double slipYaw = a[YAW_RATE][SIDESLIP] - yawForRoll * a[ROLL_RATE][SIDESLIP];
    double yawYaw = a[YAW_RATE][YAW_RATE] - yawForRoll * a[ROLL_RATE][YAW_RATE];
    assertThat(-a[SIDESLIP][SIDESLIP] - yawYaw).isCloseTo(0.362, within(0.0005));
    assertThat(a[SIDESLIP][SIDESLIP] * yawYaw - a[SIDESLIP][YAW_RATE] * slipYaw)
        .isCloseTo(1.359, within(0.0005));
  }

  /**
   * The coefficients printed for the same condition by Schmidt, app. B.4, where they can be told
   * from misprints: N_da 0.036 1/s² and N_p −0.048 1/s, unprimed, need Cn_da 0.0035 and Cn_p
   * −0.0306 (re-read); CY_dr 0.1865 and Cn_dr −0.0834 are the same in all conditions. From the
   * primed set, through the inertias, to a unit of three figures.
   */
  @Test
  void fourEngineJetHoldingCoefficients() {
    LateralDerivatives set =
        Shipped.scenario("four-engine-jet-holding-roll-entry").data().derivatives();
    assertThat(set.value(Coefficient.CN_DA)).isCloseTo(0.0035, within(0.00005));
    assertThat(set.value(Coefficient.CN_P)).isCloseTo(-0.0306, within(0.0002));
    assertThat(set.value(Coefficient.CY_DR)).isCloseTo(0.1865, within(0.0005));
    assertThat(set.value(Coefficient.CN_DR)).isCloseTo(-0.0834, within(0.0001));
  }

  /**
   * The same by the unprimed rows, which are rounded to three figures apart from the primed ones:
   * 0.5 % on roll and dutch roll, 5 % on the spiral, and 1 % on the damping ratio, where N_r of
   * three figures alone leaves half a per cent.
   */
  @ParameterizedTest
  @CsvSource({
    "approach, -1.1208812, 0.013118609, 0.99557049, 0.10926111",
    "cruise, -1.258007, -0.0039942784, 1.4979003, 0.079092121"
  })
  void fourEngineJetByItsUnprimedSet(
      String condition, double roll, double spiral, double frequency, double damping) {
    LateralModes modes =
        modes(Shipped.scenario("four-engine-jet-" + condition + "-dimensional-roll-entry"));
    Percentage half = Percentage.withPercentage(0.5);
    assertThat(modes.roll().orElseThrow().root()).isCloseTo(roll, half);
    assertThat(modes.spiral().orElseThrow().root()).isCloseTo(spiral, Percentage.withPercentage(5));
    assertThat(modes.dutchRoll().orElseThrow().naturalFrequency()).isCloseTo(frequency, half);
    assertThat(modes.dutchRoll().orElseThrow().dampingRatio())
        .isCloseTo(damping, Percentage.withPercentage(1));
  }
}
