package org.rolltrace.ui.chart;

import java.util.ArrayList;
import java.util.List;
import org.rolltrace.core.history.Channel;
import org.rolltrace.core.history.TimeHistory;

/** The strips of a flight that goes on: bank, roll rate, sideslip with yaw rate, the hand. */
public final class LiveStrips {
  private static final double WIDTH = 1.8;

  private LiveStrips() {}

  /**
   * The strips. All curves have one ink: such a flight goes to either side.
   *
   * @param history what has been flown, or a piece of it
   * @param hasPedals whether the aeroplane has a rudder to be moved
   * @return bank; roll rate; sideslip and yaw rate; stick and pedal, in per cent of travel
   */
  public static List<Strip> of(TimeHistory history, boolean hasPedals) {
    double[] time = new double[history.size()];
    for (int i = 0; i < time.length; i++) {
      time[i] = history.time(i);
    }
    List<Curve> hands = new ArrayList<>();
    hands.add(curve(history, time, Channel.STICK, "stick", Dash.SOLID));
    if (hasPedals) {
      hands.add(curve(history, time, Channel.PEDAL, "pedal", Dash.DASH_DOT));
    }
    return List.of(
        strip("Bank", "deg", curve(history, time, Channel.BANK, "bank", Dash.SOLID)),
        strip(
            "Roll rate", "deg/s", curve(history, time, Channel.ROLL_RATE, "roll rate", Dash.SOLID)),
        strip(
            "Sideslip, yaw rate",
            "deg, deg/s",
            curve(history, time, Channel.SIDESLIP, "sideslip", Dash.SOLID),
            curve(history, time, Channel.YAW_RATE, "yaw rate", Dash.DASH_DOT)),
        new Strip(RollStrips.HANDS, "% of travel", hands, List.of()));
  }

  private static Strip strip(String title, String unit, Curve... curves) {
    return new Strip(title, unit, List.of(curves), List.of());
  }

  private static Curve curve(
      TimeHistory history, double[] time, Channel channel, String name, Dash dash) {
    double[] value = history.values(channel);
    double factor = channel.unit().startsWith("rad") ? Math.toDegrees(1) : 100;
    for (int i = 0; i < value.length; i++) {
      value[i] *= factor;
    }
    return new Curve(name, time, value, new Stroke(Ink.WING, WIDTH, dash, 1));
  }
}
