package org.rodside.table;

import java.util.ArrayList;
import java.util.Arrays;
import java.util.List;

/** A table in memory: columns with names and quantities, values in SI, rows in order. Not thread-safe. */
public final class Table implements RowSink {

    private final List<Column> columns;
    private double[] values = new double[256];
    private int rows;

    public Table(List<Column> columns) {
        this.columns = List.copyOf(columns);
    }

    public List<Column> columns() {
        return columns;
    }

    public int rows() {
        return rows;
    }

    /** Value of a cell in SI; the index of the word in a column of words. */
    public double at(int row, int column) {
        return values[row * columns.size() + column];
    }

    /** The word in a cell of a column of words; empty for NaN. */
    public String word(int row, int column) {
        double index = at(row, column);
        return Double.isNaN(index) ? "" : columns.get(column).labels().get((int) index);
    }

    /** Place of a column by its name without unit; -1 where there is none. */
    public int column(String name) {
        List<String> names = new ArrayList<>();
        columns.forEach(c -> names.add(c.name()));
        return names.indexOf(name);
    }

    /** A copy of one column; SI units. */
    public double[] column(int column) {
        double[] copy = new double[rows];
        for (int i = 0; i < rows; i++) {
            copy[i] = at(i, column);
        }
        return copy;
    }

    @Override
    public void row(double[] row) {
        int width = columns.size();
        if (row.length != width) {
            throw new IllegalArgumentException("row has " + row.length + " values for " + width + " columns");
        }
        if ((rows + 1) * width > values.length) {
            values = Arrays.copyOf(values, Math.max(values.length * 2, (rows + 1) * width));
        }
        System.arraycopy(row, 0, values, rows * width, width);
        rows++;
    }
}
