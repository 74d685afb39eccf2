package org.rodside.hydraulics;

import org.rodside.model.Cylinder;
import org.rodside.model.Friction;
import org.rodside.model.Sides;
import org.rodside.model.Tube;

/** Cylinders for the tests, each changed in one respect at a time. Lengths in m, pressures in Pa. */
final class Cylinders {

    private static final double RETRACTED = 1.85;
    private static final double STROKE = 1.165;

    private Cylinders() {}

    /** One cylinder of this bore and rod at 250 bar, relief 280 bar, no friction, no back pressure. */
    static Cylinder plain(double bore, double rod) {
        return with(bore, rod, 1, new Sides(0, 0), Friction.NONE);
    }

    static Cylinder with(double bore, double rod, int count, Sides back, Friction friction) {
        Tube tube = new Tube(RETRACTED - Cylinder.TUBE_LENGTH_ROD_SHARE * rod, Cylinder.TUBE_OUTSIDE_OVER_BORE * bore);
        return make(bore, rod, count, back, friction, tube);
    }

    /** A pair in parallel with everything in it and no two pressures alike: 250/230, relief 280/300, back 3/5 bar. */
    static Cylinder pair() {
        Cylinder even = with(0.125, 0.090, 2, new Sides(3e5, 5e5), new Friction(1600, 0.02));
        return new Cylinder(
                even.name(),
                even.capPin(),
                even.rodPin(),
                even.count(),
                even.bore(),
                even.rod(),
                even.retracted(),
                even.stroke(),
                new Sides(250e5, 230e5),
                new Sides(280e5, 300e5),
                even.back(),
                even.friction(),
                even.mass(),
                even.harderShare(),
                even.tube(),
                even.yield());
    }

    static Cylinder column(double bore, double rod, Tube tube) {
        return make(bore, rod, 1, new Sides(0, 0), Friction.NONE, tube);
    }

    private static Cylinder make(double bore, double rod, int count, Sides back, Friction friction, Tube tube) {
        Sides working = new Sides(250e5, 250e5);
        Sides relief = new Sides(280e5, 280e5);
        return new Cylinder(
                "test",
                "cap-eye",
                "rod-eye",
                count,
                bore,
                rod,
                RETRACTED,
                STROKE,
                working,
                relief,
                back,
                friction,
                190,
                1.0 / count,
                tube,
                Cylinder.DEFAULT_YIELD);
    }
}
