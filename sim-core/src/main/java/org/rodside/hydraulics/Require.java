package org.rodside.hydraulics;

import org.rodside.model.Cylinder;

/** Checks at the doors of this package: a value that makes no sense is refused with its name, its value and the range. */
final class Require {

    private Require() {}

    /** Returns the cylinder when its numbers describe a cylinder at all. */
    static Cylinder cylinder(Cylinder cylinder) {
        String name = cylinder.name();
        positive(name + ".rod", cylinder.rod());
        if (!(cylinder.rod() < cylinder.bore()) || !Double.isFinite(cylinder.bore())) {
            throw new IllegalArgumentException(name + ".bore must be larger than the rod, " + cylinder.rod()
                    + " m, was " + cylinder.bore() + " m");
        }
        if (cylinder.count() < 1) {
            throw new IllegalArgumentException(name + ".count must be 1 or more, was " + cylinder.count());
        }
        double share = cylinder.friction().share();
        if (!(share >= 0 && share < 1)) {
            throw new IllegalArgumentException(name + ".friction.share must be 0 to below 1, was " + share);
        }
        notNegative(name + ".friction.constant", cylinder.friction().constant());
        return cylinder;
    }

    static double positive(String name, double value) {
        if (!(value > 0) || value == Double.POSITIVE_INFINITY) {
            throw new IllegalArgumentException(name + " must be above 0 and finite, was " + value);
        }
        return value;
    }

    static double notNegative(String name, double value) {
        if (!(value >= 0) || value == Double.POSITIVE_INFINITY) {
            throw new IllegalArgumentException(name + " must be 0 or more and finite, was " + value);
        }
        return value;
    }
}
