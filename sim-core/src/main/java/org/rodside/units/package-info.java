/** Units: the only place where a conversion factor is written. */
package org.rodside.units;
