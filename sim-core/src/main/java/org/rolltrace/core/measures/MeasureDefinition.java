package org.rolltrace.core.measures;

import java.util.Locale;

/**
 * What a measure is.
 *
 * @param name the name in results
 * @param title the name on screens
 * @param unit SI unit of its values; {@code 1} for a plain number
 * @param definition how it is read off
 */
public record MeasureDefinition(String name, String title, String unit, String definition) {

  /** The largest roll rate in the commanded direction. */
  public static final MeasureDefinition PEAK_ROLL_RATE =
      new MeasureDefinition(
          "peakRollRate",
          "Peak roll rate",
          "rad/s",
          "largest roll rate in the commanded direction");

  /** The roll rate that a held stick leads to. */
  public static final MeasureDefinition STEADY_ROLL_RATE =
      new MeasureDefinition(
          "steadyRollRate",
          "Steady roll rate",
          "rad/s",
          "mean roll rate over the last roll-mode time constant, or the last tenth of the hold if"
              + " longer, when it changes there by less than 1 % and the hold lasted 5 time"
              + " constants; otherwise the mean over the last dutch-roll period, when the hold"
              + " lasted 3 time constants and one period");

  /** The time constant of the roll mode of the equations that were flown. */
  public static final MeasureDefinition ROLL_MODE_TIME_CONSTANT =
      new MeasureDefinition(
          "rollModeTimeConstant",
          "Roll-mode time constant",
          "s",
          "minus the inverse of the roll root of the linearised equations that were flown");

  /** The time constant as a stopwatch would find it. */
  public static final MeasureDefinition RESPONSE_TIME_CONSTANT =
      new MeasureDefinition(
          "responseTimeConstant",
          "Time to 63 % of steady",
          "s",
          "from the middle of the stick's movement to the first crossing of 63.2 % of the steady"
              + " roll rate");

  /** When the roll rate has settled. */
  public static final MeasureDefinition SETTLING_TIME =
      new MeasureDefinition(
          "settlingTime",
          "Settling time",
          "s",
          "time after which the roll rate stays within the settling band (5 % unless set) of the"
              + " steady rate until release");

  /** How fast the roll rate rises. */
  public static final MeasureDefinition RISE_TIME =
      new MeasureDefinition(
          "riseTime", "Rise time", "s", "from the first 10 % to the first 90 % of the steady rate");

  /** The largest roll acceleration. */
  public static final MeasureDefinition ROLL_ACCELERATION =
      new MeasureDefinition(
          "rollAcceleration",
          "Peak roll acceleration",
          "rad/s2",
          "largest roll acceleration in the commanded direction");

  /** How far the aeroplane rolls on after the stick is centred. */
  public static final MeasureDefinition BANK_COAST =
      new MeasureDefinition(
          "bankCoast",
          "Bank coast",
          "rad",
          "bank change from the first centring movement until the roll rate has first fallen to 5 %"
              + " of its value then, changed sign or passed its first minimum");

  /** Peak pb/2V. */
  public static final MeasureDefinition HELIX_ANGLE_PEAK =
      new MeasureDefinition(
          "helixAnglePeak", "Helix angle, peak pb/2V", "rad", "peak roll rate times span over 2 V");

  /** Steady pb/2V. */
  public static final MeasureDefinition HELIX_ANGLE_STEADY =
      new MeasureDefinition(
          "helixAngleSteady",
          "Helix angle, steady pb/2V",
          "rad",
          "steady roll rate times span over 2 V");

  /** What the rolling adds to the incidence of the wing tip. */
  public static final MeasureDefinition TIP_INCIDENCE =
      new MeasureDefinition(
          "tipIncidence",
          "Tip incidence, peak",
          "rad",
          "arc tangent of the peak helix angle: what the rolling adds to the incidence of the tip"
              + " that goes down");

  /** How long half the return takes. */
  public static final MeasureDefinition RETURN_TIME_TO_HALF =
      new MeasureDefinition(
          "returnTimeToHalf",
          "Return: to half the bank",
          "s",
          "from the instant at which all controls are at trim for good until the bank, modulo"
              + " 360 deg, is first half of what it was then");

  /** How long the return to within five degrees takes. */
  public static final MeasureDefinition RETURN_TIME_TO_FIVE_DEGREES =
      new MeasureDefinition(
          "returnTimeToFiveDegrees",
          "Return: to within 5 deg",
          "s",
          "from the instant at which all controls are at trim for good until the bank, modulo"
              + " 360 deg, stays within 5 deg until the end");

  /** How far the return goes beyond wings level. */
  public static final MeasureDefinition RETURN_OVERSHOOT =
      new MeasureDefinition(
          "returnOvershoot",
          "Return: overshoot",
          "rad",
          "largest bank on the other side after passing wings level; 0 when it stays on its side");

  /** Where the manoeuvre ends. */
  public static final MeasureDefinition FINAL_BANK =
      new MeasureDefinition(
          "finalBank", "Bank at the end", "rad", "bank at the end of the manoeuvre, not wrapped");

  /** When a wing whose sections stall no longer damps. */
  public static final MeasureDefinition DAMPING_LOST =
      new MeasureDefinition(
          "dampingLostTime",
          "Roll damping lost at",
          "s",
          "first instant at which sections beyond their stall lose more lift by rolling than the"
              + " rest of the wing gains, so that the wing goes on by itself");

  /** The pedal that held slip would need. */
  public static final MeasureDefinition PEDAL_TO_HOLD_SLIP =
      new MeasureDefinition(
          "pedalToHoldSlip",
          "Pedal to hold the slip",
          "1",
          "largest pedal position, as a fraction of travel, that the yawing moments need for the"
              + " held slip");

  /** How far the bank is from that with free slip. */
  public static final MeasureDefinition FREE_SLIP_BANK_DIFFERENCE =
      new MeasureDefinition(
          "freeSlipBankDifference",
          "Bank, from free slip by",
          "rad",
          "largest difference in bank from the same manoeuvre with free slip");

  /** How far the roll rate is from that with free slip. */
  public static final MeasureDefinition FREE_SLIP_ROLL_RATE_DIFFERENCE =
      new MeasureDefinition(
          "freeSlipRollRateDifference",
          "Roll rate, from free slip by",
          "rad/s",
          "largest difference in roll rate from the same manoeuvre with free slip");

  /** The time to roll out of one turn into the opposite one. */
  public static final MeasureDefinition TIME_BANK_TO_BANK_30 =
      new MeasureDefinition(
          "timeBankToBank30",
          "Time from 30 deg one way to 30 deg the other",
          "s",
          "from the first movement of the control, in a steady turn at 30 deg of bank, to the first"
              + " crossing of 30 deg of bank the other way");

  /**
   * The time to a bank change.
   *
   * @param degrees the change, deg
   * @return the definition, named such as {@code timeToBank30}
   */
  public static MeasureDefinition timeToBank(double degrees) {
    String angle =
        degrees == Math.rint(degrees)
            ? Long.toString((long) degrees)
            : String.format(Locale.ROOT, "%s", degrees);
    return new MeasureDefinition(
        "timeToBank" + angle,
        "Time to " + angle + " deg of bank",
        "s",
        "first crossing of a bank change of " + angle + " deg in the commanded direction");
  }
}
