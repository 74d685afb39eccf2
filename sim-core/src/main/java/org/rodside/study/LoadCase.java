package org.rodside.study;

/**
 * A load case of the search for worst loads.
 *
 * @param name name in tables
 * @param kind what loads the tool
 * @param forceX force of the ground on the tip, x, for {@link Kind#GIVEN}; in N
 * @param forceY force of the ground on the tip, y, for {@link Kind#GIVEN}; in N
 * @param payload payload at the fill point for {@link Kind#CARRY} and {@link Kind#GIVEN}; in kg
 */
public record LoadCase(String name, Kind kind, double forceX, double forceY, double payload) {

    /** What loads the tool. */
    public enum Kind {
        /** Own weight and a payload. */
        CARRY,
        /** Own weight and the largest curl force of the pose. */
        CURL,
        /** Own weight and the largest crowd force of the pose. */
        CROWD,
        /** Own weight, a payload and a force on the tip. */
        GIVEN
    }

    /** Own weight and a full bucket. */
    public static LoadCase carry(double payload) {
        return new LoadCase("carry", Kind.CARRY, 0, 0, payload);
    }

    public static LoadCase curl() {
        return new LoadCase("curl", Kind.CURL, 0, 0, 0);
    }

    public static LoadCase crowd() {
        return new LoadCase("crowd", Kind.CROWD, 0, 0, 0);
    }
}
