package org.rolltrace.core.files;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.within;

import java.nio.file.Path;
import java.util.Arrays;
import java.util.Comparator;
import java.util.List;
import java.util.Locale;
import java.util.Random;
import java.util.stream.Stream;
import org.hipparchus.complex.Complex;
import org.hipparchus.linear.EigenDecompositionNonSymmetric;
import org.hipparchus.linear.MatrixUtils;
import org.hipparchus.linear.RealMatrix;
import org.junit.jupiter.api.io.TempDir;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.Arguments;
import org.junit.jupiter.params.provider.MethodSource;
import org.junit.jupiter.params.provider.ValueSource;
import org.rolltrace.core.history.Channel;
import org.rolltrace.core.history.TimeHistory;
import org.rolltrace.core.motion.LateralModel;
import org.rolltrace.core.motion.LateralMotion;
import org.rolltrace.core.motion.SlipTreatment;
import org.rolltrace.core.run.ScenarioRun;
import org.rolltrace.core.scenario.Scenario;

/**
 * One aeroplane, entered in every form that sets are printed in. The forms are worked out here, by
 * the definitions of the quantities and with a matrix library.
 */
class PrintedFormsTest {
  /** The same response: rad and rad/s, against values near 1. */
  private static final double SAME = 1e-9;

  private static final double SPAN = 10.2;
  private static final double AREA = 16.3;
  private static final double MASS = 1130;
  private static final double SPEED = 62;
  private static final double DENSITY = 1.07;
  private static final double GRAVITY = 9.80665;
  private static final String[] MOTIONS = {"beta", "p", "r", "da", "dr"};

  /** Rows: CY, Cl, Cn; columns as the motions. Stability axes, right-roll-positive, per radian. */
  private static final double[][] SET = {
    {-0.61, -0.03, 0.24, 0.01, 0.16},
    {-0.079, -0.46, 0.13, 0.155, 0.012},
    {0.074, -0.041, -0.118, -0.0093, -0.069}
  };

  private static final RealMatrix INERTIA =
      MatrixUtils.createRealMatrix(new double[][] {{1480, -210}, {-210, 3050}});

  @TempDir Path directory;

  record Form(
      String per,
      String sign,
      String angle,
      boolean dimensional,
      boolean primed,
      double attackDeg) {
    @Override
    public String toString() {
      return per
          + ", "
          + sign
          + ", "
          + angle
          + (dimensional ? primed ? ", primed" : ", dimensional" : "")
          + ", "
          + attackDeg
          + " deg";
    }
  }

  private static final Form AS_IT_IS =
      new Form("radian", "right-roll-positive", "mean", false, false, 0);

  static Stream<Form> forms() {
    return Stream.of("radian", "degree")
        .flatMap(
            per ->
                Stream.of("right-roll-positive", "left-roll-positive")
                    .flatMap(
                        sign ->
                            Stream.of("mean", "total", "one-side")
                                .flatMap(
                                    angle ->
                                        Stream.of(0.0, 7.0, -4.0)
                                            .flatMap(
                                                attack ->
                                                    Stream.of(
                                                        new Form(
                                                            per, sign, angle, false, false, attack),
                                                        new Form(
                                                            per, sign, angle, true, false, attack),
                                                        new Form(
                                                            per, sign, angle, true, true,
                                                            attack))))));
  }

  /** T turns body to stability axes; its transpose turns back. */
  private static RealMatrix turn(double attackDeg) {
    double c = Math.cos(Math.toRadians(attackDeg));
    double s = Math.sin(Math.toRadians(attackDeg));
    return MatrixUtils.createRealMatrix(new double[][] {{c, s}, {-s, c}});
  }

  private static RealMatrix inertiaIn(Form form) {
    RealMatrix t = turn(form.attackDeg());
    return t.transpose().multiply(INERTIA).multiply(t);
  }

  /** Forces and moments by mass and inertia, or coefficients, about the axes of the form. */
  private static double[][] printed(Form form) {
    RealMatrix t = turn(form.attackDeg());
    double[][] set = new double[3][5];
    double[][] moments = {SET[1].clone(), SET[2].clone()};
    RealMatrix body = t.transpose().multiply(MatrixUtils.createRealMatrix(moments));
    RealMatrix rates = body.getSubMatrix(0, 1, 1, 2).multiply(t);
    double[] sideRates = t.transpose().operate(new double[] {SET[0][1], SET[0][2]});
    for (int column = 0; column < 5; column++) {
      boolean rate = column == 1 || column == 2;
      set[0][column] = rate ? sideRates[column - 1] : SET[0][column];
      set[1][column] = rate ? rates.getEntry(0, column - 1) : body.getEntry(0, column);
      set[2][column] = rate ? rates.getEntry(1, column - 1) : body.getEntry(1, column);
    }
    double force = 0.5 * DENSITY * SPEED * SPEED * AREA;
    RealMatrix inertia = inertiaIn(form);
    for (int column = 0; column < 5; column++) {
      boolean rate = column == 1 || column == 2;
      if (form.dimensional()) {
        double scale = rate ? SPAN / (2 * SPEED) : 1;
        double[] moment = {
          force * SPAN * scale * set[1][column], force * SPAN * scale * set[2][column]
        };
        double[] accelerations =
            form.primed()
                ? MatrixUtils.inverse(inertia).operate(moment)
                : new double[] {
                  moment[0] / inertia.getEntry(0, 0), moment[1] / inertia.getEntry(1, 1)
                };
        set[0][column] *= force * scale / MASS;
        set[1][column] = accelerations[0];
        set[2][column] = accelerations[1];
      }
      double factor = !rate && form.per().equals("degree") ? Math.PI / 180 : 1;
      if (column == 3) {
        factor *= form.sign().startsWith("left") ? -1 : 1;
        factor *= form.angle().equals("total") ? 0.5 : 1;
      }
      for (int row = 0; row < 3; row++) {
        set[row][column] *= factor;
      }
    }
    return set;
  }

  private static String values(Form form) {
    String[] units = {"m/s2", "m/s", "m/s", "m/s2", "m/s2", "1/s2", "1/s", "1/s", "1/s2", "1/s2"};
    StringBuilder out = new StringBuilder();
    double[][] set = printed(form);
    for (int row = 0; row < 3; row++) {
      for (int column = 0; column < 5; column++) {
        out.append(out.length() == 0 ? "" : ", ");
        if (form.dimensional()) {
          out.append('"').append("YLN".charAt(row)).append('_').append(MOTIONS[column]);
          out.append("\": \"").append(set[row][column]).append(' ');
          out.append(units[(row == 0 ? 0 : 5) + column]).append('"');
        } else {
          out.append("\"C").append("Yln".charAt(row)).append('_').append(MOTIONS[column]);
          out.append("\": ").append(set[row][column]);
        }
      }
    }
    return out.toString();
  }

  private Scenario scenario(Form form) {
    RealMatrix inertia = inertiaIn(form);
    String text =
        String.format(
            Locale.ROOT,
            """
            {
              "format": "rolltrace-scenario/1", "title": "form",
              "aeroplane": {
                "span": "%s m", "wingArea": "%s m2", "mass": "%s kg",
                "inertia": { "roll": "%s kg m2", "yaw": "%s kg m2", "product": "%s kg m2" },
                "ailerons": { "up": "20 deg", "down": "15 deg" },
                "rudder": { "left": "25 deg", "right": "25 deg" },
                %s
                "derivatives": {
                  "source": "made up", "per": "%s", "aileronSign": "%s", "aileronAngle": "%s",
                  "validAt": { "pressureAltitude": "0 m", "density": "%s kg/m3", "trueAirspeed": "%s m/s" },
                  %s { %s }
                }
              },
              "condition": { "pressureAltitude": "500 m", "trueAirspeed": "70 m/s",
                             "propellerRollMoment": "-200 N m" },
              "slip": "free",
              "inputs": [ { "control": "stick", "shape": "hold", "start": "0.5 s", "size": 0.4, "duration": "2 s" },
                          { "control": "pedal", "shape": "step", "start": "3 s", "size": 0.1 } ],
              "duration": "6 s"
            }
            """,
            SPAN,
            AREA,
            MASS,
            inertia.getEntry(0, 0),
            inertia.getEntry(1, 1),
            -inertia.getEntry(0, 1),
            form.attackDeg() == 0
                ? ""
                : "\"axes\": \"body\", \"angleOfAttack\": \"" + form.attackDeg() + " deg\",",
            form.per(),
            form.sign(),
            form.angle(),
            DENSITY,
            SPEED,
            form.dimensional()
                ? "\"primed\": " + form.primed() + ", \"dimensional\":"
                : "\"values\":",
            values(form));
    return ScenarioFile.read(Samples.write(directory, "form.json", text));
  }

  @ParameterizedTest
  @MethodSource("forms")
  void everyFormGivesTheSameResponse(Form form) {
    TimeHistory expected = ScenarioRun.execute(scenario(AS_IT_IS)).history();
    Scenario scenario = scenario(form);
    TimeHistory found = ScenarioRun.execute(scenario).history();
    int[] ones = expected.evenSamples();
    int[] twos = found.evenSamples();
    assertThat(ones).hasSize(601);
    for (Channel channel :
        List.of(Channel.BANK, Channel.ROLL_RATE, Channel.YAW_RATE, Channel.SIDESLIP)) {
      double worst = 0;
      for (int i = 0; i < ones.length; i++) {
        worst =
            Math.max(
                worst, Math.abs(expected.value(channel, ones[i]) - found.value(channel, twos[i])));
      }
      assertThat(worst).as(channel.toString()).isCloseTo(0, within(SAME));
    }
    assertThat(Math.abs(expected.value(Channel.BANK, ones[300]))).isGreaterThan(0.5);
    assertThat(scenario.data().derivatives().convention())
        .contains("per " + form.per())
        .contains(form.angle() + " aileron angle, " + form.sign())
        .startsWith(
            form.dimensional()
                ? form.primed() ? "dimensional, primed" : "dimensional, not primed"
                : "non-dimensional")
        .endsWith(
            form.attackDeg() == 0
                ? "stability axes"
                : String.format(
                    Locale.ROOT, "body axes at %.4g deg angle of attack", form.attackDeg()));
  }

  static Stream<Arguments> bySpeed() {
    return Stream.of(
        Arguments.of("Y_beta", "Y_v", "m/s2", "1/s"),
        Arguments.of("L_beta", "L_v", "1/s2", "1/m s"),
        Arguments.of("N_beta", "N_v", "1/s2", "1/m s"));
  }

  /** v = V β: the derivative by speed times V is that by slip, whatever the angles are per. */
  @ParameterizedTest
  @MethodSource("bySpeed")
  void derivativesByTheSidewaysSpeed(String name, String bySpeed, String unit, String perSpeed) {
    Form form = new Form("radian", "right-roll-positive", "mean", true, true, 0);
    double value = printed(form)["YLN".indexOf(name.charAt(0))][0];
    String plain = '"' + name + "\": \"" + value + ' ' + unit + '"';
    String text = ScenarioDocument.open(write(form)).json();
    String replaced =
        Samples.with(text, plain, '"' + bySpeed + "\": \"" + value / SPEED + ' ' + perSpeed + '"');
    Scenario found = ScenarioFile.read(Samples.write(directory, "speed.json", replaced));
    Scenario expected = scenario(form);
    for (var coefficient : org.rolltrace.core.derivatives.Coefficient.values()) {
      assertThat(found.data().derivatives().value(coefficient))
          .isCloseTo(expected.data().derivatives().value(coefficient), within(1e-15));
    }
  }

  private Path write(Form form) {
    scenario(form);
    return directory.resolve("form.json");
  }

  /**
   * The whole problem set up about body axes: v̇ = Y/m + g cos θ sin φ + V (p sin α − r cos α), φ̇
   * = p + r tan θ with θ = α + γ and γ = 0. It has the same roots as the converted one, because
   * roots do not depend on axes.
   */
  @ParameterizedTest
  @ValueSource(doubles = {7, -4, 15})
  void rootsDoNotDependOnAxes(double attackDeg) {
    Form form = new Form("radian", "right-roll-positive", "mean", false, false, attackDeg);
    Scenario scenario = scenario(form);
    LateralModel model =
        LateralModel.of(
            scenario.data().aeroplane(),
            scenario.data().derivatives(),
            scenario.condition(),
            scenario.propulsion().moments());
    double[] found = roots(LateralMotion.of(SlipTreatment.FREE, model).linearised());

    double[][] set = printed(form);
    double speed = scenario.condition().trueAirspeed();
    double force = scenario.condition().dynamicPressure() * AREA;
    double perRate = SPAN / (2 * speed);
    double alpha = Math.toRadians(attackDeg);
    RealMatrix inverse = MatrixUtils.inverse(inertiaIn(form));
    double[][] a = new double[4][4]; // β, p, r, φ
    for (int column = 0; column < 3; column++) {
      double scale = column == 0 ? 1 : perRate;
      a[0][column] = force * scale * set[0][column] / (MASS * speed);
      double[] accelerations =
          inverse.operate(
              new double[] {
                force * SPAN * scale * set[1][column], force * SPAN * scale * set[2][column]
              });
      a[1][column] = accelerations[0];
      a[2][column] = accelerations[1];
    }
    a[0][1] += Math.sin(alpha);
    a[0][2] -= Math.cos(alpha);
    a[0][3] = GRAVITY * Math.cos(alpha) / speed;
    a[3][1] = 1;
    a[3][2] = Math.tan(alpha);
    double[] expected = roots(a);
    for (int i = 0; i < expected.length; i++) {
      assertThat(found[i]).isCloseTo(expected[i], within(1e-10)); // rounding of an eigensolver
    }
  }

  /** Real and imaginary parts, in order. */
  private static double[] roots(double[][] a) {
    Complex[] roots =
        new EigenDecompositionNonSymmetric(MatrixUtils.createRealMatrix(a)).getEigenvalues();
    return Arrays.stream(roots)
        .sorted(
            Comparator.comparingDouble(Complex::getRealPart)
                .thenComparingDouble(Complex::getImaginaryPart))
        .flatMapToDouble(
            root -> java.util.stream.DoubleStream.of(root.getRealPart(), root.getImaginaryPart()))
        .toArray();
  }

  /** An imbalance does not enter the conversion: the set is that of the aeroplane without it. */
  @ParameterizedTest
  @ValueSource(longs = {1, 2})
  void aLateralImbalanceDoesNotChangeTheSet(long seed) {
    double arm = new Random(seed).nextDouble() + 1;
    Form form = new Form("radian", "right-roll-positive", "mean", true, true, 7);
    Scenario plain = scenario(form);
    String text =
        Samples.with(
            ScenarioDocument.open(directory.resolve("form.json")).json(),
            "\"ailerons\"",
            "\"lateralImbalance\": { \"mass\": \"20 kg\", \"arm\": \""
                + arm
                + " m\" }, \"ailerons\"");
    Scenario loaded = ScenarioFile.read(Samples.write(directory, "loaded.json", text));
    for (var coefficient : org.rolltrace.core.derivatives.Coefficient.values()) {
      assertThat(loaded.data().derivatives().value(coefficient))
          .isEqualTo(plain.data().derivatives().value(coefficient));
    }
    assertThat(loaded.data().aeroplane().loadedInertia().roll())
        .isCloseTo(plain.data().aeroplane().inertia().roll() + 20 * arm * arm, within(1e-9));
  }
}
