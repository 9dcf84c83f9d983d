package org.rolltrace.ui.chart;

import java.util.Arrays;

/**
 * Puts things of some length side by side on a line, each as near to where it belongs as the others
 * let it: least squares under the order given, by pooling neighbours that press on each other.
 */
final class Spread {
  private Spread() {}

  /**
   * Finds where things stand.
   *
   * @param wanted where the middles belong, not falling
   * @param lengths of the things
   * @param low where the line begins
   * @param high where it ends; passed only when the things are longer than the line
   * @return where the middles stand
   */
  static double[] apart(double[] wanted, double[] lengths, double low, double high) {
    int count = wanted.length;
    double[] offsets = new double[count];
    double total = 0;
    for (int i = 0; i < count; i++) {
      offsets[i] = total + 0.5 * lengths[i];
      total += lengths[i];
    }
    double[] means = new double[count];
    int[] sizes = new int[count];
    int blocks = 0;
    for (int i = 0; i < count; i++) {
      means[blocks] = wanted[i] - offsets[i];
      sizes[blocks] = 1;
      blocks++;
      while (blocks > 1 && means[blocks - 2] > means[blocks - 1]) {
        int both = sizes[blocks - 2] + sizes[blocks - 1];
        means[blocks - 2] =
            (sizes[blocks - 2] * means[blocks - 2] + sizes[blocks - 1] * means[blocks - 1]) / both;
        sizes[blocks - 2] = both;
        blocks--;
      }
    }
    double[] placed = new double[count];
    int next = 0;
    for (int block = 0; block < blocks; block++) {
      double sound = Math.max(low, Math.min(high - total, means[block]));
      Arrays.fill(placed, next, next + sizes[block], sound);
      next += sizes[block];
    }
    for (int i = 0; i < count; i++) {
      placed[i] += offsets[i];
    }
    return placed;
  }
}
