/** Turning points, rainflow counts, equivalent ranges, damage: on streams of numbers in any unit, of no machine. */
package org.rodside.fatigue;
