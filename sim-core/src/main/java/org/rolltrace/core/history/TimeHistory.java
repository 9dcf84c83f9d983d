package org.rolltrace.core.history;

import java.util.Arrays;

/**
 * Samples of all channels against time. Times do not fall; an instant at which something jumps
 * stands twice, before and after the jump.
 */
public final class TimeHistory {
  private final double sampleRate;
  private final double[] times;

  private final int size;

  /** The samples of each channel at its column. */
  private final double[][] samples;

  private TimeHistory(double sampleRate, int size, double[] times, double[][] samples) {
    this.sampleRate = sampleRate;
    this.size = size;
    this.times = times;
    this.samples = samples;
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
    return size;
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
    return samples[channel.column()][index];
  }

  /**
   * All samples of a channel.
   *
   * @param channel the quantity
   * @return a copy of the values, in the channel's SI unit
   */
  public double[] values(Channel channel) {
    return Arrays.copyOf(samples[channel.column()], size);
  }

  /**
   * The largest sample of a channel, whatever its sign.
   *
   * @param channel the quantity
   * @return 0 or more, in the channel's SI unit
   */
  public double largest(Channel channel) {
    double[] values = samples[channel.column()];
    double largest = 0;
    for (int i = 0; i < size; i++) {
      double value = Math.abs(values[i]);
      if (value > largest) {
        largest = value;
      }
    }
    return largest;
  }

  /**
   * The last sample at or before an instant.
   *
   * @param time s
   * @return its index; 0 when the instant lies before the first sample
   */
  public int lastAt(double time) {
    int low = 0;
    int high = size;
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
    int[] indices = new int[size];
    int count = 0;
    for (int i = 0; i < size; i++) {
      boolean lastOfInstant = i + 1 == size || times[i + 1] > times[i];
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
    private final double[][] samples;
    private int size;

    private Recorder(double sampleRate, int capacity) {
      this.sampleRate = sampleRate;
      this.times = new double[Math.max(capacity, 4)];
      this.samples = new double[Channel.COUNT][times.length];
    }

    /**
     * Takes a sample. One that repeats the last in time and every channel is left out.
     *
     * @param time s, not before the last one
     * @param row the values in SI units, each channel at its column; copied
     * @throws IllegalArgumentException when the time falls or a value is not finite
     */
    public void add(double time, double[] row) {
      if (size > 0 && !(time >= times[size - 1])) {
        throw new IllegalArgumentException(
            "sample time is " + time + " s; expected " + times[size - 1] + " s or later");
      }
      for (double value : row) {
        if (!(Math.abs(value) <= Double.MAX_VALUE)) {
          throw new IllegalArgumentException(
              "a channel is " + value + " at " + time + " s; expected a finite number");
        }
      }
      if (repeatsLast(time, row)) {
        return;
      }
      if (size == times.length) {
        times = Arrays.copyOf(times, 2 * size);
        for (int i = 0; i < samples.length; i++) {
          samples[i] = Arrays.copyOf(samples[i], 2 * size);
        }
      }
      times[size] = time;
      for (int i = 0; i < samples.length; i++) {
        samples[i][size] = row[i];
      }
      size++;
    }

    private boolean repeatsLast(double time, double[] row) {
      if (size == 0 || times[size - 1] != time) {
        return false;
      }
      for (int i = 0; i < samples.length; i++) {
        if (samples[i][size - 1] != row[i]) {
          return false;
        }
      }
      return true;
    }

    /**
     * The number of samples so far.
     *
     * @return the number
     */
    public int size() {
      return size;
    }

    /**
     * The history so far; the recorder takes no more samples.
     *
     * @return the history
     */
    public TimeHistory finish() {
      return new TimeHistory(sampleRate, size, times, samples);
    }
  }
}
