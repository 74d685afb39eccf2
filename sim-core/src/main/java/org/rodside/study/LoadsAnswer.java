package org.rodside.study;

import java.util.List;

/**
 * Worst loads over the stroke box.
 *
 * @param cases the cases searched
 * @param cylinders worst push, pull and buckling factor of every cylinder and case that occur
 * @param bearings worst force of every pin on every link and case
 * @param intensified rod side of every cylinder with its rod port blocked while the pump works on the cap side
 * @param skipped grid poses, over all cases, that do not assemble or where nothing limits the tool force
 * @param notes what a reader should know, each a sentence
 */
public record LoadsAnswer(
        List<LoadCase> cases,
        List<OnCylinder> cylinders,
        List<OnBearing> bearings,
        List<Intensified> intensified,
        long skipped,
        List<String> notes) {

    /** Sense of a worst load on a cylinder. */
    public enum Sense {
        PUSH,
        PULL,
        /** Smallest buckling factor. */
        BUCKLE
    }

    /**
     * A worst load on a cylinder.
     *
     * @param cylinder index of the cylinder
     * @param sense which worst
     * @param loadCase name of the case
     * @param total force of all twins, + push; in N
     * @param each force of the harder-worked twin, + push; in N
     * @param cap pressure on the cap side; in Pa
     * @param rod pressure on the rod side; in Pa
     * @param reliefMargin relief pressure over the pressure of the loaded side; no unit
     * @param bucklingFactor buckling load over the harder twin's push at this pose; no unit, NaN for a pull
     * @param at fraction of stroke of each cylinder; not to be modified
     */
    public record OnCylinder(
            int cylinder,
            Sense sense,
            String loadCase,
            double total,
            double each,
            double cap,
            double rod,
            double reliefMargin,
            double bucklingFactor,
            double[] at) {}

    /**
     * A worst force of a pin on a link.
     *
     * @param bearing index of the (pin, link) pair
     * @param loadCase name of the case
     * @param total size; in N
     * @param x part along the link's drawn x axis; in N
     * @param y part along the link's drawn y axis; in N
     * @param at fraction of stroke of each cylinder; not to be modified
     */
    public record OnBearing(int bearing, String loadCase, double total, double x, double y, double[] at) {}

    /**
     * Rod side of a cylinder with its rod port blocked while the pump works on the cap side and nothing holds the rod.
     *
     * @param cylinder index of the cylinder
     * @param rod pressure on the rod side; in Pa
     * @param relief relief pressure of the rod side; in Pa
     */
    public record Intensified(int cylinder, double rod, double relief) {}
}
