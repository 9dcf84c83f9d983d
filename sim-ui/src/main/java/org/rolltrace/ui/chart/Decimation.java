package org.rolltrace.ui.chart;

import java.util.Arrays;

/**
 * The points of a curve that a plot can show: of each column of px the first and the last one, and
 * the extremes between them. What is drawn looks the same, at a cost bounded by the width.
 */
final class Decimation {
  /** More points than this in a column are thinned. */
  private static final int DENSE = 3;

  /** A line may pass a point at this distance, px: less than anyone can see. */
  private static final double UNSEEN = 0.15;

  private Decimation() {}

  /** The first sample that matters in a window: the last one before it, so that lines enter it. */
  static int start(double[] time, TimeWindow window) {
    return Math.max(0, firstNotBefore(time, window.from()) - 1);
  }

  /** One past the last sample that matters in a window. */
  static int end(double[] time, TimeWindow window) {
    int index = firstNotBefore(time, Math.nextUp(window.to()));
    return Math.min(time.length, index + 1);
  }

  private static int firstNotBefore(double[] time, double instant) {
    int low = 0;
    int high = time.length;
    while (low < high) {
      int middle = (low + high) >>> 1;
      if (time[middle] < instant) {
        low = middle + 1;
      } else {
        high = middle;
      }
    }
    return low;
  }

  static Mark.Polyline polyline(Curve curve, PlotArea area) {
    double[] time = curve.time();
    double[] value = curve.value();
    int start = start(time, area.time());
    int end = end(time, area.time());
    boolean thin = end - start > DENSE * area.width();
    double[] x = new double[thin ? 4 * (int) (area.width() + 4) : end - start];
    double[] y = new double[x.length];
    int size = 0;
    if (!thin) {
      for (int i = start; i < end; i++) {
        x[size] = area.xOf(time[i]);
        y[size++] = area.yOf(value[i]);
      }
      return straightened(x, y, curve.stroke());
    }
    double perSecond = area.width() / area.time().length();
    int i = start;
    while (i < end) {
      double column = Math.floor((time[i] - area.time().from()) * perSecond);
      double untilTime = area.time().from() + (column + 1) / perSecond;
      int first = i;
      int least = i;
      int most = i;
      double low = value[i];
      double high = low;
      for (i++; i < end && time[i] < untilTime; i++) {
        double one = value[i];
        if (one < low) {
          low = one;
          least = i;
        } else if (one > high) {
          high = one;
          most = i;
        }
      }
      int before = -1;
      int[] kept = {first, Math.min(least, most), Math.max(least, most), i - 1};
      for (int index : kept) {
        if (index > before) {
          x[size] = area.xOf(time[index]);
          y[size++] = area.yOf(value[index]);
          before = index;
        }
      }
    }
    return new Mark.Polyline(Arrays.copyOf(x, size), Arrays.copyOf(y, size), curve.stroke());
  }

  /**
   * The same line without the points that lie on it: from each kept point as far as one straight
   * line passes all points between within {@link #UNSEEN}. Painting costs by the piece.
   */
  private static Mark.Polyline straightened(double[] x, double[] y, Stroke stroke) {
    int size = Math.min(1, x.length);
    int anchor = 0;
    double least = Double.NEGATIVE_INFINITY;
    double most = Double.POSITIVE_INFINITY;
    double[] keptX = x.clone();
    double[] keptY = y.clone();
    for (int i = 1; i < x.length; i++) {
      double run = x[i] - x[anchor];
      double slope = (y[i] - y[anchor]) / run;
      boolean straight = run > 0 && slope >= least && slope <= most;
      if (!straight && anchor < i - 1) {
        anchor = i - 1;
        keptX[size] = x[anchor];
        keptY[size++] = y[anchor];
        run = x[i] - x[anchor];
        least = Double.NEGATIVE_INFINITY;
        most = Double.POSITIVE_INFINITY;
      }
      if (run > 0) {
        least = Math.max(least, (y[i] - UNSEEN - y[anchor]) / run);
        most = Math.min(most, (y[i] + UNSEEN - y[anchor]) / run);
      } else {
        anchor = i; // a jump
        keptX[size] = x[i];
        keptY[size++] = y[i];
        least = Double.NEGATIVE_INFINITY;
        most = Double.POSITIVE_INFINITY;
      }
    }
    if (anchor < x.length - 1) {
      keptX[size] = x[x.length - 1];
      keptY[size++] = y[x.length - 1];
    }
    return new Mark.Polyline(Arrays.copyOf(keptX, size), Arrays.copyOf(keptY, size), stroke);
  }

  /** The value of a curve at an instant, and that of its nearest end outside of it. */
  static double valueAt(Curve curve, double instant) {
    double[] time = curve.time();
    int next = firstNotBefore(time, instant);
    if (next == 0) {
      return curve.value()[0];
    }
    if (next == time.length) {
      return curve.value()[next - 1];
    }
    double share = (instant - time[next - 1]) / (time[next] - time[next - 1]);
    return curve.value()[next - 1] + share * (curve.value()[next] - curve.value()[next - 1]);
  }
}
