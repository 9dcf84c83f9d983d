package org.rolltrace.core.history;

import java.util.Arrays;
import java.util.EnumMap;

/**
 * Samples of all channels against time. Times do not fall; an instant at which something jumps
 * stands twice, before and after the jump.
 */
public final class TimeHistory {
  private final double sampleRate;
  private final double[] times;
  private final EnumMap<Channel, double[]> values;

  private TimeHistory(double sampleRate, double[] times, EnumMap<Channel, double[]> values) {
    this.sampleRate = sampleRate;
    this.times = times;
    this.values = values;
  }

  /**
   * The rate of the even samples; others may stand between them.
   *
   * @return samples a second
   */
  public double sampleRate() {
    return sampleRate;
  }

  /**
   * The number of samples.
   *
   * @return the number
   */
  public int size() {
    return times.length;
  }

  /**
   * The time of a sample.
   *
   * @param index from 0
   * @return s
   */
  public double time(int index) {
    return times[index];
  }

  /**
   * A sample.
   *
   * @param channel the quantity
   * @param index from 0
   * @return the value in the channel's SI unit
   */
  public double value(Channel channel, int index) {
    return values.get(channel)[index];
  }

  /**
   * All samples of a channel.
   *
   * @param channel the quantity
   * @return a copy of the values, in the channel's SI unit
   */
  public double[] values(Channel channel) {
    return values.get(channel).clone();
  }

  /**
   * The last sample at or before an instant.
   *
   * @param time s
   * @return its index; 0 when the instant lies before the first sample
   */
  public int lastAt(double time) {
    int low = 0;
    int high = times.length;
    while (high - low > 1) {
      int middle = (low + high) >>> 1;
      if (times[middle] <= time) {
        low = middle;
      } else {
        high = middle;
      }
    }
    return low;
  }

  /**
   * The samples at k/sampleRate, k = 0, 1, …: of an instant that stands twice, the one after the
   * jump.
   *
   * @return their indices
   */
  public int[] evenSamples() {
    int[] indices = new int[times.length];
    int count = 0;
    for (int i = 0; i < times.length; i++) {
      boolean lastOfInstant = i + 1 == times.length || times[i + 1] > times[i];
      if (times[i] == count / sampleRate && lastOfInstant) {
        indices[count++] = i;
      }
    }
    return Arrays.copyOf(indices, count);
  }

  /**
   * Starts a history.
   *
   * @param sampleRate the rate of the even samples, 1/s
   * @param capacity how many samples are expected
   * @return an empty recorder
   */
  public static Recorder recorder(double sampleRate, int capacity) {
    return new Recorder(sampleRate, capacity);
  }

  /** Takes samples in the order of time. */
  public static final class Recorder {
    private final double sampleRate;
    private double[] times;
    private final EnumMap<Channel, double[]> values = new EnumMap<>(Channel.class);
    private int size;

    private Recorder(double sampleRate, int capacity) {
      this.sampleRate = sampleRate;
      this.times = new double[Math.max(capacity, 4)];
      for (Channel channel : Channel.values()) {
        values.put(channel, new double[times.length]);
      }
    }

    /**
     * Begins a sample; its channels are then {@link #set}.
     *
     * @param time s, not before the last one
     */
    public void begin(double time) {
      if (size > 0 && !(time >= times[size - 1])) {
        throw new IllegalArgumentException(
            "sample time is " + time + " s; expected " + times[size - 1] + " s or later");
      }
      if (size == times.length) {
        times = Arrays.copyOf(times, 2 * size);
        values.replaceAll((channel, samples) -> Arrays.copyOf(samples, 2 * size));
      }
      times[size++] = time;
    }

    /**
     * Sets a channel of the sample that was begun last.
     *
     * @param channel the quantity
     * @param value in the channel's SI unit, finite
     */
    public void set(Channel channel, double value) {
      if (!(Math.abs(value) <= Double.MAX_VALUE)) {
        throw new IllegalArgumentException(
            channel.label() + " is " + value + " at " + times[size - 1] + " s; expected a number");
      }
      values.get(channel)[size - 1] = value;
    }

    /** Takes the last sample back when it repeats the one before it in time and every channel. */
    public void dropIfRepeated() {
      if (size < 2 || times[size - 1] != times[size - 2]) {
        return;
      }
      for (double[] samples : values.values()) {
        if (samples[size - 1] != samples[size - 2]) {
          return;
        }
      }
      size--;
    }

    /**
     * The history so far.
     *
     * @return the history
     */
    public TimeHistory finish() {
      EnumMap<Channel, double[]> taken = new EnumMap<>(values);
      taken.replaceAll((channel, samples) -> Arrays.copyOf(samples, size));
      return new TimeHistory(sampleRate, Arrays.copyOf(times, size), taken);
    }
  }
}
