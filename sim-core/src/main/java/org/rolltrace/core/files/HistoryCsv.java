package org.rolltrace.core.files;

import java.io.IOException;
import org.rolltrace.core.history.Channel;
import org.rolltrace.core.history.TimeHistory;

/**
 * A time history as CSV: a header with units, then one row at every even sample from 0 to the end,
 * in the units engineers read (deg, deg/s), with full precision.
 */
public final class HistoryCsv {
  private HistoryCsv() {}

  /**
   * Writes a history.
   *
   * @param history what is written
   * @param out receives the text
   * @throws IOException when {@code out} fails
   */
  public static void write(TimeHistory history, Appendable out) throws IOException {
    Channel[] channels = Channel.values();
    out.append("time[s]");
    for (Channel channel : channels) {
      out.append(',').append(channel.label()).append('[').append(unitOf(channel)).append(']');
    }
    out.append('\n');
    for (int index : history.evenSamples()) {
      out.append(Double.toString(history.time(index)));
      for (Channel channel : channels) {
        double value = history.value(channel, index);
        out.append(',').append(Double.toString(isAngle(channel) ? Math.toDegrees(value) : value));
      }
      out.append('\n');
    }
  }

  private static boolean isAngle(Channel channel) {
    return channel.unit().startsWith("rad");
  }

  private static String unitOf(Channel channel) {
    return isAngle(channel) ? "deg" + channel.unit().substring("rad".length()) : channel.unit();
  }
}
