package org.rodside.report;

import java.nio.file.Path;
import org.rodside.io.CsvWriter;
import org.rodside.table.Table;
import org.rodside.units.UnitSystem;

/** Tables as CSV files, whole or not at all. */
final class TableFile {

    private TableFile() {}

    static void write(Path path, Table table, UnitSystem units) {
        CsvWriter.write(path, table.columns(), units, sink -> {
            double[] values = new double[table.columns().size()];
            for (int row = 0; row < table.rows(); row++) {
                for (int column = 0; column < values.length; column++) {
                    values[column] = table.at(row, column);
                }
                sink.row(values);
            }
        });
    }
}
