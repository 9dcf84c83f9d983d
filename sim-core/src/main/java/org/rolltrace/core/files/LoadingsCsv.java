package org.rolltrace.core.files;

import java.io.IOException;
import java.util.LinkedHashSet;
import java.util.List;
import java.util.Locale;
import java.util.Set;
import org.rolltrace.core.derivatives.SpanLoads;
import org.rolltrace.core.run.DerivativeReport;
import org.rolltrace.core.run.DerivedAeroplane;

/**
 * How the loads of a wing lie along its span, as CSV: a header with units, then a row a station
 * from the left tip to the right one, closer together towards the tips. Each load is c_l c / (S/b)
 * for one unit of its cause, with full precision.
 */
public final class LoadingsCsv {
  /** Of the angle θ between stations η = −cos θ, from tip to tip. */
  private static final int STEPS = 200;

  private static final int LONGEST_NAME = 60;

  private LoadingsCsv() {}

  /**
   * Writes the loads of one wing.
   *
   * @param loads the loads; the column of the ailerons is left out where they have none
   * @param out receives the text
   * @throws IOException when {@code out} fails
   */
  public static void write(SpanLoads loads, Appendable out) throws IOException {
    List<SpanLoads.Cause> causes = loads.causes();
    out.append("eta[-]");
    for (SpanLoads.Cause cause : causes) {
      out.append(',').append(cause.word()).append('[').append(cause.unit()).append(']');
    }
    out.append('\n');
    for (int i = 0; i <= STEPS; i++) {
      double eta = station(i);
      out.append(Double.toString(eta));
      for (SpanLoads.Cause cause : causes) {
        out.append(',').append(Double.toString(loads.at(cause, eta) + 0.0)); // no −0
      }
      out.append('\n');
    }
  }

  /** Symmetric to the last digit, with the middle at 0. */
  private static double station(int i) {
    int toTheRight = i - STEPS / 2;
    return Math.sin(Math.PI * toTheRight / STEPS) + 0.0;
  }

  /**
   * The name of the file with the loads of an aeroplane of a report.
   *
   * @param report the report
   * @param derived the aeroplane
   * @return {@code loadings.csv} for the base, {@code loadings-clipped-tips.csv} for a variant
   *     "Clipped tips"; no two of a report are the same
   */
  public static String fileName(DerivativeReport report, DerivedAeroplane derived) {
    if (derived.variant().isEmpty()) {
      return "loadings.csv";
    }
    Set<String> taken = new LinkedHashSet<>();
    for (DerivedAeroplane variant : report.variants()) {
      String plain = plain(variant.variant());
      String name = plain;
      for (int i = 2; !taken.add(name); i++) {
        name = plain + "-" + i;
      }
      if (variant.variant().equals(derived.variant())) {
        return "loadings-" + name + ".csv";
      }
    }
    throw new IllegalArgumentException(
        "the report has no variant " + derived.variant() + "; expected one of its own");
  }

  /** Names of variants are any text; names of files are not. */
  private static String plain(String name) {
    String plain =
        name.toLowerCase(Locale.ROOT).replaceAll("[^a-z0-9]+", "-").replaceAll("^-|-$", "");
    String sound = plain.isEmpty() ? "variant" : plain;
    return sound.length() > LONGEST_NAME ? sound.substring(0, LONGEST_NAME) : sound;
  }
}
