package org.rolltrace.core.quantity;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.assertThatExceptionOfType;

import java.lang.reflect.Modifier;
import java.util.Arrays;
import java.util.List;
import java.util.Random;
import java.util.stream.Stream;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;
import org.junit.jupiter.params.provider.MethodSource;

class DimensionTest {
  /** Every public constant of the class. */
  static List<Dimension> constants() {
    return Arrays.stream(Dimension.class.getFields())
        .filter(field -> Modifier.isStatic(field.getModifiers()))
        .map(
            field -> {
              try {
                return (Dimension) field.get(null);
              } catch (IllegalAccessException e) {
                throw new AssertionError(e);
              }
            })
        .toList();
  }

  static Stream<Dimension> randomDimensions() {
    Random random = new Random(1903);
    return Stream.generate(
            () ->
                new Dimension(
                    random.nextInt(19) - 9,
                    random.nextInt(19) - 9,
                    random.nextInt(19) - 9,
                    random.nextInt(19) - 9,
                    random.nextInt(19) - 9))
        .filter(dimension -> !dimension.equals(Dimension.DIMENSIONLESS))
        .limit(200);
  }

  // The SI brochure's expressions of derived units in base units; the radian is written out.
  @ParameterizedTest
  @CsvSource({
    "LENGTH, m, length",
    "AREA, m2, area",
    "MASS, kg, mass",
    "TIME, s, time",
    "ANGLE, rad, angle",
    "ANGULAR_RATE, rad/s, angular rate",
    "ANGULAR_ACCELERATION, rad/s2, angular acceleration",
    "SPEED, m/s, speed",
    "ACCELERATION, m/s2, acceleration",
    "INERTIA, kg m2, moment of inertia",
    "MOMENT, kg m2/s2, moment",
    "FORCE, kg m/s2, force",
    "PRESSURE, kg/m s2, pressure",
    "DENSITY, kg/m3, density",
    "POWER, kg m2/s3, power",
    "TEMPERATURE_DIFFERENCE, K, temperature difference",
    "FREQUENCY, 1/s, frequency",
    "DIMENSIONLESS, 1, plain number",
  })
  void constantsHaveTheirUnitAndName(String constant, String unit, String name)
      throws ReflectiveOperationException {
    Dimension dimension = (Dimension) Dimension.class.getField(constant).get(null);
    assertThat(dimension.siUnit()).isEqualTo(unit);
    assertThat(dimension.name()).isEqualTo(name);
    assertThat(dimension).hasToString(name);
  }

  @Test
  void constantsAreAllDifferent() {
    assertThat(constants()).hasSize(18).doesNotHaveDuplicates();
    assertThat(constants().stream().map(Dimension::name)).doesNotHaveDuplicates();
  }

  @ParameterizedTest
  @MethodSource("randomDimensions")
  void siUnitIsReadAsTheDimensionItCameFrom(Dimension dimension) {
    Unit unit = Unit.of(dimension.siUnit());
    assertThat(unit.dimension()).isEqualTo(dimension);
    assertThat(unit.factor()).isEqualTo(1);
  }

  @ParameterizedTest
  @MethodSource("randomDimensions")
  void productsQuotientsAndPowersAgree(Dimension dimension) {
    assertThat(dimension.times(dimension).times(dimension)).isEqualTo(dimension.power(3));
    assertThat(dimension.per(dimension)).isEqualTo(Dimension.DIMENSIONLESS);
    assertThat(dimension.times(Dimension.FORCE).per(Dimension.FORCE))
        .isEqualTo(dimension)
        .hasSameHashCodeAs(dimension);
    assertThat(dimension.power(2)).isNotEqualTo(dimension);
  }

  @Test
  void eachExponentCounts() {
    Dimension ones = new Dimension(1, 1, 1, 1, 1);
    assertThat(
            List.of(
                ones,
                new Dimension(2, 1, 1, 1, 1),
                new Dimension(1, 2, 1, 1, 1),
                new Dimension(1, 1, 2, 1, 1),
                new Dimension(1, 1, 1, 2, 1),
                new Dimension(1, 1, 1, 1, 2)))
        .doesNotHaveDuplicates();
    assertThat(ones).isNotEqualTo(null).isNotEqualTo("length");
  }

  @Test
  void dimensionWithoutNameIsCalledByItsUnit() {
    Dimension massMoment = Dimension.MASS.times(Dimension.LENGTH);
    assertThat(massMoment.name()).isEqualTo("quantity in kg m");
    assertThat(Unit.symbolsOf(massMoment)).containsExactly("kg m");
  }

  @Test
  void exponentsDoNotWrapRound() {
    Dimension most = Dimension.LENGTH.power(Integer.MAX_VALUE);
    assertThatExceptionOfType(ArithmeticException.class)
        .isThrownBy(() -> most.times(Dimension.LENGTH));
    assertThatExceptionOfType(ArithmeticException.class).isThrownBy(() -> most.power(2));
  }
}
