/** Drawn linkage to mechanism, once; strokes to positions, velocities and accelerations, millions of times. */
package org.rodside.kinematics;
