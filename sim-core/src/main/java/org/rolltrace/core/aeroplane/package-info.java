/**
 * What the aeroplane is: span, area, mass and inertia, the travel of its control surfaces, its
 * propellers with their engines, and its own limits. No derivatives live here.
 *
 * <p>Lengths in m, areas in m², masses in kg, inertias in kg m², angles in rad, speeds in m/s,
 * powers in W, speeds of rotation in rad/s. The axes are stability axes through the centre of
 * gravity: x forward along the flight path, y to the right wing, z down. The product of inertia is
 * Ixz = ∫ x z dm, which stands with a minus sign in the inertia matrix [Ixx −Ixz; −Ixz Izz].
 */
package org.rolltrace.core.aeroplane;
