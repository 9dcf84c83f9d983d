/**
 * What the aeroplane is: span, area, mass and inertia, its shape where that is known, the travel of
 * its control surfaces, its propellers with their engines, and its own limits. No derivatives live
 * here.
 *
 * <p>Lengths in m, areas in m², masses in kg, inertias in kg m², angles in rad, speeds in m/s,
 * powers in W, speeds of rotation in rad/s. The axes are stability axes through the centre of
 * gravity: x forward along the flight path, y to the right wing, z down. The product of inertia is
 * Ixz = ∫ x z dm, which stands with a minus sign in the inertia matrix [Ixx −Ixz; −Ixz Izz].
 *
 * <h2>Shape</h2>
 *
 * <p>{@link org.rolltrace.core.aeroplane.Geometry} is a wing, and what there is of ailerons,
 * tailplane, fin and body. A wing is trapezoidal panels from the plane of symmetry to the tip, the
 * same on both sides; y is the station in the ground plan, c(y) the chord:
 *
 * <pre>
 * b = 2 y_tip,   S = 2 ∫ c dy = Σ (c_in + c_out)(y_out − y_in),   A = b²/S
 * </pre>
 *
 * <p>with what the body covers. Dihedral Γ is positive with the tip higher, sweep Λ of the
 * quarter-chord line positive backwards, twist positive with more incidence outside (washout is
 * negative). Heights are upwards positive: of the wing above the centre line of the body, of tail
 * and fin above the centre of gravity. Arms are backwards positive from the centre of gravity,
 * along the body.
 *
 * <h2>Mass and inertia</h2>
 *
 * <p>From parts at stations, each spread evenly over a box of length l, width w and height h, about
 * their common centre of gravity (mechanics of the box):
 *
 * <pre>
 * Ixx = Σ m (y² + z² + (w² + h²)/12),   Izz = Σ m (x² + y² + (l² + w²)/12),   Ixz = Σ m x z
 * </pre>
 *
 * <p>or, when nothing better is known, by radii of gyration that propeller aeroplanes usually have,
 * k_x = 0.25 b/2 and k_z = 0.39 (b + l)/4, without a product (J. Roskam, Airplane Design, part V,
 * 1985, app. B, from memory; a fifth either way). {@link org.rolltrace.core.aeroplane.InertiaBasis}
 * says which it was.
 */
package org.rolltrace.core.aeroplane;
