package org.rolltrace.ui.command;

import java.io.PrintWriter;
import java.math.BigDecimal;
import java.math.MathContext;
import java.util.Locale;
import org.rolltrace.core.aeroplane.Aeroplane;
import org.rolltrace.core.aeroplane.InertiaBasis;
import org.rolltrace.core.aeroplane.SurfaceDynamics;
import org.rolltrace.core.atmosphere.FlightCondition;
import org.rolltrace.core.derivatives.LateralDerivatives;
import org.rolltrace.core.quantity.Quantity;

/** A text in aligned columns, in the units that engineers read beside SI. */
abstract class TextReport {
  private static final int WIDTH = 96;

  private final StringBuilder text = new StringBuilder();

  final void printTo(PrintWriter out) {
    out.print(text);
  }

  static String sizeAndMass(Aeroplane aeroplane) {
    StringBuilder words = new StringBuilder();
    words.append(format("span %.4g m, area %.4g m2", aeroplane.span(), aeroplane.wingArea()));
    aeroplane.mass().ifPresent(mass -> words.append(format(", mass %.5g kg", mass)));
    words.append(format(", inertia in roll %.5g kg m2", aeroplane.inertia().roll()));
    aeroplane.inertia().yaw().ifPresent(yaw -> words.append(format(", yaw %.5g kg m2", yaw)));
    if (aeroplane.inertia().product() != 0) {
      words.append(format(", product %.4g kg m2", aeroplane.inertia().product()));
    }
    if (aeroplane.inertiaBasis() != InertiaBasis.GIVEN) {
      words.append(", ").append(aeroplane.inertiaBasis().words());
    }
    return words.toString();
  }

  static String travel(Aeroplane aeroplane) {
    String ailerons =
        aeroplane
            .ailerons()
            .map(
                a ->
                    "ailerons "
                        + plain(Math.toDegrees(a.up()))
                        + " deg up, "
                        + plain(Math.toDegrees(a.down()))
                        + " deg down"
                        + dynamics(a.dynamics()))
            .orElse("no ailerons given");
    String rudder =
        aeroplane
            .rudder()
            .map(
                r ->
                    "rudder "
                        + plain(Math.toDegrees(r.left()))
                        + " deg left, "
                        + plain(Math.toDegrees(r.right()))
                        + " deg right"
                        + dynamics(r.dynamics()))
            .orElse("no rudder given");
    return ailerons + "; " + rudder;
  }

  private static String dynamics(SurfaceDynamics dynamics) {
    String words = "";
    if (dynamics.rateLimit() < Double.POSITIVE_INFINITY) {
      words += ", at most " + plain(Math.toDegrees(dynamics.rateLimit())) + " deg/s";
    }
    if (dynamics.lag() > 0) {
      words += ", lag " + plain(dynamics.lag()) + " s";
    }
    return words;
  }

  final void addSource(LateralDerivatives derivatives) {
    if (!derivatives.source().isBlank()) {
      wrapped(padded("  derivatives from", 20), derivatives.source());
    }
    if (derivatives.hasGiven()) {
      wrapped(padded("  given as", 20), derivatives.convention());
    }
  }

  final void addAir(FlightCondition condition) {
    row(
        "  pressure altitude",
        format(
            "%.0f ft (%.0f m), %.1f K, density %.4f kg/m3",
            Quantity.toUnit(condition.pressureAltitude(), "ft"),
            condition.pressureAltitude(),
            condition.temperature(),
            condition.density()));
    row(
        "  airspeed",
        format(
            "%.1f kt true, %.1f kt equivalent, %.1f kt calibrated (%.2f m/s true), M %.3f",
            Quantity.toUnit(condition.trueAirspeed(), "kt"),
            Quantity.toUnit(condition.equivalentAirspeed(), "kt"),
            Quantity.toUnit(condition.calibratedAirspeed(), "kt"),
            condition.trueAirspeed(),
            condition.mach()));
  }

  /** As it would be written by hand: up to six figures, no zeros behind. */
  static String plain(double value) {
    return new BigDecimal(value).round(new MathContext(6)).stripTrailingZeros().toPlainString();
  }

  static String derivative(double value) {
    return value == 0 || Math.abs(value) >= 1e-3 ? format("%.5f", value) : number(value);
  }

  /** Four figures, which is what the data behind them are worth at best. */
  static String number(double value) {
    double size = Math.abs(value);
    if (size == 0) {
      return "0";
    }
    if (size < 1e-4 || size >= 1e6) {
      return format("%.3e", value);
    }
    int decimals = (int) Math.max(0, Math.min(6, 3 - Math.floor(Math.log10(size))));
    return format("%." + decimals + "f", value);
  }

  final void row(String label, String value) {
    line(padded(label, 20) + value);
  }

  /** Breaks a text into lines that stand under each other behind a label. */
  final void wrapped(String label, String words) {
    StringBuilder row = new StringBuilder(label);
    int start = label.length();
    for (String word : words.split(" ", -1)) {
      if (row.length() > start && row.length() + 1 + word.length() > WIDTH) {
        line(row.toString());
        row.setLength(0);
        row.append(" ".repeat(start));
      } else if (row.length() > start) {
        row.append(' ');
      }
      row.append(word);
    }
    line(row.toString());
  }

  static String padded(String words, int width) {
    return words.length() >= width ? words + " " : words + " ".repeat(width - words.length());
  }

  /** Titles and names come from files: what would steer a terminal is not passed on to it. */
  final void line(String words) {
    for (int i = 0; i < words.length(); i++) {
      char c = words.charAt(i);
      text.append(Character.isISOControl(c) ? ' ' : c);
    }
    text.append('\n');
  }

  static String format(String pattern, Object... values) {
    return String.format(Locale.ROOT, pattern, values);
  }
}
