package org.rolltrace.core.derivatives;

import static org.rolltrace.core.derivatives.Coefficient.*;

import java.util.List;
import java.util.Set;

/** Two derivatives that mix when axes turn or a product of inertia is worked in. */
record Pair(Coefficient first, Coefficient second) {
  /** Rolling and yawing moment of the same motion. */
  static final List<Pair> OF_MOMENTS =
      List.of(
          new Pair(CL_BETA, CN_BETA),
          new Pair(CL_P, CN_P),
          new Pair(CL_R, CN_R),
          new Pair(CL_DA, CN_DA),
          new Pair(CL_DR, CN_DR));

  /** The same force or moment by roll and by yaw rate. */
  static final List<Pair> OF_RATES =
      List.of(new Pair(CY_P, CY_R), new Pair(CL_P, CL_R), new Pair(CN_P, CN_R));

  /** Adds the one that is missing beside the other. */
  void addMissing(Set<Coefficient> printed, Set<Coefficient> missing) {
    if (printed.contains(first) && !printed.contains(second)) {
      missing.add(second);
    } else if (printed.contains(second) && !printed.contains(first)) {
      missing.add(first);
    }
  }
}
