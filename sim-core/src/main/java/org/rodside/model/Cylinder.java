package org.rodside.model;

/**
 * One cylinder, or {@code count} of them side by side, as drawn. Forces and masses are each unless said.
 *
 * @param name name in the linkage file
 * @param capPin name of the pin at the cap end
 * @param rodPin name of the pin at the rod end
 * @param count number of equal cylinders side by side
 * @param bore bore diameter; in m
 * @param rod rod diameter; in m
 * @param retracted pin-to-pin length when retracted; in m
 * @param stroke stroke; in m
 * @param working pump pressure that can reach each side; in Pa
 * @param relief line relief pressure of each side when the circuit is blocked; in Pa
 * @param back pressure left on the side being emptied; in Pa
 * @param friction friction while driving
 * @param mass mass of each cylinder; in kg, half of it hangs on each of its pins
 * @param harderShare share of the total force that the harder-worked cylinder takes, 1/count to 1; no unit
 * @param tube tube dimensions for buckling
 * @param yield yield stress of the rod; in Pa
 */
public record Cylinder(
        String name,
        String capPin,
        String rodPin,
        int count,
        double bore,
        double rod,
        double retracted,
        double stroke,
        Sides working,
        Sides relief,
        Sides back,
        Friction friction,
        double mass,
        double harderShare,
        Tube tube,
        double yield) {

    /** Default share of {@code rod} taken off the retracted length to find the tube length; no unit. */
    public static final double TUBE_LENGTH_ROD_SHARE = 1.25;

    /** Default outside diameter of the tube over the bore; no unit. */
    public static final double TUBE_OUTSIDE_OVER_BORE = 1.2;

    /** Default yield stress of a rod: 350 MPa; in Pa. */
    public static final double DEFAULT_YIELD = 350e6;

    /** Pin-to-pin length when fully extended; in m. */
    public double extended() {
        return retracted + stroke;
    }

    /**
     * The same cylinder with other ends of its stroke.
     *
     * @param shortest pin-to-pin length at the near end; in m
     * @param travel way to the far end; in m
     */
    public Cylinder between(double shortest, double travel) {
        return new Cylinder(
                name,
                capPin,
                rodPin,
                count,
                bore,
                rod,
                shortest,
                travel,
                working,
                relief,
                back,
                friction,
                mass,
                harderShare,
                tube,
                yield);
    }
}
