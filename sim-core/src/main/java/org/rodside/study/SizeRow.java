package org.rodside.study;

import org.rodside.model.Cylinder;

/**
 * One bore and rod for one cylinder under the worst loads of the drawn machine.
 *
 * @param index index of the cylinder in the file
 * @param cylinder the cylinder with this bore and rod
 * @param pushPressure cap side pressure that the worst push asks for; in Pa
 * @param pullPressure rod side pressure that the worst pull asks for; in Pa
 * @param bucklingFactor smallest buckling factor over all poses; no unit, infinite where nothing pushes
 * @param loadedFactor as the buckling factor for the loaded column limited by rod stress, at the same pose; NaN if not asked
 * @param mass estimated mass of one cylinder's tube and rod; in kg
 * @param pushFlow flow into the cap sides at the speed asked; in m³/s, all twins
 * @param pullFlow flow into the rod sides at the speed asked; in m³/s, all twins
 * @param present whether this is the cylinder of the file
 * @param carries whether pressures and buckling factor are within what was asked
 */
public record SizeRow(
        int index,
        Cylinder cylinder,
        double pushPressure,
        double pullPressure,
        double bucklingFactor,
        double loadedFactor,
        double mass,
        double pushFlow,
        double pullFlow,
        boolean present,
        boolean carries) {}
