package org.rolltrace.core.aeroplane;

import org.rolltrace.core.quantity.Check;

/**
 * A part of the mass.
 *
 * @param name what it is
 * @param mass kg, above 0; of each when it is a pair
 * @param x forward of any one point of reference, m
 * @param y to the right of the plane of symmetry, m
 * @param z below the point of reference, m
 * @param length along x over which it is spread evenly, m, 0 or more
 * @param width along y, m, 0 or more
 * @param height along z, m, 0 or more
 * @param pair whether the same is on the other side as well
 */
public record MassItem(
    String name,
    double mass,
    double x,
    double y,
    double z,
    double length,
    double width,
    double height,
    boolean pair) {

  public MassItem {
    if (name.isBlank()) {
      throw new IllegalArgumentException("name of a mass is blank; expected some text");
    }
    Check.positive("mass, kg,", mass);
    Check.finite("x of a mass, m,", x);
    Check.finite("y of a mass, m,", y);
    Check.finite("z of a mass, m,", z);
    Check.notNegative("length of a mass, m,", length);
    Check.notNegative("width of a mass, m,", width);
    Check.notNegative("height of a mass, m,", height);
  }

  /** Of one, or of both when it is a pair. */
  double whole() {
    return pair ? 2 * mass : mass;
  }
}
