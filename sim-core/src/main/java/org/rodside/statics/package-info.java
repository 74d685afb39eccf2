/** Pose and loads to cylinder and bearing forces, and the loads that motion makes. */
package org.rodside.statics;
