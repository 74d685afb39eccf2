/**
 * Cylinders as hydraulics and as columns: force and pressure, driving and holding limits, friction, twins, flow, buckling.
 *
 * <p>Everywhere in this package a cylinder force is the total of the twins in N, positive when the cylinder pushes
 * (compression) and negative when it pulls (tension), unless a name says {@code each}. Pressures are above the
 * surrounding air, in Pa. Formulas carry the ids of docs/theory.md: (H1) and on for hydraulics, (C1) and on for columns.
 */
package org.rodside.hydraulics;
