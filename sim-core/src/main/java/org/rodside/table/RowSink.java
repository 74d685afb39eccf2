package org.rodside.table;

/** Takes the rows of a table one after the other, so that a long table never stands in memory as a whole. */
public interface RowSink {

    /**
     * Takes one row.
     *
     * @param values one value a column, SI units (an index for a column of words); not modified, not kept
     */
    void row(double[] values);
}
