package org.rodside.study;

/** Finds the digging forces of one line of a sweep. One per thread. */
interface DigLine {

    /**
     * Forces, limits and tip places along a line.
     *
     * @param outer grid index of every stroke but the last of the sweep's order; not modified
     * @param out overwritten; NaN where a pose does not assemble
     */
    void run(int[] outer, DigRun out);

    /**
     * Forces alone along a line.
     *
     * @param outer grid index of every stroke but the last of the sweep's order; not modified
     * @param out curl and crowd overwritten, the rest left as it was
     */
    void forces(int[] outer, DigRun out);
}
