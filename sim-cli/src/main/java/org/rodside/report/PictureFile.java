package org.rodside.report;

import java.nio.file.Path;
import org.rodside.chart.Plot;
import org.rodside.chart.PlotWriter;
import org.rodside.io.WholeFile;

/** Pictures as files, whole or not at all. */
final class PictureFile {

    private static final int WIDTH = 1400;
    private static final int HEIGHT = 1000;

    private PictureFile() {}

    static void write(Path target, Plot plot) {
        WholeFile.write(target, out -> PlotWriter.png(plot, out, WIDTH, HEIGHT));
    }
}
