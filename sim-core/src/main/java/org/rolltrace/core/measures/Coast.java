package org.rolltrace.core.measures;

import static org.rolltrace.core.measures.MeasureDefinition.BANK_COAST;

import java.util.OptionalDouble;
import org.rolltrace.core.history.TimeHistory;

/** How far the aeroplane rolls on after the stick is centred. */
final class Coast {
  private static final double FADED = 0.05;

  private Coast() {}

  static Measure of(Manoeuvre manoeuvre) {
    OptionalDouble centring = manoeuvre.programme().firstCentring();
    if (centring.isEmpty()) {
      return Measure.missing(BANK_COAST, "the stick is never centred");
    }
    double start = centring.getAsDouble();
    if (start >= manoeuvre.duration()) {
      return Measure.missing(BANK_COAST, "the stick is centred after the end of the manoeuvre");
    }
    TimeHistory history = manoeuvre.history();
    double rateThen = Curve.ofRollRate(history, 1).at(start);
    if (rateThen == 0) {
      return Measure.missing(BANK_COAST, "it is not rolling when the stick is centred");
    }
    double side = Math.signum(rateThen);
    Curve rate = Curve.ofRollRate(history, side);
    Curve bank = Curve.ofBank(history, 1, 0);
    double faded = FADED * Math.abs(rateThen);
    for (int i = rate.indexAt(start); i + 1 < rate.size(); i++) {
      boolean fades = rate.value(i + 1) <= faded;
      boolean bottoms = rate.slope(i) < 0 && rate.slope(i + 1) >= 0;
      if (fades || bottoms) {
        double end = fades ? rate.crossing(i, faded, rate.time(i)) : rate.turn(i);
        return Measure.of(
            BANK_COAST,
            bank.at(end) - bank.at(start),
            Remark.of(
                "in %.2f s; roll rate left over %.2g deg/s",
                end - start, Math.toDegrees(side * rate.at(end))));
      }
    }
    return Measure.missing(BANK_COAST, "the roll rate has not faded by the end of the manoeuvre");
  }
}
