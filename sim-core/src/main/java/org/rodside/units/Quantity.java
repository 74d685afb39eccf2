package org.rodside.units;

/** The kinds of number that Rodside prints. */
public enum Quantity {
    LENGTH,
    AREA,
    ANGLE,
    FORCE,
    PRESSURE,
    MASS,
    MOMENT,
    SPEED,
    FLOW,
    POWER,
    ENERGY,
    TIME,
    VOLUME,
    /** Fractions, factors, counts, names: no unit and no suffix. */
    NONE
}
