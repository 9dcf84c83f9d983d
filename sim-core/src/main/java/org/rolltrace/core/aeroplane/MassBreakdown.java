package org.rolltrace.core.aeroplane;

import java.util.List;

/**
 * Mass and moments of inertia from parts at stations, about their common centre of gravity:
 *
 * <pre>
 * Ixx = Σ m (y² + z² + (w² + h²)/12),   Izz = Σ m (x² + y² + (l² + w²)/12),   Ixz = Σ m x z
 * </pre>
 *
 * <p>each part spread evenly over its length l, width w and height h (mechanics of the box).
 *
 * @param items at least one
 */
public record MassBreakdown(List<MassItem> items) {

  public MassBreakdown {
    items = List.copyOf(items);
    if (items.isEmpty()) {
      throw new IllegalArgumentException("there are no masses; expected at least one");
    }
  }

  /**
   * The mass.
   *
   * @return kg
   */
  public double mass() {
    return items.stream().mapToDouble(MassItem::whole).sum();
  }

  /**
   * The moments of inertia about axes through the centre of gravity, parallel to those of the
   * stations.
   *
   * @return the inertia
   * @throws IllegalArgumentException when the parts have no extent about roll or yaw
   */
  public Inertia inertia() {
    double mass = mass();
    double xg = items.stream().mapToDouble(item -> item.whole() * item.x()).sum() / mass;
    double zg = items.stream().mapToDouble(item -> item.whole() * item.z()).sum() / mass;
    double yg =
        items.stream().filter(item -> !item.pair()).mapToDouble(i -> i.mass() * i.y()).sum() / mass;
    double roll = 0;
    double yaw = 0;
    double product = 0;
    for (MassItem item : items) {
      double x = item.x() - xg;
      double z = item.z() - zg;
      double l2 = item.length() * item.length() / 12;
      double w2 = item.width() * item.width() / 12;
      double h2 = item.height() * item.height() / 12;
      for (int side = item.pair() ? -1 : 1; side <= 1; side += 2) {
        double y = side * item.y() - yg;
        roll += item.mass() * (y * y + z * z + w2 + h2);
        yaw += item.mass() * (x * x + y * y + l2 + w2);
        product += item.mass() * x * z;
      }
    }
    return Inertia.of(roll, yaw, product);
  }
}
