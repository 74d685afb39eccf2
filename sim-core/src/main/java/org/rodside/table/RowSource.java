package org.rodside.table;

/** Hands out the rows of a table one after the other, so that a long table never stands in memory as a whole. */
public interface RowSource {

    /**
     * Reads the next row.
     *
     * @param values overwritten with one value a column, SI units
     * @return false at the end; the array is then unchanged
     */
    boolean next(double[] values);

    /** What faults call the table, as a rule the file as the user gave it. */
    String name();
}
