package org.rodside.soil;

/**
 * Ground as the earthmoving equation sees it.
 *
 * @param density in place; in kg/m³
 * @param cohesion in Pa
 * @param friction angle of internal friction φ; in rad
 * @param wallFriction angle of friction between ground and blade δ; in rad
 * @param adhesion between ground and blade; in Pa
 * @param surcharge pressure on the surface in front of the blade; in Pa
 */
public record Ground(
        double density, double cohesion, double friction, double wallFriction, double adhesion, double surcharge) {}
