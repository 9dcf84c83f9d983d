package org.rolltrace.core.quantity;

import java.util.ArrayList;
import java.util.LinkedHashSet;
import java.util.List;
import java.util.Locale;
import java.util.Map;
import java.util.Set;

/** What the writer of an unknown symbol may have meant. */
final class UnitSuggestions {
  /** Other spellings in use, in lower case except where that makes a difference. */
  private static final Map<String, String> OTHER_SPELLINGS =
      Map.ofEntries(
          Map.entry("foot", "ft"),
          Map.entry("feet", "ft"),
          Map.entry("'", "ft"),
          Map.entry("inch", "in"),
          Map.entry("inches", "in"),
          Map.entry("\"", "in"),
          Map.entry("metre", "m"),
          Map.entry("metres", "m"),
          Map.entry("meter", "m"),
          Map.entry("meters", "m"),
          Map.entry("mile", "mi"),
          Map.entry("miles", "mi"),
          Map.entry("nmi", "NM"),
          Map.entry("sec", "s"),
          Map.entry("secs", "s"),
          Map.entry("second", "s"),
          Map.entry("seconds", "s"),
          Map.entry("minute", "min"),
          Map.entry("minutes", "min"),
          Map.entry("hr", "h"),
          Map.entry("hrs", "h"),
          Map.entry("hour", "h"),
          Map.entry("hours", "h"),
          Map.entry("pound", "lb"),
          Map.entry("pounds", "lb"),
          Map.entry("lbm", "lb"),
          Map.entry("tonne", "t"),
          Map.entry("tonnes", "t"),
          Map.entry("kn", "kt"),
          Map.entry("knot", "kt"),
          Map.entry("knots", "kt"),
          Map.entry("kph", "km/h"),
          Map.entry("kmh", "km/h"),
          Map.entry("mps", "m/s"),
          Map.entry("fps", "ft/s"),
          Map.entry("degree", "deg"),
          Map.entry("degrees", "deg"),
          Map.entry("degs", "deg"),
          Map.entry("°", "deg"),
          Map.entry("radian", "rad"),
          Map.entry("radians", "rad"),
          Map.entry("rps", "rev/s"),
          Map.entry("dps", "deg/s"),
          Map.entry("c", "degC"),
          Map.entry("°c", "degC"),
          Map.entry("f", "degF"),
          Map.entry("°f", "degF"),
          Map.entry("r", "degR"),
          Map.entry("°r", "degR"),
          Map.entry("Nm", "N m"),
          Map.entry("ftlb", "ft lbf"),
          Map.entry("ft-lb", "ft lbf"),
          Map.entry("lbft", "lbf ft"),
          Map.entry("lb-ft", "lbf ft"));

  private UnitSuggestions() {}

  /** The end of a message about an unknown symbol with its exponent: a question, or nothing. */
  static String after(String symbol, String exponent) {
    Set<String> meant = new LinkedHashSet<>();
    String other = otherSpelling(symbol);
    if (other != null) {
      meant.add(other);
    }
    List<String> near = new ArrayList<>();
    for (String known : UnitSymbols.TABLE.keySet()) {
      if (known.equalsIgnoreCase(symbol)) {
        meant.add(known);
      } else if (isNear(known, symbol)) {
        near.add(known);
      }
    }
    if (meant.isEmpty()) {
      String plain = withoutSigns(symbol + exponent);
      if (isUnit(plain)) {
        return question(List.of(plain));
      }
      near.sort(null);
      meant.addAll(near);
    }
    if (!exponent.isEmpty()) {
      meant.removeIf(unit -> !UnitSymbols.TABLE.containsKey(unit));
    }
    return question(meant.stream().map(unit -> unit + exponent).toList());
  }

  private static String otherSpelling(String symbol) {
    String exact = OTHER_SPELLINGS.get(symbol);
    return exact != null ? exact : OTHER_SPELLINGS.get(symbol.toLowerCase(Locale.ROOT));
  }

  /** The same in the signs of the grammar. */
  private static String withoutSigns(String text) {
    return text.replace("^", "")
        .replace('²', '2')
        .replace('³', '3')
        .replace('⁻', '-')
        .replace('¹', '1')
        .replace('−', '-')
        .replace('·', ' ')
        .replace('⋅', ' ')
        .replace('.', ' ')
        .replace("°", "deg")
        .replaceAll("-(?=\\p{Alpha})", " ");
  }

  private static boolean isUnit(String text) {
    for (String factor : text.split(" ", -1)) {
      if (!UnitSymbols.TABLE.containsKey(factor.replaceFirst("-?[1-9]$", ""))) {
        return false;
      }
    }
    return true;
  }

  private static String question(List<String> meant) {
    if (meant.isEmpty()) {
      return "";
    }
    return "; did you mean '"
        + String.join("' or '", meant.subList(0, Math.min(3, meant.size())))
        + "'?";
  }

  /** One letter more, less or different, or two neighbours exchanged; not for the shortest. */
  private static boolean isNear(String known, String given) {
    if (known.length() < 2 || given.length() < 3) {
      return false;
    }
    int same = 0;
    int shorter = Math.min(known.length(), given.length());
    while (same < shorter && known.charAt(same) == given.charAt(same)) {
      same++;
    }
    String k = known.substring(same);
    String g = given.substring(same);
    return switch (k.length() - g.length()) {
      case 1 -> k.substring(1).equals(g);
      case -1 -> g.substring(1).equals(k);
      case 0 ->
          k.substring(1).equals(g.substring(1))
              || (k.length() > 1
                  && k.charAt(0) == g.charAt(1)
                  && k.charAt(1) == g.charAt(0)
                  && k.substring(2).equals(g.substring(2)));
      default -> false;
    };
  }
}
