/**
 * Resistance of the ground to a blade, by the fundamental earthmoving equation (Reece 1964, McKyes 1985), theory (G1) and
 * on. Angles in rad, stresses in Pa, lengths in m.
 */
package org.rodside.soil;
