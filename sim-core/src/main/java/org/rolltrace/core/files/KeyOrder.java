package org.rolltrace.core.files;

import java.util.List;

/** The order in which keys stand by custom, for those that are added. */
final class KeyOrder {
  private static final List<String> ORDER =
      List.of(
          "format",
          "title",
          "name",
          "note",
          "aeroplane",
          "variant",
          "condition",
          "pressureAltitude",
          "temperatureOffset",
          "density",
          "trueAirspeed",
          "equivalentAirspeed",
          "calibratedAirspeed",
          "loadFactor",
          "flightPathAngle",
          "power",
          "propellerSpeed",
          "slip",
          "heldSlip",
          "time",
          "control",
          "shape",
          "file",
          "column",
          "cutBefore",
          "cutAfter",
          "start",
          "trim",
          "state",
          "bank",
          "rollRate",
          "sideslip",
          "propellerRollMoment",
          "inputs",
          "size",
          "width",
          "unit",
          "pattern",
          "from",
          "to",
          "law",
          "duration",
          "movement",
          "measures",
          "span",
          "wingArea",
          "mass",
          "inertia",
          "lateralImbalance",
          "ailerons",
          "rudder",
          "axes",
          "angleOfAttack",
          "propellers",
          "limits",
          "derivatives");

  private KeyOrder() {}

  /** Behind the last of the keys that come before it; behind all when it has no place by custom. */
  static int placeIn(List<JsonNode.Item> items, String key) {
    int rank = ORDER.indexOf(key);
    if (rank < 0) {
      return items.size();
    }
    int place = 0;
    for (int i = 0; i < items.size(); i++) {
      int other = ORDER.indexOf(items.get(i).key());
      if (other >= 0 && other < rank) {
        place = i + 1;
      }
    }
    return place;
  }
}
