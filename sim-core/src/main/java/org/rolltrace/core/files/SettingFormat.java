package org.rolltrace.core.files;

import java.util.Optional;
import java.util.OptionalDouble;
import org.rolltrace.core.propeller.PowerSetting;
import org.rolltrace.core.propeller.PropellerMoments;
import org.rolltrace.core.propeller.PropellerSetting;
import org.rolltrace.core.quantity.Dimension;

/** What a condition, or a trim, says of the propellers. */
final class SettingFormat {
  static final String POWER = "power";
  static final String PROPELLER_SPEED = "propellerSpeed";
  static final String PROPELLER_ROLL_MOMENT = "propellerRollMoment";

  /** What a condition may say; a trim has no speed. */
  static final String[] KEYS = {POWER, PROPELLER_SPEED, PROPELLER_ROLL_MOMENT};

  private SettingFormat() {}

  /** The setting, the fallback where nothing is said; empty when something was refused. */
  static Optional<PropellerSetting> read(ObjectCursor in, PropellerSetting fallback) {
    double power = in.quantity(POWER, Dimension.POWER, Range.ZERO_OR_MORE, 0);
    double speed = in.quantity(PROPELLER_SPEED, Dimension.ANGULAR_RATE, Range.ABOVE_ZERO, 0);
    double roll = in.quantity(PROPELLER_ROLL_MOMENT, Dimension.MOMENT, Range.ANY, 0);
    if (in.has(POWER) && in.has(PROPELLER_ROLL_MOMENT)) {
      in.refuse(
          PROPELLER_ROLL_MOMENT,
          "power and propellerRollMoment stand together; keep one, the moment follows from the"
              + " power");
      return Optional.empty();
    }
    if (in.has(PROPELLER_SPEED) && !in.has(POWER)) {
      in.refuse(
          PROPELLER_SPEED, "propellerSpeed says nothing without power; give power, or take it out");
      return Optional.empty();
    }
    if (Double.isNaN(power) || Double.isNaN(speed) || Double.isNaN(roll)) {
      return Optional.empty();
    }
    if (in.has(POWER)) {
      return Optional.of(
          new PowerSetting(
              power, in.has(PROPELLER_SPEED) ? OptionalDouble.of(speed) : OptionalDouble.empty()));
    }
    return Optional.of(in.has(PROPELLER_ROLL_MOMENT) ? new PropellerMoments(roll) : fallback);
  }
}
