package org.rolltrace.core.derivatives;

/**
 * The conventions in which a set of derivatives is printed.
 *
 * @param aileronSign which way a positive aileron rolls
 * @param angleUnit the unit of sideslip, aileron and rudder in the denominators
 * @param aileronAngle which angle is called the aileron angle
 */
public record PrintedConvention(
    AileronSign aileronSign, AngleUnit angleUnit, AileronAngle aileronAngle) {

  /** The convention used inside: right-roll-positive mean aileron angle, per radian. */
  public static final PrintedConvention MODEL =
      new PrintedConvention(AileronSign.RIGHT_ROLL_POSITIVE, AngleUnit.RADIAN, AileronAngle.MEAN);

  /** Which way a positive aileron angle rolls the aeroplane. */
  public enum AileronSign {
    /** Positive aileron rolls right: the convention used inside. */
    RIGHT_ROLL_POSITIVE,
    /** Positive aileron rolls left; CY_δa, Cl_δa and Cn_δa change sign together. */
    LEFT_ROLL_POSITIVE
  }

  /** The unit of the angles in the denominators. Rates are always per p̂ and r̂. */
  public enum AngleUnit {
    /** Per radian. */
    RADIAN,
    /** Per degree. */
    DEGREE
  }

  /** Which angle is called the aileron angle. */
  public enum AileronAngle {
    /** ½(left down − right down). */
    MEAN,
    /** Left down − right down. */
    TOTAL,
    /** The angle of one aileron while the other moves as far the other way. */
    ONE_SIDE
  }

  /**
   * Converts a printed value.
   *
   * @param coefficient which derivative
   * @param printed its value as printed
   * @return the value per radian of the mean, right-roll-positive aileron angle
   */
  public double toModel(Coefficient coefficient, double printed) {
    double value = printed;
    if (coefficient.motion() != Coefficient.Motion.RATE && angleUnit == AngleUnit.DEGREE) {
      value = value * 180 / Math.PI;
    }
    if (coefficient.motion() == Coefficient.Motion.AILERON) {
      if (aileronSign == AileronSign.LEFT_ROLL_POSITIVE) {
        value = -value;
      }
      if (aileronAngle == AileronAngle.TOTAL) {
        value = 2 * value;
      }
    }
    return value;
  }

  /**
   * The convention in words.
   *
   * @return such as "per radian; mean aileron angle, right-roll-positive"
   */
  public String words() {
    String angle =
        switch (aileronAngle) {
          case MEAN -> "mean";
          case TOTAL -> "total";
          case ONE_SIDE -> "one-side";
        };
    return (angleUnit == AngleUnit.DEGREE ? "per degree" : "per radian")
        + "; "
        + angle
        + " aileron angle, "
        + (aileronSign == AileronSign.LEFT_ROLL_POSITIVE
            ? "left-roll-positive"
            : "right-roll-positive");
  }
}
