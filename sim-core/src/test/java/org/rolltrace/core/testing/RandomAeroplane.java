package org.rolltrace.core.testing;

import static org.rolltrace.core.derivatives.Coefficient.*;

import java.util.EnumMap;
import java.util.Map;
import java.util.Random;
import org.rolltrace.core.aeroplane.Aeroplane;
import org.rolltrace.core.aeroplane.Ailerons;
import org.rolltrace.core.aeroplane.Inertia;
import org.rolltrace.core.aeroplane.Rudder;
import org.rolltrace.core.atmosphere.AirspeedKind;
import org.rolltrace.core.atmosphere.FlightCondition;
import org.rolltrace.core.derivatives.Coefficient;
import org.rolltrace.core.derivatives.LateralDerivatives;
import org.rolltrace.core.scenario.AeroplaneData;

/** Aeroplanes with seeded random values of the size that light aeroplanes have. */
public record RandomAeroplane(AeroplaneData data, FlightCondition condition) {

  /** The aeroplane of a seed. */
  public static RandomAeroplane of(long seed) {
    Random random = new Random(seed);
    double span = between(random, 6, 14);
    double mass = between(random, 300, 2000);
    double ixx = mass * Math.pow(between(random, 0.09, 0.14) * span, 2);
    double izz = ixx * between(random, 1.4, 3);
    double ixz = Math.sqrt(ixx * izz) * between(random, -0.1, 0.1);
    Map<Coefficient, Double> values = new EnumMap<>(Coefficient.class);
    values.put(CY_BETA, -between(random, 0.2, 0.8));
    values.put(CY_P, between(random, -0.1, 0.1));
    values.put(CY_R, between(random, 0.05, 0.3));
    values.put(CY_DA, between(random, -0.02, 0.02));
    values.put(CY_DR, between(random, 0.1, 0.25));
    values.put(CL_BETA, -between(random, 0.04, 0.12));
    values.put(CL_P, -between(random, 0.38, 0.6));
    values.put(CL_R, between(random, 0.05, 0.2));
    values.put(CL_DA, between(random, 0.1, 0.25));
    values.put(CL_DR, between(random, 0.005, 0.02));
    values.put(CN_BETA, between(random, 0.04, 0.12));
    values.put(CN_P, -between(random, 0.02, 0.08));
    values.put(CN_R, -between(random, 0.08, 0.15));
    values.put(CN_DA, -between(random, 0.002, 0.02));
    values.put(CN_DR, -between(random, 0.05, 0.1));
    Aeroplane aeroplane =
        Aeroplane.builder(
                "random " + seed, span, span * between(random, 1, 1.6), Inertia.of(ixx, izz, ixz))
            .mass(mass)
            .ailerons(Ailerons.of(Math.toRadians(20), Math.toRadians(15)))
            .rudder(Rudder.of(Math.toRadians(25), Math.toRadians(20)))
            .build();
    FlightCondition condition =
        FlightCondition.of(between(random, 0, 4000), 0, AirspeedKind.TRUE, between(random, 40, 90));
    return new RandomAeroplane(
        new AeroplaneData(aeroplane, LateralDerivatives.ofGiven(values, "random")), condition);
  }

  private static double between(Random random, double low, double high) {
    return low + (high - low) * random.nextDouble();
  }
}
